package etchloom.spec;

import etchloom.diagnostic.SourceSpan;
import java.util.Map;

/** Where every key of a file stands, so that a later stage can point at the key to change. */
public record Positions(String file, Map<String, SourceSpan> spans) {
  public Positions {
    spans = Map.copyOf(spans);
  }

  /** A file whose places are not known, as in tests and for values from the command line. */
  public static Positions unknown(String file) {
    return new Positions(file, Map.of());
  }

  /**
   * The value at a key path ({@code coil.track}), else the nearest group above it that is there.
   */
  public SourceSpan at(String key) {
    String k = key;
    while (!k.isEmpty()) {
      SourceSpan s = spans.get(k);
      if (s != null) {
        return s;
      }
      int dot = k.lastIndexOf('.');
      k = dot < 0 ? "" : k.substring(0, dot);
    }
    return SourceSpan.ofFile(file);
  }
}
