package etchloom.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** That what the other browser tests lean on can see a fault at all. */
@NeedsBrowser
class BrowserTest {
  private static Path page(Path dir, String body) throws Exception {
    return Files.writeString(dir.resolve("p.html"), body);
  }

  @Test
  void seesComplaintsAndRequests(@TempDir Path dir) throws Exception {
    Browser b = Browser.get();
    Path p =
        page(dir, "<title>t</title><img src=\"none.png\"><script>console.error('no')</script>");
    b.open(p.toUri());
    List<String> complaints = b.consoleComplaints();
    assertTrue(complaints.stream().anyMatch(c -> c.contains("no")), complaints.toString());
    List<String> requests = b.requests();
    assertEquals(2, requests.size(), requests.toString());
    assertTrue(requests.get(1).endsWith("/none.png"));
  }

  @Test
  void seesWhatIsHardToRead(@TempDir Path dir) throws Exception {
    Browser b = Browser.get();
    b.open(page(dir, "<p style=\"color:#aaa;background:#fff\">faint</p><img>").toUri());
    List<String> found = b.violations();
    for (String rule : List.of("color-contrast", "image-alt", "document-title")) {
      assertTrue(found.stream().anyMatch(v -> v.startsWith(rule)), rule + " in " + found);
    }
  }

  @Test
  void showsEitherScheme() {
    Browser b = Browser.get();
    for (String scheme : List.of("dark", "light")) {
      b.scheme(scheme);
      assertEquals(
          true, b.run("return matchMedia('(prefers-color-scheme: " + scheme + ")').matches"));
    }
  }
}
