package etchloom.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.diagnostic.DiagnosticText;
import etchloom.diagnostic.Staged;
import java.util.List;
import java.util.stream.Stream;

/**
 * A line of a table of mistakes: what to change in a file that is right, and all that is then said.
 *
 * @param says a part of the messages and hints
 * @param found every finding, as {@link Found#in} has them
 */
record Mistake(String name, String piece, String by, String says, List<String> found) {
  static Stream<Mistake> in(String table) {
    return Found.file(table)
        .lines()
        .filter(l -> !l.isEmpty() && !l.startsWith("#"))
        .map(Mistake::of);
  }

  private static Mistake of(String line) {
    String[] f = line.replace('\u23ce', '\n').replace('\u21e5', '\t').split(" \\| ", -1);
    assertEquals(5, f.length, line);
    return new Mistake(f[0], f[1], f[2], f[3], List.of(f[4].split("; ")));
  }

  /** The file with this mistake in it. */
  byte[] madeIn(String right) {
    return Found.utf8(Found.with(right, piece, by));
  }

  void check(Staged<?> read) {
    String text = DiagnosticText.text(read.diagnostics());
    assertEquals(found, Found.in(read), text);
    assertTrue(Found.words(read).contains(says), text);
    assertTrue(read.value().isEmpty());
  }

  @Override
  public String toString() {
    return name;
  }
}
