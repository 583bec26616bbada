package etchloom.spec;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.SourceSpan;
import etchloom.spec.yaml.YamlNode;
import etchloom.spec.yaml.YamlNode.Entry;
import etchloom.spec.yaml.YamlNode.Mapping;
import etchloom.spec.yaml.YamlNode.Scalar;
import etchloom.spec.yaml.YamlNode.Sequence;
import etchloom.spec.yaml.YamlTree;
import etchloom.units.Dimension;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * One group of keys while it is read. Every key asked for counts as known; {@link #close} reports
 * the others. Faults are reported at once and never stop the reading, so that one run finds all: a
 * faulty value reads as absent, or as NaN, which no later comparison takes for a fault of its own.
 */
final class Section {
  private final Findings findings;
  private final String path;
  private final SourceSpan span;
  private final Optional<Mapping> node;
  private final boolean whole;
  private final Set<String> known = new LinkedHashSet<>();

  private Section(
      Findings findings, String path, SourceSpan span, Optional<Mapping> node, boolean whole) {
    this.findings = findings;
    this.path = path;
    this.span = span;
    this.node = node;
    this.whole = whole;
  }

  static Section top(Findings findings, YamlTree tree) {
    return new Section(findings, "", tree.root().span(), Optional.of(tree.root()), tree.whole());
  }

  /** False where the file could be read only in part, so that keys may be missing for that. */
  boolean whole() {
    return whole;
  }

  /** The full path of one of its keys. */
  String pathOf(String key) {
    return path.isEmpty() ? key : path + "." + key;
  }

  /** Where one of its keys has its value; where it is absent, the group itself. */
  SourceSpan at(String key) {
    return entry(key)
        .map(e -> e.value() instanceof Scalar s && !s.text().isEmpty() ? s.span() : e.keySpan())
        .orElse(span);
  }

  boolean has(String key) {
    return entry(key).isPresent();
  }

  void error(String code, String key, String message, String... hints) {
    findings.error(code, at(key), pathOf(key), message, hints);
  }

  void warning(String code, String key, String message, String... hints) {
    findings.warning(code, at(key), pathOf(key), message, hints);
  }

  /** Reports a key that is not there, unless the whole group is absent, which was reported once. */
  void missing(String key, String wanted) {
    if (whole && node.isPresent() && !has(key)) {
      findings.error(
          Codes.MISSING_KEY, span, pathOf(key), "this key is missing; it takes " + wanted);
    }
  }

  /** A group that must be there. */
  Section group(String key) {
    missing(key, "a group of keys");
    return optionalGroup(key).orElseGet(() -> absent(key));
  }

  /** A group that may be left out; empty also where it is no group, which is reported. */
  Optional<Section> optionalGroup(String key) {
    known.add(key);
    return entry(key).map(e -> sectionAt(pathOf(key), e.keySpan(), e.value()));
  }

  private Section absent(String key) {
    return new Section(findings, pathOf(key), span, Optional.empty(), true);
  }

  private Section sectionAt(String at, SourceSpan where, YamlNode value) {
    Optional<Mapping> mapping =
        value.match(
            s -> {
              if (s.isNull()) { // a group whose keys are all commented out
                return Optional.of(new Mapping(List.of(), where));
              }
              wrongShape(at, s.span(), "a group of keys belongs here, not one value");
              return Optional.empty();
            },
            Optional::of,
            q -> {
              wrongShape(at, q.span(), "a group of keys belongs here, not a list");
              return Optional.empty();
            },
            b -> Optional.empty());
    return new Section(findings, at, where, mapping, true);
  }

  /** A list of groups. */
  List<Section> groups(String key) {
    List<Section> all = new ArrayList<>();
    List<YamlNode> items = items(key, "a list of groups");
    for (int i = 0; i < items.size(); i++) {
      YamlNode item = items.get(i);
      all.add(sectionAt(pathOf(key) + "[" + i + "]", item.span(), item));
    }
    return all;
  }

  /** A list of quantities; a faulty one is NaN. */
  List<Double> numbers(String key, Dimension dimension, Range range) {
    List<Double> all = new ArrayList<>();
    List<YamlNode> items = items(key, "a list, such as `[0.2 mm, 0.66 mm, 0.2 mm]`");
    for (int i = 0; i < items.size(); i++) {
      ValueReader reader = new ValueReader(findings, pathOf(key) + "[" + i + "]", key);
      all.add(
          reader
              .scalar(items.get(i))
              .map(s -> reader.number(s, dimension, range))
              .orElse(Double.NaN));
    }
    return all;
  }

  /** A list of whole numbers; faulty ones are left out. */
  List<Integer> counts(String key, int min, int max, boolean even) {
    List<Integer> all = new ArrayList<>();
    List<YamlNode> items = items(key, "a list, such as `[2, 4]`");
    for (int i = 0; i < items.size(); i++) {
      ValueReader reader = new ValueReader(findings, pathOf(key) + "[" + i + "]", key);
      reader
          .scalar(items.get(i))
          .map(s -> reader.count(s, min, max, even))
          .ifPresent(n -> n.ifPresent(all::add));
    }
    return all;
  }

  private List<YamlNode> items(String key, String wanted) {
    known.add(key);
    Optional<Entry> e = entry(key);
    if (e.isPresent() && e.get().value() instanceof Sequence q && q.items().isEmpty()) {
      findings.error(Codes.EMPTY_VALUE, q.span(), pathOf(key), "the list is empty");
    }
    if (e.isEmpty()) {
      return List.of();
    }
    return e.get()
        .value()
        .match(
            s -> {
              wrongShape(pathOf(key), s.span(), "here belongs " + wanted);
              return List.of();
            },
            m -> {
              wrongShape(pathOf(key), e.get().keySpan(), "here belongs " + wanted);
              return List.of();
            },
            Sequence::items,
            b -> List.of());
  }

  /** A quantity with its unit (a ratio may go without). */
  NumberField number(String key, Dimension dimension, Range range) {
    Optional<Scalar> s = scalar(key);
    double value = s.map(v -> reader(key).number(v, dimension, range)).orElse(Double.NaN);
    return new NumberField(this, key, has(key), value, dimension.phrase() + ", " + range.text());
  }

  NumberField length(String key, Range range) {
    return number(key, Dimension.LENGTH, range);
  }

  /** A number that has no unit. */
  NumberField bare(String key, Range range) {
    Optional<Scalar> s = scalar(key);
    double value = s.map(v -> reader(key).bare(v, range)).orElse(Double.NaN);
    return new NumberField(this, key, has(key), value, "a number, " + range.text());
  }

  CountField count(String key, int min, int max, boolean even) {
    Optional<Integer> value = scalar(key).flatMap(s -> reader(key).count(s, min, max, even));
    return new CountField(this, key, has(key), value, ValueReader.countWanted(min, max, even));
  }

  /** One of some words. */
  <E> WordField<E> word(String key, Map<String, E> words) {
    Optional<E> value = scalar(key).flatMap(s -> reader(key).word(s, words));
    return new WordField<>(this, key, has(key), value, Show.oneOf(words.keySet()));
  }

  /** A text of one line. */
  WordField<String> text(String key, int maxLength, String wanted) {
    Optional<String> value = scalar(key).flatMap(s -> reader(key).text(s, maxLength));
    return new WordField<>(this, key, has(key), value, wanted);
  }

  /** The value of a key as written; empty where absent, or no single value, which is reported. */
  Optional<Scalar> scalar(String key) {
    known.add(key);
    return entry(key)
        .flatMap(
            e -> {
              Optional<Scalar> s = reader(key).scalar(e.value());
              if (s.isPresent() && s.get().isNull()) {
                findings.error(
                    Codes.EMPTY_VALUE, e.keySpan(), pathOf(key), "this key has no value");
                return Optional.empty();
              }
              return s;
            });
  }

  ValueReader reader(String key) {
    return new ValueReader(findings, pathOf(key), key);
  }

  boolean isScalar(String key) {
    return entry(key).map(e -> e.value() instanceof Scalar s && !s.isNull()).orElse(false);
  }

  /** Reports every key that nobody asked for. */
  void close() {
    node.ifPresent(m -> m.entries().forEach(this::closeEntry));
  }

  private void closeEntry(Entry e) {
    if (known.contains(e.key())) {
      return;
    }
    String where = path.isEmpty() ? "the file" : path;
    String message =
        where + " has no key " + Show.found(e.key()) + "; it takes " + Show.oneOf(known);
    String[] hints =
        Suggest.nearest(e.key(), known).map(k -> "did you mean '" + k + "'?").stream()
            .toArray(String[]::new);
    findings.error(Codes.UNKNOWN_KEY, e.keySpan(), pathOf(e.label()), message, hints);
  }

  private void wrongShape(String at, SourceSpan where, String message) {
    findings.error(Codes.WRONG_SHAPE, where, at, message);
  }

  private Optional<Entry> entry(String key) {
    return node.flatMap(m -> m.entry(key));
  }
}
