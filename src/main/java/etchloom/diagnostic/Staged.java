package etchloom.diagnostic;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/**
 * What a stage gives back: its value, and all that it has to say about the input. There is no value
 * exactly when an error is among the diagnostics.
 */
public record Staged<T>(Optional<T> value, List<Diagnostic> diagnostics) {
  public Staged {
    diagnostics = List.copyOf(diagnostics);
    boolean failed = diagnostics.stream().anyMatch(d -> d.severity() == Severity.ERROR);
    if (failed == value.isPresent()) {
      throw new IllegalArgumentException("a stage has a value exactly when it has no error");
    }
  }

  public static <T> Staged<T> of(T value) {
    return new Staged<>(Optional.of(value), List.of());
  }

  public static <T> Staged<T> of(T value, List<Diagnostic> warnings) {
    return new Staged<>(Optional.of(value), warnings);
  }

  public static <T> Staged<T> failed(List<Diagnostic> diagnostics) {
    return new Staged<>(Optional.empty(), diagnostics);
  }

  /** What the next step, which finds no fault with the input, makes of the value. */
  public <U> Staged<U> map(Function<T, U> next) {
    return new Staged<>(value.map(next), diagnostics);
  }
}
