package etchloom.electric.machine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.electric.machine.drive.TorqueSpeed;
import etchloom.spec.Spec;
import java.lang.reflect.RecordComponent;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Whole machines: figures against each other, and what is absent. */
class MachineTest {
  private static final String[] FEW = {"turns: fill ", "turns: 4 "};
  private static TestMachine star;
  private static TestMachine delta;
  private static MachineFigures inStar;
  private static MachineFigures inDelta;

  @BeforeAll
  static void drawOneWindingBothWays() {
    star = TestMachine.of("filter-wheel", FEW);
    delta = TestMachine.of("filter-wheel", plus(FEW, "connection: star ", "connection: delta "));
    inStar = star.figures();
    inDelta = delta.figures();
  }

  private static String[] plus(String[] some, String... more) {
    String[] all = java.util.Arrays.copyOf(some, some.length + more.length);
    System.arraycopy(more, 0, all, some.length, more.length);
    return all;
  }

  private static void near(double want, double got, double share) {
    assertEquals(want, got, share * Math.abs(want));
  }

  /** The same coils in star and delta, by the textbook's star-delta transformation. */
  @Test
  void starAgainstDelta() {
    EmfFigures s = inStar.emf().orElseThrow();
    EmfFigures d = inDelta.emf().orElseThrow();
    near(s.fluxLinkageWeber(), d.fluxLinkageWeber(), 2e-3);
    near(
        Math.sqrt(3) * d.terminalPeakVoltSecondPerRadian(),
        s.terminalPeakVoltSecondPerRadian(),
        2e-3);
    TorqueFigures ts = inStar.torque().orElseThrow();
    TorqueFigures td = inDelta.torque().orElseThrow();
    near(ts.newtonMetrePerAmperePeak(), td.newtonMetrePerAmperePeak(), 2e-3);
    near(ts.newtonMetrePerLineAmpereRms(), Math.sqrt(3) * td.newtonMetrePerLineAmpereRms(), 2e-3);
    near(ts.motorConstant(), td.motorConstant(), 0.02);
    near(inStar.drive().lineOhm() / 3, inDelta.drive().lineOhm(), 0.03);
    near(inStar.drive().lineHenry() / 3, inDelta.drive().lineHenry(), 1e-12);
    near(
        Math.sqrt(3) * inStar.drive().speedLimitRpm().getAsDouble(),
        inDelta.drive().speedLimitRpm().getAsDouble(),
        2e-3);
    near(inStar.loss().copperWatt().getAsDouble(), inDelta.loss().copperWatt().getAsDouble(), 0.03);
  }

  /** A closed delta carries its triplen voltages round; a star and open windings do not. */
  @Test
  void circulatingCurrentOnlyInDelta() {
    double ampere = inDelta.emf().orElseThrow().deltaCirculatingAmpere().getAsDouble();
    assertTrue(ampere > 0);
    EmfFigures e = inDelta.emf().orElseThrow();
    double w = 200 * Math.PI / 30;
    double third = e.harmonics().get(1).phasePeakVoltSecondPerRadian() * w / Math.sqrt(2);
    double hot = 1 + 0.00393 * (inDelta.thermal().hotC() - 20);
    double ohm = 3 * inDelta.drive().lineOhm() * hot;
    double reactance = 3 * 6 * w * (1.2e-3 - 2 * 0.06e-3);
    near(third / Math.hypot(ohm, reactance), ampere, 0.02);
    assertTrue(inDelta.loss().circulatingWatt().isPresent());
    assertTrue(inStar.emf().orElseThrow().deltaCirculatingAmpere().isEmpty());
    assertTrue(inStar.loss().circulatingWatt().isEmpty());
  }

  /** Torque times speed is the mean of EMF times current, from the waveform's own samples. */
  @Test
  void torqueTimesSpeedIsTheElectricalPower() {
    EmfFigures e = inStar.emf().orElseThrow();
    double p = 6;
    double power = 0;
    for (EmfFigures.Sample s : e.waveform()) {
      for (int k = 0; k < 3; k++) {
        // Current of 1 A peak in phase with the phase's EMF, V and W a third of a turn behind.
        double axis = p * e.phases().get(0).axisRad() + k * 2 * Math.PI / 3;
        double i = Math.sin(Math.toRadians(s.electricalDegrees()) - axis);
        power += s.voltSecondPerRadian().get(k) * i / e.waveform().size();
      }
    }
    near(inStar.torque().orElseThrow().newtonMetrePerAmperePeak(), power, 1e-3);
  }

