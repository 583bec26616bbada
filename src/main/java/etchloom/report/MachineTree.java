package etchloom.report;

import etchloom.electric.inductance.InductanceFigures;
import etchloom.electric.machine.DriveFigures;
import etchloom.electric.machine.EmfFigures;
import etchloom.electric.machine.GeneratorFigures;
import etchloom.electric.machine.LossFigures;
import etchloom.electric.machine.Need;
import etchloom.electric.machine.RotorFigures;
import etchloom.electric.machine.SharingFigures;
import etchloom.electric.machine.ThermalFigures;
import etchloom.electric.machine.TorqueFigures;
import etchloom.electric.machine.spread.SpreadFigures;
import java.util.List;

/** The parts of the report that the inductances and the machine's figures make, a key each. */
final class MachineTree {
  private MachineTree() {}

  static JsonTree inductance(InductanceFigures f) {
    return new JsonTree()
        .put("coilHenry", f.coilHenry())
        .put("phaseSelfHenry", f.phaseSelfHenry())
        .put("phaseMutualHenry", f.phaseMutualHenry())
        .put("synchronousHenry", f.synchronousHenry())
        .put("terminalHenry", f.terminalHenry());
  }

  static JsonTree emf(EmfFigures f, List<String> marks) {
    return new JsonTree()
        .put("fluxLinkageWeber", f.fluxLinkageWeber())
        .put("phasePeakVoltSecondPerRadian", f.phasePeakVoltSecondPerRadian())
        .put("terminalPeakVoltSecondPerRadian", f.terminalPeakVoltSecondPerRadian())
        .put("rpmPerVolt", f.rpmPerVolt())
        .putObjects("harmonics", f.harmonics().stream().map(MachineTree::harmonic).toList())
        .putObjects("waveform", f.waveform().stream().map(s -> sample(s, marks)).toList())
        .putObjects(
            "phases",
            f.phases().stream()
                .map(
                    p ->
                        new JsonTree()
                            .put("phase", p.mark())
                            .put("axisDegrees", Math.toDegrees(p.axisRad()))
                            .put("restDegrees", Math.toDegrees(p.restRad()))
                            .put("peakVoltSecondPerRadian", p.peakVoltSecondPerRadian()))
                .toList())
        .put("deltaCirculatingAmpere", f.deltaCirculatingAmpere());
  }

  private static JsonTree harmonic(EmfFigures.Harmonic h) {
    return new JsonTree()
        .put("order", h.order())
        .put("phasePeakVoltSecondPerRadian", h.phasePeakVoltSecondPerRadian());
  }

  private static JsonTree sample(EmfFigures.Sample s, List<String> marks) {
    JsonTree out = new JsonTree().put("electricalDegrees", s.electricalDegrees());
    for (int p = 0; p < marks.size(); p++) {
      out.put(marks.get(p), s.voltSecondPerRadian().get(p));
    }
    return out;
  }

  static JsonTree sharing(SharingFigures f) {
    return new JsonTree()
        .putObjects(
            "layers",
            f.layers().stream()
                .map(
                    l ->
                        new JsonTree()
                            .put("layer", "L" + l.layer())
                            .put("currentShare", l.currentShare())
                            .put("evenShare", l.evenShare())
                            .put("linkageRatio", l.linkageRatio())
                            .put("circulatingAmpereRms", l.circulatingAmpereRms()))
                .toList())
        .put("overloadPercent", 100 * f.worstOverload())
        .put("circulatingAmpereRms", f.circulatingAmpereRms());
  }

  static JsonTree torque(TorqueFigures f) {
    return new JsonTree()
        .put("newtonMetrePerAmperePeak", f.newtonMetrePerAmperePeak())
        .put("newtonMetrePerAmpereRms", f.newtonMetrePerAmpereRms())
        .put("motorConstant", f.motorConstant());
  }

  static JsonTree loss(LossFigures f) {
    return new JsonTree()
        .put("copperWatt", f.copperWatt())
        .put("eddyWatt", f.eddyWatt())
        .put("rippleWatt", f.rippleWatt())
        .put("circulatingWatt", f.circulatingWatt())
        .putSome("bySpeed", f.bySpeed().stream().map(MachineTree::atSpeed).toList());
  }

