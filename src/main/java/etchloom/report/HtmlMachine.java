package etchloom.report;

import etchloom.electric.machine.EmfFigures;
import etchloom.electric.machine.EmfFigures.PhaseEmf;
import etchloom.electric.machine.SharingFigures;
import etchloom.units.Numbers;

/** What of the machine is more than single figures: waveform, harmonics, layers, axes. */
final class HtmlMachine {
  private final Html h;
  private final Results r;
  private final HtmlPlots plots;

  HtmlMachine(Html h, Results r, HtmlPlots plots) {
    this.h = h;
    this.r = r;
    this.plots = plots;
  }

  void emf() {
    r.machine().flatMap(m -> m.sharing()).ifPresent(this::sharing);
    r.machine().flatMap(m -> m.emf()).ifPresent(this::emf);
  }

  private void emf(EmfFigures f) {
    plots.waveform(f);
    plots.harmonics(f);
  }

  private void sharing(SharingFigures f) {
    Table t =
        new Table(
            "Layers side by side in a coil",
            4,
            "Layer",
            "Of the coil's current",
            "If shared evenly",
            "Flux linkage over the mean",
            "Circulating at speed, rms");
    for (int i = 0; i < f.layers().size(); i++) {
      SharingFigures.Layer l = f.layers().get(i);
      String stem = "sharing.layers[" + i + "].";
      t.row(
          Cell.of("L" + l.layer()),
          Cell.of(Numbers.fixed(100 * l.currentShare(), 2) + " %", stem + "currentShare"),
          Cell.of(Numbers.fixed(100 * l.evenShare(), 2) + " %", stem + "evenShare"),
          l.linkageRatio().isPresent()
              ? Cell.of(Numbers.fixed(l.linkageRatio().getAsDouble(), 4), stem + "linkageRatio")
              : Cell.of(""),
          l.circulatingAmpereRms().isPresent()
              ? Cell.of(
                  Numbers.engineering(l.circulatingAmpereRms().getAsDouble(), "A", 3),
                  stem + "circulatingAmpereRms")
              : Cell.of(""));
    }
    t.write(h);
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
    Table t =
        new Table(
            "To align the sensor: mechanical angles, counter-clockwise from the x axis, seen from"
                + " L1",
            3,
            "Phase",
            "Its axis",
            "Rotor comes to rest at",
            "Back-EMF, peak");
    for (int i = 0; i < f.phases().size(); i++) {
      PhaseEmf p = f.phases().get(i);
      String stem = "emf.phases[" + i + "].";
      t.row(
          Cell.of(p.mark()),
          Cell.of(degrees(p.axisRad()), stem + "axisDegrees"),
          Cell.of(degrees(p.restRad()), stem + "restDegrees"),
          Cell.of(Form.EMF.show(p.peakVoltSecondPerRadian()), stem + "peakVoltSecondPerRadian"));
    }
    t.write(h);
  }

  private static String degrees(double rad) {
    return Numbers.fixed(Math.toDegrees(rad), 2) + "\u00b0";
  }
}
