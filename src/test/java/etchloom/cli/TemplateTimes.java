package etchloom.cli;

import etchloom.artwork.Artwork;
import etchloom.spec.Templates;
import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * Prints what one draw of each template costs for each drawn piece (line, arc or pad), beside the
 * filter wheel: everything from the read spec to the files' bytes, proof included, nothing on disk.
 * All work on one thread but the inductance's, whose share is small; processor time of the process,
 * the least of several, after rounds for the compiler. Run its main method.
 */
final class TemplateTimes {
  private static final int ROUNDS = 5;

  private TemplateTimes() {}

  public static void main(String[] args) throws IOException {
    System.setProperty("java.util.concurrent.ForkJoinPool.common.parallelism", "0");
    List<String> names = Templates.names();
    double[] least = new double[names.size()];
    int[] pieces = new int[names.size()];
    Arrays.fill(least, Double.POSITIVE_INFINITY);
    Path folder = Files.createTempDirectory("template-times");
    for (int round = 0; round < ROUNDS; round++) {
      for (int i = 0; i < names.size(); i++) {
        Path spec = folder.resolve(names.get(i) + ".yaml");
        Files.write(spec, Templates.bytes(names.get(i)));
        InputFiles.Inputs in = InputFiles.read(spec.toString(), Optional.empty());
        double before = processorMs();
        Attempt attempt = Attempt.of(in, false);
        SetFiles.of(attempt, Optional.empty());
        least[i] = Math.min(least[i], processorMs() - before);
        pieces[i] = pieces(attempt.drawn().assembly().artwork());
      }
    }
    int wheel = names.indexOf("filter-wheel");
    for (int i = 0; i < names.size(); i++) {
      double each = least[i] / pieces[i];
      System.out.printf(
          Locale.ROOT,
          "%-16s %6d pieces %7.0f ms %7.1f us each %5.2f times the filter wheel's%n",
          names.get(i),
          pieces[i],
          least[i],
          1e3 * each,
          each / (least[wheel] / pieces[wheel]));
    }
  }

  private static int pieces(Artwork art) {
    int tracks = art.conductors().stream().mapToInt(c -> c.path().segments().size()).sum();
    int pads = 0;
    for (int layer = 1; layer <= art.layers(); layer++) {
      pads += art.padsOn(layer).size();
    }
    return tracks + pads;
  }

  private static double processorMs() {
    return ManagementFactory.getPlatformMXBean(com.sun.management.OperatingSystemMXBean.class)
            .getProcessCpuTime()
        / 1e6;
  }
}
