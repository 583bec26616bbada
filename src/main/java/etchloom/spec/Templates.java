package etchloom.spec;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** The starting specs and fab classes that ship inside the program. */
public final class Templates {
  private Templates() {}

  private static final List<String> NAMES =
      List.of(
          "filter-wheel",
          "dosing-pump",
          "reaction-wheel",
          "wind-logger",
          "sample-stirrer",
          "focuser",
          "rover-wheel",
          "sample-shaker",
          "blind-drive",
          "tide-meter",
          "test-bench",
          "record-player");
  private static final List<String> FAB_NAMES = List.of("economy", "standard", "fine");

  /** The starting specs, in the order in which they are listed. */
  public static List<String> names() {
    return NAMES;
  }

  /** The built-in fab classes, the cheapest first. */
  public static List<String> fabNames() {
    return FAB_NAMES;
  }

  /**
   * A starting spec's file.
   *
   * @throws IllegalArgumentException if there is none of that name
   */
  public static byte[] bytes(String name) {
    return resource(NAMES, name, "/templates/" + name + ".yaml");
  }

  /**
   * A fab class's rules file.
   *
   * @throws IllegalArgumentException if there is none of that name
   */
  public static byte[] fabBytes(String name) {
    return resource(FAB_NAMES, name, "/templates/fab/" + name + ".yaml");
  }

  /** One line that says what a starting spec is: its file's first comment. */
  public static String description(String name) {
    return firstComment(bytes(name));
  }

  /** One line that says what a fab class is: its file's first comment. */
  public static String fabDescription(String name) {
    return firstComment(fabBytes(name));
  }

  private static String firstComment(byte[] bytes) {
    String text = new String(bytes, StandardCharsets.UTF_8);
    String line = text.substring(0, text.indexOf('\n')).strip();
    if (!line.startsWith("# ")) {
      throw new IllegalStateException("a template must start with a comment, not: " + line);
    }
    return line.substring(2).strip();
  }

  private static byte[] resource(List<String> names, String name, String path) {
    if (!names.contains(name)) {
      throw new IllegalArgumentException("no template is named '" + name + "'");
    }
    try (InputStream in = Templates.class.getResourceAsStream(path)) {
      if (in == null) {
        throw new IllegalStateException("the program was packed without " + path);
      }
      return in.readAllBytes();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
