package etchloom.proof;

/** Millimetres to the grid of the rebuilt copper. */
final class Nm {
  static final double PER_MM = 1e6;

  private Nm() {}

  static int of(double mm) {
    return (int) Math.rint(mm * PER_MM);
  }
}
