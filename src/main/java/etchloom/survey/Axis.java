package etchloom.survey;

import java.util.List;

/**
 * A key of the spec and the values it takes in turn, as a spec file has them ({@code 0.2 mm}).
 *
 * @param key full path, {@code coil.track}
 */
public record Axis(String key, List<String> values) {
  public Axis {
    values = List.copyOf(values);
  }
}
