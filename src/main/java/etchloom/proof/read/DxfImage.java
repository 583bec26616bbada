package etchloom.proof.read;

import etchloom.geometry.Path;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.DrawnObject.Region;
import etchloom.proof.image.DrawnObject.Stroke;
import etchloom.proof.image.DxfFile;
import etchloom.proof.image.DxfFile.Circle;
import etchloom.proof.image.DxfFile.Entity;
import etchloom.proof.image.DxfFile.Polyline;
import java.util.ArrayList;
import java.util.List;

/** A layer of a DXF file as drawn objects, under the two customs there are for copper. */
public final class DxfImage {
  private DxfImage() {}

  /**
   * Copper by centre lines: a polyline of some width is drawn with a round pen, a circle or a
   * closed polyline without width is filled, each by itself. Texts draw nothing.
   *
   * @throws UnreadableFile when an open line has no width
   */
  public static List<DrawnObject> centreLines(DxfFile file, String layer) throws UnreadableFile {
    List<DrawnObject> out = new ArrayList<>();
    for (Entity e : file.entities()) {
      if (!e.layer().equals(layer)) {
        continue;
      }
      if (e instanceof Polyline p && p.widthMm() > 0) {
        ApertureShape pen = new ApertureShape.Circle(p.widthMm(), 0);
        out.add(new Stroke(p.path(), pen, true, Attributes.NONE, e.line()));
      } else if (e instanceof Polyline || e instanceof Circle) {
        out.add(new Region(List.of(contour(file, e)), true, Attributes.NONE, e.line()));
      }
    }
    return out;
  }

  /**
   * Copper by its outlines: circles and closed polylines, filled where an odd number of them lies
   * around. Texts draw nothing.
   *
   * @return one region, or nothing where the layer is empty
   * @throws UnreadableFile when a line is open or has a width
   */
  public static List<DrawnObject> outlines(DxfFile file, String layer) throws UnreadableFile {
    List<Path> contours = new ArrayList<>();
    int line = 0;
    for (Entity e : file.entities()) {
      if (e.layer().equals(layer) && (e instanceof Polyline || e instanceof Circle)) {
        if (e instanceof Polyline p && p.widthMm() > 0) {
          throw new UnreadableFile(
              file.fileName(), e.line(), "outline", "an outline has a width of its own");
        }
        contours.add(contour(file, e));
        line = line == 0 ? e.line() : line;
      }
    }
    if (contours.isEmpty()) {
      return List.of();
    }
    Reading reading = new Reading(file.fileName());
    List<Path> filled = Nesting.filled(contours, true, reading, line);
    return List.of(new Region(filled, true, Attributes.NONE, line));
  }

  private static Path contour(DxfFile file, Entity e) throws UnreadableFile {
    if (e instanceof Circle c) {
      return Path.circle(c.centre(), c.radiusMm());
    }
    Polyline p = (Polyline) e;
    if (!p.closed()) {
      throw new UnreadableFile(
          file.fileName(), e.line(), "outline", "an open line without width bounds no copper");
    }
    return p.path();
  }
}
