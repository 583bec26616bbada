package etchloom.electric.machine;

import java.util.List;
import java.util.OptionalDouble;

/**
 * Open-circuit voltage by the copper itself; V·s/rad is V at 1 rad/s of the shaft.
 *
 * @param fluxLinkageWeber peak, fundamental, one winding
 * @param phasePeakVoltSecondPerRadian fundamental of one winding
 * @param terminalPeakVoltSecondPerRadian fundamental between two terminals
 * @param rpmPerVolt speed over the peak between two terminals
 * @param harmonics mean over the phases, odd orders from 1
 * @param waveform one electrical turn
 * @param deltaCirculatingAmpere rms round a delta at the duty's speed
 * @param phases in the order of the marks
 * @param counterClockwise whether currents in the order of the marks turn the rotor
 *     counter-clockwise seen from L1; true for one phase, which has no order
 */
public record EmfFigures(
    double fluxLinkageWeber,
    double phasePeakVoltSecondPerRadian,
    double terminalPeakVoltSecondPerRadian,
    double rpmPerVolt,
    List<Harmonic> harmonics,
    List<Sample> waveform,
    OptionalDouble deltaCirculatingAmpere,
    List<PhaseEmf> phases,
    boolean counterClockwise) {
  public EmfFigures {
    harmonics = List.copyOf(harmonics);
    waveform = List.copyOf(waveform);
    phases = List.copyOf(phases);
  }

  public record Harmonic(int order, double phasePeakVoltSecondPerRadian) {}

  /**
   * @param electricalDegrees the rotor's angle times the pole pairs
   * @param voltSecondPerRadian one value a phase, in the order of the marks
   */
  public record Sample(double electricalDegrees, List<Double> voltSecondPerRadian) {
    public Sample {
      voltSecondPerRadian = List.copyOf(voltSecondPerRadian);
    }
  }

  /**
   * @param peakVoltSecondPerRadian fundamental of this phase, its leads included
   * @param axisRad mechanical angle in [0, 2π/pole pairs) where current into the phase's start
   *     makes field out of L1, by the copper as drawn
   * @param restRad rotor angle in [0, 2π/pole pairs) to which such a current pulls the rotor: half
   *     an electrical turn from the axis, since a north face at angle 0 sends its field into L1
   */
  public record PhaseEmf(
      String mark, double peakVoltSecondPerRadian, double axisRad, double restRad) {}
}
