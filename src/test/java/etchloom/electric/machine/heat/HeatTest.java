package etchloom.electric.machine.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.electric.machine.emf.FluxSeries;
import etchloom.spec.Spec.Connection;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class HeatTest {
  private static final double MIL = 0.0254;

  /** Check values TH-E and TH-I: the IPC-2221 curve fit. */
  @Test
  void trackChart() {
    double oneOunce = 10 * MIL * 1.378 * MIL;
    assertEquals(0.885517035, TrackChart.ampere(oneOunce, 10, true), 1e-4 * 0.89);
    assertEquals(0.442758517, TrackChart.ampere(oneOunce, 10, false), 1e-4 * 0.44);
    assertEquals(1.46367167, TrackChart.ampere(2 * oneOunce, 10, true), 1e-4 * 1.46);
    double wide = 50 * MIL * 2.756 * MIL;
    assertEquals(7.6230764, TrackChart.ampere(wide, 30, true), 1e-4 * 7.6);
    assertEquals(3.8115382, TrackChart.ampere(wide, 30, false), 1e-4 * 3.8);
  }

  /** I²R alone: {@code h A (T − Ta) = P20 (1 + α (T − 20))}, solved by hand. */
  @Test
  void balanceOfCopperAlone() {
    HeatBalance b = new HeatBalance(0.01, 12, 25);
    Losses l = losses(1.5);
    double p20 = 3 * 1.5 * 1.5 * 0.5;
    double want = (0.12 * 25 + p20 * (1 - 0.00393 * 20)) / (0.12 - 0.00393 * p20);
    assertEquals(want, b.solve(l::totalWatt).getAsDouble(), 1e-6);
  }

  /** Past {@code α P20 = h A} the loss outruns the cooling at any temperature. */
  @Test
  void noBalance() {
    HeatBalance b = new HeatBalance(0.01, 12, 25);
    double edge = Math.sqrt(0.12 / 0.00393 / 1.5);
    assertTrue(b.solve(losses(1.01 * edge)::totalWatt).isEmpty());
    assertTrue(b.solve(losses(0.85 * edge)::totalWatt).isPresent());
  }

  private static Losses losses(double ampere) {
    Circuit c = new Circuit(3, Connection.STAR, 6, 0.5, 1e-3, 1e-3);
    return new Losses(
        c, t -> ampere, (i, t) -> 0, Optional.empty(), Optional.empty(), OptionalDouble.empty(), 0);
  }

  /** Ripple in a delta's line: three windings of R/3 as a star. */
  @Test
  void rippleLoss() {
    Circuit star = new Circuit(3, Connection.STAR, 6, 0.5, 1e-3, 1e-3);
    Circuit delta = new Circuit(3, Connection.DELTA, 6, 0.5, 1e-3, 1e-3);
    double square = 2 * 2 / 12.0;
    double inStar =
        new Losses(
                star,
                t -> 0,
                (i, t) -> square,
                Optional.empty(),
                Optional.empty(),
                OptionalDouble.empty(),
                0)
            .rippleWatt(20);
    double inDelta =
        new Losses(
                delta,
                t -> 0,
                (i, t) -> square,
                Optional.empty(),
                Optional.empty(),
                OptionalDouble.empty(),
                0)
            .rippleWatt(20);
    assertEquals(3 * square * 0.5, inStar, 1e-12);
    assertEquals(inStar / 3, inDelta, 1e-12);
  }

  /**
   * Three windings whose third harmonics add up and whose fundamentals cancel: three times the
   * third's voltage over three windings' impedance, by hand.
   */
  @Test
  void circulatingCurrent() {
    int p = 4;
    List<FluxSeries> phases =
        java.util.stream.IntStream.range(0, 3)
            .mapToObj(
                k -> {
                  double a = k * 2 * Math.PI / 3;
                  double[] re = {0.1 * Math.cos(a), 0.004};
                  double[] im = {0.1 * Math.sin(a), 0};
                  return new FluxSeries(p, re, im);
                })
            .toList();
    Circuit c = new Circuit(3, Connection.DELTA, p, 2.0, 1.2e-3, 0.8e-3);
    CirculatingCurrent i = new CirculatingCurrent(c, phases);
    double w = 250;
    double volt = 0.004 * w / Math.sqrt(2);
    double want = volt / Math.hypot(2.0, 3 * p * w * 0.8e-3);
    assertEquals(want, i.ampereRms(w, 20), 1e-12);
    assertEquals(3 * 2.0 * want * want, i.watt(w, 20), 1e-12);
  }
}
