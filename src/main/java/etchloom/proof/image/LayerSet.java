package etchloom.proof.image;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The files of a set by what they are.
 *
 * @param copper from L1 down, every layer once
 * @param drills every hole once: spans are given and each hole is plated or not, also where the
 *     file did not say, and then with a warning
 * @param warnings on the set as a whole; each file has its own as well
 */
public record LayerSet(
    String name,
    List<LayerImage> copper,
    Optional<LayerImage> maskTop,
    Optional<LayerImage> maskBottom,
    Optional<LayerImage> legendTop,
    Optional<LayerImage> legendBottom,
    Optional<LayerImage> profile,
    List<DrillFile> drills,
    Optional<JobFile> job,
    Optional<NetlistFile> netlist,
    List<ReadWarning> warnings) {
  public LayerSet {
    copper = List.copyOf(copper);
    drills = List.copyOf(drills);
    warnings = List.copyOf(warnings);
  }

  /** The set's own warnings, and then those of every file in it. */
  public List<ReadWarning> allWarnings() {
    List<ReadWarning> all = new ArrayList<>(warnings);
    copper.forEach(f -> all.addAll(f.warnings()));
    for (Optional<LayerImage> f : List.of(maskTop, maskBottom, legendTop, legendBottom, profile)) {
      f.ifPresent(i -> all.addAll(i.warnings()));
    }
    drills.forEach(f -> all.addAll(f.warnings()));
    job.ifPresent(f -> all.addAll(f.warnings()));
    netlist.ifPresent(f -> all.addAll(f.warnings()));
    return all;
  }
}
