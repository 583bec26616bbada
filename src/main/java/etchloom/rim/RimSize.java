package etchloom.rim;

import etchloom.spec.Spec;
import java.util.Optional;

/**
 * What the rim is made from. Lengths in mm.
 *
 * @param coils on the board
 * @param nodes of one coil
 * @param nodeRadiusMm of all nodes
 * @param firstNodeRad angle of a coil's first node from its axis; the last lies opposite
 * @param edgeCopperMm least distance of copper from the board's edge
 * @param edgeHoleMm least distance of a hole's edge from the board's edge
 */
public record RimSize(
    int coils,
    int nodes,
    int layers,
    double nodeRadiusMm,
    double firstNodeRad,
    double trackMm,
    double spaceMm,
    double padMm,
    double holeMm,
    double boardRadiusMm,
    double edgeCopperMm,
    double edgeHoleMm,
    Spec.Terminals terminals,
    Optional<Spec.Tab> tab) {

  /** The wider of pad and track. */
  double wideMm() {
    return Math.max(padMm, trackMm);
  }

  double pinAngleRad(Pin pin) {
    double axis = 2 * Math.PI * (pin.coil() - 1) / coils;
    return axis + (pin.start() ? firstNodeRad : -firstNodeRad);
  }

  double firstRingMm() {
    return nodeRadiusMm + padMm / 2 + spaceMm + wideMm() / 2;
  }

  /** Distance of neighbouring rings, whose vias never share an angle: pad to track. */
  double ringPitchMm() {
    return wideMm() / 2 + spaceMm + trackMm / 2;
  }

  /** Least angle between two drops, or a drop and a radial, seen at the first ring. */
  double clearRad() {
    return Math.asin(Math.min(1, (wideMm() + spaceMm) / firstRingMm()));
  }

  /** Least distance of a terminal's centre from the board's edge. */
  double terminalMarginMm() {
    double copper = terminals.padMm() / 2 + edgeCopperMm;
    double hole =
        terminals.kind() == Spec.TerminalKind.HOLE ? terminals.holeMm() / 2 + edgeHoleMm : 0;
    return Math.max(copper, hole);
  }
}