  /**
   * Current into a phase pulls the rotor to where the phase's flux is most: dλ/dθ falls through 0.
   */
  @Test
  void restAngleIsWhereTheFluxIsMost() {
    EmfFigures e = inStar.emf().orElseThrow();
    int n = e.waveform().size();
    for (int k = 0; k < 3; k++) {
      double degrees = Math.toDegrees(6 * e.phases().get(k).restRad());
      int at = (int) Math.round(degrees / 3);
      double before = e.waveform().get(Math.floorMod(at - 5, n)).voltSecondPerRadian().get(k);
      double behind = e.waveform().get(Math.floorMod(at + 5, n)).voltSecondPerRadian().get(k);
      assertTrue(before > 0 && behind < 0, "phase " + k);
      near(before, -behind, 0.1);
    }
    assertTrue(e.counterClockwise());
  }

  /** The balance holds at the temperature found, and the stated loss is what leaves. */
  @Test
  void lossLeavesThroughTheSurface() {
    ThermalFigures t = inStar.thermal();
    double leaving = 12 * t.surfaceM2() * (t.copperC().getAsDouble() - 20);
    near(leaving, inStar.loss().totalWatt(), 1e-6);
    double outer = 0;
    for (var c : star.assembly().artwork().conductors()) {
      if (c.what().kind() == etchloom.artwork.Feature.Kind.RING) {
        outer = Math.max(outer, c.path().start().norm() + 0.2);
      }
    }
    near(2 * Math.PI * (outer * outer - 49) * 1e-6, t.surfaceM2(), 1e-9);
  }

  /** Driven with the continuous limit as its current, the copper settles at its limit. */
  @Test
  void continuousLimitSettlesAtTheLimit() {
    double limit = inStar.thermal().maxContinuousAmpereRms().getAsDouble();
    TestMachine again =
        TestMachine.of("filter-wheel", plus(FEW, "current: 0.25 A", "current: " + limit + " A"));
    near(90, again.figures().thermal().copperC().getAsDouble(), 1e-4);
  }

  /** The chart of temperatures is the balance again: what leaves is what the current makes. */
  @Test
  void temperaturesByCurrent_holdTheBalance() {
    // Without PWM, whose ripple has a test of its own.
    MachineFigures calm =
        TestMachine.of("filter-wheel", plus(FEW, "  switching: ", "  # ")).figures();
    ThermalFigures t = calm.thermal();
    LossFigures loss = calm.loss();
    double hot = 1 + 0.00393 * (loss.atC() - 20); // IEC 60028
    double cold = loss.copperWatt().getAsDouble() / (0.25 * 0.25) / hot;
    assertTrue(loss.rippleWatt().isEmpty());
    double eddy = loss.eddyWatt().getAsDouble() * hot;
    assertTrue(t.byCurrent().size() > 15, "points");
    assertEquals(0, t.byCurrent().get(0).ampereRms());
    for (ThermalFigures.AtCurrent a : t.byCurrent()) {
      double c = a.copperC().getAsDouble();
      double k = 1 + 0.00393 * (c - 20);
      double i = a.ampereRms();
      double made = cold * i * i * k + eddy / k;
      near(12 * t.surfaceM2() * (c - 20), made, 1e-3);
    }
    double last = t.byCurrent().get(t.byCurrent().size() - 1).ampereRms();
    assertTrue(last >= 1.25 * t.maxContinuousAmpereRms().getAsDouble());
  }

  /** Just below the current above which it never settles it does, just above it does not. */
  @Test
  void settlesUpToTheCurrentStated() {
    double most = inStar.thermal().settlesUpToAmpereRms().getAsDouble();
    for (double k : new double[] {0.999, 1.001}) {
      TestMachine again =
          TestMachine.of(
              "filter-wheel", plus(FEW, "current: 0.25 A", "current: " + k * most + " A"));
      assertEquals(k < 1, again.figures().thermal().copperC().isPresent(), "times " + k);
    }
  }

