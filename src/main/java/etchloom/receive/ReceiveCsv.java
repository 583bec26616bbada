package etchloom.receive;

import etchloom.units.Numbers;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.OptionalDouble;

/** The result as a table for spreadsheets: a row for each pair of each board. */
public final class ReceiveCsv {
  private static final List<String> COLUMNS =
      List.of(
          "board",
          "accepted",
          "cause",
          "where",
          "copperUm",
          "imbalancePercent",
          "pair",
          "ohm",
          "celsius",
          "leastOhm",
          "expectedOhm",
          "mostOhm",
          "within");

  private ReceiveCsv() {}

  /** The whole file, UTF-8; an open pair has {@code OL} for its ohms. */
  public static byte[] write(Outcome o) {
    StringBuilder out = new StringBuilder();
    row(out, COLUMNS);
    for (Verdict v : o.boards()) {
      for (PairVerdict p : v.pairs()) {
        row(
            out,
            List.of(
                v.board(),
                yes(v.accepted()),
                v.cause().word(),
                v.where(),
                number(v.copperUm()),
                number(v.imbalancePercent()),
                p.pair(),
                p.open() ? "OL" : Numbers.plain(p.ohm()),
                Numbers.plain(p.celsius()),
                finite(p.leastOhm()),
                finite(p.expectedOhm()),
                finite(p.mostOhm()),
                yes(p.within())));
      }
    }
    return out.toString().getBytes(StandardCharsets.UTF_8);
  }

  private static void row(StringBuilder out, List<String> values) {
    out.append(String.join(",", values.stream().map(CsvRow::quoted).toList())).append('\n');
  }

  private static String yes(boolean b) {
    return b ? "true" : "false";
  }

  private static String number(OptionalDouble d) {
    return d.isPresent() ? Numbers.plain(d.getAsDouble()) : "";
  }

  private static String finite(double d) {
    return Double.isFinite(d) ? Numbers.plain(d) : "";
  }
}
