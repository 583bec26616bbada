package etchloom.electric.machine.emf;

import etchloom.electric.field.AxialField;
import etchloom.electric.field.GaussRule;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.function.IntToDoubleFunction;

/**
 * Integrates the axial field along flat paths: {@code dλ/dθ = ∮ r Bz dr}, lines and arcs exact.
 *
 * <p>Each piece is cut into panels no longer than a share of the field's own scale on that layer
 * and summed by Gauss's rule; halving the panels moves the fundamental by less than 1e-6 (a test
 * holds it below 1e-5).
 */
final class PathIntegrator {
  /** Longest panel as a share of the least length over which the field changes. */
  static final double PANEL = 0.8;

  private static final int MOST_PANELS = 2000;

  /** Arcs whose centre is this near to the shaft, mm, run along the turning: dr = 0. */
  private static final double CENTRED_MM = 1e-9;

  private static final double WEBER = 1e-6;

  private final AxialField field;
  private final double panel;
  private final GaussRule rule = new GaussRule(4);
  private final double[] b;
  private double[] re;
  private double[] im;
  private double[] squares;
  private double counts;

  PathIntegrator(AxialField field, double panel) {
    this.field = field;
    this.panel = panel;
    b = new double[field.orders()];
  }

  TrackIntegral along(int layer, Path path) {
    return along(layer, path, k -> 1);
  }

  /**
   * @param share by which the square of the field counts on a segment
   */
  TrackIntegral along(int layer, Path path, IntToDoubleFunction share) {
    int n = field.orders();
    re = new double[n];
    im = new double[n];
    squares = new double[n];
    for (int k = 0; k < path.segments().size(); k++) {
      Segment s = path.segments().get(k);
      counts = share.applyAsDouble(k);
      if (s.<Boolean>match(l -> false, a -> a.centre().norm() < CENTRED_MM)) {
        field.amplitudes(layer, s.start().norm(), b);
        addSquares(s.lengthMm());
      } else {
        add(layer, s);
      }
    }
    return new TrackIntegral(re, im, squares);
  }

  private void add(int layer, Segment s) {
    double length = s.lengthMm();
    double step = panel * field.scaleMm(layer);
    int panels = (int) Math.min(MOST_PANELS, Math.max(1, Math.ceil(length / step)));
    for (int k = 0; k < panels; k++) {
      for (int j = 0; j < rule.size(); j++) {
        double t = (k + 0.5 + 0.5 * rule.node(j)) / panels;
        double weight = 0.5 * rule.weight(j) * length / panels;
        Point p = s.at(t);
        double outwards = p.dot(s.tangent(t));
        field.amplitudes(layer, p.norm(), b);
        addSquares(weight);
        addFlux(p.angleRad(), outwards * weight * WEBER);
      }
    }
  }

  private void addSquares(double lengthMm) {
    for (int i = 0; i < b.length; i++) {
      squares[i] += b[i] * b[i] * lengthMm * counts;
    }
  }

  private void addFlux(double angleRad, double rDr) {
    double x = field.polePairs() * angleRad;
    double c = Math.cos(x);
    double s = Math.sin(x);
    double c2 = c * c - s * s;
    double s2 = 2 * c * s;
    for (int i = 0; i < b.length; i++) {
      re[i] += b[i] * c * rDr;
      im[i] += b[i] * s * rDr;
      double next = c * c2 - s * s2;
      s = s * c2 + c * s2;
      c = next;
    }
  }
}
