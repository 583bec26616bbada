package etchloom.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.testing.Run;
import java.io.IOException;
import java.net.URI;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.openqa.selenium.WebElement;
import org.openqa.selenium.interactions.Actions;

/** The page of a survey in Chromium: variants that pass, that break rules, that cannot be drawn. */
@NeedsBrowser
class SurveyPageTest {
  private static final int VARIANTS = 16;

  /** Of 500 turns there is no board. */
  private static final int DRAWN = 12;

  @TempDir private static Path folder;

  private static URI page;

  private final Browser b = Browser.get();

  @BeforeAll
  static void survey() throws IOException {
    String spec = Files.readString(Path.of("src/test/resources/survey/three-coils.yaml"));
    Path file = folder.resolve("coils.yaml");
    Files.writeString(
        file, spec.replaceFirst("(?m)^title:.*$", "title: '" + DrawnPages.MARKUP + "'"));
    Path out = folder.resolve("out");
    Run r =
        Run.of(
            "survey",
            file.toString(),
            "-o",
            out.toString(),
            "--vary",
            "coil.turns=1..3,500",
            "winding.connection=star,delta",
            "coil.track=0.12mm,0.2mm",
            "--rank",
            "motorConstant");
    assertEquals(0, r.code(), r.err());
    page = out.resolve("survey.html").toUri();
  }

  @BeforeEach
  void open() {
    b.scheme("light");
    b.size(1200, 900);
    b.open(page);
  }

  private void keys(CharSequence... keys) {
    new Actions(b.driver()).sendKeys(keys).perform();
  }

  private void pick(String id, String value) {
    b.find("#" + id + " option[value='" + value + "']").click();
  }

  /** Centres of the points, in the order of the variants' numbers. */
  private Object places() {
    return b.run(
        "return [...document.querySelectorAll('#plot circle')].map(c => c.getAttribute('aria-label')"
            + ".split(':')[0] + ' ' + c.getAttribute('cx') + ' ' + c.getAttribute('cy')).sort()");
  }

  private List<WebElement> rows() {
    return b.findAll("#body tr");
  }

  private WebElement point(String variant) {
    return b.find("#plot circle[aria-label^='variant " + variant + ":']");
  }

  @Test
  void asksForNothing_complainsOfNothing() {
    assertEquals(List.of(), b.consoleComplaints());
    assertEquals(List.of(page.toString()), b.requests());
    assertEquals(VARIANTS, rows().size());
    assertEquals(DRAWN, b.findAll("#plot circle").size());
    assertEquals(DRAWN / 2, b.findAll("#plot circle.broken").size());
  }

  @Test
  void titleWithMarkup_isText_andNoOtherScriptRuns() {
    assertEquals("Survey of " + DrawnPages.MARKUP, b.find("h1").getText());
    b.run(
        "const s = document.createElement('script'); s.textContent = 'window.ran = 1';"
            + "document.body.append(s)");
    assertEquals(true, b.run("return window.ran === undefined && document.images.length === 0"));
  }

  @Test
  void otherFiguresGiveAnotherPlot() {
    Object before = places();
    pick("x", "variant");
    assertNotEquals(before, places());
    pick("y", "coil.turns");
    String labels = b.find("#plot").getText();
    assertTrue(labels.contains("variant") && labels.contains("coil.turns"), labels);
    assertEquals(VARIANTS, b.findAll("#plot circle").size());
    String turns = b.find("#v5 td:nth-child(5)").getText();
    assertEquals("2", turns);
    assertTrue(point("5").getDomAttribute("aria-label").startsWith("variant 5: 5, 2"));
  }

