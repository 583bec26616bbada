package etchloom.report;

import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;

/**
 * A plot: a place for the page's script to draw in, and the table that it draws from, which says
 * the same to those who cannot see it.
 *
 * @param id of the place; its table's is {@code id-table}
 * @param label what the plot shows, for those who hear it
 */
record Plot(String id, String label, String caption, String x, String y, double scale) {
  /** How the table's columns become lines. */
  enum Kind {
    /** Every column of numbers is a line. */
    LINES("lines"),
    /** The same over one turn of 360 degrees, closed at its end. */
    TURN("turn"),
    /** The one column of numbers is a line in pieces, named by the column after it. */
    PIECES("pieces"),
    /** Bars at the values of the first column. */
    BARS("bars"),
    /** Bars from the first column's value to the second's. */
    BINS("bins");

    private final String word;

    Kind(String word) {
      this.word = word;
    }
  }

  /** Lines across a plot. */
  static final class Marks {
    private final List<String> all = new ArrayList<>();

    Marks x(double at, String name) {
      return add("x", at, name);
    }

    /** In the table's unit. */
    Marks y(double at, String name) {
      return add("y", at, name);
    }

    private Marks add(String axis, double at, String name) {
      all.add("[\"" + axis + "\"," + JsonTree.number(at) + ",\"" + name + "\"]");
      return this;
    }
  }

  String tableId() {
    return id + "-table";
  }

  void write(Html h, Kind kind, Marks marks, Table table) {
    write(h, kind, marks, table, Double.NaN);
  }

  /**
   * @param most values above it are left to the table; NaN where all are shown
   */
  void write(Html h, Kind kind, Marks marks, Table table, double most) {
    h.open("figure", "class=\"chart\"");
    List<String> a = new ArrayList<>(List.of("class=\"plot\"", "id=\"" + id + "\""));
    a.add("role=\"img\"");
    a.add("aria-label=\"" + Html.escaped(label + " The table after it says the same.") + "\"");
    a.add("data-table=\"" + tableId() + "\"");
    a.add("data-kind=\"" + kind.word + "\"");
    a.add("data-x=\"" + Html.escaped(x) + "\"");
    a.add("data-y=\"" + Html.escaped(y) + "\"");
    a.add("data-scale=\"" + Numbers.plain(scale) + "\"");
    a.add("data-marks=\"" + Html.escaped("[" + String.join(",", marks.all) + "]") + "\"");
    if (Double.isFinite(most)) {
      a.add("data-most=\"" + Numbers.plain(most) + "\"");
    }
    h.open("div", a.toArray(String[]::new)).close("div");
    h.element("figcaption", caption);
    h.open("details").element("summary", "The same as a table");
    table.write(h);
    h.close("details").close("figure");
  }
}
