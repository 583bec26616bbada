package etchloom.electric.field;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Ideal endless iron above and below, as images: a plane of iron keeps the field normal to it, so
 * that each charge has an image of the other sign. Between two planes the images go on for ever, in
 * groups that stand further and further off.
 *
 * @param aboveMm height of the iron above the board, if any
 * @param belowMm height of the iron below the board, if any
 */
public record IronPlanes(OptionalDouble aboveMm, OptionalDouble belowMm) {
  public static final IronPlanes NONE =
      new IronPlanes(OptionalDouble.empty(), OptionalDouble.empty());

  /** Charges closer than this stand on the iron itself, where charge and image cancel. */
  private static final double SAME_MM = 1e-9;

  /** Whether there are groups after the first. */
  public boolean endless() {
    return aboveMm.isPresent() && belowMm.isPresent();
  }

  /**
   * The charges of a group: group 0 holds the sources and their nearest images; from group 1 on
   * each holds what comes next on both sides, and its charges add up to nought.
   */
  public List<ChargeSheet> group(List<ChargeSheet> sources, int k) {
    List<ChargeSheet> out = new ArrayList<>();
    for (ChargeSheet s : sources) {
      if (onIron(s)) {
        continue;
      }
      if (endless()) {
        between(s, k, out);
      } else if (k == 0) {
        out.add(s);
        aboveMm.ifPresent(a -> out.add(image(s, a)));
        belowMm.ifPresent(b -> out.add(image(s, b)));
      }
    }
    return out;
  }

  /**
   * What stands in for all groups after group k: the sum over them as an integral by the midpoint
   * rule, which comes to one sheet on either side. Its error is about one part in k² of itself.
   */
  public List<ChargeSheet> tail(List<ChargeSheet> sources, int k) {
    List<ChargeSheet> out = new ArrayList<>();
    if (!endless()) {
      return out;
    }
    double gap = aboveMm.getAsDouble() - belowMm.getAsDouble();
    double middle = (aboveMm.getAsDouble() + belowMm.getAsDouble()) / 2;
    double off = (2.0 * k + 1.5) * gap;
    for (ChargeSheet s : sources) {
      if (!onIron(s)) {
        double lean = (s.heightMm() - middle) / gap;
        out.add(new ChargeSheet(middle + off, s.charge() * (0.5 - lean)));
        out.add(new ChargeSheet(middle - off, s.charge() * (0.5 + lean)));
      }
    }
    return out;
  }

  private boolean onIron(ChargeSheet s) {
    double up = aboveMm.orElse(Double.POSITIVE_INFINITY) - s.heightMm();
    double down = s.heightMm() - belowMm.orElse(Double.NEGATIVE_INFINITY);
    return Math.min(up, down) < SAME_MM;
  }

  private static ChargeSheet image(ChargeSheet s, double planeMm) {
    return new ChargeSheet(2 * planeMm - s.heightMm(), -s.charge());
  }

  private void between(ChargeSheet s, int k, List<ChargeSheet> out) {
    double gap = aboveMm.getAsDouble() - belowMm.getAsDouble();
    double middle = (aboveMm.getAsDouble() + belowMm.getAsDouble()) / 2;
    double off = s.heightMm() - middle;
    double whole = 2.0 * k * gap;
    double odd = (2.0 * k + 1) * gap;
    out.add(new ChargeSheet(middle + off + whole, s.charge()));
    if (k > 0) {
      out.add(new ChargeSheet(middle + off - whole, s.charge()));
    }
    out.add(new ChargeSheet(middle - off + odd, -s.charge()));
    out.add(new ChargeSheet(middle - off - odd, -s.charge()));
  }
}
