package etchloom.spec;

import etchloom.spec.FabRules.CopperRow;
import etchloom.units.Dimension;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/** The rows of a fab's copper weights. */
final class CopperRows {
  private CopperRows() {}

  private static final String KEY = "copper";
  static final Map<String, Boolean> SIDES = Words.of("outer", true).and("inner", false).map();

  static List<CopperRow> read(Section top, List<Integer> layers) {
    top.missing(KEY, "a row for every copper weight that the fab offers");
    List<CopperRow> rows = new ArrayList<>();
    Set<String> seen = new HashSet<>();
    boolean faulty = false;
    for (Section s : top.groups(KEY)) {
      Optional<Boolean> outer = s.word("on", SIDES).required();
      CopperRow row = row(s, outer.orElse(true));
      s.close();
      checkEtch(s, row);
      faulty |= outer.isEmpty();
      if (outer.isPresent()
          && !Double.isNaN(row.ounces())
          && !seen.add(row.ounces() + (row.outer() ? "o" : "i"))) {
        String weight = Numbers.trimmed(row.ounces(), 3) + " oz";
        s.error(Codes.FAB, "weight", "there is already a row for " + weight + " on these layers");
      }
      rows.add(row);
    }
    if (!faulty && !rows.isEmpty()) {
      checkSides(top, rows, layers);
    }
    return rows;
  }

  private static CopperRow row(Section s, boolean outer) {
    NumberField etch = s.bare("etch-factor", Limits.ETCH_FACTOR);
    return new CopperRow(
        s.number("weight", Dimension.COPPER_WEIGHT, Limits.WEIGHT).required(),
        outer,
        s.length("thickness", Limits.FINISHED_COPPER).required(),
        s.length("track", Limits.COPPER_SIZE).required(),
        s.length("space", Limits.COPPER_SIZE).required(),
        etch.present() ? OptionalDouble.of(etch.value()) : OptionalDouble.empty());
  }

  /** The narrowest track must keep some width at its top: both sides lose thickness/etch-factor. */
  private static void checkEtch(Section s, CopperRow row) {
    if (row.etchFactor().isEmpty()) {
      return;
    }
    double lost = 2 * row.thicknessMm() / row.etchFactor().getAsDouble();
    if (lost >= row.trackMm()) {
      s.error(
          Codes.FAB,
          "etch-factor",
          "with this undercut nothing is left of a track of "
              + Show.mm(row.trackMm())
              + " at its top: both sides together lose "
              + Show.mm(lost));
    }
  }

  private static void checkSides(Section top, List<CopperRow> rows, List<Integer> layers) {
    boolean outer = rows.stream().anyMatch(CopperRow::outer);
    boolean inner = rows.stream().anyMatch(r -> !r.outer());
    boolean needsInner = layers.stream().anyMatch(n -> n > Limits.LAYERS_MIN);
    if (!outer) {
      top.error(Codes.FAB, KEY, "there is no row with `on: outer`");
    }
    if (needsInner && !inner) {
      top.error(Codes.FAB, KEY, "boards of more than 2 layers need a row with `on: inner`");
    }
  }
}
