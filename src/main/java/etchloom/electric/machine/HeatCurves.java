package etchloom.electric.machine;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.electric.machine.heat.HeatBalance;
import etchloom.electric.machine.heat.Losses;
import etchloom.units.RoundStep;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;

/** Losses by speed and temperature by current, in round steps, for plots and tables. */
final class HeatCurves {
  private static final int LEAST_STEPS = 20;

  /** Of the range in which a current is sought: to a double's own precision. */
  private static final int HALVINGS = 55;

  /** The chart of temperatures goes so far beyond the current of the duty or the limit. */
  private static final double BEYOND = 1.25;

  /** Which losses are known at all. */
  record Known(boolean copper, boolean ripple, boolean circulating) {}

  private HeatCurves() {}

  /**
   * The current of one winding that brings the copper to a temperature, A rms, with the ripple it
   * comes with and all other losses as they are; empty where those alone bring it there.
   */
  static OptionalDouble reaching(HeatBalance board, Losses losses, double tempC) {
    double leaving = board.leavingWatt(tempC);
    if (!(leaving > losses.totalWatt(0, tempC))) {
      return OptionalDouble.empty();
    }
    Circuit c = losses.circuit();
    double low = 0;
    double high = Math.sqrt(leaving / (c.phases() * c.windingOhm(tempC)));
    for (int i = 0; i < HALVINGS; i++) {
      double mid = (low + high) / 2;
      if (losses.totalWatt(mid, tempC) < leaving) {
        low = mid;
      } else {
        high = mid;
      }
    }
    return OptionalDouble.of(low);
  }

  /**
   * Where the copper settles by the current.
   *
   * @param ampereRms what the chart must show; 0 for no chart
   */
  static List<ThermalFigures.AtCurrent> byCurrent(
      HeatBalance board, Losses losses, double ampereRms) {
    List<ThermalFigures.AtCurrent> out = new ArrayList<>();
    for (double i : steps(BEYOND * ampereRms)) {
      out.add(new ThermalFigures.AtCurrent(i, board.solve(t -> losses.totalWatt(i, t))));
    }
    return out;
  }

  /** Losses from standstill to a speed, the copper at one temperature. */
  static List<LossFigures.AtSpeed> bySpeed(
      DoubleFunction<Losses> at, double topRadPerSecond, double tempC, Known known) {
    List<LossFigures.AtSpeed> out = new ArrayList<>();
    for (double rpm : steps(topRadPerSecond * 30 / Math.PI)) {
      Losses l = at.apply(rpm * Math.PI / 30);
      out.add(
          new LossFigures.AtSpeed(
              rpm,
              when(known.copper(), l.copperWatt(tempC)),
              l.eddyWatt(tempC),
              when(known.ripple(), l.rippleWatt(tempC)),
              when(known.circulating(), l.circulatingWatt(tempC)),
              l.totalWatt(tempC)));
    }
    return out;
  }

  private static OptionalDouble when(boolean known, double value) {
    return known ? OptionalDouble.of(value) : OptionalDouble.empty();
  }

  /** From 0 in round steps to the first at or above the top; none for a top of 0. */
  private static List<Double> steps(double top) {
    List<Double> out = new ArrayList<>();
    if (top > 0) {
      double step = RoundStep.atLeast(top / (2 * LEAST_STEPS));
      for (int i = 0; i <= Math.ceil(top / step); i++) {
        out.add(i * step);
      }
    }
    return out;
  }
}
