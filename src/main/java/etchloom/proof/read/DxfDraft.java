package etchloom.proof.read;

import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;

/** What the group codes of one entity have said so far, in the file's unit. */
final class DxfDraft {
  /** A corner of a polyline; its bulge and widths are those of the piece that starts there. */
  static final class Vertex {
    double x;
    double y;
    double bulge;
    double startWidth = Double.NaN;
    double endWidth = Double.NaN;
  }

  final String type;
  final int line;
  final List<Vertex> vertices = new ArrayList<>();
  String layer = "";
  String text = "";
  boolean paper;
  boolean tilted;
  int flags;
  int count = -1;
  double constantWidth = Double.NaN;
  double x;
  double y;
  double endX;
  double endY;
  double size = Double.NaN;
  double size2 = Double.NaN;
  double angle;
  double endAngle;
  double bulge;

  DxfDraft(String type, int line) {
    this.type = type;
    this.line = line;
  }

  private boolean light() {
    return type.equals("LWPOLYLINE");
  }

  /** Takes over the pair that the cursor stands on. */
  void take(DxfPairs pair, Reading reading) throws UnreadableFile {
    switch (pair.code) {
      case 1 -> text = pair.text();
      case 8 -> layer = pair.text().strip();
      case 10 -> x(pair.number(), reading);
      case 20 -> y(pair.number());
      case 11 -> endX = pair.number();
      case 21 -> endY = pair.number();
      case 40 -> size(pair.number());
      case 41 -> size2(pair.number());
      case 42 -> bulge(pair.number(), reading);
      case 43 -> constantWidth = pair.number();
      case 50 -> angle = pair.number();
      case 51 -> endAngle = pair.number();
      case 67 -> paper = pair.whole() == 1;
      case 70 -> flags = pair.whole();
      case 90 -> count = pair.whole();
      case 210, 220 -> tilted |= pair.number() != 0;
      case 230 -> tilted |= pair.number() != 1;
      default -> {}
    }
  }

  private void x(double v, Reading reading) throws UnreadableFile {
    if (light()) {
      reading.charge(1, line);
      vertices.add(new Vertex());
      last().x = v;
    } else {
      x = v;
    }
  }

  private void y(double v) {
    if (light() && !vertices.isEmpty()) {
      last().y = v;
    } else {
      y = v;
    }
  }

  private void size(double v) {
    if (light() && !vertices.isEmpty()) {
      last().startWidth = v;
    } else {
      size = v;
    }
  }

  private void size2(double v) {
    if (light() && !vertices.isEmpty()) {
      last().endWidth = v;
    } else {
      size2 = v;
    }
  }

  private void bulge(double v, Reading reading) throws UnreadableFile {
    if (Math.abs(v) > MAX_BULGE) {
      throw reading.fail(line, "bulge", "a bulge of " + Shown.mm(v) + " is next to a full circle");
    }
    if (light() && !vertices.isEmpty()) {
      last().bulge = v;
    } else {
      bulge = v;
    }
  }

  /** Tan of a quarter of the sweep; a sweep of 359.98° has this. */
  private static final double MAX_BULGE = 1e4;

  private Vertex last() {
    return vertices.get(vertices.size() - 1);
  }

  /** This draft of a VERTEX as a corner of the old kind of polyline. */
  Vertex asVertex() {
    Vertex v = new Vertex();
    v.x = x;
    v.y = y;
    v.bulge = bulge;
    v.startWidth = size;
    v.endWidth = size2;
    return v;
  }

  Point at(double unitMm) {
    return new Point(x * unitMm, y * unitMm);
  }
}
