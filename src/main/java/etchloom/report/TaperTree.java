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
            .put("resistanceChangePercent", f.resistancePercent())
            .put("torqueChangePercent", f.torquePercent())
            .put("motorConstantChangePercent", f.motorConstantPercent());
    variant(out, "plain", f.plain());
    f.wider()
        .ifPresent(
            w -> {
              out.put("widerTrackMm", w.trackMm());
              variant(out, "wider", w);
            });
    return out;
  }

  /** Keys that end like no others, so that their ends name them alone. */
  private static void variant(JsonTree out, String name, TaperFigures.Variant v) {
    out.put(name + "TerminalOhm", v.terminalOhm());
    v.torque()
        .ifPresent(
            t ->
                out.put(name + "NewtonMetrePerAmperePeak", t.newtonMetrePerAmperePeak())
                    .put(name + "MotorConstant", t.motorConstant()));
    out.put(name + "EddyWatt", v.eddyWatt());
  }
}
