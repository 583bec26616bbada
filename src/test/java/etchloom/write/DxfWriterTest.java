package etchloom.write;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Arc;
import etchloom.geometry.Segment;
import etchloom.testing.ToyBoards;
import etchloom.write.outline.Areas;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/** Autodesk DXF Reference 2000: group codes, sections, tables; the bulge by its own definition. */
class DxfWriterTest {
  private record Tag(int code, String value) {}

  private record Vertex(double x, double y, double bulge) {}

  private record Polyline(String layer, boolean closed, double width, List<Vertex> vertices) {}

  private final Artwork four = ToyBoards.fourLayers();

  @Test
  void layers_areThoseOfTheSpecPage() {
    Set<String> used = new TreeSet<>();
    for (Tag t : tags(DxfWriter.lines(four))) {
      if (t.code == 8 && !t.value.equals("0")) {
        used.add(t.value);
      }
    }
    assertEquals(
        Set.of(
            "COPPER_L1",
            "COPPER_L2",
            "COPPER_L3",
            "COPPER_L4",
            "DRILL_PLATED",
            "DRILL_NONPLATED",
            "PROFILE",
            "MASK_TOP",
            "MASK_BOTTOM",
            "LEGEND_TOP"),
        used);
  }

  @Test
  void structure_isWhole() {
    for (byte[] file : List.of(DxfWriter.lines(four), DxfWriter.outlines(four))) {
      List<Tag> tags = tags(file);
      List<String> sections = new ArrayList<>();
      Set<String> handles = new HashSet<>();
      Set<String> owners = new HashSet<>();
      Set<String> layers = new HashSet<>();
      int seed = 0;
      int largest = 0;
      for (int i = 0; i < tags.size(); i++) {
        Tag t = tags.get(i);
        if (t.equals(new Tag(0, "SECTION"))) {
          sections.add(tags.get(i + 1).value);
        } else if (t.equals(new Tag(9, "$HANDSEED"))) {
          seed = Integer.parseInt(tags.get(++i).value, 16);
        } else if (t.code == 5 || t.code == 105) {
          assertTrue(handles.add(t.value), "handle " + t.value + " twice");
          largest = Math.max(largest, Integer.parseInt(t.value, 16));
        } else if (t.code == 330) {
          owners.add(t.value);
        } else if (t.equals(new Tag(100, "AcDbLayerTableRecord"))) {
          layers.add(tags.get(i + 1).value);
        }
      }
      assertEquals(
          List.of("HEADER", "CLASSES", "TABLES", "BLOCKS", "ENTITIES", "OBJECTS"), sections);
      owners.remove("0");
      assertTrue(handles.containsAll(owners), owners + " in " + handles);
      assertTrue(seed > largest);
      for (Tag t : tags) {
        assertTrue(t.code != 8 || layers.contains(t.value), t.value);
      }
      assertEquals(new Tag(0, "EOF"), tags.get(tags.size() - 1));
    }
  }

  /** Bulge: the tangent of a quarter of the angle, negative where clockwise from start to end. */
  @Test
  void tracks_areTheirCentreLines_arcsExact() {
    List<Polyline> got = polylines(tags(DxfWriter.lines(four)));
    List<Conductor> tracks = new ArrayList<>();
    for (int layer = 1; layer <= 4; layer++) {
      tracks.addAll(four.conductorsOn(layer));
    }
    for (int i = 0; i < tracks.size(); i++) {
      Conductor c = tracks.get(i);
      Polyline p = got.get(i);
      assertEquals("COPPER_L" + c.layer(), p.layer);
      assertEquals(c.widthMm(), p.width, 1e-9);
      assertEquals(c.path().segments().size() + 1, p.vertices.size());
      for (int k = 0; k < c.path().segments().size(); k++) {
        Segment s = c.path().segments().get(k);
        Vertex v = p.vertices.get(k);
        assertEquals(s.start().x(), v.x, 0);
        assertEquals(s.start().y(), v.y, 0);
        double sweep = s instanceof Arc a ? a.sweepRad() : 0;
        assertEquals(sweep, 4 * Math.atan(v.bulge), 1e-11);
      }
    }
  }

