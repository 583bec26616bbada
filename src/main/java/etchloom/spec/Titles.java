package etchloom.spec;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

/** The spec's three texts: title, revision and fab. A faulty one reads as empty. */
final class Titles {
  private Titles() {}

  static final String DEFAULT_REVISION = "A";

  /**
   * Signs that a title may not hold. Files are named by the slug and everything that shows a title
   * quotes it, so nothing depends on this; but no board is called like that, and other programs
   * that read our files may be less careful.
   */
  private static final String TITLE_REFUSED = "/\\<>";

  /** For the other texts a slash is harmless and usual. */
  private static final String TEXT_REFUSED = "<>";

  /** Any printable text of one line without path separators and markup. */
  static String title(Section top) {
    String key = "title";
    Optional<String> title =
        top.text(key, Limits.TITLE_MAX, "a text, for the legend and the file names").required();
    boolean clean = without(top, key, title, TITLE_REFUSED);
    if (clean && title.isPresent() && Slug.of(title.get()).isEmpty()) {
      top.error(
          Codes.TEXT,
          key,
          Show.found(title.get()) + " has no letter a-z and no digit, which file names need");
    }
    return title.orElse("");
  }

  /** A short text without markup. */
  static Optional<String> plain(Section s, String key, String wanted) {
    Optional<String> text = s.text(key, Limits.WORDS_MAX, wanted).value();
    without(s, key, text, TEXT_REFUSED);
    return text;
  }

  /** A rules file's title: it names no files. */
  static String fabTitle(Section top) {
    Optional<String> title = top.text("title", Limits.TITLE_MAX, "a text").required();
    without(top, "title", title, TEXT_REFUSED);
    return title.orElse("");
  }

  private static boolean without(Section s, String key, Optional<String> text, String refused) {
    String found = text.orElse("");
    List<String> bad = quoted(refused.chars().filter(c -> found.indexOf(c) >= 0));
    if (bad.isEmpty()) {
      return true;
    }
    s.error(
        Codes.TEXT,
        key,
        Show.found(found)
            + " holds "
            + Show.allOf(bad)
            + "; all signs are allowed here but "
            + Show.allOf(quoted(refused.chars())));
    return false;
  }

  private static List<String> quoted(IntStream chars) {
    return chars.mapToObj(c -> "`" + (char) c + "`").toList();
  }

  /**
   * Part of a folder's name, so only letters, digits, dots and hyphens, none of these two first.
   */
  static String revision(Section top) {
    Optional<String> revision = top.text("revision", Limits.REVISION_MAX, "a short text").value();
    if (revision.isPresent() && !isFileName(revision.get())) {
      top.error(
          Codes.TEXT,
          "revision",
          Show.found(revision.get())
              + " was found; a revision is letters a-z, digits, `.`, `-` and `_`, and starts with a"
              + " letter or digit");
    }
    return revision.orElse(DEFAULT_REVISION);
  }

  private static boolean isFileName(String s) {
    for (int i = 0; i < s.length(); i++) {
      char c = s.charAt(i);
      boolean letter = (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z') || (c >= '0' && c <= '9');
      if (!letter && (i == 0 || ".-_".indexOf(c) < 0)) {
        return false;
      }
    }
    return true;
  }

  /** A built-in class, or a path where it holds a dot or a slash. */
  static String fab(Section top) {
    Optional<String> fab =
        top.text("fab", Limits.PATH_MAX, Show.oneOf(Templates.fabNames()) + ", or a file's path")
            .required();
    fab.filter(f -> !FabReader.isPath(f) && !Templates.fabNames().contains(f))
        .ifPresent(f -> unknownFab(top, f));
    return fab.orElse("");
  }

  private static void unknownFab(Section top, String fab) {
    String[] hints =
        Suggest.nearest(fab, Templates.fabNames())
            .map(w -> "did you mean `fab: " + w + "`?")
            .stream()
            .toArray(String[]::new);
    top.error(
        Codes.UNKNOWN_WORD,
        "fab",
        Show.found(fab)
            + " is no built-in class ("
            + Show.oneOf(Templates.fabNames())
            + "); the path of a rules file holds a `.` or `/`",
        hints);
  }
}
