package etchloom.survey;

import etchloom.rules.Finding;
import etchloom.rules.RuleReport;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * What is sought, as one number to make small. Whatever keeps all rules and conditions is below
 * everything that breaks any; that is below everything that cannot be drawn. Among those that break
 * something, the less is the better; among those that cannot be drawn, the nearer to the spec's own
 * values.
 *
 * @param scale size of the sought figure, so that its differences count alike for every figure
 */
record Goal(Ranking ranking, Optional<Expression> keep, double scale) {
  /** Where a drawn variant's row keeps how far it is from keeping rules and conditions. */
  static final String SHORTFALL = "seek.shortfall";

  private static final double BROKEN = 2;
  private static final double UNDRAWN = 4;

  /** The trial's figures with its shortfall. */
  Map<String, Object> figures(Trial trial) {
    Map<String, Object> out = new LinkedHashMap<>(trial.figures());
    if (trial.rules().isPresent()) {
      double conditions = keep.map(k -> k.shortfall(trial.figures())).orElse(0.0);
      out.put(SHORTFALL, shortfall(trial.rules().get()) + conditions);
    }
    return out;
  }

  /** The sum over the broken rules of the largest share by which each is broken. */
  private static double shortfall(RuleReport rules) {
    Map<String, Double> worst = new TreeMap<>();
    for (Finding f : rules.findings()) {
      double size = Math.max(Math.abs(f.measured()), Math.abs(f.required()));
      double share = size > 0 ? Math.abs(f.measured() - f.required()) / size : 1;
      worst.merge(f.rule(), Math.max(1e-6, share), Math::max);
    }
    return worst.values().stream().mapToDouble(Double::doubleValue).sum();
  }

  /** The value of a row that keeps everything; empty for all others. */
  Optional<Double> value(Row row) {
    boolean kept = row.passed() && keep.map(k -> k.holds(row.figures())).orElse(true);
    return kept ? ranking.of(row) : Optional.empty();
  }

  /**
   * @param distance from the spec's own values, 0 to 1
   */
  double score(Row row, double distance) {
    if (!row.drawn()) {
      return UNDRAWN + distance;
    }
    Optional<Double> value = value(row);
    if (value.isPresent()) {
      double v = (ranking.low() ? value.get() : -value.get()) / scale;
      return v / (1 + Math.abs(v));
    }
    double s = new FigureName(SHORTFALL).number(row.figures()).orElse(1.0);
    return BROKEN + s / (1 + s);
  }
}
