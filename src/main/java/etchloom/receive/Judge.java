package etchloom.receive;

import etchloom.electric.resistance.Copper;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Judges boards one by one. A board is accepted where every pair was measured and lies within its
 * limits at its temperature, and no two pairs depart from the drawn values by more unlike shares
 * than good boards do (see {@link Parts}).
 */
public final class Judge {
  /** So many times the board's highest resistance is a break, though the meter shows something. */
  private static final double BROKEN = 50;

  private final Model model;
  private final Diagnosis diagnosis;
  private final double brokenOhm20;

  private Judge(Model model) {
    this.model = model;
    diagnosis = new Diagnosis(model);
    double highest = Arrays.stream(model.sound()).filter(Double::isFinite).max().orElseThrow();
    brokenOhm20 = BROKEN * highest;
  }

  /** All boards, in the order in which they first occur. */
  public static List<Verdict> boards(Model model, Readings readings) {
    Judge judge = new Judge(model);
    List<Verdict> out = new ArrayList<>();
    for (Map.Entry<String, List<Reading>> b : readings.byBoard().entrySet()) {
      out.add(judge.board(b.getKey(), b.getValue()));
    }
    return out;
  }

  /** What the boards have in common. */
  public static Batch batch(Model model, List<Verdict> boards) {
    return Batch.of(boards, model.predictedSpreadPercent());
  }

  private Verdict board(String name, List<Reading> readings) {
    Measured m = measured(readings);
    List<PairVerdict> pairs = new ArrayList<>();
    for (int p = 0; p < m.ohm20().length; p++) {
      if (!Double.isNaN(m.ohm20()[p])) {
        pairs.add(pair(p, m));
      }
    }
    List<String> missing = missing(m.ohm20());
    Fit even = Fit.of(m.ohm20(), model.sound(), (p, q) -> model.parts().apart()[p][q]);
    boolean within = pairs.stream().allMatch(PairVerdict::within);
    boolean accepted = within && missing.isEmpty() && even.explains();
    Diagnosis.Finding cause = diagnosis.of(m.ohm20(), even, within, accepted);
    int worst = worst(m.ohm20());
    return new Verdict(
        name,
        accepted,
        cause.cause(),
        cause.where(),
        model.pairs().key(worst),
        deviation(m.ohm20()[worst], model.sound()[worst]),
        copper(m.ohm20(), cause.common()),
        imbalance(m.ohm20()),
        pairs,
        missing);
  }

  /** Means of what was measured of each pair; NaN where nothing was. */
  private record Measured(double[] ohm20, double[] ohm, double[] celsius) {}

  private Measured measured(List<Reading> readings) {
    int n = model.pairs().size();
    double[] ohm20 = new double[n];
    double[] ohm = new double[n];
    double[] celsius = new double[n];
    int[] count = new int[n];
    for (Reading r : readings) {
      int p = model.pairs().of(r.from(), r.to());
      boolean broken = r.ohm() > brokenOhm20 * Copper.factor(r.celsius());
      double value = broken ? Double.POSITIVE_INFINITY : r.ohm();
      ohm20[p] += value / Copper.factor(r.celsius());
      ohm[p] += value;
      celsius[p] += r.celsius();
      count[p]++;
    }
    for (int p = 0; p < n; p++) {
      ohm20[p] /= count[p]; // NaN where there is none
      ohm[p] /= count[p];
      celsius[p] /= count[p];
    }
    return new Measured(ohm20, ohm, celsius);
  }

  private PairVerdict pair(int p, Measured m) {
    double k = Copper.factor(m.celsius()[p]);
    double least = k * model.limits().least()[p];
    double most = k * model.limits().most()[p];
    double ohm = m.ohm()[p];
    boolean joined = Double.isFinite(model.sound()[p]);
    boolean within = joined ? ohm >= least && ohm <= most && Double.isFinite(ohm) : ohm == least;
    return new PairVerdict(
        model.pairs().key(p), ohm, m.celsius()[p], least, k * model.sound()[p], most, within);
  }

  /**
   * Pairs without which the board is not known: all that join two lines, or else all that join a
   * line and a star point.
   */
  private List<String> missing(double[] ohm20) {
    List<String> lines = new ArrayList<>();
    List<String> stars = new ArrayList<>();
    boolean star = false;
    for (int p = 0; p < ohm20.length; p++) {
      if (Double.isFinite(model.sound()[p])) {
        star |= model.pairs().star(p);
        if (Double.isNaN(ohm20[p])) {
          (model.pairs().star(p) ? stars : lines).add(model.pairs().key(p));
        }
      }
    }
    return star && stars.isEmpty() ? List.of() : lines;
  }

  private int worst(double[] ohm20) {
    int worst = 0;
    double most = -1;
    for (int p = 0; p < ohm20.length; p++) {
      double off =
          Math.abs(Math.log(ohm20[p] / model.sound()[p])); // NaN: not measured, or not joined
      if (off > most) {
        most = off;
        worst = p;
      }
    }
    return worst;
  }

  private static OptionalDouble deviation(double ohm, double sound) {
    double off = 100 * (ohm / sound - 1);
    return Double.isFinite(off) && Double.isFinite(sound)
        ? OptionalDouble.of(off)
        : OptionalDouble.empty();
  }

  private OptionalDouble copper(double[] ohm20, Optional<Double> common) {
    List<Integer> some = new ArrayList<>();
    for (int p = 0; p < ohm20.length; p++) {
      if (Double.isFinite(ohm20[p]) && Double.isFinite(model.sound()[p])) {
        some.add(p);
      }
    }
    return common
        .flatMap(c -> model.parts().copper(some, Math.exp(c)))
        .map(c -> OptionalDouble.of(c * model.copperUm()))
        .orElse(OptionalDouble.empty());
  }

  private OptionalDouble imbalance(double[] ohm20) {
    double[] lines = new double[ohm20.length];
    int n = 0;
    for (int p = 0; p < ohm20.length; p++) {
      boolean line = Double.isFinite(model.sound()[p]) && !model.pairs().star(p);
      if (line && !Double.isNaN(ohm20[p])) {
        lines[n++] = ohm20[p];
      }
    }
    double[] some = Arrays.copyOf(lines, n);
    double mean = Arrays.stream(some).average().orElse(Double.NaN);
    double range =
        Arrays.stream(some).max().orElse(Double.NaN) - Arrays.stream(some).min().orElse(0);
    double percent = 100 * range / mean;
    return n > 1 && Double.isFinite(percent) ? OptionalDouble.of(percent) : OptionalDouble.empty();
  }
}
