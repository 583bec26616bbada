package etchloom.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.net.URI;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.openqa.selenium.OutputType;
import org.openqa.selenium.WebElement;
import org.openqa.selenium.interactions.Actions;
import org.openqa.selenium.interactions.WheelInput.ScrollOrigin;

/** The report page in Chromium: a whole set of two layers, rules broken, its title with markup. */
@NeedsBrowser
class ReportPageTest {
  @TempDir private static Path folder;

  private static URI page;

  private final Browser b = Browser.get();

  @BeforeAll
  static void draw() throws IOException {
    page = DrawnPages.broken(folder).resolve("report.html").toUri();
  }

  @BeforeEach
  void open() {
    b.scheme("light");
    b.size(1200, 900);
    b.open(page);
  }

  private List<Double> viewBox() {
    return Arrays.stream(b.find(".view > svg").getDomAttribute("viewBox").split(" "))
        .map(Double::valueOf)
        .toList();
  }

  private double width() {
    return viewBox().get(2);
  }

  private void keys(CharSequence... keys) {
    new Actions(b.driver()).sendKeys(keys).perform();
  }

  @Test
  void asksForNothing_complainsOfNothing() {
    assertEquals(List.of(), b.consoleComplaints());
    assertEquals(List.of(page.toString()), b.requests());
  }

  @Test
  void titleWithMarkup_isText_andRunsNothing() {
    assertEquals(DrawnPages.MARKUP, b.find("h1").getText());
    assertEquals(DrawnPages.MARKUP + ", revision A", b.driver().getTitle());
    assertEquals(true, b.run("return window.ran === undefined && document.images.length === 0"));
  }

  /** Were markup to get in all the same, the page's policy would not let it run. */
  @Test
  void policy_runsNoOtherScript() {
    b.run(
        "const s = document.createElement('script'); s.textContent = 'window.ran = 1';"
            + "document.body.append(s)");
    assertEquals(true, b.run("return window.ran === undefined"));
    assertFalse(b.consoleComplaints().isEmpty());
  }

  @Test
  void layerSwitches_changeThePicture() throws IOException {
    WebElement bar = b.find(".bar[data-layer='1']");
    WebElement view = b.find(".view");
    b.run("arguments[0].scrollIntoView({block: 'start'})", view);
    List<byte[]> seen = new ArrayList<>();
    for (String state : List.of("shown", "faded", "hidden", "shown")) {
      assertEquals(state, bar.findElement(By.className("state")).getText());
      assertEquals(
          Map.of("shown", "true", "faded", "mixed", "hidden", "false").get(state),
          bar.getDomAttribute("aria-pressed"));
      seen.add(view.getScreenshotAs(OutputType.BYTES));
      bar.click();
    }
    assertTrue(changed(seen.get(0), seen.get(1)) > 0.05, "faded looks like shown");
    assertTrue(changed(seen.get(1), seen.get(2)) > 0.02, "hidden looks like faded");
    assertTrue(changed(seen.get(0), seen.get(3)) < 0.001, "shown again");
    b.find(".bar[data-layer='2']").sendKeys(Keys.ENTER);
    assertEquals("faded", b.find("#copper-L2").getDomAttribute("data-view"));
  }

  /** The share of pixels that differ to the eye; edges may be smoothed otherwise. */
  private static double changed(byte[] a, byte[] b) throws IOException {
    BufferedImage x = ImageIO.read(new ByteArrayInputStream(a));
    BufferedImage y = ImageIO.read(new ByteArrayInputStream(b));
    assertEquals(x.getWidth(), y.getWidth());
    assertEquals(x.getHeight(), y.getHeight());
    int n = 0;
    for (int i = 0; i < x.getWidth(); i++) {
      for (int j = 0; j < x.getHeight(); j++) {
        int green = (x.getRGB(i, j) >> 8 & 0xff) - (y.getRGB(i, j) >> 8 & 0xff);
        n += Math.abs(green) > 16 ? 1 : 0;
      }
    }
    return (double) n / (x.getWidth() * x.getHeight());
  }

  @Test
  void keys_zoomAndMove() {
    double home = width();
    b.run("document.querySelector('.view').focus()");
    keys("+");
    assertEquals(home / 1.4, width(), 1e-6);
    double x = viewBox().get(0);
    keys(Keys.ARROW_RIGHT);
    assertTrue(viewBox().get(0) > x);
    keys("-", "-");
    assertEquals(home, width(), 1e-9, "no farther out than the whole board");
    keys("+", "+", "0");
    assertEquals(home, width(), 1e-9);
    for (WebElement tool : b.findAll(".tools [data-do=in], .tools [data-do=left]")) {
      List<Double> before = viewBox();
      tool.click();
      assertNotEquals(before, viewBox(), tool.getDomAttribute("aria-label"));
    }
  }

