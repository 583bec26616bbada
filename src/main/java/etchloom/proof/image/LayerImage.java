package etchloom.proof.image;

import java.util.List;
import java.util.Map;

/**
 * One Gerber file.
 *
 * @param fileAttributes name to fields, {@code .FileFunction} to {@code [Copper, L1, Top]}, in the
 *     order of the file
 * @param objects in drawing order
 */
public record LayerImage(
    String fileName,
    Map<String, List<String>> fileAttributes,
    List<DrawnObject> objects,
    List<ReadWarning> warnings) {
  public LayerImage {
    objects = List.copyOf(objects);
    warnings = List.copyOf(warnings);
  }

  /** The fields of a file attribute, such as {@code .FileFunction}; empty when it is not set. */
  public List<String> fileAttribute(String name) {
    return fileAttributes.getOrDefault(name, List.of());
  }
}
