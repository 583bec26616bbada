package etchloom.spec;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.Findings;
import etchloom.diagnostic.SourceSpan;
import etchloom.diagnostic.Staged;
import etchloom.spec.yaml.YamlFile;
import etchloom.spec.yaml.YamlNode;
import etchloom.spec.yaml.YamlNode.Entry;
import etchloom.spec.yaml.YamlNode.Mapping;
import etchloom.spec.yaml.YamlNode.Scalar;
import etchloom.spec.yaml.YamlNode.Sequence;
import etchloom.spec.yaml.YamlTree;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * Sets keys of a tree anew before it is checked. Nothing is checked here but what cannot be set at
 * all: a wrong key or value is found by the reader like any other.
 */
final class Overrides {
  private final Findings findings;

  Overrides(Findings findings) {
    this.findings = findings;
  }

  /** In the order of their keys, whatever the map's own, so that a group comes before its keys. */
  YamlTree apply(YamlTree tree, Map<String, String> overrides) {
    Mapping m = tree.root();
    for (Map.Entry<String, String> e : new TreeMap<>(overrides).entrySet()) {
      m = set(m, e.getKey(), e.getValue());
    }
    return new YamlTree(m, tree.whole());
  }

  private Mapping set(Mapping root, String path, String value) {
    SourceSpan span = SourceSpan.ofFile(Show.cut(path + "=" + value) + " on the command line");
    List<String> parts = List.of(path.split("\\.", -1));
    if (parts.size() > YamlFile.MAX_DEPTH) {
      findings.error(Codes.UNKNOWN_KEY, span, "", "no key lies " + parts.size() + " levels deep");
      return root;
    }
    return set(root, path, parts, new Scalar(value.strip(), true, true, span));
  }

  /**
   * Names the overrides at every error in the file itself that is not there without them.
   *
   * @param alone what the file gives without overrides
   */
  static <T> Staged<T> blame(Staged<T> with, Staged<T> alone, Map<String, String> overrides) {
    List<String> all = new ArrayList<>();
    new TreeMap<>(overrides).forEach((k, v) -> all.add(Show.cut(k + "=" + v)));
    String hint = "the command line sets " + Show.allOf(all);
    List<Diagnostic> out = new ArrayList<>();
    for (Diagnostic d : with.diagnostics()) {
      boolean inFile = d.where().line() > 0;
      out.add(inFile && !alone.diagnostics().contains(d) ? withHint(d, hint) : d);
    }
    return Staged.failed(out);
  }

  private static Diagnostic withHint(Diagnostic d, String hint) {
    List<String> hints = new ArrayList<>(d.hints());
    hints.add(hint);
    return new Diagnostic(d.code(), d.severity(), d.where(), d.key(), d.message(), hints);
  }

  private Mapping set(Mapping m, String path, List<String> parts, Scalar value) {
    String part = parts.get(0);
    int index = index(part);
    String key = index < 0 ? part : part.substring(0, part.lastIndexOf('['));
    List<Entry> entries = new ArrayList<>();
    boolean found = false;
    for (Entry e : m.entries()) {
      boolean here = e.key().equals(key);
      found |= here;
      entries.add(here ? replaced(e, path, parts, index, value) : e);
    }
    if (!found && index < 0) {
      Entry none = new Entry(key, value.span(), new Mapping(List.of(), value.span()));
      entries.add(replaced(none, path, parts, index, value));
    } else if (!found) {
      findings.error(Codes.UNKNOWN_KEY, value.span(), path, "the file has no such list");
    }
    return new Mapping(entries, m.span());
  }

  private Entry replaced(Entry old, String path, List<String> parts, int index, Scalar value) {
    if (index >= 0) {
      return new Entry(old.key(), old.keySpan(), inList(old.value(), path, parts, index, value));
    }
    if (parts.size() == 1) {
      return new Entry(old.key(), value.span(), value);
    }
    boolean there = old.value() instanceof Mapping;
    Mapping group = there ? (Mapping) old.value() : new Mapping(List.of(), value.span());
    Mapping changed = set(group, path, parts.subList(1, parts.size()), value);
    return new Entry(old.key(), there ? old.keySpan() : value.span(), changed);
  }

  private YamlNode inList(YamlNode old, String path, List<String> parts, int index, Scalar value) {
    List<YamlNode> items =
        old instanceof Sequence q ? new ArrayList<>(q.items()) : new ArrayList<>();
    if (index >= items.size() || parts.size() > 1) {
      String found = "the file's list has " + items.size() + " values, counted from [0]";
      findings.error(Codes.UNKNOWN_KEY, value.span(), path, found);
      return old;
    }
    items.set(index, value);
    return new Sequence(items, old.span());
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
