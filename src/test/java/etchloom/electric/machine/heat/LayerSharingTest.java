package etchloom.electric.machine.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.artwork.CopperBuilder;
import etchloom.artwork.Feature;
import etchloom.artwork.Joint;
import etchloom.artwork.Stackup;
import etchloom.electric.field.AxialField;
import etchloom.electric.field.RadialField;
import etchloom.electric.machine.emf.Coupling;
import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.junit.jupiter.api.Test;

/**
 * Layers side by side whose fields and thicknesses differ, against circuits set up by hand: one
 * turn of two spokes a pole apart, so that a layer's voltage is the textbook's for a conductor that
 * crosses a field, {@code e = B l v} along the radius: {@code B ω (R² − r²) / 2} for each spoke.
 */
class LayerSharingTest {
  private static final int POLE_PAIRS = 4;
  private static final double INNER_MM = 15;
  private static final double OUTER_MM = 30;
  private static final double WIDTH_MM = 0.3;
  private static final double RAD_PER_SECOND = 120;

  /** IEC 60028, Ω·mm: 1/58 Ω·mm²/m. */
  private static final double RHO = 1 / 58e3;

  /** Peak flux density by layer. */
  private record Field(double... tesla) implements AxialField, RadialField {
    @Override
    public int polePairs() {
      return POLE_PAIRS;
    }

    @Override
    public int orders() {
      return 1;
    }

    @Override
    public void amplitudes(int layer, double radiusMm, double[] out) {
      out[0] = tesla[layer - 1];
    }

    @Override
    public double scaleMm(int layer) {
      return 1;
    }

    @Override
    public void radialAmplitudes(double radiusMm, double heightMm, double[] out) {
      out[0] = 0;
    }
  }

  private static final double[] THICK_MM = {0.070, 0.035, 0.050};

  /** The same turn on each layer, from one hole to the other. */
  private static Artwork turns(int layers) {
    double half = Math.PI / POLE_PAIRS / 2;
    Point a = Point.polar(INNER_MM, -half);
    Point b = Point.polar(OUTER_MM, -half);
    Point c = Point.polar(OUTER_MM, half);
    Point d = Point.polar(INNER_MM, half);
    Path turn = Path.of(new Line(a, b), new Arc(b, c, Point.ORIGIN, true), new Line(c, d));
    CopperBuilder copper = new CopperBuilder();
    int from = copper.drilled(Joint.Kind.NODE, a, 0.6, 0.3, layers, "U", "start");
    int to = copper.drilled(Joint.Kind.NODE, d, 0.6, 0.3, layers, "U", "finish");
    List<Integer> ids = new ArrayList<>();
    List<Stackup.Copper> build = new ArrayList<>();
    for (int l = 1; l <= layers; l++) {
      Feature what = new Feature(Feature.Kind.SPIRAL, "U", 1, List.of(1, 1, 1));
      ids.add(copper.track(l, WIDTH_MM, turn, from, to, "U", what));
      build.add(new Stackup.Copper(THICK_MM[l - 1], 1, 0));
    }
    Stackup stackup =
        new Stackup(build, java.util.Collections.nCopies(layers - 1, 0.2), /* platingMm= */ 0.02);
    return new Artwork(
        "Turn",
        "turn",
        "A",
        false,
        stackup,
        List.of(),
        copper.joints(),
        copper.conductors(),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        List.of(new Coil(1, "U", 1, 0, from, to, ids)),
        List.of(),
        1,
        0);
  }

  /** Length over section. */
  private static double ohm(int layer) {
    double length = 2 * (OUTER_MM - INNER_MM) + OUTER_MM * Math.PI / POLE_PAIRS;
    return RHO * length / (WIDTH_MM * THICK_MM[layer - 1]);
  }

  /** Peak of both spokes together: they stand under unlike poles, where their voltages add. */
  private static double volt(double tesla) {
    return 2 * tesla * RAD_PER_SECOND * (OUTER_MM * OUTER_MM - INNER_MM * INNER_MM) * 1e-6 / 2;
  }

  private static List<LayerSharing.Layer> layers(LayerSharing s) {
    return s.groups().get(0);
  }

