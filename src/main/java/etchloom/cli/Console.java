package etchloom.cli;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.DiagnosticText;
import java.io.PrintStream;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What a command talks to: results go to {@code out}, findings and errors to {@code err}.
 *
 * @param environment the process's environment variables
 * @param terminal whether a person's terminal takes what goes to {@code out}
 */
public record Console(
    PrintStream out, PrintStream err, Map<String, String> environment, boolean terminal) {
  public Console {
    environment = Map.copyOf(environment);
  }

  /**
   * Whether results may be coloured: only on a terminal that can, and never where NO_COLOR asks for
   * none.
   */
  boolean colour() {
    boolean can = !variable("TERM").orElse("").equals("dumb");
    return terminal && can && variable("NO_COLOR").isEmpty();
  }

  /** Says what is odd about the input, though it will do. */
  void warn(List<Diagnostic> warnings) {
    if (!warnings.isEmpty()) {
      err.print(DiagnosticText.text(warnings));
    }
  }

  /** A result as it is. */
  void print(byte[] bytes) {
    out.write(bytes, 0, bytes.length);
    out.flush();
  }

  Optional<String> variable(String name) {
    return Optional.ofNullable(environment.get(name)).filter(v -> !v.isEmpty());
  }
}
