package etchloom.receive;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Stackup;
import etchloom.electric.machine.spread.Tolerances;
import etchloom.electric.resistance.Copper;
import etchloom.electric.resistance.Currents;
import etchloom.electric.resistance.Edge;
import etchloom.electric.resistance.Network;
import etchloom.electric.resistance.Tracks;
import etchloom.spec.FabRules;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * What each pair's resistance is made of, and how far good boards' pairs may be apart.
 *
 * <p>One ampere through a pair loses {@code share² · R} in each resistor: these losses add up to
 * the pair's resistance, and are its derivative by each resistor's relative change.
 *
 * @param track ohms in tracks, by pair; nought where nothing joins it
 * @param barrel ohms in plated holes
 * @param apart how far the relative departures of two pairs of a good board may differ
 */
record Parts(double[] track, double[] barrel, double[][] apart) {
  /** Standard deviations of the local spread: beyond, under one good board in ten thousand. */
  private static final double SIGMAS = 4;

  /** What two readings may differ by for the meter's sake: half a per cent each. */
  private static final double METER = 0.01;

  static Parts of(Artwork artwork, FabRules.Tolerance tolerance, Pairs pairs) {
    Network network = Network.of(artwork, Copper.REFERENCE_C);
    int n = pairs.size();
    double[] track = new double[n];
    double[] barrel = new double[n];
    List<Map<Integer, double[]>> local = new java.util.ArrayList<>();
    List<Joint> ends = artwork.terminals();
    for (int i = 0; i < ends.size(); i++) {
      for (int j = i + 1; j < ends.size(); j++) {
        int p = pairs.of(ends.get(i).mark(), ends.get(j).mark());
        Map<Integer, double[]> groups = new TreeMap<>();
        Optional<Currents> currents =
            network.currents(Network.terminalNode(ends.get(i)), Network.terminalNode(ends.get(j)));
        currents.ifPresent(c -> add(artwork, tolerance, c, groups, p, track, barrel));
        local.add(groups);
      }
    }
    return new Parts(track, barrel, apart(local));
  }

  private static void add(
      Artwork artwork,
      FabRules.Tolerance tolerance,
      Currents c,
      Map<Integer, double[]> groups,
      int pair,
      double[] track,
      double[] barrel) {
    for (int e = 0; e < c.edges().size(); e++) {
      Edge edge = c.edges().get(e);
      double lost = c.ofEdge(e) * c.ofEdge(e) * edge.ohm();
      if (edge.barrel()) {
        barrel[pair] += lost;
        continue;
      }
      track[pair] += lost;
      Conductor own = artwork.conductors().get(edge.conductor().getAsInt());
      Stackup.Copper copper = artwork.stackup().copper().get(own.layer() - 1);
      double byTrack = tolerance.track() * Tracks.sensitivity(Tracks.widths(own), copper);
      double sigma = Tolerances.LOCAL / 3 * Math.hypot(byTrack, tolerance.copper());
      int group = own.what().coil() * artwork.layers() + own.layer();
      groups.computeIfAbsent(group, g -> new double[1])[0] += lost / c.ohm() * sigma;
    }
  }

  private static double[][] apart(List<Map<Integer, double[]>> local) {
    int n = local.size();
    double[][] out = new double[n][n];
    for (int p = 0; p < n; p++) {
      for (int q = 0; q < n; q++) {
        double squares = 0;
        for (Map.Entry<Integer, double[]> g : local.get(p).entrySet()) {
          double other = local.get(q).getOrDefault(g.getKey(), new double[1])[0];
          squares += (g.getValue()[0] - other) * (g.getValue()[0] - other);
        }
        for (Map.Entry<Integer, double[]> g : local.get(q).entrySet()) {
          squares += local.get(p).containsKey(g.getKey()) ? 0 : g.getValue()[0] * g.getValue()[0];
        }
        out[p][q] = SIGMAS * Math.sqrt(squares) + METER;
      }
    }
    return out;
  }

  /**
   * The factor on all copper that turns the drawn resistances of some pairs, together, into so many
   * times as much, holes as drawn; empty where no thickness would.
   */
  Optional<Double> copper(List<Integer> some, double times) {
    double t = some.stream().mapToDouble(p -> track[p]).sum();
    double b = some.stream().mapToDouble(p -> barrel[p]).sum();
    double left = times * (t + b) - b;
    return t > 0 && left > 0 ? Optional.of(t / left) : Optional.empty();
  }
}
