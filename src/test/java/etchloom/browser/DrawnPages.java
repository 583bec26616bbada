package etchloom.browser;

import etchloom.spec.Templates;
import etchloom.testing.Run;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/** Sets drawn by the program for the tests of the page. */
final class DrawnPages {
  /** What a spec may have of markup; it refuses {@code <} and {@code >}. */
  static final String MARKUP = "&lt;b&gt; \"onload=\"window.ran=1\" & co";

  private DrawnPages() {}

  /** Any template as it is. */
  static Path template(Path folder, String name) {
    Path set = folder.resolve(name);
    Run run = Run.of("draw", "templates/" + name + ".yaml", "-o", set.toString(), "--quiet");
    if (run.code() != 0) {
      throw new AssertionError(run.err());
    }
    return set;
  }

  /** Two layers, a title of markup, rules that the board breaks. */
  static Path broken(Path folder) throws IOException {
    String spec =
        text("dosing-pump")
            .replaceFirst("(?m)^title:.*$", "title: '" + MARKUP + "'")
            .replaceFirst("(?m)^fab:.*$", "fab: ./fab.yaml");
    Path fab = folder.resolve("fab.yaml");
    Run.of("new", "economy", fab.toString());
    Files.writeString(fab, Files.readString(fab).replaceFirst("space: 0.15 mm", "space: 0.2 mm"));
    Path file = Files.writeString(folder.resolve("broken.yaml"), spec);
    Path set = folder.resolve("broken");
    Run run = Run.of("draw", file.toString(), "-o", set.toString(), "--force");
    if (run.code() != 1) {
      throw new AssertionError(run.code() + " " + run.err());
    }
    return set;
  }

  private static String text(String template) {
    return new String(Templates.bytes(template), StandardCharsets.UTF_8);
  }
}
