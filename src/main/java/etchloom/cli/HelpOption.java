package etchloom.cli;

import picocli.CommandLine.Option;

/** {@code --help}, on every command. */
final class HelpOption {
  @SuppressWarnings("UnusedVariable") // picocli acts on it; nobody reads it
  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "show this text")
  private boolean help;
}
