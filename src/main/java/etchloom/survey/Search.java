package etchloom.survey;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import org.apache.commons.math3.exception.TooManyEvaluationsException;
import org.apache.commons.math3.optim.InitialGuess;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.SimpleBounds;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.nonlinear.scalar.ObjectiveFunction;
import org.apache.commons.math3.optim.nonlinear.scalar.noderiv.CMAESOptimizer;
import org.apache.commons.math3.random.MersenneTwister;

/**
 * One sequence of trials with a journal of its own. The next point depends on nothing but the seed
 * and the trials before it, so an interrupted sequence is taken up by doing it again from its
 * start, with the journal answering for the trials that it has.
 */
final class Search {
  private static final double SIGMA = 0.3;
  private static final double STEP = 0.08;
  private static final double LEAST_STEP = 5e-4;

  private static final int[] PARTS = {1, -1, 2, -2};

  /** Calls for points known already, for each new one, before a search counts as done. */
  private static final int REPEATS = 20;

  private final Bench bench;
  private final Space space;
  private final Goal goal;
  private final double[] anchor;
  private final Journal journal;
  private final List<Row> before = new ArrayList<>();
  private final Consumer<Row> told;
  private final Progress progress;
  private final int budget;
  private final Map<Map<String, String>, Double> known = new HashMap<>();
  private int done;
  private long calls;
  private double best = Double.POSITIVE_INFINITY;
  private double[] bestPoint;

  /**
   * @param anchor the spec's own values, or the middle
   * @param budget of new points
   * @param told hears of each new point
   */
  Search(
      Bench bench,
      Space space,
      Goal goal,
      double[] anchor,
      Path dir,
      String name,
      Journal journal,
      int budget,
      Consumer<Row> told,
      Progress progress)
      throws IOException {
    this.bench = bench;
    this.space = space;
    this.goal = goal;
    this.anchor = anchor.clone();
    this.journal = journal;
    this.budget = budget;
    this.told = told;
    this.progress = progress;
    bestPoint = anchor.clone();
    Journal.each(dir, name, before::add);
  }

  /** The budget is used up. */
  private static final class Spent extends RuntimeException {
    private static final long serialVersionUID = 1L;

    Spent() {
      super("spent", null, false, false);
    }
  }

  /** The point's score, from the journal, from memory or by drawing it. */
  private double at(double[] point) {
    if (++calls > (long) REPEATS * budget) {
      throw new Spent();
    }
    Map<String, String> values = space.values(point);
    Double old = known.get(values);
    if (old != null) {
      return old;
    }
    if (done >= budget) {
      throw new Spent();
    }
    Row row = row(done, values);
    double score = goal.score(row, space.distance(point, anchor));
    known.put(values, score);
    done++;
    if (score < best) {
      best = score;
      bestPoint = point.clone();
    }
    told.accept(row);
    return score;
  }

  private Row row(int index, Map<String, String> values) {
    if (index < before.size()) {
      Row row = before.get(index);
      if (!row.values().equals(values)) {
        throw new IllegalStateException("the journal has " + row.values() + ", wanted " + values);
      }
      return row;
    }
    Trial trial = bench.run(values);
    trial.fault().ifPresent(f -> progress.fault(index + 1, f));
    Row row = new Row(index + 1, values, trial.passed(), trial.reason(), goal.figures(trial));
    journal.append(row);
    return row;
  }

  /**
   * Covariance matrix adaptation, an evolution strategy for rugged functions, again and again with
   * twice the offspring until the budget is used up. Source: N. Hansen, "The CMA evolution
   * strategy", as implemented by Apache Commons Math 3.6.1; restarts as in A. Auger and N. Hansen,
   * CEC 2005.
   *
   * @param fromAnchor whether it begins at the spec's own values, else anywhere
   */
  void evolve(long seed, boolean fromAnchor) {
    MersenneTwister random = new MersenneTwister(seed);
    int n = space.size();
    int offspring = 4 + (int) (3 * Math.log(n));
    try {
      if (fromAnchor) {
        at(anchor);
      }
      for (int run = 0; ; run++) {
        double[] start = fromAnchor && run == 0 ? anchor.clone() : anywhere(random, n);
        once(random, start, Math.min(offspring << Math.min(run, 4), Math.max(4, budget / 4)));
      }
    } catch (Spent e) {
      // done
    }
  }

  private static double[] anywhere(MersenneTwister random, int n) {
    double[] out = new double[n];
    for (int i = 0; i < n; i++) {
      out[i] = random.nextDouble();
    }
    return out;
  }

  private void once(MersenneTwister random, double[] start, int offspring) {
    int n = space.size();
    double[] zeros = new double[n];
    double[] ones = new double[n];
    double[] sigma = new double[n];
    java.util.Arrays.fill(ones, 1);
    java.util.Arrays.fill(sigma, SIGMA);
    CMAESOptimizer cma = new CMAESOptimizer(10_000, 0, true, 0, 0, random, false, null);
    try {
      cma.optimize(
          new MaxEval(100_000),
          new ObjectiveFunction(this::at),
          GoalType.MINIMIZE,
          new InitialGuess(start),
          new SimpleBounds(zeros, ones),
          new CMAESOptimizer.Sigma(sigma),
          new CMAESOptimizer.PopulationSize(offspring));
    } catch (TooManyEvaluationsException e) {
      // the next run begins elsewhere
    }
  }

  /**
   * Goes from a point along each key in turn as long as that gets better; then along a whole number
   * and another key at once, since one turn more often needs a wider track to be any better; then
   * with half the step. The strategy above rounds whole numbers and may pass over their neighbours.
   */
  void polish(double[] from) {
    bestPoint = from.clone();
    try {
      at(from);
      for (double step = STEP; step > LEAST_STEP; ) {
        if (!alongOne(step) && !alongTwo(step)) {
          step /= 2;
        }
      }
    } catch (Spent e) {
      // done
    }
  }

  private boolean alongOne(double step) {
    double before = best;
    for (int i = 0; i < space.size(); i++) {
      for (int part : PARTS) {
        at(moved(bestPoint, i, part, step));
      }
    }
    return best < before;
  }

  private boolean alongTwo(double step) {
    double before = best;
    for (int i = 0; i < space.size(); i++) {
      for (int j = 0; j < space.size() && space.spans().get(i).whole(); j++) {
        for (int k = 0; k < PARTS.length * PARTS.length && i != j; k++) {
          double[] first = moved(bestPoint, i, PARTS[k / PARTS.length], step);
          at(moved(first, j, PARTS[k % PARTS.length], step));
        }
      }
    }
    return best < before;
  }

  private double[] moved(double[] from, int key, int part, double step) {
    double[] out = from.clone();
    double to = out[key] + part * space.spans().get(key).move(step);
    out[key] = Math.max(0, Math.min(1, to));
    return out;
  }

  /** The best point so far, and its score. */
  double[] bestPoint() {
    return bestPoint.clone();
  }

  double best() {
    return best;
  }
}
