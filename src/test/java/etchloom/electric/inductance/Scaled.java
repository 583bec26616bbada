package etchloom.electric.inductance;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Stackup;
import java.util.List;
import java.util.Optional;

/** A board drawn larger. */
final class Scaled {
  private Scaled() {}

  static Artwork twice(Artwork a) {
    List<Stackup.Copper> copper =
        a.stackup().copper().stream()
            .map(c -> new Stackup.Copper(2 * c.thicknessMm(), c.ounces(), 2 * c.undercutMm()))
            .toList();
    List<Double> dielectric = a.stackup().dielectricMm().stream().map(d -> 2 * d).toList();
    return new Artwork(
        a.title(),
        a.slug(),
        a.revision(),
        a.draft(),
        new Stackup(copper, dielectric, 2 * a.stackup().platingMm()),
        a.profile(),
        a.joints().stream().map(Scaled::joint).toList(),
        a.conductors().stream().map(Scaled::conductor).toList(),
        a.mountingHoles(),
        a.maskTop(),
        a.maskBottom(),
        a.legend(),
        a.coils(),
        a.phases(),
        a.turnsPerLayer(),
        a.expectedCircuits());
  }

  private static Joint joint(Joint j) {
    Optional<Double> hole = j.hole().map(d -> 2 * d);
    return new Joint(
        j.id(),
        j.kind(),
        j.at().times(2),
        2 * j.padMm(),
        hole,
        j.firstLayer(),
        j.lastLayer(),
        j.net(),
        j.mark(),
        j.what());
  }

  private static Conductor conductor(Conductor c) {
    return new Conductor(
        c.id(),
        c.layer(),
        2 * c.widthMm(),
        c.widthsMm().stream().map(w -> 2 * w).toList(),
        c.path().mapped(p -> p.times(2)),
        c.fromJoint(),
        c.toJoint(),
        c.net(),
        c.what());
  }
}
