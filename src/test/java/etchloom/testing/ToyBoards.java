package etchloom.testing;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.artwork.Feature;
import etchloom.artwork.Joint;
import etchloom.artwork.MountingHole;
import etchloom.artwork.Opening;
import etchloom.artwork.Phase;
import etchloom.artwork.Stackup;
import etchloom.artwork.Stroke;
import etchloom.geometry.Path;
import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Small boards laid out by hand, on the nanometre grid: not windings anyone would order, but every
 * construct of the artwork once, few enough to count.
 */
public final class ToyBoards {
  private static final double TRACK = 0.2;
  private static final double VIA_PAD = 0.6;
  private static final double VIA_HOLE = 0.3;

  private final List<Joint> joints = new ArrayList<>();
  private final List<Conductor> conductors = new ArrayList<>();
  private final List<Coil> coils = new ArrayList<>();

  private ToyBoards() {}

  /** One coil on L1 and L2, two terminals in plated holes, a ring, corners without fillets. */
  public static Artwork twoLayers() {
    ToyBoards b = new ToyBoards();
    int[] coil = b.coil(1, "U", 0, 1, 2, "WINDING");
    int u1 = b.terminal("U1", new Point(4, 15), true, "WINDING");
    int u2 = b.terminal("U2", new Point(-4, 15), true, "WINDING");
    Point from = b.joints.get(coil[1]).at();
    Point drop = Point.polar(from.norm(), Math.toRadians(100));
    int d = b.via(Joint.Kind.DROP, drop, "WINDING", "phase U, drop");
    Path lead =
        new PathBuilder(b.joints.get(coil[0]).at())
            .lineTo(new Point(6, 0))
            .arcTo(new Point(0, 6), Point.ORIGIN, true)
            .lineTo(new Point(0, 9))
            .lineTo(new Point(4, 15))
            .build();
    b.track(1, 0.4, lead, coil[0], u1, "WINDING", Feature.Kind.TERMINAL_TRACK);
    Path ring = new PathBuilder(from).arcTo(drop, Point.ORIGIN, true).build();
    b.track(2, 0.4, ring, coil[1], d, "WINDING", Feature.Kind.RING);
    Path radial = new PathBuilder(drop).lineTo(new Point(-4, 15)).build();
    b.track(1, 0.4, radial, d, u2, "WINDING", Feature.Kind.RADIAL);
    Stackup stackup =
        new Stackup(
            List.of(new Stackup.Copper(0.035, 1, 0.01), new Stackup.Copper(0.035, 1, 0.01)),
            List.of(0.93),
            0.02);
    return b.board("Toy board", "toy-two", "A", false, stackup, List.of(phase("U", coil)));
  }

  /** Two coils, one on L1 and L2, one on L3 and L4, each its own net; terminals of both kinds. */
  public static Artwork fourLayers() {
    return fourLayers("Toy board 4", "U", "V", false);
  }

  /** The four-layer board under other names. */
  public static Artwork fourLayers(String title, String netU, String netV, boolean draft) {
    ToyBoards b = new ToyBoards();
    List<Phase> phases = new ArrayList<>();
    for (int k = 0; k < 2; k++) {
      String mark = k == 0 ? "U" : "V";
      String net = k == 0 ? netU : netV;
      double turn = k * Math.PI / 2;
      int[] coil = b.coil(k + 1, mark, turn, 2 * k + 1, 2 * k + 2, net);
      int bare = b.terminal(mark + "1", new Point(4.5, -4.5).rotated(turn), false, net);
      int drilled = b.terminal(mark + "2", new Point(9, -13).rotated(turn), true, net);
      b.straight(1, coil[0], bare, net);
      b.straight(4, coil[1], drilled, net);
      phases.add(phase(mark, coil));
    }
    Stackup.Copper outer = new Stackup.Copper(0.035, 1, 0.01);
    Stackup.Copper inner = new Stackup.Copper(0.03, 1, 0.01);
    Stackup stackup =
        new Stackup(List.of(outer, inner, inner, outer), List.of(0.2, 0.67, 0.2), 0.02);
    return b.board(title, "toy-four", "B", draft, stackup, phases);
  }

  private static Phase phase(String mark, int[] coil) {
    return new Phase(
        mark,
        coil[0],
        coil[1],
        List.of(new Phase.Step(coil[2], false), new Phase.Step(coil[3], true)));
  }

  /**
   * Half circles about two centres on {@code upper}, the same mirrored on {@code lower}.
   *
   * @return start joint, finish joint, upper and lower conductor
   */
  private int[] coil(int number, String phase, double turn, int upper, int lower, String net) {
    int eye = via(Joint.Kind.EYE, new Point(1, -9).rotated(turn), net, "coil " + number + ", eye");
    PathBuilder up = halfCircles(true);
    up.lineTo(new Point(2.2, -5.5));
    PathBuilder down = halfCircles(false);
    down.lineTo(new Point(2.2, -10.5))
        .arcTo(new Point(3.2, -11.5), new Point(3.2, -10.5), true)
        .lineTo(new Point(5, -11.5));
    int start = via(Joint.Kind.NODE, up.at().rotated(turn), net, "coil " + number + ", node 1");
    int finish = via(Joint.Kind.NODE, down.at().rotated(turn), net, "coil " + number + ", node 2");
    int a = spiral(upper, up.build().rotated(turn), eye, start, net, phase, number);
    int b = spiral(lower, down.build().rotated(turn), eye, finish, net, phase, number);
    coils.add(new Coil(number, phase, 1, turn - Math.PI / 2, start, finish, List.of(a, b)));
    return new int[] {start, finish, a, b};
  }

