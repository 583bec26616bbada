package etchloom.watch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.testing.Page;
import java.io.IOException;
import java.net.InetAddress;
import java.net.InetSocketAddress;
import java.net.NetworkInterface;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.TreeMap;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Status codes after RFC 9110: 404, 405 with Allow, 421 for a host that is not ours. */
class PageServerTest {
  private static final String REPORT =
      "<html><head><meta charset=\"utf-8\"/>\n"
          + "<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src"
          + " 'unsafe-inline'; script-src 'unsafe-inline'\"/>\n"
          + "</head><body><p>\"</body>\" is text here</p></body></html>";

  private PageServer server;
  private InetSocketAddress at;

  @BeforeEach
  void open() throws IOException {
    server = PageServer.open();
    at = server.address();
    TreeMap<String, byte[]> set = new TreeMap<>();
    set.put("report.html", REPORT.getBytes(StandardCharsets.UTF_8));
    set.put("wheel.svg", "<svg/>".getBytes(StandardCharsets.UTF_8));
    set.put("wheel-L1.gbr", "M02*".getBytes(StandardCharsets.UTF_8));
    server.show(set);
  }

  @AfterEach
  void close() {
    server.close();
  }

  @Test
  void theSetsFilesAreServed_eachAsWhatItIs() throws IOException {
    assertEquals("<svg/>", Page.get(at, "/wheel.svg").body());
    assertTrue(Page.get(at, "/wheel.svg").head().contains("content-type: image/svg+xml"));
    Page gerber = Page.get(at, "/wheel-L1.gbr");
    assertEquals("M02*", gerber.body());
    assertTrue(gerber.head().contains("content-type: text/plain"), gerber.head());
    assertTrue(gerber.head().contains("x-content-type-options: nosniff"), gerber.head());
    assertTrue(gerber.head().contains("cache-control: no-store"), gerber.head());
  }

  @Test
  void onlyTheServedCopyReloads_andKeepsThePagesOwnPolicyBesides() throws IOException {
    Page page = Page.get(at, "/");
    assertEquals(page.body(), Page.get(at, "/report.html").body());
    assertTrue(page.body().contains("is text here</p><script src=\"/-/reload.js\""), page.body());
    assertFalse(page.body().contains("http-equiv"), page.body());
    assertTrue(
        page.head()
            .contains(
                "content-security-policy: default-src 'none'; style-src 'unsafe-inline' 'self';"
                    + " script-src 'unsafe-inline' 'self'; connect-src 'self';"
                    + " frame-ancestors 'none'\r\n"),
        page.head());
    assertTrue(page.body().contains("<link rel=\"stylesheet\" href=\"/-/watch.css\"/>\n</head>"));
    assertTrue(Page.get(at, "/-/watch.css").head().contains("content-type: text/css"));
    assertTrue(Page.get(at, "/-/reload.js").body().contains("location.reload()"));
  }

  @Test
  void everyChangeHasAVersionOfItsOwn_whichThePageHolds() throws IOException {
    String before = Page.get(at, "/-/version").body();
    assertTrue(Page.get(at, "/").body().contains("data-version=\"" + before + "\""));
    server.trouble("error[x]: no");
    String after = Page.get(at, "/-/version").body();
    assertNotEquals(before, after);
    assertTrue(Page.get(at, "/").body().contains("data-version=\"" + after + "\""));
  }

  @Test
  void troubleIsShownAsText_andTheLastSetStaysAtHand() throws IOException {
    server.trouble("error[x]: \"<img src=x onerror=alert(1)>\" & \u001b[31m\n\thint: none\n");
    Page page = Page.get(at, "/");
    assertEquals(200, page.status());
    assertTrue(
        page.body()
            .contains("&quot;&lt;img src=x onerror=alert(1)&gt;&quot; &amp; ?[31m\n    hint: none"),
        page.body());
    assertTrue(page.body().contains("href=\"/report.html\""), page.body());
    Page last = Page.get(at, "/report.html");
    assertTrue(
        last.body().contains("<body><p role=\"status\" class=\"watch-notice\""), last.body());
    assertEquals("<svg/>", Page.get(at, "/wheel.svg").body());
    server.show(
        new TreeMap<>(java.util.Map.of("report.html", REPORT.getBytes(StandardCharsets.UTF_8))));
    assertFalse(Page.get(at, "/report.html").body().contains("watch-notice\""));
    assertEquals(404, Page.get(at, "/wheel.svg").status(), "no longer in the set");
  }

