package etchloom.proof.read;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import etchloom.geometry.Point;
import etchloom.proof.image.DxfFile;
import etchloom.proof.image.DxfFile.Circle;
import etchloom.proof.image.DxfFile.Polyline;
import etchloom.proof.image.DxfFile.Text;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Group codes after the DXF Reference (R12 and 2000), recalled; the samples are from a script. */
class DxfReaderTest {
  private static DxfFile read(String pairs) throws UnreadableFile {
    String text = pairs.strip().replaceAll(" +", "\n") + "\n";
    return DxfReader.read("t.dxf", text.getBytes(StandardCharsets.UTF_8));
  }

  private static DxfFile drawn(int units, String entities) throws UnreadableFile {
    return read(
        "0 SECTION 2 HEADER 9 $INSUNITS 70 "
            + units
            + " 0 ENDSEC 0 SECTION 2 TABLES 0 TABLE 2"
            + " LAYER 0 LAYER 2 A 70 0 0 ENDTAB 0 ENDSEC 0 SECTION 2 ENTITIES "
            + entities
            + " 0 ENDSEC 0 EOF");
  }

  private static double area(String entities) throws UnreadableFile {
    return TestCopper.of(DxfImage.outlines(drawn(4, entities), "A")).getArea();
  }

  @ParameterizedTest
  @ValueSource(strings = {"round.dxf", "round-r12.dxf"})
  void samples(String name) throws UnreadableFile {
    DxfFile f = DxfReader.read(name, Samples.file(name));
    boolean old = name.contains("r12");
    assertEquals(old ? "AC1009" : "AC1015", f.version());
    // R12 cannot say its unit.
    assertEquals(old ? 1 : 0, f.warnings().size(), () -> f.warnings().toString());
    assertEquals(true, f.layers().contains("L1_TOP"));
    List<Polyline> spirals =
        f.entities().stream()
            .filter(e -> e.layer().equals("L1_TOP") && e instanceof Polyline)
            .map(e -> (Polyline) e)
            .toList();
    assertEquals(0.3, spirals.get(0).widthMm());
    // The same half circles and lines as in the Gerber sample.
    double halfCircles = Math.PI * (1.2 + 1.4 + 1.6 + 1.8 + 2.0 + 2.2 + 2.4 + 2.6);
    assertEquals(halfCircles + 4 + 20.6, spirals.get(0).path().lengthMm(), 1e-9);
  }

  @Test
  void closedPolylineOfTwoHalfCircles() throws UnreadableFile {
    Polyline p =
        (Polyline)
            drawn(4, "0 LWPOLYLINE 8 A 90 2 70 1 43 0.0 10 1.0 20 0.0 42 1.0 10 -1.0 20 0.0 42 1.0")
                .entities()
                .get(0);
    assertEquals(true, p.closed());
    assertEquals(2 * Math.PI, p.path().lengthMm(), 1e-12);
    assertEquals(Math.PI, Contours.signedAreaMm2(p.path()), 1e-12);
  }

  @Test
  void bulgeIsTheTangentOfAQuarterOfTheSweep() throws UnreadableFile {
    double b = Math.tan(Math.PI / 8);
    Polyline p =
        (Polyline)
            drawn(4, "0 LWPOLYLINE 8 A 90 2 70 0 43 0.2 10 2.0 20 0.0 42 -" + b + " 10 0.0 20 -2.0")
                .entities()
                .get(0);
    // A quarter circle clockwise about the origin.
    Point middle = p.path().segments().get(0).at(0.5);
    assertEquals(Math.sqrt(2), middle.x(), 1e-12);
    assertEquals(-Math.sqrt(2), middle.y(), 1e-12);
    assertEquals(0.2, p.widthMm());
    assertEquals(false, p.closed());
  }

  @Test
  void otherEntitiesAndUnits() throws UnreadableFile {
    DxfFile f =
        drawn(
            1,
            "0 CIRCLE 8 A 10 1.0 20 2.0 30 0.0 40 0.5 0 LINE 8 A 10 0.0 20 0.0 11 1.0 21 0.0"
                + " 0 ARC 8 A 10 0.0 20 0.0 40 1.0 50 270.0 51 90.0"
                + " 0 TEXT 8 A 10 1.0 20 1.0 40 0.1 1 U1 50 90.0 0 HATCH 8 A 0 HATCH 8 A"
                + " 0 CIRCLE 67 1 8 A 10 0.0 20 0.0 40 1.0");
    Circle c = (Circle) f.entities().get(0);
    assertEquals(12.7, c.radiusMm(), 1e-12);
    assertEquals(new Point(25.4, 50.8), c.centre());
    assertEquals(25.4, ((Polyline) f.entities().get(1)).path().lengthMm(), 1e-12);
    Polyline arc = (Polyline) f.entities().get(2);
    assertEquals(25.4 * Math.PI, arc.path().lengthMm(), 1e-9);
    assertEquals(25.4, arc.path().segments().get(0).at(0.5).x(), 1e-9);
    Text t = (Text) f.entities().get(3);
    assertEquals("U1", t.text());
    assertEquals(Math.PI / 2, t.rotationRad());
    assertEquals(4, f.entities().size());
    assertEquals(2, f.warnings().size());
    assertEquals("2 entities of kind HATCH are not read", f.warnings().get(1).message());
  }

