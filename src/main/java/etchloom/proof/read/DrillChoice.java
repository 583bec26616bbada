package etchloom.proof.read;

import etchloom.geometry.Point;
import etchloom.proof.image.DrillFile;
import etchloom.proof.image.DrillFile.DrilledHole;
import etchloom.proof.image.DrillFile.Slot;
import etchloom.proof.image.Plating;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** Of drill files in two forms the one to count, after holding them against each other. */
final class DrillChoice {
  /** NC files may be rounded to a ten-thousandth of an inch; no two holes are so close. */
  private static final double SAME_MM = 0.005;

  private final Reading reading;

  DrillChoice(Reading reading) {
    this.reading = reading;
  }

  /**
   * @throws UnreadableFile when both forms are there and differ, or it cannot be told what an NC
   *     file beside Gerber files is for
   */
  List<DrillFile> of(List<DrillFile> gerber, List<DrillFile> nc) throws UnreadableFile {
    Map<String, List<DrillFile>> byGerber = grouped(gerber);
    Map<String, List<DrillFile>> byNc = grouped(nc);
    List<DrillFile> out = new ArrayList<>(gerber);
    for (Map.Entry<String, List<DrillFile>> e : byNc.entrySet()) {
      List<DrillFile> twins = byGerber.getOrDefault(e.getKey(), List.of());
      DrillFile first = e.getValue().get(0);
      if (twins.isEmpty()) {
        if (first.plating() == Plating.UNKNOWN && !gerber.isEmpty()) {
          throw reading.fail(
              0,
              "drill-unclear",
              first.fileName()
                  + " does not say what it drills, and there are Gerber drill files"
                  + " beside it; --layer drill=FILE chooses");
        }
        out.addAll(e.getValue());
        continue;
      }
      Optional<String> difference = difference(marks(twins), marks(e.getValue()));
      if (difference.isPresent()) {
        throw reading.fail(
            0,
            "drill-differs",
            twins.get(0).fileName()
                + " and "
                + first.fileName()
                + " should hold the same holes: "
                + difference.get()
                + "; --layer drill=FILE chooses");
      }
    }
    return out;
  }

  private static Map<String, List<DrillFile>> grouped(List<DrillFile> files) {
    Map<String, List<DrillFile>> out = new TreeMap<>();
    for (DrillFile f : files) {
      String key = f.plating() + " " + f.fromLayer() + " " + f.toLayer();
      out.computeIfAbsent(key, k -> new ArrayList<>()).add(f);
    }
    return out;
  }

  private record Mark(Point at, double diameterMm) {
    boolean same(Mark o) {
      return at.distanceTo(o.at) <= SAME_MM && Math.abs(diameterMm - o.diameterMm) <= SAME_MM;
    }
  }

  private record Cell(long x, long y) {}

  private static List<Mark> marks(List<DrillFile> files) {
    List<Mark> out = new ArrayList<>();
    for (DrillFile f : files) {
      for (DrilledHole h : f.holes()) {
        out.add(new Mark(h.at(), h.diameterMm()));
      }
      for (Slot s : f.slots()) {
        Point middle = s.path().start().plus(s.path().end()).times(0.5);
        out.add(new Mark(middle, s.widthMm()));
      }
    }
    return out;
  }

  /** Where the first is found that the other has not, or how the counts differ. */
  private static Optional<String> difference(List<Mark> a, List<Mark> b) {
    if (a.size() != b.size()) {
      return Optional.of(a.size() + " and " + b.size());
    }
    Map<Cell, List<Mark>> cells = new HashMap<>();
    for (Mark m : b) {
      cells.computeIfAbsent(cell(m, 0, 0), k -> new ArrayList<>()).add(m);
    }
    for (Mark m : a) {
      if (!remove(cells, m)) {
        return Optional.of("only the first has one at " + Shown.point(m.at));
      }
    }
    return Optional.empty();
  }

  private static Cell cell(Mark m, int dx, int dy) {
    return new Cell(
        (long) Math.floor(m.at.x() / SAME_MM) + dx, (long) Math.floor(m.at.y() / SAME_MM) + dy);
  }

  private static boolean remove(Map<Cell, List<Mark>> cells, Mark m) {
    for (int dx = -1; dx <= 1; dx++) {
      for (int dy = -1; dy <= 1; dy++) {
        List<Mark> there = cells.getOrDefault(cell(m, dx, dy), List.of());
        for (int i = there.size() - 1; i >= 0; i--) {
          if (there.get(i).same(m)) {
            there.remove(i);
            return true;
          }
        }
      }
    }
    return false;
  }
}
