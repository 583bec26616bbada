package etchloom.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import etchloom.browser.Browser;
import etchloom.browser.NeedsBrowser;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Titles that no spec may have, straight into the page: text all the same. */
@NeedsBrowser
class HtmlTitleTest {
  @Test
  void markup_isShownAndRunsNothing(@TempDir Path folder) throws Exception {
    String title = "</title><script>window.ran=1</script><img src=x onerror=window.ran=1>";
    Results r = Samples.titled(Samples.template(Samples.SMALL), title);
    Path file = folder.resolve("report.html");
    Files.write(file, HtmlReport.write(r, Optional.empty()));
    Browser b = Browser.get();
    b.open(file.toUri());
    assertEquals(title, b.find("h1").getText());
    assertEquals(title + ", revision A", b.driver().getTitle());
    assertEquals(true, b.run("return window.ran === undefined && document.images.length === 0"));
    assertEquals(List.of(), b.consoleComplaints());
  }
}
