package etchloom.proof.read;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.geometry.Arc;
import etchloom.geometry.Point;
import etchloom.proof.image.DrillFile;
import etchloom.proof.image.DrillFile.DrilledHole;
import etchloom.proof.image.DrillFile.Slot;
import etchloom.proof.image.Plating;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Drill programs made by hand after the XNC Format Specification (2021.11), recalled; zero
 * suppression after the common definition of the NC drill formats 2.4 and 3.3.
 */
class DrillReaderTest {
  private static DrillFile read(String text) throws UnreadableFile {
    return DrillReader.read("t.xnc", text.getBytes(StandardCharsets.UTF_8));
  }

  /** A millimetre program with a 0.4 mm and a 1 mm tool, T01 chosen. */
  private static DrillFile mm(String body) throws UnreadableFile {
    return read("M48\nMETRIC\nT01C0.400\nT02C1.0\n%\nG05\nT01\n" + body + "M30\n");
  }

  private static void at(double x, double y, Point p) {
    assertEquals(x, p.x(), 1e-12);
    assertEquals(y, p.y(), 1e-12);
  }

  @Test
  void sample_plated() throws UnreadableFile {
    DrillFile f = DrillReader.read("round-pth.xnc", Samples.file("round-pth.xnc"));
    assertEquals(Plating.PLATED, f.plating());
    assertEquals(1, f.fromLayer());
    assertEquals(2, f.toLayer());
    assertEquals(3, f.holes().size());
    assertEquals(List.of(), f.warnings());
    DrilledHole via = f.holes().get(0);
    assertEquals("ViaDrill", via.function());
    assertEquals(0.4, via.diameterMm());
    at(11, 0, via.at());
    assertEquals(Plating.PLATED, via.plating());
    assertEquals("ComponentDrill", f.holes().get(2).function());
    at(-8, -4, f.holes().get(2).at());
  }

  @Test
  void sample_nonPlatedWithSlot() throws UnreadableFile {
    DrillFile f = DrillReader.read("round-npth.xnc", Samples.file("round-npth.xnc"));
    assertEquals(Plating.NON_PLATED, f.plating());
    assertEquals(2, f.holes().size());
    Slot s = f.slots().get(0);
    assertEquals(1.0, s.widthMm());
    at(-15, -1, s.path().start());
    at(-15, 1, s.path().end());
    assertEquals(Plating.NON_PLATED, s.plating());
    assertEquals("MechanicalDrill", s.function());
  }

  @Test
  void gerberForm_holdsTheSameHoles() throws UnreadableFile {
    DrillFile f = GerberDrill.of(GerberReader.read("round-pth.gbr", Samples.file("round-pth.gbr")));
    DrillFile nc = DrillReader.read("round-pth.xnc", Samples.file("round-pth.xnc"));
    assertEquals(nc.plating(), f.plating());
    assertEquals(nc.toLayer(), f.toLayer());
    assertEquals(nc.holes().size(), f.holes().size());
    for (int i = 0; i < 3; i++) {
      DrilledHole a = nc.holes().get(i);
      DrilledHole b = f.holes().get(i);
      assertEquals(a.at(), b.at());
      assertEquals(a.diameterMm(), b.diameterMm());
      assertEquals(a.function(), b.function());
      assertEquals(a.plating(), b.plating());
    }
  }

  @Test
  void gerberForm_drawIsSlot_dotIsHole() throws UnreadableFile {
    DrillFile f =
        GerberDrill.of(
            Samples.mm(
                "%TF.FileFunction,NonPlated,1,4,NPTH,Rout*%%ADD10C,1.5*%D10*G01*X0Y0D02*"
                    + "X3000000D01*X9000000Y0D02*D01*"));
    assertEquals(1, f.slots().size());
    assertEquals(3.0, f.slots().get(0).path().lengthMm());
    assertEquals(1, f.holes().size());
    at(9, 0, f.holes().get(0).at());
    assertEquals(4, f.toLayer());
    assertEquals(Plating.NON_PLATED, f.holes().get(0).plating());
  }

