package etchloom.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

/** The page is written so that an XML parser reads it too; what it finds is held to WCAG 2.1. */
class HtmlReportTest {
  private static final String PICTURE =
      "<?xml version=\"1.0\"?>\n<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 1 1\">"
          + "<g id=\"copper-L1\"><path d=\"M0 0L1 1\"/></g></svg>\n";

  private static final Results SMALL = Samples.template(Samples.SMALL);

  private static String page(Results r) {
    return new String(HtmlReport.write(r, Optional.of(PICTURE)), StandardCharsets.UTF_8);
  }

  private static Document parsed(String page) throws Exception {
    return DocumentBuilderFactory.newInstance()
        .newDocumentBuilder()
        .parse(new ByteArrayInputStream(page.getBytes(StandardCharsets.UTF_8)));
  }

  private static List<Element> elements(Document d, String tag) {
    NodeList all = d.getElementsByTagName(tag);
    List<Element> out = new ArrayList<>();
    for (int i = 0; i < all.getLength(); i++) {
      out.add((Element) all.item(i));
    }
    return out;
  }

  static Stream<Results> boards() {
    return Stream.of(
        SMALL,
        Samples.with(SMALL, Samples.broken()),
        SMALL.withProof(Samples.proof()),
        Samples.Electric.STAR,
        Samples.Electric.BARE,
        Samples.titled(SMALL, "<script>alert(1)</script> & \"more\" '\u0007'"));
  }

  @ParameterizedTest
  @MethodSource("boards")
  void headingsTablesAndLinks(Results r) throws Exception {
    Document d = parsed(page(r));
    assertEquals("en", d.getDocumentElement().getAttribute("lang"));
    assertEquals(1, elements(d, "h1").size());
    assertEquals(10, elements(d, "h2").size());
    assertEquals(10, elements(d, "section").size());
    for (Element th : elements(d, "th")) {
      assertTrue(Set.of("col", "row").contains(th.getAttribute("scope")), th.getTextContent());
    }
    for (Element table : elements(d, "table")) {
      assertEquals(1, table.getElementsByTagName("caption").getLength());
    }
    Set<String> ids = new HashSet<>();
    for (Element e : elements(d, "*")) {
      assertTrue(!e.hasAttribute("id") || ids.add(e.getAttribute("id")), e.getAttribute("id"));
    }
    for (Element a : elements(d, "a")) {
      assertTrue(ids.contains(a.getAttribute("href").substring(1)), a.getAttribute("href"));
    }
    for (Element e : elements(d, "section")) {
      assertTrue(ids.contains(e.getAttribute("aria-labelledby")));
    }
  }

  @ParameterizedTest
  @MethodSource("boards")
  void asksForNothingFromOutside(Results r) {
    String page = page(r);
    assertTrue(page.length() < 3_000_000);
    String outside = page.replace("http://www.w3.org/2000/svg", "");
    outside = outside.replace("/*! https://github.com/leeoniya/uPlot (v1.6.30) */", "");
    for (String s : List.of("http:", "https:", " src=", "url(", "@import", "<link", "fetch(")) {
      assertFalse(outside.contains(s), s);
    }
    assertTrue(page.contains("default-src 'none'"));
    assertFalse(page.contains("unsafe"));
  }

  @Test
  void sectionsStandInOrder() throws Exception {
    List<String> names =
        elements(parsed(page(SMALL)), "h2").stream()
            .map(e -> e.getTextContent().replaceAll("^[0-9]+ ", ""))
            .toList();
    assertEquals(
        List.of(
            "Verdict",
            "The board",
            "The numbers that decide",
            "Electrical",
            "Thermal",
            "Drive set-up sheet",
            "Order sheet",
            "Acceptance sheet",
            "Cautions",
            "Basis of every figure"),
        names);
  }

  @Test
  void ripple_standsInTheVerdict() {
    String page = page(Samples.Electric.STAR);
    String verdict = page.substring(page.indexOf("id=\"s1\""), page.indexOf("id=\"s2\""));
    assertTrue(verdict.contains("PWM RIPPLE TOO GREAT"), verdict);
  }

  @Test
  void titleWithMarkup_isText() throws Exception {
    String title = "<script>alert(1)</script> & \"more\"";
    String page = page(Samples.titled(SMALL, title));
    assertFalse(page.contains("<script>alert"));
    assertEquals(title, elements(parsed(page), "h1").get(0).getTextContent());
  }

