package etchloom.report;

import etchloom.proof.ProofFinding;
import etchloom.proof.ProofReport;

/** {@code proof} of the report. */
final class ProofTree {
  private ProofTree() {}

  static JsonTree of(ProofReport p) {
    JsonTree islands = new JsonTree();
    p.islands().forEach((layer, n) -> islands.put("L" + layer, n));
    JsonTree loops = new JsonTree();
    p.loops().forEach((layer, n) -> loops.put("L" + layer, n));
    JsonTree out =
        new JsonTree().put("islands", islands).put("loops", loops).put("circuits", p.circuits());
    p.circuitsExpected().ifPresent(n -> out.put("circuitsExpected", n));
    return out.put("nets", p.nets())
        .put("opens", p.opens())
        .put("shorts", p.shorts())
        .put("gerberDxfAreaDifferenceMm2", p.gerberDxfAreaDifferenceMm2());
  }

  /** With all that is wrong and all that the reader should know, for a check of files alone. */
  static JsonTree withFindings(ProofReport p) {
    return of(p)
        .putObjects("findings", p.findings().stream().map(ProofTree::finding).toList())
        .putTexts("notes", p.notes());
  }

  private static JsonTree finding(ProofFinding f) {
    JsonTree out = new JsonTree().put("name", f.name());
    if (!f.file().isEmpty()) {
      out.put("file", f.file());
    }
    if (f.line() > 0) {
      out.put("line", f.line());
    }
    if (!f.layer().isEmpty()) {
      out.put("layer", f.layer());
    }
    f.at().ifPresent(at -> out.put("xMm", at.x()).put("yMm", at.y()));
    return out.put("message", f.message());
  }
}
