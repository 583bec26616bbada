package etchloom.proof.copper;

import etchloom.geometry.Point;
import etchloom.proof.plane.Figure;

/**
 * Where a long narrow hole in the copper has its two ends: at the bridge that closed the gap
 * between two turns.
 *
 * <p>At an end, the two walls of the gap lie opposite each other for the whole way round. The ring
 * is sampled evenly, and the sample is taken about which the walls fit best; of a hole that is not
 * long and narrow this gives some point of its rim.
 */
final class Fold {
  private static final int SAMPLES = 240;

  private Fold() {}

  /** The middle between the two ends, mm. */
  static Point place(Figure f, int ring) {
    Point[] p = sample(f, ring);
    int best = 0;
    double bestSum = Double.POSITIVE_INFINITY;
    for (int i = 0; i < SAMPLES / 2; i++) {
      double sum = 0;
      for (int k = 1; k < SAMPLES / 2; k++) {
        sum += p[(i + k) % SAMPLES].distanceTo(p[(i - k + SAMPLES) % SAMPLES]);
      }
      if (sum < bestSum) {
        bestSum = sum;
        best = i;
      }
    }
    return p[best].plus(p[best + SAMPLES / 2]).times(0.5);
  }

  private static Point[] sample(Figure f, int ring) {
    int first = f.firstEdge(ring);
    double length = 0;
    int e = first;
    do {
      length += length(f, e);
      e = f.next(e);
    } while (e != first);
    Point[] out = new Point[SAMPLES];
    double at = 0;
    int n = 0;
    do {
      double l = length(f, e);
      while (n < SAMPLES && n * length / SAMPLES <= at + l) {
        double t = l == 0 ? 0 : (n * length / SAMPLES - at) / l;
        out[n++] =
            Place.mm(
                f.fromX(e) + t * ((double) f.toX(e) - f.fromX(e)),
                f.fromY(e) + t * ((double) f.toY(e) - f.fromY(e)));
      }
      at += l;
      e = f.next(e);
    } while (e != first);
    while (n < SAMPLES) {
      out[n++] = Place.mm(f.fromX(first), f.fromY(first));
    }
    return out;
  }

  private static double length(Figure f, int e) {
    return Math.hypot((double) f.toX(e) - f.fromX(e), (double) f.toY(e) - f.fromY(e));
  }
}
