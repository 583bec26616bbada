package etchloom.report;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.json.JsonWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import etchloom.units.Numbers;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A JSON object with its keys in the order in which they were put. What is absent leaves no key; an
 * object without keys leaves none either.
 */
public final class JsonTree {
  /**
   * A machine's mathematical library may round the last digits of a sine otherwise than another's;
   * no figure is known to so many digits, and files drawn on two machines are to be the same.
   */
  static final int DIGITS = 10;

  private final Map<String, Object> entries = new LinkedHashMap<>();

  /**
   * Kept to {@link #DIGITS} significant digits.
   *
   * @throws IllegalArgumentException if the number is not finite
   */
  public JsonTree put(String key, double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException(key + " is not finite: " + value);
    }
    return set(key, Numbers.rounded(value, DIGITS));
  }

  /** A number as the file has it. */
  static String number(double value) {
    return Numbers.plain(Numbers.rounded(value, DIGITS));
  }

  public JsonTree put(String key, long value) {
    return set(key, value);
  }

  public JsonTree put(String key, boolean value) {
    return set(key, value);
  }

  public JsonTree put(String key, String value) {
    return set(key, value);
  }

  public JsonTree put(String key, OptionalDouble value) {
    value.ifPresent(v -> put(key, v));
    return this;
  }

  public JsonTree put(String key, Optional<Double> value) {
    value.ifPresent(v -> put(key, v.doubleValue()));
    return this;
  }

  public JsonTree put(String key, JsonTree value) {
    return value.entries.isEmpty() ? this : set(key, value);
  }

  public JsonTree putObjects(String key, List<JsonTree> values) {
    return set(key, List.copyOf(values));
  }

  /** As {@link #putObjects}, but no key for an empty list. */
  JsonTree putSome(String key, List<JsonTree> values) {
    return values.isEmpty() ? this : putObjects(key, values);
  }

  public JsonTree putTexts(String key, List<String> values) {
    return set(key, List.copyOf(values));
  }

  private JsonTree set(String key, Object value) {
    if (entries.put(key, value) != null) {
      throw new IllegalStateException("key put twice: " + key);
    }
    return this;
  }

  /** Single values by their path, {@code resistance.phaseOhm.U}; lists are left out. */
  Map<String, Object> flat() {
    Map<String, Object> out = new LinkedHashMap<>();
    flatten("", out);
    return out;
  }

  private void flatten(String prefix, Map<String, Object> out) {
    entries.forEach(
        (key, value) -> {
          if (value instanceof JsonTree t) {
            t.flatten(prefix + key + ".", out);
          } else if (!(value instanceof List)) {
            out.put(prefix + key, value);
          }
        });
  }

  /** Indented by two, ASCII only, final line end; numbers never with an exponent. */
  public byte[] bytes() {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    JsonFactory factory = JsonFactory.builder().enable(JsonWriteFeature.ESCAPE_NON_ASCII).build();
    DefaultIndenter indent = new DefaultIndenter("  ", "\n");
    try (JsonGenerator g = factory.createGenerator(out)) {
      g.setPrettyPrinter(
          new DefaultPrettyPrinter().withObjectIndenter(indent).withArrayIndenter(indent));
      write(g);
      g.writeRaw('\n');
    } catch (IOException e) {
      throw new UncheckedIOException("writing to memory failed", e);
    }
    return out.toByteArray();
  }

  private void write(JsonGenerator g) throws IOException {
    g.writeStartObject();
    for (Map.Entry<String, Object> e : entries.entrySet()) {
      g.writeFieldName(e.getKey());
      write(g, e.getValue());
    }
    g.writeEndObject();
  }

  private static void write(JsonGenerator g, Object value) throws IOException {
    if (value instanceof JsonTree t) {
      t.write(g);
    } else if (value instanceof List<?> list) {
      g.writeStartArray();
      for (Object o : list) {
        write(g, o);
      }
      g.writeEndArray();
    } else if (value instanceof Double d) {
      g.writeNumber(Numbers.plain(d));
    } else if (value instanceof Long l) {
      g.writeNumber(l);
    } else if (value instanceof Boolean b) {
      g.writeBoolean(b);
    } else {
      g.writeString((String) value);
    }
  }
}
