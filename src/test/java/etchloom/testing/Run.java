package etchloom.testing;

import etchloom.cli.App;
import etchloom.cli.Console;
import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.Map;

/** One command line, run in this process, with all that a user sees of it. */
public record Run(int code, String out, String err) {
  public static Run of(String... args) {
    return with(Map.of(), args);
  }

  public static Run with(Map<String, String> environment, String... args) {
    return run(environment, false, args);
  }

  /** As a person has it, who sees the output itself. */
  public static Run onTerminal(Map<String, String> environment, String... args) {
    return run(environment, true, args);
  }

  private static Run run(Map<String, String> environment, boolean terminal, String... args) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    Console console =
        new Console(
            new PrintStream(out, true, StandardCharsets.UTF_8),
            new PrintStream(err, true, StandardCharsets.UTF_8),
            environment,
            terminal);
    int code = App.run(args, console);
    return new Run(
        code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
  }
}
