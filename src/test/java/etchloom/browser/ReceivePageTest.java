package etchloom.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
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

/** The page of a delivery in Chromium: boards good, shorted and broken, one named with markup. */
@NeedsBrowser
class ReceivePageTest {
  private static final String NAME = "<img src=x onerror=window.ran=1>";

  @TempDir private static Path folder;

  private static URI page;

  private final Browser b = Browser.get();

  @BeforeAll
  static void receive() throws IOException {
    Path rows = folder.resolve("r.csv");
    Files.writeString(
        rows,
        "board,from,to,ohm,celsius\nlead,,,0.12,\n7,U1,V1,11.62,24.5\n7,V1,W1,11.60,24.5\n"
            + "7,W1,U1,11.65,24.5\n8,U1,V1,8.71,24.5\n8,V1,W1,11.58,24.5\n8,W1,U1,8.74,24.5\n"
            + "N,U1,V1,OL,24.5\nN,V1,W1,11.60,24.5\nN,W1,U1,OL,24.5\n".replace("N,", NAME + ","));
    Path out = folder.resolve("out");
    Run r = Run.of("receive", "templates/dosing-pump.yaml", rows.toString(), "-o", out.toString());
    assertEquals(1, r.code(), r.err());
    page = out.resolve("receive.html").toUri();
  }

  @BeforeEach
  void open() {
    b.scheme("light");
    b.size(1200, 900);
    b.open(page);
  }

  @Test
  void asksForNothing_complainsOfNothing_runsNothing() {
    assertEquals(List.of(), b.consoleComplaints());
    assertEquals(List.of(page.toString()), b.requests());
    assertEquals(true, b.run("return window.ran === undefined && document.images.length === 0"));
    assertTrue(b.find("table").getText().contains(NAME));
  }

  @Test
  void tellsVerdictAndCause() {
    String text = b.find("main").getText();
    assertTrue(text.contains("3 boards, 2 rejected"), text);
    assertTrue(text.contains("shorted-layers") && text.contains("open-phase"), text);
    assertEquals(
        9,
        b.findAll("table:last-of-type tbody").get(1).findElements(By.tagName("tr")).size(),
        "three pairs of each board");
  }

  @ParameterizedTest
  @CsvSource({"light, 1200", "dark, 1200", "dark, 380", "light, 380"})
  void accessibilityChecker_findsNothing(String scheme, int width) throws IOException {
    b.scheme(scheme);
    b.size(width, 900);
    b.open(page);
    assertEquals(List.of(), b.violations());
    assertEquals(
        true,
        b.run("return document.documentElement.scrollWidth <= innerWidth"),
        "the page itself scrolls sideways");
    String keep = System.getProperty("etchloom.pictures");
    if (keep != null) {
      Files.write(Path.of(keep, "receive-" + scheme + "-" + width + ".png"), b.wholePage());
    }
  }
}
