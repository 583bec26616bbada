package etchloom.rules;

/**
 * How near two pieces of one track can come to each other by its own bends, from no more than how
 * long it is and how far it turns.
 *
 * <p>Seen in the direction half-way between its extreme ones, a run of length l that turns by t
 * advances by at least l·cos(t/2). With u along the first piece and v along the second, both
 * counted from where they face each other, l and t are linear in u and v, so that ln(l·cos(t/2)) is
 * concave and the bound is least at a corner of what u and v may be: 0 up to the pieces' lengths,
 * and far enough apart to be no neighbours.
 */
final class Run {
  private final double lengthMm;
  private final double turnRad;
  private final double firstMm;
  private final double secondMm;
  private final double firstRad;
  private final double secondRad;
  private double least = Double.POSITIVE_INFINITY;

  private Run(Piece p, Piece q) {
    lengthMm = Math.max(0, q.fromMm() - p.toMm());
    turnRad = Math.max(0, q.turnFromRad() - p.turnToRad());
    firstMm = p.lengthMm();
    secondMm = q.lengthMm();
    firstRad = p.turnToRad() - p.turnFromRad();
    secondRad = q.turnToRad() - q.turnFromRad();
  }

  /**
   * A lower bound, mm, on the distance of points that are more than {@code near} apart along the
   * track; infinite where there are none; 0 for pieces of different tracks, pads, and where the
   * bound says nothing.
   */
  static double leastMm(Piece p, Piece q, double near) {
    if (p.isPad() || p.conductor() != q.conductor()) {
      return 0;
    }
    boolean forward = p.fromMm() <= q.fromMm();
    Run run = forward ? new Run(p, q) : new Run(q, p);
    return run.least(near - run.lengthMm);
  }

  private double least(double apartMm) {
    if (firstMm + secondMm < apartMm) {
      return Double.POSITIVE_INFINITY;
    }
    corner(firstMm, secondMm);
    if (apartMm <= 0) {
      corner(0, 0);
      corner(firstMm, 0);
      corner(0, secondMm);
    } else {
      double u = Math.min(firstMm, apartMm);
      corner(u, apartMm - u);
      corner(firstMm, Math.max(0, apartMm - firstMm));
      double v = Math.min(secondMm, apartMm);
      corner(apartMm - v, v);
      corner(Math.max(0, apartMm - secondMm), secondMm);
    }
    return least;
  }

  private void corner(double u, double v) {
    double turn =
        turnRad
            + (firstMm > 0 ? firstRad * u / firstMm : firstRad)
            + (secondMm > 0 ? secondRad * v / secondMm : secondRad);
    double l = lengthMm + u + v;
    least = Math.min(least, turn < Math.PI ? l * Math.cos(turn / 2) : 0);
  }
}
