package etchloom.proof.copper;

import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.DrawnObject.Flash;
import etchloom.proof.image.DrawnObject.Region;
import etchloom.proof.image.DrawnObject.Stroke;
import etchloom.proof.plane.EdgeSet;
import etchloom.proof.plane.Figure;
import etchloom.proof.plane.Overlay;
import java.util.List;

/**
 * Rebuilds the figure that drawn objects make, in their order: dark ones add, clear ones take away.
 *
 * <p>Runs of one polarity are laid down together, so an image without clear objects is one union.
 */
public final class CopperBuilder {
  /** How far chords leave their arc unless said otherwise, mm. */
  public static final double CHORD_ERROR_MM = 0.001;

  private final double chordErrorMm;
  private final ShapeEdges shapes;

  public CopperBuilder() {
    this(CHORD_ERROR_MM);
  }

  public CopperBuilder(double chordErrorMm) {
    if (!(chordErrorMm > 0 && chordErrorMm < 1)) {
      throw new IllegalArgumentException("chord error must be in (0, 1) mm, got " + chordErrorMm);
    }
    this.chordErrorMm = chordErrorMm;
    this.shapes = new ShapeEdges(chordErrorMm);
  }

  /**
   * @throws etchloom.proof.plane.OutOfRange when something lies more than 1 m from the origin, or
   *     the outlines are too tangled
   */
  public Figure build(List<DrawnObject> objects) {
    Figure done = null;
    int i = 0;
    while (i < objects.size()) {
      boolean dark = objects.get(i).dark();
      EdgeSet run = new EdgeSet();
      while (i < objects.size() && objects.get(i).dark() == dark) {
        lay(objects.get(i++), run);
      }
      if (done == null) {
        done = dark ? Overlay.union(run) : null;
      } else {
        done = dark ? Overlay.add(done, run) : Overlay.subtract(done, run);
      }
    }
    return done == null ? Overlay.union(new EdgeSet()) : done;
  }

  /** The edges of one object as if it were dark. */
  void lay(DrawnObject object, EdgeSet out) {
    if (object instanceof Stroke s) {
      stroke(s, out);
    } else if (object instanceof Flash f) {
      out.addAll(shapes.of(f.shape()), nm(f.at().x()), nm(f.at().y()), 1);
    } else if (object instanceof Region r) {
      r.contours().forEach(c -> contour(c, out));
    }
  }

  private void stroke(Stroke s, EdgeSet out) {
    if (s.pen() instanceof ApertureShape.Rectangle r) {
      for (Segment piece : s.path().segments()) {
        BoxPen.draw(out, shapes.of(r), piece.start(), piece.end());
      }
    } else {
      round(s.path(), s.widthMm(), out);
    }
  }

  /** A round pen drawn along a path. */
  void round(Path path, double widthMm, EdgeSet out) {
    PenTour.draw(new RingPen(out, chordErrorMm), path, widthMm * RingPen.NM, 1);
  }

  /** A disc. */
  void disc(Point at, double diameterMm, EdgeSet out) {
    out.addAll(shapes.of(new ApertureShape.Circle(diameterMm, 0)), nm(at.x()), nm(at.y()), 1);
  }

  /** A contour filled by itself: cut-ins cancel, crossings are filled whichever way they wind. */
  void contour(Path closed, EdgeSet out) {
    EdgeSet ring = new EdgeSet();
    new RingPen(ring, chordErrorMm).ring(closed, 1);
    Overlay.nonZero(ring).copyTo(out, 1);
  }

  private static int nm(double mm) {
    double v = Math.rint(mm * RingPen.NM);
    if (!(Math.abs(v) <= EdgeSet.LIMIT_NM)) {
      throw new etchloom.proof.plane.OutOfRange(
          "coordinate " + mm + " mm is beyond 1000 mm from the origin");
    }
    return (int) v;
  }
}
