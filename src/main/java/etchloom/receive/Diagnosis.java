package etchloom.receive;

import java.util.List;
import java.util.Optional;

/**
 * Finds the fault whose pattern explains a rejected board's readings. Kinds that leave no freedom
 * come first, so that a fault is not taken for one that could be made to fit anything.
 */
final class Diagnosis {
  /** Steps in which a phase's factor is searched, in its logarithm, and its bounds. */
  private static final double STEP = 0.005;

  private static final double LEAST = Math.log(0.02);
  private static final double MOST = Math.log(100);

  private final Model model;
  private final double loose;
  private final double lowest;
  private final double highest;

  Diagnosis(Model model) {
    this.model = model;
    double most = 0;
    double low = 0;
    double high = 0;
    for (int p = 0; p < model.pairs().size(); p++) {
      for (int q = 0; q < model.pairs().size(); q++) {
        most = Math.max(most, model.parts().apart()[p][q]);
      }
      if (Double.isFinite(model.sound()[p])) {
        low = Math.min(low, Math.log(model.limits().least()[p] / model.sound()[p]));
        high = Math.max(high, Math.log(model.limits().most()[p] / model.sound()[p]));
      }
    }
    loose = most;
    lowest = low;
    highest = high;
  }

  /**
   * @param common what all pairs have in common apart from the fault; empty where that is not known
   */
  record Finding(Cause cause, String where, Optional<Double> common) {}

  private record Candidate(Suspect suspect, Fit fit) {}

  /**
   * @param ohm measured, at 20 °C, by pair; NaN where it was not, infinite where it is open
   * @param even how the board as drawn agrees
   * @param within whether every measured pair is within its limits
   */
  Finding of(double[] ohm, Fit even, boolean within, boolean accepted) {
    if (accepted) {
      return new Finding(Cause.NONE, "", Optional.of(even.common()));
    }
    if (even.explains()) {
      Cause cause = within ? Cause.UNCLEAR : Cause.COPPER_THICKNESS;
      return new Finding(cause, "", Optional.of(even.common()));
    }
    for (List<Suspect> some : model.suspects()) {
      Optional<Candidate> best = best(ohm, some);
      if (best.isPresent()) {
        return finding(ohm, best.get());
      }
    }
    return onePhase(ohm)
        .or(() -> best(ohm, model.lastSuspects()))
        .map(c -> finding(ohm, c))
        .orElse(new Finding(Cause.UNCLEAR, "", Optional.empty()));
  }

  private static Finding finding(double[] ohm, Candidate c) {
    boolean any = java.util.Arrays.stream(ohm).anyMatch(Double::isFinite);
    Optional<Double> common = any ? Optional.of(c.fit().common()) : Optional.empty();
    return new Finding(c.suspect().cause(), c.suspect().where(), common);
  }

  private Optional<Candidate> best(double[] ohm, List<Suspect> some) {
    Candidate best = null;
    for (Suspect s : some) {
      Fit fit = Fit.of(ohm, s.ohm(), (p, q) -> loose);
      if (good(fit) && (best == null || fit.misfit() < best.fit().misfit())) {
        best = new Candidate(s, fit);
      }
    }
    return Optional.ofNullable(best);
  }

  /** Explains the readings, on a board whose other copper is within the tolerances. */
  private boolean good(Fit fit) {
    return fit.explains() && fit.common() >= lowest && fit.common() <= highest;
  }

  /** The phase with the best fit; of equal ones the one that leaves the others nearest as drawn. */
  private Optional<Candidate> onePhase(double[] ohm) {
    Candidate best = null;
    for (PhaseShift shift : model.shifts()) {
      Candidate own = null;
      for (double x = LEAST; x <= MOST; x += STEP) {
        double[] pattern = shift.at(Math.exp(x));
        Fit fit = Fit.of(ohm, pattern, (p, q) -> loose);
        if (good(fit) && (own == null || fit.misfit() < own.fit().misfit())) {
          own = new Candidate(new Suspect(Cause.ONE_PHASE, "phase " + shift.mark(), pattern), fit);
        }
      }
      if (own != null && (best == null || better(own, best))) {
        best = own;
      }
    }
    return Optional.ofNullable(best);
  }

  private static boolean better(Candidate a, Candidate b) {
    boolean equal = Math.abs(a.fit().misfit() - b.fit().misfit()) < STEP;
    return equal
        ? Math.abs(a.fit().common()) < Math.abs(b.fit().common())
        : a.fit().misfit() < b.fit().misfit();
  }
}
