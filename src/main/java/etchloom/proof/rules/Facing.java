package etchloom.proof.rules;

import etchloom.geometry.Distance;
import etchloom.geometry.Nearest;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;

/**
 * Where stretches of a boundary face each other: across copper, which gives its width, or across
 * empty space, which gives the gap, within one net or one piece of copper as well.
 *
 * <p>Two points of one ring are neighbours, and do not count, while the way between them along the
 * ring is at most (π/2) times the required width or gap: half-way round the tightest round end, or
 * the tightest bend, that keeps it. So a right-angled corner passes, and one sharper than about 79°
 * does not, as on the drawn centre lines.
 *
 * <p>Exact on the boundary's lines and circles; the midpoint of a pair tells which side it faces.
 * Near linear in the number of pieces.
 */
final class Facing {
  /** Places looked at beyond what is required, so that the least of what is kept is known too. */
  private static final double REACH = 3;

  private static final double FINEST_MM = 2e-7;
  private static final int MOST_CUTS = 2000;

  /** Below this the midpoint of two points is no help. */
  private static final double TOUCHING_MM = 2e-5;

  /**
   * @param gap across empty space, else across copper
   * @param first a piece of the outline
   */
  record Close(boolean gap, double mm, Point at, int first, int second) {}

  private final Outline outline;
  private final double trackMm;
  private final double spaceMm;
  private final List<Close> broken = new ArrayList<>();
  private final Close[] least = new Close[2];

  /**
   * @param trackMm least width of copper; 0 when it is of no interest
   * @param spaceMm least gap
   */
  Facing(Outline outline, double trackMm, double spaceMm) {
    this.outline = outline;
    this.trackMm = trackMm;
    this.spaceMm = spaceMm;
    double most = Math.max(trackMm, spaceMm);
    outline.tree().pairs(REACH * most, this::visit);
  }

  /** All places narrower than required. */
  List<Close> broken() {
    return broken;
  }

  /** The narrowest gap, or the narrowest width, or null when there is none in reach. */
  Close least(boolean gap) {
    return least[gap ? 1 : 0];
  }

  private double required(boolean gap) {
    return gap ? spaceMm : trackMm;
  }

  private double visit(int i, int j, double limit) {
    Nearest n = Distance.between(outline.pieces.get(i), outline.pieces.get(j));
    if (n.distanceMm() > limit) {
      return limit;
    }
    int r = outline.ring.get(i);
    if (r != outline.ring.get(j)) {
      keep(!outline.covers(n.middle()), n, i, j);
      return wanted();
    }
    double s = outline.walkTo(i, n.onFirst());
    double t = outline.walkTo(j, n.onSecond());
    boolean gap = gap(r, n, s, t);
    if (required(gap) == 0) {
      return wanted();
    }
    if (outline.apart(r, s, t) > neighboursMm(gap, n)) {
      keep(gap, n, i, j);
    } else {
      if (n.distanceMm() >= required(gap)) {
        elsewhere(i, j, gap);
      }
      if (!plain(r, i, j, s, t, gap)) {
        around(i, j, gap);
      }
    }
    return wanted();
  }

  /** Of sides that run along each other, the nearest points may be those at the round end. */
  private void elsewhere(int i, int j, boolean gap) {
    for (double share : new double[] {0, 0.5, 1}) {
      elsewhere(i, j, share, gap);
      elsewhere(j, i, share, gap);
    }
  }

  private void elsewhere(int i, int j, double share, boolean gap) {
    int r = outline.ring.get(i);
    Nearest n = Distance.between(outline.pieces.get(i).at(share), outline.pieces.get(j));
    double s = outline.walkTo(i, n.onFirst());
    double t = outline.walkTo(j, n.onSecond());
    if (outline.apart(r, s, t) > neighboursMm(gap, n)
        && outline.covers(n.middle()) != gap
        && n.distanceMm() < wanted()) {
      keep(gap, n, i, j);
    }
  }

  /** Round a bend wider than required, what faces each other is as far as its own diameter. */
  private double neighboursMm(boolean gap, Nearest n) {
    return Math.max(reach(gap), Math.PI / 2 * n.distanceMm() * 1.001);
  }

  private double reach(boolean gap) {
    return Math.PI / 2 * required(gap) + 1e-9;
  }

  /** What the two points face; of touching ones, what points a little farther on do. */
  private boolean gap(int r, Nearest n, double s, double t) {
    if (n.distanceMm() > TOUCHING_MM) {
      return !outline.covers(n.middle());
    }
    double low = Math.min(s, t);
    double high = Math.max(s, t);
    double step = Math.max(trackMm, spaceMm) / 2;
    boolean within = high - low <= outline.ringLength[r] / 2;
    Point p = outline.at(r, within ? low - step : low + step);
    Point q = outline.at(r, within ? high + step : high - step);
    return !outline.covers(p.plus(q).times(0.5));
  }

