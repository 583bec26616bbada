package etchloom.cli;

import etchloom.artwork.Artwork;
import etchloom.proof.ProofExpectation;
import etchloom.proof.ProofReport;
import etchloom.proof.Prover;
import etchloom.run.Laid;
import etchloom.write.LayerSet;
import java.time.Instant;
import java.util.Optional;
import java.util.SortedMap;

/** The files that the drawn board alone decides, read back and proved. */
record LayerFiles(SortedMap<String, byte[]> files, ProofReport proof) {

  /**
   * Writes the files and reads them back; nothing touches the disk.
   *
   * @throws FailedProof where the bytes are not the winding that was asked for
   */
  static LayerFiles of(Laid laid, Optional<Instant> created) {
    Artwork art = laid.assembly().artwork().onGrid();
    SortedMap<String, byte[]> files = LayerSet.write(art, OrderSheet.of(laid, created));
    ProofReport proof = Prover.prove(files, ProofExpectation.of(art));
    if (!proof.passed()) {
      throw new FailedProof(proof);
    }
    return new LayerFiles(files, proof);
  }
}