  private static JsonTree atSpeed(LossFigures.AtSpeed a) {
    return new JsonTree()
        .put("rpm", a.rpm())
        .put("copperWatt", a.copperWatt())
        .put("eddyWatt", a.eddyWatt())
        .put("rippleWatt", a.rippleWatt())
        .put("circulatingWatt", a.circulatingWatt())
        .put("totalWatt", a.totalWatt());
  }

  static JsonTree thermal(ThermalFigures f) {
    JsonTree out =
        new JsonTree()
            .put("copperC", f.copperC())
            .put("maxContinuousAmpereRms", f.maxContinuousAmpereRms());
    f.stable().ifPresent(s -> out.put("stable", s));
    return out.put("chartAmpere", f.chartAmpere())
        .put("settlesUpToAmpereRms", f.settlesUpToAmpereRms())
        .putSome(
            "byCurrent",
            f.byCurrent().stream()
                .map(
                    a -> new JsonTree().put("ampereRms", a.ampereRms()).put("copperC", a.copperC()))
                .toList());
  }

  static JsonTree drive(DriveFigures f) {
    JsonTree out =
        new JsonTree()
            .put("polePairs", f.polePairs())
            .put("electricalHz", f.electricalHz())
            .put("timeConstantSecond", f.timeConstantSecond())
            .put("rippleAmperePeakToPeak", f.rippleAmperePeakToPeak())
            .put("seriesInductanceForRippleHenry", f.seriesInductanceForRippleHenry())
            .put("proportionalGain", f.proportionalGain())
            .put("integralGain", f.integralGain())
            .put("bandwidthHertz", f.bandwidthHertz())
            .put("speedLimitRpm", f.speedLimitRpm())
            .put("senseSpeedRpm", f.senseSpeedRpm());
    if (!f.torqueSpeed().isEmpty()) {
      out.putObjects(
          "torqueSpeed",
          f.torqueSpeed().stream()
              .map(
                  p ->
                      new JsonTree()
                          .put("rpm", p.rpm())
                          .put("newtonMetre", p.newtonMetre())
                          .put("limit", p.limit().word()))
              .toList());
    }
    return out;
  }

  static JsonTree generator(GeneratorFigures f) {
    return new JsonTree()
        .put("phaseVoltRms", f.phaseVoltRms())
        .put("loadVoltRms", f.loadVoltRms())
        .put("powerWatt", f.powerWatt())
        .put("efficiency", f.efficiency());
  }

  static JsonTree spread(SpreadFigures f) {
    return new JsonTree()
        .put("terminalOhmPercent", share(f.terminalOhmPercent()))
        .put("torquePercent", share(f.torquePercent()))
        .put("imbalancePercent", share(f.imbalancePercent()))
        .putSome(
            "boards",
            f.boards().stream()
                .map(
                    b ->
                        new JsonTree()
                            .put("fromOhm", b.fromOhm())
                            .put("toOhm", b.toOhm())
                            .put("boards", b.boards()))
                .toList());
  }

  private static JsonTree share(SpreadFigures.Share s) {
    return new JsonTree()
        .put("worst", s.worst())
        .put("rss", s.rss())
        .put("monteCarlo95", s.monteCarlo95());
  }

  static JsonTree rotor(RotorFigures f) {
    return new JsonTree()
        .put("magnetPullNewton", f.magnetPullNewton())
        .put("bondStressPascal", f.bondStressPascal())
        .put("axialPullNewton", f.axialPullNewton());
  }

  /** Beside the keys bound by the spec page: the unit, and what keeps the answer from more. */
  static JsonTree duty(Need n) {
    JsonTree out =
        new JsonTree()
            .put("what", n.what())
            .put("needed", n.needed())
            .put("got", n.got())
            .put("met", n.met())
            .put("unit", n.unit());
    return n.limitedBy().isEmpty() ? out : out.put("limitedBy", n.limitedBy());
  }
}
