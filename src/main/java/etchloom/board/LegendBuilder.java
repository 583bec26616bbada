package etchloom.board;

import etchloom.artwork.Joint;
import etchloom.artwork.MountingHole;
import etchloom.artwork.Opening;
import etchloom.artwork.Stroke;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The legend on L1's side: terminal marks, a datum mark at 0°, title and revision along an arc;
 * never over an opening, a hole or the edge. What finds no place is left out and said so.
 */
final class LegendBuilder {
  private static final double STEP_RAD = Math.toRadians(3);

  private final Spec spec;
  private final List<Joint> joints;
  private final LegendRoom room;
  private final double lineMm;
  private final double heightMm;
  private final List<Stroke> strokes = new ArrayList<>();
  private final List<String> leftOut = new ArrayList<>();

  LegendBuilder(
      Spec spec,
      FabRules fab,
      List<Joint> joints,
      List<MountingHole> holes,
      List<Opening> openings) {
    this.spec = spec;
    this.joints = joints;
    lineMm = fab.legend().lineMm();
    // A little over the fab's least height, so that the letters' counters stay open.
    heightMm = Math.max(fab.legend().heightMm() * 1.25, 6 * lineMm);
    room =
        new LegendRoom(
            spec.board().diameterMm() / 2,
            spec.board().boreMm() / 2,
            spec.board().tab(),
            holes,
            openings,
            fab.legend().gapMm(),
            lineMm);
  }

  Assembler.PlacedLegend build(boolean draft) {
    terminalMarks();
    datum();
    String draftMark = draft ? " DRAFT" : "";
    List<String> texts =
        List.of(
            spec.title() + " " + spec.revision() + draftMark,
            spec.title() + draftMark,
            ("REV " + spec.revision() + draftMark).strip());
    int done = 0;
    while (done < texts.size() && !alongAnArc(StrokeFont.plain(texts.get(done)), "title")) {
      done++;
    }
    if (done > 0) {
      leftOut.add(done == 1 ? "the revision" : "the title");
    }
    return new Assembler.PlacedLegend(strokes, leftOut);
  }

  /** Each terminal's mark beside its pad: towards the shaft, else outwards. */
  private void terminalMarks() {
    double start = spec.board().terminals().startRad();
    Point radial = Point.polar(1, start);
    double turn = start - Math.PI / 2;
    for (Joint j : joints) {
      if (!j.terminal()) {
        continue;
      }
      boolean done = false;
      for (int side : new int[] {-1, 1}) {
        double off = j.padMm() / 2 + room.gapMm() + lineMm + heightMm / 2;
        for (int step = 0; step < 12 && !done; step++) {
          Point middle = j.at().plus(radial.times(side * (off + step * 0.25)));
          done = put(text(j.mark(), middle, turn), "mark " + j.mark(), letters());
        }
        if (done) {
          break;
        }
      }
      if (!done) {
        leftOut.add("terminal mark " + j.mark());
      }
    }
  }

  /** A tick and an arrowhead at 0°, as far out as there is room. */
  private void datum() {
    for (double r = room.outerMm() - lineMm; r > room.innerMm() + 2 * heightMm; r -= 0.5) {
      Point tip = new Point(r, 0);
      Point foot = new Point(r - 1.5 * heightMm, 0);
      Point barb = new Point(r - 0.6 * heightMm, 0.35 * heightMm);
      List<Path> mark =
          List.of(
              StrokeFont.stroke(foot, tip),
              StrokeFont.stroke(tip, barb),
              StrokeFont.stroke(tip, barb.mirrored()));
      if (put(mark, "datum", OptionalDouble.empty())) {
        return;
      }
    }
    leftOut.add("the datum mark");
  }

  /** Upright text about a middle point. */
  private List<Path> text(String text, Point middle, double turnRad) {
    List<Path> out = new ArrayList<>();
    double x = -StrokeFont.widthMm(text, heightMm) / 2;
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      for (Path g : StrokeFont.glyph(c, heightMm)) {
        out.add(StrokeFont.placed(g, new Point(x, -heightMm / 2), turnRad, middle));
      }
      x += heightMm;
    }
    return out;
  }

  /** Tries bands from the edge inwards and angles from opposite the terminals. */
  private boolean alongAnArc(String text, String what) {
    double away = spec.board().terminals().startRad() + Math.PI;
    for (double r = room.outerMm() - heightMm; r > room.innerMm() + heightMm; r -= 0.5) {
      if (StrokeFont.widthMm(text, heightMm) > 1.8 * Math.PI * r) {
        continue;
      }
      for (int k = 0; k <= 120; k++) {
        double a = away + (k % 2 == 0 ? 1 : -1) * ((k + 1) / 2) * STEP_RAD;
        Optional<List<Path>> arc = curved(text, r, a);
        if (arc.isPresent() && put(arc.get(), what, letters())) {
          return true;
        }
      }
    }
    return false;
  }

  /** Text along an arc, read from outside below the shaft and from inside above it. */
  private Optional<List<Path>> curved(String text, double radius, double middleRad) {
    boolean below = Math.sin(middleRad) < 0;
    double step = heightMm / radius * (below ? 1 : -1);
    double a = middleRad - step * (text.length() - 1) / 2.0;
    List<Path> out = new ArrayList<>();
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      double turn = below ? a + Math.PI / 2 : a - Math.PI / 2;
      Point at = Point.polar(radius, a);
      for (Path g : StrokeFont.glyph(c, heightMm)) {
        out.add(StrokeFont.placed(g, new Point(-heightMm / 3, -heightMm / 2), turn, at));
      }
      a += step;
    }
    return out.isEmpty() ? Optional.empty() : Optional.of(out);
  }

  private OptionalDouble letters() {
    return OptionalDouble.of(heightMm);
  }

  private boolean put(List<Path> paths, String what, OptionalDouble letterMm) {
    if (!room.free(paths)) {
      return false;
    }
    room.take(paths);
    paths.forEach(p -> strokes.add(new Stroke(p, lineMm, what, letterMm)));
    return true;
  }
}
