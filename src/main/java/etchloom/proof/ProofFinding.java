package etchloom.proof;

import etchloom.geometry.Point;
import java.util.Locale;
import java.util.Optional;

/**
 * Something in a set of files that is not as it must be.
 *
 * @param name one of {@link ProofNames}
 * @param file where it was read; empty where no single file is meant
 * @param line of that file, from 1; 0 where none is meant
 * @param layer {@code L1}, or empty where no layer is meant
 * @param at the place, where there is one
 * @param message what was found and what was wanted
 */
public record ProofFinding(
    String name, String file, int line, String layer, Optional<Point> at, String message) {

  /** {@code short: L1 at (18.204, 3.310) mm, radius 18.503 mm, 10.31 deg: …}. */
  public String text() {
    StringBuilder s = new StringBuilder(name).append(": ");
    if (!file.isEmpty()) {
      s.append(file).append(line > 0 ? ":" + line : "").append(": ");
    }
    if (!layer.isEmpty()) {
      s.append(layer).append(at.isPresent() ? " " : ": ");
    }
    at.ifPresent(p -> s.append("at ").append(place(p)).append(": "));
    return s.append(message).toString();
  }

  static String place(Point p) {
    double degrees = Math.toDegrees(p.angleRad());
    return String.format(
        Locale.ROOT,
        "(%.3f, %.3f) mm, radius %.3f mm, %.2f deg",
        p.x() + 0.0,
        p.y() + 0.0,
        p.norm(),
        degrees < 0 ? degrees + 360 : degrees + 0.0);
  }
}
