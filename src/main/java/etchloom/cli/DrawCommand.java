package etchloom.cli;

import etchloom.report.Summary;
import etchloom.write.PublishFailure;
import etchloom.write.Publisher;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ForkJoinPool;
import java.util.function.BiConsumer;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code draw SPEC}: the main job, from a spec to a layer set in its folder. */
@Command(
    name = "draw",
    mixinStandardHelpOptions = true,
    description = "Draws a spec's board, checks it against the fab's rules, and writes its files.",
    sortOptions = false,
    synopsisHeading = "Usage: ")
final class DrawCommand implements Callable<Integer> {
  private final Console console;

  @Parameters(paramLabel = "SPEC", description = "the spec, a YAML file")
  private String spec;

  @Option(
      names = "-o",
      paramLabel = "DIR",
      description = "folder for the set; TITLE-REVISION beside the spec if left out")
  private String folder;

  @Option(
      names = "--force",
      description = "write even where rules are broken; the files then say DRAFT")
  private boolean force;

  @Option(
      names = "--watch",
      description =
          "draw again whenever the spec or its rules change; shows the page at an address"
              + " of this machine; Ctrl-C ends it")
  private boolean watch;

  @Mixin private CommonOptions options;

  DrawCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    if (watch && options.json()) {
      throw BadInput.of("draw", "usage", "--watch and --json exclude each other");
    }
    return watch
        ? WatchRun.run(spec, options.fab(), this::drawInPool, console)
        : drawInPool(console, (f, s) -> {});
  }

  private int drawInPool(Console console, BiConsumer<Path, SetFiles> written) {
    ForkJoinPool pool = new ForkJoinPool(Runtime.getRuntime().availableProcessors());
    try (DrawPace pace = new DrawPace(console, options.quiet(), true)) {
      return pool.submit(() -> draw(console, written, pace)).join();
    } finally {
      pool.shutdownNow();
    }
  }

  /**
   * Draws once.
   *
   * @param written is given the folder and the set, where one was published
   */
  private int draw(Console console, BiConsumer<Path, SetFiles> written, DrawPace pace) {
    InputFiles.Inputs in = InputFiles.read(spec, options.fab());
    Optional<Instant> created = OrderSheet.created(console);
    Making making = Making.of(in, false, created, pace);
    pace.clear();
    making.attempt().tell(console);
    boolean passed = making.attempt().passed();
    if (!passed && !force) {
      console.err().println("nothing was written; --force writes a set marked DRAFT");
      return ExitCode.REFUSED;
    }
    if (!passed) {
      making = Making.of(in, true, created, pace);
    }
    Path target = target(in);
    SetFiles set = making.whole();
    publish(target, set);
    pace.close();
    written.accept(target, set);
    if (options.json()) {
      console.print(set.files().get("report.json"));
    } else if (!options.quiet()) {
      String where = target + ", " + set.files().size() + " files";
      console.out().print(Summary.text(set.results(), Optional.of(where), console.colour()));
    }
    return passed ? ExitCode.DONE : ExitCode.REFUSED;
  }

  private static void publish(Path target, SetFiles set) {
    try {
      Publisher.publish(target, set.files());
    } catch (PublishFailure e) {
      throw new DiskTrouble(e.getMessage());
    }
  }

  private Path target(InputFiles.Inputs in) {
    if (folder != null) {
      return InputFiles.path(folder);
    }
    String name = in.file().spec().slug() + "-" + in.file().spec().revision();
    return in.specPath().resolveSibling(name);
  }
}
