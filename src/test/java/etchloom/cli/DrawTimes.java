package etchloom.cli;

import etchloom.spec.Templates;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/**
 * Prints the whole-process time of {@code draw} for each template, and of {@code report} for the
 * first, beside that of an empty program, taken in turn so that all see the same machine. Run its
 * main method with the command to time: {@code target/etchloom} or {@code java -jar
 * target/etchloom.jar}.
 */
final class DrawTimes {
  private static final int ROUNDS = 11;

  private DrawTimes() {}

  /** An empty program. */
  static final class Empty {
    private Empty() {}

    public static void main(String[] args) {}
  }

  public static void main(String[] args) throws IOException, InterruptedException {
    List<String> program = args.length > 0 ? List.of(args) : List.of("target/etchloom");
    Path folder = Files.createTempDirectory("draw-times");
    String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
    String here = System.getProperty("java.class.path");
    List<String> names = new ArrayList<>(Templates.names());
    double[][] times = new double[names.size() + 2][ROUNDS];
    for (int round = 0; round < ROUNDS; round++) {
      times[0][round] = run(List.of(java), "-cp", here, Empty.class.getName());
      for (int i = 0; i < names.size(); i++) {
        Path spec = folder.resolve(names.get(i) + ".yaml");
        Files.write(spec, Templates.bytes(names.get(i)));
        times[i + 1][round] = run(program, "draw", spec.toString(), "--quiet");
      }
      Path first = folder.resolve("filter-wheel.yaml");
      times[names.size() + 1][round] = run(program, "report", first.toString(), "--quiet");
    }
    names.add("report of filter-wheel");
    double empty = median(times[0]);
    System.out.printf(Locale.ROOT, "%-24s %7.0f ms%n", "empty JVM", 1e3 * empty);
    for (int i = 0; i < names.size(); i++) {
      double t = median(times[i + 1]);
      System.out.printf(
          Locale.ROOT, "%-24s %7.0f ms  %5.1f times%n", names.get(i), 1e3 * t, t / empty);
    }
  }

  private static double run(List<String> program, String... rest)
      throws IOException, InterruptedException {
    List<String> all = new ArrayList<>(program);
    all.addAll(List.of(rest));
    long start = System.nanoTime();
    int code = new ProcessBuilder(all).inheritIO().start().waitFor();
    double seconds = (System.nanoTime() - start) / 1e9;
    if (code != 0) {
      throw new IllegalStateException("exit " + code + " of " + all);
    }
    return seconds;
  }

  private static double median(double[] values) {
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    return sorted[sorted.length / 2];
  }
}
