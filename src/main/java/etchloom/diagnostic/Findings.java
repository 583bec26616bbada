package etchloom.diagnostic;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;

/**
 * Collects what a stage has to say, so that one run reports everything. A hostile file could hold a
 * hundred thousand mistakes: only the first {@link #MOST} are kept, and the last says how many were
 * left out.
 */
public final class Findings {
  /** More than anyone reads in one go. */
  public static final int MOST = 200;

  /** Too many findings to list; mend the first ones and run again. */
  public static final String TOO_MANY = "too-many";

  private final List<Diagnostic> kept = new ArrayList<>();
  private int leftOut;
  private boolean failed;

  public void add(Diagnostic d) {
    failed |= d.severity() == Severity.ERROR;
    if (kept.size() < MOST) {
      kept.add(d);
    } else {
      leftOut++;
    }
  }

  public void error(String code, SourceSpan where, String key, String message, String... hints) {
    add(Diagnostic.error(code, where, key, message, hints));
  }

  public void warning(String code, SourceSpan where, String key, String message, String... hints) {
    add(Diagnostic.warning(code, where, key, message, hints));
  }

  public boolean failed() {
    return failed;
  }

  /** All that was kept, in order of place. */
  public List<Diagnostic> sorted() {
    List<Diagnostic> all = new ArrayList<>(DiagnosticText.sorted(kept));
    if (leftOut > 0) {
      SourceSpan last = all.get(all.size() - 1).where();
      String text = leftOut + " more findings are not listed";
      all.add(new Diagnostic(TOO_MANY, Severity.ERROR, last, "", text, List.of()));
    }
    return all;
  }

  /** The stage's result: the value is built only if there is no error. */
  public <T> Staged<T> staged(Supplier<T> value) {
    return failed ? Staged.failed(sorted()) : Staged.of(value.get(), sorted());
  }
}
