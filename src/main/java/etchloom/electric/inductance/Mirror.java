package etchloom.electric.inductance;

/**
 * Where an image stands: every height z becomes {@code sign z + shift}. Currents along the board
 * keep their direction in an image behind ideal iron.
 *
 * @param sign +1 or -1
 */
record Mirror(int sign, double shiftMm) {
  /** The thing itself. */
  static final Mirror NONE = new Mirror(1, 0);

  double heightMm(double z) {
    return sign * z + shiftMm;
  }
}
