package etchloom.testing;

import java.util.List;
import java.util.Random;

/**
 * Random specs as YAML text, the same for the same seed. Every value keeps the rules of the
 * standard class, so that a drawn board has no reason to break one; whether there is room for what
 * is asked is left to chance.
 */
public final class RandomSpecs extends SpecText {
  /** Counts of coils and poles, most of them feasible for three phases, some not. */
  private static final List<int[]> COUNTS =
      List.of(
          new int[] {3, 2},
          new int[] {3, 4},
          new int[] {6, 4},
          new int[] {6, 8},
          new int[] {9, 6},
          new int[] {9, 8},
          new int[] {9, 10},
          new int[] {9, 12},
          new int[] {12, 8},
          new int[] {12, 10},
          new int[] {12, 14},
          new int[] {12, 16},
          new int[] {15, 14},
          new int[] {15, 20},
          new int[] {18, 16},
          new int[] {18, 24},
          new int[] {21, 22},
          new int[] {24, 20},
          new int[] {12, 12},
          new int[] {10, 8});

  /** Phases, coils, poles: most of them feasible, some not. */
  private static final List<int[]> WINDINGS =
      List.of(
          new int[] {1, 4, 4},
          new int[] {1, 6, 6},
          new int[] {1, 9, 8},
          new int[] {2, 8, 6},
          new int[] {2, 8, 10},
          new int[] {2, 16, 12},
          new int[] {2, 12, 10},
          new int[] {3, 9, 12},
          new int[] {3, 12, 10},
          new int[] {3, 12, 8},
          new int[] {3, 18, 24},
          new int[] {3, 18, 16},
          new int[] {5, 5, 4},
          new int[] {5, 10, 8},
          new int[] {5, 15, 12},
          new int[] {5, 20, 18},
          new int[] {5, 20, 16},
          new int[] {5, 10, 10},
          new int[] {6, 12, 10},
          new int[] {6, 12, 14},
          new int[] {6, 24, 20},
          new int[] {6, 24, 22},
          new int[] {6, 18, 16});

  private final Random tapering;

  private RandomSpecs(long seed) {
    super(seed);
    tapering = new Random(~seed);
  }

  public static String yaml(long seed) {
    RandomSpecs r = new RandomSpecs(seed);
    r.build();
    return r.text();
  }

  /** Windings of every phase count, parallel paths, tabs, pads and screws. */
  public static String wide(long seed) {
    RandomSpecs r = new RandomSpecs(1_000_003 * seed + 17);
    r.buildWide();
    return r.text();
  }

  private void buildWide() {
    int[] w = pick(WINDINGS);
    String connection =
        switch (w[0]) {
          case 1 -> "open";
          case 3 -> pick(List.of("star", "delta", "open"));
          default -> pick(List.of("star", "open"));
        };
    boolean star = connection.equals("star");
    int paths = pick(List.of(1, 1, 2, 3, 4));
    double inner = between(10, 25);
    double outer = inner + between(8, 20);
    double radius = outer + between(8, 20);
    line("etchloom: 1");
    line("title: Random winding");
    line("rotor: {poles: " + w[2] + "}");
    line("winding:");
    line("  phases: " + w[0]);
    line("  coils: " + w[1]);
    line("  connection: " + connection);
    line("  parallel-paths: " + (w[1] / w[0] % paths == 0 ? paths : 1));
    line("coil:");
    line("  outline: wedge");
    line("  inner-radius: " + mm(inner));
    line("  outer-radius: " + mm(outer));
    line("  turns: " + (1 + random.nextInt(4)));
    line("  track: " + mm(between(0.13, 0.35)));
    line("  space: " + mm(between(0.13, 0.3)));
    taper(2);
    line("via: {hole: 0.3 mm, pad: 0.6 mm}");
    line("board:");
    line("  layers: " + pick(List.of(2, 2, 4)));
    line("  thickness: 1.2 mm");
    line("  copper: 1 oz");
    line("  diameter: " + mm(2 * radius));
    String start = random.nextInt(360) + " deg";
    boolean tab = random.nextInt(3) == 0;
    if (tab) {
      String size = mm(between(10, 40)) + ", length: " + mm(between(1, 20));
      line("  tab: {angle: " + start + ", width: " + size + "}");
    }
    String drill = pick(List.of("kind: hole, hole: 0.9 mm", "kind: pad"));
    String place = tab ? "" : ", start: " + start;
    String pitch = pick(List.of("2.54", "3.5", "5")) + " mm, pad: 1.8 mm}";
    line("  terminals: {" + drill + place + ", pitch: " + pitch);
    if (random.nextInt(3) == 0) {
      String circle = mm(2 * (radius - between(3.5, 5)));
      line(
          "  holes: {count: 3, diameter: 2.7 mm, circle: "
              + circle
              + ", start: "
              + random.nextInt(120)
              + " deg, keep-out: 5 mm}");
    }
    if (star) {
      line("  star-point: " + (w[0] == 2 ? "terminal" : pick(List.of("inside", "terminal"))));
    }
    line("fab: standard");
  }

