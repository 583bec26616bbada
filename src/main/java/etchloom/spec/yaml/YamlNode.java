package etchloom.spec.yaml;

import etchloom.diagnostic.SourceSpan;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** A part of a YAML file with its place. */
public sealed interface YamlNode
    permits YamlNode.Scalar, YamlNode.Mapping, YamlNode.Sequence, YamlNode.Broken {
  SourceSpan span();

  /** Calls exactly one function; {@code broken} gives what to return for a refused part. */
  <R> R match(
      Function<Scalar, R> scalar,
      Function<Mapping, R> mapping,
      Function<Sequence, R> sequence,
      Function<Broken, R> broken);

  /**
   * A single value.
   *
   * @param plain whether it stands without quotes, so that numbers and null are what they look like
   */
  record Scalar(String text, boolean plain, SourceSpan span) implements YamlNode {
    /** Null of the core schema: nothing at all, {@code ~} or {@code null}. */
    public boolean isNull() {
      return plain
          && (text.isEmpty()
              || text.equals("~")
              || text.equals("null")
              || text.equals("Null")
              || text.equals("NULL"));
    }

    @Override
    public <R> R match(
        Function<Scalar, R> scalar,
        Function<Mapping, R> mapping,
        Function<Sequence, R> sequence,
        Function<Broken, R> broken) {
      return scalar.apply(this);
    }
  }

  /** A key with its value. */
  record Entry(String key, SourceSpan keySpan, YamlNode value) {}

  /** A group of keys in the file's order; no key occurs twice. */
  record Mapping(List<Entry> entries, SourceSpan span) implements YamlNode {
    public Mapping {
      entries = List.copyOf(entries);
    }

    public Optional<Entry> entry(String key) {
      for (Entry e : entries) {
        if (e.key().equals(key)) {
          return Optional.of(e);
        }
      }
      return Optional.empty();
    }

    @Override
    public <R> R match(
        Function<Scalar, R> scalar,
        Function<Mapping, R> mapping,
        Function<Sequence, R> sequence,
        Function<Broken, R> broken) {
      return mapping.apply(this);
    }
  }

  record Sequence(List<YamlNode> items, SourceSpan span) implements YamlNode {
    public Sequence {
      items = List.copyOf(items);
    }

    @Override
    public <R> R match(
        Function<Scalar, R> scalar,
        Function<Mapping, R> mapping,
        Function<Sequence, R> sequence,
        Function<Broken, R> broken) {
      return sequence.apply(this);
    }
  }

  /** A part that was refused and reported: nothing more is to be said about it. */
  record Broken(SourceSpan span) implements YamlNode {
    @Override
    public <R> R match(
        Function<Scalar, R> scalar,
        Function<Mapping, R> mapping,
        Function<Sequence, R> sequence,
        Function<Broken, R> broken) {
      return broken.apply(this);
    }
  }
}
