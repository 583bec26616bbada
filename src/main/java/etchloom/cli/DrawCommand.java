package etchloom.cli;

import etchloom.report.Summary;
import etchloom.write.PublishFailure;
import etchloom.write.Publisher;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ForkJoinPool;
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

  @Mixin private CommonOptions options;

  DrawCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    ForkJoinPool pool = new ForkJoinPool(Runtime.getRuntime().availableProcessors());
    try {
      return pool.submit(this::draw).join();
    } finally {
      pool.shutdownNow();
    }
  }

  private Integer draw() {
    InputFiles.Inputs in = InputFiles.read(spec, options.fab());
    Optional<Instant> created = OrderSheet.created(console);
    Making making = Making.of(in, false, created);
    making.attempt().tell(console);
    boolean passed = making.attempt().passed();
    if (!passed && !force) {
      console.err().println("nothing was written; --force writes a set marked DRAFT");
      return ExitCode.REFUSED;
    }
    if (!passed) {
      making = Making.of(in, true, created);
    }
    Path target = target(in);
    SetFiles set = making.whole();
    publish(target, set);
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
