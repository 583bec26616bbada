package etchloom.survey;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.json.JsonWriteFeature;
import etchloom.units.Numbers;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.LinkedHashMap;
import java.util.Map;

/** A row as one line of JSON, and back; numbers as in {@code report.json}. */
final class RowJson {
  private static final JsonFactory FACTORY =
      JsonFactory.builder().enable(JsonWriteFeature.ESCAPE_NON_ASCII).build();

  private RowJson() {}

  /** Without line end. */
  static String write(Row row) {
    StringWriter out = new StringWriter();
    try (JsonGenerator g = FACTORY.createGenerator(out)) {
      g.writeStartObject();
      g.writeNumberField("variant", row.variant());
      g.writeObjectFieldStart("values");
      for (Map.Entry<String, String> e : row.values().entrySet()) {
        g.writeStringField(e.getKey(), e.getValue());
      }
      g.writeEndObject();
      g.writeBooleanField("passed", row.passed());
      g.writeStringField("reason", row.reason());
      g.writeObjectFieldStart("figures");
      for (Map.Entry<String, Object> e : row.figures().entrySet()) {
        g.writeFieldName(e.getKey());
        write(g, e.getValue());
      }
      g.writeEndObject();
      g.writeEndObject();
    } catch (IOException e) {
      throw new UncheckedIOException("writing to memory failed", e);
    }
    return out.toString();
  }

  private static void write(JsonGenerator g, Object value) throws IOException {
    if (value instanceof Number || value instanceof Boolean) {
      g.writeRawValue(text(value));
    } else {
      g.writeString(text(value));
    }
  }

  /** A figure as tables have it. */
  static String text(Object value) {
    return value instanceof Double d ? Numbers.plain(d) : String.valueOf(value);
  }

  /**
   * @throws IOException where the line is no row
   */
  static Row read(String line) throws IOException {
    long variant = 0;
    Map<String, String> values = new LinkedHashMap<>();
    Map<String, Object> figures = new LinkedHashMap<>();
    boolean passed = false;
    String reason = "";
    try (JsonParser p = FACTORY.createParser(line)) {
      p.nextToken();
      for (String name = p.nextFieldName(); name != null; name = p.nextFieldName()) {
        p.nextToken();
        switch (name) {
          case "variant" -> variant = p.getLongValue();
          case "values" -> {
            for (String key = p.nextFieldName(); key != null; key = p.nextFieldName()) {
              values.put(key, p.nextTextValue());
            }
          }
          case "passed" -> passed = p.getBooleanValue();
          case "reason" -> reason = p.getText();
          case "figures" -> {
            for (String key = p.nextFieldName(); key != null; key = p.nextFieldName()) {
              figures.put(key, value(p, p.nextToken()));
            }
          }
          default -> throw new IOException("no key " + name + " in a row");
        }
      }
    }
    return new Row(variant, values, passed, reason, figures);
  }

  private static Object value(JsonParser p, JsonToken token) throws IOException {
    return switch (token) {
      case VALUE_TRUE -> true;
      case VALUE_FALSE -> false;
      case VALUE_NUMBER_INT ->
          p.getNumberType() == JsonParser.NumberType.BIG_INTEGER
              ? (Object) p.getDoubleValue()
              : (Object) p.getLongValue();
      case VALUE_NUMBER_FLOAT -> p.getDoubleValue();
      default -> p.getText();
    };
  }
}