  @ParameterizedTest
  @CsvSource({
    "%ADD10R;1X1*%D10*X0Y0D03*",
    "%ADD10C;2X1*%D10*X0Y0D03*",
    "%ADD10C;2*%%LPC*%D10*X0Y0D03*",
    "G36*G01*X0Y0D02*X2000000D01*Y2000000D01*X0Y0D01*G37*"
  })
  void gerberForm_refusesWhatIsNoHole(String body) throws UnreadableFile {
    var image = Samples.mm(body.replace(';', ','));
    UnreadableFile e = assertThrows(UnreadableFile.class, () -> GerberDrill.of(image));
    assertEquals("drill-shape", e.code());
    assertEquals(4, e.line());
  }

  @Test
  void rout_lineAndArcs() throws UnreadableFile {
    DrillFile f =
        mm(
            """
            T02
            G00X0.0Y0.0
            M15
            G01X3.0Y0.0
            G03X3.0Y4.0A2.0
            X1.0Y4.0A1.0
            M16
            G05
            X9.0Y9.0
            """);
    assertEquals(1, f.slots().size());
    Slot s = f.slots().get(0);
    assertEquals(1.0, s.widthMm());
    assertEquals(3, s.path().segments().size());
    // Two half circles of radius 2 and 1 mm after 3 mm straight.
    assertEquals(3 + 3 * Math.PI, s.path().lengthMm(), 1e-12);
    assertEquals(1, f.holes().size());
  }

  @Test
  void rout_shortArcBulgesToTheSideOfItsSense() throws UnreadableFile {
    Slot s = mm("G00X2.0Y0.0\nM15\nG02X0.0Y-2.0A2.0\nM16\n").slots().get(0);
    Arc a = (Arc) s.path().segments().get(0);
    at(0, 0, a.centre());
    assertEquals(-Math.PI / 2, a.sweepRad(), 1e-12);
    Slot t = mm("G00X2.0Y0.0\nM15\nG03X0.0Y2.0I-2.0J0.0\nM16\n").slots().get(0);
    at(0, 0, ((Arc) t.path().segments().get(0)).centre());
  }

  @Test
  void inch_andFullTurnByCentre() throws UnreadableFile {
    DrillFile f =
        read(
            """
            M48
            INCH
            T1C0.1
            %
            T1
            X1.0Y-0.5
            G00X1.0Y0.0
            M15
            G03X1.0Y0.0I-1.0J0.0
            M16
            M30
            """);
    at(25.4, -12.7, f.holes().get(0).at());
    assertEquals(2.54, f.holes().get(0).diameterMm(), 1e-12);
    assertEquals(2 * Math.PI * 25.4, f.slots().get(0).path().lengthMm(), 1e-9);
    assertEquals(Plating.UNKNOWN, f.holes().get(0).plating());
  }

  @ParameterizedTest(name = "{0} {1} is {2} mm")
  @CsvSource({
    "'INCH,LZ', 0025, 6.35", // 00.25 inch, trailing zeros left out
    "'INCH,TZ', 5000, 12.7", // 0.5000 inch, leading zeros left out
    "'INCH,TZ', -1, -0.00254",
    "'METRIC,LZ', 0125, 12.5",
    "'METRIC,TZ', 12500, 12.5",
    "'METRIC,TZ,000.00', 1250, 12.5",
    "'METRIC,TZ', 12.5, 12.5",
  })
  void zeroSuppression(String unit, String number, double mm) throws UnreadableFile {
    DrillFile f = read("M48\n" + unit + "\nT1C0.1\n%\nT1\nX" + number + "Y0.0\nM30\n");
    assertEquals(mm, f.holes().get(0).at().x(), 1e-12);
    assertEquals("drill-format", f.warnings().get(0).code());
  }

