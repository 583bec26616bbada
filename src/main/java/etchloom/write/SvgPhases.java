package etchloom.write;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.geometry.Grid;
import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;

/**
 * Which coil belongs to which phase: inside the coils a band for each, whose dashes tell the phase
 * without colour, and the phase's mark; a reversed coil's mark carries a minus.
 */
final class SvgPhases {
  private static final String INK = "#22303a";

  /** Share of the coil's sector that its band covers. */
  private static final double COVER = 0.82;

  /** Dash and gap in band widths, a pattern for each phase in the order of their marks. */
  private static final double[][] DASHES = {
    {}, {3, 1.6}, {0.01, 1.9}, {6, 1.6}, {3, 1.6, 0.01, 1.6}, {6, 1.6, 0.01, 1.6, 0.01, 1.6}
  };

  private final Artwork art;
  private final StringBuilder out;
  private final List<String> marks = new ArrayList<>();
  private final double halfRad;
  private final double bandMm;
  private final double widthMm;

  SvgPhases(Artwork art, StringBuilder out) {
    this.art = art;
    this.out = out;
    art.phases().forEach(p -> marks.add(p.mark()));
    halfRad = COVER * Math.PI / Math.max(1, art.coils().size());
    double inner = innermostMm();
    bandMm = 0.9 * inner;
    widthMm = 0.03 * inner;
  }

  /** Nearest to the shaft of all coils' copper. */
  private double innermostMm() {
    double least = Double.POSITIVE_INFINITY;
    for (Coil coil : art.coils()) {
      for (int id : coil.conductors()) {
        Conductor c = art.conductors().get(id);
        for (int k = 0; k < c.path().segments().size(); k++) {
          double to = c.path().segments().get(k).end().norm();
          least = Math.min(least, to - c.widthMm(k) / 2);
        }
      }
    }
    return least;
  }

  /** In the drawing's flipped group. */
  void bands() {
    out.append("<g id=\"phases\" fill=\"none\" stroke=\"" + INK + "\" stroke-linecap=\"round\"");
    out.append(" stroke-width=\"");
    mm(widthMm);
    out.append("\">\n<title>Phases</title>\n");
    for (Coil c : art.coils()) {
      out.append("<path");
      dashes(marks.indexOf(c.phase()));
      out.append(" d=\"M");
      point(Point.polar(bandMm, c.axisRad() - halfRad));
      out.append('A');
      mm(bandMm);
      out.append(' ');
      mm(bandMm);
      out.append(" 0 0 1 ");
      point(Point.polar(bandMm, c.axisRad() + halfRad));
      out.append("\"><title>").append(Ascii.xml("coil " + c.number() + ", phase " + name(c)));
      out.append("</title></path>\n");
    }
    out.append("</g>\n");
  }

  /** Outside the flipped group, so that letters stand upright. */
  void names() {
    double letter = Math.min(0.2 * bandMm, 1.1 * bandMm * halfRad);
    double r = bandMm - widthMm - 0.75 * letter;
    out.append("<g fill=\"" + INK + "\" font-family=\"sans-serif\" text-anchor=\"middle\"");
    out.append(" font-size=\"");
    mm(letter);
    out.append("\">\n");
    for (Coil c : art.coils()) {
      Point at = Point.polar(r, c.axisRad());
      out.append("<text x=\"");
      mm(at.x());
      out.append("\" y=\"");
      mm(0.36 * letter - at.y());
      out.append("\">").append(Ascii.xml(name(c))).append("</text>\n");
    }
    out.append("</g>\n");
  }

  private static String name(Coil c) {
    return (c.sign() < 0 ? "-" : "") + c.phase();
  }

  private void dashes(int phase) {
    double[] pattern = DASHES[Math.max(0, phase) % DASHES.length];
    if (pattern.length > 0) {
      out.append(" stroke-dasharray=\"");
      for (int i = 0; i < pattern.length; i++) {
        out.append(i > 0 ? " " : "");
        mm(pattern[i] * widthMm);
      }
      out.append('"');
    }
  }

  private void point(Point p) {
    mm(p.x());
    out.append(' ');
    mm(p.y());
  }

  /** To the micrometre. */
  private void mm(double value) {
    Numbers.fixed(out, Numbers.micrometres(Grid.nm(value)), 3);
  }
}
