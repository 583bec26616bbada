package etchloom.proof.image;

import java.util.List;

/**
 * What an SVG picture draws, group by group; lengths in mm, y up. Every object is dark: paint is
 * paint, whatever its colour.
 *
 * @param groups in the order of the file, only those that draw something themselves
 */
public record SvgFile(String fileName, List<Group> groups, List<ReadWarning> warnings) {
  public SvgFile {
    groups = List.copyOf(groups);
    warnings = List.copyOf(warnings);
  }

  /**
   * @param ids of the elements around the objects that have one, the outermost first
   * @param objects strokes with a round pen, and filled regions
   */
  public record Group(List<String> ids, List<DrawnObject> objects) {
    public Group {
      ids = List.copyOf(ids);
      objects = List.copyOf(objects);
    }
  }

  /** All that is drawn within the element of an id, however deep. */
  public List<DrawnObject> objects(String id) {
    return groups.stream()
        .filter(g -> g.ids().contains(id))
        .flatMap(g -> g.objects().stream())
        .toList();
  }
}
