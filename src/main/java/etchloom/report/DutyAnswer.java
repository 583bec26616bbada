package etchloom.report;

import etchloom.electric.machine.MachineFigures;
import etchloom.electric.machine.Need;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Whether the machine does its duty, in words.
 *
 * @param met empty where nothing could be judged
 * @param word {@code DUTY MET}
 * @param text what it rests on
 */
record DutyAnswer(Optional<Boolean> met, String word, String text, List<Row> rows) {
  DutyAnswer {
    rows = List.copyOf(rows);
  }

  /** One demand; {@code answer} is yes or no. */
  record Row(String what, String needed, String got, String answer, String limitedBy) {}

  static DutyAnswer of(Results r) {
    if (r.spec().duty().isEmpty()) {
      return open(
          "the spec has no duty; add duty, and the report says whether the machine does it");
    }
    if (r.machine().isEmpty()) {
      return open("the machine's figures are not in this report");
    }
    MachineFigures m = r.machine().get();
    if (m.verdict().isEmpty()) {
      return open(lacking(m).orElse("the duty asks for nothing that could be judged"));
    }
    List<Row> rows = m.verdict().stream().map(DutyAnswer::row).toList();
    List<String> failed =
        m.verdict().stream().filter(n -> !n.met()).map(DutyAnswer::failure).toList();
    String more = lacking(m).map(s -> "; " + s).orElse("");
    return failed.isEmpty()
        ? new DutyAnswer(Optional.of(true), "DUTY MET", met(m) + more, rows)
        : new DutyAnswer(
            Optional.of(false), "DUTY NOT MET", String.join("; ", failed) + more, rows);
  }

  private static DutyAnswer open(String text) {
    return new DutyAnswer(Optional.empty(), "DUTY NOT JUDGED", text, List.of());
  }

  private static String met(MachineFigures m) {
    return "as far as asked: " + String.join(", ", m.verdict().stream().map(Need::what).toList());
  }

  private static String failure(Need n) {
    return n.what()
        + " "
        + got(n)
        + ", needed "
        + bound(n)
        + value(n.needed(), n.unit())
        + (n.limitedBy().isEmpty() ? "" : ", limited by " + n.limitedBy());
  }

  private static Optional<String> lacking(MachineFigures m) {
    List<String> out = new ArrayList<>();
    m.absent().stream()
        .filter(a -> a.figure().startsWith("verdict.duty."))
        .forEach(
            a ->
                out.add(
                    "not judged: "
                        + a.figure().substring("verdict.duty.".length())
                        + " (add "
                        + a.key()
                        + ")"));
    return out.isEmpty() ? Optional.empty() : Optional.of(String.join("; ", out));
  }

  private static Row row(Need n) {
    return new Row(
        n.what(),
        bound(n) + value(n.needed(), n.unit()),
        got(n),
        n.met() ? "yes" : "NO",
        n.met() && n.unit().equals("C") ? "" : n.limitedBy());
  }

  /** Temperatures must not be passed, all else must be reached. */
  private static String bound(Need n) {
    return n.unit().equals("C") ? "at most " : "at least ";
  }

  private static String got(Need n) {
    return n.got().isPresent() ? value(n.got().getAsDouble(), n.unit()) : "none, it never settles";
  }

  private static String value(double v, String unit) {
    return switch (unit) {
      case "C" -> Numbers.trimmed(v, 1) + " C";
      case "rpm" -> Numbers.trimmed(v, 0) + " rpm";
      default -> Numbers.engineering(v, unit, 4);
    };
  }
}
