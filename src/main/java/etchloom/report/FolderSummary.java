package etchloom.report;

import etchloom.proof.ProofReport;
import etchloom.rules.RuleReport;
import java.util.List;
import java.util.Map;

/** What {@code check DIR} ends in on the terminal, within 80 columns. */
public final class FolderSummary {
  private FolderSummary() {}

  /**
   * @param name of the folder, as the user may type it
   * @param fab title of the rules
   * @param terminals resistances between terminals, one text a pair; may be empty
   * @param colour whether the terminal takes colours and its user wants them
   * @return lines, each with its end
   */
  public static String text(
      String name,
      String fab,
      RuleReport rules,
      ProofReport proof,
      List<String> terminals,
      boolean colour) {
    Page page = new Page(colour);
    page.heading(name);
    page.item("islands", perLayer(proof.islands()));
    page.item("loops", perLayer(proof.loops()));
    String expected =
        proof.circuitsExpected().isPresent()
            ? " of " + proof.circuitsExpected().getAsInt() + " meant"
            : ", not judged: say how many are meant with --circuits";
    page.item("circuits", proof.circuits() + expected);
    page.item(
        "nets",
        Words.count(proof.nets(), "piece")
            + " of copper, "
            + Words.count(proof.opens(), "open")
            + ", "
            + Words.count(proof.shorts(), "short"));
    if (!terminals.isEmpty()) {
      page.cells("at 20 C", terminals, t -> t);
    }
    Summary.rules(page, rules, rules.notes());
    proof.notes().forEach(n -> page.item("note", n));
    page.blank();
    int broken = rules.findings().size() + proof.findings().size();
    if (broken == 0) {
      page.good("NOTHING WRONG FOUND", "every rule that files alone can show is kept: " + fab);
    } else {
      page.bad("NOT IN ORDER", Words.count(broken, "finding") + "; rules: " + fab);
    }
    return page.text();
  }

  private static String perLayer(Map<Integer, Integer> counts) {
    return String.join(
        "  ", counts.entrySet().stream().map(e -> "L" + e.getKey() + " " + e.getValue()).toList());
  }
}
