package etchloom.survey;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Every combination of the axes' values, the last axis varying fastest. */
public record Grid(List<Axis> axes) {
  /** Some months of computing. */
  public static final long MOST = 50_000_000;

  public Grid {
    axes = List.copyOf(axes);
  }

  /** How many there are; {@link #MOST} and one where there are more than that. */
  public long count() {
    long n = 1;
    for (Axis a : axes) {
      n = Math.min(MOST + 1, n * a.values().size());
    }
    return n;
  }

  /**
   * @param variant from 1
   * @return key to value, in the order of the axes
   */
  public Map<String, String> values(long variant) {
    long left = variant - 1;
    String[] value = new String[axes.size()];
    for (int i = axes.size() - 1; i >= 0; i--) {
      List<String> own = axes.get(i).values();
      value[i] = own.get((int) (left % own.size()));
      left /= own.size();
    }
    Map<String, String> out = new LinkedHashMap<>();
    for (int i = 0; i < value.length; i++) {
      out.put(axes.get(i).key(), value[i]);
    }
    return out;
  }
}