  /** At the duty's speed the chart's losses are the losses; eddy loss grows with its square. */
  @Test
  void lossesBySpeed_agreeWithTheDuty() {
    LossFigures f = inStar.loss();
    assertTrue(f.bySpeed().size() > 15, "points");
    LossFigures.AtSpeed first = f.bySpeed().get(0);
    assertEquals(0, first.rpm());
    assertEquals(0, first.eddyWatt());
    double rpm = 200; // duty.speed of the template
    // Three phases of a wave that is at its peaks all the time.
    double half = inStar.drive().rippleAmperePeakToPeak().getAsDouble() / 2;
    double worst = 3 * half * half * inStar.drive().lineOhm() * (1 + 0.00393 * (f.atC() - 20));
    double perSquare = f.eddyWatt().getAsDouble() / (rpm * rpm);
    for (LossFigures.AtSpeed a : f.bySpeed()) {
      assertEquals(perSquare * a.rpm() * a.rpm(), a.eddyWatt(), 1e-9 * (1 + a.eddyWatt()));
      near(f.copperWatt().getAsDouble(), a.copperWatt().getAsDouble(), 1e-12);
      double ripple = a.rippleWatt().getAsDouble();
      // Far below the bus's limit the ripple's loss grows with the speed.
      double own = f.rippleWatt().getAsDouble();
      assertTrue(a.rpm() > rpm || ripple <= own, a.rpm() + " rpm");
      assertTrue(a.rpm() < rpm || a.rpm() > 2 * rpm || ripple >= own, a.rpm() + " rpm");
      assertTrue(ripple > 0 && ripple <= worst, ripple + " W of at most " + worst + " W");
      assertTrue(a.circulatingWatt().isEmpty());
      double sum = a.copperWatt().getAsDouble() + a.eddyWatt() + a.rippleWatt().getAsDouble();
      near(sum, a.totalWatt(), 1e-12);
    }
  }

  /**
   * The ripple never drives more than the bus can, and its loss follows the modulation: with hardly
   * any speed and current it is small, and where those are not known it is at its worst, and said.
   */
  @Test
  void rippleLoss_followsTheModulation() {
    double own = inStar.loss().rippleWatt().getAsDouble();
    String[] idle = plus(FEW, "speed: 200 rpm", "speed: 1 rpm", "current: 0.25 A", "current: 1 mA");
    MachineFigures still = TestMachine.of("filter-wheel", idle).figures();
    assertTrue(still.loss().rippleWatt().getAsDouble() < 0.1 * own);
    assertFalse(codes(still).contains("ripple-loss-at-worst"));
    MachineFigures open = TestMachine.of("filter-wheel", plus(FEW, "  speed: ", "  # ")).figures();
    assertTrue(codes(open).contains("ripple-loss-at-worst"));
    assertTrue(open.loss().rippleWatt().getAsDouble() > own);
    double line = open.drive().lineOhm() * (1 + 0.00393 * (open.thermal().hotC() - 20));
    double ripple = open.drive().rippleAmperePeakToPeak().getAsDouble();
    assertTrue(ripple < 2 / 3.0 * 24 / line, "duty.bus of the spec over R");
  }

  /** Against the magnets the bus drives what Ohm's law leaves, and no more than at standstill. */
  @Test
  void verdict_currentTheBusCannotDrive() {
    Need met = need(inStar, "current");
    assertTrue(met.met() && met.got().getAsDouble() > 0.25);
    MachineFigures f =
        TestMachine.of("filter-wheel", plus(FEW, "current: 0.25 A", "current: 9 A")).figures();
    Need current = need(f, "current");
    assertFalse(current.met());
    assertEquals("voltage", current.limitedBy());
    assertTrue(codes(f).contains("current-above-bus"));
    double ohm = f.drive().lineOhm() * (1 + 0.00393 * (f.thermal().hotC() - 20));
    double still = 24 / Math.sqrt(3) / ohm / Math.sqrt(2);
    double e = f.emf().orElseThrow().phasePeakVoltSecondPerRadian() * 200 * Math.PI / 30;
    double x = 6 * 200 * Math.PI / 30 * 1.26e-3;
    double i = Math.sqrt(2) * current.got().getAsDouble();
    near(24 / Math.sqrt(3), Math.hypot(ohm * i + e, x * i), 1e-9);
    String[] bare = plus(FEW, "current: 0.25 A", "current: 9 A", "  air-gap: 0.8 mm ", "  # ");
    Need atStandstill = need(TestMachine.of("filter-wheel", bare).figures(), "current");
    assertFalse(atStandstill.met());
    near(still, atStandstill.got().getAsDouble(), 1e-9);
  }

  /** Ten times the current has no balance: said by name, and never a number. */
  @Test
  void tooMuchCurrent_noTemperature() {
    TestMachine hot = TestMachine.of("filter-wheel", "current: 0.25 A", "current: 2.5 A");
    MachineFigures f = hot.figures();
    assertEquals(Optional.of(false), f.thermal().stable());
    assertTrue(f.thermal().copperC().isEmpty());
    assertEquals(90, f.thermal().hotC());
    assertTrue(codes(f).contains("no-stable-temperature"));
    Need copper = need(f, "copper temperature");
    assertFalse(copper.met());
    assertTrue(copper.got().isEmpty());
    finite(f, "figures");
  }

