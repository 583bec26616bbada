package etchloom.proof.ohm;

import etchloom.geometry.Arc;
import etchloom.geometry.Distance;
import etchloom.geometry.Line;
import etchloom.geometry.Nearest;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.geometry.ShapeTree;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;

/**
 * One layer's strokes as resistors along their centre lines.
 *
 * <p>Discs (pads, and holes that join layers) are nodes. A stroke is tapped once for each time that
 * it runs into a disc, where it is nearest to the disc's centre, and once for each time that it
 * runs into another stroke, where the two centre lines are nearest; what lies between two taps is a
 * resistor of its length over its etched cross-section. Length within a pad counts up to its
 * centre, as for the drawn conductors. Strokes that lie along each other are two resistors side by
 * side; copper drawn twice in the same place counts once.
 */
final class CentreLines {
  private static final double TOUCH_MM = 1e-6;

  /**
   * Two strokes meet where they overlap by more than this: round ends that only graze each other,
   * as rounded to the grid, meet in a neck of a micrometre that carries nothing.
   */
  private static final double GRAZE_MM = 1e-5;

  private static final double MAX_SWEEP = ShapeTree.MAX_SWEEP_RAD - 1e-3;

  /** A stroke touches itself only where the way along it is longer than so many widths. */
  private static final double SELF_WIDTHS = 4;

  private final OhmNetwork net;
  private final double ohmPerSquare;
  private final double undercutMm;
  private final List<Disc> discs = new ArrayList<>();
  private final List<Stroke> strokes = new ArrayList<>();
  private final Set<Segment> drawn = new HashSet<>();

  private record Disc(Point at, double diameterMm, int node) {}

  private record Tap(double walkMm, int node) {}

  private static final class Stroke {
    final double widthMm;
    final List<Segment> pieces = new ArrayList<>();
    final List<Double> walk = new ArrayList<>();
    final List<Tap> taps = new ArrayList<>();
    double lengthMm;

    Stroke(double widthMm) {
      this.widthMm = widthMm;
    }
  }

  /** Two things that touch: of strokes the piece is told, of discs -1. */
  private record Contact(int a, int pieceA, int b, int pieceB, Nearest nearest) {}

  CentreLines(OhmNetwork net, CopperBuild.Layer build) {
    this.net = net;
    this.ohmPerSquare = FileResistance.RESISTIVITY_OHM_MM / build.thicknessMm();
    this.undercutMm = build.undercutMm();
  }

  /** A pad, or a hole's wall; gives its node. */
  int disc(Point at, double diameterMm) {
    int node = net.node();
    discs.add(new Disc(at, diameterMm, node));
    return node;
  }

  void stroke(Path path, double widthMm) {
    Stroke s = new Stroke(widthMm);
    for (Segment p : path.segments()) {
      if (p.lengthMm() > 0 && fresh(p)) {
        split(p, s);
      } else if (!s.pieces.isEmpty()) {
        strokes.add(s);
        s = new Stroke(widthMm);
      }
    }
    if (!s.pieces.isEmpty()) {
      strokes.add(s);
    } else if (path.lengthMm() == 0) {
      disc(path.start(), widthMm);
    }
  }

  private boolean fresh(Segment p) {
    return drawn.add(p) && !drawn.contains(p.reversed());
  }

  private static void split(Segment p, Stroke s) {
    double sweep = p instanceof Arc a ? Math.abs(a.sweepRad()) : 0;
    int n = (int) Math.max(1, Math.ceil(sweep / MAX_SWEEP));
    for (int k = 0; k < n; k++) {
      Segment part = n == 1 ? p : p.part(k / (double) n, (k + 1) / (double) n);
      s.pieces.add(part);
      s.walk.add(s.lengthMm);
      s.lengthMm += part.lengthMm();
    }
  }

  /** Adds all resistors; to be called once, after everything was put in. */
  void connect() {
    for (Stroke s : strokes) {
      s.taps.add(new Tap(0, net.node()));
      s.taps.add(new Tap(s.lengthMm, net.node()));
    }
    join(contacts());
    for (Stroke s : strokes) {
      s.taps.sort(Comparator.comparingDouble(Tap::walkMm));
      double width = s.widthMm - undercutMm;
      if (!(width > 0)) {
        continue; // etched away
      }
      for (int k = 1; k < s.taps.size(); k++) {
        Tap a = s.taps.get(k - 1);
        Tap b = s.taps.get(k);
        net.resistor(a.node(), b.node(), ohmPerSquare * (b.walkMm() - a.walkMm()) / width);
      }
    }
  }

