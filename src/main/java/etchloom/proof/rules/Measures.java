package etchloom.proof.rules;

import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Collects measurements: the tightest of each rule, and the broken places, each told once. */
final class Measures {
  /** Files are on the nanometre grid: widths and gaps come out up to a few nanometres off. */
  static final double SLACK_MM = 5e-6;

  private static final int LISTED = 50;

  /** Broken places of the same two things no farther apart are one. */
  private static final double CELL_MM = 2;

  private static final List<String> ORDER =
      List.of(
          "track",
          "space",
          "ring",
          "hole",
          "aspect",
          "hole-gap",
          "hole-copper",
          "edge",
          "mask-web",
          "layers",
          "size");

  private static final Comparator<CopperFinding> TIGHTEST =
      Comparator.<CopperFinding>comparingLong(f -> Math.round(1e6 * margin(f)))
          .thenComparing(CopperFinding::layer)
          .thenComparingDouble(f -> f.at().x())
          .thenComparingDouble(f -> f.at().y())
          .thenComparing(CopperFinding::what);

  private static final Comparator<CopperFinding> BY_PLACE =
      Comparator.<CopperFinding>comparingInt(f -> ORDER.indexOf(f.rule()))
          .thenComparing(CopperFinding::layer, Comparator.comparingInt(String::length))
          .thenComparing(CopperFinding::layer)
          .thenComparingDouble(f -> f.at().x())
          .thenComparingDouble(f -> f.at().y())
          .thenComparing(CopperFinding::what);

  private record Place(String rule, String layer, String what, long x, long y)
      implements Comparable<Place> {
    private static final Comparator<Place> BY =
        Comparator.comparing(Place::rule)
            .thenComparing(Place::layer)
            .thenComparing(Place::what)
            .thenComparingLong(Place::x)
            .thenComparingLong(Place::y);

    @Override
    public int compareTo(Place o) {
      return BY.compare(this, o);
    }
  }

  private final Map<String, CopperFinding> tightest = new TreeMap<>();
  private final Map<Place, CopperFinding> broken = new TreeMap<>();
  private final List<String> notes = new ArrayList<>();

  /** How much is left over what is required; an upper bound counts the other way. */
  private static double margin(CopperFinding f) {
    return upper(f) ? f.required() - f.measured() : f.measured() - f.required();
  }

  private static boolean upper(CopperFinding f) {
    return f.rule().equals("aspect") || f.rule().equals("size");
  }

  void add(String rule, int layer, Point at, double mm, double required, String what) {
    add(new CopperFinding(rule, layer == 0 ? "" : "L" + layer, at, mm, required, "mm", what));
  }

  void add(CopperFinding f) {
    tightest.merge(f.rule(), f, Measures::tighter);
    if (margin(f) < -SLACK_MM) {
      long x = Math.round(f.at().x() / CELL_MM);
      long y = Math.round(f.at().y() / CELL_MM);
      broken.merge(new Place(f.rule(), f.layer(), f.what(), x, y), f, Measures::tighter);
    }
  }

  /** Something that is broken however its numbers compare. */
  void refuse(CopperFinding f) {
    tightest.put(f.rule(), f);
    broken.put(new Place(f.rule(), f.layer(), f.what(), 0, 0), f);
  }

  private static CopperFinding tighter(CopperFinding a, CopperFinding b) {
    return TIGHTEST.compare(a, b) <= 0 ? a : b;
  }

  void note(String text) {
    notes.add(text);
  }

  CopperRuleReport report() {
    List<CopperFinding> findings = new ArrayList<>();
    List<String> told = new ArrayList<>(notes);
    for (String rule : ORDER) {
      List<CopperFinding> all =
          broken.values().stream().filter(f -> f.rule().equals(rule)).sorted(TIGHTEST).toList();
      all.stream().limit(LISTED).sorted(BY_PLACE).forEach(findings::add);
      if (all.size() > LISTED) {
        told.add(
            rule + ": broken at " + all.size() + " places; the " + LISTED + " tightest are listed");
      }
    }
    List<CopperFinding> minima =
        ORDER.stream().filter(tightest::containsKey).map(tightest::get).toList();
    return new CopperRuleReport(minima, findings, told);
  }
}
