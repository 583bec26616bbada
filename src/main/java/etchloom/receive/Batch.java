package etchloom.receive;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;

/**
 * What the boards have in common.
 *
 * @param spreadPercent what 95 of 100 boards keep: their farthest pair's departure from the drawn
 *     value; of the boards that are whole and have no fault in one place
 * @param predictedSpreadPercent the same of the fab's tolerances, as the report has it
 * @param meanPercent mean departure of those boards, signed
 */
public record Batch(
    int count,
    int rejected,
    OptionalDouble spreadPercent,
    OptionalDouble predictedSpreadPercent,
    OptionalDouble meanPercent) {
  private static final double KEPT = 0.95;

  static Batch of(List<Verdict> all, OptionalDouble predictedPercent) {
    double[] farthest = new double[all.size()];
    double sum = 0;
    int n = 0;
    for (Verdict v : all) {
      boolean even = v.cause() == Cause.NONE || v.cause() == Cause.COPPER_THICKNESS;
      if (even && v.missing().isEmpty()) {
        double most = 0;
        double mean = 0;
        List<PairVerdict> lines = v.pairs().stream().filter(Batch::line).toList();
        for (PairVerdict p : lines) {
          double off = 100 * (p.ohm() / p.expectedOhm() - 1);
          most = Math.max(most, Math.abs(off));
          mean += off / lines.size();
        }
        farthest[n++] = most;
        sum += mean;
      }
    }
    int rejected = (int) all.stream().filter(v -> !v.accepted()).count();
    if (n == 0) {
      return new Batch(
          all.size(), rejected, OptionalDouble.empty(), predictedPercent, OptionalDouble.empty());
    }
    double[] sorted = Arrays.copyOf(farthest, n);
    Arrays.sort(sorted);
    return new Batch(
        all.size(),
        rejected,
        OptionalDouble.of(sorted[(int) Math.ceil(KEPT * n) - 1]),
        predictedPercent,
        OptionalDouble.of(sum / n));
  }

  private static boolean line(PairVerdict p) {
    return !p.pair().contains("N") && Double.isFinite(p.expectedOhm()) && !p.open();
  }
}
