package etchloom.survey;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class JournalTest {
  @TempDir Path folder;

  private static Plan plan(String print) {
    return new Plan(
        print,
        "1",
        "A title",
        "a-title",
        Plan.GRID,
        List.of(new Axis("coil.turns", List.of("1", "2", "3"))),
        3,
        Part.WHOLE);
  }

  private static Row row(long n) {
    return new Row(
        n,
        Map.of("coil.turns", "" + n),
        true,
        "",
        Map.of("a.b", 1.0 / n, "c", 5L, "d", "w\u00f6rd, \"x\"", "e", true, "big", 1e22));
  }

  @Test
  void rowsComeBackAsTheyWere() throws IOException {
    try (Journal j = Journal.open(folder, plan("p"))) {
      assertEquals(1, j.next());
      j.append(row(1));
      j.append(row(2));
      assertThrows(IllegalStateException.class, () -> j.append(row(5)));
      assertThrows(SurveyTrouble.class, () -> Journal.open(folder, plan("p")), "locked");
    }
    List<Row> rows = new ArrayList<>();
    Journal.each(folder, rows::add);
    assertEquals(RowJson.write(row(2)), RowJson.write(rows.get(1)));
    assertEquals(row(1).values(), rows.get(0).values());
    assertEquals(1.0, rows.get(0).figures().get("a.b") instanceof Number x ? x.doubleValue() : 0);
    assertEquals(plan("p"), Journal.plan(folder));
  }

  @Test
  void cutAnywhereItGoesOn() throws IOException {
    try (Journal j = Journal.open(folder, plan("p"))) {
      for (int n = 1; n <= 3; n++) {
        j.append(row(n));
      }
    }
    Path file = folder.resolve(Journal.NAME);
    byte[] all = Files.readAllBytes(file);
    for (int cut = 0; cut <= all.length; cut++) {
      Files.write(file, java.util.Arrays.copyOf(all, cut));
      try (Journal j = Journal.open(folder, plan("p"))) {
        for (long n = j.next(); n <= 3; n++) {
          j.append(row(n));
        }
      }
      assertEquals(
          -1, Files.mismatch(file, Files.write(folder.resolve("all"), all)), "cut at " + cut);
      Files.delete(folder.resolve("all"));
    }
  }

  @Test
  void anotherSurveysFolderIsLeftAlone() throws IOException {
    Journal.open(folder, plan("p")).close();
    assertThrows(SurveyTrouble.class, () -> Journal.open(folder, plan("q")));
    Path other = Files.createDirectories(folder.resolve("other"));
    Files.writeString(other.resolve("letter.txt"), "mine");
    assertThrows(SurveyTrouble.class, () -> Journal.open(other, plan("p")));
    assertThrows(SurveyTrouble.class, () -> Journal.plan(other));
    Files.writeString(other.resolve(Journal.NAME), "{\"x\":1}\n");
    assertThrows(SurveyTrouble.class, () -> Journal.plan(other));
  }
}