  /** Against a plain comparison of each with each, of the numbers that the page was given. */
  @Test
  void whatNoOtherBeats_isMarked() {
    for (String ways : List.of("high high", "low high", "high low", "low low")) {
      pick("xway", ways.split(" ")[0]);
      pick("yway", ways.split(" ")[1]);
      Object wanted =
          b.run(
              "const d = JSON.parse(document.getElementById('data').textContent);"
                  + "const at = n => d.columns.indexOf(document.getElementById(n).value);"
                  + "const i = at('x'), j = at('y');"
                  + "const p = arguments[0] === 'low' ? -1 : 1, q = arguments[1] === 'low' ? -1 : 1;"
                  + "const r = d.rows.filter(v => v[1]).map(v => [v[0], p * v[4][i], q * v[4][j]]);"
                  + "return r.filter(a => !r.some(c => c[1] >= a[1] && c[2] >= a[2]"
                  + " && (c[1] > a[1] || c[2] > a[2]))).map(a => a[0]).sort((a, b) => a - b)",
              ways.split(" ")[0],
              ways.split(" ")[1]);
      Object found =
          b.run(
              "return [...document.querySelectorAll('#body tr.best')]"
                  + ".map(r => +r.id.slice(1)).sort((a, b) => a - b)");
      assertEquals(wanted, found, ways);
      assertEquals(((List<?>) wanted).size(), b.findAll("#plot circle.best").size(), ways);
    }
  }

  @Test
  void rowMarksItsPoint_andPointItsRow() {
    b.find("#v4 td:nth-child(3)").click();
    assertEquals("true", point("4").getDomAttribute("aria-pressed"));
    assertEquals(1, b.findAll("#plot circle.on").size());
    assertTrue(b.find("#said").getText().startsWith("Variant 4; coil.turns 1;"));
    WebElement other = point("8");
    b.run("arguments[0].scrollIntoView({block: 'center'})", other);
    new Actions(b.driver()).moveToElement(other).click().perform();
    assertEquals(1, b.findAll("#body tr.on").size());
    assertEquals(
        "true", b.find("#v8").findElement(By.tagName("button")).getDomAttribute("aria-pressed"));
    assertEquals("8.yaml", b.find("#said a").getText());
  }

  @Test
  void keysAlone_chooseAxesPointsRowsAndOrder() {
    b.run("document.getElementById('x').focus()");
    Object before = places();
    keys("v");
    assertEquals("variant", b.run("return document.getElementById('x').value"));
    assertNotEquals(before, places());
    keys(Keys.TAB, Keys.TAB, Keys.TAB, Keys.TAB);
    String first = (String) b.run("return document.activeElement.getAttribute('aria-label')");
    assertTrue(first.startsWith("variant 2:"), first);
    keys(Keys.ARROW_RIGHT, Keys.ARROW_RIGHT, Keys.ENTER);
    assertTrue(b.find("#v4").getDomAttribute("class").contains("on"));
    keys(Keys.ARROW_LEFT, Keys.SPACE);
    assertTrue(b.find("#v3").getDomAttribute("class").contains("on"));
    b.run("document.querySelector('#v6 button').focus()");
    keys(Keys.ENTER);
    assertEquals("true", point("6").getDomAttribute("aria-pressed"));
    b.run("document.querySelector('#head button').focus()");
    keys(Keys.ENTER);
    assertEquals("variant", b.run("return document.activeElement.textContent"), "focus was lost");
    assertEquals("v1", rows().get(0).getDomAttribute("id"));
    keys(Keys.ENTER);
    assertEquals("v" + VARIANTS, rows().get(0).getDomAttribute("id"));
    assertEquals("descending", b.find("#head th").getDomAttribute("aria-sort"));
  }

  @Test
  void everyRowLeadsToItsSpec() {
    for (WebElement a : b.findAll("#body a")) {
      URI spec = page.resolve(a.getDomAttribute("href"));
      assertTrue(Files.exists(Path.of(spec)), spec::toString);
    }
    assertEquals(VARIANTS, b.findAll("#body a").size());
  }

  @ParameterizedTest
  @CsvSource({"light, 1200", "dark, 1200", "dark, 380", "light, 380"})
  void accessibilityChecker_findsNothing(String scheme, int width) throws IOException {
    b.scheme(scheme);
    b.size(width, 900);
    b.open(page);
    b.find("#body button").click();
    assertEquals(List.of(), b.violations());
    assertEquals(
        true,
        b.run("return document.documentElement.scrollWidth <= innerWidth"),
        "the page itself scrolls sideways");
    String keep = System.getProperty("etchloom.pictures");
    if (keep != null) {
      Files.write(Path.of(keep, "survey-" + scheme + "-" + width + ".png"), b.wholePage());
    }
  }
}
