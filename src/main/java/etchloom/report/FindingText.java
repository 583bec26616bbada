package etchloom.report;

import etchloom.geometry.Point;
import etchloom.rules.Finding;
import etchloom.rules.RuleReport;
import etchloom.units.Numbers;
import java.util.List;

/**
 * Broken rules as lines for people, one a finding:
 *
 * <pre>
 * error[space]: L1 at (18.204, 3.366) mm, radius 18.513 mm, 10.48 deg: 0.1120 mm, must be at least
 * 0.1270 mm: phase U, coil 4, turn 7 and phase U, coil 4, turn 8
 * </pre>
 *
 * (one line, broken here for the page).
 */
public final class FindingText {
  private FindingText() {}

  public static String line(Finding f) {
    if (f.rule().equals("layers")) {
      // A count that is built or is not: neither the nearest one nor a place says more.
      return "error[layers]: " + value(f.measured(), f, true) + " " + Text.safe(f.what());
    }
    return "error["
        + f.rule()
        + "]: "
        + place(f)
        + ": "
        + value(f.measured(), f, true)
        + ", must be "
        + (upperBound(f, true) ? "at most " : "at least ")
        + value(f.required(), f, true)
        + ": "
        + Text.safe(f.what());
  }

  /** Rules whose value must not be passed, for where it is met exactly. */
  private static final List<String> UPPER = List.of("aspect", "size");

  /** Far below what any rule asks for, above the rounding of sums. */
  private static final double SAME = 1e-6;

  /** Whether the required value is the largest allowed, not the least. */
  static boolean upperBound(Finding f, boolean broken) {
    double over = f.measured() - f.required();
    if (!broken && Math.abs(over) <= SAME) {
      return UPPER.contains(f.rule());
    }
    return broken ? over > 0 : over < 0;
  }

  /** {@code L1 at (18.204, 3.366) mm, radius 18.513 mm, 10.48 deg}. */
  static String place(Finding f) {
    if (f.at().equals(Point.ORIGIN)) {
      return f.layer().isEmpty() ? "board" : f.layer();
    }
    String layer = f.layer().isEmpty() ? "" : f.layer() + " ";
    return layer
        + "at "
        + point(f)
        + " mm, radius "
        + Numbers.fixed(f.at().norm(), 3)
        + " mm, "
        + Numbers.fixed(Math.toDegrees(f.at().angleRad()), 2)
        + " deg";
  }

  /** {@code L1 (18.204, 3.366) mm}; what is true of the whole board or layer has no point. */
  static String shortPlace(Finding f) {
    String point = f.at().equals(Point.ORIGIN) ? "" : point(f) + " mm";
    return (f.layer() + " " + point).trim();
  }

  /**
   * What was measured or what it must be, with its key.
   *
   * @param stem of the finding in {@code report.json}
   */
  static Cell cell(String stem, Finding f, boolean measured, boolean broken) {
    String key =
        stem + (measured ? ".measured" : ".required") + (f.unit().equals("mm") ? "Mm" : "");
    String bound = measured ? "" : upperBound(f, broken) ? "at most " : "at least ";
    return Cell.of(bound + value(measured ? f.measured() : f.required(), f, broken), key);
  }

  /** Whether a rule is among the broken ones. */
  static boolean broken(RuleReport r, String rule) {
    return r.findings().stream().anyMatch(f -> f.rule().equals(rule));
  }

  static String point(Finding f) {
    return "(" + Numbers.fixed(f.at().x(), 3) + ", " + Numbers.fixed(f.at().y(), 3) + ")";
  }

  /**
   * Lengths to 0.1 µm, more where rounding would hide that the rule is broken; a plain number for a
   * ratio or a count.
   */
  static String value(double v, Finding f, boolean broken) {
    if (!f.unit().equals("mm")) {
      return Numbers.trimmed(v, 3) + (f.unit().equals("1") ? "" : " " + f.unit());
    }
    boolean close = broken && Math.abs(f.measured() - f.required()) < 1e-4;
    return Numbers.fixed(v, close ? 6 : 4) + " mm";
  }
}
