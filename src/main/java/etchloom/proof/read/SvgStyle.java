package etchloom.proof.read;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.UnaryOperator;

/**
 * The properties that elements hand down.
 *
 * @param width of strokes, in the unit of the element
 * @param ids of the elements around
 * @param hidden nothing in here is drawn
 */
record SvgStyle(
    boolean filled,
    boolean evenOdd,
    boolean stroked,
    double width,
    boolean round,
    SvgTransform transform,
    List<String> ids,
    boolean hidden) {
  static SvgStyle initial(SvgTransform transform) {
    return new SvgStyle(true, false, false, 1, false, transform, List.of(), false);
  }

  /** The presentation attributes of an element, those of its style attribute before others. */
  static Map<String, String> properties(UnaryOperator<String> attribute) {
    Map<String, String> out = new TreeMap<>();
    for (String name :
        List.of(
            "fill",
            "fill-rule",
            "stroke",
            "stroke-width",
            "stroke-linecap",
            "stroke-linejoin",
            "display")) {
      String v = attribute.apply(name);
      if (!v.isEmpty()) {
        out.put(name, v.strip());
      }
    }
    String style = attribute.apply("style");
    for (int from = 0; from < style.length(); ) {
      int end = style.indexOf(';', from);
      end = end < 0 ? style.length() : end;
      int colon = style.indexOf(':', from);
      if (colon >= 0 && colon < end) {
        out.put(style.substring(from, colon).strip(), style.substring(colon + 1, end).strip());
      }
      from = end + 1;
    }
    return out;
  }

  SvgStyle with(
      Map<String, String> p, SvgTransform own, List<String> allIds, Reading reading, int line)
      throws UnreadableFile {
    double w = width;
    String text = p.getOrDefault("stroke-width", "inherit");
    if (!text.equals("inherit")) {
      w =
          Decimals.parseFloating(text.endsWith("px") ? text.substring(0, text.length() - 2) : text)
              .orElse(Double.NaN);
      if (!(w >= 0 && w <= Reading.MAX_MM)) {
        throw reading.fail(line, "svg", "a stroke-width is no length in units of the drawing");
      }
    }
    return new SvgStyle(
        paint(p, "fill", filled),
        said(p, "fill-rule", "evenodd", evenOdd),
        paint(p, "stroke", stroked),
        w,
        said(p, "stroke-linecap", "round", round),
        transform.after(own),
        allIds,
        hidden || "none".equals(p.get("display")));
  }

  /** As this, and nothing in it is drawn. */
  SvgStyle unseen() {
    return new SvgStyle(filled, evenOdd, stroked, width, round, transform, ids, true);
  }

  private static boolean paint(Map<String, String> p, String key, boolean inherited) {
    String v = p.getOrDefault(key, "inherit");
    return v.equals("inherit") ? inherited : !v.equals("none") && !v.equals("transparent");
  }

  private static boolean said(Map<String, String> p, String key, String word, boolean inherited) {
    String v = p.getOrDefault(key, "inherit");
    return v.equals("inherit") ? inherited : v.equals(word);
  }
}
