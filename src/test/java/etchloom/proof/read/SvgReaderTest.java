package etchloom.proof.read;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.DrawnObject.Stroke;
import etchloom.proof.image.SvgFile;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Areas in closed form; the drawing rules are those of SVG 1.1, chapters 7 to 9 and 11. */
class SvgReaderTest {
  private static final String ROOT =
      "<svg xmlns='http://www.w3.org/2000/svg' width='20mm' height='20mm' viewBox='0 0 20 20'>";

  private static SvgFile read(String text) throws UnreadableFile {
    return SvgReader.read("t.svg", text.getBytes(StandardCharsets.UTF_8));
  }

  private static double area(String body) throws UnreadableFile {
    SvgFile f = read(ROOT + "<g id='A'>" + body + "</g></svg>");
    return TestCopper.of(f.objects("A")).getArea();
  }

  static Stream<Arguments> areas() {
    String round = "fill='none' stroke='#000' stroke-linecap='round' stroke-width='1' ";
    double pi = Math.PI;
    return Stream.of(
        Arguments.of("circle", pi, "<circle cx='5' cy='6' r='1'/>"),
        Arguments.of("line", 3 + pi / 4, "<path " + round + "d='M1 1L4 1'/>"),
        Arguments.of("dot", pi / 4, "<path " + round + "d='M1 1Z'/>"),
        Arguments.of("relative, H and V", 4, "<path d='m1,1 2,0 0,2 h-2 z M5 5V5H5'/>"),
        Arguments.of("half disc", pi / 2, "<path d='M1 0A1 1 0 0 1-1 0Z'/>"),
        Arguments.of("flags without blanks", pi / 2, "<path d='M1,0a1,1,0,00-2,0z'/>"),
        Arguments.of("three quarters", 0.75 * pi, "<path d='M1 0A1 1 0 1 1 0-1L0 0Z'/>"),
        Arguments.of("the smaller rest", 0.25 * pi, "<path d='M1 0A1 1 0 0 0 0-1L0 0Z'/>"),
        Arguments.of("radius too small grows", pi / 2, "<path d='M1 0A.5.5 0 0 1-1 0Z'/>"),
        Arguments.of("closed stroke", 4 * 2 - 1 + pi / 4, "<path " + round + "d='M0 0H2V2H0Z'/>"),
        Arguments.of("hole by direction", 9 - 1, "<path d='M0 0H3V3H0ZM1 1V2H2V1Z'/>"),
        Arguments.of("same direction is no hole", 9, "<path d='M0 0H3V3H0ZM1 1H2V2H1Z'/>"),
        Arguments.of("even and odd", 8, "<path fill-rule='evenodd' d='M0 0H3V3H0ZM1 1H2V2H1Z'/>"),
        Arguments.of("scale", 9 * pi, "<g transform='scale(3)'><circle r='1'/></g>"),
        Arguments.of(
            "scaled stroke",
            4 * (3 + pi / 4),
            "<g transform='scale(2 -2)' " + round + "><path d='M1 1L4 1'/></g>"),
        Arguments.of(
            "matrix with turn",
            4 * pi,
            "<circle transform='translate(1 2) rotate(30)" + " matrix(0 2 -2 0 1 1)' r='1'/>"),
        Arguments.of(
            "style attribute",
            3 + pi / 4,
            "<path stroke-linecap='round' d='M1 1L4 1'"
                + " style='fill:none; stroke: red;stroke-width:1px'/>"),
        Arguments.of(
            "definitions and hidden things draw nothing",
            0,
            "<defs><circle r='1'/></defs>"
                + "<g display='none'><circle r='1'/></g><circle r='1' fill='none'/>"));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("areas")
  void area(String name, double areaMm2, String body) throws UnreadableFile {
    assertEquals(areaMm2, area(body), 1e-5 * Math.max(areaMm2, Math.PI), name);
  }

  @Test
  void unitsAndUpwardY() throws UnreadableFile {
    SvgFile f =
        read(
            "<svg width='1in' height='1in' viewBox='0 0 10 10'><path id='p' fill='none'"
                + " stroke='red' stroke-width='1' d='M0 0L10 5'/></svg>");
    Stroke s = (Stroke) f.objects("p").get(0);
    assertEquals(25.4, s.path().end().x(), 1e-12);
    assertEquals(-12.7, s.path().end().y(), 1e-12);
    assertEquals(2.54, s.widthMm(), 1e-12);
    assertEquals("stroke-end", f.warnings().get(0).code());
  }

  @Test
  void whatIsNotReadIsCounted() throws UnreadableFile {
    SvgFile f = read(ROOT + "<rect/><rect/><use/><text>x</text></svg>");
    assertEquals(2, f.warnings().size());
    assertEquals("2 elements of kind rect are not read", f.warnings().get(0).message());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "<html/>",
        "<svg>",
        "<svg><path d='M0 0C1 1 2 2 3 3'/></svg>",
        "<svg><path d='L1 1'/></svg>",
        "<svg><path d='M0 0A1 2 0 0 1 1 1'/></svg>",
        "<svg><path d='M0 0A1 1 0 2 1 1 1'/></svg>",
        "<svg><path d='M0 0L1'/></svg>",
        "<svg><circle r='-1'/></svg>",
        "<svg><circle r='1mm'/></svg>",
        "<svg><g transform='scale(1 2)'/></svg>",
        "<svg><g transform='skewX(3)'/></svg>",
        "<svg><path d='M0 0' stroke-width='-1'/></svg>",
        "<svg><g><svg/></g></svg>",
        "<svg width='20mm' height='30mm' viewBox='0 0 20 20'/>",
        "<!DOCTYPE svg [<!ENTITY a SYSTEM 'file:///etc/passwd'>]><svg><text>&a;</text></svg>",
        "<!DOCTYPE svg [<!ENTITY a 'b'><!ENTITY c '&a;&a;'>]><svg id='&c;'/>"
      })
  void refused(String text) {
    UnreadableFile e = assertThrows(UnreadableFile.class, () -> read(text));
    assertEquals(1, e.line(), e.getMessage());
  }

  @Test
  void threeFormatsOfTheSample_agree() throws UnreadableFile {
    SvgFile svg = SvgReader.read("round.svg", Samples.file("round.svg"));
    assertEquals(List.of(), svg.warnings());
    List<DrawnObject> gerber =
        GerberReader.read("round-L1.gbr", Samples.file("round-L1.gbr")).objects().stream()
            .filter(Stroke.class::isInstance)
            .toList();
    double wanted = TestCopper.of(gerber).getArea();
    assertEquals(wanted, TestCopper.of(svg.objects("L1_TOP")).getArea(), 1e-6);
    List<DrawnObject> dxf =
        DxfImage.centreLines(DxfReader.read("round.dxf", Samples.file("round.dxf")), "L1_TOP")
            .stream()
            .filter(Stroke.class::isInstance)
            .toList();
    assertEquals(wanted, TestCopper.of(dxf).getArea(), 1e-6);
  }
}
