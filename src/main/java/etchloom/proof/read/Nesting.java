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

  private static final class Node {
    final Path path;
    final double area;
    final Envelope box;
    boolean outside;
    boolean inside;
    Node around;
    final List<Node> holes = new ArrayList<>();

    Node(Path path) {
      this.path = path;
      this.area = Contours.signedAreaMm2(path);
      this.box = box(path);
    }

    private static Envelope box(Path path) {
      Envelope e = new Envelope();
      for (Segment s : path.segments()) {
        // An arc bulges by less than its radius; half the length is enough on either side.
        double more = s.match(l -> 0.0, a -> a.radiusMm());
        Envelope piece = new Envelope(new Coordinate(s.start().x(), s.start().y()));
        piece.expandToInclude(s.end().x(), s.end().y());
        Point c = s.match(l -> l.start(), a -> a.centre());
        piece.expandToInclude(c.x() - more, c.y() - more);
        piece.expandToInclude(c.x() + more, c.y() + more);
        e.expandToInclude(piece);
      }
      return e;
    }

    boolean outer() {
      return inside && !outside;
    }
  }

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

  private List<Path> of(List<Path> contours, boolean evenOdd) throws UnreadableFile {
    List<Node> nodes = new ArrayList<>();
    STRtree tree = new STRtree();
    for (Path p : contours) {
      Node n = new Node(p);
      if (n.area != 0) {
        nodes.add(n);
      }
    }
    // The sort is stable, so equal areas keep the order of the file.
    nodes.sort(Comparator.comparingDouble((Node n) -> -Math.abs(n.area)));
    for (int i = 0; i < nodes.size(); i++) {
      tree.insert(nodes.get(i).box, i);
    }
    for (int i = 0; i < nodes.size(); i++) {
      place(nodes, i, tree, evenOdd);
    }
    List<Path> out = new ArrayList<>();
    for (Node n : nodes) {
      if (n.outer()) {
        out.add(withCutIns(n));
      }
    }
    return out;
  }

  private void place(List<Node> nodes, int index, STRtree tree, boolean evenOdd)
      throws UnreadableFile {
    Node n = nodes.get(index);
    Point p = n.path.segments().get(0).at(0.5);
    int around = 0;
    int winding = 0;
    int nearest = -1;
    for (Object found : tree.query(new Envelope(new Coordinate(p.x(), p.y())))) {
      int k = (Integer) found;
      // Only a contour of more area can lie around; they come first.
      if (k < index && inside(nodes.get(k).path, p)) {
        around++;
        winding += nodes.get(k).area > 0 ? 1 : -1;
        nearest = Math.max(nearest, k);
      }
    }
    n.outside = evenOdd ? around % 2 != 0 : winding != 0;
    n.inside = evenOdd ? !n.outside : winding + (n.area > 0 ? 1 : -1) != 0;
    n.around = nearest < 0 ? null : nodes.get(nearest);
    if (n.outside && !n.inside) {
      Node ring = n.around;
      while (ring != null && !ring.outer()) {
        ring = ring.around;
      }
      if (ring == null) {
        throw reading.fail(line, "crossing", "contours cross each other near " + Shown.point(p));
      }
      ring.holes.add(n);
    }
  }

  private boolean inside(Path path, Point p) throws UnreadableFile {
    tests += path.segments().size();
    if (tests > MAX_TESTS) {
      throw reading.fail(line, "too-large", "too many contours lie within each other");
    }
    return Contours.inside(path, p);
  }

  private static Path withCutIns(Node ring) {
    if (ring.holes.isEmpty()) {
      return ring.path;
    }
    List<Segment> out = new ArrayList<>();
    Point start = ring.path.start();
    for (Node hole : ring.holes) {
      Path h = hole.area > 0 == ring.area > 0 ? hole.path.reversed() : hole.path;
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
