package etchloom.testing;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The least gap between copper of a layer by points set close along every centre line: slow, plain,
 * and independent of the rule check. A gap is overstated by at most step²/(8·gap to centre lines).
 */
public final class SampledGap {
  private static final double STEP_MM = 0.05;
  private static final double LEAST_CELL_MM = 1.2;

  private SampledGap() {}

  private record Sample(Point at, double half, int conductor, double along, double length) {}

  /** A gap and where it is. */
  public record Gap(double mm, Point at, String what) {}

  /** Points of one conductor within π/2 (width + space) along it count as neighbours. */
  public static Gap least(Artwork art, int layer, double spaceMm) {
    List<Sample> samples = new ArrayList<>();
    for (Conductor c : art.conductorsOn(layer)) {
      double at = 0;
      double whole = c.path().lengthMm();
      for (int k = 0; k < c.path().segments().size(); k++) {
        Segment s = c.path().segments().get(k);
        double half = c.widthMm(k) / 2;
        int n = (int) Math.ceil(s.lengthMm() / STEP_MM);
        for (int i = 0; i <= n; i++) {
          double t = i / (double) n;
          samples.add(new Sample(s.at(t), half, c.id(), at + t * s.lengthMm(), whole));
        }
        at += s.lengthMm();
      }
    }
    double widest =
        art.conductorsOn(layer).stream().mapToDouble(Conductor::widestMm).max().orElse(0);
    double cell = Math.max(LEAST_CELL_MM, widest + spaceMm);
    Map<Long, List<Sample>> cells = new HashMap<>();
    samples.forEach(
        s -> cells.computeIfAbsent(key(s.at(), cell, 0, 0), k -> new ArrayList<>()).add(s));
    Map<Long, List<Joint>> pads = new HashMap<>();
    art.padsOn(layer)
        .forEach(j -> pads.computeIfAbsent(key(j.at(), cell, 0, 0), k -> new ArrayList<>()).add(j));
    Gap best = new Gap(Double.POSITIVE_INFINITY, Point.ORIGIN, "");
    for (Sample s : samples) {
      for (int dx = -1; dx <= 1; dx++) {
        for (int dy = -1; dy <= 1; dy++) {
          for (Sample o : cells.getOrDefault(key(s.at(), cell, dx, dy), List.of())) {
            if (Math.abs(s.at().x() - o.at().x()) - s.half() - o.half() > best.mm()) {
              continue;
            }
            double gap = s.at().distanceTo(o.at()) - s.half() - o.half();
            if (gap < best.mm() && !neighbours(art, s, o, spaceMm)) {
              best = new Gap(gap, s.at(), name(art, s) + " / " + name(art, o));
            }
          }
        }
      }
      for (int dx = -1; dx <= 1; dx++) {
        for (int dy = -1; dy <= 1; dy++) {
          for (Joint j : pads.getOrDefault(key(s.at(), cell, dx, dy), List.of())) {
            double gap = s.at().distanceTo(j.at()) - s.half() - j.padMm() / 2;
            if (gap < best.mm() && !joined(art, s, j, spaceMm)) {
              best = new Gap(gap, s.at(), name(art, s) + " / " + j.what());
            }
          }
        }
      }
    }
    return best;
  }

  private static String name(Artwork art, Sample s) {
    return art.conductors().get(s.conductor()).what().describe(-1);
  }

  private static boolean neighbours(Artwork art, Sample a, Sample b, double spaceMm) {
    double near = Math.PI / 2 * (a.half() + b.half() + spaceMm);
    if (a.conductor() == b.conductor()) {
      return Math.abs(a.along() - b.along()) <= near;
    }
    Conductor ca = art.conductors().get(a.conductor());
    Conductor cb = art.conductors().get(b.conductor());
    for (int ja : new int[] {ca.fromJoint(), ca.toJoint()}) {
      for (int jb : new int[] {cb.fromJoint(), cb.toJoint()}) {
        double da = ja == ca.fromJoint() ? a.along() : a.length() - a.along();
        double db = jb == cb.fromJoint() ? b.along() : b.length() - b.along();
        double pad = art.joints().get(ja).padMm();
        if (ja == jb && da + db <= near + pad) {
          return true;
        }
      }
    }
    return false;
  }

  private static boolean joined(Artwork art, Sample s, Joint j, double spaceMm) {
    Conductor c = art.conductors().get(s.conductor());
    double near = Math.PI / 2 * (2 * s.half() + spaceMm) + j.padMm() / 2;
    return (c.fromJoint() == j.id() && s.along() <= near)
        || (c.toJoint() == j.id() && s.length() - s.along() <= near)
        || reaches(art, c, s, j, near);
  }

  /** A conductor that meets the pad's own conductor at a joint without a pad. */
  private static boolean reaches(Artwork art, Conductor c, Sample s, Joint j, double near) {
    return art.conductorsOn(c.layer()).stream()
        .filter(o -> o.id() != c.id())
        .filter(o -> o.fromJoint() == j.id() || o.toJoint() == j.id())
        .anyMatch(
            o -> {
              int other = o.fromJoint() == j.id() ? o.toJoint() : o.fromJoint();
              double da =
                  c.fromJoint() == other
                      ? s.along()
                      : c.toJoint() == other ? s.length() - s.along() : Double.POSITIVE_INFINITY;
              return da + o.path().lengthMm() <= near;
            });
  }

  private static long key(Point p, double cell, int dx, int dy) {
    long x = (long) Math.floor(p.x() / cell) + dx;
    long y = (long) Math.floor(p.y() / cell) + dy;
    return (x << 32) ^ (y & 0xffffffffL);
  }
}
