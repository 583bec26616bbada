package etchloom.proof.copper;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.plane.Figure;
import java.lang.management.ManagementFactory;
import java.util.ArrayList;
import java.util.List;

/**
 * Times the rebuilding of copper: {@code CopperBenchmark [chains|singles] LAYERS COILS TURNS …}. A
 * plain main, no test. CPU time of the whole process, start-up included, is printed last.
 */
public final class CopperBenchmark {
  private CopperBenchmark() {}

  public static void main(String[] args) {
    boolean chains = args.length == 0 || args[0].equals("chains");
    int layers = args.length > 1 ? Integer.parseInt(args[1]) : 4;
    int coils = args.length > 2 ? Integer.parseInt(args[2]) : 9;
    int turns = args.length > 3 ? Integer.parseInt(args[3]) : 15;
    for (int layer = 0; layer < layers; layer++) {
      List<DrawnObject> objects = wheel(coils, turns, chains);
      long t0 = System.nanoTime();
      Figure f = new CopperBuilder().build(objects);
      long t1 = System.nanoTime();
      int segments = coils * turns * 4;
      System.out.printf(
          "%d segments, %d boundary edges, %d islands, %d rings, %.4f mm2: %.0f ms%n",
          segments, f.edges(), f.islands(), f.rings(), f.areaMm2(), (t1 - t0) * 1e-6);
    }
    var os =
        (com.sun.management.OperatingSystemMXBean) ManagementFactory.getOperatingSystemMXBean();
    System.out.printf("CPU of the process: %.3f s%n", os.getProcessCpuTime() * 1e-9);
  }

  /** Wedge-like spirals side by side round the shaft: two lines and two arcs a turn. */
  static List<DrawnObject> wheel(int coils, int turns, boolean chains) {
    List<DrawnObject> out = new ArrayList<>();
    double pitch = 0.4;
    double inner = 12.0 * coils * turns / 135;
    double alpha = Math.PI / coils;
    double outer = Math.max(2.5 * inner, 1.2 * (turns + 2) * pitch / Math.sin(alpha));
    for (int c = 0; c < coils; c++) {
      double axis = 2 * Math.PI * c / coils;
      List<Segment> path = spiral(turns, pitch, inner, outer, alpha);
      List<Segment> turned = path.stream().map(s -> s.rotated(axis)).toList();
      ApertureShape pen = new ApertureShape.Circle(0.2, 0);
      if (chains) {
        out.add(new DrawnObject.Stroke(joined(turned), pen, true, Attributes.NONE, 1));
      } else {
        for (Segment s : turned) {
          out.add(new DrawnObject.Stroke(Path.of(s), pen, true, Attributes.NONE, 1));
        }
      }
      for (Point p : List.of(turned.get(0).start(), turned.get(turned.size() - 1).end())) {
        out.add(
            new DrawnObject.Flash(
                p, new ApertureShape.Circle(0.6, 0), 11, true, Attributes.NONE, 1));
      }
    }
    return out;
  }

  private static Path joined(List<Segment> segments) {
    List<Segment> out = new ArrayList<>();
    Point at = segments.get(0).start();
    for (Segment s : segments) {
      Point from = at;
      at = s.end();
      out.add(
          s.match(
              l -> (Segment) new Line(from, l.end()),
              a -> (Segment) new Arc(from, a.end(), a.centre(), a.counterClockwise())));
    }
    return new Path(out);
  }

  private static List<Segment> spiral(
      int turns, double pitch, double inner, double outer, double alpha) {
    List<Segment> out = new ArrayList<>();
    Point at = null;
    for (int i = 0; i < turns; i++) {
      double d = 0.2 + i * pitch;
      double ro = outer - i * pitch;
      double ri = inner + i * pitch;
      Point ol = Point.polar(ro, alpha - Math.asin(d / ro));
      if (at != null) {
        out.add(new Arc(at, ol, Point.ORIGIN, true));
      }
      boolean hairpin = ri * Math.sin(alpha) <= d * 1.01;
      double across = hairpin ? 0 : alpha - Math.asin(d / ri);
      double r = hairpin ? d / Math.sin(alpha) : ri;
      Point il = Point.polar(r, across);
      Point ir = Point.polar(r, -across);
      out.add(new Line(ol, il));
      if (!hairpin) {
        out.add(new Arc(il, ir, Point.ORIGIN, false));
      }
      at = Point.polar(ro - pitch, -alpha + Math.asin(d / (ro - pitch)));
      out.add(new Line(ir, at));
    }
    return out;
  }
}
