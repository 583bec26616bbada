package etchloom.electric.field;

import java.util.Arrays;
import java.util.List;
import java.util.function.Predicate;

/** Amplitudes of the field of a magnet array with all its images, at any place. */
public final class FieldHarmonics {
  /** Orders end where the space between magnet and copper has taken this much of them. */
  private static final double FAINT = 1e-4;

  private static final int LEAST_ORDERS = 7;
  private static final int MOST_ORDERS = 100;

  private final MagnetArray array;
  private final int orders;
  private final SheetHarmonics sheet;
  private final double[] part;

  public FieldHarmonics(MagnetArray array, int orders) {
    this.array = array;
    this.orders = orders;
    sheet = new SheetHarmonics(array.shape(), array.polePairs(), orders);
    part = new double[orders];
  }

  /**
   * How many odd orders matter at a height: a field of order ν falls as {@code e^(−ν P d / r)} over
   * the distance d from the magnets. At least 7, at most 100.
   */
  public static int ordersFor(MagnetArray array, double clearanceMm) {
    double highest = -Math.log(FAINT) * array.shape().outerMm() / (array.polePairs() * clearanceMm);
    return (int) Math.max(LEAST_ORDERS, Math.min(MOST_ORDERS, Math.ceil((highest + 1) / 2)));
  }

  public int orders() {
    return orders;
  }

  /**
   * The axial amplitudes at a place, T, entry i for order 2i + 1.
   *
   * @param heightMm over the board's mid-plane, not on a magnet's face
   */
  public double[] at(double radiusMm, double heightMm) {
    return sum(radiusMm, heightMm, false, s -> true);
  }

  /** The amplitudes of the field along the radius, outwards, T. */
  public double[] radialAt(double radiusMm, double heightMm) {
    return sum(radiusMm, heightMm, true, s -> true);
  }

  /** The axial part of some sheets, T. */
  double[] at(double radiusMm, double heightMm, List<ChargeSheet> some) {
    double[] sum = new double[orders];
    add(some, radiusMm, heightMm, false, sum);
    return sum;
  }

  /** The axial part of all sheets and images but some, T; no tail may be among those. */
  double[] rest(double radiusMm, double heightMm, Predicate<ChargeSheet> which) {
    return sum(radiusMm, heightMm, false, which);
  }

  private double[] sum(
      double radiusMm, double heightMm, boolean radial, Predicate<ChargeSheet> which) {
    double[] sum = new double[orders];
    IronPlanes iron = array.iron();
    int k = 0;
    while (true) {
      List<ChargeSheet> group = iron.group(array.sheets(), k);
      List<ChargeSheet> some = group.stream().filter(which).toList();
      double most = add(some, radiusMm, heightMm, radial, sum);
      // Only whole groups add up to nought and so fall fast enough to be judged by.
      boolean whole = k > 0 && some.size() == group.size();
      boolean small = whole && most <= MagnetArray.IMAGE_SHARE * largest(sum);
      if (!iron.endless() || small || k == MagnetArray.MOST_GROUPS) {
        break;
      }
      k++;
    }
    add(iron.tail(array.sheets(), k), radiusMm, heightMm, radial, sum);
    return sum;
  }

  /** Adds a group's part and gives its largest amplitude. */
  private double add(
      List<ChargeSheet> group, double radiusMm, double heightMm, boolean radial, double[] sum) {
    Arrays.fill(part, 0);
    for (ChargeSheet s : group) {
      double charge = s.charge() * array.remanenceTesla();
      double over = heightMm - s.heightMm();
      if (radial) {
        sheet.addRadial(radiusMm, over, charge, part);
      } else {
        sheet.add(radiusMm, over, charge, part);
      }
    }
    for (int i = 0; i < orders; i++) {
      sum[i] += part[i];
    }
    return largest(part);
  }

  private static double largest(double[] a) {
    double most = 0;
    for (double v : a) {
      most = Math.max(most, Math.abs(v));
    }
    return most;
  }
}
