package etchloom.testing;

import java.util.List;
import java.util.Random;

/**
 * Random specs over the whole space at once, as YAML text, the same for the same seed: every count
 * of phases, every connection, parallel paths together with parallel layers and rows of vias, all
 * outlines, terminals as holes and pads, on tabs, with screws and star points brought out. Values
 * keep the rules of their class; whether all of it has room is left to chance.
 */
public final class MixedSpecs extends SpecText {
  /** Phases, coils, poles: most of them feasible, and most of them with parallel paths. */
  private static final List<int[]> WINDINGS =
      List.of(
          new int[] {1, 4, 4},
          new int[] {1, 6, 6},
          new int[] {1, 8, 8},
          new int[] {2, 4, 6},
          new int[] {2, 8, 6},
          new int[] {2, 8, 12},
          new int[] {2, 16, 12},
          new int[] {3, 3, 4},
          new int[] {3, 6, 8},
          new int[] {3, 9, 12},
          new int[] {3, 12, 10},
          new int[] {3, 12, 16},
          new int[] {3, 18, 24},
          new int[] {3, 12, 12},
          new int[] {5, 5, 6},
          new int[] {5, 10, 8},
          new int[] {5, 10, 12},
          new int[] {5, 20, 16},
          new int[] {6, 12, 10},
          new int[] {6, 12, 14},
          new int[] {6, 12, 10},
          new int[] {6, 24, 28},
          new int[] {6, 24, 20});

  private final Random tapering;

  private MixedSpecs(long seed) {
    super(7_368_787 * seed + 11);
    tapering = new Random(~seed);
  }

  public static String yaml(long seed) {
    MixedSpecs m = new MixedSpecs(seed);
    m.build();
    return m.text();
  }

  private void build() {
    int[] w = pick(WINDINGS);
    double space = between(0.18, 0.3);
    line("etchloom: 1");
    line("title: Random mixture");
    line("rotor: {poles: " + w[2] + "}");
    boolean star = winding(w);
    double outer = coil(w[1], space);
    int layers = pick(List.of(2, 2, 2, 4, 4, 6, 8));
    double hole = between(0.3, 0.4);
    int vias = pick(List.of(1, 2, 2, 3));
    line("via: {hole: " + mm(hole) + ", pad: " + mm(hole + 0.3) + ", count: " + vias + "}");
    line("board:");
    line("  layers: " + layers);
    line("  thickness: 1.6 mm");
    line("  copper: " + pick(List.of("1 oz", "{outer: 2 oz, inner: 1 oz}")));
    double radius = outer + between(9, w[0] > 3 ? 32 : 24);
    line("  diameter: " + mm(2 * radius));
    terminals();
    if (random.nextInt(4) == 0) {
      String circle = mm(2 * (radius - between(3.5, 5)));
      String screws = "{count: 3, diameter: 2.7 mm, keep-out: 5 mm, circle: " + circle;
      line("  holes: " + screws + ", start: " + random.nextInt(120) + " deg}");
    }
    if (star) {
      line("  star-point: " + (w[0] == 2 ? "terminal" : pick(List.of("inside", "terminal"))));
    }
    line("fab: " + (layers > 6 ? "fine" : "standard"));
  }

  /** Gives whether it has a star point. */
  private boolean winding(int[] w) {
    String connection =
        switch (w[0]) {
          case 1 -> "open";
          case 3 -> pick(List.of("star", "delta", "open"));
          default -> pick(List.of("star", "open"));
        };
    int paths = pick(List.of(1, 2, 2, 3, 4));
    line("winding:");
    line("  phases: " + w[0]);
    line("  coils: " + w[1]);
    line("  connection: " + connection);
    line("  parallel-paths: " + (w[1] / w[0] % paths == 0 ? paths : 1));
    return connection.equals("star");
  }

  /** Gives the outer radius. */
  private double coil(int coils, double space) {
    String outline = pick(List.of("wedge", "round", "racetrack"));
    double half = Math.sin(Math.PI / Math.max(3, coils));
    double middle = between(14, 36);
    double round = Math.min(between(0.7, 1) * 2 * (middle * half - space / 2), 1.6 * middle);
    double inner = middle - round / 2;
    double outer = middle + round / 2;
    String width = "";
    if (outline.equals("wedge")) {
      inner = middle * between(0.4, 0.7);
      outer = middle * between(1.1, 1.4);
    } else if (outline.equals("racetrack")) {
      inner = middle * between(0.6, 0.8);
      outer = middle * between(1.1, 1.3);
      width = mm(2 * inner * half * between(0.7, 1) - space);
    }
    double track = between(0.18, 0.35);
    line("coil:");
    line("  outline: " + outline);
    line("  inner-radius: " + mm(inner));
    line("  outer-radius: " + mm(outer));
    if (!width.isEmpty()) {
      line("  width: " + width);
    }
    line("  turns: " + (random.nextInt(8) == 0 ? "fill" : 1 + random.nextInt(4)));
    line("  track: " + mm(track));
    line("  space: " + mm(space));
    line("  layers: " + pick(List.of("series", "parallel")));
    if (!outline.equals("round") && random.nextInt(4) == 0) {
      line("  corner: " + mm(between(0.5, 2.5) * (track + space)));
    }
    if (outline.equals("wedge") && tapering.nextBoolean()) {
      line("  taper: on");
    }
    line("rim: {track: " + mm(track * between(1, 3)) + "}");
    return outer;
  }

  private void terminals() {
    String start = random.nextInt(360) + " deg";
    boolean tab = random.nextInt(4) == 0;
    if (tab) {
      String size = mm(between(15, 45)) + ", length: " + mm(between(1, 15));
      line("  tab: {angle: " + start + ", width: " + size + "}");
    }
    String drill = pick(List.of("kind: hole, hole: 0.9 mm", "kind: pad"));
    String pitch = pick(List.of("2.54", "3.5")) + " mm, pad: 1.8 mm}";
    line("  terminals: {" + drill + (tab ? "" : ", start: " + start) + ", pitch: " + pitch);
  }
}
