package etchloom.survey;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.Severity;
import etchloom.diagnostic.Staged;
import etchloom.report.FindingText;
import etchloom.report.ReportJson;
import etchloom.rules.RuleReport;
import etchloom.run.Drawn;
import etchloom.run.Pipeline;
import etchloom.spec.SpecFile;
import etchloom.spec.SpecReader;
import etchloom.spec.SpecWriter;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * Draws, checks and solves variants of one spec by the way that {@code draw} and {@code report} go.
 * May be used from several threads at once.
 */
public final class Bench {
  /** What is the same in every row and no figure. */
  private static final Set<String> NO_FIGURES = Set.of("tool.version", "title", "revision");

  /** How the reason begins where the program itself failed. */
  static final String FAULT = "error[fault]";

  private final String specName;
  private final byte[] spec;
  private final Shelf shelf;
  private final String toolVersion;

  /**
   * @param specName for messages
   * @param spec the file's bytes
   */
  public Bench(String specName, byte[] spec, Shelf shelf, String toolVersion) {
    this.specName = specName;
    this.spec = spec.clone();
    this.shelf = shelf;
    this.toolVersion = toolVersion;
  }

  String toolVersion() {
    return toolVersion;
  }

  byte[] spec() {
    return spec.clone();
  }

  Shelf shelf() {
    return shelf;
  }

  /** The spec itself. */
  Optional<SpecFile> file() {
    return SpecReader.read(specName, spec).value();
  }

  /** What is wrong with a set of values as far as reading them can tell. */
  public List<Diagnostic> reading(Map<String, String> values) {
    return SpecReader.read(specName, spec, values).diagnostics();
  }

  Trial run(Map<String, String> values) {
    try {
      return tried(values);
    } catch (RuntimeException e) {
      String reason = FAULT + ": a fault in Etchloom itself: " + e.getClass().getSimpleName();
      return new Trial(reason, Optional.empty(), Map.of(), Optional.empty(), Optional.of(e));
    }
  }

  private Trial tried(Map<String, String> values) {
    Staged<SpecFile> read = SpecReader.read(specName, spec, values);
    if (read.value().isEmpty()) {
      return refused(read.diagnostics(), Optional.empty());
    }
    SpecFile file = read.value().get();
    String fab = file.spec().fab();
    Optional<String> yaml = Optional.of(yaml(file, values));
    Staged<Drawn> drawn = Pipeline.run(file.spec(), shelf.of(fab).fab(), file.positions(), false);
    if (drawn.value().isEmpty()) {
      return refused(drawn.diagnostics(), yaml);
    }
    Drawn d = drawn.value().get();
    Map<String, Object> figures = new LinkedHashMap<>(ReportJson.figures(d.results(toolVersion)));
    figures.keySet().removeAll(NO_FIGURES);
    return new Trial(reason(d.rules()), yaml, figures, Optional.of(d.rules()), Optional.empty());
  }

  /** The variant's own file without drawing it; empty where the values make none. */
  Optional<String> yaml(Map<String, String> values) {
    return SpecReader.read(specName, spec, values).value().map(f -> yaml(f, values));
  }

  /** The variant's own file, ready for {@code draw}. */
  private String yaml(SpecFile file, Map<String, String> values) {
    String own = file.spec().fab();
    String there = shelf.nameIn(own);
    if (there.equals(own)) {
      return SpecWriter.toYaml(file.spec());
    }
    Map<String, String> moved = new LinkedHashMap<>(values);
    moved.put("fab", there);
    return SpecWriter.toYaml(SpecReader.read(specName, spec, moved).value().orElseThrow().spec());
  }

  private static Trial refused(List<Diagnostic> all, Optional<String> yaml) {
    List<Diagnostic> errors = all.stream().filter(d -> d.severity() == Severity.ERROR).toList();
    Diagnostic first = errors.get(0);
    String key = first.key().isEmpty() ? "" : first.key() + ": ";
    String reason = "error[" + first.code() + "]: " + key + first.message();
    String full = and(reason, errors.size() - 1);
    return new Trial(full, yaml, Map.of(), Optional.empty(), Optional.empty());
  }

  private static String reason(RuleReport rules) {
    return rules.passed()
        ? ""
        : and(FindingText.line(rules.findings().get(0)), rules.findings().size() - 1);
  }

  private static String and(String reason, int more) {
    return more == 0 ? reason : reason + " (and " + more + " more)";
  }
}
