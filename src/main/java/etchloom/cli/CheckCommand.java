package etchloom.cli;

import etchloom.report.ReportJson;
import etchloom.report.Summary;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code check}: the rule check of a spec, or of a folder of files from any tool. */
@Command(
    name = "check",
    mixinStandardHelpOptions = true,
    description =
        "Checks a spec's board, or a folder (or zip) of Gerber X2 and drill files from any tool,"
            + " against the fab's rules, and the folder's copper for opens, shorts and loops."
            + " Writes nothing.",
    sortOptions = false,
    synopsisHeading = "Usage: ")
final class CheckCommand implements Callable<Integer> {
  private final Console console;

  @Parameters(paramLabel = "SPEC|DIR", description = "a spec, a folder or a zip file")
  private String what;

  @Option(
      names = "--circuits",
      paramLabel = "N",
      description = "DIR: closed circuits the whole conductor should have: star 0, delta 1")
  private Integer circuits;

  @Option(
      names = "--layer",
      paramLabel = "ROLE=FILE",
      description =
          "DIR: what a file is that does not say so itself: L1, L2 ..., profile, drill, plated,"
              + " nonplated, mask-top, mask-bottom, legend-top, legend-bottom, netlist or job")
  private List<String> layers = new ArrayList<>();

  @Mixin private CommonOptions options;

  CheckCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    Path path = InputFiles.path(what);
    if (FolderCheckRun.meant(path)) {
      OptionalInt wanted = circuits == null ? OptionalInt.empty() : OptionalInt.of(circuits);
      return FolderCheckRun.run(path, layers, wanted, options, console);
    }
    if (circuits != null || !layers.isEmpty()) {
      throw BadInput.of(what, "usage", "--circuits and --layer are for folders and zip files");
    }
    Attempt attempt =
        Attempt.watched(InputFiles.read(what, options.fab()), console, options.quiet());
    attempt.tell(console);
    if (options.json()) {
      console.print(ReportJson.writeCheck(attempt.results()));
    } else if (!options.quiet()) {
      console.out().print(Summary.text(attempt.results(), Optional.empty(), console.colour()));
    }
    return attempt.passed() ? ExitCode.DONE : ExitCode.REFUSED;
  }
}
