package etchloom.electric.inductance;

import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;

/**
 * A plain benchmark, run by hand: how the time for a coil's self-inductance grows with its
 * filaments, and how much the clusters save.
 *
 * <pre>java -cp … etchloom.electric.inductance.Growth [most filaments for the direct sum]</pre>
 *
 * <p>Times are processor time of all threads.
 *
 * <p>The coil is rings of 0.2 mm track at 0.4 mm pitch on four layers, filaments of 0.8 mm: the
 * density of a board's coil, more of it each time.
 */
final class Growth {
  private static final List<CrossSection> SECTIONS =
      List.of(
          new CrossSection(0.2, 0.035, 0.5825),
          new CrossSection(0.2, 0.03, 0.35),
          new CrossSection(0.2, 0.03, -0.35),
          new CrossSection(0.2, 0.035, -0.5825));

  private Growth() {}

  public static void main(String[] args) {
    int mostDirect = args.length > 0 ? Integer.parseInt(args[0]) : 10_000;
    for (int i = 0; i < 15; i++) {
      Bodies.clustered(rings(28), SECTIONS);
    }
    double lastN = 0;
    double lastMs = 0;
    for (int turns : new int[] {28, 40, 56, 89, 126, 178}) {
      Filaments f = rings(turns);
      double l = 0;
      double ms = Double.POSITIVE_INFINITY;
      double wall = Double.POSITIVE_INFINITY;
      for (int i = 0; i < 5; i++) {
        long start = System.nanoTime();
        double before = processorMs();
        l = Bodies.clustered(f, SECTIONS);
        ms = Math.min(ms, processorMs() - before);
        wall = Math.min(wall, (System.nanoTime() - start) / 1e6);
      }
      String growth =
          lastN == 0
              ? ""
              : format(", as N^%.2f", Math.log(ms / lastMs) / Math.log(f.size() / lastN));
      System.out.println(
          format("%7d filaments: %8.0f ms (%.0f ms by the clock)%s", f.size(), ms, wall, growth));
      lastN = f.size();
      lastMs = ms;
      if (f.size() <= mostDirect) {
        double before = processorMs();
        double d = direct(f);
        double direct = processorMs() - before;
        System.out.println(
            format(
                "          every pair: %8.0f ms, %.0f times as long; clusters off by %.1e",
                direct, direct / ms, l / d - 1));
      }
    }
  }

  /** Processor time of all threads, so that a busy machine does not show. */
  private static double processorMs() {
    var system =
        (com.sun.management.OperatingSystemMXBean)
            java.lang.management.ManagementFactory.getOperatingSystemMXBean();
    return system.getProcessCpuTime() / 1e6;
  }

  /** Every pair, on as many threads as the clusters get. */
  private static double direct(Filaments f) {
    Pieces p = Bodies.pieces(f, SECTIONS);
    Distances d = new Distances(SECTIONS, Mirror.NONE);
    int rows = 200;
    double[] part = new double[rows * rows];
    IntStream.range(0, rows * rows)
        .parallel()
        .forEach(
            k -> {
              int i = k / rows;
              int j = k % rows;
              PairSum pairs = new PairSum(p, p, Mirror.NONE, d);
              if (i == j) {
                part[k] = pairs.within(at(i, rows, p.size), at(i + 1, rows, p.size));
              } else if (i < j) {
                part[k] =
                    2
                        * pairs.block(
                            at(i, rows, p.size),
                            at(i + 1, rows, p.size),
                            at(j, rows, p.size),
                            at(j + 1, rows, p.size));
              }
            });
    double sum = 0;
    for (double v : part) {
      sum += v;
    }
    return Bodies.HENRY_A_MM * sum;
  }

  private static int at(int row, int rows, int size) {
    return (int) ((long) row * size / rows);
  }

  private static Filaments rings(int turns) {
    Filaments f = new Filaments();
    for (int layer = 0; layer < 4; layer++) {
      for (int k = 1; k <= turns; k++) {
        double r = 0.4 * k;
        int n = (int) Math.ceil(2 * Math.PI * r / 0.8);
        f.addTurned(Bodies.polygon(n, r, 1, layer), 0.3 * layer, 1);
      }
    }
    return f;
  }

  private static String format(String f, Object... values) {
    return String.format(Locale.ROOT, f, values);
  }
}
