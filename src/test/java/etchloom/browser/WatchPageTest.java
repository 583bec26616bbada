package etchloom.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.spec.Templates;
import etchloom.testing.WatchedDraw;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.time.Duration;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The page of {@code draw --watch} in an open browser, which nobody touches. */
@NeedsBrowser
class WatchPageTest {
  private static final Duration PATIENCE = Duration.ofSeconds(60);

  private final Browser b = Browser.get();

  @TempDir Path folder;

  /** Until the page has this heading by itself. */
  private void heading(String wanted) throws InterruptedException {
    long end = System.nanoTime() + PATIENCE.toNanos();
    Object found = "";
    while (!wanted.equals(found)) {
      assertTrue(System.nanoTime() < end, "the page stayed at " + found);
      Thread.sleep(50);
      // As one script: between two calls the page may be another.
      found = b.run("const h = document.querySelector('h1'); return h ? h.textContent : ''");
    }
  }

  @Test
  void anOpenPageFollowsTheSpec_andSurvivesABrokenOne() throws Exception {
    String text = new String(Templates.bytes("dosing-pump"), StandardCharsets.UTF_8);
    Path spec = Files.writeString(folder.resolve("pump.yaml"), text);
    b.scheme("light");
    b.size(1200, 900);
    try (WatchedDraw watch = new WatchedDraw(spec.toString())) {
      watch.outcome(1);
      b.open(URI.create(watch.url()));
      heading("Dosing pump drive");
      b.run("window.kept = true");

      Path other = folder.resolve("pump.yaml~");
      Files.writeString(other, text.replaceFirst("title: .*", "title: Second pump"));
      Files.move(other, spec, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
      heading("Second pump");
      assertEquals(true, b.run("return window.kept === undefined"), "another page by now");

      String markup = "<img src=none onerror='window.ran=1'>: 1\n";
      Files.writeString(spec, text + markup);
      heading("Not drawn");
      String shown = b.find("pre").getText();
      assertTrue(shown.contains("pump.yaml:") && shown.contains("<img src=none"), shown);
      assertEquals(true, b.run("return window.ran === undefined && document.images.length === 0"));
      assertEquals(List.of(), b.violations());
      b.find("main a").click();
      heading("Second pump");
      String notice = b.find(".watch-notice").getText();
      assertTrue(notice.startsWith("Not the spec as it stands"), notice);

      Files.writeString(spec, text);
      heading("Dosing pump drive");
      assertEquals(List.of(), b.findAll(".watch-notice"));
      assertEquals(List.of(), b.consoleComplaints());
      List<String> requests = b.requests();
      assertTrue(requests.stream().allMatch(r -> r.startsWith(watch.url())), requests.toString());
      b.driver().get("about:blank");
    }
  }
}