  @Test
  void beforeAnythingWasDrawn_thereIsNoBoardToLinkTo() throws IOException {
    try (PageServer fresh = PageServer.open()) {
      fresh.trouble("error[x]: no");
      Page page = Page.get(fresh.address(), "/");
      assertTrue(page.body().contains("No board was drawn yet."), page.body());
      assertFalse(page.body().contains("report.html"), page.body());
      assertEquals(404, Page.get(fresh.address(), "/report.html").status());
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "/../../etc/passwd",
        "/%2e%2e/%2e%2e/etc/passwd",
        "/..%2f..%2fetc%2fpasswd",
        "/..\\..\\etc\\passwd",
        "/./wheel.svg",
        "/wheel.svg/",
        "/wheel.svg%00.html",
        "//wheel.svg",
        "/WHEEL.SVG",
        "/pom.xml",
        "/-/",
        "/-/../pom.xml",
        "*",
        "pom.xml"
      })
  void nothingButTheSetsOwnNamesIsFound(String path) throws IOException {
    Page page = Page.get(at, path);
    assertTrue(List.of(400, 404, 421).contains(page.status()), page.head());
    assertFalse(page.body().contains("<svg"), page.body());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "evil.example",
        "evil.example:PORT",
        "127.0.0.1",
        "127.0.0.1:1",
        "0.0.0.0:PORT",
        "[::1]:PORT",
        "127.0.0.1:PORT.evil.example",
        "localhost",
        "\u007f",
        ""
      })
  void aForeignHostIsRefused(String host) throws IOException {
    Page page = Page.ask(at, "GET /wheel.svg", host.replace("PORT", "" + at.getPort()));
    assertTrue(page.status() == 421 || page.status() == 400, page.head());
    assertFalse(page.body().contains("<svg"), page.body());
  }

  @Test
  void noHost_twoHosts_orATargetWithAHost_areRefused() throws IOException {
    String own = "Host: 127.0.0.1:" + at.getPort() + "\r\n";
    for (String lines :
        List.of(
            "GET /wheel.svg HTTP/1.0\r\n",
            "GET /wheel.svg HTTP/1.1\r\n" + own + "Host: evil.example\r\n",
            "GET http://evil.example/wheel.svg HTTP/1.1\r\n" + own)) {
      Page page = Page.raw(at, lines);
      assertTrue(page.status() == 421 || page.status() == 400, page.head());
      assertFalse(page.body().contains("<svg"), lines);
    }
    assertEquals(200, Page.ask(at, "GET /", "LOCALHOST:" + at.getPort()).status());
  }

  @ParameterizedTest
  @ValueSource(strings = {"POST", "PUT", "DELETE", "OPTIONS", "TRACE", "PATCH"})
  void nothingButReadingIsAllowed(String method) throws IOException {
    Page page = Page.ask(at, method + " /wheel.svg", "127.0.0.1:" + at.getPort());
    assertEquals(405, page.status());
    assertTrue(page.head().contains("allow: get, head"), page.head());
  }

  @Test
  void headTellsTheLengthAndSendsNothing() throws IOException {
    Page page = Page.ask(at, "HEAD /wheel.svg", "127.0.0.1:" + at.getPort());
    assertEquals(200, page.status());
    assertTrue(page.head().contains("content-length: 6"), page.head());
    assertEquals("", page.body());
  }

  @Test
  void noOtherAddressOfThisMachineAnswers() throws IOException {
    assertTrue(at.getAddress().isLoopbackAddress());
    List<InetAddress> others =
        NetworkInterface.networkInterfaces()
            .flatMap(NetworkInterface::inetAddresses)
            .filter(a -> !a.equals(at.getAddress()))
            .toList();
    for (InetAddress other : others) {
      InetSocketAddress there = new InetSocketAddress(other, at.getPort());
      assertThrows(IOException.class, () -> Page.get(there, "/"), other.toString());
    }
    InetSocketAddress next =
        new InetSocketAddress(InetAddress.getByAddress(new byte[] {127, 0, 0, 2}), at.getPort());
    assertThrows(IOException.class, () -> Page.get(next, "/"));
  }

  @Test
  void closed_nobodyListens() {
    server.close();
    assertThrows(IOException.class, () -> Page.get(at, "/"));
  }
}
