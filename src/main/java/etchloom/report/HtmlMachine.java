package etchloom.report;

import etchloom.electric.machine.DriveFigures;
import etchloom.electric.machine.EmfFigures;
import etchloom.electric.machine.EmfFigures.PhaseEmf;
import etchloom.electric.machine.EmfFigures.Sample;
import etchloom.electric.machine.SharingFigures;
import etchloom.electric.machine.drive.TorqueSpeed;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;

/** What of the machine is more than single figures: waveform, harmonics, axes, torque by speed. */
final class HtmlMachine {
  private static final int ROWS = 7;

  private final Html h;
  private final Results r;

  HtmlMachine(Html h, Results r) {
    this.h = h;
    this.r = r;
  }

  void emf() {
    r.machine().flatMap(m -> m.sharing()).ifPresent(this::sharing);
    r.machine().flatMap(m -> m.emf()).ifPresent(this::emf);
  }

  private void emf(EmfFigures f) {
    List<LinePlot.Series> lines = new ArrayList<>();
    List<String> marks = r.winding().marks();
    List<Sample> turn = new ArrayList<>(f.waveform());
    turn.add(new Sample(360, f.waveform().get(0).voltSecondPerRadian()));
    List<Double> degrees = turn.stream().map(Sample::electricalDegrees).toList();
    for (int p = 0; p < marks.size(); p++) {
      int phase = p;
      List<Double> values =
          turn.stream().map(s -> 1000 * s.voltSecondPerRadian().get(phase)).toList();
      lines.add(new LinePlot.Series(marks.get(p), degrees, values));
    }
    h.open("figure").open("div", "class=\"sheet\"");
    h.raw(
        LinePlot.draw(
            "Back-EMF of the phases over one electrical turn; the harmonics below say the same",
            "rotor, electrical degrees",
            "mV s/rad",
            lines));
    h.close("div");
    h.element("figcaption", "Back-EMF of each phase over one electrical turn, at 1 rad/s.");
    h.close("figure");
    List<List<String>> rows = new ArrayList<>();
    double first = f.phasePeakVoltSecondPerRadian();
    for (EmfFigures.Harmonic x : f.harmonics()) {
      double v = x.phasePeakVoltSecondPerRadian();
      String share = first == 0 ? "" : Numbers.fixed(100 * v / first, 2) + " %";
      rows.add(List.of("" + x.order(), Form.EMF.show(v), share));
    }
    h.table(
        "Harmonics of the back-EMF", List.of("Order", "Peak, a phase", "Of the first"), rows, 2);
  }

  private void sharing(SharingFigures f) {
    List<List<String>> rows = new ArrayList<>();
    for (SharingFigures.Layer l : f.layers()) {
      rows.add(
          List.of(
              "L" + l.layer(),
              Numbers.fixed(100 * l.currentShare(), 2) + " %",
              Numbers.fixed(100 * l.evenShare(), 2) + " %",
              l.linkageRatio().isPresent() ? Numbers.fixed(l.linkageRatio().getAsDouble(), 4) : "",
              l.circulatingAmpereRms().isPresent()
                  ? Numbers.engineering(l.circulatingAmpereRms().getAsDouble(), "A", 3)
                  : ""));
    }
    h.table(
        "Layers side by side in a coil",
        List.of(
            "Layer",
            "Of the coil's current",
            "If shared evenly",
            "Flux linkage over the mean",
            "Circulating at speed, rms"),
        rows,
        1);
  }

  void axes() {
    r.machine().flatMap(m -> m.emf()).ifPresent(this::axes);
  }

  private void axes(EmfFigures f) {
    h.element(
        "p",
        f.counterClockwise()
            ? "Currents in the order of the marks turn the rotor counter-clockwise, seen from L1."
            : "Currents in the order of the marks turn the rotor clockwise, seen from L1.");
    List<List<String>> rows = new ArrayList<>();
    for (PhaseEmf p : f.phases()) {
      rows.add(
          List.of(
              p.mark(),
              degrees(p.axisRad()),
              degrees(p.restRad()),
              Form.EMF.show(p.peakVoltSecondPerRadian())));
    }
    h.table(
        "To align the sensor: mechanical angles, counter-clockwise from the x axis, seen from L1",
        List.of("Phase", "Its axis", "Rotor comes to rest at", "Back-EMF, peak"),
        rows,
        3);
  }

  private static String degrees(double rad) {
    return Numbers.fixed(Math.toDegrees(rad), 2) + "\u00b0";
  }

  void torqueSpeed() {
    r.machine().map(m -> m.drive()).filter(d -> d.torqueSpeed().size() > 1).ifPresent(this::line);
  }

  private void line(DriveFigures d) {
    List<TorqueSpeed.Point> points = d.torqueSpeed();
    List<Double> x = points.stream().map(TorqueSpeed.Point::rpm).toList();
    List<Double> y = points.stream().map(p -> 1000 * p.newtonMetre()).toList();
    h.open("figure").open("div", "class=\"sheet\"");
    h.raw(
        LinePlot.draw(
            "Most torque at the shaft over the speed; the table below says the same",
            "rpm",
            "mN m",
            List.of(new LinePlot.Series("", x, y))));
    h.close("div");
    h.element(
        "figcaption", "Most torque at the shaft with the duty's current and bus, copper hot.");
    h.close("figure");
    List<List<String>> rows = new ArrayList<>();
    for (int i = 0; i < ROWS; i++) {
      TorqueSpeed.Point p = points.get(Math.round(i * (points.size() - 1) / (ROWS - 1f)));
      rows.add(
          List.of(Form.RPM.show(p.rpm()), Form.TORQUE.show(p.newtonMetre()), p.limit().word()));
    }
    h.table("Torque by speed", List.of("Speed", "Torque", "Limited by"), rows, 1);
  }
}
