package etchloom.electric.machine.drive;

import etchloom.electric.machine.circuit.Circuit;

/**
 * Gains of a current controller {@code u = Kp e + Ki ∫ e dt} whose zero lies on the winding's pole
 * (textbook pole cancellation): {@code Kp = L ω}, {@code Ki = R ω}; the loop is then of first order
 * with that bandwidth. Per phase of the line's star, R at 20 °C. Dead time and the filter of the
 * measurement are left out: above a tenth of the switching frequency they eat the phase margin.
 *
 * @param proportionalGain V/A
 * @param integralGain V/(A·s)
 */
public record CurrentLoop(double bandwidthHertz, double proportionalGain, double integralGain) {
  public static CurrentLoop of(Circuit c, double bandwidthHertz) {
    double w = 2 * Math.PI * bandwidthHertz;
    return new CurrentLoop(bandwidthHertz, c.lineHenry() * w, c.lineOhm(20) * w);
  }
}
