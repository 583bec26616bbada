package etchloom.proof.read;

import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.DrawnObject.Flash;
import etchloom.proof.image.DrawnObject.Stroke;
import etchloom.proof.image.DrillFile;
import etchloom.proof.image.DrillFile.DrilledHole;
import etchloom.proof.image.DrillFile.Slot;
import etchloom.proof.image.LayerImage;
import java.util.ArrayList;
import java.util.List;

/**
 * Drill files in Gerber form: flashed circles are holes, draws are slots. Section 6 of the Gerber
 * Layer Format on drill and rout files.
 */
public final class GerberDrill {
  private GerberDrill() {}

  /**
   * @throws UnreadableFile when the file holds anything but dark circles and draws with them
   */
  public static DrillFile of(LayerImage image) throws UnreadableFile {
    DrillSpan span = DrillSpan.of(image.fileAttributes());
    List<DrilledHole> holes = new ArrayList<>();
    List<Slot> slots = new ArrayList<>();
    for (DrawnObject o : image.objects()) {
      Attributes a = o.attributes();
      if (!o.dark()) {
        throw wrong(image, o, "a clear object");
      }
      if (o instanceof Flash f) {
        double d = diameter(image, o, f.shape());
        DrillTool t = tool(f.aperture(), d, span, a);
        holes.add(
            new DrilledHole(f.at(), d, t.plating(), t.function(), a.nets(), t.number(), o.line()));
      } else if (o instanceof Stroke s) {
        double d = diameter(image, o, s.pen());
        DrillTool t = tool(0, d, span, a);
        if (s.path().lengthMm() == 0) {
          holes.add(
              new DrilledHole(
                  s.path().start(), d, t.plating(), t.function(), a.nets(), 0, o.line()));
        } else {
          slots.add(new Slot(s.path(), d, t.plating(), t.function(), a.nets(), 0, o.line()));
        }
      } else {
        throw wrong(image, o, "a region");
      }
    }
    return new DrillFile(
        image.fileName(),
        span.plating(),
        span.fromLayer(),
        span.toLayer(),
        image.fileAttributes(),
        holes,
        slots,
        image.warnings());
  }

  private static DrillTool tool(int number, double d, DrillSpan span, Attributes a) {
    return DrillTool.of(number, d, DrillTool.ofHole(span.plating()), a.aperFunction());
  }

  private static double diameter(LayerImage image, DrawnObject o, ApertureShape shape)
      throws UnreadableFile {
    if (shape instanceof ApertureShape.Circle c && c.holeDiameterMm() == 0 && c.diameterMm() > 0) {
      return c.diameterMm();
    }
    throw wrong(image, o, "an aperture that is no round, solid circle");
  }

  private static UnreadableFile wrong(LayerImage image, DrawnObject o, String what) {
    return new UnreadableFile(
        image.fileName(), o.line(), "drill-shape", what + " in a drill file is no hole");
  }
}
