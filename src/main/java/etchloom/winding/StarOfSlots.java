package etchloom.winding;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Deals coils to phases by the star of slots, in exact integers.
 *
 * <p>Coil {@code k} of {@code Q} has the phasor {@code k·P/Q} of a turn, {@code P} the pole pairs.
 * Belts are half-open, so that phasors exactly between two belts (half of them with 12 coils and 10
 * poles) all fall to the same side; the nearest belt in floating point deals them out unbalanced.
 *
 * <p>Source: the star of slots as in texts on fractional-slot windings (Bianchi et al. 2006,
 * recalled).
 */
public final class StarOfSlots {
  /** How closely phasor sums of different phases must agree, as a share of a coil's phasor. */
  private static final double BALANCE = 1e-9;

  /** Below this distribution factor a single-phase winding mostly cancels itself. */
  private static final double SINGLE_PHASE_LEAST = 0.5;

  private StarOfSlots() {}

  /**
   * @param phases 1, 2, 3, 5 or 6
   * @param coils positive
   * @param poles even, positive
   * @return the winding, or empty where no balanced one exists
   */
  public static Optional<Winding> wind(int phases, int coils, int poles) {
    int pairs = poles / 2;
    if (!feasible(phases, coils, pairs)) {
      return Optional.empty();
    }
    List<PhaseCoil> sequence = deal(phases, coils, pairs);
    return balanced(phases, coils, pairs, sequence);
  }

  private static boolean feasible(int phases, int coils, int pairs) {
    if (coils % phases != 0) {
      return false;
    }
    int n = coils / gcd(coils, pairs);
    return switch (phases) {
      case 1 -> true;
      case 2 -> n % 4 == 0;
      case 6 -> n % 12 == 0;
      default -> n % phases == 0;
    };
  }

  private static List<PhaseCoil> deal(int phases, int coils, int pairs) {
    int belts = phases == 6 ? 12 : 2 * phases;
    List<PhaseCoil> out = new ArrayList<>(coils);
    for (int k = 0; k < coils; k++) {
      long r = (long) k * pairs % coils;
      int belt = (int) (Math.floorDiv(2L * belts * r + coils, 2L * coils) % belts);
      out.add(coil(phases, k + 1, belt));
    }
    return out;
  }

  private static PhaseCoil coil(int phases, int number, int belt) {
    if (phases == 2) {
      return new PhaseCoil(number, belt % 2, belt < 2 ? 1 : -1);
    }
    if (phases == 6) {
      // Belts of 30 degrees; set 1 on the even ones, set 2 on the odd ones, each a set of three.
      PhaseCoil three = coil(3, number, belt / 2);
      return new PhaseCoil(number, three.phase() + (belt % 2 == 0 ? 0 : 3), three.sign());
    }
    return belt % 2 == 0
        ? new PhaseCoil(number, belt / 2, 1)
        : new PhaseCoil(number, (belt + phases) / 2 % phases, -1);
  }

  private static Optional<Winding> balanced(
      int phases, int coils, int pairs, List<PhaseCoil> sequence) {
    double[] re = new double[phases];
    double[] im = new double[phases];
    int[] count = new int[phases];
    for (PhaseCoil c : sequence) {
      double a = 2 * Math.PI * ((long) (c.coil() - 1) * pairs % coils) / coils;
      re[c.phase()] += c.sign() * Math.cos(a);
      im[c.phase()] += c.sign() * Math.sin(a);
      count[c.phase()]++;
    }
    double sum = Math.hypot(re[0], im[0]);
    double first = Math.atan2(im[0], re[0]);
    for (int p = 1; p < phases; p++) {
      double want = first + phaseAngle(phases, p);
      if (count[p] != count[0]
          || Math.hypot(re[p] - sum * Math.cos(want), im[p] - sum * Math.sin(want)) > BALANCE) {
        return Optional.empty();
      }
    }
    double distribution = sum / count[0];
    if (distribution < (phases == 1 ? SINGLE_PHASE_LEAST : BALANCE)) {
      return Optional.empty();
    }
    List<Double> axes = new ArrayList<>();
    for (int p = 0; p < phases; p++) {
      axes.add(axis(Math.atan2(im[p], re[p]), pairs));
    }
    double pitch = Math.abs(Math.sin(Math.PI * pairs / coils));
    return Optional.of(
        new Winding(phases, coils, 2 * pairs, marks(phases), sequence, distribution, pitch, axes));
  }

  /** Electrical angle by which a phase lags the first, rad. */
  public static double phaseAngle(int phases, int phase) {
    return switch (phases) {
      case 2 -> phase * Math.PI / 2;
      case 6 -> phase % 3 * 2 * Math.PI / 3 + (phase < 3 ? 0 : Math.PI / 6);
      default -> phase * 2 * Math.PI / phases;
    };
  }

  /** The marks of the phases, IEC 60034-8 for up to three; S and T are our own. */
  public static List<String> marks(int phases) {
    return switch (phases) {
      case 1 -> List.of("U");
      case 2 -> List.of("U", "V");
      case 3 -> List.of("U", "V", "W");
      case 5 -> List.of("U", "V", "W", "S", "T");
      case 6 -> List.of("1U", "1V", "1W", "2U", "2V", "2W");
      default -> throw new IllegalArgumentException("no marks for " + phases + " phases");
    };
  }

  private static double axis(double electricalRad, int pairs) {
    double turn = 2 * Math.PI;
    double a = electricalRad % turn;
    if (a < 0) {
      a += turn;
    }
    // A sum at exactly 0 may come out a rounding below it.
    return (turn - a < 1e-12 ? 0 : a) / pairs;
  }

  /**
   * The coil count nearest to {@code coils} that gives a balanced winding, the smaller on a tie.
   */
  public static Optional<Integer> nearestCoils(int phases, int coils, int poles) {
    for (int step = 1; step <= 60; step++) {
      for (int q : new int[] {coils - step, coils + step}) {
        if (q >= 3 && wind(phases, q, poles).isPresent()) {
          return Optional.of(q);
        }
      }
    }
    return Optional.empty();
  }

  /**
   * The pole count nearest to {@code poles} that gives a balanced winding, the smaller on a tie.
   */
  public static Optional<Integer> nearestPoles(int phases, int coils, int poles) {
    for (int step = 2; step <= 60; step += 2) {
      for (int n : new int[] {poles - step, poles + step}) {
        if (n >= 2 && wind(phases, coils, n).isPresent()) {
          return Optional.of(n);
        }
      }
    }
    return Optional.empty();
  }

  private static int gcd(int a, int b) {
    return b == 0 ? a : gcd(b, a % b);
  }
}
