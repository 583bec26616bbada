package etchloom.watch;

import com.sun.net.httpserver.Headers;
import com.sun.net.httpserver.HttpExchange;
import com.sun.net.httpserver.HttpServer;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.net.InetAddress;
import java.net.InetSocketAddress;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;

/**
 * Serves what was last drawn to browsers of this machine.
 *
 * <p>Bound to 127.0.0.1 on a port that is free. Files are looked up by name among those of the set,
 * in memory, so no path can lead anywhere else. A request must name this very server as its host: a
 * foreign page whose name was made to point here cannot read anything.
 */
public final class PageServer implements AutoCloseable {
  private static final String REPORT = "report.html";
  private static final int THREADS = 4;

  private final HttpServer server;
  private final ExecutorService threads;
  private final List<String> hosts;
  private final byte[] script;
  private final byte[] style;
  private volatile Showing showing;
  private int shown;

  private PageServer(HttpServer server, ExecutorService threads) throws IOException {
    this.server = server;
    this.threads = threads;
    int port = server.getAddress().getPort();
    hosts = List.of("127.0.0.1:" + port, "localhost:" + port);
    showing = new Showing(version(), Optional.empty(), Optional.empty());
    script = resource("reload.js");
    style = resource("watch.css");
    server.setExecutor(threads);
    server.createContext("/", this::answer);
    server.start();
  }

  private static byte[] resource(String name) throws IOException {
    try (InputStream in = PageServer.class.getResourceAsStream(name)) {
      if (in == null) {
        throw new IllegalStateException(name + " is missing from the program");
      }
      return in.readAllBytes();
    }
  }

  /**
   * @throws IOException where no port can be had
   */
  public static PageServer open() throws IOException {
    InetAddress loopback = InetAddress.getByAddress(new byte[] {127, 0, 0, 1});
    HttpServer server = HttpServer.create(new InetSocketAddress(loopback, 0), 0);
    ExecutorService threads =
        Executors.newFixedThreadPool(
            THREADS,
            r -> {
              Thread t = new Thread(r, "page");
              t.setDaemon(true);
              return t;
            });
    return new PageServer(server, threads);
  }

  public InetSocketAddress address() {
    return server.getAddress();
  }

  public String url() {
    return "http://" + hosts.get(0) + "/";
  }

  /**
   * From now on this set; {@code report.html} among its files is the page.
   *
   * @param set names and bytes as written; not changed afterwards
   */
  public synchronized void show(SortedMap<String, byte[]> set) {
    showing = new Showing(version(), Optional.of(new TreeMap<>(set)), Optional.empty());
  }

  /** From now on this text instead, as it stands on the terminal; the last set stays at hand. */
  public synchronized void trouble(String text) {
    showing = new Showing(version(), showing.set(), Optional.of(text));
  }

  private String version() {
    return ProcessHandle.current().pid() + "-" + ++shown;
  }

  @Override
  public void close() {
    server.stop(0);
    threads.shutdownNow();
  }

  private void answer(HttpExchange e) throws IOException {
    try (e) {
      if (!isForUs(e)) {
        plain(e, 421, "This server answers for " + hosts.get(0) + " only.");
      } else if (!List.of("GET", "HEAD").contains(e.getRequestMethod())) {
        e.getResponseHeaders().set("Allow", "GET, HEAD");
        plain(e, 405, "Only GET and HEAD are answered.");
      } else {
        file(e);
      }
    }
  }

  private boolean isForUs(HttpExchange e) {
    List<String> named = e.getRequestHeaders().getOrDefault("Host", List.of());
    return named.size() == 1
        && hosts.contains(named.get(0).toLowerCase(Locale.ROOT))
        && e.getRequestURI().getRawAuthority() == null;
  }

  private void file(HttpExchange e) throws IOException {
    Showing now = showing;
    URI uri = e.getRequestURI();
    String path = uri.getPath() == null ? "" : uri.getPath();
    String name = path.startsWith("/") ? path.substring(1) : path;
    if (name.isEmpty()) {
      page(e, now, now.trouble().isPresent() || now.set().isEmpty());
    } else if (name.equals(REPORT) && now.file(REPORT).isPresent()) {
      page(e, now, false);
    } else if (name.equals(ServedCopy.VERSION)) {
      plain(e, 200, now.version());
    } else if (name.equals(ServedCopy.SCRIPT)) {
      send(e, 200, "text/javascript; charset=utf-8", script);
    } else if (name.equals(ServedCopy.STYLE)) {
      send(e, 200, "text/css; charset=utf-8", style);
    } else if (now.file(name).isPresent()) {
      send(e, 200, type(name), now.file(name).get());
    } else {
      plain(e, 404, "There is no such file in the set.");
    }
  }

  private void page(HttpExchange e, Showing now, boolean trouble) throws IOException {
    String page;
    if (trouble) {
      String link = now.file(REPORT).isPresent() ? "/" + REPORT : "";
      page = TroublePage.of(now.trouble().orElse("Being drawn."), link);
    } else {
      page = new String(now.file(REPORT).orElseThrow(), StandardCharsets.UTF_8);
    }
    String notice = !trouble && now.trouble().isPresent() ? TroublePage.notice() : "";
    ServedCopy copy = ServedCopy.of(page, now.version(), notice);
    e.getResponseHeaders().set("Content-Security-Policy", copy.policy());
    send(e, 200, "text/html; charset=utf-8", copy.html());
  }

  private static void plain(HttpExchange e, int status, String text) throws IOException {
    send(e, status, "text/plain; charset=utf-8", text.getBytes(StandardCharsets.UTF_8));
  }

  private static void send(HttpExchange e, int status, String type, byte[] body)
      throws IOException {
    Headers h = e.getResponseHeaders();
    h.set("Content-Type", type);
    h.set("Cache-Control", "no-store");
    h.set("X-Content-Type-Options", "nosniff");
    h.set("Referrer-Policy", "no-referrer");
    h.set("Cross-Origin-Resource-Policy", "same-origin");
    if (e.getRequestMethod().equals("HEAD")) {
      h.set("Content-Length", Integer.toString(body.length));
      e.sendResponseHeaders(status, -1);
      return;
    }
    e.sendResponseHeaders(status, body.length == 0 ? -1 : body.length);
    try (OutputStream out = e.getResponseBody()) {
      out.write(body);
    }
  }

  private static String type(String name) {
    return switch (name.substring(name.lastIndexOf('.') + 1)) {
      case "svg" -> "image/svg+xml";
      case "json", "gbrjob" -> "application/json";
      case "zip" -> "application/zip";
      default -> "text/plain; charset=utf-8";
    };
  }
}
