package etchloom.artwork;

import etchloom.geometry.Path;
import java.util.OptionalDouble;

/**
 * A line of the legend on L1's side.
 *
 * @param what the text or mark it belongs to
 * @param letterMm height of the letters of the text, capitals; absent where it belongs to no text
 */
public record Stroke(Path path, double widthMm, String what, OptionalDouble letterMm) {
  /** A line of a mark that is no text. */
  public Stroke(Path path, double widthMm, String what) {
    this(path, widthMm, what, OptionalDouble.empty());
  }
}
