package etchloom.survey;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A condition on a report's figures, such as {@code terminalOhm < 5 and passed}. A comparison with
 * a figure that a report does not have is false, and so is its opposite.
 */
interface Expression {

  boolean holds(Map<String, Object> figures);

  /**
   * How far it is from holding, as a share of the values compared: nought where it holds, and 1 for
   * what cannot be measured.
   */
  double shortfall(Map<String, Object> figures);

  /** Every figure it speaks of. */
  List<FigureName> names();

  /** One side of a comparison. */
  sealed interface Side permits Literal, Named {}

  /**
   * @param value a {@code Double} or a {@code String}
   */
  record Literal(Object value) implements Side {}

  record Named(FigureName name) implements Side {}

  /** How two values compare. */
  enum Relation {
    LESS,
    AT_MOST,
    MORE,
    AT_LEAST,
    EQUAL,
    UNEQUAL;

    boolean holds(int order) {
      return switch (this) {
        case LESS -> order < 0;
        case AT_MOST -> order <= 0;
        case MORE -> order > 0;
        case AT_LEAST -> order >= 0;
        case EQUAL -> order == 0;
        case UNEQUAL -> order != 0;
      };
    }
  }

  /** Two values compared; words only for being the same. */
  record Comparison(Side left, Relation relation, Side right) implements Expression {
    @Override
    public boolean holds(Map<String, Object> figures) {
      Optional<Object> a = value(left, figures);
      Optional<Object> b = value(right, figures);
      if (a.isEmpty() || b.isEmpty()) {
        return false;
      }
      if (a.get() instanceof Double x && b.get() instanceof Double y) {
        return relation.holds(Double.compare(x, y));
      }
      boolean sameness = relation == Relation.EQUAL || relation == Relation.UNEQUAL;
      return sameness && a.get().equals(b.get()) == (relation == Relation.EQUAL);
    }

    @Override
    public double shortfall(Map<String, Object> figures) {
      if (holds(figures)) {
        return 0;
      }
      Optional<Object> a = value(left, figures);
      Optional<Object> b = value(right, figures);
      if (a.isPresent()
          && b.isPresent()
          && a.get() instanceof Double x
          && b.get() instanceof Double y) {
        double size = Math.max(Math.abs(x), Math.abs(y));
        return size == 0 ? 1e-9 : Math.max(1e-9, Math.abs(x - y) / size);
      }
      return 1;
    }

    private static Optional<Object> value(Side side, Map<String, Object> figures) {
      if (side instanceof Literal l) {
        return Optional.of(l.value());
      }
      return ((Named) side)
          .name()
          .in(figures)
          .map(v -> v instanceof Number n ? (Object) n.doubleValue() : v.toString());
    }

    @Override
    public List<FigureName> names() {
      return List.of(left, right).stream()
          .filter(s -> s instanceof Named)
          .map(s -> ((Named) s).name())
          .toList();
    }
  }

  /** All must hold, or any. */
  record Joined(boolean all, List<Expression> parts) implements Expression {
    @Override
    public boolean holds(Map<String, Object> figures) {
      return all
          ? parts.stream().allMatch(p -> p.holds(figures))
          : parts.stream().anyMatch(p -> p.holds(figures));
    }

    @Override
    public double shortfall(Map<String, Object> figures) {
      double sum = 0;
      double least = Double.POSITIVE_INFINITY;
      for (Expression p : parts) {
        double s = p.shortfall(figures);
        sum += s;
        least = Math.min(least, s);
      }
      return all ? sum : least;
    }

    @Override
    public List<FigureName> names() {
      return parts.stream().flatMap(p -> p.names().stream()).toList();
    }
  }

  /** Must not hold. */
  record Not(Expression part) implements Expression {
    @Override
    public boolean holds(Map<String, Object> figures) {
      boolean known = part.names().stream().allMatch(n -> n.in(figures).isPresent());
      return known && !part.holds(figures);
    }

    @Override
    public double shortfall(Map<String, Object> figures) {
      return holds(figures) ? 0 : 1;
    }

    @Override
    public List<FigureName> names() {
      return part.names();
    }
  }
}
