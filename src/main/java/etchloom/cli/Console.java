package etchloom.cli;

import java.io.PrintStream;
import java.util.Map;
import java.util.Optional;

/**
 * What a command talks to: results go to {@code out}, findings and errors to {@code err}.
 *
 * @param environment the process's environment variables
 */
public record Console(PrintStream out, PrintStream err, Map<String, String> environment) {
  public Console {
    environment = Map.copyOf(environment);
  }

  Optional<String> variable(String name) {
    return Optional.ofNullable(environment.get(name)).filter(v -> !v.isEmpty());
  }
}
