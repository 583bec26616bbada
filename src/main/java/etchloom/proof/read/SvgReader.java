package etchloom.proof.read;

import etchloom.proof.image.SvgFile;
import java.io.StringReader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;

/**
 * Reads what an SVG picture made of circular paths draws: paths of lines and circular arcs, and
 * circles, in groups, with transforms that keep circles round. Other shapes are counted in a
 * warning. Document types, entities of one's own and outside references are never followed.
 *
 * <p>Source: SVG 1.1 (second edition), chapters 7 to 9 and 11. Memory is a small multiple of the
 * input.
 */
public final class SvgReader {
  private static final int MAX_DEPTH = 64;

  private final Reading reading;
  private final Deque<SvgStyle> styles = new ArrayDeque<>();
  private final Map<String, Integer> leftOut = new TreeMap<>();
  private final SvgCanvas canvas;

  private SvgReader(Reading reading) {
    this.reading = reading;
    this.canvas = new SvgCanvas(reading);
  }

  /**
   * @param name for messages
   * @throws UnreadableFile at the first thing that cannot be read
   */
  public static SvgFile read(String name, byte[] bytes) throws UnreadableFile {
    return new SvgReader(new Reading(name)).file(bytes);
  }

  private SvgFile file(byte[] bytes) throws UnreadableFile {
    XMLInputFactory factory = XMLInputFactory.newDefaultFactory();
    factory.setProperty(XMLInputFactory.SUPPORT_DTD, false);
    factory.setProperty(XMLInputFactory.IS_SUPPORTING_EXTERNAL_ENTITIES, false);
    factory.setProperty(XMLInputFactory.IS_NAMESPACE_AWARE, false);
    try {
      String text = new String(bytes, StandardCharsets.UTF_8);
      XMLStreamReader in = factory.createXMLStreamReader(new StringReader(text));
      while (in.hasNext()) {
        int event = in.next();
        if (event == XMLStreamConstants.START_ELEMENT) {
          start(in);
        } else if (event == XMLStreamConstants.END_ELEMENT) {
          styles.pop();
        }
      }
    } catch (XMLStreamException e) {
      int line = e.getLocation() == null ? 0 : Math.max(0, e.getLocation().getLineNumber());
      throw reading.fail(line, "xml", "not well-formed XML: " + reason(e));
    }
    leftOut.forEach(
        (kind, n) ->
            reading.warn(0, "not-drawn", n + " elements of kind " + kind + " are not read"));
    return new SvgFile(reading.file(), canvas.groups(), reading.warnings());
  }

  /** The last line of what the parser says; those before it repeat the place. */
  private static String reason(XMLStreamException e) {
    String m = String.valueOf(e.getMessage());
    int at = m.indexOf("Message: ");
    return at < 0 ? m : m.substring(at + 9);
  }

  private void start(XMLStreamReader in) throws UnreadableFile {
    int line = Math.max(0, in.getLocation().getLineNumber());
    String kind = in.getLocalName();
    if (styles.size() >= MAX_DEPTH) {
      throw reading.fail(line, "too-large", "elements more than " + MAX_DEPTH + " deep");
    }
    reading.charge(1, line);
    if (styles.isEmpty() != kind.equals("svg")) {
      throw reading.fail(line, "svg", "an svg element is wanted as the root, and only there");
    }
    SvgStyle around =
        styles.isEmpty() ? SvgStyle.initial(SvgUnits.of(in, reading, line)) : styles.peek();
    SvgStyle style = style(in, around, kind, line);
    styles.push(style);
    if (!style.hidden()) {
      draw(in, kind, style, line);
    }
  }

  private SvgStyle style(XMLStreamReader in, SvgStyle around, String kind, int line)
      throws UnreadableFile {
    SvgTransform own = SvgTransforms.parse(attribute(in, "transform"), reading, line);
    String id = attribute(in, "id");
    List<String> ids = around.ids();
    if (!id.isEmpty()) {
      ids = new ArrayList<>(ids);
      ids.add(id);
    }
    SvgStyle made =
        around.with(SvgStyle.properties(n -> attribute(in, n)), own, ids, reading, line);
    if (!made.transform().similar()) {
      throw reading.fail(line, "svg", "a transform that makes circles oval, or of no size");
    }
    boolean unseen =
        switch (kind) {
          case "defs", "clipPath", "mask", "pattern", "symbol", "marker" -> true;
          default -> false;
        };
    return unseen ? made.unseen() : made;
  }

  private void draw(XMLStreamReader in, String kind, SvgStyle style, int line)
      throws UnreadableFile {
    switch (kind) {
      case "svg", "g", "a", "title", "desc", "metadata", "text", "tspan" -> {}
      case "path" -> canvas.path(attribute(in, "d"), style, line);
      case "circle" ->
          canvas.circle(
              length(in, "cx", line), length(in, "cy", line), length(in, "r", line), style, line);
      default -> {
        if (leftOut.size() < 50 || leftOut.containsKey(kind)) {
          leftOut.merge(kind, 1, Integer::sum);
        }
      }
    }
  }

  private double length(XMLStreamReader in, String name, int line) throws UnreadableFile {
    String text = attribute(in, name);
    if (text.isEmpty()) {
      return 0;
    }
    SvgScanner s = new SvgScanner(text, reading, line);
    double v = s.number();
    if (s.peek() != 0) {
      throw s.wrong("a number without unit");
    }
    return v;
  }

  private static String attribute(XMLStreamReader in, String name) {
    String v = in.getAttributeValue(null, name);
    return v == null ? "" : v;
  }
}
