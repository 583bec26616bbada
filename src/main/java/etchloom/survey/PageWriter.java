package etchloom.survey;

import com.fasterxml.jackson.jr.ob.JSON;
import etchloom.report.Html;
import etchloom.report.HtmlHead;
import etchloom.units.Numbers;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * {@code survey.html}: a scatter of any two figures, linked with the table of variants. Asks for
 * nothing from outside; the rows are in the page, as data that the page's own script reads.
 */
final class PageWriter extends RowWriter {
  /** As many as a screen can tell apart, and small files. */
  private static final int DIGITS = 6;

  private static final List<String> FIRST_Y =
      List.of("torque.motorConstant", "generator.powerWatt", "geometry.turnsPerLayer");
  private static final String NO_SCRIPT =
      "The plot and the table need scripts; survey.csv has the same numbers.";
  private static final String HOW =
      "Filled in copper: beaten by no other in both figures at once. Rings: rules are broken."
          + " Choose a point or a row to find it in the other; by keyboard, the arrows go from point"
          + " to point and Enter chooses. A variant's spec is ready for draw.";
  private static final String FIRST_X = "resistance.coilOhm";

  private final List<String> keys;
  private final List<String> columns;
  private final Path variants;
  private final String script;
  private boolean first = true;

  PageWriter(Path dir, Plan plan, Summary summary) throws IOException {
    super(dir.resolve("survey.html"));
    keys = plan.axes().stream().map(Axis::key).toList();
    // a figure of the same name as a varied key has the same value
    columns = summary.columns().stream().filter(c -> !keys.contains(c)).toList();
    variants = dir.resolve("variants");
    script = "\n" + resource("survey.js");
    Html h = new Html();
    HtmlHead.write(h, "Survey of " + plan.title(), resource("survey.css"), script);
    h.open("body").open("header").element("h1", "Survey of " + plan.title());
    h.element("p", words(plan, summary), "class=\"quiet\"").close("header").open("main");
    controls(h);
    h.open("noscript").element("p", NO_SCRIPT).close("noscript");
    h.raw("<svg id=\"plot\" viewBox=\"0 0 900 460\" role=\"group\" aria-label=\"scatter of the");
    h.raw(" two figures chosen above; the same numbers stand in the table below\"></svg>\n");
    h.element("p", "", "id=\"said\"", "role=\"status\"");
    h.element("p", "", "id=\"count\"", "class=\"quiet\"");
    h.element("p", HOW, "class=\"quiet\"");
    h.raw("<div id=\"table\" tabindex=\"0\" role=\"region\" aria-label=\"Table of variants\">");
    h.raw("<table id=\"rows\"><caption>Variants</caption>");
    h.raw("<thead id=\"head\"></thead><tbody id=\"body\"></tbody></table></div>\n");
    h.element("p", "", "id=\"more\"", "class=\"quiet\"").close("main");
    h.raw("<script type=\"application/json\" id=\"data\">");
    put(h.toString()).put(head(plan, summary));
  }

  private static String words(Plan plan, Summary s) {
    String keep = s.listing().keepText();
    return s.count()
        + " variants"
        + (plan.part().equals(Part.WHOLE) ? "" : ", part " + plan.part())
        + (keep.isEmpty() ? "" : "; " + s.kept() + " with " + keep)
        + "; "
        + s.passed()
        + " keep every rule"
        + (s.undrawn() > 0 ? "; " + s.undrawn() + " could not be drawn" : "")
        + (s.kept() > Summary.ON_PAGE ? "; this page shows " + Summary.ON_PAGE : "")
        + ". Etchloom "
        + plan.toolVersion()
        + ".";
  }

  private static void controls(Html h) {
    h.open("div", "class=\"pick\"");
    for (String axis : List.of("x", "y")) {
      String name = axis.equals("x") ? "Across" : "Up";
      h.open("label").text(name).raw("<select id=\"" + axis + "\"></select>").close("label");
      h.open("label").text(name + " is best where").raw("<select id=\"" + axis + "way\">");
      h.raw("<option value=\"high\">large</option><option value=\"low\">small</option></select>");
      h.close("label");
    }
    h.close("div");
  }

  /** The data's object up to the rows. */
  private String head(Plan plan, Summary s) throws IOException {
    List<String> shown = new ArrayList<>();
    for (FigureName n : s.listing().names()) {
      columns.stream()
          .filter(c -> c.equals(n.name()) || c.endsWith("." + n.name()))
          .forEach(shown::add);
    }
    Map<String, Object> head = new LinkedHashMap<>();
    head.put("keys", keys);
    head.put("columns", columns);
    head.put("shown", shown);
    head.put("low", columns.stream().filter(Ranking::low).toList());
    head.put("order", s.listing().rank().isPresent() ? s.onPage() : List.of());
    head.put("x", plan.kind().equals(Plan.GRID) ? FIRST_X : "variant");
    head.put("y", shown.stream().findFirst().orElse(firstY()));
    String text = safe(JSON.std.asString(head));
    return text.substring(0, text.length() - 1) + ",\"rows\":[";
  }

  private String firstY() {
    return FIRST_Y.stream().filter(columns::contains).findFirst().orElse("");
  }

  @Override
  void row(Row row) throws IOException {
    List<Object> out = new ArrayList<>();
    out.add(row.variant());
    out.add(row.passed());
    out.add(row.reason());
    out.add(keys.stream().map(k -> row.values().getOrDefault(k, "")).toList());
    List<Object> figures = new ArrayList<>();
    for (String c : columns) {
      figures.add(brief(row.figures().get(c)));
    }
    out.add(figures);
    out.add(row.drawn() || java.nio.file.Files.exists(variants.resolve(row.variant() + ".yaml")));
    put(first ? "\n" : ",\n").put(safe(JSON.std.asString(out)));
    first = false;
  }

  private static Object brief(Object figure) {
    return figure instanceof Double d
        ? (Object) Double.parseDouble(Numbers.significant(d, DIGITS))
        : figure;
  }

  /** Inside a script element only {@code <} could end it or begin a comment. */
  private static String safe(String json) {
    return json.replace("<", "\\u003c").replace("\u2028", "\\u2028").replace("\u2029", "\\u2029");
  }

  @Override
  void end() throws IOException {
    put("\n]}</script>\n<script>").put(script).put("</script>\n</body></html>\n");
  }

  private static String resource(String name) throws IOException {
    try (InputStream in = PageWriter.class.getResourceAsStream(name)) {
      if (in == null) {
        throw new IllegalStateException(name + " is missing from the program");
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    }
  }
}
