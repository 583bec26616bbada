package etchloom.write;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.testing.TemplateBoards;
import etchloom.testing.ToyBoards;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.SortedMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** Gerber Layer Format Specification 2024.05; sections by name beside each check. */
class GerberLayersTest {
  private static final Pattern APERTURE = Pattern.compile("%ADD(\\d+)C,([0-9.]+)\\*%");
  private static final Pattern ARC = Pattern.compile("X(-?\\d+)Y(-?\\d+)I(-?\\d+)J(-?\\d+)D01\\*");
  private static final Pattern POINT = Pattern.compile("X(-?\\d+)Y(-?\\d+).*D0[123]\\*");

  private final SortedMap<String, byte[]> two = WriterContractTest.write(ToyBoards.twoLayers());
  private final SortedMap<String, byte[]> four = WriterContractTest.write(ToyBoards.fourLayers());

  /** "Header": attributes, format and unit once each, before apertures and objects. */
  @Test
  void header_standsInTheOrderOfTheFormat() {
    List<String> lines = lines(two, "toy-two-copper-L1.gbr");
    List<String> order =
        List.of(
            "%TF.GenerationSoftware,Etchloom,etchloom,0.1.0*%",
            "%TF.Part,Single*%",
            "%TF.FileFunction,Copper,L1,Top*%",
            "%TF.FilePolarity,Positive*%",
            "%FSLAX46Y46*%",
            "%MOMM*%",
            "%TA.AperFunction,Conductor*%",
            "%TD.AperFunction*%",
            "%LPD*%",
            "G75*",
            "G01*");
    int before = -1;
    for (String l : order) {
      int at = lines.indexOf(l);
      assertTrue(at > before, l + " at " + at);
      before = at;
    }
    assertEquals("M02*", lines.get(lines.size() - 1));
  }

  /** "Aperture definition": numbers from 10, never redefined; ours in rising order. */
  @Test
  void apertures_areNumberedInRisingOrderFromTen() {
    four.forEach(
        (name, bytes) -> {
          if (!name.endsWith(".gbr")) {
            return;
          }
          Matcher m = APERTURE.matcher(new String(bytes, StandardCharsets.US_ASCII));
          int expected = 10;
          while (m.find()) {
            assertEquals(expected++, Integer.parseInt(m.group(1)), name);
          }
          assertTrue(expected > 10, name);
        });
  }

  /** ".P": on the flash of a component's pad, on every layer that has it. */
  @Test
  void terminals_carryPartMarkAndFunction() {
    for (String layer : List.of("L1", "L2")) {
      String text = text(two, "toy-two-copper-" + layer + ".gbr");
      assertTrue(
          text.contains("%TO.P,X1,U1*%\nX4000000Y15000000D03*\n%TD.P*%\n"), "U1 on " + layer);
      assertTrue(
          text.contains("%TO.P,X1,U2*%\nX-4000000Y15000000D03*\n%TD.P*%\n"), "U2 on " + layer);
      assertTrue(text.contains("%TA.AperFunction,ComponentPad*%\n%ADD"));
    }
    String top = text(four, "toy-four-copper-L1.gbr");
    assertTrue(top.contains("%TA.AperFunction,SMDPad,CuDef*%\n"));
    assertTrue(top.contains("%TO.P,X1,U1*%\nX4500000Y-4500000D03*\n"));
    String inner = text(four, "toy-four-copper-L2.gbr");
    assertFalse(inner.contains("SMDPad"), "a bare pad is on L1 only");
    assertTrue(inner.contains("%TO.P,X1,U2*%"));
  }

  /** ".N": joined copper is one net. */
  @Test
  void copperAndPlatedHoles_carryTheirNet() {
    assertEquals(List.of("WINDING"), nets(text(two, "toy-two-copper-L1.gbr")));
    assertEquals(List.of("U", "V"), nets(text(four, "toy-four-copper-L1.gbr")));
    assertEquals(List.of("U", "V"), nets(text(four, "toy-four-plated.gbr")));
    assertEquals(List.of(), nets(text(four, "toy-four-nonplated.gbr")));
  }

  /** "FileFunction" values, and that openings make a mask file negative. */
  @Test
  void eachFile_saysWhatItIs() {
    assertTrue(text(four, "toy-four-copper-L2.gbr").contains("%TF.FileFunction,Copper,L2,Inr*%"));
    assertTrue(text(four, "toy-four-copper-L4.gbr").contains("%TF.FileFunction,Copper,L4,Bot*%"));
    for (String side : List.of("top", "bottom")) {
      String mask = text(four, "toy-four-mask-" + side + ".gbr");
      assertTrue(mask.contains("%TF.FilePolarity,Negative*%"));
      assertTrue(
          mask.contains(
              "%TF.FileFunction,Soldermask," + (side.equals("top") ? "Top" : "Bot") + "*%"));
      assertFalse(mask.contains("Pad*%"), "pad functions belong to copper");
    }
    assertTrue(text(four, "toy-four-profile.gbr").contains("%TF.FileFunction,Profile,NP*%"));
    assertTrue(text(four, "toy-four-plated.gbr").contains("%TF.FileFunction,Plated,1,4,PTH*%"));
    assertTrue(
        text(four, "toy-four-nonplated.gbr").contains("%TF.FileFunction,NonPlated,1,4,NPTH*%"));
  }

