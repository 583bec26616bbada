package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.jr.ob.JSON;
import etchloom.testing.Folders;
import etchloom.testing.Run;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;

/** {@code survey} from the command line, on a board of three coils with few turns. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class SurveyCommandTest {
  private static final String SPEC = "src/test/resources/survey/three-coils.yaml";
  private static final String[] VARY = {
    "--vary", "coil.turns=1..3", "winding.connection=star,delta", "coil.track=0.12mm,0.2mm"
  };

  @TempDir static Path folder;
  private Path done;

  private static Run survey(Path dir, String... more) {
    Stream<String> args =
        Stream.of(new String[] {"survey", SPEC, "-o", dir.toString()}, more)
            .flatMap(Arrays::stream);
    return Run.of(args.toArray(String[]::new));
  }

  private static String[] and(String[] some, String... more) {
    return Stream.of(some, more).flatMap(Arrays::stream).toArray(String[]::new);
  }

  @BeforeAll
  void once() {
    done = folder.resolve("done");
    Run r = survey(done, VARY);
    assertEquals(ExitCode.DONE, r.code(), r.err());
    assertTrue(r.out().contains("12 variants; 6 keep every rule"), r.out());
  }

  private static List<Map<String, String>> csv(Path dir) throws IOException {
    List<String> lines = Files.readAllLines(dir.resolve("survey.csv"));
    List<String> head = cells(lines.get(0));
    return lines.subList(1, lines.size()).stream()
        .map(
            line -> {
              Map<String, String> out = new LinkedHashMap<>();
              List<String> cells = cells(line);
              assertEquals(head.size(), cells.size());
              for (int i = 0; i < cells.size(); i++) {
                out.put(head.get(i), cells.get(i));
              }
              return out;
            })
        .toList();
  }

  private static List<String> cells(String line) {
    return Arrays.stream(line.split(",(?=(?:[^\"]*\"[^\"]*\")*[^\"]*$)", -1))
        .map(s -> s.startsWith("\"") ? s.substring(1, s.length() - 1).replace("\"\"", "\"") : s)
        .toList();
  }

  @Test
  void aRowAVariantInTheOrderOfTheKeys() throws IOException {
    List<Map<String, String>> rows = csv(done);
    assertEquals(12, rows.size());
    assertEquals(
        List.of("variant", "coil.turns", "winding.connection", "coil.track", "passed", "reason"),
        List.copyOf(rows.get(0).keySet()).subList(0, 6));
    assertEquals("1", rows.get(3).get("coil.turns"));
    assertEquals("delta", rows.get(3).get("winding.connection"));
    assertEquals("0.2 mm", rows.get(3).get("coil.track"));
    assertEquals("2", rows.get(4).get("coil.turns"));
    assertEquals("false", rows.get(0).get("passed"));
    assertTrue(rows.get(0).get("reason").startsWith("error[track]"), rows.get(0)::toString);
    assertEquals("", rows.get(1).get("reason"));
  }

  /** The numbers of single runs of {@code report}, to the last digit. */
  @Test
  void sameNumbersAsReport() throws IOException {
    List<Map<String, String>> rows = csv(done);
    for (int n : new int[] {1, 4, 6, 12}) {
      Run r = Run.of("report", done.resolve("variants/" + n + ".yaml").toString(), "--json");
      Map<String, String> wanted = new TreeMap<>();
      flat("", JSON.std.mapFrom(r.out()), wanted);
      wanted.keySet().removeAll(List.of("tool.version", "title", "revision"));
      Map<String, String> found = new TreeMap<>(rows.get(n - 1));
      List.of("variant", "coil.turns", "coil.track", "passed", "reason").forEach(found::remove);
      found.values().removeIf(String::isEmpty);
      assertEquals(wanted.keySet(), found.keySet());
      wanted.forEach((k, v) -> assertEquals(v, found.get(k), k));
      assertTrue(wanted.size() > 50);
    }
  }

  private static void flat(String prefix, Map<?, ?> map, Map<String, String> out) {
    map.forEach(
        (k, v) -> {
          if (v instanceof Map<?, ?> m) {
            flat(prefix + k + ".", m, out);
          } else if (v instanceof Double d) {
            out.put(prefix + k, etchloom.units.Numbers.plain(d));
          } else if (!(v instanceof List)) {
            out.put(prefix + k, v.toString());
          }
        });
  }

  @Test
  void keepAndRankNeedNoNewComputing() throws IOException {
    Path dir = copy("ranked");
    String keep = "terminalOhm < 1.5 and check.passed";
    Run r = survey(dir, and(VARY, "--keep", keep, "--rank", "motorConstant"));
    assertEquals(ExitCode.DONE, r.code(), r.err());
    List<Map<String, String>> rows = csv(dir);
    List<Map<String, String>> all = csv(done);
    List<String> wanted =
        all.stream()
            .filter(m -> m.get("passed").equals("true") && mean(m) < 1.5)
            .map(m -> m.get("variant"))
            .toList();
    assertTrue(wanted.size() > 1 && wanted.size() < 6, wanted::toString);
    assertEquals(wanted, rows.stream().map(m -> m.get("variant")).toList());
    double best =
        rows.stream()
            .mapToDouble(m -> Double.parseDouble(m.get("torque.motorConstant")))
            .max()
            .orElseThrow();
    Map<String, Object> json = JSON.std.mapFrom(Files.readString(dir.resolve("survey.json")));
    Object first = ((List<?>) ((Map<?, ?>) json.get("rank")).get("variants")).get(0);
    Map<String, String> row =
        rows.stream().filter(m -> m.get("variant").equals(first)).findFirst().orElseThrow();
    assertEquals(best, Double.parseDouble(row.get("torque.motorConstant")));
    assertTrue(
        r.out().lines().skip(1).findFirst().orElseThrow().strip().startsWith(first + " "), r.out());
    assertEquals(wanted.size(), ((List<?>) json.get("variants")).size());
  }

  private static double mean(Map<String, String> row) {
    return row.entrySet().stream()
        .filter(e -> e.getKey().startsWith("resistance.terminalOhm."))
        .mapToDouble(e -> Double.parseDouble(e.getValue()))
        .average()
        .orElseThrow();
  }

  private Path copy(String name) throws IOException {
    Path to = folder.resolve(name);
    try (Stream<Path> all = Files.walk(done)) {
      for (Path p : (Iterable<Path>) all::iterator) {
        Files.copy(p, to.resolve(done.relativize(p).toString()));
      }
    }
    return to;
  }

  /** A survey is cut where a kill could have cut it: after any byte of its journal. */
  @Test
  void cutAtTwentyPointsAndResumed() throws IOException {
    byte[] journal = Files.readAllBytes(done.resolve("survey.journal"));
    Random random = new Random(20);
    for (int i = 0; i < 20; i++) {
      Path dir = copy("cut-" + i);
      int from = journal.length * 2 / 3; // so that not all is computed twenty times
      int cut = i == 0 ? 10 : from + random.nextInt(journal.length - from);
      Files.write(dir.resolve("survey.journal"), Arrays.copyOf(journal, cut));
      Files.delete(dir.resolve("survey.csv"));
      Files.delete(dir.resolve("survey.html"));
      Files.writeString(dir.resolve("variants/12.yaml"), "half a fi");
      assertEquals(ExitCode.DONE, survey(dir, VARY).code());
      Folders.assertSame(done, dir, "in " + dir);
    }
  }

  @Test
  void partsJoinedAreTheWhole() throws IOException {
    Path[] parts = new Path[3];
    for (int k = 1; k <= 3; k++) {
      parts[k - 1] = folder.resolve("part-" + k);
      assertEquals(ExitCode.DONE, survey(parts[k - 1], and(VARY, "--part", k + "/3")).code());
      assertEquals(4, csv(parts[k - 1]).size());
    }
    Path whole = folder.resolve("joined");
    Run r =
        Run.of("survey", "--join", parts[2] + "", parts[0] + "", parts[1] + "", "-o", whole + "");
    assertEquals(ExitCode.DONE, r.code(), r.err());
    Folders.assertSame(done, whole, "in " + whole);
    Run missing =
        Run.of("survey", "--join", parts[2] + "", parts[0] + "", "-o", folder.resolve("x") + "");
    assertEquals(ExitCode.BAD_INPUT, missing.code());
    assertTrue(missing.err().contains("part 2/3 is missing"), missing.err());
    Run twice = Run.of("survey", "--join", parts[0] + "", parts[0] + "");
    assertEquals(ExitCode.BAD_INPUT, twice.code());
    assertEquals(ExitCode.DISK, Run.of("survey", "--join", folder + "").code());
  }

  @Test
  void pageAsksForNothingFromOutside() throws IOException {
    String page = Files.readString(done.resolve("survey.html"));
    assertTrue(page.contains("default-src 'none'"));
    assertFalse(page.replace("http://www.w3.org/2000/svg", "").matches("(?s).*https?:.*"));
    String data = page.substring(page.indexOf("id=\"data\">") + 10, page.indexOf("</script>"));
    Map<String, Object> read = JSON.std.mapFrom(data);
    assertEquals(12, ((List<?>) read.get("rows")).size());
    assertFalse(data.contains("<"));
  }

  @Test
  void variantsOfOtherRulesCarryThemAlong() throws IOException {
    Path rules = folder.resolve("own.yaml");
    assertEquals(0, Run.of("new", "standard", rules.toString()).code());
    Path dir = folder.resolve("own");
    Run r = survey(dir, "--vary", "coil.turns=1,2", "--fab", rules.toString());
    assertEquals(ExitCode.DONE, r.code(), r.err());
    assertTrue(Files.readString(dir.resolve("variants/1.yaml")).contains("../fab.yaml"));
    assertEquals(0, Run.of("check", dir.resolve("variants/1.yaml").toString()).code());
    Path two = folder.resolve("two");
    Run v = survey(two, "--vary", "coil.turns=1", "fab=economy,fine," + rules);
    assertEquals(ExitCode.DONE, v.code(), v.err());
    assertTrue(Files.readString(two.resolve("variants/2.yaml")).contains("fab: \"fine\""));
    assertEquals(0, Run.of("check", two.resolve("variants/3.yaml").toString()).code());
  }

  @Test
  void whatIsWrongIsSaidBeforeAnythingIsDone() {
    Path dir = folder.resolve("never");
    wrong(dir, "unknown-key", "--vary", "coil.trak=0.2mm,0.3mm");
    wrong(dir, "no end", "--vary", "coil.track=0.1mm..x/3");
    wrong(dir, "twice", "--vary", "coil.turns=1", "--vary", "coil.turns=2");
    wrong(dir, "--vary", "--rank", "coilOhm");
    wrong(dir, "torque.motorConstant", "--vary", "coil.turns=1", "--rank", "motorConstand");
    wrong(dir, "condition", "--vary", "coil.turns=1", "--keep", "coilOhm <");
    wrong(dir, "K/N", "--vary", "coil.turns=1", "--part", "3/2");
    wrong(dir, "more than", "--vary", "coil.turns=1..99999", "board.layers=1..99999");
    assertFalse(Files.exists(dir));
  }

  private static void wrong(Path dir, String words, String... args) {
    Run r = survey(dir, args);
    assertEquals(ExitCode.BAD_INPUT, r.code(), r.err());
    assertTrue(r.err().contains(words), r.err());
  }

  @Test
  void foldersOfOthersAreLeftAlone() throws IOException {
    Path dir = Files.createDirectories(folder.resolve("mine"));
    Files.writeString(dir.resolve("letter.txt"), "dear");
    assertEquals(ExitCode.DISK, survey(dir, VARY).code());
    Run other = survey(done, "--vary", "coil.turns=1");
    assertEquals(ExitCode.DISK, other.code());
    assertTrue(other.err().contains("another survey"), other.err());
  }

  @Test
  void noVariantThatKeepsTheRules() {
    Run r = survey(folder.resolve("none"), "--vary", "coil.turns=500,600");
    assertEquals(ExitCode.REFUSED, r.code(), r.err());
    assertTrue(r.out().contains("2 could not be drawn"), r.out());
  }
}
