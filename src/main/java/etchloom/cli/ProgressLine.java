package etchloom.cli;

import etchloom.report.Text;
import etchloom.survey.Progress;
import java.io.PrintStream;

/** How far a survey is, and how long it will take: on a terminal in one line, else now and then. */
final class ProgressLine implements Progress {
  private static final long SECOND = 1_000_000_000L;

  /** One less than a terminal has, so that no line is begun. */
  private static final int COLUMNS = 79;

  private final PrintStream err;
  private final boolean terminal;
  private final boolean quiet;
  private final long began = System.nanoTime();
  private long told = began;
  private boolean open;

  ProgressLine(Console console, boolean quiet) {
    err = console.err();
    terminal = console.terminal();
    this.quiet = quiet;
  }

  @Override
  public void at(long done, long todo, String best) {
    long now = System.nanoTime();
    boolean due = now - told >= (terminal ? SECOND / 2 : 10 * SECOND);
    if (quiet || done == 0 || !(due || (open && done == todo))) {
      return;
    }
    told = now;
    double spent = (now - began) / (double) SECOND;
    String line = done + " of " + todo + left(spent / done * (todo - done));
    line = best.isEmpty() ? line : line + "; " + best;
    if (terminal) {
      err.print("\r" + Text.left(Text.cut(line, COLUMNS), COLUMNS) + (done == todo ? "\n" : ""));
      err.flush();
      open = done < todo;
    } else {
      err.println(line);
    }
  }

  private static String left(double seconds) {
    long s = Math.round(seconds);
    if (s < 1) {
      return "";
    }
    return ", " + time(s) + " left";
  }

  static String time(long s) {
    return s < 120 ? s + " s" : s < 7200 ? s / 60 + " min" : s / 3600 + " h";
  }

  @Override
  public void fault(long variant, RuntimeException e) {
    err.println("error[fault]: variant " + variant + ": a fault in Etchloom itself: " + e);
  }
}
