package etchloom.cli;

import etchloom.report.HtmlReport;
import etchloom.report.ReportJson;
import etchloom.report.Results;
import etchloom.write.Manifest;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * Everything that {@code draw} writes, as names and bytes; nothing touches the disk.
 *
 * @param results with the proof of these very files
 */
record SetFiles(SortedMap<String, byte[]> files, Results results) {

  /**
   * @throws FailedProof where the bytes are not the winding that was asked for
   */
  static SetFiles of(Attempt attempt, Optional<Instant> created) {
    return of(attempt, LayerFiles.of(attempt.drawn().laid(), created));
  }

  /**
   * @param layers of this very attempt
   */
  static SetFiles of(Attempt attempt, LayerFiles layers) {
    Results results = attempt.results().withProof(layers.proof());
    SortedMap<String, byte[]> files = new TreeMap<>(layers.files());
    String picture =
        new String(files.get(results.artwork().slug() + ".svg"), StandardCharsets.UTF_8);
    files.put("report.json", ReportJson.write(results));
    files.put("report.html", HtmlReport.write(results, Optional.of(picture)));
    files.put("spec.yaml", InputsAsUsed.spec(attempt.inputs()));
    files.put("fab.yaml", InputsAsUsed.fab(attempt.inputs()));
    files.put(Manifest.NAME, Manifest.of(Version.TEXT, files));
    return new SetFiles(files, results);
  }
}
