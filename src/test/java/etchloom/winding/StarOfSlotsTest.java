package etchloom.winding;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class StarOfSlotsTest {
  /**
   * Winding and distribution factors of double-layer tooth-coil windings: Cros and Viarouge 2002,
   * Libert and Soulard 2004, Bianchi et al. 2006 (tables recalled). 3-phase.
   */
  @ParameterizedTest(name = "{0} coils, {1} poles")
  @CsvSource({
    "3,2,0.8660,1.0", "3,4,0.8660,1.0", "6,4,0.8660,1.0", "6,8,0.8660,1.0",
    "9,6,0.8660,1.0", "9,8,0.9452,0.9598", "9,10,0.9452,0.9598", "9,12,0.8660,1.0",
    "12,8,0.8660,1.0", "12,10,0.9330,0.9659", "12,14,0.9330,0.9659", "12,16,0.8660,1.0",
    "15,14,0.9514,0.9567", "15,16,0.9514,0.9567", "18,12,0.8660,1.0", "18,14,0.9019,0.9598",
    "18,16,0.9452,0.9598", "18,20,0.9452,0.9598", "18,24,0.8660,1.0", "21,20,0.9531,0.9558",
    "21,22,0.9531,0.9558", "24,20,0.9330,0.9659", "24,22,0.9495,0.9577", "24,26,0.9495,0.9577",
    "24,28,0.9330,0.9659", "27,24,0.9452,0.9598", "36,40,0.9452,0.9598", "36,42,0.9330,0.9659"
  })
  void factorsAgreeWithPublishedTables(int coils, int poles, double kw, double kd) {
    Winding w = StarOfSlots.wind(3, coils, poles).orElseThrow();
    assertEquals(kw, w.windingFactor(), 1e-4);
    assertEquals(kd, w.distributionFactor(), 1e-4);
  }

  /**
   * Published sequences (same tables): capital forward, small reversed. A sequence is defined up to
   * rotation, reversal and sign, so its phasors are compared, not its letters.
   */
  @ParameterizedTest(name = "{0} coils, {1} poles: {2}")
  @CsvSource({
    "3,2,ABC",
    "3,4,ACB",
    "9,8,AabBbcCca",
    "9,10,AacCcbBba",
    "12,10,AabBCcaABbcC",
    "12,14,ACcbBAacCBba",
    "15,14,AaABbBbBCcCcCAa",
    "15,16,AaACcCcCBbBbBAa",
    "18,14,ABbcaABCcabBCAabcC",
    "21,20,AaAabBbBbBbcCcCcCcaAa",
    "24,22,AaABbBbcCcCAaAabBbBCcCca",
    "24,28,ACcbBAacCBbaACcbBAacCBba"
  })
  void publishedSequencesHaveThePhasorSumsOfOurs(int coils, int poles, String letters) {
    double[] sums = new double[3];
    for (int phase = 0; phase < 3; phase++) {
      double re = 0;
      double im = 0;
      for (int k = 0; k < coils; k++) {
        char c = letters.charAt(k);
        if (Character.toUpperCase(c) != "ABC".charAt(phase)) {
          continue;
        }
        double a = Math.PI * poles * k / coils;
        re += (Character.isUpperCase(c) ? 1 : -1) * Math.cos(a);
        im += (Character.isUpperCase(c) ? 1 : -1) * Math.sin(a);
      }
      sums[phase] = Math.hypot(re, im) / (coils / 3.0);
    }
    Winding w = StarOfSlots.wind(3, coils, poles).orElseThrow();
    for (double s : sums) {
      assertEquals(s, w.distributionFactor(), 1e-9);
    }
  }

  /** The trap named in the design: half of these phasors lie exactly between two belts. */
  @Test
  void phasorsBetweenBeltsAreDealtOutEvenly() {
    Winding w = StarOfSlots.wind(3, 12, 10).orElseThrow();
    for (int p = 0; p < 3; p++) {
      int phase = p;
      assertEquals(4, w.sequence().stream().filter(c -> c.phase() == phase).count());
      assertEquals(
          0, w.sequence().stream().filter(c -> c.phase() == phase).mapToInt(PhaseCoil::sign).sum());
    }
    assertEquals(Math.cos(Math.PI / 12), w.distributionFactor(), 1e-12);
  }

  /**
   * Winding factors of two, five and twice three phases as published for tooth coils in two layers:
   * two-phase 8/6 and 8/10 of small motors; five-phase 10/8, 10/12, 20/18 and 20/22 (Bianchi and
   * others on fault-tolerant machines); dual three-phase 12/10, 12/14, 24/22 (Barcaro, Bianchi,
   * Magnussen 2010). All recalled, and each checked with the textbook's formula below.
   */
  @ParameterizedTest(name = "{0} phases, {1} coils, {2} poles")
  @CsvSource({
    "2,8,6,0.854",
    "2,8,10,0.854",
    "2,4,2,0.707",
    "2,4,6,0.707",
    "5,10,8,0.951",
    "5,10,12,0.951",
    "5,20,18,0.976",
    "5,20,22,0.976",
    "5,15,12,0.951",
    "6,12,10,0.966",
    "6,12,14,0.966",
    "6,24,22,0.983",
    "6,24,26,0.983",
    "6,24,20,0.966"
  })
  void factorsOfOtherPhaseCountsAgreeWithPublishedOnes(int m, int coils, int poles, double kw) {
    assertEquals(kw, StarOfSlots.wind(m, coils, poles).orElseThrow().windingFactor(), 5e-4);
  }

  /**
   * Distribution factor of z neighbouring spokes in a belt of width β, {@code sin(β/2) / (z
   * sin(β/2z))}, and pitch factor {@code sin(πP/Q)}: textbook (Pyrhönen, Jokinen, Hrabovcová,
   * Design of Rotating Electrical Machines, chapter 2; recalled). Belts of 180°/m, of 30° for twice
   * three phases, 360°/m where the star has an odd number of spokes.
   */
  @ParameterizedTest(name = "{0} phases, {1} coils, {2} poles")
  @CsvSource({
    "2,8,6", "2,8,10", "2,16,14", "2,12,10", "2,20,18", "2,24,22",
    "5,10,8", "5,15,14", "5,20,18", "5,25,24", "5,30,28", "5,40,38",
    "6,12,10", "6,24,22", "6,36,34", "6,24,26", "6,48,44"
  })
  void factorsFollowTheTextbookFormula(int m, int coils, int poles) {
    int pairs = poles / 2;
    int spokes = coils / gcd(coils, pairs);
    double belt = m == 6 ? Math.PI / 6 : spokes % 2 == 0 ? Math.PI / m : 2 * Math.PI / m;
    double z = spokes * belt / (2 * Math.PI);
    if (spokes % 2 == 1) {
      // Reversed coils fall between the others: half the belt, spokes twice as close.
      belt /= 2;
    }
    double kd = Math.sin(belt / 2) / (z * Math.sin(belt / 2 / z));
    double kp = Math.sin(Math.PI * pairs / coils);
    Winding w = StarOfSlots.wind(m, coils, poles).orElseThrow();
    assertEquals(kd, w.distributionFactor(), 1e-12);
    assertEquals(kp, w.pitchFactor(), 1e-12);
  }

  private static int gcd(int a, int b) {
    return b == 0 ? a : gcd(b, a % b);
  }

  /**
   * Sequences from stars drawn by hand. 10 coils, 8 poles: each coil 144° on, so every second of
   * five phases. 8 coils, 6 poles: 135° on, belts of 90°. 12 coils, 10 poles as twice three phases:
   * 150° on, each phasor in the middle of a belt of 30°.
   */
  @ParameterizedTest
  @CsvSource({
    "5,10,8,U W T V S U W T V S",
    "2,8,6,U -U -V V -U U V -V",
    "6,12,10,1U 2V -1V -2W 1W 2U -1U -2V 1V 2W -1W -2U"
  })
  void sequencesFollowTheStar(int m, int coils, int poles, String want) {
    Winding w = StarOfSlots.wind(m, coils, poles).orElseThrow();
    String got =
        w.sequence().stream()
            .map(c -> (c.sign() < 0 ? "-" : "") + w.marks().get(c.phase()))
            .collect(java.util.stream.Collectors.joining(" "));
    assertEquals(want, got);
  }

  /** Each phase of a set lags the one before it by its angle; the second set lags by 30°. */
  @Test
  void axesOfOtherPhaseCountsStandAtTheirAngles() {
    for (int[] c : new int[][] {{2, 8, 6}, {5, 20, 18}, {6, 24, 22}}) {
      Winding w = StarOfSlots.wind(c[0], c[1], c[2]).orElseThrow();
      double[][] degrees = {{0, 90}, {0, 72, 144, 216, 288}, {0, 120, 240, 30, 150, 270}};
      double[] want = degrees[c[0] == 2 ? 0 : c[0] == 5 ? 1 : 2];
      for (int p = 0; p < c[0]; p++) {
        double el = Math.toDegrees((w.axisRad().get(p) - w.axisRad().get(0)) * c[2] / 2);
        assertEquals(0, Math.IEEEremainder(el - want[p], 360), 1e-9);
      }
    }
  }

  /** Infeasible pairs of the same tables: coils, or coils over their common part, not by three. */
  @ParameterizedTest(name = "{0} coils, {1} poles")
  @CsvSource({"12,12", "9,18", "12,6", "10,8", "15,12", "12,18", "6,6"})
  void infeasibleCountsAreRefused(int coils, int poles) {
    assertTrue(StarOfSlots.wind(3, coils, poles).isEmpty());
  }

  @Test
  void nearestCountsAreFeasibleAndNearest() {
    assertEquals(Optional.of(9), StarOfSlots.nearestCoils(3, 10, 8));
    assertEquals(Optional.of(10), StarOfSlots.nearestPoles(3, 12, 12));
    assertTrue(StarOfSlots.wind(3, 12, 10).isPresent());
  }

  @Test
  void axesFollowThePhasesAndLieInOnePolePair() {
    Winding w = StarOfSlots.wind(3, 9, 12).orElseThrow();
    double pair = 2 * Math.PI / 6;
    assertEquals(0, w.axisRad().get(0), 1e-12);
    // V lags U by 120 electrical degrees, so its axis stands a third of a pole pair further on.
    assertEquals(pair / 3, w.axisRad().get(1), 1e-12);
    assertEquals(2 * pair / 3, w.axisRad().get(2), 1e-12);
  }

  /** Coil 1 of 12 coils and 10 poles and its neighbour share a phase; the axis lies between. */
  @Test
  void axisIsThatOfThePhasorSumNotOfTheBelt() {
    Winding w = StarOfSlots.wind(3, 12, 10).orElseThrow();
    double electrical = Math.toDegrees(w.axisRad().get(0) * 5);
    assertEquals(15, Math.min(electrical, 360 - electrical), 1e-9);
  }

  @Test
  void otherPhaseCountsAreBalanced() {
    for (int[] c : new int[][] {{1, 6, 6}, {2, 8, 6}, {5, 10, 8}, {6, 12, 10}, {6, 24, 22}}) {
      Winding w = StarOfSlots.wind(c[0], c[1], c[2]).orElseThrow();
      assertEquals(c[1], w.sequence().size());
      assertTrue(w.distributionFactor() > 0.9, () -> List.of(c[0], c[1], c[2]).toString());
    }
  }
}
