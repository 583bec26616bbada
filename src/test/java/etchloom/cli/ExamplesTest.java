package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import etchloom.testing.Run;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The committed examples are what the program writes today, byte for byte. */
class ExamplesTest {
  /** 2026-12-01T00:00:00Z. */
  private static final String EPOCH = "1796083200";

  @TempDir Path folder;

  @ParameterizedTest
  @CsvSource({"filter-wheel, filter-wheel-drive-A", "dosing-pump, dosing-pump-drive-A"})
  void drawnAgainGivesTheSameBytes(String template, String name) throws IOException {
    Path target = folder.resolve(name);
    Run run =
        Run.with(
            Map.of("SOURCE_DATE_EPOCH", EPOCH),
            "draw",
            "templates/" + template + ".yaml",
            "-o",
            target.toString());
    assertEquals(ExitCode.DONE, run.code(), run.err());
    Path kept = Path.of("out-examples", name);
    boolean write = Boolean.getBoolean("examples.write");
    if (write) {
      replace(kept, target);
    }
    Map<String, byte[]> expected = files(kept);
    Map<String, byte[]> found = files(target);
    assertEquals(expected.keySet(), found.keySet());
    expected.forEach((f, bytes) -> assertArrayEquals(bytes, found.get(f), f));
    assertFalse(write, "the examples were written anew; look at them, then run without the flag");
  }

  private static void replace(Path kept, Path by) throws IOException {
    Files.createDirectories(kept);
    for (String old : files(kept).keySet()) {
      Files.delete(kept.resolve(old));
    }
    for (Map.Entry<String, byte[]> e : files(by).entrySet()) {
      Files.write(kept.resolve(e.getKey()), e.getValue());
    }
  }

  private static Map<String, byte[]> files(Path folder) throws IOException {
    Map<String, byte[]> out = new TreeMap<>();
    try (Stream<Path> all = Files.list(folder)) {
      all.forEach(
          p -> {
            try {
              out.put(p.getFileName().toString(), Files.readAllBytes(p));
            } catch (IOException e) {
              throw new UncheckedIOException(e);
            }
          });
    }
    return out;
  }
}
