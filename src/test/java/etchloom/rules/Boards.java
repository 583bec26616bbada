package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Feature;
import etchloom.artwork.Joint;
import etchloom.artwork.MountingHole;
import etchloom.artwork.Opening;
import etchloom.artwork.Phase;
import etchloom.artwork.Stackup;
import etchloom.artwork.Stroke;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/** Small boards made by hand, and the spec and rules they are held against. */
final class Boards {
  static final double TRACK = 0.2;
  static final double SPACE = 0.2;

  final List<Joint> joints = new ArrayList<>();
  final List<Conductor> conductors = new ArrayList<>();
  final List<MountingHole> holes = new ArrayList<>();
  final List<Opening> maskTop = new ArrayList<>();
  final List<Opening> maskBottom = new ArrayList<>();
  final List<Stroke> legend = new ArrayList<>();
  final List<Phase> phases = new ArrayList<>();
  List<Path> profile = List.of(Path.circle(Point.ORIGIN, 42), Path.circle(Point.ORIGIN, 7));
  int layers = 2;
  double thicknessMm = 1.2;

  /** A joint of one layer, no hole, its pad as wide as a track. */
  int bare(int layer, Point at) {
    return bare(layer, at, TRACK);
  }

  int bare(int layer, Point at, double padMm) {
    return joint(Joint.Kind.NODE, at, padMm, Optional.empty(), layer, layer, "");
  }

  /** A plated hole through all layers. */
  int via(Point at, double padMm, double holeMm) {
    return joint(Joint.Kind.EYE, at, padMm, Optional.of(holeMm), 1, layers, "");
  }

  int terminal(String mark, Point at, double padMm, double holeMm) {
    return joint(Joint.Kind.TERMINAL, at, padMm, Optional.of(holeMm), 1, layers, mark);
  }

  private int joint(
      Joint.Kind kind,
      Point at,
      double padMm,
      Optional<Double> hole,
      int first,
      int last,
      String mark) {
    int id = joints.size();
    String what = mark.isEmpty() ? "joint " + id : "terminal " + mark;
    joints.add(new Joint(id, kind, at, padMm, hole, first, last, "WINDING", mark, what));
    return id;
  }

  /** A spiral of coil {@code coil} between two joints, every segment a turn of its own. */
  int track(int layer, double widthMm, Path path, int from, int to, String phase, int coil) {
    List<Integer> turns = new ArrayList<>();
    for (int i = 1; i <= path.segments().size(); i++) {
      turns.add(i);
    }
    Feature what = new Feature(Feature.Kind.SPIRAL, phase, coil, turns);
    int id = conductors.size();
    conductors.add(new Conductor(id, layer, widthMm, path, from, to, "WINDING", what));
    return id;
  }

  /** A track of the usual width with bare joints of its own. */
  int track(int layer, Path path, int coil) {
    int from = bare(layer, path.start());
    return track(layer, TRACK, path, from, bare(layer, path.end()), "U", coil);
  }

  Artwork artwork() {
    Stackup.Copper foil = new Stackup.Copper(0.035, 1, 0);
    double dielectric = (thicknessMm - layers * 0.035) / (layers - 1);
    return new Artwork(
        "Test",
        "test",
        "A",
        false,
        new Stackup(
            Collections.nCopies(layers, foil), Collections.nCopies(layers - 1, dielectric), 0.02),
        profile,
        joints,
        conductors,
        holes,
        maskTop,
        maskBottom,
        legend,
        List.of(),
        phases,
        1,
        0);
  }

  RuleReport check() {
    return check(spec(layers, Optional.empty()), fab());
  }

  RuleReport check(Spec spec, FabRules fab) {
    return RuleCheck.check(artwork(), spec, fab, RuleContext.NONE);
  }

  /** The only finding of a rule that is broken once; all other rules are kept. */
  static Finding only(RuleReport report, String rule) {
    List<Finding> all = report.findings();
    if (all.size() != 1 || !all.get(0).rule().equals(rule)) {
      throw new AssertionError("expected one finding of " + rule + ", got " + all);
    }
    return all.get(0);
  }

  static Spec spec(int layers, Optional<Spec.Duty> duty) {
    return spec(layers, duty, OptionalDouble.empty(), SPACE);
  }

  static Spec spec(
      int layers, Optional<Spec.Duty> duty, OptionalDouble rotorDiameter, double spaceMm) {
    Spec.Copper ounce = new Spec.Copper(OptionalDouble.of(1), OptionalDouble.empty());
    return new Spec(
        "Test",
        "test",
        "A",
        new Spec.Rotor(
            12,
            false,
            OptionalDouble.empty(),
            Optional.empty(),
            rotorDiameter,
            false,
            OptionalDouble.empty()),
        new Spec.Winding(3, 9, Spec.Connection.STAR, 1),
        new Spec.Coil(
            Spec.CoilOutline.WEDGE,
            12,
            30,
            OptionalDouble.empty(),
            OptionalInt.empty(),
            TRACK,
            spaceMm,
            OptionalDouble.empty(),
            false,
            false),
        new Spec.Rim(0.4),
        new Spec.Via(0.3, 0.6, 1),
        new Spec.Board(
            layers,
            1.2,
            ounce,
            ounce,
            List.of(),
            84,
            14,
            Optional.empty(),
            new Spec.Terminals(Spec.TerminalKind.HOLE, Math.PI / 2, 3.5, 1, 2),
            false,
            "ENIG",
            "green",
            150,
            Optional.empty()),
        "standard",
        duty);
  }

  static Spec.Duty duty(OptionalDouble busVolt) {
    return new Spec.Duty(
        false,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        busVolt,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        25,
        105,
        12);
  }

  /** The example of the spec page, with the drawn space as its rule. */
  static FabRules fab() {
    return fab(List.of(row(1, true, SPACE), row(1, false, SPACE)));
  }

  static FabRules.CopperRow row(double ounces, boolean outer, double spaceMm) {
    return new FabRules.CopperRow(
        ounces, outer, 0.035 * ounces, 0.127, spaceMm, OptionalDouble.empty());
  }

  static FabRules fab(List<FabRules.CopperRow> rows) {
    return new FabRules(
        "Test class",
        List.of(2, 4, 6),
        List.of(),
        0.6,
        2.4,
        400,
        rows,
        new FabRules.Hole(0.3, 8, 0.25, 0.2, 0.02),
        new FabRules.Ring(0.13, 0.2),
        new FabRules.Edge(0.3, 0.5),
        new FabRules.Mask(0.05, 0.1),
        new FabRules.Legend(0.15, 0.8, 0.15),
        new FabRules.Tolerance(0.2, 0.1, 0.2));
  }

  static Optional<Finding> minimum(RuleReport report, String rule) {
    return report.minima().stream().filter(f -> f.rule().equals(rule)).findFirst();
  }

  static List<Finding> findings(RuleReport report, String rule) {
    return report.findings().stream().filter(f -> f.rule().equals(rule)).toList();
  }
}
