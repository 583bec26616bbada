package etchloom.spec;

import java.util.Optional;

/** The spec's three texts: title, revision and fab. A faulty one reads as empty. */
final class Titles {
  private Titles() {}

  static final String DEFAULT_REVISION = "A";

  /** Any printable text: it is quoted wherever it is shown, and files are named by its slug. */
  static String title(Section top) {
    Optional<String> title =
        top.text("title", Limits.TITLE_MAX, "a text, for the legend and the file names").required();
    if (title.isPresent() && Slug.of(title.get()).isEmpty()) {
      top.error(
          Codes.TEXT,
          "title",
          Show.found(title.get()) + " has no letter a-z and no digit, which file names need");
    }
    return title.orElse("");
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
    fab.filter(f -> !isPath(f) && !Templates.fabNames().contains(f))
        .ifPresent(f -> unknownFab(top, f));
    return fab.orElse("");
  }

  /** Whether a {@code fab:} value names a file rather than a built-in class. */
  static boolean isPath(String fab) {
    return fab.indexOf('.') >= 0 || fab.indexOf('/') >= 0;
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
