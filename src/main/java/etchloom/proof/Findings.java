package etchloom.proof;

import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Collects findings; of one name in one file only the first ones are kept, the rest is counted. */
final class Findings {
  private static final int KEPT = 50;

  private static final Comparator<ProofFinding> ORDER =
      Comparator.comparing(ProofFinding::layer, Comparator.comparingInt(String::length))
          .thenComparing(ProofFinding::layer)
          .thenComparing(ProofFinding::name)
          .thenComparing(ProofFinding::file)
          .thenComparingInt(ProofFinding::line)
          .thenComparingDouble(f -> f.at().map(Point::x).orElse(0.0))
          .thenComparingDouble(f -> f.at().map(Point::y).orElse(0.0))
          .thenComparing(ProofFinding::message);

  private record Kind(String name, String file, String layer) {}

  private final List<ProofFinding> all = new ArrayList<>();
  private final Map<Kind, Integer> counts = new LinkedHashMap<>();
  private final List<String> notes = new ArrayList<>();

  void add(ProofFinding f) {
    if (counts.merge(new Kind(f.name(), f.file(), f.layer()), 1, Integer::sum) <= KEPT) {
      all.add(f);
    }
  }

  void add(String name, String file, int line, int layer, Point at, String message) {
    add(new ProofFinding(name, file, line, layerName(layer), Optional.of(at), message));
  }

  void add(String name, String file, String message) {
    add(new ProofFinding(name, file, 0, "", Optional.empty(), message));
  }

  static String layerName(int layer) {
    return layer > 0 ? "L" + layer : "";
  }

  void note(String text) {
    notes.add(text);
  }

  int count(String name) {
    return counts.entrySet().stream()
        .filter(e -> e.getKey().name().equals(name))
        .mapToInt(Map.Entry::getValue)
        .sum();
  }

  Optional<Point> firstPlace(String... names) {
    List<String> wanted = List.of(names);
    return all.stream()
        .filter(f -> wanted.contains(f.name()) && f.at().isPresent())
        .min(ORDER)
        .flatMap(ProofFinding::at);
  }

  List<ProofFinding> sorted() {
    return all.stream().sorted(ORDER).toList();
  }

  List<String> notes() {
    List<String> out = new ArrayList<>(notes);
    counts.forEach(
        (k, n) -> {
          if (n > KEPT) {
            out.add(
                k.name()
                    + (k.layer().isEmpty() ? "" : " on " + k.layer())
                    + (k.file().isEmpty() ? "" : " in " + k.file())
                    + ": found at "
                    + n
                    + " places; the first "
                    + KEPT
                    + " are listed");
          }
        });
    return out;
  }
}
