package etchloom.electric.machine.emf;

import etchloom.electric.field.GaussRule;
import etchloom.electric.field.MagnetArray;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;

/**
 * Flux through a closed flat path that may run round many times: rows across it, each point of a
 * row counted as often as the path goes round it.
 */
final class SurfaceFlux {
  private static final double STEP_MM = 0.02;

  private record Crossing(double x, int turn) {}

  private SurfaceFlux() {}

  static double weber(Path closed, MagnetArray magnets, double z, double theta, int rows) {
    List<Point> points = new ArrayList<>();
    for (Segment s : closed.segments()) {
      int n = s.<Integer>match(l -> 1, a -> (int) Math.ceil(a.lengthMm() / STEP_MM));
      for (int i = 0; i < n; i++) {
        points.add(s.at((double) i / n));
      }
    }
    points.add(points.get(0));
    double low = points.stream().mapToDouble(Point::y).min().orElseThrow();
    double high = points.stream().mapToDouble(Point::y).max().orElseThrow();
    double sum = 0;
    for (int i = 0; i < rows; i++) {
      sum += row(points, low + (high - low) * (i + 0.5) / rows, magnets, z, theta);
    }
    return sum * (high - low) / rows * 1e-6;
  }

  private static double row(
      List<Point> points, double y, MagnetArray magnets, double z, double theta) {
    List<Crossing> crossings = new ArrayList<>();
    for (int i = 0; i + 1 < points.size(); i++) {
      Point a = points.get(i);
      Point b = points.get(i + 1);
      if ((a.y() <= y) != (b.y() <= y)) {
        double x = a.x() + (b.x() - a.x()) * (y - a.y()) / (b.y() - a.y());
        crossings.add(new Crossing(x, b.y() > a.y() ? -1 : 1));
      }
    }
    crossings.sort((a, b) -> Double.compare(a.x(), b.x()));
    GaussRule rule = new GaussRule(4);
    double sum = 0;
    int turns = 0;
    for (int i = 0; i + 1 < crossings.size(); i++) {
      turns += crossings.get(i).turn();
      double from = crossings.get(i).x();
      double to = crossings.get(i + 1).x();
      int panels = (int) Math.ceil((to - from) / 0.6);
      if (turns == 0) {
        continue;
      }
      double half = (to - from) / panels / 2;
      for (int k = 0; k < panels; k++) {
        for (int j = 0; j < rule.size(); j++) {
          Point p = new Point(from + half * (2 * k + 1 + rule.node(j)), y).rotated(-theta);
          sum += turns * half * rule.weight(j) * magnets.axialTesla(p.x(), p.y(), z);
        }
      }
    }
    return sum;
  }
}
