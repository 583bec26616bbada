package etchloom.cli;

import java.util.Optional;
import picocli.CommandLine.Option;

/** Options that most commands share. */
final class CommonOptions {
  @Option(
      names = "--fab",
      paramLabel = "CLASS_OR_FILE",
      description = "rules to hold the board against, instead of the spec's own")
  private String fab;

  @Option(names = "--json", description = "print the result as JSON")
  private boolean json;

  @Option(names = "--quiet", description = "print nothing but findings and errors")
  private boolean quiet;

  Optional<String> fab() {
    return Optional.ofNullable(fab);
  }

  boolean json() {
    return json;
  }

  boolean quiet() {
    return quiet;
  }
}