  /** One mesh: the difference of the voltages over the sum of the resistances. */
  @Test
  void twoLayers_driveTheirDifferenceThroughBoth() {
    Artwork art = turns(2);
    LayerSharing s = LayerSharing.of(art).orElseThrow();
    Coupling c = Coupling.of(art, new Field(0.5, 0.41));
    double r = ohm(1) + ohm(2);
    double want = (volt(0.5) - volt(0.41)) / r / Math.sqrt(2);
    for (LayerSharing.Layer l : layers(s)) {
      assertEquals(want, s.ampereRms(c, l, RAD_PER_SECOND, 20), 1e-9 * want);
    }
    assertEquals(want, s.mostAmpereRms(c, RAD_PER_SECOND, 20), 1e-9 * want);
    assertEquals(want * want * r, s.watt(c, RAD_PER_SECOND, 20), 1e-9 * want * want * r);
    // 80 K warmer, copper has 1 + 0.00393 · 80 of its resistance
    double warm = want / (1 + 0.00393 * 80);
    assertEquals(warm, s.mostAmpereRms(c, RAD_PER_SECOND, 100), 1e-9 * want);
    assertEquals(0.5 / 0.455, s.linkageRatio(c, layers(s).get(0)), 1e-9);
  }

  /**
   * Three layers and the barrels between them: Kirchhoff's voltage law round both meshes. The
   * barrels, which the figure leaves out, are worth a few thousandths.
   */
  @Test
  void threeLayers_againstMeshEquations() {
    Artwork art = turns(3);
    LayerSharing s = LayerSharing.of(art).orElseThrow();
    double[] tesla = {0.5, 0.41, 0.3};
    Coupling c = Coupling.of(art, new Field(tesla));
    for (boolean barrels : new boolean[] {false, true}) {
      double[] mesh = meshAmperes(art, tesla, barrels);
      double[] want = {mesh[0], mesh[1] - mesh[0], -mesh[1]};
      double share = barrels ? 0.01 : 1e-9;
      for (int l = 0; l < 3; l++) {
        double rms = Math.abs(want[l]) / Math.sqrt(2);
        double got = s.ampereRms(c, layers(s).get(l), RAD_PER_SECOND, 20);
        assertEquals(rms, got, share * Math.abs(want[0]), "L" + (l + 1));
      }
    }
  }

  /** A current fed in splits as the resistances have it: the current divider. */
  @Test
  void currentFromOutside_splitsByTheResistances() {
    Artwork art = turns(2);
    List<LayerSharing.Layer> l = layers(LayerSharing.of(art).orElseThrow());
    double barrel = barrelOhm(art, 1);
    // Both ends of L1 are the coil's; the way through L2 has a barrel at each end.
    double want = (ohm(2) + 2 * barrel) / (ohm(1) + ohm(2) + 2 * barrel);
    assertEquals(want, l.get(0).share(), 1e-9);
    assertEquals(1 - want, l.get(1).share(), 1e-9);
    assertEquals(0.5, l.get(0).evenShare(), 0);
  }

  /** Peak currents round the two windows between neighbouring layers. */
  private static double[] meshAmperes(Artwork art, double[] tesla, boolean barrels) {
    double first = barrels ? 2 * barrelOhm(art, 1) : 0;
    double second = barrels ? 2 * barrelOhm(art, 2) : 0;
    double[][] r = {
      {ohm(1) + ohm(2) + first, -ohm(2)}, {-ohm(2), ohm(2) + ohm(3) + second},
    };
    double[] e = {volt(tesla[0]) - volt(tesla[1]), volt(tesla[1]) - volt(tesla[2])};
    return new LUDecomposition(new Array2DRowRealMatrix(r))
        .getSolver()
        .solve(new ArrayRealVector(e))
        .toArray();
  }

  private static double barrelOhm(Artwork art, int upper) {
    double area = Math.PI * (0.17 * 0.17 - 0.15 * 0.15);
    Stackup s = art.stackup();
    return RHO * (s.heightMm(upper) - s.heightMm(upper + 1)) / area;
  }

  @Test
  void theTurnIsAsLongAsReckoned() {
    Conductor c = turns(2).conductors().get(0);
    assertEquals(ohm(1), RHO * c.path().lengthMm() / (WIDTH_MM * THICK_MM[0]), 1e-12);
  }
}
