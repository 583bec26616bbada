package etchloom.rules;

import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

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
      Words what) {

    /** A length that must reach what is required, 1 nm of slack given. */
    static Measured atLeast(
        RuleName rule, int layer, Point at, double mm, double required, Words what) {
      return new Measured(
          rule, layer, at, mm, required, "mm", mm >= required - STEP_MM, mm, 0, 0, what);
    }

    /** A value that must not pass what is required. */
    static Measured atMost(
        RuleName rule, Point at, double value, double required, String unit, Words what) {
      boolean kept = value <= required + 1e-9 * Math.max(1, Math.abs(required));
      return new Measured(rule, 0, at, value, required, unit, kept, -value, 0, 0, what);
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
          rule.word(), layer == 0 ? "" : "L" + layer, at, value, required, unit, what.toString());
    }
  }

  /** The tightest first. */
  private static int byTightness(Measured a, Measured b) {
    int c = Boolean.compare(a.kept(), b.kept());
    c = c != 0 ? c : Long.compare(a.step(), b.step());
    c = c != 0 ? c : Integer.compare(a.layer(), b.layer());
    return c != 0 ? c : byIds(a, b);
  }

  private static int byPlace(Measured a, Measured b) {
    int c = Integer.compare(a.layer(), b.layer());
    c = c != 0 ? c : Double.compare(a.at().x(), b.at().x());
    c = c != 0 ? c : Double.compare(a.at().y(), b.at().y());
    return c != 0 ? c : byIds(a, b);
  }

  private static int byIds(Measured a, Measured b) {
    int c = Long.compare(a.first(), b.first());
    c = c != 0 ? c : Long.compare(a.second(), b.second());
    c = c != 0 ? c : Double.compare(a.at().x(), b.at().x());
    return c != 0 ? c : Double.compare(a.at().y(), b.at().y());
  }

  private record Things(int layer, String what) {}

  private final Map<RuleName, Measured> tightest = new EnumMap<>(RuleName.class);
  private final Map<RuleName, Map<Things, Measured>> broken = new EnumMap<>(RuleName.class);
  private final List<String> notes = new ArrayList<>();
  private final List<String> brief = new ArrayList<>();

  /** A broken place is told once for the same two things on a layer, where it is tightest. */
  void add(Measured m) {
    Measured before = tightest.get(m.rule());
    if (before == null || byTightness(m, before) < 0) {
      tightest.put(m.rule(), m);
    }
    if (!m.kept()) {
      Map<Things, Measured> all = broken.computeIfAbsent(m.rule(), k -> new HashMap<>());
      Things things = new Things(m.layer(), m.what().toString());
      Measured known = all.get(things);
      if (known == null || byTightness(m, known) < 0) {
        all.put(things, m);
      }
    }
  }

  /** Takes over what was found elsewhere. */
  void take(Verdicts other) {
    other.tightest.values().forEach(this::add);
    other.broken.values().forEach(all -> all.values().forEach(this::add));
    notes.addAll(other.notes);
    brief.addAll(other.brief);
  }

  void note(String text) {
    note(List.of(text), text);
  }

  /** Several notes, and what stands for them all where room is short. */
  void note(List<String> texts, String inShort) {
    notes.addAll(texts);
    brief.add(inShort);
  }

  RuleReport report() {
    List<Finding> minima = tightest.values().stream().map(Measured::finding).toList();
    List<Finding> findings = new ArrayList<>();
    List<String> told = new ArrayList<>(notes);
    List<String> inShort = new ArrayList<>(brief);
    for (Map.Entry<RuleName, Map<Things, Measured>> e : broken.entrySet()) {
      List<Measured> all = e.getValue().values().stream().sorted(Verdicts::byTightness).toList();
      all.stream()
          .limit(LISTED)
          .sorted(Verdicts::byPlace)
          .map(Measured::finding)
          .forEach(findings::add);
      if (all.size() > LISTED) {
        String rest =
            e.getKey().word()
                + ": broken at "
                + all.size()
                + " places; the "
                + LISTED
                + " tightest are listed";
        told.add(rest);
        inShort.add(rest);
      }
    }
    return new RuleReport(minima, findings, told, inShort);
  }
}
