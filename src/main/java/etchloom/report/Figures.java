package etchloom.report;

import etchloom.report.Figure.Group;
import etchloom.report.Figure.Shown;
import etchloom.spec.Spec;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;

/** Every single figure of the report: its key, how it is shown, what it rests on and needs. */
final class Figures {
  private static final List<SpecKey> FIELD = List.of(SpecKey.MAGNET, SpecKey.AIR_GAP);

  private final List<Figure> all = new ArrayList<>();

  private Figures() {}

  private static boolean always(Results r) {
    return true;
  }

  private static boolean delta(Results r) {
    return r.spec().winding().connection() == Spec.Connection.DELTA;
  }

  private static boolean generates(Results r) {
    return r.spec().duty().map(Spec.Duty::generator).orElse(false);
  }

  private static boolean drives(Results r) {
    return !generates(r);
  }

  private static boolean pulled(Results r) {
    return r.spec().rotor().twoSided() || r.spec().rotor().counterPlateGapMm().isPresent();
  }

  static List<Figure> all() {
    Figures f = new Figures();
    f.resistance();
    f.inductance();
    f.field();
    f.taper();
    f.heat();
    f.drive();
    f.generator();
    f.spread();
    f.rotor();
    return List.copyOf(f.all);
  }

  private static List<SpecKey> field(SpecKey... more) {
    List<SpecKey> out = new ArrayList<>(FIELD);
    out.addAll(List.of(more));
    return out;
  }

  private void add(Group g, Basis b, String path, String label, Form form, List<SpecKey> needs) {
    add(g, b, path, label, form, needs, Figures::always);
  }

  private void add(
      Group g,
      Basis b,
      String path,
      String label,
      Form form,
      List<SpecKey> needs,
      Predicate<Results> applies) {
    all.add(new Figure(g, path, label, form, b, needs, applies));
  }

  private void resistance() {
    Group g = Group.RESISTANCE;
    List<SpecKey> none = List.of();
    List<SpecKey> duty = List.of(SpecKey.DUTY);
    add(g, Basis.RESISTANCE, "resistance.coilOhm", "one coil", Form.OHM, none);
    add(g, Basis.RESISTANCE, "resistance.phaseOhm.*", "phase *", Form.OHM, none);
    add(g, Basis.RESISTANCE, "resistance.terminalOhm.*", "between *", Form.OHM, none);
    add(
        g,
        Basis.RESISTANCE,
        "resistance.imbalancePercent",
        "imbalance of the pairs",
        Form.PERCENT,
        none);
    add(g, Basis.LIMITS, "resistance.minTerminalOhm", "least, worst case", Form.OHM, none);
    add(g, Basis.LIMITS, "resistance.maxTerminalOhm", "greatest, worst case", Form.OHM, none);
    add(g, Basis.LIMITS, "resistance.rssMinTerminalOhm", "least, rss", Form.OHM, none);
    add(g, Basis.LIMITS, "resistance.rssMaxTerminalOhm", "greatest, rss", Form.OHM, none);
    add(g, Basis.HOT, "resistance.hotTerminalOhm", "between terminals, hot", Form.OHM, duty);
    add(g, Basis.HOT, "resistance.hotC", "hot means", Form.CELSIUS, duty);
  }

  private void inductance() {
    Group g = Group.INDUCTANCE;
    Basis b = Basis.INDUCTANCE;
    List<SpecKey> none = List.of();
    add(g, b, "inductance.coilHenry", "one coil", Form.HENRY, none);
    add(g, b, "inductance.phaseSelfHenry", "one phase, self", Form.HENRY, none);
    add(g, b, "inductance.phaseMutualHenry", "two phases, mutual", Form.HENRY, none);
    add(g, b, "inductance.synchronousHenry", "synchronous, a phase", Form.HENRY, none);
    add(g, b, "inductance.terminalHenry", "between terminals", Form.HENRY, none);
  }

