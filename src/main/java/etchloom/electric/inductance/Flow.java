package etchloom.electric.inductance;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.artwork.Phase;
import etchloom.electric.resistance.Chains;
import etchloom.electric.resistance.Copper;
import etchloom.electric.resistance.Currents;
import java.util.List;

/**
 * How one ampere flows through the first coil, and through each phase.
 *
 * @param coil from the first coil's start to its finish
 * @param phases from each phase's entry to its exit
 */
record Flow(Artwork artwork, Currents coil, List<Currents> phases) {
  Flow {
    phases = List.copyOf(phases);
  }

  static Flow of(Artwork artwork) {
    return new Flow(
        artwork,
        Chains.coil(artwork, artwork.coils().get(0), Copper.REFERENCE_C),
        artwork.phases().stream().map(p -> Chains.phase(artwork, p, Copper.REFERENCE_C)).toList());
  }

  Coil firstCoil() {
    return artwork.coils().get(0);
  }

  /** The first coil, start to finish; if closed, with a straight way back. */
  Filaments coilFilaments(BoardCopper copper, boolean closed) {
    Filaments out = new Filaments();
    Coil c = firstCoil();
    for (int id : c.copper()) {
      copper.add(id, coil.ofConductor(id), out);
    }
    if (closed) {
      copper.addStraight(c.finishJoint(), c.startJoint(), c.conductors().get(0), 1, out);
    }
    return out;
  }

  /**
   * A phase, entry to exit; if closed, with a straight way back.
   *
   * @param coilsToo false for the links between its coils only
   */
  Filaments phaseFilaments(BoardCopper copper, int phase, boolean coilsToo, boolean closed) {
    Filaments out = new Filaments();
    Currents currents = phases.get(phase);
    boolean[] inCoil = new boolean[artwork.conductors().size()];
    artwork.coils().forEach(c -> c.copper().forEach(id -> inCoil[id] = true));
    for (Conductor c : artwork.conductors()) {
      double ampere = currents.ofConductor(c.id());
      if (ampere != 0 && (coilsToo || !inCoil[c.id()])) {
        copper.add(c.id(), ampere, out);
      }
    }
    if (closed) {
      Phase p = artwork.phases().get(phase);
      copper.addStraight(p.exitJoint(), p.entryJoint(), p.steps().get(0).conductor(), 1, out);
    }
    return out;
  }

  /** Adds what the closed coils of a phase have too much: their straight ways back, reversed. */
  void addWaysBack(BoardCopper copper, int phase, Repeats repeats, Filaments out) {
    Coil c = firstCoil();
    Filaments way = new Filaments();
    copper.addStraight(c.startJoint(), c.finishJoint(), c.conductors().get(0), 1, way);
    for (int k = 0; k < repeats.coils(); k++) {
      if (repeats.phase(k) == phase) {
        out.addTurned(way, k * repeats.pitchRad(), repeats.factor(k));
      }
    }
  }
}
