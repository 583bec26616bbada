package etchloom.proof;

import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.copper.Hole;
import etchloom.proof.image.DrillFile;
import etchloom.proof.image.Plating;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The holes of drill files as holes of the board. */
final class DrilledHoles {
  private DrilledHoles() {}

  /** Where no file says whether a hole is plated, it counts as not plated. */
  static List<Hole> of(List<DrillFile> files, int layers) {
    List<Hole> out = new ArrayList<>();
    for (DrillFile f : files) {
      int from = f.fromLayer() > 0 ? f.fromLayer() : 1;
      int to = f.toLayer() > 0 ? f.toLayer() : layers;
      for (DrillFile.DrilledHole h : f.holes()) {
        out.add(
            new Hole(
                h.at(),
                Optional.empty(),
                h.diameterMm(),
                h.plating() == Plating.PLATED,
                from,
                to,
                h.function(),
                h.nets(),
                f.fileName(),
                h.line()));
      }
      for (DrillFile.Slot s : f.slots()) {
        out.add(
            new Hole(
                middle(s.path()),
                Optional.of(s.path()),
                s.widthMm(),
                s.plating() == Plating.PLATED,
                from,
                to,
                s.function(),
                s.nets(),
                f.fileName(),
                s.line()));
      }
    }
    return out;
  }

  private static Point middle(Path path) {
    List<Segment> pieces = path.segments();
    return pieces.get(pieces.size() / 2).at(pieces.size() % 2 == 0 ? 0 : 0.5);
  }
}