  @Test
  void verdict_torqueAndSpeed() {
    Need torque = need(inStar, "torque at speed");
    assertEquals(0.004, torque.needed());
    assertEquals("current", torque.limitedBy());
    double kt = inStar.torque().orElseThrow().newtonMetrePerAmpereRms();
    near(kt * 0.25, torque.got().getAsDouble(), 1e-3);
    assertEquals(torque.got().getAsDouble() >= 0.004, torque.met());
    TestMachine fast = TestMachine.of("filter-wheel", "speed: 200 rpm", "speed: 9000 rpm");
    MachineFigures f = fast.figures();
    assertFalse(need(f, "speed").met());
    assertEquals("voltage", need(f, "torque at speed").limitedBy());
    assertTrue(codes(f).contains("emf-above-bus"));
    finite(f, "figures");
  }

  /** At the speed the verdict names for a torque, the line gives just that torque. */
  @Test
  void verdict_speedIsWhereTheTorqueEnds() {
    TestMachine m = TestMachine.of("filter-wheel");
    MachineFigures f = m.figures();
    double rpm = need(f, "speed").got().getAsDouble();
    List<TorqueSpeed.Point> line = f.drive().torqueSpeed();
    for (int i = 1; i < line.size(); i++) {
      TorqueSpeed.Point a = line.get(i - 1);
      TorqueSpeed.Point b = line.get(i);
      if (a.rpm() <= rpm && rpm <= b.rpm()) {
        assertTrue(a.newtonMetre() >= 0.004 && 0.004 >= b.newtonMetre());
      }
    }
  }

  private static Need need(MachineFigures f, String what) {
    return f.verdict().stream().filter(n -> n.what().equals(what)).findFirst().orElseThrow();
  }

  private static List<String> codes(MachineFigures f) {
    return f.cautions().stream().map(Caution::code).toList();
  }

  /** What the shaft gives is what load and losses take. */
  @Test
  void generator() {
    TestMachine m = TestMachine.of("wind-logger", "turns: fill ", "turns: 5 ");
    MachineFigures f = m.figures();
    GeneratorFigures g = f.generator().orElseThrow();
    double w = 500 * Math.PI / 30;
    double emf = f.emf().orElseThrow().phasePeakVoltSecondPerRadian() * w / Math.sqrt(2);
    near(emf, g.phaseVoltRms(), 1e-9);
    double shaft = g.shaftNewtonMetre().getAsDouble() * w;
    near(g.powerWatt().getAsDouble() + f.loss().totalWatt(), shaft, 1e-9);
    near(g.powerWatt().getAsDouble() / shaft, g.efficiency().getAsDouble(), 1e-9);
    double i = g.ampereRms().getAsDouble();
    near(3 * i * i * 33, g.powerWatt().getAsDouble(), 1e-9);
    double x = 12 * w * 1.26e-3;
    double ohm = f.drive().lineOhm() * (1 + 0.00393 * (f.thermal().hotC() - 20));
    near(emf / Math.hypot(33 + ohm, x), i, 1e-6);
    assertTrue(f.drive().speedLimitRpm().isEmpty());
    assertTrue(f.absent().contains(new Absent("drive.speedLimitRpm", "duty.bus")));
    finite(f, "figures");
  }

  @Test
  void withoutMagnets_noEmfButHeat() {
    TestMachine m = TestMachine.of("filter-wheel", plus(FEW, "  air-gap: 0.8 mm ", "  # "));
    MachineFigures f = m.figures();
    assertTrue(f.emf().isEmpty() && f.torque().isEmpty());
    assertTrue(f.drive().speedLimitRpm().isEmpty() && f.drive().torqueSpeed().isEmpty());
    assertTrue(f.loss().eddyWatt().isEmpty());
    assertTrue(f.thermal().copperC().isPresent());
    assertTrue(f.drive().rippleAmperePeakToPeak().isPresent());
    assertTrue(f.absent().contains(new Absent("emf", "rotor.air-gap")));
    assertFalse(f.absent().contains(new Absent("emf", "rotor.magnet")));
    assertTrue(f.spread().torquePercent().worst().isEmpty());
    assertTrue(f.spread().terminalOhmPercent().worst().isPresent());
    finite(f, "figures");
  }

