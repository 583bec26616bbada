package etchloom.rules;

import com.sun.management.OperatingSystemMXBean;
import etchloom.artwork.Artwork;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import java.lang.management.ManagementFactory;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Prints the time of the rule check against the number of segments, at 1, 2, 4 and 8 times the
 * turns, and the exponent fitted to all of them; run its main method. It is the time of all
 * processors together, and the best of several batches, so that a busy machine and the compiler's
 * warming up hardly count.
 */
final class RuleGrowth {
  private static final int BATCHES = 6;
  private static final int BATCH = 5;

  private RuleGrowth() {}

  public static void main(String[] args) {
    // Once round for the compiler.
    series(true);
    System.out.println("finer tracks in the same coil, 9 coils, 4 layers");
    print(series(true));
    System.out.println("larger coils, the same track");
    print(series(false));
  }

  private record Point(int turns, int segments, double ms) {}

  private static List<Point> series(boolean finer) {
    List<Point> out = new ArrayList<>();
    for (int k = 1; k <= 8; k *= 2) {
      double scale = finer ? 1 : k;
      double pitch = finer ? 0.8 / k : 0.8;
      Artwork a = Wedges.board(9, 4, 8 * k, 12 * scale, 30 * scale, pitch).artwork();
      Optional<Spec.Duty> duty = Optional.of(Boards.duty(OptionalDouble.of(24)));
      Spec spec = Boards.spec(4, duty, OptionalDouble.empty(), pitch / 2);
      FabRules fab =
          Boards.fab(List.of(Boards.row(1, true, pitch / 2), Boards.row(1, false, pitch / 2)));
      double best = Double.POSITIVE_INFINITY;
      for (int i = 0; i < BATCHES; i++) {
        long start = cpuNanos();
        for (int run = 0; run < BATCH; run++) {
          RuleCheck.check(a, spec, fab, RuleContext.NONE);
        }
        best = Math.min(best, (cpuNanos() - start) / 1e6 / BATCH);
      }
      int segments = a.conductors().stream().mapToInt(c -> c.path().segments().size()).sum();
      out.add(new Point(8 * k, segments, best));
    }
    return out;
  }

  private static long cpuNanos() {
    return ManagementFactory.getPlatformMXBean(OperatingSystemMXBean.class).getProcessCpuTime();
  }

  private static void print(List<Point> points) {
    for (Point p : points) {
      System.out.printf(
          Locale.ROOT,
          "%6d turns %8d segments %8.1f ms of processor%n",
          p.turns(),
          p.segments(),
          p.ms());
    }
    System.out.printf(Locale.ROOT, "time grows as N^%.2f%n", exponent(points));
  }

  /** The slope of the straight line fitted to the logarithms. */
  private static double exponent(List<Point> points) {
    double n = points.size();
    double x = 0;
    double y = 0;
    double xx = 0;
    double xy = 0;
    for (Point p : points) {
      double u = Math.log(p.segments());
      double v = Math.log(p.ms());
      x += u;
      y += v;
      xx += u * u;
      xy += u * v;
    }
    return (n * xy - x * y) / (n * xx - x * x);
  }
}
