package etchloom.electric.machine.drive;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.spec.Spec.Connection;
import org.junit.jupiter.api.Test;

/**
 * Check values DR-1 to DR-15 (textbook conventions: amplitude-invariant dq, 10 pole pairs, 2 mV·s
 * peak a phase), and hand calculations.
 */
class DriveTest {
  private static final double RPM = 30 / Math.PI;
  private static final Circuit STAR = circuit(Connection.STAR);

  private static Circuit circuit(Connection c) {
    return new Circuit(3, c, 10, 0.25, 30e-6, 25e-6);
  }

  private static void close(double want, double got) {
    assertEquals(want, got, 1e-6 * Math.abs(want));
  }

  @Test
  void currentLoop() {
    CurrentLoop g = CurrentLoop.of(STAR, 1000);
    close(0.188495559, g.proportionalGain());
    close(1570.79633, g.integralGain());
    close(
        0.000159154943,
        g.proportionalGain()
            / g.integralGain()
            / (30e-6 / 0.25)
            / (2 * Math.PI * g.bandwidthHertz()));
  }

  @Test
  void torqueConstants() {
    close(0.03, STAR.torqueNm(2e-3, 1));
    close(0.0424264069, STAR.torqueNm(2e-3, Math.sqrt(2)));
    close(0.0346410162, STAR.terminalShare() * 10 * 2e-3);
    close(275.664448, RPM / (STAR.terminalShare() * 10 * 2e-3));
  }

  @Test
  void noLoadSpeedOfCentredModulation() {
    close(6615.94675, RPM * TorqueSpeed.noLoadRadPerSecond(STAR, 2e-3, 24));
    double open = TorqueSpeed.noLoadRadPerSecond(circuit(Connection.OPEN), 2e-3, 24);
    close(24 / 0.02, open);
    double delta = TorqueSpeed.noLoadRadPerSecond(circuit(Connection.DELTA), 2e-3, 24);
    close(24 / 0.02, delta);
  }

  /** At a point that the voltage limits, the dq equations give back the bus's peak. */
  @Test
  void voltageLimit() {
    TorqueSpeed t = new TorqueSpeed(STAR, 2e-3, 80, 20, 24, w -> 0);
    double w = 5000 / RPM;
    TorqueSpeed.Point p = t.at(w);
    assertEquals(TorqueSpeed.Limit.VOLTAGE, p.limit());
    double i = p.newtonMetre() / 0.03;
    double q = 0.25 * (1 + 0.00393 * 60) * i + 10 * w * 2e-3;
    double d = -10 * w * 30e-6 * i;
    close(24 / Math.sqrt(3), Math.hypot(q, d));
  }

  @Test
  void line_fromStandstillToNoLoad() {
    TorqueSpeed t = new TorqueSpeed(STAR, 2e-3, 20, 5, 24, w -> 1e-6 * w);
    var line = t.line();
    close(0.0424264069 * 5, line.get(0).newtonMetre());
    assertEquals(TorqueSpeed.Limit.CURRENT, line.get(0).limit());
    TorqueSpeed.Point last = line.get(line.size() - 1);
    close(6615.94675, last.rpm());
    assertEquals(0, last.newtonMetre());
    for (int i = 1; i < line.size(); i++) {
      assertTrue(line.get(i).newtonMetre() <= line.get(i - 1).newtonMetre());
    }
  }

  /** Two hundred volts rms on 30 Ω and 10 Ω in series with ωL of 30 Ω: 4 A by 40-30-50. */
  @Test
  void generator() {
    double w = 100;
    Circuit c = new Circuit(3, Connection.OPEN, 2, 10, 30 / (2 * w), 0.1);
    double flux = 200 * Math.sqrt(2) / (2 * w);
    Generator g = new Generator(c, flux, w, 30);
    close(200, Generator.openVoltRms(c, flux, w));
    close(4, g.ampereRms(20));
    close(120, g.loadVoltRms(20));
    close(3 * 16 * 30, g.loadWatt(20));
  }
}