  @Test
  void outlines_nested() throws UnreadableFile {
    String square = "0 LWPOLYLINE 8 A 90 4 70 1 10 0 20 0 10 9 20 0 10 9 20 9 10 0 20 9 ";
    // Clockwise, to show that the direction does not matter.
    String hole = "0 LWPOLYLINE 8 A 90 4 70 1 10 1 20 1 10 1 20 8 10 8 20 8 10 8 20 1 ";
    String island = "0 CIRCLE 8 A 10 3 20 3 40 1 ";
    String eye = "0 CIRCLE 8 A 10 3 20 3 40 0.5";
    double disc = Math.PI;
    assertEquals(81, area(square), 1e-9);
    assertEquals(81 - 49, area(hole + square), 1e-9);
    assertEquals(81 - 49 + disc, area(square + island + hole), 1e-4);
    assertEquals(81 - 49 + 0.75 * disc, area(eye + " " + square + island + hole), 1e-4);
    String second = " 0 CIRCLE 8 A 10 20 20 0 40 2 0 CIRCLE 8 A 10 20 20 1 40 0.5";
    assertEquals(81 + 3.75 * disc, area(square + second), 1e-4);
  }

  @Test
  void centreLines_roundPenAndDiscs() throws UnreadableFile {
    DxfFile f =
        drawn(
            4,
            "0 LWPOLYLINE 8 A 90 2 70 0 43 1 10 0 20 0 10 3 20 0 0 CIRCLE 8 A 10 9 20 0 40 1"
                + " 0 CIRCLE 8 B 10 0 20 0 40 1");
    double area = TestCopper.of(DxfImage.centreLines(f, "A")).getArea();
    assertEquals(3 + Math.PI / 4 + Math.PI, area, 1e-4);
    assertEquals("dxf-layer", f.warnings().get(0).code());
  }

  @ParameterizedTest(name = "{1}: {0}")
  @CsvSource({
    "0 LWPOLYLINE 8 A 90 3 70 0 10 0 20 0 10 1 20 1, polyline",
    "0 LWPOLYLINE 8 A 90 2 70 0 10 0 20 0 40 1 41 2 10 1 20 1, width",
    "0 LWPOLYLINE 8 A 90 2 70 0 43 -1 10 0 20 0 10 1 20 1, width",
    "0 LWPOLYLINE 8 A 90 2 230 -1 10 0 20 0 10 1 20 1, tilted",
    "0 LWPOLYLINE 8 A 90 2 70 0 10 0 20 0 42 99999 10 1 20 1, bulge",
    "0 LWPOLYLINE 8 A 90 2 70 0 10 0 20 x 10 1 20 1, number",
    "0 CIRCLE 8 A 10 0 20 0 40 0, radius",
    "0 CIRCLE 8 A 10 1e11 20 0 40 1, coordinate-range",
    "0 POLYLINE 8 A 70 8 0 SEQEND, polyline",
    "0 POLYLINE 8 A 70 0 0 VERTEX 10 0 20 0, polyline",
    "0 POLYLINE 8 A 70 0 0 LINE 8 A, polyline",
    "10 5, dxf",
    "zero LINE, group-code"
  })
  void refused(String entities, String code) {
    UnreadableFile e = assertThrows(UnreadableFile.class, () -> drawn(4, entities));
    assertEquals(code, e.code(), e.getMessage());
    assertEquals(true, e.line() > 0);
  }

  @ParameterizedTest(name = "{1}: {0}")
  @CsvSource({
    "0 EOF, dxf",
    "0 SECTION 2 ENTITIES 0 ENDSEC, missing-end",
    "0 SECTION 2 ENTITIES 0 EOF, dxf",
    "0 SECTION 2 ENTITIES 0, truncated",
    "0 LINE, dxf"
  })
  void refusedFrame(String pairs, String code) {
    UnreadableFile e = assertThrows(UnreadableFile.class, () -> read(pairs));
    assertEquals(code, e.code(), e.getMessage());
  }

  @Test
  void outline_openOrWide_isRefused() throws UnreadableFile {
    DxfFile open = drawn(4, "0 LINE 8 A 10 0 20 0 11 1 21 0");
    assertThrows(UnreadableFile.class, () -> DxfImage.outlines(open, "A"));
    assertThrows(UnreadableFile.class, () -> DxfImage.centreLines(open, "A"));
    DxfFile wide = drawn(4, "0 LWPOLYLINE 8 A 70 1 43 1 10 0 20 0 10 1 20 0 10 1 20 1");
    assertThrows(UnreadableFile.class, () -> DxfImage.outlines(wide, "A"));
  }
}
