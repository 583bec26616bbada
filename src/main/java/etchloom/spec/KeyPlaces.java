package etchloom.spec;

import etchloom.diagnostic.SourceSpan;
import etchloom.spec.yaml.YamlNode;
import etchloom.spec.yaml.YamlNode.Mapping;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Collects where every key of a file stands: a single value's own place, a group's or list's key.
 */
final class KeyPlaces {
  private final Map<String, SourceSpan> spans = new HashMap<>(); // only ever looked up by key

  private KeyPlaces() {}

  static Positions of(String file, Mapping root) {
    KeyPlaces places = new KeyPlaces();
    places.group("", root);
    return new Positions(file, places.spans);
  }

  private void group(String path, Mapping m) {
    m.entries()
        .forEach(
            e -> {
              String key = path.isEmpty() ? e.key() : path + "." + e.key();
              node(key, e.keySpan(), e.value());
            });
  }

  private void node(String key, SourceSpan keySpan, YamlNode value) {
    value.match(
        s -> spans.put(key, s.text().isEmpty() ? keySpan : s.span()),
        m -> {
          group(key, m);
          return spans.put(key, keySpan);
        },
        q -> {
          list(key, q.items());
          return spans.put(key, keySpan);
        },
        b -> spans.put(key, b.span()));
  }

  private void list(String key, List<YamlNode> items) {
    for (int i = 0; i < items.size(); i++) {
      node(key + "[" + i + "]", items.get(i).span(), items.get(i));
    }
  }
}
