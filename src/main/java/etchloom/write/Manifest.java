package etchloom.write;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.regex.Pattern;

/** The list of a set's files with the SHA-256 of each, by which we know our own again. */
public final class Manifest {
  public static final String NAME = "manifest.json";

  /** More than any set needs; a longer file is not ours. */
  static final int MAX_BYTES = 1 << 20;

  private static final String TOOL = "etchloom";
  private static final Pattern SUM = Pattern.compile("[0-9a-f]{64}");

  private Manifest() {}

  /**
   * The manifest of a finished set, itself not among the files.
   *
   * @param version of the program
   */
  public static byte[] of(String version, SortedMap<String, byte[]> files) {
    MessageDigest sha = sha256();
    return Json.write(
        g -> {
          g.writeStartObject();
          g.writeStringField("tool", TOOL);
          g.writeStringField("version", version);
          g.writeObjectFieldStart("files");
          for (Map.Entry<String, byte[]> f : files.entrySet()) {
            g.writeStringField(f.getKey(), hex(sha.digest(f.getValue())));
          }
          g.writeEndObject();
          g.writeEndObject();
        });
  }

  /** Names and sums; empty where the bytes are no manifest of ours, for whatever reason. */
  static Optional<SortedMap<String, String>> read(byte[] bytes) {
    try (JsonParser p = new JsonFactory().createParser(bytes)) {
      Optional<SortedMap<String, String>> files = Optional.empty();
      boolean ours = false;
      if (p.nextToken() != JsonToken.START_OBJECT) {
        return Optional.empty();
      }
      while (p.nextToken() == JsonToken.FIELD_NAME) {
        String key = p.currentName();
        JsonToken value = p.nextToken();
        if (key.equals("tool")) {
          ours = TOOL.equals(p.getText());
        } else if (key.equals("files") && value == JsonToken.START_OBJECT) {
          files = sums(p);
        } else {
          p.skipChildren();
        }
      }
      return ours && p.nextToken() == null ? files : Optional.empty();
    } catch (IOException e) {
      return Optional.empty();
    }
  }

  private static Optional<SortedMap<String, String>> sums(JsonParser p) throws IOException {
    SortedMap<String, String> out = new TreeMap<>();
    boolean good = true;
    while (p.nextToken() == JsonToken.FIELD_NAME) {
      String name = p.currentName();
      p.nextToken();
      String sum = p.getText();
      good &= plain(name) && SUM.matcher(sum).matches() && out.put(name, sum) == null;
      p.skipChildren();
    }
    return good ? Optional.of(out) : Optional.empty();
  }

  /** Whether a name stays within the folder and is not the manifest's own. */
  static boolean plain(String name) {
    return !name.isEmpty()
        && name.indexOf('/') < 0
        && name.indexOf('\\') < 0
        && name.indexOf('\0') < 0
        && !name.equals(".")
        && !name.equals("..")
        && !name.equals(NAME);
  }

  static MessageDigest sha256() {
    try {
      return MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }

  static String hex(byte[] sum) {
    return HexFormat.of().formatHex(sum);
  }
}
