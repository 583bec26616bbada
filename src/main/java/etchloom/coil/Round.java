package etchloom.coil;

import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;
import java.util.Optional;

/**
 * Round coils: half-turns that step by half a pitch. The outer halves all have one centre, the
 * inner halves another, half a pitch beside it, so that the gap is even all round.
 */
final class Round implements OvalTurns {
  private final CoilSize size;
  private final int count;
  private final Point centre;
  private final Point innerCentre;

  private Round(CoilSize size, int count) {
    this.size = size;
    this.count = count;
    centre = new Point(size.outerRadiusMm() - size.trackMm() / 2 - radius(0), 0);
    innerCentre = centre.plus(new Point(0, size.pitchMm() / 2));
  }

  static Optional<CoilPlan> draw(CoilSize size, int count) {
    Round r = new Round(size, count);
    return r.inner(count - 1).radiusMm() > size.leastCornerMm()
        ? OvalSpiral.plan(size, r)
        : Optional.empty();
  }

  /** How much the coil is too wide for its sector. */
  static double overhangMm(CoilSize size) {
    Round r = new Round(size, 1);
    double half = r.radius(0) + size.pitchMm() / 2;
    return 2 * (half - r.centre.x() * Math.sin(size.halfSpanRad()));
  }

  /**
   * The inner half-turns are smaller by half a pitch; together they reach from radius to radius.
   */
  private double radius(int turn) {
    double over = (size.outerRadiusMm() - size.innerRadiusMm() - size.trackMm()) / 2;
    return over + size.pitchMm() / 4 - turn * size.pitchMm();
  }

  private Bend outer(int turn) {
    return new Bend(centre, radius(turn));
  }

  private Bend inner(int turn) {
    return new Bend(innerCentre, radius(turn) - size.pitchMm() / 2);
  }

  @Override
  public int count() {
    return count;
  }

  @Override
  public Bend startRight() {
    return outer(0);
  }

  @Override
  public Bend startLeft() {
    return outer(0);
  }

  @Override
  public void turn(int i, boolean whole, PathBuilder path) {
    // In quarters: the ends of a half-turn say little of its centre, and files may round them.
    if (path.at().y() < 0) {
      outer(i).to(outer(i).outer(), path);
    }
    outer(i).to(outer(i).left(), path);
    inner(i).to(inner(i).inner(), path);
    if (whole) {
      inner(i).to(outer(i + 1).right(), path);
    }
  }

  @Override
  public Bend exitInner() {
    return inner(count - 1);
  }

  @Override
  public Bend exitOuter() {
    return outer(count);
  }

  @Override
  public double middleMm() {
    return centre.x();
  }
}
