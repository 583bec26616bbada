package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.spec.Templates;
import etchloom.testing.Run;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Whatever is wrong with the input: a message that helps, exit 2, no trace, nothing written. */
class BadInputTest {
  @TempDir Path folder;

  private static String template() {
    return new String(Templates.bytes("filter-wheel"), StandardCharsets.UTF_8);
  }

  /** A line of the template, what stands there instead, and words of the message. */
  static Stream<Arguments> changes() {
    return Stream.of(
        Arguments.of("  track: 0.2 mm", "  trak: 0.2 mm", List.of("trak", "track")),
        Arguments.of("  track: 0.2 mm", "  # gone", List.of("coil", "track")),
        Arguments.of("  track: 0.2 mm", "  track: 0.2", List.of("track", "mm")),
        Arguments.of("  track: 0.2 mm", "  track: 0.2 T", List.of("track", "mm")),
        Arguments.of("  track: 0.2 mm", "  track: NaN mm", List.of("track")),
        Arguments.of("  track: 0.2 mm", "  track: -0.2 mm", List.of("track")),
        Arguments.of("  coils: 9 ", "  coils: 0 ", List.of("coils")),
        Arguments.of("  coils: 9 ", "  coils: 7 ", List.of("coils", "6", "9")),
        Arguments.of("  turns: fill ", "  turns: 1000000000 ", List.of("turns")),
        Arguments.of("  turns: fill ", "  turns: 18 ", List.of("turns", "17")),
        Arguments.of("  inner-radius: 12 mm", "  inner-radius: 31 mm", List.of("inner-radius")),
        Arguments.of("  outer-radius: 30 mm", "  outer-radius: 43 mm", List.of("outer-radius")),
        Arguments.of("  outer-radius: 30 mm", "  outer-radius: 39 mm", List.of("holes", "coils")),
        Arguments.of(
            "title: Filter-wheel drive ", "title: ../../etc/passwd #", List.of("title", "/")),
        Arguments.of("title: Filter-wheel drive ", "title: <b>wheel</b> #", List.of("title", "<")),
        Arguments.of("title: Filter-wheel drive ", "title: '###' #", List.of("title")),
        Arguments.of("winding:", "winding: &w", List.of("anchor")),
        Arguments.of("  layers: 4", "\tlayers: 4", List.of("tab")),
        Arguments.of("  layers: 4", "  layers: 3", List.of("layers", "even")),
        Arguments.of("  outline: wedge", "  outline: oval", List.of("round", "racetrack")),
        Arguments.of("  sides: one", "  sides: three", List.of("sides", "one", "two")),
        Arguments.of("fab: standard", "fab: standart", List.of("standart", "economy", "fine")));
  }

  @ParameterizedTest(name = "{1}")
  @MethodSource("changes")
  void aBadLineIsNamed(String line, String instead, List<String> words) throws IOException {
    String text = template();
    assertTrue(text.contains(line), line);
    String bad = text.replace(line, instead);
    int at =
        1 + (int) bad.substring(0, bad.indexOf(instead)).chars().filter(c -> c == '\n').count();
    Run run = refused(bad.getBytes(StandardCharsets.UTF_8));
    words.forEach(w -> assertTrue(run.err().contains(w), () -> w + " in\n" + run.err()));
    boolean whole = instead.contains("gone") || instead.contains("39 mm");
    assertTrue(whole || run.err().contains("wheel.yaml:" + at + ":"), () -> at + "\n" + run.err());
  }

  @Test
  void everyErrorIsToldInOneRun() throws IOException {
    String bad =
        template()
            .replace("  track: 0.2 mm", "  track: 0.2 kg")
            .replace("  coils: 9 ", "  coils: -1 ")
            .replace("  layers: 4", "  layers: 5");
    Run run = refused(bad.getBytes(StandardCharsets.UTF_8));
    for (String key : List.of("track", "coils", "layers")) {
      assertTrue(run.err().contains(key), run.err());
    }
  }

