package etchloom.cli;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.Staged;
import etchloom.report.FindingBrief;
import etchloom.report.Results;
import etchloom.run.Drawn;
import etchloom.run.Laid;
import etchloom.run.Pipeline;
import java.util.ArrayList;
import java.util.List;

/** A run of a command's inputs, with what the user is to be told. */
record Attempt(InputFiles.Inputs inputs, Drawn drawn, List<Diagnostic> warnings) {
  Attempt {
    warnings = List.copyOf(warnings);
  }

  /**
   * @param draft whether the board is to be marked as one that breaks rules
   * @throws BadInput where the spec cannot be drawn
   */
  static Attempt of(InputFiles.Inputs in, boolean draft) {
    Staged<Laid> laid = laid(in, draft);
    return with(in, laid, Pipeline.judge(laid.value().orElseThrow()));
  }

  /** As above, telling a person who looks how long it takes. */
  static Attempt watched(InputFiles.Inputs in, Console console, boolean quiet) {
    try (DrawPace pace = new DrawPace(console, quiet, false)) {
      Staged<Laid> laid = laid(in, false);
      pace.laid(laid.value().orElseThrow());
      return judged(in, laid, pace);
    }
  }

  /**
   * The board as drawn, not judged yet.
   *
   * @throws BadInput where the spec cannot be drawn
   */
  static Staged<Laid> laid(InputFiles.Inputs in, boolean draft) {
    Staged<Laid> staged = Pipeline.lay(in.file().spec(), in.fab(), in.file().positions(), draft);
    if (staged.value().isEmpty()) {
      throw new BadInput(staged.diagnostics());
    }
    return staged;
  }

  static Attempt judged(InputFiles.Inputs in, Staged<Laid> laid, DrawPace pace) {
    Drawn drawn = Pipeline.judge(laid.value().orElseThrow(), pace::figures);
    pace.figures(1);
    return with(in, laid, drawn);
  }

  private static Attempt with(InputFiles.Inputs in, Staged<Laid> laid, Drawn drawn) {
    List<Diagnostic> warnings = new ArrayList<>(in.warnings());
    warnings.addAll(laid.diagnostics());
    return new Attempt(in, drawn, warnings);
  }

  boolean passed() {
    return drawn.rules().passed();
  }

  Results results() {
    return drawn.results(Version.TEXT);
  }

  /** Warnings and broken rules, to the stream for them. */
  void tell(Console console) {
    console.warn(warnings);
    FindingBrief.lines(drawn.rules().findings()).forEach(console.err()::println);
  }
}
