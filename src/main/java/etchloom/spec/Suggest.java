package etchloom.spec;

import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * The nearest valid word for a misspelt one. A wrong hint is worse than none: only a word that is
 * clearly nearer than every other is offered.
 */
public final class Suggest {
  private Suggest() {}

  /** No key or word is longer; a longer text is compared with nothing. */
  private static final int LONGEST = 40;

  /**
   * The one word within reach, or none. Words that differ only in case, or in {@code _} or a space
   * for {@code -}, count as equal; else up to one slip in three letters, two at most; else the one
   * word of which this is a part, as {@code gap} is of {@code air-gap}.
   */
  public static Optional<String> nearest(String wrong, Collection<String> words) {
    if (wrong.isEmpty() || wrong.length() > LONGEST) {
      return Optional.empty();
    }
    String plainWrong = plain(wrong);
    String best = "";
    int bestDistance = Integer.MAX_VALUE;
    boolean tie = false;
    for (String word : words) {
      String plainWord = plain(word);
      int reach = Math.min(2, Math.max(plainWord.length(), plainWrong.length()) / 3);
      int d = distance(plainWrong, plainWord);
      if (d > reach || d > bestDistance || word.equals(best)) {
        continue;
      }
      tie = d == bestDistance;
      best = word;
      bestDistance = d;
    }
    if (best.isEmpty()) {
      return whole(wrong, words);
    }
    return tie ? Optional.empty() : Optional.of(best);
  }

  private static Optional<String> whole(String part, Collection<String> words) {
    List<String> all =
        words.stream().filter(w -> List.of(w.split("-")).contains(part)).distinct().toList();
    return all.size() == 1 ? Optional.of(all.get(0)) : Optional.empty();
  }

  private static String plain(String word) {
    StringBuilder s = new StringBuilder();
    for (char c : word.toLowerCase(Locale.ROOT).toCharArray()) {
      if (c != '-' && c != '_' && c != ' ') {
        s.append(c);
      }
    }
    return s.toString();
  }

  /**
   * Letters to insert, drop, change or swap with their neighbour, no letter touched twice (optimal
   * string alignment). Cost: product of the lengths. Source: F. J. Damerau, "A technique for
   * computer detection and correction of spelling errors", Comm. ACM 7 (1964).
   */
  static int distance(String a, String b) {
    int[][] d = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      d[i][0] = i;
    }
    for (int j = 0; j <= b.length(); j++) {
      d[0][j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      for (int j = 1; j <= b.length(); j++) {
        int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
        d[i][j] = Math.min(d[i - 1][j - 1] + change, 1 + Math.min(d[i - 1][j], d[i][j - 1]));
        if (i > 1
            && j > 1
            && a.charAt(i - 1) == b.charAt(j - 2)
            && a.charAt(i - 2) == b.charAt(j - 1)) {
          d[i][j] = Math.min(d[i][j], d[i - 2][j - 2] + 1);
        }
      }
    }
    return d[a.length()][b.length()];
  }
}
