package etchloom.testing;

import etchloom.cli.App;
import etchloom.cli.Console;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.net.InetAddress;
import java.net.InetSocketAddress;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.function.Predicate;

/** {@code draw --watch} in a thread of this process, as a user has it on a terminal. */
public final class WatchedDraw implements AutoCloseable {
  private static final Duration PATIENCE = Duration.ofSeconds(60);

  private final ByteArrayOutputStream out = new ByteArrayOutputStream();
  private final ByteArrayOutputStream err = new ByteArrayOutputStream();
  private final ExecutorService thread = Executors.newSingleThreadExecutor();
  private final Future<Integer> code;

  public WatchedDraw(String spec, String... more) {
    List<String> args = new ArrayList<>(List.of("draw", spec, "--watch"));
    args.addAll(List.of(more));
    Console console = new Console(stream(out), stream(err), Map.of(), false);
    code = thread.submit(() -> App.run(args.toArray(String[]::new), console));
  }

  private static PrintStream stream(ByteArrayOutputStream to) {
    return new PrintStream(to, true, StandardCharsets.UTF_8);
  }

  public String out() {
    return out.toString(StandardCharsets.UTF_8);
  }

  public String err() {
    return err.toString(StandardCharsets.UTF_8);
  }

  /** Waits for so many lines of outcome, drawn or not. */
  public String outcome(int n) throws InterruptedException {
    long end = System.nanoTime() + PATIENCE.toNanos();
    while (System.nanoTime() < end) {
      List<String> lines = out().lines().filter(l -> !l.startsWith("page: ")).toList();
      if (lines.size() >= n) {
        return lines.get(n - 1);
      }
      Thread.sleep(20);
    }
    throw new AssertionError("no outcome " + n + " in time:\n" + out() + err());
  }

  public String url() {
    String line = out().lines().findFirst().orElseThrow();
    return line.substring("page: ".length(), line.indexOf("  "));
  }

  public InetSocketAddress address() throws IOException {
    String digits = url().replaceAll(".*:(\\d+)/$", "$1");
    InetAddress loopback = InetAddress.getByAddress(new byte[] {127, 0, 0, 1});
    return new InetSocketAddress(loopback, Integer.parseInt(digits));
  }

  /** The page, once it is as wanted. */
  public Page page(String path, Predicate<String> wanted) throws Exception {
    Page page = Page.get(address(), path);
    long end = System.nanoTime() + PATIENCE.toNanos();
    while (!wanted.test(page.body())) {
      if (System.nanoTime() > end) {
        throw new AssertionError("the page stayed\n" + page.body());
      }
      Thread.sleep(20);
      page = Page.get(address(), path);
    }
    return page;
  }

  /** Ends the command as an interrupt of its thread does, and gives its exit code. */
  public int end() throws InterruptedException, ExecutionException, TimeoutException {
    thread.shutdownNow();
    return code.get(PATIENCE.toSeconds(), TimeUnit.SECONDS);
  }

  @Override
  public void close() {
    thread.shutdownNow();
  }
}
