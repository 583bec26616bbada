package etchloom.cli;

import etchloom.run.Laid;

/**
 * How far one board is: its figures are worked out and, where a set is written, its files beside
 * them.
 */
final class DrawPace implements AutoCloseable {
  // Seconds on a machine with two processors, by measurement: a start, and so much for each segment
  // of copper. They need not be right, only in proportion.
  private static final double FIGURES = 0.4;
  private static final double FIGURES_EACH = 0.15e-3;
  private static final double FILES = 0.5;
  private static final double FILES_EACH = 0.1e-3;
  private static final double REPORT = 0.3;

  private final Pace pace;
  private final boolean withFiles;
  private double figures;
  private double files;
  private double done;

  DrawPace(Console console, boolean quiet, boolean withFiles) {
    pace = new Pace(console, quiet, withFiles ? "drawing" : "working it out");
    this.withFiles = withFiles;
  }

  synchronized void laid(Laid board) {
    int segments =
        board.assembly().artwork().conductors().stream()
            .mapToInt(c -> c.path().segments().size())
            .sum();
    figures = FIGURES + FIGURES_EACH * segments;
    files = withFiles ? FILES + FILES_EACH * segments : 0;
    done = 0;
    tell();
  }

  /**
   * @param share of the work on the figures
   */
  synchronized void figures(double share) {
    done = Math.max(done, share * figures);
    tell();
  }

  /** The files are written and proved. */
  synchronized void files() {
    done = Math.max(done, files);
    tell();
  }

  /** Figures and files began together: who is as far as this says how far both are. */
  private void tell() {
    pace.left(Math.max(figures, files) + (withFiles ? REPORT : 0) - done);
  }

  void clear() {
    pace.clear();
  }

  @Override
  public void close() {
    pace.close();
  }
}
