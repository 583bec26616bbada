package etchloom.report;

import etchloom.proof.ProofReport;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** The last lines of every text: may it be made, and what can hurt. */
final class Verdicts {
  private Verdicts() {}

  static void add(Page page, Results r, Map<String, Object> figures) {
    page.blank();
    made(page, r);
    duty(page, DutyAnswer.of(r));
    ripple(r, figures).ifPresent(w -> page.bad(w.get(0), w.get(1)));
    r.proof().ifPresent(p -> page.item(p.passed() ? "proof" : "NOT PROVEN", proof(p)));
    Cautions.own(r).forEach(c -> page.item("caution", c.text()));
    page.item("cautions", Cautions.line());
  }

  private static void duty(Page page, DutyAnswer duty) {
    if (duty.met().isEmpty()) {
      page.item("duty", "not judged: " + duty.text());
    } else if (duty.met().get()) {
      page.good(duty.word(), duty.text());
    } else {
      page.bad(duty.word(), duty.text());
    }
    for (DutyAnswer.Row x : duty.rows()) {
      page.item("  " + x.answer(), x.what() + " " + x.got() + ", needed " + x.needed());
    }
  }

  /** Above this share of the line current's peak, ripple counts as a fault of the drive. */
  static final double RIPPLE_AIM = 0.2;

  /** A warning and its text, where PWM ripple is above the aim or cannot be told from it. */
  static Optional<List<String>> ripple(Results r, Map<String, Object> figures) {
    if (!(figures.get("drive.rippleAmperePeakToPeak") instanceof Double ripple)) {
      return Optional.empty();
    }
    OptionalDouble current =
        r.spec().duty().map(Spec.Duty::currentAmpereRms).orElse(OptionalDouble.empty());
    String text = Form.AMPERE.show(ripple) + " peak to peak in each line from the PWM";
    if (current.isEmpty()) {
      return Optional.of(List.of("PWM RIPPLE", text + "; add duty.current to judge it"));
    }
    // Both in a line: a delta's lines carry √3 times the current of its windings.
    double line = r.spec().winding().connection() == Spec.Connection.DELTA ? Math.sqrt(3) : 1;
    double share = ripple / (Math.sqrt(2) * line * current.getAsDouble());
    if (share <= RIPPLE_AIM) {
      return Optional.empty();
    }
    String part = Numbers.fixed(100 * share, 0) + " % of the line current's peak, the aim is 20 %";
    String choke =
        figures.get("drive.seriesInductanceForRippleHenry") instanceof Double l
            ? "; put " + Form.HENRY.show(l) + " in series with each line, or switch faster"
            : "; switch faster or add series inductance";
    return Optional.of(List.of("PWM RIPPLE TOO GREAT", text + ": " + part + choke));
  }

  private static void made(Page page, Results r) {
    List<String> words = words(r);
    if (r.rules().passed()) {
      page.good(words.get(0), words.get(1));
    } else {
      page.bad(words.get(0), words.get(1));
    }
  }

  /** The proof in one line. */
  static String proof(ProofReport p) {
    String expected =
        p.circuitsExpected().isPresent() ? " of " + p.circuitsExpected().getAsInt() : "";
    return Words.count(p.nets(), "net")
        + ", "
        + Words.count(p.opens(), "open")
        + ", "
        + Words.count(p.shorts(), "short")
        + ", closed circuits "
        + p.circuits()
        + expected;
  }

  /** The verdict in capitals, then what it rests on. */
  static List<String> words(Results r) {
    String fab = r.fab().title();
    if (r.rules().passed()) {
      return List.of("MAY BE MADE", "every rule checked is kept: " + fab);
    }
    int n = r.rules().findings().size();
    return List.of(
        "MAY NOT BE MADE", n + (n == 1 ? " place breaks" : " places break") + " the rules: " + fab);
  }
}
