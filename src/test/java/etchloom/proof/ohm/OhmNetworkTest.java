package etchloom.proof.ohm;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class OhmNetworkTest {
  /** Twelve equal resistors along the edges of a cube: the textbook values, by symmetry. */
  @Test
  void cubeOfResistors() {
    OhmNetwork net = new OhmNetwork();
    int[] v = new int[8];
    for (int i = 0; i < 8; i++) {
      v[i] = net.node();
    }
    for (int i = 0; i < 8; i++) {
      for (int bit = 1; bit < 8; bit *= 2) {
        if ((i & bit) == 0) {
          net.resistor(v[i], v[i | bit], 1);
        }
      }
    }
    List<OptionalDouble> r = net.between(new int[] {v[0], v[1], v[3], v[7]});
    assertEquals(7 / 12.0, r.get(0).orElseThrow(), 1e-12); // along an edge
    assertEquals(3 / 4.0, r.get(1).orElseThrow(), 1e-12); // across a face
    assertEquals(5 / 6.0, r.get(2).orElseThrow(), 1e-12); // through the body
  }

  @Test
  void placesThatNothingJoins_haveNoResistance() {
    OhmNetwork net = new OhmNetwork();
    int a = net.node();
    int b = net.node();
    int c = net.node();
    net.resistor(a, b, 2);
    net.resistor(a, b, 2);
    List<OptionalDouble> r = net.between(new int[] {a, b, c});
    assertEquals(1, r.get(0).orElseThrow(), 1e-15);
    assertTrue(r.get(1).isEmpty() && r.get(2).isEmpty());
  }

  @Test
  void joinedNodes_areOne() {
    OhmNetwork net = new OhmNetwork();
    int a = net.node();
    int b = net.node();
    int c = net.node();
    net.resistor(a, b, 3);
    net.resistor(b, c, 0);
    List<OptionalDouble> r = net.between(new int[] {a, c, b});
    assertEquals(3, r.get(0).orElseThrow(), 1e-15);
    assertEquals(0, r.get(2).orElseThrow());
  }
}
