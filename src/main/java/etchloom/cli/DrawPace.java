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
    tell();
  }

  /** The figures are there; what of the files took as long is done as well. */
  synchronized void judged() {
    files = Math.max(0, files - figures);
    figures = 0;
    tell();
  }

  /** The files are written and proved. */
  synchronized void filed() {
    figures = Math.max(0, figures - files);
    files = 0;
    tell();
  }

  private void tell() {
    pace.left(Math.max(figures, files) + (withFiles ? REPORT : 0));
  }

  void clear() {
    pace.clear();
  }

  @Override
  public void close() {
    pace.close();
  }
}
