package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.jr.ob.JSON;
import etchloom.testing.Folders;
import etchloom.testing.Run;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** {@code survey --seek} from the command line, on a board of three coils. */
class SeekTest {
  private static final String SPEC = "src/test/resources/survey/three-coils.yaml";

  @TempDir static Path folder;

  private static Run survey(Path dir, String... more) {
    return Run.of(
        Stream.of(new String[] {"survey", SPEC, "-o", dir.toString()}, more)
            .flatMap(Arrays::stream)
            .toArray(String[]::new));
  }

  private static Map<String, Object> json(Path dir) throws IOException {
    return JSON.std.mapFrom(Files.readString(dir.resolve("survey.json")));
  }

  private static Map<?, ?> variant(Map<String, Object> json, Object number) {
    return ((List<?>) json.get("variants"))
        .stream()
            .map(v -> (Map<?, ?>) v)
            .filter(v -> v.get("variant").equals(number))
            .findFirst()
            .orElseThrow();
  }

  private static double figure(Map<?, ?> row, String path) {
    return ((Number) ((Map<?, ?>) row.get("figures")).get(path)).doubleValue();
  }

  private static double mm(Map<?, ?> row, String key) {
    return Double.parseDouble(
        ((Map<?, ?>) row.get("values")).get(key).toString().replace(" mm", ""));
  }

  /**
   * Every whole number of turns, and tracks 0.02 mm apart: the best lies inside, held by a
   * condition.
   */
  @Test
  void findsWhatAnExhaustiveGridFinds() throws IOException {
    String keep = "terminalOhm < 2.2";
    Path grid = folder.resolve("grid");
    Run all =
        survey(
            grid,
            "--vary",
            "coil.turns=5..9",
            "coil.track=0.16mm..0.5mm/17",
            "--keep",
            keep,
            "--rank",
            "phaseSelfHenry:high");
    assertEquals(ExitCode.DONE, all.code(), all.err());
    Map<String, Object> g = json(grid);
    List<?> ranking = (List<?>) ((Map<?, ?>) g.get("rank")).get("variants");
    Map<?, ?> best = variant(g, Integer.valueOf(ranking.get(0).toString()));
    Map<?, ?> second = variant(g, Integer.valueOf(ranking.get(1).toString()));

    Path dir = folder.resolve("seek");
    Run r =
        survey(
            dir,
            "--seek",
            "phaseSelfHenry:high",
            "--within",
            "coil.turns=5..9",
            "coil.track=0.16mm..0.5mm",
            "--keep",
            keep,
            "--trials",
            "120");
    assertEquals(ExitCode.DONE, r.code(), r.err());
    Map<String, Object> s = json(dir);
    Map<?, ?> found = variant(s, ((Map<?, ?>) s.get("seek")).get("bestVariant"));
    String figure = "inductance.phaseSelfHenry";
    assertTrue(
        figure(found, figure) > figure(second, figure),
        () ->
            found.get("values") + " is no better than the grid's second, " + second.get("values"));
    assertEquals(
        ((Map<?, ?>) best.get("values")).get("coil.turns"),
        ((Map<?, ?>) found.get("values")).get("coil.turns"));
    assertEquals(mm(best, "coil.track"), mm(found, "coil.track"), 0.02);
    assertEquals(true, found.get("passed"));
    assertTrue(r.out().replaceAll("\\s+", " ").contains("of the spec as it stands (+"), r.out());
  }

  /** Cut anywhere, in its searches or after them, it comes to the same files. */
  @Test
  void interruptedItComesToTheSame() throws IOException {
    String[] what = {
      "--seek",
      "coilOhm",
      "--within",
      "coil.turns=1..3",
      "coil.track=0.15mm..0.3mm",
      "--trials",
      "40"
    };
    Path done = folder.resolve("done");
    assertEquals(ExitCode.DONE, survey(done, what).code());
    List<String> journals =
        List.of("seek-1.journal", "seek-2.journal", "seek-5.journal", "survey.journal");
    for (String cut : journals) {
      Path dir = Files.createDirectories(folder.resolve("cut-" + cut));
      for (String name : Folders.names(done)) {
        Files.createDirectories(dir.resolve(name).getParent());
        Files.copy(done.resolve(name), dir.resolve(name));
      }
      byte[] all = Files.readAllBytes(done.resolve(cut));
      Files.write(dir.resolve(cut), Arrays.copyOf(all, all.length * 3 / 5));
      if (!cut.equals("survey.journal")) { // a search that is not done has joined nothing yet
        byte[] main = Files.readAllBytes(done.resolve("survey.journal"));
        int head = 0;
        while (main[head] != '\n') {
          head++;
        }
        Files.write(dir.resolve("survey.journal"), Arrays.copyOf(main, head + 1));
      }
      assertEquals(ExitCode.DONE, survey(dir, what).code());
      Folders.assertSame(done, dir, "after " + cut);
    }
  }

  @Test
  void nothingThatKeepsTheRules() throws IOException {
    Path dir = folder.resolve("none");
    Run r = survey(dir, "--seek", "coilOhm", "--within", "coil.turns=400..500", "--trials", "40");
    assertEquals(ExitCode.REFUSED, r.code(), r.err());
    assertTrue(r.out().contains("No trial kept every rule"), r.out());
  }

  @Test
  void whatIsWrongIsSaidBeforeAnythingIsDone() {
    Path dir = folder.resolve("never");
    wrong(dir, "unknown-key", "--seek", "coilOhm", "--within", "coil.trak=0.1mm..0.2mm");
    wrong(dir, "same unit", "--seek", "coilOhm", "--within", "coil.track=0.1mm..0.2in");
    wrong(dir, "lower", "--seek", "coilOhm", "--within", "coil.track=0.2mm..0.1mm");
    wrong(dir, "numbers", "--seek", "coilOhm", "--within", "winding.connection=star..delta");
    wrong(dir, "twice", "--seek", "coilOhm", "--within", "coil.turns=1..2", "coil.turns=1..3");
    wrong(dir, "figure", "--seek", "coilOmh", "--within", "coil.turns=1..2");
    wrong(dir, "no number", "--seek", "check.passed", "--within", "coil.turns=1..2");
    wrong(dir, "--trials", "--seek", "coilOhm", "--within", "coil.turns=1..2", "--trials", "3");
    wrong(dir, "--vary", "--seek", "coilOhm", "--vary", "coil.turns=1..2");
  }

  private static void wrong(Path dir, String words, String... args) {
    Run r = survey(dir, args);
    assertEquals(ExitCode.BAD_INPUT, r.code(), r.err());
    assertTrue(r.err().contains(words), r.err());
    assertTrue(Files.notExists(dir));
  }
}
