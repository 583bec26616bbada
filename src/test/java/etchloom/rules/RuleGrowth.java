package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/** Prints the time of the rule check against the number of segments; run its main method. */
final class RuleGrowth {
  private RuleGrowth() {}

  public static void main(String[] args) {
    System.out.println("finer tracks in the same coil, 9 coils, 4 layers");
    series(true);
    System.out.println("larger coils, the same track");
    series(false);
  }

  private static void series(boolean finer) {
    double before = 0;
    int segmentsBefore = 0;
    for (int k = 1; k <= 8; k *= 2) {
      double scale = finer ? 1 : k;
      double pitch = finer ? 0.8 / k : 0.8;
      Boards b = Wedges.board(9, 4, 8 * k, 12 * scale, 30 * scale, pitch);
      Artwork a = b.artwork();
      int segments = a.conductors().stream().mapToInt(c -> c.path().segments().size()).sum();
      Spec spec = Boards.spec(4, Optional.empty(), OptionalDouble.empty(), pitch / 2);
      FabRules fab = fab(pitch / 2);
      long start = System.nanoTime();
      RuleReport first = RuleCheck.check(a, spec, fab, RuleContext.NONE);
      double cold = (System.nanoTime() - start) / 1e6;
      double warm = Double.POSITIVE_INFINITY;
      for (int i = 0; i < 8; i++) {
        start = System.nanoTime();
        RuleCheck.check(a, spec, fab, RuleContext.NONE);
        warm = Math.min(warm, (System.nanoTime() - start) / 1e6);
      }
      String exponent =
          before > 0
              ? String.format(
                  Locale.ROOT,
                  "N^%.2f",
                  Math.log(warm / before) / Math.log(segments / (double) segmentsBefore))
              : "";
      System.out.printf(
          Locale.ROOT,
          "%6d turns %8d segments  first %8.1f ms  best %8.1f ms  %s  space %s%n",
          8 * k,
          segments,
          cold,
          warm,
          exponent,
          Boards.minimum(first, "space").map(f -> f.measured() + " " + f.what()).orElse("-"));
      before = warm;
      segmentsBefore = segments;
    }
  }

  private static FabRules fab(double spaceMm) {
    return Boards.fab(List.of(Boards.row(1, true, spaceMm), Boards.row(1, false, spaceMm)));
  }
}
