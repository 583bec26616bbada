package etchloom.electric.inductance;

import java.util.List;
import java.util.OptionalDouble;

/**
 * Inductances of a board, H. A positive current enters at a coil's start, at a phase's entry.
 *
 * @param coilHenry the first coil alone, from start to finish, its vias included
 * @param phaseHenry each phase with each phase, in the artwork's order, symmetric: self-inductances
 *     on the diagonal, mutual ones, signed, beside it; from entry to exit, links and vias included,
 *     leads to terminals and shared star or delta copper left out
 * @param phaseSelfHenry mean of the phases' self-inductances
 * @param phaseMutualHenry mean mutual inductance of two phases of one set, signed; absent where
 *     there is one phase
 * @param synchronousHenry what one phase shows while all carry balanced sinusoidal currents: for
 *     three phases self less mutual; mean of the phases
 * @param terminalHenry between two terminals: across a phase for open windings, else the mean over
 *     pairs of terminals of one set
 */
public record InductanceFigures(
    double coilHenry,
    List<List<Double>> phaseHenry,
    double phaseSelfHenry,
    OptionalDouble phaseMutualHenry,
    double synchronousHenry,
    double terminalHenry) {
  public InductanceFigures {
    phaseHenry = phaseHenry.stream().map(List::copyOf).toList();
  }
}