  private void build() {
    int[] counts = pick(COUNTS);
    int layers = pick(List.of(2, 2, 4, 4, 6));
    boolean heavy = random.nextInt(4) == 0;
    double least = heavy ? 0.18 : 0.127;
    double track = between(least, 0.4);
    double space = between(least, 0.3);
    double hole = between(0.3, 0.45);
    double pad = hole + between(0.27, 0.4);
    double inner = between(5, 25);
    double outer = inner + between(6, 22);
    double board = 2 * (outer + between(6, 18));
    line("etchloom: 1");
    line("title: Random board");
    line("rotor: {poles: " + counts[1] + "}");
    String connection = pick(List.of("star", "delta", "open"));
    line("winding: {phases: 3, coils: " + counts[0] + ", connection: " + connection + "}");
    line("coil:");
    line("  outline: wedge");
    line("  inner-radius: " + mm(inner));
    line("  outer-radius: " + mm(outer));
    line("  turns: " + (random.nextInt(3) == 0 ? 1 + random.nextInt(12) : "fill"));
    line("  track: " + mm(track));
    line("  space: " + mm(space));
    if (random.nextInt(4) == 0) {
      line("  corner: " + mm(between(0.5, 2.5) * (track + space)));
    }
    taper(2);
    line("rim: {track: " + mm(track * between(1, 2.5)) + "}");
    line("via: {hole: " + mm(hole) + ", pad: " + mm(pad) + "}");
    line("board:");
    line("  layers: " + layers);
    line("  thickness: " + pick(List.of("1.0 mm", "1.2 mm", "1.6 mm")));
    line("  copper: " + (heavy ? "2 oz" : "1 oz"));
    line("  diameter: " + mm(board));
    line("  bore: " + (random.nextInt(4) == 0 ? "0 mm" : mm(inner * between(0.8, 1.6))));
    line(
        "  terminals: {kind: hole, start: "
            + random.nextInt(360)
            + " deg, pitch: "
            + pick(List.of("2.54", "3.5", "5"))
            + " mm, hole: 0.9 mm, pad: 1.8 mm}");
    if (connection.equals("star")) {
      line("  star-point: " + pick(List.of("inside", "inside", "terminal")));
    }
    line("fab: standard");
  }

  /**
   * Specs over all outlines, layers side by side, several vias at a joint, and up to 12 layers of
   * unequal copper.
   */
  public static String shapes(long seed) {
    RandomSpecs r = new RandomSpecs(seed);
    r.buildShapes();
    return r.text();
  }

  private void buildShapes() {
    int[] counts = pick(COUNTS);
    String outline = pick(List.of("wedge", "round", "racetrack"));
    int layers = pick(List.of(2, 2, 4, 4, 6, 8, 12));
    int vias = pick(List.of(1, 1, 2, 2, 3, 4));
    double track = between(0.18, 0.4);
    double space = between(0.18, 0.3);
    double hole = between(0.3, 0.4);
    double pad = hole + between(0.27, 0.35);
    double half = Math.sin(Math.PI / counts[0]);
    double middle = between(12, 40);
    double most = 2 * (middle * half - space / 2);
    double length = Math.min(between(0.5, 1) * most, 1.6 * middle);
    String width = "";
    double inner = middle - length / 2;
    double outer = middle + length / 2;
    if (outline.equals("wedge")) {
      inner = middle * between(0.4, 0.7);
      outer = middle * between(1.1, 1.4);
    } else if (outline.equals("racetrack")) {
      inner = middle * between(0.6, 0.9);
      outer = middle * between(1.05, 1.3);
      width = mm(2 * inner * half * between(0.5, 1));
    }
    line("etchloom: 1");
    line("title: Random board");
    line("rotor: {poles: " + counts[1] + "}");
    String connection = pick(List.of("star", "delta", "open"));
    line("winding: {phases: 3, coils: " + counts[0] + ", connection: " + connection + "}");
    line("coil:");
    line("  outline: " + outline);
    line("  inner-radius: " + mm(inner));
    line("  outer-radius: " + mm(outer));
    if (!width.isEmpty()) {
      line("  width: " + width);
    }
    line("  turns: " + (random.nextInt(3) == 0 ? 1 + random.nextInt(6) : "fill"));
    line("  track: " + mm(track));
    line("  space: " + mm(space));
    line("  layers: " + pick(List.of("series", "parallel")));
    if (!outline.equals("round") && random.nextInt(4) == 0) {
      line("  corner: " + mm(between(0.5, 2.5) * (track + space)));
    }
    if (outline.equals("wedge")) {
      taper(1);
    }
    line("rim: {track: " + mm(track * between(1, 2)) + "}");
    line("via: {hole: " + mm(hole) + ", pad: " + mm(pad) + ", count: " + vias + "}");
    line("board:");
    line("  layers: " + layers);
    line("  thickness: " + (layers > 8 ? "2.4 mm" : "1.6 mm"));
    line("  copper: " + pick(List.of("1 oz", "{outer: 2 oz, inner: 1 oz}")));
    line("  diameter: " + mm(2 * (outer + between(8, 18))));
    line("  bore: " + (random.nextInt(4) == 0 ? "0 mm" : mm(inner * between(0.5, 0.9) * 2)));
    line(
        "  terminals: {kind: hole, start: "
            + random.nextInt(360)
            + " deg, pitch: 3.5 mm, hole: 0.9 mm, pad: 1.8 mm}");
    line("fab: " + (layers > 6 ? "fine" : "standard"));
  }

  /** Sides that widen, in one of so many; drawn apart, so that all else stays as it was. */
  private void taper(int of) {
    if (tapering.nextInt(of + 1) == 0) {
      line("  taper: on");
    }
  }
}
