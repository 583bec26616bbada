package etchloom.proof.read;

import java.nio.charset.StandardCharsets;
import java.util.List;

/** What a file is by how it begins; names and endings differ from tool to tool. */
enum FileKind {
  GERBER,
  NC_DRILL,
  JOB,
  NETLIST,
  DXF,
  SVG,
  OTHER;

  /**
   * @param head the first few thousand bytes, or all
   */
  static FileKind of(byte[] head) {
    String s = new String(head, 0, Math.min(head.length, 4096), StandardCharsets.ISO_8859_1);
    String text = s.stripLeading();
    if (text.isEmpty() || s.indexOf('\0') >= 0) {
      return OTHER;
    }
    if (text.charAt(0) == '{') {
      return text.contains("\"GeneralSpecs\"") || text.contains("\"FilesAttributes\"")
          ? JOB
          : OTHER;
    }
    if (text.charAt(0) == '<') {
      return text.contains("<svg") ? SVG : OTHER;
    }
    String code = firstCode(text);
    if (code.equals("M48")) {
      return NC_DRILL;
    }
    if (code.equals("0") && text.contains("SECTION")) {
      return DXF;
    }
    if (netlist(text, code)) {
      return NETLIST;
    }
    boolean gerber = text.contains("%FS") || text.contains("%MO") || text.contains("%TF");
    return gerber && "%GXDN*".indexOf(text.charAt(0)) >= 0 ? GERBER : OTHER;
  }

  /** The first line that is no NC comment and no lone %. */
  private static String firstCode(String text) {
    for (String line : (Iterable<String>) text.lines()::iterator) {
      String l = line.strip();
      if (!l.isEmpty() && !l.startsWith(";") && !l.equals("%")) {
        return l;
      }
    }
    return "";
  }

  private static boolean netlist(String text, String first) {
    if (first.startsWith("P  ") || first.startsWith("C  ")) {
      return text.contains("\nP  ") || text.contains("\n317") || text.contains("\n327");
    }
    return (first.startsWith("317") || first.startsWith("327")) && first.length() >= 57;
  }

  /** The fields of the file function that a Gerber or drill file states in its head, or none. */
  static List<String> function(byte[] bytes) {
    String s = new String(bytes, 0, Math.min(bytes.length, 65_536), StandardCharsets.UTF_8);
    String mark = "TF.FileFunction,";
    int at = s.indexOf(mark);
    if (at < 0) {
      return List.of();
    }
    int from = at + mark.length();
    int to = from;
    while (to < s.length() && "*%\r\n".indexOf(s.charAt(to)) < 0) {
      to++;
    }
    return AttributeStore.fields(s.substring(from, to));
  }
}