  private void field() {
    Group e = Group.EMF;
    Group t = Group.TORQUE;
    Basis b = Basis.EMF;
    add(e, b, "emf.fluxLinkageWeber", "flux linkage of a phase, peak", Form.WEBER, FIELD);
    add(e, b, "emf.phasePeakVoltSecondPerRadian", "of a phase, fundamental, peak", Form.EMF, FIELD);
    add(
        e,
        b,
        "emf.terminalPeakVoltSecondPerRadian",
        "between terminals, fundamental, peak",
        Form.EMF,
        FIELD);
    add(e, b, "emf.rpmPerVolt", "speed for each volt, line peak", Form.RPM_PER_VOLT, FIELD);
    add(
        e,
        b,
        "emf.deltaCirculatingAmpere",
        "current round the delta, rms",
        Form.AMPERE,
        field(SpecKey.SPEED),
        Figures::delta);
    b = Basis.TORQUE;
    Form k = Form.TORQUE_PER_AMPERE;
    add(t, b, "torque.newtonMetrePerAmperePeak", "for each ampere peak of a winding", k, FIELD);
    add(t, b, "torque.newtonMetrePerAmpereRms", "for each ampere rms of a winding", k, FIELD);
    add(t, b, "torque.motorConstant", "motor constant", Form.MOTOR_CONSTANT, FIELD);
  }

  private static boolean tapers(Results r) {
    return r.taper().isPresent();
  }

  private static boolean couldBeWider(Results r) {
    return r.taper().isPresent() && r.taper().get().wider().isPresent();
  }

  private void taper() {
    Group g = Group.TAPER;
    Basis b = Basis.TAPER;
    List<SpecKey> none = List.of();
    Form percent = Form.PERCENT;
    String change = "ChangePercent";
    add(g, b, "taper.widestMm", "widest track", Form.MILLIMETRE, none, Figures::tapers);
    add(g, b, "taper.resistance" + change, "resistance", percent, none, Figures::tapers);
    add(g, b, "taper.torque" + change, "torque for each ampere", percent, FIELD, Figures::tapers);
    add(g, b, "taper.motorConstant" + change, "motor constant", percent, FIELD, Figures::tapers);
    variant("taper.plain", "even track", Figures::tapers);
    add(
        g,
        b,
        "taper.widerTrackMm",
        "wider even track",
        Form.MILLIMETRE,
        none,
        Figures::couldBeWider);
    variant("taper.wider", "wider even track", Figures::couldBeWider);
  }

  private void variant(String stem, String name, Predicate<Results> applies) {
    Group g = Group.TAPER;
    Basis b = Basis.TAPER;
    List<SpecKey> none = List.of();
    Form k = Form.MOTOR_CONSTANT;
    add(g, b, stem + "TerminalOhm", name + ", terminals", Form.OHM, none, applies);
    add(g, b, stem + "MotorConstant", name + ", motor const.", k, FIELD, applies);
    List<SpecKey> eddy = field(SpecKey.SPEED);
    add(g, b, stem + "EddyWatt", name + ", eddy loss", Form.WATT, eddy, applies);
  }

  private void heat() {
    Group g = Group.LOSS;
    Basis b = Basis.LOSS;
    List<SpecKey> current = List.of(SpecKey.CURRENT);
    List<SpecKey> eddy = field(SpecKey.SPEED);
    add(g, b, "loss.copperWatt", "copper", Form.WATT, current);
    add(g, b, "loss.eddyWatt", "eddy currents", Form.WATT, eddy);
    add(
        g,
        b,
        "loss.rippleWatt",
        "ripple",
        Form.WATT,
        List.of(SpecKey.BUS, SpecKey.SWITCHING),
        Figures::drives);
    add(g, b, "loss.circulatingWatt", "round the delta", Form.WATT, eddy, Figures::delta);
    g = Group.THERMAL;
    b = Basis.THERMAL;
    List<SpecKey> duty = List.of(SpecKey.DUTY);
    add(g, b, "thermal.copperC", "copper", Form.CELSIUS, current);
    add(g, b, "thermal.stable", "settles", Form.YES_NO, current);
    add(g, b, "thermal.maxContinuousAmpereRms", "most current, rms", Form.AMPERE, duty);
    String settles = "thermal.settlesUpToAmpereRms";
    add(g, b, settles, "current above which it never settles, rms", Form.AMPERE, duty);
    add(g, b, "thermal.chartAmpere", "chart current, narrowest track", Form.AMPERE, duty);
  }

