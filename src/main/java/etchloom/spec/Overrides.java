package etchloom.spec;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.SourceSpan;
import etchloom.spec.yaml.YamlFile;
import etchloom.spec.yaml.YamlNode;
import etchloom.spec.yaml.YamlNode.Entry;
import etchloom.spec.yaml.YamlNode.Mapping;
import etchloom.spec.yaml.YamlNode.Scalar;
import etchloom.spec.yaml.YamlNode.Sequence;
import etchloom.units.Quantity;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * Sets keys of a tree anew before it is checked. Nothing is checked here but what cannot be set at
 * all: a wrong key or value is found by the reader like any other.
 */
final class Overrides {
  private final String file;
  private final Findings findings;

  Overrides(String file, Findings findings) {
    this.file = file;
    this.findings = findings;
  }

  Mapping apply(Mapping root, Map<String, String> overrides) {
    Mapping m = root;
    for (Map.Entry<String, String> e : overrides.entrySet()) {
      m = set(m, e.getKey(), e.getValue());
    }
    return m;
  }

  private Mapping set(Mapping root, String path, String value) {
    SourceSpan span = SourceSpan.ofFile(file + " with " + path + "=" + value);
    List<String> parts = List.of(path.split("\\.", -1));
    if (parts.size() > YamlFile.MAX_DEPTH) {
      findings.error(Codes.UNKNOWN_KEY, span, "", "no key lies " + parts.size() + " levels deep");
      return root;
    }
    return set(root, parts, new Scalar(Quantity.spaced(value.strip()), true, span));
  }

  private Mapping set(Mapping m, List<String> parts, Scalar value) {
    String part = parts.get(0);
    int index = index(part);
    String key = index < 0 ? part : part.substring(0, part.lastIndexOf('['));
    List<Entry> entries = new ArrayList<>();
    boolean found = false;
    for (Entry e : m.entries()) {
      boolean here = e.key().equals(key);
      found |= here;
      entries.add(
          here ? new Entry(key, value.span(), replaced(e.value(), parts, index, value)) : e);
    }
    if (!found) {
      YamlNode none = new Mapping(List.of(), value.span());
      entries.add(new Entry(key, value.span(), replaced(none, parts, index, value)));
    }
    return new Mapping(entries, m.span());
  }

  private YamlNode replaced(YamlNode old, List<String> parts, int index, Scalar value) {
    if (index >= 0) {
      return inList(old, parts, index, value);
    }
    if (parts.size() == 1) {
      return value;
    }
    Mapping group = old instanceof Mapping m ? m : new Mapping(List.of(), value.span());
    return set(group, parts.subList(1, parts.size()), value);
  }

  private YamlNode inList(YamlNode old, List<String> parts, int index, Scalar value) {
    List<YamlNode> items =
        old instanceof Sequence q ? new ArrayList<>(q.items()) : new ArrayList<>();
    if (index >= items.size() || parts.size() > 1) {
      String found = "the list has " + items.size() + " values, counted from [0]";
      findings.error(Codes.UNKNOWN_KEY, value.span(), parts.get(0), found);
      return old;
    }
    items.set(index, value);
    return new Sequence(items, value.span());
  }

  /** The number in {@code stackup[1]}; negative where there is none. */
  private static int index(String part) {
    int open = part.lastIndexOf('[');
    if (open < 1 || !part.endsWith("]")) {
      return -1;
    }
    String digits = part.substring(open + 1, part.length() - 1);
    boolean whole = !digits.isEmpty() && digits.length() < 5;
    return whole && digits.chars().allMatch(c -> c >= '0' && c <= '9')
        ? Integer.parseInt(digits)
        : -1;
  }
}
