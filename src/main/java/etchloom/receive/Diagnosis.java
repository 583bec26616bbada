package etchloom.receive;

import java.util.Arrays;
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

  /** Boards of one design usually differ by so much altogether, in the logarithm. */
  private static final double USUAL_COMMON = 0.05;

  /** A phase that is off usually is so by so much, in the logarithm. */
  private static final double USUAL_FACTOR = 0.7;

  /** What the choice of any factor costs against a fault that has none to choose. */
  private static final double FREEDOM = 3;

  /** What a misfit of 1, at the end of what is allowed, costs. */
  private static final double MISFIT = 8;

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

  /**
   * @param cost the less, the likelier: twice the negative logarithm of a likelihood, up to a sum
   */
  private record Candidate(Suspect suspect, Fit fit, double cost) {}

  /**
   * @param ohm measured, at 20 °C, by pair; NaN where it was not, infinite where it is open
   * @param even how the board as drawn agrees
   * @param within whether every measured pair is within its limits
   */
  Finding of(double[] ohm, Fit even, boolean within, boolean accepted) {
    if (accepted) {
      return new Finding(Cause.NONE, "", Optional.of(even.common()));
    }
    if (tooFew(ohm)) {
      return new Finding(Cause.UNCLEAR, "", Optional.empty());
    }
    if (even.explains()) {
      Cause cause = within ? Cause.UNCLEAR : Cause.COPPER_THICKNESS;
      return new Finding(cause, "", Optional.of(even.common()));
    }
    return best(ohm, model.breaks(), 0)
        .or(() -> best(ohm, model.swaps(), 0))
        .or(() -> cheaper(best(ohm, model.shorts(), 0), onePhase(ohm)))
        .or(() -> best(ohm, model.doubleBreaks(), 0))
        .map(c -> finding(ohm, c))
        .orElse(new Finding(Cause.UNCLEAR, "", Optional.empty()));
  }

  /** One pair of several tells no pattern. */
  private boolean tooFew(double[] ohm) {
    long measured = Arrays.stream(ohm).filter(r -> !Double.isNaN(r)).count();
    long joined = Arrays.stream(model.sound()).filter(Double::isFinite).count();
    return measured < 2 && joined > 1;
  }

  private static Finding finding(double[] ohm, Candidate c) {
    boolean any = Arrays.stream(ohm).anyMatch(Double::isFinite);
    Optional<Double> common = any ? Optional.of(c.fit().common()) : Optional.empty();
    return new Finding(c.suspect().cause(), c.suspect().where(), common);
  }

  private Optional<Candidate> best(double[] ohm, List<Suspect> some, double price) {
    Optional<Candidate> best = Optional.empty();
    for (Suspect s : some) {
      best = cheaper(best, candidate(ohm, s, price));
    }
    return best;
  }

  private Optional<Candidate> candidate(double[] ohm, Suspect s, double price) {
    Fit fit = Fit.of(ohm, s.ohm(), (p, q) -> loose);
    if (!good(fit)) {
      return Optional.empty();
    }
    double common = fit.common() / USUAL_COMMON;
    double cost = price + common * common + MISFIT * fit.misfit() * fit.misfit();
    return Optional.of(new Candidate(s, fit, cost));
  }

  private static Optional<Candidate> cheaper(Optional<Candidate> a, Optional<Candidate> b) {
    return b.isEmpty() || (a.isPresent() && a.get().cost() <= b.get().cost()) ? a : b;
  }

  /** Explains the readings, on a board whose other copper is within the tolerances. */
  private boolean good(Fit fit) {
    return fit.explains() && fit.common() >= lowest && fit.common() <= highest;
  }

  /** The phase and factor that explain the readings best. */
  private Optional<Candidate> onePhase(double[] ohm) {
    Optional<Candidate> best = Optional.empty();
    for (PhaseShift shift : model.shifts()) {
      for (double x = LEAST; x <= MOST; x += STEP) {
        Suspect s = new Suspect(Cause.ONE_PHASE, "phase " + shift.mark(), shift.at(Math.exp(x)));
        double size = x / USUAL_FACTOR;
        best = cheaper(best, candidate(ohm, s, FREEDOM + size * size));
      }
    }
    return best;
  }
}
