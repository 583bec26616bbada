package etchloom.artwork;

import etchloom.geometry.Path;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;

/**
 * A track on one layer, from one joint to another; it touches no joint in between.
 *
 * @param id its place in {@link Artwork#conductors()}
 * @param layer from 1
 * @param widthMm its width; where it changes, the least, which it has at both ends
 * @param widthsMm the width of each segment of the path; empty where all have the one width
 * @param path centre line, walked from {@code fromJoint} to {@code toJoint}; round ends and joints,
 *     at the end of each width too
 */
public record Conductor(
    int id,
    int layer,
    double widthMm,
    List<Double> widthsMm,
    Path path,
    int fromJoint,
    int toJoint,
    String net,
    Feature what) {
  public Conductor {
    widthsMm = List.copyOf(widthsMm);
    int n = path.segments().size();
    if (!widthsMm.isEmpty()
        && (widthsMm.size() != n
            || widthsMm.get(0) != widthMm
            || widthsMm.get(n - 1) != widthMm
            || !widthsMm.stream().allMatch(w -> w >= widthMm))) {
      throw new IllegalArgumentException(
          n + " pieces of " + widthMm + " mm at both ends do not go with widths " + widthsMm);
    }
  }

  /** A track of one width. */
  public Conductor(
      int id,
      int layer,
      double widthMm,
      Path path,
      int fromJoint,
      int toJoint,
      String net,
      Feature what) {
    this(id, layer, widthMm, List.of(), path, fromJoint, toJoint, net, what);
  }

  /** A stretch of one width. */
  public record Stretch(Path path, double widthMm) {}

  /** Whether its width changes. */
  public boolean tapered() {
    return !widthsMm.isEmpty();
  }

  /** Width of one segment of the path. */
  public double widthMm(int segment) {
    return widthsMm.isEmpty() ? widthMm : widthsMm.get(segment);
  }

  public double widestMm() {
    return widthsMm.stream().mapToDouble(w -> w).max().orElse(widthMm);
  }

  /** Its stretches of one width, from its start on, each as long as it can be. */
  public List<Stretch> stretches() {
    if (widthsMm.isEmpty()) {
      return List.of(new Stretch(path, widthMm));
    }
    List<Segment> pieces = path.segments();
    List<Stretch> out = new ArrayList<>();
    int from = 0;
    for (int k = 1; k <= pieces.size(); k++) {
      if (k == pieces.size() || widthMm(k) != widthMm(from)) {
        out.add(new Stretch(new Path(pieces.subList(from, k)), widthMm(from)));
        from = k;
      }
    }
    return out;
  }
}
