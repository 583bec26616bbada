package etchloom.report;

import etchloom.electric.machine.TaperFigures;

/** {@code taper} of the report: only where the tracks widen. */
final class TaperTree {
  private TaperTree() {}

  static JsonTree of(TaperFigures f) {
    JsonTree out =
        new JsonTree()
            .put("widestMm", f.widestMm())
            .put("widths", f.widths())
            .put("resistancePercent", f.resistancePercent())
            .put("torquePercent", f.torquePercent())
            .put("motorConstantPercent", f.motorConstantPercent())
            .put("plain", variant(f.plain()));
    f.wider().ifPresent(w -> out.put("wider", variant(w)));
    return out;
  }

  private static JsonTree variant(TaperFigures.Variant v) {
    JsonTree out = new JsonTree().put("trackMm", v.trackMm()).put("terminalOhm", v.terminalOhm());
    v.torque()
        .ifPresent(
            t ->
                out.put("newtonMetrePerAmperePeak", t.newtonMetrePerAmperePeak())
                    .put("motorConstant", t.motorConstant()));
    return out.put("eddyWatt", v.eddyWatt());
  }
}
