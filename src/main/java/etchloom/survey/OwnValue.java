package etchloom.survey;

import etchloom.diagnostic.SourceSpan;
import etchloom.spec.SpecFile;
import etchloom.units.Dimension;
import etchloom.units.Quantity;
import java.util.Optional;

/** What a spec itself has for a key, as a number in a span's unit. */
final class OwnValue {
  private OwnValue() {}

  /** Empty where the spec does not name the key, or has no number that fits the unit. */
  static Optional<Double> of(SpecFile file, Span span) {
    SourceSpan at = file.positions().spans().get(span.key());
    if (at == null) {
      return Optional.empty();
    }
    int[] line = at.text().codePoints().toArray();
    int from = at.column() - 1;
    boolean there = from >= 0 && at.length() > 0 && from + at.length() <= line.length;
    return there ? number(new String(line, from, at.length()), span.unit()) : Optional.empty();
  }

  private static Optional<Double> number(String text, String unit) {
    if (unit.isEmpty()) {
      return Optional.of(Quantity.readBare(text).value()).filter(Double::isFinite);
    }
    for (Dimension d : Dimension.values()) {
      Quantity own = Quantity.read(text, d);
      Quantity one = Quantity.read("1 " + unit, d);
      Quantity none = Quantity.read("0 " + unit, d);
      if (own.ok() && one.ok()) {
        return Optional.of((own.value() - none.value()) / (one.value() - none.value()));
      }
    }
    return Optional.empty();
  }
}