  /** ".MD5": over all bytes before the command, line ends left out. */
  @Test
  void checksum_isThatOfTheBytesBeforeIt() throws Exception {
    String text = text(four, "toy-four-copper-L1.gbr");
    int at = text.indexOf("%TF.MD5,");
    MessageDigest md = MessageDigest.getInstance("MD5");
    byte[] sum =
        md.digest(text.substring(0, at).replace("\n", "").getBytes(StandardCharsets.US_ASCII));
    assertEquals("%TF.MD5," + HexFormat.of().formatHex(sum) + "*%\nM02*\n", text.substring(at));
  }

  /**
   * "Circular plotting": the radii of start and end may differ; rounding to whole nanometres leaves
   * at most 2 · sqrt(2) nm. Arcs shorter than a few micrometres become draws.
   */
  @Test
  void arcs_haveOneRadius_andAreNotShort() {
    Artwork art = TemplateBoards.onGrid("dosing-pump");
    SortedMap<String, byte[]> set = WriterContractTest.write(art);
    int arcs = 0;
    for (String name : set.keySet()) {
      if (!name.endsWith(".gbr")) {
        continue;
      }
      long x = 0;
      long y = 0;
      for (String l : lines(set, name)) {
        Matcher p = POINT.matcher(l);
        if (!p.matches()) {
          continue;
        }
        long toX = Long.parseLong(p.group(1));
        long toY = Long.parseLong(p.group(2));
        Matcher m = ARC.matcher(l);
        if (m.matches()) {
          arcs++;
          double cx = x + Long.parseLong(m.group(3));
          double cy = y + Long.parseLong(m.group(4));
          double difference = Math.hypot(x - cx, y - cy) - Math.hypot(toX - cx, toY - cy);
          assertEquals(0, difference, 2.83, name + ": " + l);
          assertTrue(Math.hypot(toX - x, toY - y) >= 5_000, name + ": " + l);
        }
        x = toX;
        y = toY;
      }
    }
    assertTrue(arcs > 500, arcs + " arcs");
  }

  /** "Drill in Gerber": a flash of the finished size for each hole, the same holes as in XNC. */
  @Test
  void drillFiles_holdTheSameHolesInBothForms() {
    for (String kind : List.of("plated", "nonplated")) {
      List<String> gerber = new ArrayList<>();
      String size = "";
      String text = text(four, "toy-four-" + kind + ".gbr");
      for (String l : lines(four, "toy-four-" + kind + ".gbr")) {
        if (l.matches("D\\d+\\*")) {
          Matcher m = APERTURE.matcher(text);
          while (m.find()) {
            if (l.equals("D" + m.group(1) + "*")) {
              size = m.group(2);
            }
          }
        } else if (l.endsWith("D03*")) {
          Matcher m = POINT.matcher(l);
          assertTrue(m.matches());
          gerber.add(nm(size) + " " + m.group(1) + " " + m.group(2));
        }
      }
      assertEquals(xnc(text(four, "toy-four-" + kind + ".xnc")), gerber, kind);
    }
  }

  private static List<String> xnc(String text) {
    List<String> out = new ArrayList<>();
    List<String> sizes = new ArrayList<>();
    String size = "";
    for (String l : text.split("\n")) {
      if (l.matches("T\\d\\dC.*")) {
        sizes.add(nm(l.substring(4)));
      } else if (l.matches("T\\d\\d")) {
        size = sizes.get(Integer.parseInt(l.substring(1)) - 1);
      } else if (l.startsWith("X")) {
        String[] xy = l.substring(1).split("Y");
        out.add(size + " " + nm(xy[0]) + " " + nm(xy[1]));
      }
    }
    return out;
  }

  private static String nm(String mm) {
    return new java.math.BigDecimal(mm).movePointRight(6).toBigIntegerExact().toString();
  }

  private static List<String> nets(String text) {
    List<String> out = new ArrayList<>();
    Matcher m = Pattern.compile("%TO\\.N,([^*]*)\\*%").matcher(text);
    while (m.find()) {
      if (!out.contains(m.group(1))) {
        out.add(m.group(1));
      }
    }
    return out;
  }

  private static List<String> lines(SortedMap<String, byte[]> set, String name) {
    return List.of(text(set, name).split("\n"));
  }

  private static String text(SortedMap<String, byte[]> set, String name) {
    return WriterContractTest.text(set, name);
  }
}
