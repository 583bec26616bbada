package etchloom.electric.inductance;

import etchloom.spec.Spec;
import etchloom.winding.StarOfSlots;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** What the phases' self and mutual inductances come to for a drive. Any unit. */
final class PhaseMatrix {
  private final int phases;
  private final double[][] l;

  /**
   * @param l symmetric, phases in the order of their marks
   */
  PhaseMatrix(double[][] l) {
    this.l = l;
    phases = l.length;
  }

  List<List<Double>> rows() {
    List<List<Double>> out = new ArrayList<>();
    for (double[] row : l) {
      List<Double> values = new ArrayList<>();
      for (double v : row) {
        values.add(v);
      }
      out.add(values);
    }
    return out;
  }

  double self() {
    double sum = 0;
    for (int p = 0; p < phases; p++) {
      sum += l[p][p];
    }
    return sum / phases;
  }

  OptionalDouble mutual() {
    double sum = 0;
    int pairs = 0;
    for (int p = 0; p < phases; p++) {
      for (int q = p + 1; q < phases; q++) {
        if (oneSet(p, q)) {
          sum += l[p][q];
          pairs++;
        }
      }
    }
    return pairs == 0 ? OptionalDouble.empty() : OptionalDouble.of(sum / pairs);
  }

  /** Six phases are two sets of three. */
  private boolean oneSet(int p, int q) {
    return phases != 6 || p / 3 == q / 3;
  }

  /**
   * Flux of one phase over its current while every phase q carries the same current later by its
   * angle: sum of {@code L cos(angle)}, since the sines cancel in the mean over the phases.
   */
  double synchronous() {
    double sum = 0;
    for (int p = 0; p < phases; p++) {
      for (int q = 0; q < phases; q++) {
        double angle = StarOfSlots.phaseAngle(phases, q) - StarOfSlots.phaseAngle(phases, p);
        sum += l[p][q] * Math.cos(angle);
      }
    }
    return sum / phases;
  }

  double terminal(Spec.Connection connection) {
    return switch (connection) {
      case OPEN -> self();
      case STAR -> star();
      case DELTA -> delta();
    };
  }

  /** In at one phase, out at another. */
  private double star() {
    double sum = 0;
    int pairs = 0;
    for (int p = 0; p < phases; p++) {
      for (int q = p + 1; q < phases; q++) {
        if (oneSet(p, q)) {
          sum += l[p][p] + l[q][q] - 2 * l[p][q];
          pairs++;
        }
      }
    }
    return pairs == 0 ? self() : sum / pairs;
  }

  /**
   * From corner to corner of the ring: phase p alone in parallel with all others in series the
   * other way, the current shared as the inductances have it.
   */
  private double delta() {
    double sum = 0;
    for (int p = 0; p < phases; p++) {
      double others = 0;
      double between = 0;
      for (int q = 0; q < phases; q++) {
        if (q != p) {
          between -= l[p][q];
          for (int r = 0; r < phases; r++) {
            others += r == p ? 0 : l[q][r];
          }
        }
      }
      sum += (l[p][p] * others - between * between) / (l[p][p] + others - 2 * between);
    }
    return sum / phases;
  }
}
