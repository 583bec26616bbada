package etchloom.electric.resistance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The resistor network against Kirchhoff's and textbook networks. */
class NetworkTest {
  private static final double WIDTH_MM = 0.2;

  /** Twelve equal edges of a cube: 5/6 across its body diagonal, 7/12 along an edge (textbook). */
  @Test
  void cubeOfEqualResistors() {
    TestBoards b = new TestBoards(TestBoards.twoLayers(0.035, 0));
    int[] corner = new int[8];
    for (int i = 0; i < 8; i++) {
      corner[i] = b.terminal("C" + i);
    }
    for (int i = 0; i < 8; i++) {
      for (int bit = 1; bit < 8; bit *= 2) {
        if ((i & bit) == 0) {
          b.track(corner[i], corner[i | bit], 1, 100, WIDTH_MM);
        }
      }
    }
    Network n = Network.of(b.build(), 20);
    double one = 100 / 58e3 / (0.035 * WIDTH_MM);
    assertEquals(5.0 / 6 * one, n.terminalOhm("C0", "C7").orElseThrow(), 1e-12);
    assertEquals(7.0 / 12 * one, n.terminalOhm("C0", "C4").orElseThrow(), 1e-12);
    Currents share = n.currents(new Node(corner[0], 1), new Node(corner[7], 1)).orElseThrow();
    for (int id = 0; id < 12; id++) {
      double a = Math.abs(share.ofConductor(id));
      assertTrue(Math.abs(a - 1.0 / 3) < 1e-12 || Math.abs(a - 1.0 / 6) < 1e-12, "got " + a);
    }
  }

  /** Any network against Kirchhoff's equations solved in full. */
  @ParameterizedTest(name = "seed {0}")
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void randomNetworkAgainstFullSolution(long seed) {
    Random random = new Random(seed);
    TestBoards b = new TestBoards(TestBoards.twoLayers(0.035, 0));
    int joints = 5 + random.nextInt(20);
    b.terminal("A");
    b.terminal("B");
    IntStream.range(2, joints).forEach(i -> b.node());
    for (int i = 1; i < joints; i++) {
      b.track(random.nextInt(i), i, 1 + random.nextInt(2), 1 + random.nextInt(500), WIDTH_MM);
    }
    for (int i = 0; i < joints / 2; i++) {
      int from = random.nextInt(joints);
      int to = (from + 1 + random.nextInt(joints - 1)) % joints;
      b.track(from, to, 1 + random.nextInt(2), 1 + random.nextInt(500), WIDTH_MM);
    }
    Artwork art = b.build();
    Network n = Network.of(art, 20);
    Currents c = n.currents(new Node(0, 1), new Node(1, 1)).orElseThrow();
    assertEquals(fullSolution(n), n.terminalOhm("A", "B").orElseThrow(), 1e-9);
    assertEquals(n.terminalOhm("A", "B").orElseThrow(), c.ohm(), 1e-12);
    assertTrue(currentLawHolds(n, c));
    double watt = 0;
    for (int i = 0; i < n.edges().size(); i++) {
      watt += c.ofEdge(i) * c.ofEdge(i) * n.edges().get(i).ohm();
    }
    assertEquals(c.ohm(), watt, 1e-9 * watt); // one ampere heats as much as the whole resists
  }

  private static double fullSolution(Network n) {
    List<Node> nodes = nodes(n);
    RealMatrix y = new Array2DRowRealMatrix(nodes.size(), nodes.size());
    for (Edge e : n.edges()) {
      int a = nodes.indexOf(e.from());
      int b = nodes.indexOf(e.to());
      y.addToEntry(a, a, 1 / e.ohm());
      y.addToEntry(b, b, 1 / e.ohm());
      y.addToEntry(a, b, -1 / e.ohm());
      y.addToEntry(b, a, -1 / e.ohm());
    }
    int to = nodes.indexOf(new Node(1, 1));
    int from = nodes.indexOf(new Node(0, 1));
    y.addToEntry(to, to, 1); // ties node B to earth, so that the matrix has an inverse
    RealVector in = new ArrayRealVector(nodes.size());
    in.setEntry(from, 1);
    in.setEntry(to, -1);
    RealVector v = new LUDecomposition(y).getSolver().solve(in);
    return v.getEntry(from) - v.getEntry(to);
  }

  private static List<Node> nodes(Network n) {
    List<Node> nodes = new ArrayList<>();
    for (Edge e : n.edges()) {
      for (Node x : List.of(e.from(), e.to())) {
        if (!nodes.contains(x)) {
          nodes.add(x);
        }
      }
    }
    return nodes;
  }

  private static boolean currentLawHolds(Network n, Currents c) {
    for (Node x : nodes(n)) {
      double out = 0;
      for (int i = 0; i < n.edges().size(); i++) {
        Edge e = n.edges().get(i);
        out += e.from().equals(x) ? c.ofEdge(i) : 0;
        out -= e.to().equals(x) ? c.ofEdge(i) : 0;
      }
      double wanted = x.equals(new Node(0, 1)) ? 1 : x.equals(new Node(1, 1)) ? -1 : 0;
      if (Math.abs(out - wanted) > 1e-8) {
        return false;
      }
    }
    return true;
  }

  @Test
  void noCopperBetween_isEmpty() {
    TestBoards b = new TestBoards(TestBoards.twoLayers(0.035, 0));
    int u1 = b.terminal("U1");
    int u2 = b.terminal("U2");
    int v1 = b.terminal("V1");
    int v2 = b.terminal("V2");
    b.track(u1, u2, 1, 100, WIDTH_MM);
    b.track(v1, v2, 1, 100, WIDTH_MM);
    Network n = Network.of(b.build(), 20);
    assertTrue(n.terminalOhm("U1", "V1").isEmpty());
    assertTrue(n.currents(new Node(u1, 1), new Node(v2, 1)).isEmpty());
    assertEquals(0.24630542, n.terminalOhm("U1", "U2").orElseThrow(), 1e-7);
  }
}