  /** What is drawn is for the eye or has a name; what the page adds to the board has names. */
  @Test
  void pictures_haveTextAlternatives() throws Exception {
    Document d = parsed(page(SMALL));
    for (Element svg : elements(d, "svg")) {
      Element up = (Element) svg.getParentNode();
      assertTrue(
          svg.getAttribute("aria-hidden").equals("true")
              || !up.getAttribute("aria-label").isEmpty());
    }
    assertEquals(1 + SMALL.artwork().layers(), elements(d, "svg").size(), "board and switches");
    Document full = parsed(page(Samples.Electric.STAR));
    List<Element> plots =
        elements(full, "div").stream().filter(e -> e.getAttribute("class").equals("plot")).toList();
    assertEquals(6, plots.size());
    plots.forEach(p -> assertFalse(p.getAttribute("aria-label").isEmpty()));
  }

  @Test
  void hugePicture_isLeftOut() throws Exception {
    String huge = "<svg>" + "x".repeat(HtmlReport.LARGEST_PICTURE) + "</svg>";
    byte[] page = HtmlReport.write(Samples.with(SMALL, Samples.broken()), Optional.of(huge));
    assertTrue(page.length < 3_000_000);
    assertFalse(
        new String(page, StandardCharsets.UTF_8).contains("href=\"#mark-"), "leads nowhere");
    assertEquals(0, elements(parsed(new String(page, StandardCharsets.UTF_8)), "svg").size());
  }

  @Test
  void verdict_isInWords() {
    assertTrue(page(SMALL).contains("<strong>MAY BE MADE</strong>:"));
    String broken = page(Samples.with(SMALL, Samples.broken()));
    assertTrue(broken.contains("<strong>MAY NOT BE MADE</strong>:"));
    assertTrue(broken.contains("phase U, coil 4, turn 7 and phase U, coil 4, turn 8"));
  }

  @Test
  void acceptanceSheet_hasEveryPairAndTheLimits() {
    String page = page(SMALL);
    String sheet = page.substring(page.indexOf("id=\"s8\""), page.indexOf("id=\"s9\""));
    SMALL.resistance().terminals().forEach(t -> assertTrue(sheet.contains(">" + t.key() + "<")));
    String most = Form.OHM.show(SMALL.resistance().worst().orElseThrow().maxTerminalOhm());
    assertTrue(sheet.contains(most.replace("ohm", "\u03a9")), most);
    assertTrue(sheet.contains("four wires"));
  }

  /** WCAG 2.1, 1.4.3: 4.5 to 1 for text; relative luminance by its glossary. */
  @Test
  void colours_haveContrastInLightAndDark() {
    String page = page(SMALL);
    List<Map<String, String>> themes = new ArrayList<>();
    Matcher roots = Pattern.compile(":root \\{([^}]*)\\}").matcher(page);
    while (roots.find()) {
      Map<String, String> colours = new java.util.HashMap<>();
      Matcher c = Pattern.compile("--(\\w+): (#[0-9a-f]{6})").matcher(roots.group(1));
      while (c.find()) {
        colours.put(c.group(1), c.group(2));
      }
      themes.add(colours);
    }
    assertEquals(3, themes.size(), "light, dark, print");
    for (Map<String, String> t : themes) {
      for (String ink : List.of("ink", "quiet", "copper", "good", "bad")) {
        for (String ground : List.of("paper", "panel")) {
          double ratio = contrast(t.get(ink), t.get(ground));
          assertTrue(ratio >= 4.5, ink + " on " + ground + ": " + ratio);
        }
      }
      for (int i = 1; i <= 6; i++) {
        // 1.4.11: 3 to 1 for what is drawn
        assertTrue(contrast(t.get("p" + i), t.get("paper")) >= 3, "line " + i);
      }
      assertTrue(contrast("#1b201e", t.get("sheet")) >= 4.5);
    }
  }

  private static double contrast(String a, String b) {
    double x = luminance(a);
    double y = luminance(b);
    return (Math.max(x, y) + 0.05) / (Math.min(x, y) + 0.05);
  }

  private static double luminance(String hex) {
    double[] c = new double[3];
    for (int i = 0; i < 3; i++) {
      double v = Integer.parseInt(hex.substring(1 + 2 * i, 3 + 2 * i), 16) / 255.0;
      c[i] = v <= 0.03928 ? v / 12.92 : Math.pow((v + 0.055) / 1.055, 2.4);
    }
    return 0.2126 * c[0] + 0.7152 * c[1] + 0.0722 * c[2];
  }

  @Test
  void sameBytesInEveryLocale() {
    String first = page(SMALL);
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.forLanguageTag("tr-TR"));
      assertEquals(first, page(SMALL));
    } finally {
      Locale.setDefault(before);
    }
  }
}
