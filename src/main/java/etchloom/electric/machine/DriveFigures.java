package etchloom.electric.machine;

import etchloom.electric.machine.drive.TorqueSpeed;
import java.util.List;
import java.util.OptionalDouble;

/**
 * What a drive sees at the terminals, as a star; resistances at 20 °C.
 *
 * @param lineOhm of a phase of that star
 * @param lineHenry likewise, synchronous
 * @param rippleAmperePeakToPeak in a line, at its worst over the modulation, copper hot
 * @param seriesInductanceForRippleHenry in series with each line, for such a ripple of 20 % of the
 *     peak of the duty's current in a line; 0 where it is that small already
 * @param proportionalGain V/A
 * @param integralGain V/(A·s)
 * @param speedLimitRpm without load, the whole bus for the back-EMF
 * @param senseSpeedRpm where the peak between terminals reaches {@code senseVolt}
 * @param senseVolt stated threshold below which a sensorless drive sees little (common practice)
 * @param torqueSpeed at the shaft, copper hot
 */
public record DriveFigures(
    int polePairs,
    double lineOhm,
    double lineHenry,
    OptionalDouble electricalHz,
    double timeConstantSecond,
    OptionalDouble rippleAmperePeakToPeak,
    OptionalDouble seriesInductanceForRippleHenry,
    OptionalDouble proportionalGain,
    OptionalDouble integralGain,
    OptionalDouble bandwidthHertz,
    OptionalDouble speedLimitRpm,
    OptionalDouble senseSpeedRpm,
    double senseVolt,
    List<TorqueSpeed.Point> torqueSpeed) {
  public DriveFigures {
    torqueSpeed = List.copyOf(torqueSpeed);
  }
}
