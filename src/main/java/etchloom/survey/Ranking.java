package etchloom.survey;

import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Which figure says what is best, and whether that is its smallest value.
 *
 * <p>Written {@code KEY}, or {@code KEY:low} or {@code KEY:high} to say which way. Without, losses,
 * resistances, spreads, temperatures, ripple, sizes and pulls are best small, all else large.
 */
record Ranking(FigureName name, boolean low) {
  private static final List<String> LOW_GROUPS =
      List.of("loss.", "resistance.", "spread.", "rotor.");
  private static final List<String> LOW =
      List.of(
          "thermal.copperC",
          "drive.rippleAmperePeakToPeak",
          "drive.seriesInductanceForRippleHenry",
          "drive.senseSpeedRpm",
          "emf.deltaCirculatingAmpere",
          "geometry.vias",
          "geometry.boardDiameterMm");

  /**
   * @param figures of some report, for what a short name means
   */
  static Ranking read(String text, Map<String, Object> figures) {
    int colon = text.lastIndexOf(':');
    String way = colon < 0 ? "" : text.substring(colon + 1);
    boolean said = way.equals("low") || way.equals("high");
    FigureName name = new FigureName(said ? text.substring(0, colon) : text);
    List<String> meanings = name.meanings(figures);
    String path = meanings.size() == 1 ? meanings.get(0) : name.name();
    return new Ranking(name, said ? way.equals("low") : low(path));
  }

  static boolean low(String path) {
    return LOW.contains(path)
        || LOW_GROUPS.stream()
            .anyMatch(g -> path.startsWith(g) || path.equals(g.substring(0, g.length() - 1)));
  }

  Optional<Double> of(Row row) {
    return name.number(row.figures());
  }

  /** Whether a value is better than another. */
  boolean better(double a, double b) {
    return low ? a < b : a > b;
  }

  /** Best first: those that keep the rules, then by the figure, then by number. */
  Comparator<Row> order() {
    return Comparator.comparing((Row r) -> !r.passed())
        .thenComparing(r -> of(r).isEmpty())
        .thenComparingDouble(r -> of(r).map(v -> low ? v : -v).orElse(0.0))
        .thenComparingLong(Row::variant);
  }
}
