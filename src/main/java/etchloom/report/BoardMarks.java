package etchloom.report;

import etchloom.geometry.Point;
import etchloom.rules.Finding;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;

/** Findings at their place on the board's picture, each linked to its row in a table, and back. */
final class BoardMarks {
  private BoardMarks() {}

  /**
   * @param name stands beside the place
   * @param placed whether it has a place at all
   */
  record Mark(String id, String rowId, String name, boolean broken, boolean placed, Finding f) {}

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
   * In the picture's coordinates, mm, y down.
   *
   * @param size of the ring round the place, mm
   */
  static void draw(StringBuilder b, List<Mark> marks, double size) {
    b.append("<g id=\"marks\" font-family=\"sans-serif\" font-size=\"");
    b.append(n(1.5 * size)).append("\">\n");
    for (Mark m : marks) {
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
      b.append(n(-m.f().at().y())).append(")\"><title>").append(Html.escaped(text));
      b.append("</title><circle r=\"").append(n(size)).append("\"/><text x=\"");
      b.append(n(1.3 * size)).append("\" y=\"").append(n(-0.9 * size)).append("\">");
      b.append(Html.escaped(m.name())).append("</text></a>\n");
    }
    b.append("</g>\n");
  }

  private static String n(double v) {
    return Numbers.trimmed(v, 4);
  }
}
