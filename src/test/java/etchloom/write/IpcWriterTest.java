package etchloom.write;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Joint;
import etchloom.testing.ToyBoards;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Columns, counted from 1, by the application note on IPC-D-356A: 1-3 operation, 4-17 net, 21-26
 * part, 28-31 pin, 32 mid-net, 33-38 hole, 39-41 access, 42-57 place, 58-67 size, 73-74 mask.
 */
class IpcWriterTest {
  private final Artwork art = ToyBoards.fourLayers();
  private final List<String> lines = lines(art);

  @Test
  void header_hasItsRecordsInOrder_inMicrometres() {
    List<String> parameters =
        lines.stream().filter(l -> l.startsWith("P  ")).map(l -> l.substring(3, 8)).toList();
    assertEquals(
        List.of("JOB  ", "CODE ", "UNITS", "TITLE", "NUM  ", "REV  ", "VER  ", "IMAGE"),
        parameters);
    assertTrue(lines.contains("P  UNITS CUST 1"));
    assertTrue(lines.contains("P  VER   IPC-D-356A"));
    assertEquals("999", lines.get(lines.size() - 1));
  }

  @Test
  void everyPadAndHole_isATestRecordOnItsColumns() {
    List<String> expected = new ArrayList<>();
    for (String net : List.of("U", "V")) {
      for (Joint j : art.joints()) {
        if (j.net().equals(net)) {
          expected.add(record(j));
        }
      }
    }
    List<String> got =
        lines.stream().filter(l -> l.startsWith("317") || l.startsWith("327")).toList();
    assertEquals(expected, got);
  }

  /** One joint spelt out by hand, so that the columns are not only our own arithmetic. */
  @Test
  void oneTerminalAndOneMountingHole_byHand() {
    assertTrue(
        lines.contains(
            "317U                X1    -U2   D1000PA00X+009000Y-013000X2000     R000 S0"));
    assertTrue(
        lines.contains(
            "327U                X1    -U1         A01X+004500Y-004500X2000     R000 S0"));
    assertTrue(
        lines.contains(
            "367N/C              MH    -     D3200UA00X-017000Y+000000X3200     R000 S0"));
  }

  /** Chords stand on the edge and leave it by no more than 5 um. */
  @Test
  void outline_followsTheEdge() {
    List<double[]> points = new ArrayList<>();
    for (String l : lines) {
      if (l.startsWith("389BOARD_EDGE") && !points.isEmpty()) {
        break; // the bore follows
      }
      if (l.startsWith("389") || l.startsWith("089")) {
        for (String p : l.substring(l.startsWith("389") ? 27 : 3).trim().split(" ")) {
          points.add(
              new double[] {
                Integer.parseInt(p.substring(1, 8)) / 1000.0,
                Integer.parseInt(p.substring(9)) / 1000.0
              });
        }
      }
    }
    assertTrue(points.size() > 100);
    for (int i = 1; i < points.size(); i++) {
      double[] a = points.get(i - 1);
      double[] b = points.get(i);
      assertEquals(20, Math.hypot(a[0], a[1]), 0.0008); // whole micrometres
      double middle = Math.hypot((a[0] + b[0]) / 2, (a[1] + b[1]) / 2);
      assertTrue(middle > 20 - 0.005 - 0.0008, "sagitta at point " + i);
    }
  }

  @Test
  void linesFitTheCard() {
    lines.forEach(l -> assertTrue(l.length() <= 80, l));
  }

  @Test
  void aLongNetName_isSpeltOutOnce() {
    List<String> out = lines(ToyBoards.fourLayers("Toy", "THE_FIRST_OF_ALL_NETS", "V", true));
    assertTrue(out.contains("P  NNAME1     THE_FIRST_OF_ALL_NETS"));
    assertTrue(out.stream().anyMatch(l -> l.startsWith("317NNAME1        ")));
    assertTrue(out.stream().noneMatch(l -> l.startsWith("317THE_FIRST")));
    assertTrue(out.stream().anyMatch(l -> l.startsWith("C  DRAFT")));
  }

  private static String record(Joint j) {
    boolean hole = j.hole().isPresent();
    return (hole ? "317" : "327")
        + pad(j.net(), 14)
        + "   "
        + pad(j.terminal() ? "X1" : "VIA", 6)
        + "-"
        + pad(j.mark(), 4)
        + (j.terminal() ? " " : "M")
        + (hole ? "D" + digits(j.hole().orElseThrow(), 4) + "P" : "      ")
        + (hole ? "A00" : "A01")
        + "X"
        + signed(j.at().x())
        + "Y"
        + signed(j.at().y())
        + "X"
        + digits(j.padMm(), 4)
        + "     R000 "
        + (j.terminal() ? "S0" : "S3");
  }

  private static String pad(String s, int n) {
    return (s + " ".repeat(n)).substring(0, n);
  }

  private static String digits(double mm, int n) {
    String s = "000000" + Math.round(Math.abs(mm) * 1000);
    return s.substring(s.length() - n);
  }

  private static String signed(double mm) {
    return (mm < 0 ? "-" : "+") + digits(mm, 6);
  }

  private static List<String> lines(Artwork art) {
    String text = new String(IpcWriter.write(art), StandardCharsets.US_ASCII);
    assertTrue(text.endsWith("\r\n"));
    return List.of(text.split("\r\n"));
  }
}
