package etchloom.cli;

import etchloom.artwork.Artwork;
import etchloom.report.ReportJson;
import etchloom.report.Results;
import etchloom.write.LayerSet;
import java.time.Instant;
import java.util.Optional;
import java.util.SortedMap;

/** Everything that {@code draw} writes, as names and bytes; nothing touches the disk. */
final class SetFiles {
  private SetFiles() {}

  static SortedMap<String, byte[]> of(Pipeline.Drawn drawn, Optional<Instant> created) {
    Results results = drawn.results();
    Artwork art = drawn.assembly().artwork().onGrid();
    SortedMap<String, byte[]> files = LayerSet.write(art, OrderSheet.of(results, created));
    files.put("report.json", ReportJson.write(results));
    files.put("spec.yaml", InputsAsUsed.spec(drawn.inputs()));
    files.put("fab.yaml", InputsAsUsed.fab(drawn.inputs()));
    return files;
  }
}
