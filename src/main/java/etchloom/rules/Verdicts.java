package etchloom.rules;

import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Supplier;

/**
 * Collects what the rules measure: the tightest place of each, and those that break it.
 *
 * <p>Nothing depends on the order of measuring: places are compared by how tight they are in steps
 * of 1 nm, then by layer and the ids of the things measured.
 */
final class Verdicts {
  /** Findings listed for one rule; a note counts the rest. */
  static final int LISTED = 50;

  private static final double STEP_MM = 1e-6;

  /**
   * One measurement.
   *
   * @param layer from 1; 0 where no layer is meant
   * @param tightness the smaller the tighter; mostly the measured value itself
   * @param first id of the thing measured, to put equal places in order
   * @param second id of the other thing
   * @param what the things in the user's words; only asked for where it is told
   */
  record Measured(
      RuleName rule,
      int layer,
      Point at,
      double value,
      double required,
      String unit,
      boolean kept,
      double tightness,
      long first,
      long second,
      Supplier<String> what) {

    /** A length that must reach what is required, 1 nm of slack given. */
    static Measured atLeast(
        RuleName rule, int layer, Point at, double mm, double required, Supplier<String> what) {
      return new Measured(
          rule, layer, at, mm, required, "mm", mm >= required - STEP_MM, mm, 0, 0, what);
    }

    /** A value that must not pass what is required. */
    static Measured atMost(
        RuleName rule, Point at, double value, double required, String unit, String what) {
      boolean kept = value <= required + 1e-9 * Math.max(1, Math.abs(required));
      return new Measured(rule, 0, at, value, required, unit, kept, -value, 0, 0, () -> what);
    }

    Measured ids(long a, long b) {
      return new Measured(rule, layer, at, value, required, unit, kept, tightness, a, b, what);
    }

    /** Ranked by what is left over the required value, where that differs from place to place. */
    Measured byMargin() {
      return new Measured(
          rule, layer, at, value, required, unit, kept, value - required, first, second, what);
    }

    private long step() {
      return Math.round(tightness / STEP_MM);
    }

    Finding finding() {
      return new Finding(
          rule.word(), layer == 0 ? "" : "L" + layer, at, value, required, unit, what.get());
    }
  }

  private static final Comparator<Measured> TIGHTEST =
      Comparator.comparing(Measured::kept)
          .thenComparingLong(Measured::step)
          .thenComparingInt(Measured::layer)
          .thenComparingLong(Measured::first)
          .thenComparingLong(Measured::second)
          .thenComparingDouble(m -> m.at().x())
          .thenComparingDouble(m -> m.at().y());

  private static final Comparator<Measured> BY_PLACE =
      Comparator.comparingInt(Measured::layer)
          .thenComparingDouble(m -> m.at().x())
          .thenComparingDouble(m -> m.at().y())
          .thenComparingLong(Measured::first)
          .thenComparingLong(Measured::second);

  private record Things(int layer, String what) {}

  private final Map<RuleName, Measured> tightest = new EnumMap<>(RuleName.class);
  private final Map<RuleName, Map<Things, Measured>> broken = new EnumMap<>(RuleName.class);
  private final List<String> notes = new ArrayList<>();

  /** A broken place is told once for the same two things on a layer, where it is tightest. */
  void add(Measured m) {
    tightest.merge(m.rule(), m, Verdicts::tighter);
    if (!m.kept()) {
      broken
          .computeIfAbsent(m.rule(), k -> new HashMap<>())
          .merge(new Things(m.layer(), m.what().get()), m, Verdicts::tighter);
    }
  }

  private static Measured tighter(Measured a, Measured b) {
    return TIGHTEST.compare(a, b) <= 0 ? a : b;
  }

  void note(String text) {
    notes.add(text);
  }

  RuleReport report() {
    List<Finding> minima = tightest.values().stream().map(Measured::finding).toList();
    List<Finding> findings = new ArrayList<>();
    List<String> told = new ArrayList<>(notes);
    for (Map.Entry<RuleName, Map<Things, Measured>> e : broken.entrySet()) {
      List<Measured> all = e.getValue().values().stream().sorted(TIGHTEST).toList();
      all.stream().limit(LISTED).sorted(BY_PLACE).map(Measured::finding).forEach(findings::add);
      if (all.size() > LISTED) {
        told.add(
            String.format(
                Locale.ROOT,
                "%s: broken at %d places; the %d tightest are listed",
                e.getKey().word(),
                all.size(),
                LISTED));
      }
    }
    return new RuleReport(minima, findings, told);
  }
}
