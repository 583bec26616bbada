package etchloom.electric.field;

/**
 * The rotor's field along the radius, outwards, at any height: {@code Br(r, φ, z) = Σ b(r, z) cos(ν
 * P (φ − θ))} over the same orders as {@link AxialField}.
 */
public interface RadialField {
  /**
   * The amplitudes, signed, T.
   *
   * @param heightMm over the board's mid-plane, not on a magnet's face
   * @param out {@code double[orders]}, entry i for order 2i + 1
   */
  void radialAmplitudes(double radiusMm, double heightMm, double[] out);
}
