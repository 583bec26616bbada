package etchloom.cli;

import etchloom.report.ReportJson;
import etchloom.report.Summary;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** {@code check SPEC}: the rule check alone, nothing written. */
@Command(
    name = "check",
    mixinStandardHelpOptions = true,
    description = "Checks a spec's board against the fab's rules; writes nothing.",
    sortOptions = false,
    synopsisHeading = "Usage: ")
final class CheckCommand implements Callable<Integer> {
  private final Console console;

  @Parameters(paramLabel = "SPEC", description = "the spec, a YAML file")
  private String spec;

  @Mixin private CommonOptions options;

  CheckCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    Attempt attempt = Attempt.of(InputFiles.read(spec, options.fab()), false);
    attempt.tell(console);
    if (options.json()) {
      console.print(ReportJson.writeCheck(attempt.results()));
    } else if (!options.quiet()) {
      console.out().print(Summary.text(attempt.results(), Optional.empty(), console.colour()));
    }
    return attempt.passed() ? ExitCode.DONE : ExitCode.REFUSED;
  }
}
