package etchloom.proof.read;

import etchloom.proof.image.JobFile;
import etchloom.proof.image.JobFile.DesignRule;
import etchloom.proof.image.JobFile.Entry;
import etchloom.proof.image.JobFile.StackupLayer;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/** Reads Gerber job files. Source: Gerber Job Format Specification 2020.08. */
public final class JobReader {
  /** Job files have a few kilobytes. */
  private static final int MAX_BYTES = 4_000_000;

  private static final int MAX_LAYERS = 1000;

  private final Reading reading;

  private JobReader(Reading reading) {
    this.reading = reading;
  }

  /**
   * @param name for messages
   * @throws UnreadableFile when it is no JSON, or a value that is read here is of the wrong kind
   */
  public static JobFile read(String name, byte[] bytes) throws UnreadableFile {
    Reading reading = new Reading(name);
    if (bytes.length > MAX_BYTES) {
      throw reading.fail(0, "too-large", "a job file of more than " + MAX_BYTES + " bytes");
    }
    return new JobReader(reading).file(JsonNode.parse(bytes, reading));
  }

  private JobFile file(JsonNode root) throws UnreadableFile {
    if (root.kind() != JsonNode.Kind.OBJECT) {
      throw reading.fail(root.line(), "json", "a job file is one JSON object");
    }
    JsonNode general = root.child("GeneralSpecs");
    JsonNode project = general.child("ProjectId");
    JsonNode size = general.child("Size");
    return new JobFile(
        reading.file(),
        project.string("Name"),
        project.string("Revision"),
        length(size, "X"),
        length(size, "Y"),
        layerNumber(general),
        length(general, "BoardThickness"),
        general.string("Finish"),
        entries(root),
        rules(root),
        stackup(root),
        reading.warnings());
  }

  private OptionalInt layerNumber(JsonNode general) throws UnreadableFile {
    OptionalDouble n = number(general, "LayerNumber");
    if (n.isEmpty()) {
      return OptionalInt.empty();
    }
    double v = n.getAsDouble();
    if (!(v >= 1 && v <= MAX_LAYERS && v == Math.rint(v))) {
      throw reading.fail(
          general.child("LayerNumber").line(), "job-value", "LayerNumber is a count of layers");
    }
    return OptionalInt.of((int) v);
  }

  private OptionalDouble length(JsonNode in, String key) throws UnreadableFile {
    OptionalDouble v = number(in, key);
    if (v.isPresent() && !(v.getAsDouble() >= 0 && v.getAsDouble() <= Reading.MAX_MM)) {
      throw reading.fail(in.child(key).line(), "job-value", key + " is a length in mm");
    }
    return v;
  }

  /** A number; tools are known to write them as strings too. */
  private OptionalDouble number(JsonNode in, String key) throws UnreadableFile {
    JsonNode node = in.fields().get(key);
    if (node == null) {
      return OptionalDouble.empty();
    }
    OptionalDouble v = Decimals.parseFloating(node.text());
    if (v.isEmpty()) {
      throw reading.fail(node.line(), "job-value", key + " is no number");
    }
    if (node.kind() == JsonNode.Kind.STRING) {
      reading.warnOnce(node.line(), "job-value", key + " is a string, not a number");
    }
    return v;
  }

  private List<Entry> entries(JsonNode root) throws UnreadableFile {
    JsonNode list = root.fields().get("FilesAttributes");
    if (list == null || list.kind() != JsonNode.Kind.ARRAY) {
      throw reading.fail(
          root.line(), "job-value", "the job file has no FilesAttributes, the list of its files");
    }
    List<Entry> out = new ArrayList<>();
    for (JsonNode n : list.items()) {
      String path = n.string("Path").replace('\\', '/');
      if (path.isEmpty()) {
        throw reading.fail(n.line(), "job-value", "an entry of FilesAttributes has no Path");
      }
      Optional<String> fault = EntryName.fault(path);
      if (fault.isPresent()) {
        throw reading.fail(n.line(), "job-value", "the Path '" + path + "' " + fault.get());
      }
      List<String> function = AttributeStore.fields(n.string("FileFunction"));
      boolean none = function.size() == 1 && function.get(0).isEmpty();
      out.add(new Entry(path, none ? List.of() : function, n.string("FilePolarity")));
    }
    return out;
  }

  private List<DesignRule> rules(JsonNode root) throws UnreadableFile {
    List<DesignRule> out = new ArrayList<>();
    for (JsonNode n : root.list("DesignRules")) {
      Map<String, Double> values = new LinkedHashMap<>();
      for (String key : n.fields().keySet()) {
        if (!key.equals("Layers") && n.child(key).kind() == JsonNode.Kind.NUMBER) {
          length(n, key).ifPresent(v -> values.put(key, v));
        }
      }
      out.add(new DesignRule(n.string("Layers"), Collections.unmodifiableMap(values)));
    }
    return out;
  }

  private List<StackupLayer> stackup(JsonNode root) throws UnreadableFile {
    List<StackupLayer> out = new ArrayList<>();
    for (JsonNode n : root.list("MaterialStackup")) {
      out.add(new StackupLayer(n.string("Type"), n.string("Name"), length(n, "Thickness")));
    }
    return out;
  }
}
