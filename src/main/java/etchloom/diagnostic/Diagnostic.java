package etchloom.diagnostic;

import java.util.List;

/**
 * Something found in the user's input, as data.
 *
 * @param code short lower-case word with hyphens, the same for every such finding
 * @param key the key's full path, {@code coil.track}; empty where no key is meant
 * @param message what was found and what is wanted, with numbers and units
 * @param hints things the user can type
 */
public record Diagnostic(
    String code,
    Severity severity,
    SourceSpan where,
    String key,
    String message,
    List<String> hints) {
  public Diagnostic {
    hints = List.copyOf(hints);
  }

  public static Diagnostic error(
      String code, SourceSpan where, String key, String message, String... hints) {
    return new Diagnostic(code, Severity.ERROR, where, key, message, List.of(hints));
  }

  public static Diagnostic warning(
      String code, SourceSpan where, String key, String message, String... hints) {
    return new Diagnostic(code, Severity.WARNING, where, key, message, List.of(hints));
  }
}
