package etchloom.receive;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Phase;
import etchloom.electric.resistance.Edge;
import etchloom.electric.resistance.Network;
import etchloom.electric.resistance.Node;
import etchloom.spec.FabRules;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.Random;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;

/**
 * One made board on a measuring bench: the drawn copper as resistors, each layer and each coil's
 * copper on it a little off, with or without a fault; solved by nodal analysis with Commons Math's
 * LU decomposition, and read by a meter with noise.
 */
final class BenchBoard {
  /** Keeps parts without a connection solvable; what is above {@link #OPEN_OHM} is open. */
  private static final double LEAK_SIEMENS = 1e-12;

  private static final double OPEN_OHM = 1e9;

  private final Artwork artwork;
  private final Network drawn;
  private final Random random;
  private final List<Edge> edges = new ArrayList<>();
  private double meter = 0.001;
  private int swapA = -1;
  private int swapB = -1;

  private BenchBoard(Artwork artwork, Random random) {
    this.artwork = artwork;
    drawn = Network.of(artwork, 20);
    this.random = random;
  }

  /**
   * A good board: each layer draws track width and copper, each coil's part of a layer a little on
   * top, three standard deviations being the fab's tolerance.
   */
  static BenchBoard good(Artwork artwork, FabRules.Tolerance t, Random random) {
    BenchBoard b = new BenchBoard(artwork, random);
    Map<Integer, double[]> layer = new TreeMap<>();
    Map<List<Integer>, double[]> local = new TreeMap<>(Comparator.comparing(List::toString));
    double share = 0.25;
    double plating = 1 + cut(t.plating(), random.nextGaussian() / 3);
    for (Edge e : b.drawn.edges()) {
      if (e.barrel()) {
        b.edges.add(new Edge(e.from(), e.to(), e.ohm() / plating, e.conductor()));
        continue;
      }
      Conductor c = artwork.conductors().get(e.conductor().getAsInt());
      double[] l = layer.computeIfAbsent(c.layer(), k -> b.two(Math.sqrt(1 - share * share) / 3));
      double[] o =
          local.computeIfAbsent(List.of(c.layer(), c.what().coil()), k -> b.two(share / 3));
      double cutMm = artwork.stackup().copper().get(c.layer() - 1).undercutMm();
      double width = c.widthMm() * (1 + cut(t.track(), l[0] + o[0]));
      double copper = 1 + cut(t.copper(), l[1] + o[1]);
      double ohm = e.ohm() * (c.widthMm() - cutMm) / (width - cutMm) / copper;
      b.edges.add(new Edge(e.from(), e.to(), ohm, e.conductor()));
    }
    return b;
  }

  private double[] two(double sigma) {
    return new double[] {sigma * random.nextGaussian(), sigma * random.nextGaussian()};
  }

  private static double cut(double tolerance, double sigmas) {
    return tolerance * Math.max(-1, Math.min(1, sigmas));
  }

  private Phase anyPhase() {
    return artwork.phases().get(random.nextInt(artwork.phases().size()));
  }

  private static Set<Integer> conductors(Phase p) {
    return p.steps().stream()
        .map(Phase.Step::conductor)
        .collect(Collectors.toCollection(TreeSet::new));
  }

  private void scale(Set<Integer> ids, double factor) {
    edges.replaceAll(
        e ->
            e.conductor().isPresent() && ids.contains(e.conductor().getAsInt())
                ? new Edge(e.from(), e.to(), e.ohm() * factor, e.conductor())
                : e);
  }

  /** One conductor of one phase, anywhere along it, is broken. */
  BenchBoard broken() {
    List<Integer> ids = List.copyOf(conductors(anyPhase()));
    int gone = ids.get(random.nextInt(ids.size()));
    edges.removeIf(e -> e.conductor().isPresent() && e.conductor().getAsInt() == gone);
    return this;
  }

  /** Two neighbouring layers of any coil touch where they are farthest from being joined. */
  BenchBoard shorted() {
    Coil coil = artwork.coils().get(random.nextInt(artwork.coils().size()));
    int upper = random.nextInt(coil.conductors().size() - 1);
    Conductor a = artwork.conductors().get(coil.conductors().get(upper));
    Conductor b = artwork.conductors().get(coil.conductors().get(upper + 1));
    int common =
        a.fromJoint() == b.fromJoint() || a.fromJoint() == b.toJoint()
            ? a.fromJoint()
            : a.toJoint();
    int farA = a.fromJoint() == common ? a.toJoint() : a.fromJoint();
    int farB = b.fromJoint() == common ? b.toJoint() : b.fromJoint();
    edges.add(
        new Edge(new Node(farA, a.layer()), new Node(farB, b.layer()), 1e-3, OptionalInt.empty()));
    return this;
  }

