package etchloom.report;

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
}