  private void drive() {
    Group g = Group.DRIVE;
    Basis b = Basis.DRIVE;
    List<SpecKey> none = List.of();
    List<SpecKey> loop = List.of(SpecKey.BANDWIDTH);
    List<SpecKey> pwm = List.of(SpecKey.BUS, SpecKey.SWITCHING);
    List<SpecKey> series = List.of(SpecKey.BUS, SpecKey.SWITCHING, SpecKey.CURRENT);
    String choke = "drive.seriesInductanceForRippleHenry";
    add(g, b, "drive.polePairs", "pole pairs", Form.COUNT, none);
    add(g, b, "drive.electricalHz", "electrical frequency", Form.HERTZ, List.of(SpecKey.SPEED));
    add(g, b, "drive.timeConstantSecond", "time constant L/R", Form.SECOND, none);
    add(
        g,
        b,
        "drive.rippleAmperePeakToPeak",
        "PWM ripple of a line, peak to peak",
        Form.AMPERE,
        pwm,
        Figures::drives);
    add(g, b, choke, "to add in series, each line", Form.HENRY, series, Figures::drives);
    add(g, b, "drive.bandwidthHertz", "current loop bandwidth", Form.HERTZ, loop, Figures::drives);
    add(g, b, "drive.proportionalGain", "proportional gain", Form.GAIN, loop, Figures::drives);
    add(g, b, "drive.integralGain", "integral gain", Form.INTEGRAL_GAIN, loop, Figures::drives);
    add(g, b, "drive.speedLimitRpm", "no-load speed at the bus", Form.RPM, field(SpecKey.BUS));
    add(
        g,
        b,
        "drive.senseSpeedRpm",
        "speed for sensing EMF",
        Form.RPM,
        field(SpecKey.BUS),
        Figures::drives);
  }

  private void generator() {
    Group g = Group.GENERATOR;
    Basis b = Basis.GENERATOR;
    List<SpecKey> n = field(SpecKey.SPEED, SpecKey.LOAD);
    add(g, b, "generator.phaseVoltRms", "a phase, open", Form.VOLT, n, Figures::generates);
    add(g, b, "generator.loadVoltRms", "a phase, on its load", Form.VOLT, n, Figures::generates);
    add(g, b, "generator.powerWatt", "power into the load", Form.WATT, n, Figures::generates);
    add(g, b, "generator.efficiency", "efficiency", Form.RATIO, n, Figures::generates);
  }

  private void spread() {
    share("terminalOhmPercent", "resistance", List.of());
    share("torquePercent", "torque", FIELD);
    share("imbalancePercent", "imbalance", List.of());
  }

  private void share(String key, String label, List<SpecKey> needs) {
    String path = "spread." + key + ".";
    Group g = Group.SPREAD;
    Form p = Form.PERCENT;
    add(g, Basis.SPREAD, path + "worst", label + ", worst case", p, needs);
    add(g, Basis.SPREAD, path + "rss", label + ", root of squares", p, needs);
    add(g, Basis.SPREAD, path + "monteCarlo95", label + ", 95 of 100 boards", p, needs);
  }

  private void rotor() {
    Group g = Group.ROTOR;
    Basis b = Basis.ROTOR;
    List<SpecKey> pull = List.of(SpecKey.MAGNET, SpecKey.SPEED);
    add(g, b, "rotor.magnetPullNewton", "pull on a magnet at speed", Form.NEWTON, pull);
    add(g, b, "rotor.bondStressPascal", "shear in its bond", Form.PASCAL, pull);
    add(g, b, "rotor.axialPullNewton", "axial pull", Form.NEWTON, FIELD, Figures::pulled);
  }

  /** What is there, by group, in the report's order; groups without a figure are left out. */
  static Map<Group, List<Shown>> shown(Map<String, Object> figures) {
    Map<Group, List<Shown>> out = new LinkedHashMap<>();
    for (Figure f : all()) {
      List<Shown> values = f.shown(figures);
      if (!values.isEmpty()) {
        out.computeIfAbsent(f.group(), g -> new ArrayList<>()).addAll(values);
      }
    }
    return out;
  }
}
