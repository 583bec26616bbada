package etchloom.spec;

import java.text.Normalizer;
import java.util.Locale;

/** The part of every file name that comes from the title. */
public final class Slug {
  private Slug() {}

  /**
   * Lower-case a-z, 0-9 and single hyphens between them; accents are dropped, every other run of
   * characters becomes one hyphen. Never holds a dot or a separator, so it is safe as a file name
   * whatever the title says. Empty where the title has no letter or digit of that kind.
   */
  public static String of(String title) {
    String plain = isAscii(title) ? title : Normalizer.normalize(title, Normalizer.Form.NFKD);
    StringBuilder slug = new StringBuilder();
    boolean gap = false;
    for (char c : plain.toLowerCase(Locale.ROOT).toCharArray()) {
      if ((c >= 'a' && c <= 'z') || (c >= '0' && c <= '9')) {
        if (gap && !slug.isEmpty()) {
          slug.append('-');
        }
        slug.append(c);
        gap = false;
      } else if (Character.getType(c) != Character.NON_SPACING_MARK) {
        gap = true;
      }
    }
    return slug.toString();
  }

  private static boolean isAscii(String s) {
    return s.chars().allMatch(c -> c < 128);
  }
}
