package etchloom.receive;

import etchloom.units.Numbers;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Values as people read them, the same on the terminal and on the page. */
final class Shown {
  static final List<String> HEAD =
      List.of("board", "verdict", "worst pair", "off", "imbalance", "copper", "likely cause");

  private Shown() {}

  static List<String> row(Verdict v) {
    return List.of(
        v.board(),
        v.accepted() ? "accepted" : "REJECTED",
        v.worstPair(),
        percent(v.deviationPercent(), true)
            .orElse(v.accepted() ? "" : v.worstOpen() ? "open" : "joined"),
        percent(v.imbalancePercent(), false).orElse(""),
        v.copperUm().isPresent() ? Numbers.fixed(v.copperUm().getAsDouble(), 1) + " um" : "",
        v.words());
  }

  /** {@code +3.2 %}; empty for what is not known. */
  static Optional<String> percent(OptionalDouble p, boolean signed) {
    if (p.isEmpty()) {
      return Optional.empty();
    }
    String plus = signed && p.getAsDouble() > 0 ? "+" : "";
    return Optional.of(plus + Numbers.fixed(p.getAsDouble(), 1) + " %");
  }

  static String ohm(double ohm) {
    return Double.isFinite(ohm) ? Numbers.engineering(ohm, "ohm", 4) : "OL";
  }

  static String count(int n, String one, String many) {
    return n + " " + (n == 1 ? one : many);
  }

  /** {@code 12 boards, 2 rejected}. */
  static String counts(Outcome o) {
    String bad =
        o.badRows() == 0 ? "" : "; " + count(o.badRows(), "row", "rows") + " could not be read";
    return count(o.batch().count(), "board", "boards")
        + ", "
        + o.batch().rejected()
        + " rejected"
        + bad;
  }

  /** How the batch scatters, and how the tolerances said it would; empty without sound boards. */
  static Optional<String> spread(Batch b) {
    if (b.spreadPercent().isEmpty()) {
      return Optional.empty();
    }
    String predicted =
        percent(b.predictedSpreadPercent(), false)
            .map(p -> "; the fab's tolerances predicted " + p)
            .orElse("");
    return Optional.of(
        "95 of 100 boards keep within "
            + percent(b.spreadPercent(), false).orElseThrow()
            + " of the drawn resistance (mean "
            + percent(b.meanPercent(), true).orElseThrow()
            + ")"
            + predicted);
  }
}
