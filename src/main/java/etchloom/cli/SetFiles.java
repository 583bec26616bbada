package etchloom.cli;

import etchloom.artwork.Artwork;
import etchloom.proof.ProofExpectation;
import etchloom.proof.ProofReport;
import etchloom.proof.Prover;
import etchloom.report.HtmlReport;
import etchloom.report.ReportJson;
import etchloom.report.Results;
import etchloom.write.LayerSet;
import etchloom.write.Manifest;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.Optional;
import java.util.SortedMap;

/**
 * Everything that {@code draw} writes, as names and bytes; nothing touches the disk.
 *
 * @param results with the proof of these very files
 */
record SetFiles(SortedMap<String, byte[]> files, Results results) {

  /**
   * Writes the set and reads it back.
   *
   * @throws FailedProof where the bytes are not the winding that was asked for
   */
  static SetFiles of(Attempt attempt, Optional<Instant> created) {
    Artwork art = attempt.drawn().assembly().artwork().onGrid();
    Results before = attempt.results();
    SortedMap<String, byte[]> files = LayerSet.write(art, OrderSheet.of(before, created));
    ProofReport proof = Prover.prove(files, ProofExpectation.of(art));
    if (!proof.passed()) {
      throw new FailedProof(proof);
    }
    Results results = before.withProof(proof);
    String picture = new String(files.get(art.slug() + ".svg"), StandardCharsets.UTF_8);
    files.put("report.json", ReportJson.write(results));
    files.put("report.html", HtmlReport.write(results, Optional.of(picture)));
    files.put("spec.yaml", InputsAsUsed.spec(attempt.inputs()));
    files.put("fab.yaml", InputsAsUsed.fab(attempt.inputs()));
    files.put(Manifest.NAME, Manifest.of(Version.TEXT, files));
    return new SetFiles(files, results);
  }
}
