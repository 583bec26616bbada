package etchloom.electric.inductance;

import java.util.List;

/** Shapes and sums for tests: lengths in mm, results in H. */
final class Bodies {
  /** Thin enough to stand for a filament of no thickness, mm. */
  static final double THIN = 1e-6;

  /** The magnetic constant over 4π, in H for a coupling in mm. */
  static final double HENRY_A_MM = 1e-10;

  private Bodies() {}

  static Pieces pieces(Filaments f, List<CrossSection> sections) {
    int[] order = new int[f.size()];
    for (int i = 0; i < order.length; i++) {
      order[i] = i;
    }
    return new Pieces(f, sections, order);
  }

  /** Every pair on its own, one after the other. */
  static double direct(Filaments f, List<CrossSection> sections) {
    Pieces p = pieces(f, sections);
    Distances d = new Distances(sections, Mirror.NONE);
    return HENRY_A_MM * new PairSum(p, p, Mirror.NONE, d).within(0, p.size);
  }

  static double direct(Filaments f, Filaments g, List<CrossSection> sections, Mirror mirror) {
    Pieces p = pieces(f, sections);
    Pieces q = pieces(g, sections);
    PairSum pairs = new PairSum(p, q, mirror, new Distances(sections, mirror));
    return HENRY_A_MM * pairs.block(0, p.size, 0, q.size);
  }

  static double direct(Filaments f, Filaments g, List<CrossSection> sections) {
    return direct(f, g, sections, Mirror.NONE);
  }

  /** The same by clusters. */
  static double clustered(Filaments f, List<CrossSection> sections) {
    Sums sums = new Sums();
    Clusters c = new Clusters(f, sections);
    sums.add(c, c, Mirror.NONE, new Distances(sections, Mirror.NONE));
    return HENRY_A_MM * sums.run()[0];
  }

  static double clustered(Filaments f, Filaments g, List<CrossSection> sections, Mirror mirror) {
    Sums sums = new Sums();
    sums.add(
        new Clusters(f, sections),
        new Clusters(g, sections),
        mirror,
        new Distances(sections, mirror));
    return HENRY_A_MM * sums.run()[0];
  }

  /** Straight sides from point to point, each cut into pieces no longer than {@code longest}. */
  static Filaments polyline(double longest, int section, double... xy) {
    Filaments out = new Filaments();
    for (int i = 0; i + 3 < xy.length; i += 2) {
      double dx = xy[i + 2] - xy[i];
      double dy = xy[i + 3] - xy[i + 1];
      int n = (int) Math.max(1, Math.ceil(Math.hypot(dx, dy) / longest));
      for (int k = 0; k < n; k++) {
        double s = (double) k / n;
        double t = (k + 1.0) / n;
        out.add(xy[i] + s * dx, xy[i + 1] + s * dy, xy[i] + t * dx, xy[i + 1] + t * dy, section, 1);
      }
    }
    return out;
  }

  /** A closed regular polygon with its corners on a circle, counter-clockwise. */
  static Filaments polygon(int sides, double radius, double longest, int section) {
    double[] xy = new double[2 * sides + 2];
    for (int i = 0; i <= sides; i++) {
      xy[2 * i] = radius * Math.cos(2 * Math.PI * i / sides);
      xy[2 * i + 1] = radius * Math.sin(2 * Math.PI * i / sides);
    }
    return polyline(longest, section, xy);
  }

  /** A circle by the same flattening as the copper's arcs. */
  static Filaments circle(double radius, double chordError, int section) {
    Filaments out = new Filaments();
    new Flattening(chordError, radius)
        .add(
            etchloom.geometry.Path.circle(etchloom.geometry.Point.ORIGIN, radius), section, 1, out);
    return out;
  }

  static Filaments all(Filaments... some) {
    Filaments out = new Filaments();
    for (Filaments f : some) {
      out.addTurned(f, 0, 1);
    }
    return out;
  }

  static CrossSection thin(double height) {
    return new CrossSection(THIN, THIN, height);
  }
}
