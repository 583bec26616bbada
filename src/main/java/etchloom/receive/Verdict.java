package etchloom.receive;

import java.util.List;
import java.util.OptionalDouble;

/**
 * What is to be said of one board. Values that cannot be had are empty.
 *
 * @param where what the cause lies in, {@code phase U}; empty where none
 * @param worstPair the pair farthest from the drawn value
 * @param deviationPercent that pair's, from the drawn value at its temperature
 * @param copperUm finished copper of L1 that would explain what all pairs have in common
 * @param imbalancePercent largest less smallest over the mean, of the pairs without a star point
 * @param missing pairs that were not measured and that the board cannot be accepted without
 */
public record Verdict(
    String board,
    boolean accepted,
    Cause cause,
    String where,
    String worstPair,
    OptionalDouble deviationPercent,
    OptionalDouble copperUm,
    OptionalDouble imbalancePercent,
    List<PairVerdict> pairs,
    List<String> missing) {
  public Verdict {
    pairs = List.copyOf(pairs);
    missing = List.copyOf(missing);
  }

  /** Whether the worst pair was found open. */
  boolean worstOpen() {
    return pairs.stream().anyMatch(p -> p.pair().equals(worstPair) && p.open());
  }

  /** The cause with its place, for people; what is missing where that alone is wrong. */
  public String words() {
    if (accepted) {
      return "";
    }
    String text = cause.word() + (where.isEmpty() ? "" : " (" + where + ")");
    return missing.isEmpty() ? text : text + "; not measured: " + String.join(" ", missing);
  }
}