  @Test
  void olderDialect_repeatsModalAndTools() throws UnreadableFile {
    DrillFile f =
        read(
            """
            %
            ; made by hand
            M48
            ;FILE_FORMAT=3:3
            FMAT,2
            METRIC,TZ
            ;TYPE=NON_PLATED
            T1F085S010C0.300
            ;TYPE=PLATED
            T2C0.5
            %
            G90
            G81
            T1
            X1.0Y2.0
            X3.0
            R3X1.0Y-1.0
            T2
            X7Y7
            T0
            M30
            """);
    assertEquals(6, f.holes().size());
    at(3, 2, f.holes().get(1).at());
    at(6, -1, f.holes().get(4).at());
    at(0.007, 0.007, f.holes().get(5).at());
    assertEquals(Plating.NON_PLATED, f.holes().get(0).plating());
    assertEquals(Plating.PLATED, f.holes().get(5).plating());
  }

  @Test
  void shortSlotIsHole() throws UnreadableFile {
    DrillFile f = mm("X1.0Y1.0G85X1.0Y1.0\nG00X2.0Y2.0\nM15\nM16\n");
    assertEquals(2, f.holes().size());
    assertEquals(2, f.warnings().size());
  }

  @ParameterizedTest(name = "{2}: {0}")
  @CsvSource({
    "M15;, 8, rout",
    "M16;, 8, rout",
    "G00X1.0Y1.0;G01X2.0Y2.0;, 9, rout",
    "G00X1.0Y1.0;M15;G01X2.0Y2.0;, 11, rout",
    "G00X1.0Y1.0;M15;T02;, 10, rout",
    "G00X1.0Y1.0;M15;G02X3.0Y1.0A0.9;, 10, arc-radius",
    "G00X1.0Y1.0;M15;G02X3.0Y1.0;, 10, arc-radius",
    "G00X1.0Y1.0;M15;G02X3.0Y1.0I0.9J0.0;, 10, arc-radius",
    "T03;, 8, undefined-tool",
    "T00;X1.0Y1.0;, 9, no-tool",
    "G91;, 8, incremental",
    "G41;, 8, unknown-command",
    "M97;, 8, unknown-command",
    "X1.0Y1.0G85;, 8, syntax",
    "G85X1.0Y1.0;, 8, syntax",
    "X1.0;, 8, syntax",
    "X1..0Y1.0;, 8, syntax",
    "x1.0Y1.0;, 8, syntax",
    "X1.0Y1.0Z1.0;, 8, unknown-command",
    "X9999999.0Y1.0;, 8, syntax",
    "R3X1.0;, 8, repeat",
    "X0.0Y0.0;R999999X1.0;R999999X-1.0;R999999X1.0;R999999X-1.0;, 12, too-large",
    "M72;, 8, unit"
  })
  void refused(String body, int line, String code) {
    UnreadableFile e = assertThrows(UnreadableFile.class, () -> mm(body.replace(';', '\n')));
    assertEquals(code, e.code(), e.getMessage());
    assertEquals(line, e.line(), e.getMessage());
    assertTrue(e.getMessage().startsWith("t.xnc:" + line + ": "), e.getMessage());
  }

  @ParameterizedTest(name = "{1}: {0}")
  @CsvSource({
    "'', not-a-drill-file",
    "'METRIC;M30;', not-a-drill-file",
    "'M48;METRIC;T1C0.1;', truncated",
    "'M48;METRIC;T1C0.1;%;T1;X1.0Y1.0;', missing-end",
    "'M48;T1C0.1;%;M30;', unit",
    "'M48;METRIC;INCH;%;M30;', unit",
    "'M48;METRIC,FZ;%;M30;', drill-format",
    "'M48;ICI,ON;%;M30;', incremental",
    "'M48;METRIC;T1C0.0;%;M30;', tool-size",
    "'M48;METRIC;T1C0.1;T1C0.2;%;M30;', tool-twice"
  })
  void refusedHeader(String text, String code) {
    UnreadableFile e = assertThrows(UnreadableFile.class, () -> read(text.replace(';', '\n')));
    assertEquals(code, e.code(), e.getMessage());
  }
}
