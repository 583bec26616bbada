package etchloom.write;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.geometry.Arc;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.testing.ToyBoards;
import java.io.ByteArrayInputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

/** SVG 1.1 (second edition); the path's grammar and arcs by chapter 8 and appendix F.6. */
class SvgWriterTest {
  private static final Pattern COMMAND = Pattern.compile("([MLAZ])([-0-9. ]*)");

  private final Artwork four = ToyBoards.fourLayers();

  @Test
  void groups_areALayerEach_theLowestFirst() throws Exception {
    List<String> ids = new ArrayList<>();
    NodeList groups = document(four).getElementsByTagName("g");
    for (int i = 0; i < groups.getLength(); i++) {
      String id = ((Element) groups.item(i)).getAttribute("id");
      if (!id.isEmpty()) {
        ids.add(id);
      }
    }
    assertEquals(
        List.of(
            "profile",
            "mask-bottom",
            "copper-L4",
            "copper-L3",
            "copper-L2",
            "copper-L1",
            "mask-top",
            "legend-top",
            "drill-plated",
            "drill-nonplated",
            "datum",
            "phases",
            "notes"),
        ids);
  }

  /** A user unit is a millimetre, and nothing of the board lies outside the view. */
  @Test
  void theView_isInMillimetres_andHoldsTheBoard() throws Exception {
    Element svg = document(four).getDocumentElement();
    String[] box = svg.getAttribute("viewBox").split(" ");
    assertEquals(svg.getAttribute("width"), box[2] + "mm");
    assertEquals(svg.getAttribute("height"), box[3] + "mm");
    double x = Double.parseDouble(box[0]);
    double y = Double.parseDouble(box[1]);
    assertTrue(x < -20 && y < -20); // the board is a disc of radius 20
    assertTrue(x + Double.parseDouble(box[2]) > 20 && y + Double.parseDouble(box[3]) > 20);
  }

  /** Each arc read back by its own rule: end points, radius and sweep give the centre. */
  @Test
  void copper_isDrawnAlongItsCentreLines() throws Exception {
    for (int layer = 1; layer <= 4; layer++) {
      List<Element> paths = paths(document(four), "copper-L" + layer);
      List<Conductor> tracks = four.conductorsOn(layer);
      assertEquals(tracks.size(), paths.size());
      for (int i = 0; i < tracks.size(); i++) {
        Conductor c = tracks.get(i);
        Element e = paths.get(i);
        assertEquals(c.widthMm(), Double.parseDouble(e.getAttribute("stroke-width")), 1e-9);
        checkPath(e.getAttribute("d"), c);
      }
    }
  }

  private static void checkPath(String data, Conductor c) {
    Matcher m = COMMAND.matcher(data);
    assertTrue(m.find());
    Point at = point(m.group(2), 0);
    close(c.path().start(), at);
    for (Segment s : c.path().segments()) {
      double sweep = s instanceof Arc a ? Math.abs(a.sweepRad()) : 0;
      int parts = sweep > Math.toRadians(170) ? 2 : 1;
      for (int k = 0; k < parts; k++) {
        assertTrue(m.find(), data);
        boolean arc = m.group(1).equals("A");
        Point to = point(m.group(2), arc ? 5 : 0);
        assertEquals(s instanceof Arc, arc);
        if (s instanceof Arc a) {
          String[] n = m.group(2).trim().split(" ");
          double r = Double.parseDouble(n[0]);
          assertEquals("0", n[3], "never more than half a turn");
          // F.6.5 with equal radii and flags: the centre lies at the chord's left for sweep 1 here,
          // since the flipped drawing turns the positive direction counter-clockwise.
          Point half = to.minus(at).times(0.5);
          double high = Math.sqrt(Math.max(0, r * r - half.dot(half)));
          Point left = new Point(-half.y(), half.x()).times(high / half.norm());
          Point centre = at.plus(half).plus(n[4].equals("1") ? left : left.times(-1));
          assertEquals(0, centre.distanceTo(a.centre()), 0.02, "places are rounded to 1 um");
          assertEquals(a.radiusMm(), r, 0.0006);
        }
        at = to;
      }
      close(s.end(), at);
    }
  }

  private static void close(Point a, Point b) {
    assertEquals(0, a.distanceTo(b), 0.0008);
  }

  private static Point point(String numbers, int from) {
    String[] n = numbers.trim().split(" ");
    return new Point(Double.parseDouble(n[from]), Double.parseDouble(n[from + 1]));
  }

  @Test
  void aDraftAndAHostileTitle_areSafe() throws Exception {
    Document d = document(ToyBoards.fourLayers("<b>&\"'\uD800 \u00d6l", "U", "V", true));
    String title = d.getElementsByTagName("title").item(0).getTextContent();
    assertTrue(title.startsWith("DRAFT - <b>&\"'? \u00d6l"), title);
    assertEquals(0, d.getElementsByTagName("b").getLength());
  }

  /** Neighbouring layers must differ for eyes that see no hue: in lightness, CIE L* by sRGB. */
  @Test
  void colours_differInLightness() {
    for (int layers : new int[] {2, 4, 6}) {
      for (int i = 1; i < layers; i++) {
        double upper = lightness(SvgWriter.colour(i, layers));
        double lower = lightness(SvgWriter.colour(i + 1, layers));
        assertTrue(lower - upper > 3, layers + " layers, L" + i + ": " + upper + ", " + lower);
      }
    }
    double board = lightness("#eceee8");
    assertTrue(board - lightness(SvgWriter.colour(4, 4)) > 15);
  }

  /** IEC 61966-2-1 for the linear values and Y; CIE 1976 L*. */
  private static double lightness(String hex) {
    double[] weight = {0.2126, 0.7152, 0.0722};
    double y = 0;
    for (int i = 0; i < 3; i++) {
      double v = Integer.parseInt(hex.substring(1 + 2 * i, 3 + 2 * i), 16) / 255.0;
      y += weight[i] * (v <= 0.04045 ? v / 12.92 : Math.pow((v + 0.055) / 1.055, 2.4));
    }
    return 116 * Math.cbrt(y) - 16;
  }

  private static List<Element> paths(Document d, String group) {
    NodeList groups = d.getElementsByTagName("g");
    List<Element> out = new ArrayList<>();
    for (int i = 0; i < groups.getLength(); i++) {
      Element g = (Element) groups.item(i);
      if (g.getAttribute("id").equals(group)) {
        NodeList paths = g.getElementsByTagName("path");
        for (int k = 0; k < paths.getLength(); k++) {
          out.add((Element) paths.item(k));
        }
      }
    }
    return out;
  }

  private static Document document(Artwork art) throws Exception {
    return DocumentBuilderFactory.newInstance()
        .newDocumentBuilder()
        .parse(new ByteArrayInputStream(SvgWriter.write(art)));
  }
}