  @Test
  void mouse_zoomsAndDrags() {
    WebElement view = b.find(".view");
    b.run("arguments[0].scrollIntoView({block: 'center'})", view);
    double home = width();
    new Actions(b.driver()).scrollFromOrigin(ScrollOrigin.fromElement(view), 0, -400).perform();
    assertTrue(width() < home, "wheel");
    List<Double> before = viewBox();
    new Actions(b.driver())
        .moveToElement(view)
        .clickAndHold()
        .moveByOffset(60, 40)
        .release()
        .perform();
    assertTrue(viewBox().get(0) < before.get(0) && viewBox().get(1) < before.get(1), "drag");
    assertEquals(before.get(2), viewBox().get(2), 1e-9);
  }

  @Test
  void twoFingers_zoom_oneMoves() {
    WebElement view = b.find(".view");
    b.run("arguments[0].scrollIntoView({block: 'center'})", view);
    Map<?, ?> box =
        (Map<?, ?>)
            b.run(
                "const r = arguments[0].getBoundingClientRect();"
                    + "return {x: r.left + r.width / 2, y: r.top + r.height / 2}",
                view);
    double x = ((Number) box.get("x")).doubleValue();
    double y = ((Number) box.get("y")).doubleValue();
    double home = width();
    touch("touchStart", x - 40, y, x + 40, y);
    touch("touchMove", x - 80, y, x + 80, y);
    touch("touchMove", x - 120, y, x + 120, y);
    touch("touchEnd");
    assertTrue(width() < home / 1.8, "pinch: " + home + " to " + width());
    List<Double> before = viewBox();
    touch("touchStart", x, y);
    touch("touchMove", x + 30, y + 20);
    touch("touchMove", x + 60, y + 40);
    touch("touchEnd");
    assertTrue(viewBox().get(0) < before.get(0) && viewBox().get(1) < before.get(1), "drag");
  }

  private void touch(String type, double... xy) {
    List<Map<String, Object>> points = new ArrayList<>();
    for (int i = 0; i < xy.length; i += 2) {
      points.add(Map.of("x", xy[i], "y", xy[i + 1], "id", i / 2));
    }
    b.driver()
        .executeCdpCommand("Input.dispatchTouchEvent", Map.of("type", type, "touchPoints", points));
  }

  @Test
  void coils_sayTheirDataUnderPointerAndFocus() {
    WebElement third = b.find("#coils path[data-coil='3']");
    b.run("arguments[0].scrollIntoView({block: 'center'})", third);
    String before = b.find(".said").getText();
    b.run("document.querySelector('#coils path').focus()");
    keys(Keys.ARROW_RIGHT, Keys.ARROW_RIGHT);
    assertEquals("3", b.run("return document.activeElement.dataset.coil"));
    String row =
        (String)
            b.run(
                "return Array.from(document.getElementById('coils-table').tBodies[0].rows[2].cells,"
                    + " c => c.textContent).join('|')");
    String told = b.find(".said").getText();
    for (String cell : row.split("\\|")) {
      assertTrue(told.contains(cell) || cell.endsWith("\u00b0"), cell + " in " + told);
    }
    keys(Keys.ENTER);
    assertEquals("true", third.getDomAttribute("aria-pressed"));
    keys(Keys.ENTER);
    b.run("document.activeElement.blur()");
    assertEquals(before, b.find(".said").getText());
    new Actions(b.driver()).moveToElement(b.find("#coils path[data-coil='5']"), 20, 20).perform();
    b.run(
        "document.querySelector(\"#coils path[data-coil='5']\")"
            + ".dispatchEvent(new PointerEvent('pointerenter'))");
    assertTrue(b.find(".said").getText().startsWith("Coil 5, phase "), b.find(".said").getText());
  }

