package etchloom.rules;

import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The space of random wanderings against every pair of points on them, sampled, with neither tree
 * nor exact distances: written from the rule's text alone.
 */
class SpaceBruteForceTest {
  private static final double STEP = 0.02;

  /** A sampled point; a pad is one point with its radius. */
  private record Dot(Point at, double fat, int conductor, double walk, int joint) {}

  static LongStream seeds() {
    return LongStream.range(0, 40);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void gapsOfAllPairs_againstSampledPairs(long seed) {
    Boards b = wander(new Random(seed));
    Artwork a = b.artwork();
    for (int layer = 1; layer <= 2; layer++) {
      Map<String, Double> sampled = sampled(a, layer);
      Map<String, Double> got = new TreeMap<>();
      new PairSearch(new LayerCopper(a, layer, Boards.SPACE), Boards.SPACE, List.of(collector(got)))
          .run(Boards.SPACE, Boards.SPACE);
      // A sample is never nearer than the copper; no point is further than half a step from one.
      sampled.forEach(
          (pair, gap) ->
              assertTrue(
                  got.getOrDefault(pair, 9.0) <= gap + 1e-9,
                  () -> pair + ": sampled " + gap + ", got " + got.get(pair)));
      got.forEach(
          (pair, gap) ->
              assertTrue(
                  gap >= sampled.getOrDefault(pair, Boards.SPACE) - 1.01 * STEP,
                  () -> pair + ": got " + gap + ", sampled " + sampled.get(pair)));
    }
  }

  private static PairWatch collector(Map<String, Double> got) {
    return new PairWatch() {
      @Override
      public double wantedMm() {
        return Boards.SPACE;
      }

      @Override
      public void see(Close c) {
        String pair = pair(c.p().conductor(), c.p().joint(), c.q().conductor(), c.q().joint());
        got.merge(pair, c.gapMm(), Math::min);
      }
    };
  }

  private static String pair(int c1, int j1, int c2, int j2) {
    String p = c1 >= 0 ? "track " + c1 : "pad " + j1;
    String q = c2 >= 0 ? "track " + c2 : "pad " + j2;
    return p.compareTo(q) <= 0 ? p + ", " + q : q + ", " + p;
  }

  /** Chains of one to three tracks of lines and arcs, with pads between them. */
  private static Boards wander(Random rnd) {
    Boards b = new Boards();
    for (int chain = 0; chain < 4; chain++) {
      Point at = new Point(12 + 14 * rnd.nextDouble(), 14 * rnd.nextDouble() - 7);
      double heading = 7 * rnd.nextDouble();
      int joint = rnd.nextBoolean() ? b.via(at, 0.6, 0.3) : b.bare(1, at);
      int tracks = 1 + rnd.nextInt(3);
      for (int t = 0; t < tracks; t++) {
        List<Segment> path = new ArrayList<>();
        int pieces = 1 + rnd.nextInt(6);
        for (int i = 0; i < pieces; i++) {
          Segment s = piece(rnd, at, heading);
          path.add(s);
          at = s.end();
          heading = s.tangent(1).angleRad() + (rnd.nextInt(4) == 0 ? rnd.nextDouble() - 0.5 : 0);
        }
        int next = rnd.nextBoolean() ? b.via(at, 0.3 + rnd.nextDouble(), 0.3) : b.bare(1, at);
        b.track(1, rnd.nextBoolean() ? 0.2 : 0.35, new Path(path), joint, next, "U", chain + 1);
        joint = next;
      }
    }
    return b;
  }

  private static Segment piece(Random rnd, Point at, double heading) {
    if (rnd.nextInt(3) == 0) {
      return new Line(at, at.plus(Point.polar(0.1 + 3 * rnd.nextDouble(), heading)));
    }
    boolean ccw = rnd.nextBoolean();
    double r = 0.15 + 1.5 * rnd.nextDouble();
    Point centre = at.plus(Point.polar(r, heading + (ccw ? Math.PI / 2 : -Math.PI / 2)));
    double start = at.minus(centre).angleRad();
    double sweep = (ccw ? 1 : -1) * (0.2 + 3 * rnd.nextDouble());
    Point end = centre.plus(Point.polar(r, start + sweep));
    return new Arc(at, end, centre, ccw);
  }

  private static Map<String, Double> sampled(Artwork a, int layer) {
    Map<String, Double> out = new TreeMap<>();
    List<Dot> dots = dots(a, layer);
    for (int i = 0; i < dots.size(); i++) {
      for (int j = i + 1; j < dots.size(); j++) {
        Dot p = dots.get(i);
        Dot q = dots.get(j);
        double gap = p.at().distanceTo(q.at()) - p.fat() - q.fat();
        if (gap < Boards.SPACE) {
          String pair = pair(p.conductor(), p.joint(), q.conductor(), q.joint());
          if (gap < out.getOrDefault(pair, Double.POSITIVE_INFINITY)
              && !neighbours(a, layer, p, q)) {
            out.put(pair, gap);
          }
        }
      }
    }
    return out;
  }

  private static List<Dot> dots(Artwork a, int layer) {
    List<Dot> out = new ArrayList<>();
    for (Joint j : a.padsOn(layer)) {
      out.add(new Dot(j.at(), j.padMm() / 2, -1, 0, j.id()));
    }
    for (Conductor c : a.conductorsOn(layer)) {
      double at = 0;
      List<Segment> path = c.path().segments();
      for (int k = 0; k < path.size(); k++) {
        Segment s = path.get(k);
        int n = (int) Math.ceil(s.lengthMm() / STEP);
        for (int i = 0; i <= n; i++) {
          Point p = s.at(i / (double) n);
          boolean under =
              (k == 0 && under(a.joints().get(c.fromJoint()), c, p))
                  || (k == path.size() - 1 && under(a.joints().get(c.toJoint()), c, p));
          if (!under) {
            out.add(new Dot(p, c.widthMm() / 2, c.id(), at + s.lengthMm() * i / n, -1));
          }
        }
        at += s.lengthMm();
      }
    }
    return out;
  }

  /** Whether the track at this point lies wholly under its joint's pad. */
  private static boolean under(Joint j, Conductor c, Point p) {
    return p.distanceTo(j.at()) + c.widthMm() / 2 <= j.padMm() / 2 - 1e-9;
  }

  private static boolean neighbours(Artwork a, int layer, Dot p, Dot q) {
    double wp = p.joint() >= 0 ? width(a, layer, p, q) : 2 * p.fat();
    double wq = q.joint() >= 0 ? width(a, layer, q, p) : 2 * q.fat();
    double near = Math.PI / 2 * ((wp + wq) / 2 + Boards.SPACE);
    near += p.joint() >= 0 ? p.fat() : 0;
    near += q.joint() >= 0 ? q.fat() : 0;
    double direct =
        p.conductor() >= 0 && p.conductor() == q.conductor()
            ? Math.abs(p.walk() - q.walk())
            : Double.POSITIVE_INFINITY;
    return direct <= near || walk(a, layer, p, q) <= near;
  }

  private static double width(Artwork a, int layer, Dot pad, Dot partner) {
    if (partner.joint() < 0) {
      return 2 * partner.fat();
    }
    return a.conductorsOn(layer).stream()
        .filter(c -> c.fromJoint() == pad.joint() || c.toJoint() == pad.joint())
        .mapToDouble(Conductor::widthMm)
        .min()
        .orElse(0);
  }

  /** Shortest way over joints by trying all chains of tracks. */
  private static double walk(Artwork a, int layer, Dot p, Dot q) {
    double[] fromP = toJoints(a, p);
    double[] fromQ = toJoints(a, q);
    for (int round = 0; round < 4; round++) {
      for (Conductor c : a.conductorsOn(layer)) {
        double l = c.path().lengthMm();
        fromP[c.toJoint()] = Math.min(fromP[c.toJoint()], fromP[c.fromJoint()] + l);
        fromP[c.fromJoint()] = Math.min(fromP[c.fromJoint()], fromP[c.toJoint()] + l);
      }
    }
    double best = Double.POSITIVE_INFINITY;
    for (int j = 0; j < fromP.length; j++) {
      best = Math.min(best, fromP[j] + fromQ[j]);
    }
    return best;
  }

  private static double[] toJoints(Artwork a, Dot d) {
    double[] out = new double[a.joints().size()];
    java.util.Arrays.fill(out, Double.POSITIVE_INFINITY);
    if (d.joint() >= 0) {
      out[d.joint()] = 0;
    } else {
      Conductor c = a.conductors().get(d.conductor());
      out[c.fromJoint()] = d.walk();
      out[c.toJoint()] = Math.min(out[c.toJoint()], c.path().lengthMm() - d.walk());
    }
    return out;
  }
}
