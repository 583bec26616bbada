package etchloom.testing;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** Folders held against each other. */
public final class Folders {
  private Folders() {}

  /** The same files with the same bytes, at any depth. */
  public static void assertSame(Path wanted, Path found, String what) throws IOException {
    assertEquals(names(wanted), names(found), what);
    for (String n : names(wanted)) {
      assertEquals(-1, Files.mismatch(wanted.resolve(n), found.resolve(n)), n + " " + what);
    }
  }

  /** Every file below a folder, sorted. */
  public static List<String> names(Path dir) throws IOException {
    try (Stream<Path> all = Files.walk(dir)) {
      return all.filter(Files::isRegularFile)
          .map(p -> dir.relativize(p).toString())
          .sorted()
          .toList();
    }
  }
}
