package etchloom.cli;

import etchloom.report.ReportJson;
import etchloom.report.ReportText;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** {@code report SPEC}: what the copper does, nothing written. */
@Command(
    name = "report",
    mixinStandardHelpOptions = true,
    description = "Reports the electrical properties of a spec's board; writes nothing.",
    sortOptions = false,
    synopsisHeading = "Usage: ")
final class ReportCommand implements Callable<Integer> {
  private final Console console;

  @Parameters(paramLabel = "SPEC", description = "the spec, a YAML file")
  private String spec;

  @Mixin private CommonOptions options;

  ReportCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    Attempt attempt =
        Attempt.watched(InputFiles.read(spec, options.fab()), console, options.quiet());
    attempt.tell(console);
    if (options.json()) {
      console.print(ReportJson.write(attempt.results()));
    } else if (!options.quiet()) {
      console.out().print(ReportText.text(attempt.results(), console.colour()));
    }
    return attempt.passed() ? ExitCode.DONE : ExitCode.REFUSED;
  }
}
