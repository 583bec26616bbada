package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.jr.ob.JSON;
import etchloom.spec.Templates;
import etchloom.testing.Run;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The main job from outside: a command line, its exit, what it prints and what it leaves. */
class DrawTest {
  @TempDir Path folder;

  static Stream<String> templates() {
    return Templates.names().stream();
  }

  @ParameterizedTest
  @MethodSource("templates")
  void aTemplateBecomesASetThatCheckFindsInOrder(String name) throws IOException {
    Path spec = spec(name, "");
    Run draw = Run.of("draw", spec.toString());
    assertEquals(ExitCode.DONE, draw.code(), draw.err());
    assertEquals("", draw.err());
    Path set;
    try (Stream<Path> all = Files.list(folder)) {
      set = all.filter(Files::isDirectory).findFirst().orElseThrow();
    }
    String slug = set.getFileName().toString().replaceFirst("-A$", "");
    Map<String, Object> report =
        JSON.std.mapFrom(Files.readString(set.resolve("report.json"), StandardCharsets.UTF_8));
    int layers = whole(report, "geometry", "layers");
    TreeSet<String> expected =
        new TreeSet<>(
            List.of(
                "report.html",
                "report.json",
                "spec.yaml",
                "fab.yaml",
                "manifest.json",
                slug + "-mask-top.gbr",
                slug + "-mask-bottom.gbr",
                slug + "-legend-top.gbr",
                slug + "-profile.gbr",
                slug + "-plated.gbr",
                slug + "-plated.xnc",
                slug + ".gbrjob",
                slug + ".ipc",
                slug + ".dxf",
                slug + "-outlines.dxf",
                slug + ".svg",
                slug + "-notes.txt",
                slug + "-fab.zip"));
    if (Files.readString(spec).contains("\n  holes:")) {
      expected.addAll(List.of(slug + "-nonplated.gbr", slug + "-nonplated.xnc"));
    }
    for (int l = 1; l <= layers; l++) {
      expected.add(slug + "-copper-L" + l + ".gbr");
    }
    TreeSet<String> found = new TreeSet<>();
    try (Stream<Path> all = Files.list(set)) {
      all.forEach(p -> found.add(p.getFileName().toString()));
    }
    assertEquals(expected, found);
    String circuits = String.valueOf(whole(report, "proof", "circuitsExpected"));
    Run check = Run.of("check", set.toString(), "--circuits", circuits);
    assertEquals(ExitCode.DONE, check.code(), check.err());
    Run again = Run.of("draw", set.resolve("spec.yaml").toString(), "-o", set.toString());
    assertEquals(ExitCode.DONE, again.code(), again.err());
  }

  @SuppressWarnings("unchecked")
  private static int whole(Map<String, Object> report, String group, String key) {
    return (Integer) ((Map<String, Object>) report.get(group)).get(key);
  }

  @Test
  void aBrokenRuleWritesNothing_untilForced_andThenSaysDraft() throws IOException {
    Path spec = spec("dosing-pump", "  space: 0.16 mm", "  space: 0.14 mm");
    Path set = folder.resolve("set");
    Run refused = Run.of("draw", spec.toString(), "-o", set.toString());
    assertEquals(ExitCode.REFUSED, refused.code());
    assertTrue(refused.err().contains("error[space]: L1 at ("), refused.err());
    assertTrue(refused.err().contains("turn"), refused.err());
    assertFalse(Files.exists(set));
    Run forced = Run.of("draw", spec.toString(), "-o", set.toString(), "--force");
    assertEquals(ExitCode.REFUSED, forced.code());
    for (String file :
        List.of("report.html", "dosing-pump-drive-notes.txt", "dosing-pump-drive.gbrjob")) {
      assertTrue(Files.readString(set.resolve(file)).contains("DRAFT"), file);
    }
  }

  @Test
  void aFolderThatIsNotOurs_isLeftAlone() throws IOException {
    Path spec = spec("dosing-pump", "");
    Path set = Files.createDirectory(folder.resolve("set"));
    Path own = Files.writeString(set.resolve("letters.txt"), "mine");
    Run run = Run.of("draw", spec.toString(), "-o", set.toString());
    assertEquals(ExitCode.DISK, run.code(), run.err());
    assertEquals("mine", Files.readString(own));
    try (Stream<Path> all = Files.list(set)) {
      assertEquals(1, all.count());
    }
  }

  @Test
  void otherRules_areKeptInTheSet_soThatItCanBeDrawnAgain() throws IOException {
    Path spec = spec("dosing-pump", "");
    Path first = folder.resolve("first");
    Path second = folder.resolve("second");
    String fine = "fine";
    assertEquals(
        ExitCode.DONE,
        Run.of("draw", spec.toString(), "--fab", fine, "-o", first.toString()).code());
    assertTrue(Files.readString(first.resolve("spec.yaml")).contains("fab: ./fab.yaml"));
    Run again = Run.of("draw", first.resolve("spec.yaml").toString(), "-o", second.toString());
    assertEquals(ExitCode.DONE, again.code(), again.err());
    assertEquals(
        Files.readString(first.resolve("report.json")),
        Files.readString(second.resolve("report.json")));
  }

  private Path spec(String template, String line, String... instead) throws IOException {
    String text = new String(Templates.bytes(template), StandardCharsets.UTF_8);
    if (instead.length > 0) {
      assertTrue(text.contains(line), line);
      text = text.replace(line, instead[0]);
    }
    return Files.writeString(folder.resolve(template + ".yaml"), text);
  }
}
