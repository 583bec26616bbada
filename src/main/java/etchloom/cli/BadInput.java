package etchloom.cli;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.SourceSpan;
import etchloom.spec.Suggest;
import java.util.List;

/** The user's input is wrong; carries what to say. Ends the command with {@link ExitCode}. */
final class BadInput extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient List<Diagnostic> diagnostics;

  BadInput(List<Diagnostic> diagnostics) {
    super("bad input", null, false, false);
    this.diagnostics = List.copyOf(diagnostics);
  }

  static BadInput of(String file, String code, String message, String... hints) {
    return new BadInput(
        List.of(Diagnostic.error(code, SourceSpan.ofFile(file), "", message, hints)));
  }

  /** The hint that names the nearest of the words, if one is near. */
  static String[] nearest(String wrong, List<String> words) {
    return Suggest.nearest(wrong, words).stream()
        .map(w -> "did you mean `" + w + "`?")
        .toArray(String[]::new);
  }

  List<Diagnostic> diagnostics() {
    return diagnostics;
  }
}
