package etchloom.proof.copper;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.DrawnObject;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A line or an arc drawn with a round pen; a disc is a line of no length.
 *
 * @param tag whatever the caller wants to know it by: a line of a file, a number
 */
public record DrawnPiece(Segment shape, double widthMm, int tag) {
  /** The pieces of an image; empty where something in it is no dark round stroke or disc. */
  public static Optional<List<DrawnPiece>> of(List<DrawnObject> objects) {
    List<DrawnPiece> out = new ArrayList<>();
    for (DrawnObject o : objects) {
      if (!o.dark() || !o.match(s -> stroke(s, out), f -> flash(f, out), r -> false)) {
        return Optional.empty();
      }
    }
    return Optional.of(out);
  }

  private static boolean stroke(DrawnObject.Stroke s, List<DrawnPiece> out) {
    if (!(s.pen() instanceof ApertureShape.Circle)) {
      return false;
    }
    add(s.path(), s.widthMm(), s.line(), out);
    return true;
  }

  private static boolean flash(DrawnObject.Flash f, List<DrawnPiece> out) {
    if (f.shape() instanceof ApertureShape.Circle c && c.holeDiameterMm() == 0) {
      out.add(disc(f.at(), c.diameterMm(), f.line()));
      return true;
    }
    return false;
  }

  public static DrawnPiece disc(Point at, double diameterMm, int tag) {
    return new DrawnPiece(new Line(at, at), diameterMm, tag);
  }

  /** All pieces of a path; those of no length are only kept where the path has none at all. */
  public static void add(Path path, double widthMm, int tag, List<DrawnPiece> out) {
    int before = out.size();
    for (Segment s : path.segments()) {
      if (s.lengthMm() > 0) {
        out.add(new DrawnPiece(s, widthMm, tag));
      }
    }
    if (out.size() == before) {
      out.add(disc(path.start(), widthMm, tag));
    }
  }

  Point lowEnd() {
    return reversed() ? shape.end() : shape.start();
  }

  Point highEnd() {
    return reversed() ? shape.start() : shape.end();
  }

  private boolean reversed() {
    Point a = shape.start();
    Point b = shape.end();
    return b.x() < a.x() || (b.x() == a.x() && b.y() < a.y());
  }
}
