package etchloom.proof;

import etchloom.proof.copper.Connectivity;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.JobFile;
import etchloom.proof.image.LayerImage;
import etchloom.proof.ohm.CopperBuild;
import etchloom.proof.ohm.FileResistance;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Resistances between the pads that a folder's files mark as pins of a part. */
final class FolderOhms {
  /** Of the board, where no file tells it; it only lengthens the via barrels. */
  private static final double USUAL_BOARD_MM = 1.6;

  private final List<LayerImage> copper;
  private final Optional<JobFile> job;

  FolderOhms(List<LayerImage> copper, Optional<JobFile> job) {
    this.copper = copper;
    this.job = job;
  }

  /**
   * @param layers the copper from L1 down
   * @return empty where fewer than two pads are marked
   */
  Optional<FileResistance.Ohms> between(
      Connectivity net, List<CopperBuild.Layer> layers, double platingMm) {
    List<FileResistance.Terminal> terminals = terminals();
    if (terminals.size() < 2) {
      return Optional.empty();
    }
    CopperBuild build = new CopperBuild(layers, dielectrics(layers), platingMm);
    return Optional.of(FileResistance.between(copper, net, build, terminals));
  }

  /** Each pin once, where the topmost layer shows it. */
  private List<FileResistance.Terminal> terminals() {
    Map<String, FileResistance.Terminal> out = new LinkedHashMap<>();
    for (int l = 1; l <= copper.size(); l++) {
      for (DrawnObject o : copper.get(l - 1).objects()) {
        String pin = o.attributes().pin();
        if (!pin.isEmpty() && o instanceof DrawnObject.Flash f) {
          String mark = many() ? o.attributes().refdes() + "." + pin : pin;
          out.putIfAbsent(mark, new FileResistance.Terminal(mark, l, f.at()));
        }
      }
    }
    return List.copyOf(out.values());
  }

  /** Whether pins of several parts are marked, so that a pin alone does not say which. */
  private boolean many() {
    return copper.stream()
            .flatMap(i -> i.objects().stream())
            .map(o -> o.attributes().refdes())
            .filter(r -> !r.isEmpty())
            .distinct()
            .limit(2)
            .count()
        > 1;
  }

  private List<Double> dielectrics(List<CopperBuild.Layer> layers) {
    List<Double> told = new ArrayList<>();
    job.ifPresent(
        j ->
            j.stackup().stream()
                .filter(l -> l.type().equals("Dielectric") && l.thicknessMm().isPresent())
                .forEach(l -> told.add(l.thicknessMm().getAsDouble())));
    if (told.size() == layers.size() - 1) {
      return told;
    }
    double board =
        job.map(JobFile::boardThicknessMm).orElse(OptionalDouble.empty()).orElse(USUAL_BOARD_MM);
    double metal = layers.stream().mapToDouble(CopperBuild.Layer::thicknessMm).sum();
    List<Double> equal = new ArrayList<>();
    for (int i = 0; i + 1 < layers.size(); i++) {
      equal.add(Math.max(0.01, (board - metal) / (layers.size() - 1)));
    }
    return equal;
  }
}