  private static PathBuilder halfCircles(boolean counterClockwise) {
    PathBuilder p = new PathBuilder(new Point(1, -9));
    double x = 1;
    for (int i = 0; i < 6; i++) {
      double to = i % 2 == 0 ? -(1.4 + 0.2 * i) : 1.4 + 0.2 * (i - 1);
      p.arcTo(new Point(to, -9), new Point((x + to) / 2, -9), counterClockwise);
      x = to;
    }
    return p;
  }

  private int spiral(int layer, Path p, int from, int to, String net, String phase, int coil) {
    List<Integer> turns = new ArrayList<>();
    for (int i = 0; i < p.segments().size(); i++) {
      turns.add(Math.min(3, i / 2 + 1));
    }
    Feature what = new Feature(Feature.Kind.SPIRAL, phase, coil, turns);
    conductors.add(new Conductor(conductors.size(), layer, TRACK, p, from, to, net, what));
    return conductors.size() - 1;
  }

  private void straight(int layer, int from, int to, String net) {
    Path p = new PathBuilder(joints.get(from).at()).lineTo(joints.get(to).at()).build();
    track(layer, 0.4, p, from, to, net, Feature.Kind.TERMINAL_TRACK);
  }

  private void track(
      int layer, double width, Path p, int from, int to, String net, Feature.Kind kind) {
    Feature what = new Feature(kind, "", 0, List.of());
    conductors.add(new Conductor(conductors.size(), layer, width, p, from, to, net, what));
  }

  private int via(Joint.Kind kind, Point at, String net, String what) {
    return joint(kind, at, VIA_PAD, Optional.of(VIA_HOLE), net, "", what);
  }

  private int terminal(String mark, Point at, boolean drilled, String net) {
    Optional<Double> hole = drilled ? Optional.of(1.0) : Optional.empty();
    return joint(Joint.Kind.TERMINAL, at, 2.0, hole, net, mark, "terminal " + mark);
  }

  /** The last layer is set when the board is built. */
  private int joint(
      Joint.Kind kind,
      Point at,
      double pad,
      Optional<Double> hole,
      String net,
      String mark,
      String what) {
    joints.add(new Joint(joints.size(), kind, at, pad, hole, 1, 1, net, mark, what));
    return joints.size() - 1;
  }

  private Artwork board(
      String title,
      String slug,
      String revision,
      boolean draft,
      Stackup stackup,
      List<Phase> phases) {
    List<MountingHole> holes =
        List.of(
            new MountingHole(new Point(-17, 0), 3.2, 6.4),
            new MountingHole(new Point(0, -17), 3.2, 6.4));
    List<Joint> through =
        joints.stream()
            .map(
                j ->
                    new Joint(
                        j.id(),
                        j.kind(),
                        j.at(),
                        j.padMm(),
                        j.hole(),
                        1,
                        j.hole().isPresent() ? stackup.layers() : 1,
                        j.net(),
                        j.mark(),
                        j.what()))
            .toList();
    List<Opening> top = new ArrayList<>();
    List<Opening> bottom = new ArrayList<>();
    for (Joint j : through) {
      if (j.terminal()) {
        top.add(new Opening(j.at(), j.padMm() + 0.1, j.what()));
        if (j.hole().isPresent()) {
          bottom.add(top.get(top.size() - 1));
        }
      }
    }
    return new Artwork(
            title,
            slug,
            revision,
            draft,
            stackup,
            List.of(Path.circle(Point.ORIGIN, 20), Path.circle(Point.ORIGIN, 3)),
            through,
            conductors,
            holes,
            top,
            bottom,
            legend(),
            coils,
            phases,
            3,
            0)
        .onGrid();
  }

  /** A datum arrow and the letter U. */
  private static List<Stroke> legend() {
    Path shaft = new PathBuilder(new Point(17, 0)).lineTo(new Point(19, 0)).build();
    Path barb =
        new PathBuilder(new Point(18.4, 0.4))
            .lineTo(new Point(19, 0))
            .lineTo(new Point(18.4, -0.4))
            .build();
    Path letter =
        new PathBuilder(new Point(-12, -12))
            .lineTo(new Point(-12, -12.7))
            .arcTo(new Point(-11.4, -12.7), new Point(-11.7, -12.7), true)
            .lineTo(new Point(-11.4, -12))
            .build();
    return List.of(
        new Stroke(shaft, 0.15, "datum"),
        new Stroke(barb, 0.15, "datum"),
        new Stroke(letter, 0.15, "mark U"));
  }
}
