package etchloom.spec;

import etchloom.spec.Spec.Copper;
import etchloom.spec.yaml.YamlNode.Scalar;
import etchloom.units.Constants;
import etchloom.units.Dimension;
import etchloom.units.Quantity;
import java.util.Optional;
import java.util.OptionalDouble;

/** Copper of the outer and the inner layers, from one value or from a group of two. */
record CopperDraft(Copper outer, Copper inner) {
  private static final String KEY = "copper";

  /** Stands for a faulty value while reading goes on. */
  private static final Copper FAULTY =
      new Copper(OptionalDouble.empty(), OptionalDouble.of(Double.NaN));

  static CopperDraft read(Section board, int layers) {
    board.missing(KEY, "a weight such as `1 oz`, a thickness such as `35 um`, or outer and inner");
    if (board.isScalar(KEY)) {
      Copper both = value(board, KEY).orElse(FAULTY);
      return new CopperDraft(both, both);
    }
    Optional<Section> group = board.optionalGroup(KEY);
    if (group.isEmpty()) {
      return new CopperDraft(FAULTY, FAULTY);
    }
    Section s = group.get();
    s.missing("outer", "a weight such as `1 oz`, or a thickness");
    Copper outer = value(s, "outer").orElse(FAULTY);
    if (layers > Limits.LAYERS_MIN) {
      s.missing("inner", "a weight such as `1 oz`, or a thickness");
    }
    Copper inner = value(s, "inner").orElse(s.has("inner") ? FAULTY : outer);
    s.close();
    return new CopperDraft(outer, inner);
  }

  private static Optional<Copper> value(Section s, String key) {
    return s.scalar(key).flatMap(v -> copper(v, s.reader(key)));
  }

  private static Optional<Copper> copper(Scalar v, ValueReader reader) {
    boolean byWeight = v.text().endsWith("oz");
    Range range = byWeight ? Limits.WEIGHT : Limits.ORDERED_COPPER;
    Quantity q = reader.quantity(v, Dimension.COPPER, range);
    if (!q.ok()) {
      return Optional.empty();
    }
    OptionalDouble value = OptionalDouble.of(q.value());
    return Optional.of(
        byWeight
            ? new Copper(value, OptionalDouble.empty())
            : new Copper(OptionalDouble.empty(), value));
  }

  /** All copper of a board, mm, weights taken at their nominal thickness; NaN where faulty. */
  double totalMm(int layers) {
    return 2 * nominalMm(outer) + (layers - 2) * nominalMm(inner);
  }

  private static double nominalMm(Copper c) {
    return c.thicknessMm().orElseGet(() -> c.ounces().orElseThrow() * Constants.NOMINAL_OUNCE_MM);
  }
}
