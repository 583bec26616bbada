package etchloom.proof.image;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/** A Gerber job file. Keys that are not read here are allowed and left out. */
public record JobFile(
    String fileName,
    String projectName,
    String projectRevision,
    OptionalDouble sizeXMm,
    OptionalDouble sizeYMm,
    OptionalInt layerNumber,
    OptionalDouble boardThicknessMm,
    String finish,
    List<Entry> files,
    List<DesignRule> designRules,
    List<StackupLayer> stackup,
    List<ReadWarning> warnings) {
  public JobFile {
    files = List.copyOf(files);
    designRules = List.copyOf(designRules);
    stackup = List.copyOf(stackup);
    warnings = List.copyOf(warnings);
  }

  /**
   * @param path relative to the job file, slashes forward
   * @param function the fields of the file function, {@code [Copper, L1, Top]}
   * @param polarity {@code Positive} or {@code Negative}, empty when left out
   */
  public record Entry(String path, List<String> function, String polarity) {}

  /**
   * @param layers {@code Outer} or {@code Inner}
   * @param valuesMm by the key of the format, {@code TrackToTrack}, in the order of the file
   */
  public record DesignRule(String layers, Map<String, Double> valuesMm) {}

  /**
   * @param type {@code Copper}, {@code Dielectric}, {@code SolderMask}, {@code Legend} and others
   */
  public record StackupLayer(String type, String name, OptionalDouble thicknessMm) {}
}
