package etchloom.survey;

import java.util.Optional;

/**
 * One of several equal stretches of a survey.
 *
 * @param number from 1
 */
public record Part(int number, int of) {
  public static final Part WHOLE = new Part(1, 1);

  /** Reads {@code 2/8}. */
  public static Optional<Part> read(String text) {
    int stroke = text.indexOf('/');
    if (stroke < 1 || !digits(text.substring(0, stroke)) || !digits(text.substring(stroke + 1))) {
      return Optional.empty();
    }
    int k = Integer.parseInt(text.substring(0, stroke));
    int n = Integer.parseInt(text.substring(stroke + 1));
    return k >= 1 && k <= n ? Optional.of(new Part(k, n)) : Optional.empty();
  }

  private static boolean digits(String s) {
    return !s.isEmpty() && s.length() <= 6 && s.chars().allMatch(c -> c >= '0' && c <= '9');
  }

  /** The first variant, from 1. */
  public long first(long count) {
    return count * (number - 1) / of + 1;
  }

  /** The last variant; less than the first where the part is empty. */
  public long last(long count) {
    return count * number / of;
  }

  @Override
  public String toString() {
    return number + "/" + of;
  }
}
