package etchloom.electric.field;

import etchloom.spec.Spec;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Magnets of alternating sign round the shaft, on one or both sides of the board, with their iron.
 * Heights are over the board's mid-plane, L1 up; the magnet at angle 0 has its north face towards
 * L1.
 *
 * @param remanenceTesla at the magnets' temperature
 * @param sheets the magnets' faces, images left out
 */
public record MagnetArray(
    MagnetShape shape,
    int polePairs,
    double remanenceTesla,
    List<ChargeSheet> sheets,
    IronPlanes iron) {
  /**
   * Image groups are added until one changes the field by less than this share; what comes after is
   * then taken together, which leaves less than 1e-5.
   */
  static final double IMAGE_SHARE = 1e-4;

  /** At most so many groups: enough for magnets thirty times as wide as the iron's gap. */
  static final int MOST_GROUPS = 40;

  public MagnetArray {
    sheets = List.copyOf(sheets);
  }

  /**
   * The rotor of a spec that gives magnet and air gap.
   *
   * <p>On a rotor with two sides the magnets facing each other attract: the lower magnet at angle 0
   * has its south face towards the board. Remanence falls linearly with temperature, 20 C the
   * reference.
   *
   * @param boardMm thickness of the board over its copper
   */
  public static MagnetArray of(Spec.Rotor rotor, double boardMm) {
    Spec.Magnet m = rotor.magnet().orElseThrow();
    double face = boardMm / 2 + rotor.airGapMm().orElseThrow();
    double back = face + m.thicknessMm();
    List<ChargeSheet> sheets = new ArrayList<>();
    sheets.add(new ChargeSheet(face, 1));
    sheets.add(new ChargeSheet(back, -1));
    if (rotor.twoSided()) {
      sheets.add(new ChargeSheet(-face, -1));
      sheets.add(new ChargeSheet(-back, 1));
    }
    OptionalDouble above =
        rotor.ironBehindMagnets() ? OptionalDouble.of(back) : OptionalDouble.empty();
    OptionalDouble below = OptionalDouble.empty();
    if (rotor.twoSided()) {
      below = rotor.ironBehindMagnets() ? OptionalDouble.of(-back) : OptionalDouble.empty();
    } else if (rotor.counterPlateGapMm().isPresent()) {
      below = OptionalDouble.of(-boardMm / 2 - rotor.counterPlateGapMm().getAsDouble());
    }
    return new MagnetArray(
        MagnetShape.of(m),
        rotor.poles() / 2,
        remanenceTesla(m),
        sheets,
        new IronPlanes(above, below));
  }

  /** Remanence at the magnet's temperature. */
  public static double remanenceTesla(Spec.Magnet m) {
    return m.remanenceTesla() * (1 + m.remanenceDriftPerKelvin() * (m.temperatureC() - 20));
  }

  /**
   * The axial field at a point outside the magnets, T, by the solid angles of all faces and images.
   *
   * @param x mm, in the rotor's frame
   * @param z mm over the board's mid-plane
   */
  public double axialTesla(double x, double y, double z) {
    double sum = 0;
    int k = 0;
    while (true) {
      double group = axial(iron.group(sheets, k), x, y, z);
      sum += group;
      boolean small = k > 0 && Math.abs(group) <= IMAGE_SHARE * Math.abs(sum);
      if (!iron.endless() || small || k == MOST_GROUPS) {
        break;
      }
      k++;
    }
    sum += axial(iron.tail(sheets, k), x, y, z);
    return remanenceTesla / (4 * Math.PI) * sum;
  }

  private double axial(List<ChargeSheet> group, double x, double y, double z) {
    double sum = 0;
    for (ChargeSheet s : group) {
      sum += s.charge() * solidAngle(x, y, z - s.heightMm());
    }
    return sum;
  }

  /** Solid angles of one sheet's magnets, those of odd poles counted negative. */
  private double solidAngle(double x, double y, double height) {
    double sum = 0;
    for (int k = 0; k < 2 * polePairs; k++) {
      double a = Math.PI * k / polePairs;
      double c = Math.cos(a);
      double s = Math.sin(a);
      double omega = shape.solidAngle(c * x + s * y, c * y - s * x, height);
      sum += k % 2 == 0 ? omega : -omega;
    }
    return sum;
  }

  /**
   * Whether the axial field is the same at any height and its negative: every sheet has one of the
   * other sign on the other side, and so has the iron.
   */
  boolean even() {
    for (ChargeSheet s : sheets) {
      if (!sheets.contains(new ChargeSheet(-s.heightMm(), -s.charge()))) {
        return false;
      }
    }
    OptionalDouble above = iron.aboveMm();
    OptionalDouble below = iron.belowMm();
    return above.isPresent()
        ? below.isPresent() && above.getAsDouble() == -below.getAsDouble()
        : below.isEmpty();
  }

  /** Least distance of a height from the magnets' faces, mm. */
  public double clearanceMm(double heightMm) {
    double least = Double.POSITIVE_INFINITY;
    for (ChargeSheet s : iron.group(sheets, 0)) {
      least = Math.min(least, Math.abs(s.heightMm() - heightMm));
    }
    return least;
  }
}
