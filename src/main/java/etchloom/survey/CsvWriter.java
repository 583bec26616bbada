package etchloom.survey;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** {@code survey.csv}: a row a variant, after RFC 4180 but for the line ends, which are LF. */
final class CsvWriter extends RowWriter {
  private final List<String> keys;
  private final List<String> columns;

  CsvWriter(Path dir, Plan plan, Summary summary) throws IOException {
    super(dir.resolve("survey.csv"));
    keys = plan.axes().stream().map(Axis::key).toList();
    // a figure of the same name as a varied key has the same value
    columns = summary.columns().stream().filter(c -> !keys.contains(c)).toList();
    List<String> head = new ArrayList<>(List.of("variant"));
    head.addAll(keys);
    head.addAll(List.of("passed", "reason"));
    head.addAll(columns);
    line(head);
  }

  @Override
  void row(Row row) throws IOException {
    List<String> cells = new ArrayList<>(List.of(Long.toString(row.variant())));
    keys.forEach(k -> cells.add(row.values().getOrDefault(k, "")));
    cells.add(row.passed() ? "true" : "false");
    cells.add(row.reason());
    for (String c : columns) {
      Object value = row.figures().get(c);
      cells.add(value == null ? "" : RowJson.text(value));
    }
    line(cells);
  }

  private void line(List<String> cells) throws IOException {
    put(String.join(",", cells.stream().map(CsvWriter::quoted).toList())).put("\n");
  }

  private static String quoted(String value) {
    boolean plain = value.chars().noneMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r');
    return plain ? value : '"' + value.replace("\"", "\"\"") + '"';
  }

  @Override
  void end() {}
}
