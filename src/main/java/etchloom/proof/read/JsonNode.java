package etchloom.proof.read;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A JSON value and the line it starts on.
 *
 * @param fields of an object, else empty
 * @param items of an array, else empty
 * @param text of a string or number as written, else empty
 */
record JsonNode(
    Kind kind, Map<String, JsonNode> fields, List<JsonNode> items, String text, int line) {
  enum Kind {
    OBJECT,
    ARRAY,
    STRING,
    NUMBER,
    OTHER
  }

  private static final int MAX_DEPTH = 30;

  static JsonNode parse(byte[] bytes, Reading reading) throws UnreadableFile {
    try (JsonParser in = new JsonFactory().createParser(bytes)) {
      in.nextToken();
      JsonNode node = value(in, reading, 0);
      if (in.nextToken() != null) {
        throw reading.fail(lineOf(in), "json", "there is more after the end of the JSON object");
      }
      return node;
    } catch (JsonProcessingException e) {
      int line = e.getLocation() == null ? 0 : Math.max(0, e.getLocation().getLineNr());
      throw reading.fail(line, "json", "not JSON: " + firstLine(e.getOriginalMessage()));
    } catch (IOException e) {
      throw reading.fail(0, "json", "not JSON: " + firstLine(e.getMessage()));
    }
  }

  private static String firstLine(String message) {
    String m = String.valueOf(message);
    int end = m.indexOf('\n');
    return end < 0 ? m : m.substring(0, end);
  }

  private static int lineOf(JsonParser in) {
    return Math.max(0, in.currentTokenLocation().getLineNr());
  }

  private static JsonNode value(JsonParser in, Reading reading, int depth)
      throws IOException, UnreadableFile {
    int line = lineOf(in);
    reading.charge(2, line);
    if (depth > MAX_DEPTH) {
      throw reading.fail(line, "too-large", "more than " + MAX_DEPTH + " levels of JSON");
    }
    JsonToken token = in.currentToken();
    if (token == JsonToken.START_OBJECT) {
      return object(in, reading, depth, line);
    }
    if (token == JsonToken.START_ARRAY) {
      List<JsonNode> items = new ArrayList<>();
      while (in.nextToken() != JsonToken.END_ARRAY) {
        items.add(value(in, reading, depth + 1));
      }
      return new JsonNode(Kind.ARRAY, Map.of(), items, "", line);
    }
    if (token == JsonToken.VALUE_STRING) {
      return new JsonNode(Kind.STRING, Map.of(), List.of(), in.getText(), line);
    }
    if (token != null && token.isNumeric()) {
      return new JsonNode(Kind.NUMBER, Map.of(), List.of(), in.getText(), line);
    }
    if (token == null) {
      throw reading.fail(line, "json", "not JSON: the file is empty or ends too early");
    }
    return new JsonNode(Kind.OTHER, Map.of(), List.of(), "", line);
  }

  private static JsonNode object(JsonParser in, Reading reading, int depth, int line)
      throws IOException, UnreadableFile {
    Map<String, JsonNode> fields = new LinkedHashMap<>();
    while (in.nextToken() == JsonToken.FIELD_NAME) {
      String name = in.currentName();
      in.nextToken();
      JsonNode v = value(in, reading, depth + 1);
      if (fields.put(name, v) != null) {
        reading.warn(v.line, "json-twice", "the key " + name + " stands twice; the last one holds");
      }
    }
    return new JsonNode(Kind.OBJECT, fields, List.of(), "", line);
  }

  Optional<JsonNode> get(String key) {
    return Optional.ofNullable(fields.get(key));
  }

  /** The object under a key; one without fields when it is absent. */
  JsonNode child(String key) {
    JsonNode none = new JsonNode(Kind.OBJECT, Map.of(), List.of(), "", line);
    return get(key).orElse(none);
  }

  List<JsonNode> list(String key) {
    return get(key).map(JsonNode::items).orElse(List.of());
  }

  /** The string or number under a key as text; empty when it is absent or something else. */
  String string(String key) {
    return get(key).map(JsonNode::text).orElse("");
  }
}