  /** The reader refuses such a drift; whoever makes a spec in code is told too. */
  @Test
  void demagnetised_saidByName() {
    Spec s = star.spec();
    Spec.Magnet m = s.rotor().magnet().orElseThrow();
    Spec.Magnet gone =
        new Spec.Magnet(
            m.outline(),
            m.diameterMm(),
            m.innerRadiusMm(),
            m.outerRadiusMm(),
            m.spanRad(),
            m.lengthMm(),
            m.widthMm(),
            m.pitchRadiusMm(),
            m.thicknessMm(),
            m.remanenceTesla(),
            -0.02,
            78,
            m.density(),
            m.limitC());
    Spec.Rotor r = s.rotor();
    Spec.Rotor rotor =
        new Spec.Rotor(
            r.poles(),
            r.twoSided(),
            r.airGapMm(),
            Optional.of(gone),
            r.outerDiameterMm(),
            r.ironBehindMagnets(),
            r.counterPlateGapMm());
    Spec spec =
        new Spec(
            s.title(),
            s.slug(),
            s.revision(),
            rotor,
            s.winding(),
            s.coil(),
            s.rim(),
            s.via(),
            s.board(),
            s.fab(),
            s.duty());
    MachineFigures f =
        new TestMachine(spec, star.fab(), star.assembly(), star.resistance()).figures();
    assertTrue(f.emf().isEmpty());
    assertTrue(codes(f).contains("demagnetised"));
    assertTrue(f.absent().contains(new Absent("emf", "rotor.magnet.remanence-drift")));
    finite(f, "figures");
  }

  @Test
  void withoutDuty_whatNeedsNone() {
    String text = TestMachine.text("filter-wheel");
    String duty = text.substring(text.indexOf("\nduty:"));
    MachineFigures f = TestMachine.of("filter-wheel", plus(FEW, duty, "\n")).figures();
    assertTrue(f.emf().isPresent() && f.torque().isPresent());
    assertTrue(f.thermal().maxContinuousAmpereRms().isPresent());
    assertTrue(f.thermal().stable().isEmpty());
    assertEquals(OptionalDouble.empty(), f.drive().electricalHz());
    assertTrue(f.rotor().magnetKilogram().isPresent());
    assertTrue(f.rotor().magnetPullNewton().isEmpty());
    for (String[] a :
        new String[][] {
          {"thermal.copperC", "duty.current"},
          {"loss.eddyWatt", "duty.speed"},
          {"drive.rippleAmperePeakToPeak", "duty.bus"},
          {"verdict.duty.torque", "duty.torque"},
          {"rotor.magnetPullNewton", "duty.speed"}
        }) {
      assertTrue(f.absent().contains(new Absent(a[0], a[1])), a[0] + ": " + f.absent());
    }
    finite(f, "figures");
  }

  @Test
  void cautions_counterPlateAndPull() {
    TestMachine m =
        TestMachine.of(
            "filter-wheel",
            plus(FEW, "  iron: none ", "  counter-plate: {gap: 1 mm}\n  iron: none "));
    MachineFigures f = m.figures();
    assertTrue(codes(f).contains("counter-plate-drag"));
    assertTrue(f.rotor().axialPullNewton().getAsDouble() > 1);
    assertTrue(codes(f).contains("axial-pull"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"filter-wheel", "dosing-pump", "reaction-wheel", "wind-logger"})
  void templates_sameAgainAndFinite(String template) {
    TestMachine m = TestMachine.template(template);
    MachineFigures f = m.figures();
    assertEquals(f, m.figures());
    finite(f, template);
  }

  /** No NaN and no infinity anywhere in a figure. */
  private static void finite(Object o, String where) {
    if (o instanceof Double d) {
      assertTrue(Double.isFinite(d), where + " is " + d);
    } else if (o instanceof OptionalDouble d) {
      d.ifPresent(v -> finite(v, where));
    } else if (o instanceof Optional<?> v) {
      v.ifPresent(x -> finite(x, where));
    } else if (o instanceof List<?> l) {
      for (int i = 0; i < l.size(); i++) {
        finite(l.get(i), where + "[" + i + "]");
      }
    } else if (o instanceof Record r) {
      for (RecordComponent c : r.getClass().getRecordComponents()) {
        try {
          c.getAccessor().setAccessible(true);
          finite(c.getAccessor().invoke(r), where + "." + c.getName());
        } catch (ReflectiveOperationException e) {
          throw new IllegalStateException(e);
        }
      }
    }
  }
}
