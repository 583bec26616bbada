package etchloom.receive;

import etchloom.report.JsonTree;

/** The result for programs; its keys are bound by the spec page. What is not known has no key. */
public final class ReceiveJson {
  private ReceiveJson() {}

  /** The whole file, UTF-8. */
  public static byte[] write(Outcome o) {
    Batch b = o.batch();
    return new JsonTree()
        .put("tool", new JsonTree().put("version", o.toolVersion()))
        .put("title", o.title())
        .put("revision", o.revision())
        .put("leadOhm", o.leadOhm())
        .put("badRows", (long) o.badRows())
        .putObjects("boards", o.boards().stream().map(ReceiveJson::board).toList())
        .put(
            "batch",
            new JsonTree()
                .put("count", (long) b.count())
                .put("rejected", (long) b.rejected())
                .put("spreadPercent", b.spreadPercent())
                .put("predictedSpreadPercent", b.predictedSpreadPercent())
                .put("meanPercent", b.meanPercent()))
        .bytes();
  }

  private static JsonTree board(Verdict v) {
    JsonTree out =
        new JsonTree()
            .put("board", v.board())
            .put("accepted", v.accepted())
            .put("cause", v.cause().word());
    if (!v.where().isEmpty()) {
      out.put("where", v.where());
    }
    out.put("worstPair", v.worstPair())
        .put("deviationPercent", v.deviationPercent())
        .put("copperUm", v.copperUm())
        .put("imbalancePercent", v.imbalancePercent())
        .putObjects("pairs", v.pairs().stream().map(ReceiveJson::pair).toList());
    return v.missing().isEmpty() ? out : out.putTexts("notMeasured", v.missing());
  }

  private static JsonTree pair(PairVerdict p) {
    JsonTree out = new JsonTree().put("pair", p.pair()).put("open", p.open());
    finite(out, "ohm", p.ohm());
    out.put("celsius", p.celsius());
    finite(out, "leastOhm", p.leastOhm());
    finite(out, "expectedOhm", p.expectedOhm());
    finite(out, "mostOhm", p.mostOhm());
    return out.put("within", p.within());
  }

  private static void finite(JsonTree out, String key, double value) {
    if (Double.isFinite(value)) {
      out.put(key, value);
    }
  }
}
