package etchloom.cli;

import etchloom.proof.ProofFinding;
import etchloom.proof.ProofReport;

/** The written bytes are not what was meant: a fault in Etchloom itself, never the user's. */
final class FailedProof extends IllegalStateException {
  private static final long serialVersionUID = 1L;

  FailedProof(ProofReport proof) {
    super(
        "the files, read back, are not the winding that was asked for ("
            + proof.findings().stream().map(ProofFinding::name).distinct().toList()
            + ")\n"
            + String.join("\n", proof.findings().stream().map(ProofFinding::text).toList()));
  }
}
