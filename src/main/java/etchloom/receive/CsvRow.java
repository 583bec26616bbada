package etchloom.receive;

import java.util.ArrayList;
import java.util.List;

/** One row of comma-separated values after RFC 4180, section 2, quoted line ends left out. */
final class CsvRow {
  private CsvRow() {}

  /** The row's values, stripped of white space outside quotes; empty where a quote is left open. */
  static List<String> values(String line) {
    List<String> out = new ArrayList<>();
    StringBuilder value = new StringBuilder();
    boolean quoted = false;
    for (int i = 0; i < line.length(); i++) {
      char c = line.charAt(i);
      if (quoted && c == '"' && i + 1 < line.length() && line.charAt(i + 1) == '"') {
        value.append(c);
        i++;
      } else if (c == '"' && (quoted || value.toString().isBlank())) {
        quoted = !quoted;
      } else if (c == ',' && !quoted) {
        out.add(value.toString().strip());
        value.setLength(0);
      } else {
        value.append(c);
      }
    }
    if (quoted) {
      return List.of();
    }
    out.add(value.toString().strip());
    return out;
  }

  /** A value as it stands in a row: quoted where it must be. */
  static String quoted(String value) {
    boolean plain = value.chars().noneMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r');
    return plain ? value : '"' + value.replace("\"", "\"\"") + '"';
  }
}
