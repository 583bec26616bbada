package etchloom.proof.read;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.index.strtree.STRtree;

/**
 * What contours within contours fill, as contours that are each filled by themselves: a contour
 * that bounds a hole is led into the one around it by a cut-in. Contours may not cross.
 */
final class Nesting {
  /** Pieces of path a point may be held against, all contours together; a second's work. */
  private static final long MAX_TESTS = 20_000_000;

  private final Reading reading;
  private final int line;
  private long tests;

  private Nesting(Reading reading, int line) {
    this.reading = reading;
    this.line = line;
  }

  /**
   * @param contours closed
   * @param evenOdd filled where an odd number of contours lies around; else where the contours
   *     around do not cancel by their directions
   */
  static List<Path> filled(List<Path> contours, boolean evenOdd, Reading reading, int line)
      throws UnreadableFile {
    return contours.size() == 1 ? contours : new Nesting(reading, line).of(contours, evenOdd);
  }

  private List<Path> of(List<Path> paths, boolean evenOdd) throws UnreadableFile {
    List<Contour> contours = new ArrayList<>();
    STRtree tree = new STRtree();
    for (Path p : paths) {
      Contour n = new Contour(p);
      if (n.areaMm2 != 0) {
        contours.add(n);
      }
    }
    // The sort is stable, so equal areas keep the order of the file.
    contours.sort(Comparator.comparingDouble((Contour n) -> -Math.abs(n.areaMm2)));
    for (int i = 0; i < contours.size(); i++) {
      tree.insert(contours.get(i).box, i);
    }
    for (int i = 0; i < contours.size(); i++) {
      place(contours, i, tree, evenOdd);
    }
    List<Path> out = new ArrayList<>();
    for (Contour n : contours) {
      if (n.bounds()) {
        out.add(withCutIns(n));
      }
    }
    return out;
  }

  private void place(List<Contour> contours, int index, STRtree tree, boolean evenOdd)
      throws UnreadableFile {
    Contour n = contours.get(index);
    Point p = n.path.segments().get(0).at(0.5);
    int around = 0;
    int winding = 0;
    int nearest = -1;
    for (Object found : tree.query(new Envelope(new Coordinate(p.x(), p.y())))) {
      int k = (Integer) found;
      // Only a contour of more area can lie around; they come first.
      if (k < index && inside(contours.get(k), p)) {
        around++;
        winding += contours.get(k).areaMm2 > 0 ? 1 : -1;
        nearest = Math.max(nearest, k);
      }
    }
    n.filledOutside = evenOdd ? around % 2 != 0 : winding != 0;
    n.filledInside = evenOdd ? !n.filledOutside : winding + (n.areaMm2 > 0 ? 1 : -1) != 0;
    n.around = nearest < 0 ? null : contours.get(nearest);
    if (n.filledOutside && !n.filledInside) {
      Contour ring = n.around;
      while (ring != null && !ring.bounds()) {
        ring = ring.around;
      }
      if (ring == null) {
        throw reading.fail(line, "crossing", "contours cross each other near " + Shown.point(p));
      }
      ring.holes.add(n);
    }
  }

  private boolean inside(Contour contour, Point p) throws UnreadableFile {
    List<Segment> besides = contour.besides(p);
    tests += 1 + besides.size();
    if (tests > MAX_TESTS) {
      throw reading.fail(line, "too-large", "too many contours lie within each other");
    }
    return Contours.inside(besides, p);
  }

  private static Path withCutIns(Contour ring) {
    if (ring.holes.isEmpty()) {
      return ring.path;
    }
    List<Segment> out = new ArrayList<>();
    Point start = ring.path.start();
    for (Contour hole : ring.holes) {
      Path h = hole.areaMm2 > 0 == ring.areaMm2 > 0 ? hole.path.reversed() : hole.path;
      boolean apart = !start.equals(h.start());
      if (apart) {
        out.add(new Line(start, h.start()));
      }
      out.addAll(h.segments());
      if (apart) {
        out.add(new Line(h.start(), start));
      }
    }
    out.addAll(ring.path.segments());
    return new Path(out);
  }
}
