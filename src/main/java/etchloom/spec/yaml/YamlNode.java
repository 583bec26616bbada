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
   * @param typed whether it comes from a command line, where a unit may follow its number without a
   *     space
   */
  record Scalar(String text, boolean plain, boolean typed, SourceSpan span) implements YamlNode {
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
  record Entry(String key, SourceSpan keySpan, YamlNode value) {
    /** Longer keys than any of ours are cut short where a message shows them. */
    private static final int LONGEST_LABEL = 60;

    /** The key as messages show it. */
    public String label() {
      return label(key);
    }

    static String label(String key) {
      int n = key.codePointCount(0, key.length());
      return n <= LONGEST_LABEL
          ? key
          : key.substring(0, key.offsetByCodePoints(0, LONGEST_LABEL)) + "...";
    }
  }

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
