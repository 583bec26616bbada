package etchloom.electric.field;

import java.util.Arrays;
import java.util.List;

/** Amplitudes of the axial field of a magnet array with all its images, at any place. */
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
   * The amplitudes at a place, T, entry i for order 2i + 1.
   *
   * @param heightMm over the board's mid-plane, not on a magnet's face
   */
  public double[] at(double radiusMm, double heightMm) {
    double[] sum = new double[orders];
    int k = 0;
    while (true) {
      double most = add(array.iron().group(array.sheets(), k), radiusMm, heightMm, sum);
      boolean small = k > 0 && most <= MagnetArray.IMAGE_SHARE * largest(sum);
      if (!array.iron().endless() || small || k == MagnetArray.MOST_GROUPS) {
        break;
      }
      k++;
    }
    add(array.iron().tail(array.sheets(), k), radiusMm, heightMm, sum);
    return sum;
  }

  /** Adds a group's part and gives its largest amplitude. */
  private double add(List<ChargeSheet> group, double radiusMm, double heightMm, double[] sum) {
    Arrays.fill(part, 0);
    for (ChargeSheet s : group) {
      double charge = s.charge() * array.remanenceTesla();
      sheet.add(radiusMm, heightMm - s.heightMm(), charge, part);
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
