package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.jr.ob.JSON;
import etchloom.testing.Run;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** {@code receive} from the command line, on the dosing pump's board: 11.25 ohm between lines. */
class ReceiveCommandTest {
  private static final String SPEC = "templates/dosing-pump.yaml";
  private static final String HEAD = "board,from,to,ohm,celsius\n";
  private static final String GOOD = "1,U1,V1,11.3,20\n1,V1,W1,11.28,20\n1,W1,U1,11.32,20\n";

  @TempDir Path folder;

  private String file(String rows) throws IOException {
    return Files.writeString(folder.resolve("r.csv"), HEAD + rows).toString();
  }

  @SuppressWarnings("unchecked")
  private static List<Map<String, Object>> boards(String json) throws IOException {
    return (List<Map<String, Object>>) JSON.std.mapFrom(json).get("boards");
  }

  @Test
  void goodBoard() throws IOException {
    Run r = Run.of("receive", SPEC, file(GOOD));
    assertEquals(ExitCode.DONE, r.code(), r.err());
    assertTrue(r.out().contains("1 board, 0 rejected"), r.out());
    assertEquals("", r.err());
  }

  /** The same copper at 70 C has 1 + 0.00393 * 50 = 1.1965 times the resistance (IEC 60028). */
  @Test
  void warmBoardIsJudgedAtItsTemperature() throws IOException {
    double hot = 16.0 * 1.1965; // 16 of at most 16.4 at 20 C
    String rows = "1,U1,V1,%1$s,70\n1,V1,W1,%1$s,70\n1,W1,U1,%1$s,70\n".replace("%1$s", "" + hot);
    assertEquals(ExitCode.DONE, Run.of("receive", SPEC, file(rows)).code());
    assertEquals(
        ExitCode.REFUSED, Run.of("receive", SPEC, file(rows.replace(",70", ",20"))).code());
  }

  @Test
  void rejectedBoardsBadRowsAndFiles() throws IOException {
    String half = "2,U1,V1,8.5,20\n2,V1,W1,11.3,20\n2,U1,W1,8.5,20\n";
    String bad = "3,U1,V1,eleven,20\n3,V1,W1,11.3,20\n3,U1,W1,11.3,20\n";
    Path out = folder.resolve("out");
    Run r = Run.of("receive", SPEC, file(GOOD + half + bad), "--json", "-o", out.toString());
    assertEquals(ExitCode.REFUSED, r.code());
    assertTrue(r.err().contains("r.csv:8: error[reading]: ohm: eleven"), r.err());
    List<Map<String, Object>> boards = boards(r.out());
    assertEquals(List.of("1", "2", "3"), boards.stream().map(b -> b.get("board")).toList());
    assertEquals("none", boards.get(0).get("cause"));
    assertEquals("shorted-layers", boards.get(1).get("cause"));
    assertEquals("phase U", boards.get(1).get("where"));
    assertEquals(List.of("U1-V1"), boards.get(2).get("notMeasured"));
    assertEquals("unclear", boards.get(2).get("cause"));
    assertEquals(r.out(), Files.readString(out.resolve("receive.json")));
    assertEquals(9, Files.readAllLines(out.resolve("receive.csv")).size());
    String page = Files.readString(out.resolve("receive.html"));
    assertTrue(page.contains("shorted-layers"));
    assertFalse(page.contains("http://") || page.contains("https://"), "asks nothing from outside");
  }

  @Test
  void onlyBadRowsIsBadInput() throws IOException {
    assertEquals(ExitCode.BAD_INPUT, Run.of("receive", SPEC, file(GOOD + "2,U1,V1,x,1\n")).code());
    assertEquals(ExitCode.BAD_INPUT, Run.of("receive", SPEC, file("2,U1,V1,x,1\n")).code());
    assertEquals(ExitCode.BAD_INPUT, Run.of("receive", SPEC, SPEC).code());
    assertEquals(ExitCode.DISK, Run.of("receive", SPEC, "no-such.csv").code());
    assertEquals(ExitCode.BAD_INPUT, Run.of("receive", SPEC).code());
  }

  @Test
  void markupInNamesIsText() throws IOException {
    Path out = folder.resolve("out");
    Run.of("receive", SPEC, file(GOOD.replace("1,U1", "<b>1,U1")), "-o", out.toString());
    assertFalse(Files.readString(out.resolve("receive.html")).contains("<b>1"));
  }
}
