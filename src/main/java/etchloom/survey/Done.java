package etchloom.survey;

/** A finished survey, as its command tells of it. */
public final class Done {
  private final Plan plan;
  private final Summary summary;
  private final long faults;

  Done(Plan plan, Summary summary, long faults) {
    this.plan = plan;
    this.summary = summary;
    this.faults = faults;
  }

  /** The table for the terminal. */
  public String text(String where) {
    return SurveyText.text(plan, summary, where);
  }

  /** Variants shown that keep every rule. */
  public long passed() {
    return summary.passed();
  }

  /** Variants of this run in which the program itself failed. */
  public long faults() {
    return faults;
  }
}
