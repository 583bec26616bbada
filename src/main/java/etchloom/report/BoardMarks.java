package etchloom.report;

import etchloom.geometry.Point;
import etchloom.rules.Finding;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;

/** Findings at their place on the board's picture, each linked to its row in a table, and back. */
final class BoardMarks {
  /** Of the names beside the places, pixels: line, letter, and how far up the lowest stands. */
  private static final int LINE = 14;

  private static final int LETTER = 8;
  private static final int LOWEST = 5;

  private BoardMarks() {}

  /**
   * @param name stands beside the place
   * @param placed whether it has a place at all
   */
  record Mark(String id, String rowId, String name, boolean broken, boolean placed, Finding f) {
    /** The place in words, linked to the mark where there is a picture that has it. */
    Cell place(String words, boolean pictured) {
      return placed && pictured ? Cell.of(words).to("#" + id) : Cell.of(words);
    }
  }

  /** What a table's caption says of its rows' places. */
  static String caption(String rows, boolean pictured) {
    return pictured ? rows + "; those with a place are marked on the board" : rows;
  }

  static Mark broken(int i, Finding f) {
    return new Mark("mark-b" + i, "broken-" + i, "" + (i + 1), true, placed(f), f);
  }

  static Mark tightest(int i, Finding f) {
    return new Mark("mark-t" + i, "rule-" + i, f.rule(), false, placed(f), f);
  }

  private static boolean placed(Finding f) {
    return !f.at().equals(Point.ORIGIN);
  }

  /** The broken ones; of the tightest places those of rules that are kept. */
  static List<Mark> of(Results r) {
    List<Mark> out = new ArrayList<>();
    for (int i = 0; i < r.rules().minima().size(); i++) {
      Finding f = r.rules().minima().get(i);
      out.add(tightest(i, f));
    }
    for (int i = 0; i < r.rules().findings().size(); i++) {
      out.add(broken(i, r.rules().findings().get(i)));
    }
    return out.stream().filter(Mark::placed).toList();
  }

  /**
   * In the picture's coordinates, mm, y down; rings and letters in screen pixels.
   *
   * @param pixelMm how large a pixel is until the page's script knows better, mm
   */
  static void draw(StringBuilder b, List<Mark> marks, double pixelMm) {
    b.append("<g id=\"marks\" font-family=\"sans-serif\" font-size=\"13\">\n");
    List<Integer> heights = heights(marks, pixelMm);
    for (int i = 0; i < marks.size(); i++) {
      Mark m = marks.get(i);
      String word = m.broken() ? "Broken: " : "Tightest place: ";
      String text =
          word
              + m.f().rule()
              + " "
              + FindingText.value(m.f().measured(), m.f(), m.broken())
              + ", "
              + FindingText.shortPlace(m.f())
              + ", "
              + m.f().what();
      b.append("<a id=\"").append(m.id()).append("\" href=\"#").append(m.rowId());
      b.append("\" class=\"mark ").append(m.broken() ? "broken" : "kept");
      b.append("\" aria-label=\"").append(Html.escaped(text)).append("\" data-x=\"");
      b.append(n(m.f().at().x())).append("\" data-y=\"").append(n(-m.f().at().y()));
      b.append("\" transform=\"translate(").append(n(m.f().at().x())).append(' ');
      b.append(n(-m.f().at().y()))
          .append(") scale(")
          .append(n(pixelMm))
          .append(")\"><title>")
          .append(Html.escaped(text));
      b.append("</title><circle r=\"6\"/><text x=\"8\" y=\"");
      b.append(-heights.get(i)).append("\">");
      b.append(Html.escaped(m.name())).append("</text></a>\n");
    }
    b.append("</g>\n");
  }

  /** Where each name stands, y up from its place: the lowest place clear of the names before. */
  private static List<Integer> heights(List<Mark> marks, double pixelMm) {
    List<Integer> out = new ArrayList<>();
    for (int i = 0; i < marks.size(); i++) {
      int up = LOWEST;
      while (covered(marks, out, i, up, pixelMm)) {
        up += LINE;
      }
      out.add(up);
    }
    return out;
  }

  private static boolean covered(
      List<Mark> marks, List<Integer> heights, int i, int up, double pixelMm) {
    Mark m = marks.get(i);
    for (int k = 0; k < i; k++) {
      Mark other = marks.get(k);
      double dx = (other.f().at().x() - m.f().at().x()) / pixelMm;
      double dy = (other.f().at().y() - m.f().at().y()) / pixelMm + heights.get(k) - up;
      int wide = LETTER * (dx > 0 ? m.name() : other.name()).length();
      if (Math.abs(dy) < LINE && Math.abs(dx) < wide) {
        return true;
      }
    }
    return false;
  }

  private static String n(double v) {
    return Numbers.trimmed(v, 4);
  }
}