  private List<Contact> contacts() {
    List<Segment> shapes = new ArrayList<>();
    List<int[]> owner = new ArrayList<>();
    List<Double> fat = new ArrayList<>();
    for (int d = 0; d < discs.size(); d++) {
      Point p = discs.get(d).at();
      shapes.add(new Line(p, p));
      owner.add(new int[] {d, -1});
      fat.add(discs.get(d).diameterMm() / 2);
    }
    for (int s = 0; s < strokes.size(); s++) {
      for (int k = 0; k < strokes.get(s).pieces.size(); k++) {
        shapes.add(strokes.get(s).pieces.get(k));
        owner.add(new int[] {s, k});
        fat.add(strokes.get(s).widthMm / 2);
      }
    }
    double[] fats = fat.stream().mapToDouble(f -> f).toArray();
    List<Contact> out = new ArrayList<>();
    new ShapeTree(shapes, fats)
        .pairs(
            TOUCH_MM,
            (i, j, limit) -> {
              Nearest n = Distance.between(shapes.get(i), shapes.get(j));
              int[] a = owner.get(i);
              int[] b = owner.get(j);
              boolean strokes = a[1] >= 0 && b[1] >= 0;
              if (n.distanceMm() - fats[i] - fats[j] <= (strokes ? -GRAZE_MM : TOUCH_MM)) {
                out.add(new Contact(a[0], a[1], b[0], b[1], n));
              }
              return limit;
            });
    return out;
  }

  private record Couple(boolean discFirst, int a, int b) implements Comparable<Couple> {
    @Override
    public int compareTo(Couple o) {
      int c = Boolean.compare(discFirst, o.discFirst);
      c = c != 0 ? c : Integer.compare(a, o.a);
      return c != 0 ? c : Integer.compare(b, o.b);
    }
  }

  private void join(List<Contact> contacts) {
    Map<Couple, List<Contact>> couples = new TreeMap<>();
    for (Contact c : contacts) {
      if (c.pieceA() < 0 && c.pieceB() < 0) {
        net.join(discs.get(c.a()).node(), discs.get(c.b()).node());
      } else if (c.pieceA() < 0) {
        couples.computeIfAbsent(new Couple(true, c.a(), c.b()), k -> new ArrayList<>()).add(c);
      } else if (c.a() != c.b() || apart(strokes.get(c.a()), c)) {
        couples.computeIfAbsent(new Couple(false, c.a(), c.b()), k -> new ArrayList<>()).add(c);
      }
    }
    couples.forEach(
        (couple, list) -> {
          for (Contact c : runs(list)) {
            if (couple.discFirst()) {
              tap(c.b(), c.pieceB(), c.nearest().onSecond(), discs.get(c.a()).node());
            } else {
              int node = net.node();
              tap(c.a(), c.pieceA(), c.nearest().onFirst(), node);
              tap(c.b(), c.pieceB(), c.nearest().onSecond(), node);
            }
          }
        });
  }

  private static boolean apart(Stroke s, Contact c) {
    double a = walk(s, c.pieceA(), c.nearest().onFirst());
    double b = walk(s, c.pieceB(), c.nearest().onSecond());
    return Math.abs(c.pieceA() - c.pieceB()) > 1 && Math.abs(a - b) > SELF_WIDTHS * s.widthMm;
  }

  /** One contact for each unbroken run of pieces, where the two are nearest. */
  private static List<Contact> runs(List<Contact> list) {
    List<Contact> sorted = new ArrayList<>(list);
    sorted.sort(Comparator.comparingInt(Contact::pieceB).thenComparingInt(Contact::pieceA));
    List<List<Contact>> runs = new ArrayList<>();
    for (Contact c : sorted) {
      List<Contact> home = null;
      for (List<Contact> run : runs) {
        if (run.stream().anyMatch(o -> beside(o, c))) {
          if (home == null) {
            home = run;
            run.add(c);
          } else {
            home.addAll(run);
            run.clear();
          }
        }
      }
      if (home == null) {
        runs.add(new ArrayList<>(List.of(c)));
      }
      runs.removeIf(List::isEmpty);
    }
    return runs.stream()
        .map(
            r ->
                r.stream()
                    .min(Comparator.comparingDouble(c -> c.nearest().distanceMm()))
                    .orElseThrow())
        .toList();
  }

  private static boolean beside(Contact a, Contact b) {
    return Math.abs(a.pieceA() - b.pieceA()) <= 1 && Math.abs(a.pieceB() - b.pieceB()) <= 1;
  }

  private void tap(int stroke, int piece, Point at, int node) {
    Stroke s = strokes.get(stroke);
    s.taps.add(new Tap(walk(s, piece, at), node));
  }

  private static double walk(Stroke s, int piece, Point at) {
    Segment p = s.pieces.get(piece);
    double share =
        p.match(
            l -> at.distanceTo(l.start()) / l.lengthMm(),
            a -> {
              Point u = a.start().minus(a.centre());
              Point v = at.minus(a.centre());
              return Math.atan2(u.cross(v), u.dot(v)) / a.sweepRad();
            });
    return s.walk.get(piece) + p.lengthMm() * Math.max(0, Math.min(1, share));
  }
}
