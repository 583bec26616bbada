package etchloom.proof.copper;

import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;
import java.util.Optional;

/**
 * A drilled hole or a slot of the board.
 *
 * @param at its centre; of a slot the middle of its path
 * @param slot the path of the cutter's centre; empty for a round hole
 * @param diameterMm finished
 * @param fromLayer first copper layer it passes, from 1
 * @param toLayer last copper layer it passes
 * @param function such as {@code ViaDrill}; empty when the file does not say
 * @param nets the nets that the file declares for it
 * @param file where it was read
 * @param line of that file, from 1
 */
public record Hole(
    Point at,
    Optional<Path> slot,
    double diameterMm,
    boolean plated,
    int fromLayer,
    int toLayer,
    String function,
    List<String> nets,
    String file,
    int line) {
  public Hole {
    nets = List.copyOf(nets);
  }

  public boolean through(int layer) {
    return layer >= fromLayer && layer <= toLayer;
  }

  /** Points of the centre line that are no farther apart than the hole's radius. */
  List<Point> samples() {
    if (slot.isEmpty()) {
      return List.of(at);
    }
    return slot.get().segments().stream()
        .flatMap(
            s -> {
              int n = 1 + (int) Math.min(10_000, Math.ceil(2 * s.lengthMm() / diameterMm));
              return java.util.stream.IntStream.rangeClosed(0, n)
                  .mapToObj(i -> s.at(i / (double) n));
            })
        .toList();
  }
}
