package etchloom.proof.read;

import etchloom.proof.image.Attributes;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The three attribute dictionaries of X2 and their commands TF, TA, TO and TD. */
final class AttributeStore {
  /** Names one dictionary may hold; the standard ones are two dozen. */
  private static final int MAX_NAMES = 200;

  private final Reading reading;
  private final Map<String, List<String>> file = new LinkedHashMap<>();
  private final Map<String, List<String>> aperture = new LinkedHashMap<>();
  private final Map<String, List<String>> object = new LinkedHashMap<>();
  private int version;
  private Attributes regionAttributes = Attributes.NONE;
  private int regionVersion = -1;

  AttributeStore(Reading reading) {
    this.reading = reading;
  }

  /** Grows whenever the aperture or object dictionary changes. */
  int version() {
    return version;
  }

  Map<String, List<String>> file() {
    return Collections.unmodifiableMap(file);
  }

  /** A copy of the aperture dictionary, for an aperture being defined. */
  Map<String, List<String>> apertureNow(int line) throws UnreadableFile {
    if (aperture.isEmpty()) {
      return Map.of();
    }
    reading.charge(aperture.size(), line);
    return Collections.unmodifiableMap(new LinkedHashMap<>(aperture));
  }

  /** What holds for an object made now with these aperture attributes. */
  Attributes objectNow(Map<String, List<String>> ofAperture, int line) throws UnreadableFile {
    if (ofAperture.isEmpty() && object.isEmpty()) {
      return Attributes.NONE;
    }
    reading.charge(ofAperture.size() + object.size(), line);
    Map<String, List<String>> other = new LinkedHashMap<>(ofAperture);
    other.putAll(object);
    List<String> function = other.remove(".AperFunction");
    List<String> nets = other.remove(".N");
    List<String> pin = other.remove(".P");
    return new Attributes(
        nets == null ? List.of() : nets,
        pin == null || pin.isEmpty() ? "" : pin.get(0),
        pin == null || pin.size() < 2 ? "" : pin.get(1),
        function == null ? List.of() : function,
        other.isEmpty() ? Map.of() : Collections.unmodifiableMap(other));
  }

  /** What holds for a region made now, whose aperture attributes are those of the dictionary. */
  Attributes regionNow(int line) throws UnreadableFile {
    if (regionVersion != version) {
      regionAttributes = objectNow(aperture, line);
      regionVersion = version;
    }
    return regionAttributes;
  }

  /** Obeys {@code TFname,field,…}, {@code TA}, {@code TO} or {@code TD}. */
  void command(String text, int line) throws UnreadableFile {
    char kind = text.length() < 2 ? '?' : text.charAt(1);
    List<String> parts = fields(text.substring(Math.min(2, text.length())));
    String name = parts.get(0);
    List<String> values = List.copyOf(parts.subList(1, parts.size()));
    switch (kind) {
      case 'F' -> {
        if (file.containsKey(name)) {
          reading.warn(line, "attribute-twice", "file attribute " + name + " is set twice");
        }
        put(file, name, values, line);
      }
      case 'A' -> {
        put(aperture, name, values, line);
        version++;
      }
      case 'O' -> {
        put(object, name, values, line);
        version++;
      }
      case 'D' -> delete(name);
      default -> throw reading.fail(line, "unknown-command", "unknown command " + text);
    }
  }

  private void put(Map<String, List<String>> dictionary, String name, List<String> values, int line)
      throws UnreadableFile {
    if (name.isEmpty()) {
      throw reading.fail(line, "syntax", "an attribute has no name");
    }
    dictionary.put(name, values);
    if (dictionary.size() > MAX_NAMES) {
      throw reading.fail(line, "too-large", "more than " + MAX_NAMES + " attributes at once");
    }
  }

  private void delete(String name) {
    version++;
    if (name.isEmpty()) {
      aperture.clear();
      object.clear();
    } else {
      aperture.remove(name);
      object.remove(name);
    }
  }

  static String decode(byte[] b, int from, int to) {
    return new String(b, from, to - from, StandardCharsets.UTF_8);
  }

  /** Cut at commas, escapes replaced; at least one field. */
  static List<String> fields(String text) {
    List<String> out = new ArrayList<>();
    int start = 0;
    for (int i = 0; i <= text.length(); i++) {
      if (i == text.length() || text.charAt(i) == ',') {
        out.add(unescaped(text.substring(start, i).strip()));
        start = i + 1;
      }
    }
    return out;
  }

  private static String unescaped(String s) {
    int at = s.indexOf('\\');
    if (at < 0) {
      return s;
    }
    StringBuilder out = new StringBuilder(s.substring(0, at));
    for (int i = at; i < s.length(); i++) {
      char kind = s.charAt(i) == '\\' && i + 1 < s.length() ? s.charAt(i + 1) : ' ';
      int digits = kind == 'u' ? 4 : kind == 'U' ? 8 : 0;
      int code = digits == 0 ? -1 : hex(s, i + 2, digits);
      if (code < 0) {
        out.append(s.charAt(i));
      } else {
        out.appendCodePoint(code);
        i += 1 + digits;
      }
    }
    return out.toString();
  }

  /** The code point of the hex digits, or -1 when they are none. */
  private static int hex(String s, int from, int digits) {
    if (from + digits > s.length()) {
      return -1;
    }
    long v = 0;
    for (int i = from; i < from + digits; i++) {
      int d = Character.digit(s.charAt(i), 16);
      if (d < 0) {
        return -1;
      }
      v = v * 16 + d;
    }
    return v <= Character.MAX_CODE_POINT ? (int) v : -1;
  }
}
