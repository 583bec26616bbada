package etchloom.cli;

import etchloom.report.Text;
import java.io.PrintStream;
import java.util.Timer;
import java.util.TimerTask;
import java.util.function.LongSupplier;

/**
 * One line on the terminal while a single piece of work goes on for more than a second: how long it
 * has taken and about how long it will. Silent where nobody looks.
 *
 * <p>Whoever does the work says now and then what is left of it as it would take on a usual
 * machine; how this machine compares is taken from the pieces that are done.
 */
final class Pace implements AutoCloseable {
  private static final double SECOND = 1e9;
  private static final long TICK_MS = 500;
  private static final int COLUMNS = 79;

  private final PrintStream err;
  private final String doing;
  private final LongSupplier nanoTime;
  private final long began;
  private final Timer ticks;
  private long marked;
  private double left;
  private double usualDone;
  private double tookForIt;
  private boolean shown;
  private boolean closed;

  Pace(Console console, boolean quiet, String doing) {
    this(console, quiet, doing, System::nanoTime);
  }

  Pace(Console console, boolean quiet, String doing, LongSupplier nanoTime) {
    err = console.err();
    this.doing = doing;
    this.nanoTime = nanoTime;
    began = nanoTime.getAsLong();
    marked = began;
    ticks = console.terminal() && !quiet ? new Timer("pace", true) : null;
    if (ticks != null) {
      ticks.schedule(
          new TimerTask() {
            @Override
            public void run() {
              tick();
            }
          },
          2 * TICK_MS,
          TICK_MS);
    }
  }

  /**
   * A piece of the work is done.
   *
   * @param usualSeconds what the rest usually takes
   */
  synchronized void left(double usualSeconds) {
    long now = nanoTime.getAsLong();
    if (left > usualSeconds) {
      usualDone += left - usualSeconds;
      tookForIt += (now - marked) / SECOND;
    }
    left = usualSeconds;
    marked = now;
  }

  /** {@code drawing: 3 s, about 9 s left}; empty in the first second. */
  synchronized String line() {
    long now = nanoTime.getAsLong();
    double spent = (now - began) / SECOND;
    if (spent < 1) {
      return "";
    }
    double slower = usualDone > 0 ? tookForIt / usualDone : 1;
    long rest = Math.round(left * slower - (now - marked) / SECOND);
    String more = rest < 1 ? "" : ", about " + ProgressLine.time(rest) + " left";
    return doing + ": " + ProgressLine.time(Math.round(spent)) + more;
  }

  private synchronized void tick() {
    String line = line();
    if (!line.isEmpty() && !closed) {
      err.print("\r" + Text.left(line, COLUMNS));
      err.flush();
      shown = true;
    }
  }

  /** Takes the line away, so that something else can be said; it comes again. */
  synchronized void clear() {
    if (shown) {
      err.print("\r" + " ".repeat(COLUMNS) + "\r");
      err.flush();
      shown = false;
    }
  }

  @Override
  public synchronized void close() {
    closed = true;
    if (ticks != null) {
      ticks.cancel();
    }
    clear();
  }
}
