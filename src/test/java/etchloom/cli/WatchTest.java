package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.spec.Templates;
import etchloom.testing.Page;
import etchloom.testing.Run;
import etchloom.testing.WatchedDraw;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.net.InetAddress;
import java.net.InetSocketAddress;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** {@code draw --watch} from outside: files change, and the page and the set follow. */
class WatchTest {
  @TempDir Path folder;

  @Test
  void thePageFollowsTheSpec_andABrokenOneLeavesTheLastBoard() throws Exception {
    String text = new String(Templates.bytes("dosing-pump"), StandardCharsets.UTF_8);
    Path spec = Files.writeString(folder.resolve("pump.yaml"), text);
    Path set = folder.resolve("set");
    try (WatchedDraw watch = new WatchedDraw(spec.toString(), "-o", set.toString())) {
      assertEquals("drawn: " + set + ", 22 files", watch.outcome(1));
      Page first = watch.page("/", b -> b.contains("<h1>Dosing pump drive</h1>"));
      String written = Files.readString(set.resolve("report.html"));
      assertFalse(written.contains("reload"), "the file on the disk has nothing of the server");
      String policy = "<meta http-equiv=\"Content-Security-Policy\".*?/>\n";
      String script = "<script src=\"/-/reload.js\".*?</script>\n";
      String style = "<link rel=\"stylesheet\" href=\"/-/watch.css\"/>\n";
      assertEquals(
          written.replaceFirst(policy, ""),
          first.body().replaceFirst(script, "").replaceFirst(style, ""));
      for (Map.Entry<String, byte[]> f : files(set).entrySet()) {
        Page page = Page.get(watch.address(), "/" + f.getKey());
        assertEquals(200, page.status(), f.getKey());
        if (!f.getKey().equals("report.html")) {
          assertEquals(new String(f.getValue(), StandardCharsets.UTF_8), page.body(), f.getKey());
        }
      }

      Files.writeString(spec, text.replaceFirst("title: .*", "title: Second pump"));
      assertEquals("drawn: " + set + ", 22 files", watch.outcome(2));
      watch.page("/", b -> b.contains("<h1>Second pump</h1>"));
      assertEquals(200, Page.get(watch.address(), "/second-pump.svg").status());
      assertEquals(404, Page.get(watch.address(), "/dosing-pump-drive.svg").status());

      Map<String, byte[]> good = files(set);
      Files.writeString(spec, text.replaceFirst("title: .*", "title: 3\n<b>loud</b>: 1"));
      assertEquals("not drawn; the page says why, the files are as they were", watch.outcome(3));
      Page broken = watch.page("/", b -> b.contains("<h1>Not drawn</h1>"));
      assertTrue(broken.body().contains("error[unknown-key]"), broken.body());
      assertTrue(broken.body().contains("&lt;b&gt;loud&lt;/b&gt;"), broken.body());
      assertFalse(broken.body().contains("<b>loud"), broken.body());
      assertTrue(watch.err().contains("pump.yaml:"), watch.err());
      same(good, files(set));
      Page last = Page.get(watch.address(), "/report.html");
      assertTrue(last.body().contains("<h1>Second pump</h1>"), last.body());

      Path other = Files.writeString(folder.resolve("pump.yaml~"), text);
      Files.move(other, spec, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
      assertEquals("drawn: " + set + ", 22 files", watch.outcome(4));
      watch.page("/", b -> b.contains("<h1>Dosing pump drive</h1>"));
      assertEquals(written, Files.readString(set.resolve("report.html")));
      assertEquals(421, Page.ask(watch.address(), "GET /", "evil.example").status());
      Files.createSymbolicLink(folder.resolve("link"), spec);
      for (String path :
          new String[] {"/../pump.yaml", "/%2e%2e/pump.yaml", "/link", "/pump.yaml"}) {
        assertEquals(404, Page.get(watch.address(), path).status(), path);
      }
      assertEquals(ExitCode.DONE, watch.end());
      InetSocketAddress at = watch.address();
      assertThrows(IOException.class, () -> Page.get(at, "/"));
    }
  }

  @Test
  void theRulesFileIsFollowedToo_andItsFindingsAreShown() throws Exception {
    String fab = new String(Templates.fabBytes("standard"), StandardCharsets.UTF_8);
    Path rules = Files.writeString(folder.resolve("own.yaml"), fab);
    String text = new String(Templates.bytes("dosing-pump"), StandardCharsets.UTF_8);
    Path spec = folder.resolve("pump.yaml");
    Files.writeString(spec, text.replaceFirst("(?m)^fab: \\S+", "fab: ./own.yaml"));
    try (WatchedDraw watch = new WatchedDraw(spec.toString(), "-o", folder + "/set")) {
      assertTrue(watch.outcome(1).startsWith("drawn: "), watch.err());
      Map<String, byte[]> good = files(folder.resolve("set"));
      Files.writeString(rules, "ring: nonsense\n" + fab);
      assertTrue(watch.outcome(2).startsWith("not drawn"), watch.out());
      watch.page("/", b -> b.contains("own.yaml:"));
      String strict = fab.replace("ring: {via: 0.13 mm", "ring: {via: 4 mm");
      assertFalse(strict.equals(fab), "no such rule in\n" + fab);
      Files.writeString(rules, strict);
      assertTrue(watch.outcome(3).startsWith("not drawn"), watch.out());
      watch.page("/", b -> b.contains("error[ring]"));
      same(good, files(folder.resolve("set")));
      Files.writeString(rules, fab);
      assertTrue(watch.outcome(4).startsWith("drawn: "), watch.out() + watch.err());
    }
  }

  @Test
  void forced_theBoardIsShownAsADraft() throws Exception {
    String text = new String(Templates.bytes("dosing-pump"), StandardCharsets.UTF_8);
    Path spec = folder.resolve("pump.yaml");
    Files.writeString(spec, text.replace("  space: 0.16 mm", "  space: 0.14 mm"));
    try (WatchedDraw watch = new WatchedDraw(spec.toString(), "--force")) {
      assertTrue(watch.outcome(1).startsWith("drawn as DRAFT: "), watch.out());
      assertTrue(watch.err().contains("error[space]"), watch.err());
      watch.page("/", b -> b.contains("DRAFT"));
    }
  }

  @Test
  void whatCannotBegin_isSaidAtOnce() {
    Run none = Run.of("draw", folder.resolve("none.yaml").toString(), "--watch");
    assertEquals(ExitCode.DISK, none.code());
    assertEquals("", none.out());
    Run json = Run.of("draw", "x.yaml", "--watch", "--json");
    assertEquals(ExitCode.BAD_INPUT, json.code());
    assertTrue(json.err().contains("--watch and --json exclude each other"), json.err());
  }

  /** The signal that the platform sends to end a process; Ctrl-C runs the same hooks. */
  @Test
  void asAProcessOfItsOwn_itEndsWhenAsked_andLeavesAWholeSet() throws Exception {
    Path spec = folder.resolve("pump.yaml");
    Files.write(spec, Templates.bytes("dosing-pump"));
    Process process =
        new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-XX:TieredStopAtLevel=1",
                "-cp",
                System.getProperty("java.class.path"),
                "etchloom.cli.Main",
                "draw",
                spec.toString(),
                "-o",
                folder.resolve("set").toString(),
                "--watch")
            .redirectErrorStream(true)
            .start();
    try (BufferedReader out =
        new BufferedReader(
            new InputStreamReader(process.getInputStream(), StandardCharsets.UTF_8))) {
      String url = out.readLine();
      assertTrue(url.startsWith("page: http://127.0.0.1:"), url);
      String drawn = out.readLine();
      assertTrue(drawn.startsWith("drawn: "), drawn);
      int port = Integer.parseInt(url.replaceAll(".*:(\\d+)/.*", "$1"));
      InetAddress loopback = InetAddress.getByAddress(new byte[] {127, 0, 0, 1});
      InetSocketAddress at = new InetSocketAddress(loopback, port);
      assertEquals(200, Page.get(at, "/").status());
      process.toHandle().destroy(); // the process's own method would close its output too
      assertTrue(process.waitFor(20, TimeUnit.SECONDS), "still running");
      assertEquals(null, out.readLine(), "nothing more is said");
      assertThrows(IOException.class, () -> Page.get(at, "/"));
      assertEquals(22, files(folder.resolve("set")).size());
      try (Stream<Path> all = Files.list(folder)) {
        assertFalse(all.anyMatch(p -> p.toString().endsWith("-new")), "half a set was left");
      }
    } finally {
      process.destroyForcibly();
    }
  }

  private static void same(Map<String, byte[]> one, Map<String, byte[]> other) {
    assertEquals(one.keySet(), other.keySet());
    one.forEach((f, bytes) -> assertArrayEquals(bytes, other.get(f), f));
  }

  private static Map<String, byte[]> files(Path folder) throws IOException {
    Map<String, byte[]> out = new TreeMap<>();
    try (Stream<Path> all = Files.list(folder)) {
      for (Path p : all.toList()) {
        out.put(p.getFileName().toString(), Files.readAllBytes(p));
      }
    }
    return out;
  }
}
