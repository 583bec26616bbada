package etchloom.survey;

import java.util.Optional;

/** A finished survey, as its command tells of it. */
public final class Done {
  private final Plan plan;
  private final Summary summary;
  private final Optional<Best> best;

  Done(Plan plan, Summary summary, Optional<Best> best) {
    this.plan = plan;
    this.summary = summary;
    this.best = best;
  }

  /** The table for the terminal. */
  public String text(String where) {
    return best.map(b -> b.text() + "\n").orElse("") + SurveyText.text(plan, summary, where);
  }

  /** Variants shown that keep every rule. */
  public long passed() {
    return summary.passed();
  }

  /** Variants in which the program itself failed. */
  public long faults() {
    return summary.faults();
  }
}
