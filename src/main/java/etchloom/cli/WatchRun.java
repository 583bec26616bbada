package etchloom.cli;

import etchloom.spec.SpecReader;
import etchloom.watch.Changes;
import etchloom.watch.PageServer;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.BiConsumer;

/** {@code draw --watch}: draws again and again, and shows what came of it on a page. */
final class WatchRun {
  /** How long the end waits for a set that is being drawn and put in its place. */
  private static final long LAST_DRAW_SECONDS = 30;

  /** One run of the command as it is without {@code --watch}. */
  @FunctionalInterface
  interface Draw {
    /**
     * @param written is given the folder and the set, where one was published
     * @return the exit code
     */
    int once(Console console, BiConsumer<Path, SetFiles> written);
  }

  private final Draw draw;
  private final Console console;
  private final PageServer page;

  private WatchRun(Draw draw, Console console, PageServer page) {
    this.draw = draw;
    this.console = console;
    this.page = page;
  }

  /**
   * Comes back when its thread is interrupted; when the process is asked to end, what is being
   * written is finished first.
   *
   * @throws DiskTrouble where the spec cannot be read to begin with, or no port can be had
   */
  static int run(String spec, Optional<String> fab, Draw draw, Console console) {
    Path path = InputFiles.path(spec);
    InputFiles.bytes(path, spec, "spec", SpecReader.MAX_BYTES);
    CountDownLatch stop = new CountDownLatch(1);
    CountDownLatch ended = new CountDownLatch(1);
    Thread hook = new Thread(() -> end(stop, ended, console), "end of watch");
    try (PageServer page = PageServer.open()) {
      Runtime.getRuntime().addShutdownHook(hook);
      Changes changes = new Changes(path, b -> InputFiles.rulesFile(path, b, fab));
      WatchRun run = new WatchRun(draw, console, page);
      console.out().println("page: " + page.url() + "  (Ctrl-C ends)");
      do {
        run.draw();
      } while (changes.await(stop));
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    } catch (IOException e) {
      throw new DiskTrouble("no port for the page: " + InputFiles.reason(e));
    } finally {
      ended.countDown();
      forget(hook);
    }
    return ExitCode.DONE;
  }

  private static void end(CountDownLatch stop, CountDownLatch ended, Console console) {
    stop.countDown();
    try {
      if (!ended.await(LAST_DRAW_SECONDS, TimeUnit.SECONDS)) {
        console.err().println("what was being drawn is given up; the last set stays");
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private static void forget(Thread hook) {
    try {
      Runtime.getRuntime().removeShutdownHook(hook);
    } catch (IllegalStateException e) {
      // The process is ending, and the hook with it.
    }
  }

  private record Written(Path folder, SetFiles set) {}

  /** What a user is told goes to the terminal and, where nothing was drawn, to the page. */
  private void draw() {
    ByteArrayOutputStream told = new ByteArrayOutputStream();
    Optional<Written> written;
    try (PrintStream err = new PrintStream(told, true, StandardCharsets.UTF_8)) {
      written = draw(err);
    }
    String text = told.toString(StandardCharsets.UTF_8);
    console.err().print(text);
    if (written.isEmpty()) {
      page.trouble(text);
      console.out().println("not drawn; the page says why, the files are as they were");
      return;
    }
    SetFiles set = written.get().set();
    page.show(set.files());
    String what = set.results().rules().passed() ? "drawn: " : "drawn as DRAFT: ";
    console.out().println(what + written.get().folder() + ", " + set.files().size() + " files");
  }

  private Optional<Written> draw(PrintStream err) {
    AtomicReference<Written> written = new AtomicReference<>();
    try (PrintStream nowhere = new PrintStream(OutputStream.nullOutputStream())) {
      Console own = new Console(nowhere, err, console.environment(), false);
      draw.once(own, (folder, set) -> written.set(new Written(folder, set)));
    } catch (RuntimeException e) {
      App.failed(e, new Console(err, err, console.environment(), false));
    }
    return Optional.ofNullable(written.get());
  }
}
