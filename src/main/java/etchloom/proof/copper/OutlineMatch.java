package etchloom.proof.copper;

import etchloom.geometry.Path;
import etchloom.proof.plane.EdgeSet;
import etchloom.proof.plane.Figure;
import etchloom.proof.plane.Overlay;
import etchloom.proof.plane.RingWalk;
import java.util.List;

/**
 * Whether closed outlines bound a figure: outer ones counter-clockwise, holes clockwise.
 *
 * <p>Equal when both run along each other within {@link #NEAR_MM}, and the areas agree. Only where
 * that is not so are the two laid over each other.
 *
 * @param areaDifferenceMm2 area that only one of the two covers; where they follow each other, the
 *     difference of their areas
 * @param patches where they differ
 */
public record OutlineMatch(double areaDifferenceMm2, List<CopperDifference.Patch> patches) {
  /** Both are flattened, each within the chord error; corners of acute notches move farther. */
  public static final double NEAR_MM = 4 * CopperBuilder.CHORD_ERROR_MM;

  /** Mean distance of the boundaries that the areas may not show, mm. */
  private static final double MEAN_MM = 1e-4;

  public OutlineMatch {
    patches = List.copyOf(patches);
  }

  public static OutlineMatch of(Figure copper, List<Path> outlines) {
    EdgeSet rings = new EdgeSet();
    RingPen pen = new RingPen(rings, CopperBuilder.CHORD_ERROR_MM);
    double area = 0;
    double length = 0;
    for (Path p : outlines) {
      pen.ring(p, 1);
      area += RingPen.areaSign(p) / 2;
      length += p.lengthMm();
    }
    double difference = Math.abs(area - copper.areaMm2());
    boolean same =
        difference <= MEAN_MM * length && RingWalk.follow(rings, copper, NEAR_MM * RingPen.NM);
    if (same) {
      return new OutlineMatch(difference, List.of());
    }
    Figure drawn = Overlay.union(rings);
    List<CopperDifference.Patch> patches = CopperDifference.between(copper, drawn);
    double sum = patches.stream().mapToDouble(CopperDifference.Patch::areaMm2).sum();
    return new OutlineMatch(
        patches.isEmpty() ? Math.abs(drawn.areaMm2() - copper.areaMm2()) : sum, patches);
  }
}