  /** Whether two long pieces meet in a corner so blunt that nothing near it is too narrow. */
  private boolean plain(int r, int i, int j, double s, double t, boolean gap) {
    double arm = reach(gap) / 2;
    if (outline.apart(r, s, t) > 1e-6
        || outline.pieces.get(i).lengthMm() < 2 * arm
        || outline.pieces.get(j).lengthMm() < 2 * arm) {
      return false;
    }
    Point p = outline.at(r, s - arm);
    Point q = outline.at(r, s + arm);
    return p.distanceTo(q) > 1.1 * required(gap);
  }

  private void keep(boolean gap, Nearest n, int i, int j) {
    double required = required(gap);
    if (required == 0) {
      return;
    }
    Close c = new Close(gap, n.distanceMm(), n.middle(), i, j);
    int k = gap ? 1 : 0;
    if (least[k] == null || before(c, least[k])) {
      least[k] = c;
    }
    if (c.mm() < required - Measures.SLACK_MM) {
      broken.add(c);
    }
  }

  /** In steps of a nanometre, so that equal places come in a fixed order. */
  private static boolean before(Close a, Close b) {
    long x = Math.round(a.mm() * 1e6);
    long y = Math.round(b.mm() * 1e6);
    return x != y
        ? x < y
        : a.at().x() != b.at().x() ? a.at().x() < b.at().x() : a.at().y() < b.at().y();
  }

  private double wanted() {
    double most = Math.max(trackMm, spaceMm);
    double reach = most;
    for (int k = 0; k < 2; k++) {
      if (required(k == 1) > 0) {
        reach = least[k] == null ? REACH * most : Math.max(reach, least[k].mm());
        if (least[k] == null) {
          return reach;
        }
      }
    }
    return reach + 1e-9;
  }

  private record Part(Segment shape, double from, double to) {
    Part half(boolean upper) {
      double mid = (from + to) / 2;
      return upper
          ? new Part(shape.part(0.5, 1), mid, to)
          : new Part(shape.part(0, 0.5), from, mid);
    }

    double lengthMm() {
      return to - from;
    }
  }

  private record Pair(Part a, Part b, Nearest n) {}

  private Part part(int i) {
    Segment s = outline.pieces.get(i);
    double w = outline.walk.get(i);
    return new Part(s, w, w + s.lengthMm());
  }

  /** Looks for the narrowest place of a pair that is beyond its neighbours, if it is too narrow. */
  private void around(int i, int j, boolean gap) {
    int r = outline.ring.get(i);
    double near = reach(gap);
    double bound = required(gap) - Measures.SLACK_MM;
    Deque<Pair> open = new ArrayDeque<>();
    add(open, part(i), part(j));
    Nearest best = null;
    int cuts = 0;
    while (!open.isEmpty()) {
      Pair p = open.remove();
      if (p.n().distanceMm() >= bound || farthest(r, p) <= near) {
        continue;
      }
      double s = p.a().from() + p.a().lengthMm() * Outline.share(p.a().shape(), p.n().onFirst());
      double t = p.b().from() + p.b().lengthMm() * Outline.share(p.b().shape(), p.n().onSecond());
      if (outline.apart(r, s, t) > near) {
        if (outline.covers(p.n().middle()) != gap) {
          best = p.n();
          bound = best.distanceMm() - FINEST_MM;
        }
        continue;
      }
      if (p.a().lengthMm() + p.b().lengthMm() <= FINEST_MM || cuts >= MOST_CUTS) {
        continue;
      }
      cuts++;
      boolean cutFirst = p.a().lengthMm() >= p.b().lengthMm();
      for (boolean upper : new boolean[] {false, true}) {
        add(open, cutFirst ? p.a().half(upper) : p.a(), cutFirst ? p.b() : p.b().half(upper));
      }
    }
    if (best != null) {
      keep(gap, best, i, j);
    }
  }

  private static void add(Deque<Pair> open, Part a, Part b) {
    open.add(new Pair(a, b, Distance.between(a.shape(), b.shape())));
  }

  /** An upper bound for the way between any two points of a pair. */
  private double farthest(int r, Pair p) {
    double up = Math.max(p.a().to(), p.b().to()) - Math.min(p.a().from(), p.b().from());
    double round = outline.ringLength[r] - Math.max(0, gapBetween(p));
    return Math.min(up, Math.max(round, 0));
  }

  private static double gapBetween(Pair p) {
    return Math.max(p.a().from() - p.b().to(), p.b().from() - p.a().to());
  }
}