  /** All copper off by one factor. */
  BenchBoard copper(double factor) {
    edges.replaceAll(
        e -> e.barrel() ? e : new Edge(e.from(), e.to(), e.ohm() / factor, e.conductor()));
    return this;
  }

  /** All of one phase's tracks narrow. */
  BenchBoard etched(double factor) {
    scale(conductors(anyPhase()), factor);
    return this;
  }

  /** One of a phase's joints is bad and adds a share of the phase's resistance. */
  BenchBoard badVia(double share) {
    List<Integer> ids = List.copyOf(conductors(anyPhase()));
    double phase =
        edges.stream()
            .filter(e -> e.conductor().isPresent() && ids.contains(e.conductor().getAsInt()))
            .mapToDouble(Edge::ohm)
            .sum();
    int at = ids.get(random.nextInt(ids.size()));
    edges.replaceAll(
        e ->
            e.conductor().isPresent() && e.conductor().getAsInt() == at
                ? new Edge(e.from(), e.to(), e.ohm() + share * phase, e.conductor())
                : e);
    return this;
  }

  /** The two terminals' leads have changed places. */
  BenchBoard swapped(int a, int b) {
    swapA = a;
    swapB = b;
    return this;
  }

  private int moved(int t) {
    return t == swapA ? swapB : t == swapB ? swapA : t;
  }

  /** The readings' rows, leads of a tenth of an ohm included. */
  String rows(String board, boolean everyPair) {
    List<Joint> ends = artwork.terminals();
    double[][] ohm = solve(ends);
    Set<List<Integer>> joined = joined(ends);
    double celsius = 15 + 20 * random.nextDouble();
    StringBuilder out = new StringBuilder();
    for (int i = 0; i < ends.size(); i++) {
      for (int j = i + 1; j < ends.size(); j++) {
        boolean own = joined.contains(List.of(i, j));
        if (!own && !everyPair) {
          continue;
        }
        double r = ohm[moved(i)][moved(j)];
        double hot = r * (1 + 0.00393 * (celsius - 20)) * (1 + meter * random.nextGaussian()) + 0.1;
        out.append(board).append(',').append(ends.get(i).mark()).append(',');
        out.append(ends.get(j).mark()).append(',');
        out.append(r > OPEN_OHM ? "OL" : String.valueOf(hot))
            .append(',')
            .append(celsius)
            .append('\n');
      }
    }
    return out.toString();
  }

  /** The pairs that a drawn board joins: others are measured only where asked for. */
  private Set<List<Integer>> joined(List<Joint> ends) {
    Set<List<Integer>> out = new HashSet<>();
    boolean open = ends.stream().anyMatch(t -> t.mark().endsWith("2"));
    for (int i = 0; i < ends.size(); i++) {
      for (int j = i + 1; j < ends.size(); j++) {
        if (!open || ends.get(i).mark().charAt(0) == ends.get(j).mark().charAt(0)) {
          out.add(List.of(i, j));
        }
      }
    }
    return out;
  }

  private double[][] solve(List<Joint> ends) {
    Map<Node, Integer> index = new TreeMap<>();
    edges.forEach(
        e -> {
          index.putIfAbsent(e.from(), index.size());
          index.putIfAbsent(e.to(), index.size());
        });
    ends.forEach(t -> index.putIfAbsent(Network.terminalNode(t), index.size()));
    int n = index.size();
    RealMatrix g = MatrixUtils.createRealIdentityMatrix(n).scalarMultiply(LEAK_SIEMENS);
    for (Edge e : edges) {
      int a = index.get(e.from());
      int b = index.get(e.to());
      double s = 1 / e.ohm();
      g.addToEntry(a, a, s);
      g.addToEntry(b, b, s);
      g.addToEntry(a, b, -s);
      g.addToEntry(b, a, -s);
    }
    var solver = new LUDecomposition(g, 0).getSolver();
    double[][] out = new double[ends.size()][ends.size()];
    for (int i = 0; i < ends.size(); i++) {
      for (int j = i + 1; j < ends.size(); j++) {
        int a = index.get(Network.terminalNode(ends.get(i)));
        int b = index.get(Network.terminalNode(ends.get(j)));
        RealVector in = new ArrayRealVector(n);
        in.setEntry(a, 1);
        in.setEntry(b, -1);
        RealVector v = solver.solve(in);
        out[i][j] = v.getEntry(a) - v.getEntry(b);
        out[j][i] = out[i][j];
      }
    }
    return out;
  }
}
