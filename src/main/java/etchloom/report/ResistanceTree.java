package etchloom.report;

import etchloom.electric.resistance.Copper;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.spec.Spec;

/** {@code resistance} of the report. */
final class ResistanceTree {
  private ResistanceTree() {}

  static JsonTree of(Results r) {
    ResistanceFigures f = r.resistance();
    JsonTree phases = new JsonTree();
    f.phases().forEach(p -> phases.put(p.mark(), p.ohm()));
    JsonTree terminals = new JsonTree();
    f.terminals().forEach(t -> terminals.put(t.key(), t.ohm()));
    JsonTree out =
        new JsonTree()
            .put("coilOhm", f.coilOhm())
            .put("phaseOhm", phases)
            .put("terminalOhm", terminals)
            .put("imbalancePercent", f.imbalancePercent());
    f.worst()
        .ifPresent(
            l ->
                out.put("minTerminalOhm", l.minTerminalOhm())
                    .put("maxTerminalOhm", l.maxTerminalOhm()));
    f.rss()
        .ifPresent(
            l ->
                out.put("rssMinTerminalOhm", l.minTerminalOhm())
                    .put("rssMaxTerminalOhm", l.maxTerminalOhm()));
    out.putSome(
        "pairs",
        f.pairs().stream()
            .map(
                p ->
                    new JsonTree()
                        .put("pair", p.key())
                        .put("expectedOhm", p.expectedOhm())
                        .put("leastOhm", p.leastOhm())
                        .put("greatestOhm", p.greatestOhm()))
            .toList());
    r.spec().duty().ifPresent(d -> hot(out, f, hotC(r, d)));
    return out;
  }

  /** Where the copper settles, else its limit. */
  private static double hotC(Results r, Spec.Duty duty) {
    return r.machine().map(m -> m.thermal().hotC()).orElse(duty.copperLimitC());
  }

  /** The mean of the pairs without a star point, at another temperature. */
  private static void hot(JsonTree out, ResistanceFigures f, double tempC) {
    out.put("hotTerminalOhm", f.meanTerminalOhm() * Copper.factor(tempC)).put("hotC", tempC);
  }
}
