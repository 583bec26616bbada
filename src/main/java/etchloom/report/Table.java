package etchloom.report;

import java.util.ArrayList;
import java.util.List;

/**
 * A table under construction. Its first column heads the rows. Each number says in {@code data-key}
 * which one of {@code report.json} it is, so that the two can be held against each other.
 */
final class Table {
  private record Row(String id, List<Cell> cells) {}

  private final String caption;
  private final String id;
  private final int numbers;
  private final List<String> head;
  private final List<Row> rows = new ArrayList<>();

  /**
   * @param id empty for none
   * @param numbers columns from the second on that hold numbers
   */
  Table(String caption, String id, int numbers, List<String> head) {
    this.caption = caption;
    this.id = id;
    this.numbers = numbers;
    this.head = List.copyOf(head);
  }

  Table(String caption, int numbers, String... head) {
    this(caption, "", numbers, List.of(head));
  }

  Table row(Cell... cells) {
    return row("", List.of(cells));
  }

  Table row(String rowId, List<Cell> cells) {
    rows.add(new Row(rowId, List.copyOf(cells)));
    return this;
  }

  boolean empty() {
    return rows.isEmpty();
  }

  void write(Html h) {
    h.open("div", "class=\"scroll\"");
    if (id.isEmpty()) {
      h.open("table");
    } else {
      h.open("table", "id=\"" + id + "\"");
    }
    h.element("caption", caption).open("thead").open("tr");
    for (int c = 0; c < head.size(); c++) {
      h.element("th", head.get(c), attributes(c, "scope=\"col\""));
    }
    h.close("tr").close("thead").open("tbody");
    for (Row r : rows) {
      row(h, r);
    }
    h.close("tbody").close("table").close("div");
  }

  private void row(Html h, Row r) {
    if (r.id().isEmpty()) {
      h.open("tr");
    } else {
      h.open("tr", "id=\"" + r.id() + "\"");
    }
    for (int c = 0; c < r.cells().size(); c++) {
      Cell cell = r.cells().get(c);
      String tag = c == 0 ? "th" : "td";
      h.open(tag, c == 0 ? attributes(c, cell, "scope=\"row\"") : attributes(c, cell));
      if (cell.href().isEmpty()) {
        h.text(Words.symbols(cell.text()));
      } else {
        h.element("a", Words.symbols(cell.text()), "href=\"" + cell.href() + "\"");
      }
      h.close(tag);
    }
    h.close("tr");
  }

  private String[] attributes(int column, Cell cell, String... more) {
    List<String> out = new ArrayList<>(List.of(attributes(column, more)));
    if (!cell.key().isEmpty()) {
      out.add("data-key=\"" + Html.escaped(cell.key()) + "\"");
    }
    if (!cell.over().isEmpty()) {
      out.add("data-over=\"" + Html.escaped(cell.over()) + "\"");
    }
    cell.exact().ifPresent(v -> out.add("data-v=\"" + JsonTree.number(v) + "\""));
    return out.toArray(String[]::new);
  }

  private String[] attributes(int column, String... more) {
    List<String> out = new ArrayList<>(List.of(more));
    if (column >= 1 && column <= numbers) {
      out.add("class=\"n\"");
    }
    return out.toArray(String[]::new);
  }
}
