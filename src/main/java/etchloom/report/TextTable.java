package etchloom.report;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntPredicate;

/**
 * A table for the terminal: every column as wide as its widest cell, two spaces between.
 *
 * @param rows the head first; a row that has fewer cells ends with one that runs on over the
 *     columns left, and is cut at the terminal's edge
 */
public record TextTable(List<List<String>> rows) {
  /** What a terminal is wide, at least. */
  public static final int COLUMNS = 80;

  private static final String GAP = "  ";

  public TextTable {
    rows = rows.stream().map(List::copyOf).toList();
  }

  private int count() {
    return rows.get(0).size();
  }

  /** Of the whole table. */
  public int width() {
    int width = GAP.length() * (count() - 1);
    for (int c = 0; c < count(); c++) {
      width += width(c);
    }
    return width;
  }

  private int width(int column) {
    return rows.stream()
        .filter(r -> column < r.size() && !runsOn(r, column))
        .mapToInt(r -> Text.columns(r.get(column)))
        .max()
        .orElse(0);
  }

  private boolean runsOn(List<String> row, int column) {
    return column == row.size() - 1 && row.size() < count();
  }

  public TextTable without(int column) {
    List<List<String>> out = new ArrayList<>();
    for (List<String> row : rows) {
      List<String> left = new ArrayList<>(row);
      if (column < row.size() && !runsOn(row, column)) {
        left.remove(column);
      }
      out.add(left);
    }
    return new TextTable(out);
  }

  /** With the last column cut so that the whole fits, but not below a least width. */
  public TextTable cut(int least) {
    int last = count() - 1;
    int room = Math.max(least, width(last) - (width() - COLUMNS));
    List<List<String>> out = new ArrayList<>();
    for (List<String> row : rows) {
      List<String> cells = new ArrayList<>(row);
      if (row.size() == count()) {
        cells.set(last, Text.cut(row.get(last), room));
      }
      out.add(cells);
    }
    return new TextTable(out);
  }

  /**
   * @param numbers the columns that are set to the right
   * @return without line ends
   */
  public List<String> lines(IntPredicate numbers) {
    List<String> out = new ArrayList<>();
    for (List<String> row : rows) {
      StringBuilder line = new StringBuilder();
      for (int c = 0; c < row.size(); c++) {
        line.append(c == 0 ? "" : GAP);
        String cell = row.get(c);
        if (runsOn(row, c)) {
          line.append(Text.cut(cell, COLUMNS - Text.columns(line.toString())));
        } else {
          line.append(numbers.test(c) ? Text.right(cell, width(c)) : Text.left(cell, width(c)));
        }
      }
      out.add(line.toString().stripTrailing());
    }
    return out;
  }
}
