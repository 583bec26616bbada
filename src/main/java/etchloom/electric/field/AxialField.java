package etchloom.electric.field;

/**
 * The rotor's axial field at the copper of each layer as a sum over odd orders {@code ν = 1, 3, 5,
 * …}: {@code Bz(r, φ) = Σ b(r) cos(ν P (φ − θ))}, θ the rotor's angle, P its pole pairs.
 */
public interface AxialField {
  int polePairs();

  /** How many odd orders are kept; the last is {@code 2 orders() − 1}. */
  int orders();

  /**
   * The amplitudes b, signed, T.
   *
   * @param layer from 1
   * @param radiusMm about the shaft
   * @param out {@code double[orders()]}, entry i for order 2i + 1
   */
  void amplitudes(int layer, double radiusMm, double[] out);

  /** The shortest length over which the field changes on a layer, mm: its distance to a face. */
  double scaleMm(int layer);
}