  @Test
  void padsAndHoles_areCircles() {
    List<String> circles = circles(tags(DxfWriter.lines(four)));
    for (Joint j : four.joints()) {
      for (int layer = j.firstLayer(); layer <= j.lastLayer(); layer++) {
        String pad = circle("COPPER_L" + layer, j.at().x(), j.at().y(), j.padMm() / 2);
        assertTrue(circles.contains(pad), pad);
      }
      j.hole()
          .ifPresent(
              d ->
                  assertTrue(
                      circles.contains(circle("DRILL_PLATED", j.at().x(), j.at().y(), d / 2))));
    }
    assertTrue(circles.contains(circle("DRILL_NONPLATED", -17, 0, 1.6)));
  }

  /** Closed outlines, no width; signed areas add up to the copper of an independent union. */
  @Test
  void outlines_areClosed_andRunAroundTheCopper() {
    List<Polyline> all = polylines(tags(DxfWriter.outlines(four)));
    for (int layer = 1; layer <= 4; layer++) {
      double area = 0;
      for (Polyline p : all) {
        assertTrue(p.closed);
        assertEquals(0, p.width, 0);
        if (p.layer.equals("COPPER_L" + layer)) {
          area += signedArea(p.vertices);
        }
      }
      assertEquals(1, area / Areas.jts(four, layer).getArea(), 5e-5);
    }
    double board = 0;
    for (Polyline p : all) {
      if (p.layer.equals("PROFILE")) {
        board = Math.max(board, Math.abs(signedArea(p.vertices)));
      }
    }
    assertEquals(Math.PI * 20 * 20, board, 1e-6);
  }

  private static double signedArea(List<Vertex> v) {
    double a = 0;
    for (int i = 0; i < v.size(); i++) {
      Vertex p = v.get(i);
      Vertex q = v.get((i + 1) % v.size());
      a += (p.x * q.y - p.y * q.x) / 2;
      double sweep = 4 * Math.atan(p.bulge);
      if (sweep != 0) {
        double r = Math.hypot(q.x - p.x, q.y - p.y) / (2 * Math.sin(Math.abs(sweep) / 2));
        a += r * r / 2 * (sweep - Math.sin(sweep));
      }
    }
    return a;
  }

  private static String circle(String layer, double x, double y, double r) {
    return layer
        + " "
        + Math.round(x * 1e6)
        + " "
        + Math.round(y * 1e6)
        + " "
        + Math.round(r * 1e6);
  }

  private static List<String> circles(List<Tag> tags) {
    List<String> out = new ArrayList<>();
    for (int i = 0; i < tags.size(); i++) {
      if (tags.get(i).equals(new Tag(0, "CIRCLE"))) {
        List<Tag> e = entity(tags, i);
        out.add(circle(text(e, 8), number(e, 10), number(e, 20), number(e, 40)));
      }
    }
    return out;
  }

  private static List<Polyline> polylines(List<Tag> tags) {
    List<Polyline> out = new ArrayList<>();
    for (int i = 0; i < tags.size(); i++) {
      if (tags.get(i).equals(new Tag(0, "LWPOLYLINE"))) {
        List<Tag> e = entity(tags, i);
        List<Vertex> v = new ArrayList<>();
        for (int k = 0; k < e.size(); k++) {
          if (e.get(k).code == 10) {
            boolean bulged = k + 2 < e.size() && e.get(k + 2).code == 42;
            v.add(
                new Vertex(
                    Double.parseDouble(e.get(k).value),
                    Double.parseDouble(e.get(k + 1).value),
                    bulged ? Double.parseDouble(e.get(k + 2).value) : 0));
          }
        }
        assertEquals(v.size(), (int) number(e, 90));
        out.add(new Polyline(text(e, 8), number(e, 70) == 1, number(e, 43), v));
      }
    }
    return out;
  }

  private static List<Tag> entity(List<Tag> tags, int from) {
    int to = from + 1;
    while (tags.get(to).code != 0) {
      to++;
    }
    return tags.subList(from + 1, to);
  }

  private static double number(List<Tag> e, int code) {
    return Double.parseDouble(text(e, code));
  }

  private static String text(List<Tag> e, int code) {
    return e.stream().filter(t -> t.code == code).findFirst().orElseThrow().value;
  }

  private static List<Tag> tags(byte[] file) {
    String[] lines = new String(file, StandardCharsets.US_ASCII).split("\r\n");
    assertEquals(0, lines.length % 2);
    List<Tag> out = new ArrayList<>();
    for (int i = 0; i < lines.length; i += 2) {
      out.add(new Tag(Integer.parseInt(lines[i].trim()), lines[i + 1]));
    }
    return out;
  }
}
