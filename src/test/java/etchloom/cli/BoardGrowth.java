package etchloom.cli;

import etchloom.artwork.Artwork;
import etchloom.board.Assembler;
import etchloom.board.Assembly;
import etchloom.electric.resistance.Resistance;
import etchloom.proof.ProofExpectation;
import etchloom.proof.Prover;
import etchloom.rules.RuleCheck;
import etchloom.rules.RuleContext;
import etchloom.run.Laid;
import etchloom.spec.FabReader;
import etchloom.spec.FabRules;
import etchloom.spec.SpecFile;
import etchloom.spec.SpecReader;
import etchloom.spec.Templates;
import etchloom.write.LayerSet;
import java.lang.management.ManagementFactory;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.SortedMap;

/**
 * Prints the time of drawing, of the rule check, of writing and of the proof against the number of
 * drawn pieces, and the exponent from each to the next, for boards like the filter wheel's, four
 * times as large and with 0.1 mm tracks: first ever more turns, then more layers. Arguments are
 * boards as SIZE:LAYERS:TURNS; the last by default holds about 200,000 pieces. All work is done on
 * one thread; it is that thread's processor time, the least of three, after some rounds for the
 * compiler. Note that a larger board has more pieces and longer arcs: its copper takes more chords.
 */
final class BoardGrowth {
  private static final int ROUNDS = 3;
  private static final List<String> BOARDS =
      List.of("4:8:17", "4:8:34", "4:8:68", "4:8:136", "4:16:136", "5:16:170");

  private BoardGrowth() {}

  private record Times(int pieces, double[] ms) {}

  public static void main(String[] args) {
    List<String> boards = args.length > 0 ? List.of(args) : BOARDS;
    System.setProperty("java.util.concurrent.ForkJoinPool.common.parallelism", "0");
    for (int i = 0; i < 4; i++) {
      times("1:4:17");
    }
    System.out.printf(
        "%9s %22s %22s %22s %22s%n", "pieces", "geometry", "rules", "writing", "proof");
    Times last = null;
    for (String board : boards) {
      Times now = times(board);
      StringBuilder line = new StringBuilder(String.format(Locale.ROOT, "%9d", now.pieces));
      for (int k = 0; k < now.ms.length; k++) {
        String growth =
            last == null
                ? ""
                : String.format(
                    Locale.ROOT,
                    "N^%.2f",
                    Math.log(now.ms[k] / last.ms[k]) / Math.log(now.pieces / (double) last.pieces));
        line.append(String.format(Locale.ROOT, " %12.0f ms %6s", now.ms[k], growth));
      }
      System.out.println(line);
      last = now;
    }
  }

  private static Times times(String board) {
    SpecFile file = spec(board.split(":"));
    FabRules fab = FabReader.builtIn("standard");
    double[] least = new double[4];
    Arrays.fill(least, Double.POSITIVE_INFINITY);
    int pieces = 0;
    for (int round = 0; round < ROUNDS; round++) {
      List<Double> at = new ArrayList<>();
      at.add(processorMs());
      Assembly drawn =
          Assembler.assemble(file.spec(), fab, file.positions(), false).value().orElseThrow();
      at.add(processorMs());
      Artwork art = drawn.artwork().onGrid();
      Laid laid =
          new Laid(file.spec(), fab, drawn, Resistance.of(drawn.artwork(), fab.tolerance()));
      double before = processorMs();
      RuleCheck.check(drawn.artwork(), file.spec(), fab, RuleContext.NONE);
      at.add(at.get(1) + processorMs() - before);
      before = processorMs();
      SortedMap<String, byte[]> files = LayerSet.write(art, OrderSheet.of(laid, Optional.empty()));
      at.add(at.get(2) + processorMs() - before);
      before = processorMs();
      if (!Prover.prove(files, ProofExpectation.of(art)).passed()) {
        throw new IllegalStateException("the set is not proved");
      }
      at.add(at.get(3) + processorMs() - before);
      for (int k = 0; k < least.length; k++) {
        least[k] = Math.min(least[k], at.get(k + 1) - at.get(k));
      }
      pieces =
          art.conductors().stream().mapToInt(c -> c.path().segments().size()).sum()
              + art.joints().size();
    }
    return new Times(pieces, least);
  }

  private static SpecFile spec(String[] board) {
    int size = Integer.parseInt(board[0]);
    String text =
        new String(Templates.bytes("filter-wheel"), StandardCharsets.UTF_8)
            .replace("inner-radius: 12 mm", "inner-radius: " + 12 * size + " mm")
            .replace("outer-radius: 30 mm", "outer-radius: " + 30 * size + " mm")
            .replace("diameter: 84 mm", "diameter: " + (60 * size + 24) + " mm")
            .replace("circle: 78 mm", "circle: " + (60 * size + 18) + " mm")
            .replace("track: 0.2 mm", "track: 0.1 mm")
            .replace("space: 0.2 mm", "space: 0.1 mm")
            .replace("turns: fill", "turns: " + board[2])
            .replace("layers: 4", "layers: " + board[1])
            .replace("thickness: 1.2 mm", "thickness: 3.2 mm");
    return SpecReader.read("growth.yaml", text.getBytes(StandardCharsets.UTF_8))
        .value()
        .orElseThrow();
  }

  private static double processorMs() {
    return ManagementFactory.getThreadMXBean().getCurrentThreadCpuTime() / 1e6;
  }
}
