package etchloom.write;

import etchloom.artwork.Artwork;
import etchloom.artwork.Joint;
import etchloom.artwork.MountingHole;
import etchloom.geometry.Grid;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** The board's holes by tool: what they are for, then the finished diameter. */
final class Holes {
  private Holes() {}

  /**
   * @param function aperture function in Gerber's words
   */
  record Tool(String function, long diameterNm, List<Hit> hits) {}

  record Hit(long x, long y, Optional<String> net) {}

  private record Key(String function, long diameterNm) {}

  private static final Comparator<Key> ORDER =
      Comparator.comparing(Key::function)
          .reversed() // vias before terminals
          .thenComparingLong(Key::diameterNm);

  static List<Tool> plated(Artwork art) {
    Map<Key, List<Hit>> tools = new TreeMap<>(ORDER);
    for (Joint j : art.joints()) {
      if (j.hole().isPresent()) {
        Key k =
            new Key(j.terminal() ? "ComponentDrill" : "ViaDrill", Grid.nm(j.hole().orElseThrow()));
        long[] at = Trace.steps(j.at());
        tools
            .computeIfAbsent(k, x -> new ArrayList<>())
            .add(new Hit(at[0], at[1], Optional.of(j.net())));
      }
    }
    return list(tools);
  }

  static List<Tool> nonPlated(Artwork art) {
    Map<Key, List<Hit>> tools = new TreeMap<>(ORDER);
    for (MountingHole h : art.mountingHoles()) {
      long[] at = Trace.steps(h.at());
      tools
          .computeIfAbsent(
              new Key("MechanicalDrill", Grid.nm(h.diameterMm())), x -> new ArrayList<>())
          .add(new Hit(at[0], at[1], Optional.empty()));
    }
    return list(tools);
  }

  private static List<Tool> list(Map<Key, List<Hit>> tools) {
    List<Tool> out = new ArrayList<>();
    tools.forEach((k, hits) -> out.add(new Tool(k.function, k.diameterNm, List.copyOf(hits))));
    return out;
  }
}
