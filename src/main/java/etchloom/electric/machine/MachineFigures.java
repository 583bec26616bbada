package etchloom.electric.machine;

import etchloom.electric.machine.spread.SpreadFigures;
import java.util.List;
import java.util.Optional;

/**
 * Everything known about the machine. What is not known is in {@code absent}, with the key that
 * would bring it; nothing is nought, infinite or no number for lack of input.
 */
public record MachineFigures(
    Optional<SharingFigures> sharing,
    Optional<EmfFigures> emf,
    Optional<TorqueFigures> torque,
    LossFigures loss,
    ThermalFigures thermal,
    DriveFigures drive,
    Optional<GeneratorFigures> generator,
    SpreadFigures spread,
    List<Need> verdict,
    RotorFigures rotor,
    List<Caution> cautions,
    List<Absent> absent) {
  public MachineFigures {
    verdict = List.copyOf(verdict);
    cautions = List.copyOf(cautions);
    absent = List.copyOf(absent);
  }
}
