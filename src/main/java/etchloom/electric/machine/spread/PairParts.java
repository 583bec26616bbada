package etchloom.electric.machine.spread;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Stackup;
import etchloom.electric.resistance.Currents;
import etchloom.electric.resistance.Edge;
import etchloom.electric.resistance.Network;
import etchloom.electric.resistance.Section;
import etchloom.electric.resistance.Tracks;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * Each terminal pair's resistance as a sum over groups of copper that come out alike: the tracks of
 * one width of one coil on one layer, the rim's of a layer, the barrels of one hole size.
 *
 * <p>Each resistor counts with its share of the current squared: exact for copper in series, and to
 * first order elsewhere (a resistance is the least loss over all shares of one ampere, so shares at
 * their nominal values give it to second order, from above).
 */
final class PairParts {
  /**
   * @param phase the phase's mark, empty for what belongs to none or to several
   * @param layer from 1; 0 for barrels
   * @param coil from 1; 0 for rim and barrels
   * @param sizeMm a track's width, or a hole's diameter
   * @param tapered the track whose width changes; empty where it is the same all along
   */
  record Group(String phase, int layer, int coil, double sizeMm, Optional<Conductor> tapered)
      implements Comparable<Group> {
    private int track() {
      return tapered.map(Conductor::id).orElse(-1);
    }

    @Override
    public int compareTo(Group o) {
      int byLayer = Integer.compare(layer, o.layer);
      int byCoil = byLayer != 0 ? byLayer : Integer.compare(coil, o.coil);
      int bySize = byCoil != 0 ? byCoil : Double.compare(sizeMm, o.sizeMm);
      int byTrack = bySize != 0 ? bySize : Integer.compare(track(), o.track());
      return byTrack != 0 ? byTrack : phase.compareTo(o.phase);
    }
  }

  private final Stackup stackup;
  private final List<Group> groups;
  private final List<List<Tracks.Width>> widths;
  private final double[][] ohm;

  private PairParts(Stackup stackup, List<Group> groups, double[][] ohm) {
    this.stackup = stackup;
    this.groups = groups;
    widths = groups.stream().map(g -> g.tapered().map(Tracks::widths).orElse(List.of())).toList();
    this.ohm = ohm;
  }

  static PairParts of(Artwork artwork) {
    Network network = Network.of(artwork, 20);
    List<Joint> ends = artwork.terminals().stream().filter(t -> !t.mark().endsWith("N")).toList();
    List<Map<Group, Double>> pairs = new ArrayList<>();
    Map<Group, Integer> index = new TreeMap<>();
    for (int i = 0; i < ends.size(); i++) {
      for (int j = i + 1; j < ends.size(); j++) {
        network
            .currents(Network.terminalNode(ends.get(i)), Network.terminalNode(ends.get(j)))
            .ifPresent(c -> pairs.add(parts(artwork, c)));
      }
    }
    pairs.forEach(p -> p.keySet().forEach(g -> index.put(g, 0)));
    List<Group> groups = List.copyOf(index.keySet());
    double[][] ohm = new double[pairs.size()][groups.size()];
    for (int p = 0; p < ohm.length; p++) {
      for (int g = 0; g < groups.size(); g++) {
        ohm[p][g] = pairs.get(p).getOrDefault(groups.get(g), 0.0);
      }
    }
    return new PairParts(artwork.stackup(), groups, ohm);
  }

  private static Map<Group, Double> parts(Artwork artwork, Currents currents) {
    Map<Group, Double> out = new TreeMap<>();
    for (int e = 0; e < currents.edges().size(); e++) {
      double share = currents.ofEdge(e);
      if (share != 0) {
        Edge edge = currents.edges().get(e);
        out.merge(group(artwork, edge), share * share * edge.ohm(), Double::sum);
      }
    }
    return out;
  }

  private static Group group(Artwork artwork, Edge edge) {
    if (edge.barrel()) {
      double hole = artwork.joints().get(edge.from().joint()).hole().orElseThrow();
      return new Group("", 0, 0, hole, Optional.empty());
    }
    Conductor c = artwork.conductors().get(edge.conductor().getAsInt());
    boolean coil = c.what().coil() > 0;
    return new Group(
        coil ? c.what().phase() : "",
        c.layer(),
        c.what().coil(),
        c.widthMm(),
        Optional.of(c).filter(Conductor::tapered));
  }

  List<Group> groups() {
    return groups;
  }

  int pairs() {
    return ohm.length;
  }

  /** A pair's nominal part in a group, Ω. */
  double ohm(int pair, int group) {
    return ohm[pair][group];
  }

  /** A pair's nominal resistance, Ω. */
  double nominal(int pair) {
    double sum = 0;
    for (double part : ohm[pair]) {
      sum += part;
    }
    return sum;
  }

  private double ohm(int pair, double[] factor) {
    double sum = 0;
    for (int g = 0; g < factor.length; g++) {
      sum += ohm[pair][g] * factor[g];
    }
    return sum;
  }

  /** The largest relative departure of any pair, each group's part taken times a factor. */
  double farthest(double[] factor) {
    double most = 0;
    for (int p = 0; p < pairs(); p++) {
      most = Math.max(most, Math.abs(ohm(p, factor) / nominal(p) - 1));
    }
    return most;
  }

  /** Mean of all pairs, Ω, each group's part taken times a factor. */
  double mean(double[] factor) {
    double sum = 0;
    for (int p = 0; p < pairs(); p++) {
      sum += ohm(p, factor);
    }
    return sum / pairs();
  }

  /** Largest less smallest pair over their mean, each group's part taken times a factor. */
  double imbalance(double[] factor) {
    double least = Double.POSITIVE_INFINITY;
    double most = 0;
    double sum = 0;
    for (int p = 0; p < pairs(); p++) {
      double ohm = ohm(p, factor);
      least = Math.min(least, ohm);
      most = Math.max(most, ohm);
      sum += ohm;
    }
    return (most - least) / (sum / pairs());
  }

  /**
   * What a group's resistance becomes: tracks by their width's and copper's factor, barrels by the
   * plating's.
   */
  double factor(int group, double track, double copper, double plating) {
    Group g = groups.get(group);
    if (g.layer() == 0) {
      double p = stackup.platingMm();
      return Section.barrelAreaMm2(g.sizeMm(), p) / Section.barrelAreaMm2(g.sizeMm(), p * plating);
    }
    Stackup.Copper layer = stackup.copper().get(g.layer() - 1);
    if (g.tapered().isPresent()) {
      return Tracks.factor(widths.get(group), layer, track) / copper;
    }
    double cut = layer.undercutMm();
    return (g.sizeMm() - cut) / (g.sizeMm() * track - cut) / copper;
  }
}