  static Stream<Arguments> files() {
    byte[] noise = new byte[4000];
    new java.util.Random(7).nextBytes(noise);
    return Stream.of(
        Arguments.of("empty", new byte[0]),
        Arguments.of("binary", noise),
        Arguments.of("a list", "- 1\n- 2\n".getBytes(StandardCharsets.UTF_8)),
        Arguments.of("2 MiB", " ".repeat(2 << 20).getBytes(StandardCharsets.UTF_8)),
        Arguments.of("nested", "[".repeat(20_000).getBytes(StandardCharsets.UTF_8)));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("files")
  void aFileThatIsNoSpecIsRefused(String name, byte[] bytes) throws IOException {
    refused(bytes);
  }

  @Test
  void aFolderIsNoSpec() {
    Run run = Run.of("draw", folder.toString());
    assertEquals(ExitCode.BAD_INPUT, run.code(), run.err());
  }

  @Test
  void aMissingFileIsDiskTrouble() {
    Run run = Run.of("draw", folder.resolve("none.yaml").toString());
    assertEquals(ExitCode.DISK, run.code(), run.err());
    assertTrue(run.err().contains("none.yaml"), run.err());
  }

  @Test
  void aMissingRulesFileIsDiskTrouble() throws IOException {
    String text = template().replace("fab: standard", "fab: ./none.yaml");
    Path spec = Files.writeString(folder.resolve("wheel.yaml"), text);
    Run run = Run.of("draw", spec.toString());
    assertEquals(ExitCode.DISK, run.code(), run.err());
    assertTrue(run.err().contains("none.yaml"), run.err());
    onlyTheSpec();
  }

  @Test
  void aBadRulesFileIsBadInputWithItsPlace() throws IOException {
    Path spec = Files.write(folder.resolve("wheel.yaml"), Templates.bytes("filter-wheel"));
    String fab = new String(Templates.fabBytes("standard"), StandardCharsets.UTF_8);
    Path rules =
        Files.writeString(
            Files.createTempFile("rules", ".yaml"), fab.replace("aspect: ", "apect: "));
    Run run = Run.of("check", spec.toString(), "--fab", rules.toString());
    assertEquals(ExitCode.BAD_INPUT, run.code(), run.err());
    assertTrue(run.err().contains("apect") && run.err().contains(rules + ":"), run.err());
    Files.delete(rules);
  }

  @Test
  void aBadEpochIsBadInput() throws IOException {
    Path spec = Files.write(folder.resolve("wheel.yaml"), Templates.bytes("dosing-pump"));
    Run run = Run.with(Map.of("SOURCE_DATE_EPOCH", "yesterday"), "draw", spec.toString());
    assertEquals(ExitCode.BAD_INPUT, run.code(), run.err());
    onlyTheSpec();
  }

  @ParameterizedTest
  @MethodSource("commandLines")
  void aBadCommandLineIsBadInput(List<String> args) {
    Run run = Run.of(args.toArray(String[]::new));
    assertEquals(ExitCode.BAD_INPUT, run.code(), run.err());
    assertEquals("", run.out());
    assertFalse(run.err().isBlank());
  }

  static Stream<List<String>> commandLines() {
    return Stream.of(
        List.of("drow"),
        List.of("draw"),
        List.of("draw", "a.yaml", "b.yaml"),
        List.of("draw", "--nonsense", "a.yaml"),
        List.of("check"),
        List.of("new", "no-such-template"));
  }

  private Run refused(byte[] bytes) throws IOException {
    Path spec = Files.write(folder.resolve("wheel.yaml"), bytes);
    Run run = Run.of("draw", spec.toString());
    assertEquals(ExitCode.BAD_INPUT, run.code(), run.err());
    assertEquals("", run.out());
    assertTrue(run.err().contains("wheel.yaml"), run.err());
    assertFalse(run.err().contains("Exception"), run.err());
    assertFalse(run.err().contains("\tat "), run.err());
    onlyTheSpec();
    return run;
  }

  private void onlyTheSpec() throws IOException {
    try (Stream<Path> all = Files.list(folder)) {
      assertEquals(List.of("wheel.yaml"), all.map(p -> p.getFileName().toString()).toList());
    }
  }
}