  @Test
  void findings_leadToTheirRow_andBack() {
    WebElement mark = b.find("#marks .mark.broken");
    String row = mark.getDomAttribute("href").substring(1);
    assertTrue(mark.getDomAttribute("aria-label").startsWith("Broken: "));
    b.run("arguments[0].focus()", mark);
    keys(Keys.ENTER);
    assertEquals("#" + row, b.run("return location.hash"));
    assertEquals(true, b.run("return document.querySelector('tr:target') !== null"));
    double home = width();
    b.find("#" + row + " a").click();
    assertTrue(width() < home / 2, "zoomed to the place");
    assertEquals(mark.getDomAttribute("id"), b.run("return document.activeElement.id"));
    List<Double> box = viewBox();
    double x = Double.parseDouble(mark.getDomAttribute("data-x"));
    assertTrue(box.get(0) < x && x < box.get(0) + box.get(2));
    b.find(".findings").click();
    assertFalse(mark.isDisplayed());
  }

  /** From the top with the tab key alone, every control once; coils as one, with arrows inside. */
  @Test
  void tabReachesEveryControl() {
    b.run(
        "window.seen = []; addEventListener('focusin', e => seen.push(e.target));"
            + "document.querySelectorAll('details').forEach(d => { d.open = true; });");
    long controls =
        (Long)
            b.run(
                "window.controls = Array.from(document.querySelectorAll("
                    + "'a[href], button, summary, [tabindex=\"0\"]'))"
                    + ".filter(e => e.checkVisibility()); return controls.length");
    assertTrue(controls > 80, controls + " controls");
    for (long left = controls + 2; left > 0; left -= 40) {
      CharSequence[] tabs = new CharSequence[(int) Math.min(left, 40)];
      Arrays.fill(tabs, Keys.TAB);
      keys(tabs);
    }
    assertEquals(
        List.of(),
        b.run("return controls.filter(e => !seen.includes(e)).map(e => e.outerHTML.slice(0, 90))"));
  }

  @Test
  void focus_isSeen() {
    for (String css :
        List.of(".bar", ".tools button", ".view", "nav a", "summary", "#coils path")) {
      b.run("document.querySelector('" + css + "').focus({focusVisible: true})");
      assertEquals(
          true,
          b.run(
              "const s = getComputedStyle(document.activeElement);"
                  + "return s.outlineStyle !== 'none' || parseFloat(s.strokeWidth) >= 2"),
          css);
    }
  }

  @ParameterizedTest
  @CsvSource({"light, 1200, false", "dark, 1200, false", "dark, 380, true"})
  void accessibilityChecker_findsNothing(String scheme, int width, boolean open) {
    b.scheme(scheme);
    b.size(width, 900);
    b.open(page);
    b.run("document.querySelectorAll('details').forEach(d => { d.open = " + open + "; })");
    assertEquals(List.of(), b.violations());
    assertEquals(
        true,
        b.run("return document.documentElement.scrollWidth <= innerWidth"),
        "the page itself scrolls sideways");
  }

  @Test
  void plots_areDrawn_andTellValuesUnderThePointer() {
    List<WebElement> plots = b.findAll(".plot");
    assertEquals(6, plots.size());
    for (WebElement p : plots) {
      b.run("arguments[0].scrollIntoView({block: 'center'})", p);
      String told = (String) b.run("return arguments[0].querySelector('.u-legend').innerText", p);
      new Actions(b.driver()).moveToElement(p.findElement(By.className("u-over"))).perform();
      String now = (String) b.run("return arguments[0].querySelector('.u-legend').innerText", p);
      assertNotEquals(told, now, p.getDomAttribute("id"));
      assertTrue(now.matches("(?s).*[0-9].*"), now);
      assertEquals(
          true,
          b.run(
              "const c = arguments[0].querySelector('canvas:not(.sample)');"
                  + "const d = c.getContext('2d').getImageData(0, 0, c.width, c.height).data;"
                  + "return d.some(v => v !== 0)",
              p));
    }
  }

  @Test
  void printing_isInLightColoursAndWhole_andComesBack() {
    b.scheme("dark");
    b.open(page);
    b.find(".tools [data-do=in]").click();
    List<Double> before = viewBox();
    b.run("dispatchEvent(new Event('beforeprint'))");
    assertTrue(width() > before.get(2));
    assertEquals(
        "#000000",
        b.run("return getComputedStyle(document.documentElement).getPropertyValue('--ink')"));
    assertEquals(1280L, b.run("return document.querySelector('.uplot canvas').width"));
    b.run("dispatchEvent(new Event('afterprint'))");
    assertEquals(before, viewBox());
    assertNotEquals(
        "#000000",
        b.run("return getComputedStyle(document.documentElement).getPropertyValue('--ink')"));
  }
}
