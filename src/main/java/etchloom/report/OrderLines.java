package etchloom.report;

import etchloom.artwork.Artwork;
import etchloom.artwork.Stackup;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;

/** What the fab must be told, and what to measure when the boards come. */
public final class OrderLines {
  /** One item of the order sheet. */
  public record Line(String item, String value) {
    @Override
    public String toString() {
      return item + ": " + value;
    }
  }

  private OrderLines() {}

  /** The order sheet. */
  public static List<Line> of(Results r) {
    Artwork art = r.artwork();
    Spec.Board board = r.spec().board();
    List<Line> out = new ArrayList<>();
    if (art.draft()) {
      out.add(new Line("DRAFT", "rules are broken; not for production"));
    }
    out.add(new Line("board", outline(board)));
    out.add(
        new Line(
            "layers", art.layers() + ", thickness over the copper " + mm(board.thicknessMm())));
    for (int i = 0; i < art.layers(); i++) {
      Stackup.Copper c = art.stackup().copper().get(i);
      out.add(
          new Line(
              "copper L" + (i + 1),
              um(c.thicknessMm())
                  + " finished, ordered as "
                  + Numbers.trimmed(c.ounces(), 2)
                  + " oz"));
      if (i < art.layers() - 1) {
        out.add(
            new Line(
                "dielectric L" + (i + 1) + "/L" + (i + 2),
                mm(art.stackup().dielectricMm().get(i))));
      }
    }
    out.add(
        new Line(
            "laminate",
            "glass transition at least " + Numbers.trimmed(board.laminateTgC(), 0) + " C"));
    out.add(
        new Line(
            "holes",
            "diameters are finished; plating at least "
                + um(art.stackup().platingMm())
                + " on the wall"));
    out.add(new Line("finish", board.finish()));
    out.add(new Line("solder mask", board.mask() + ", both sides, vias tented"));
    out.add(new Line("legend", "top side only"));
    out.add(new Line("rules", "drawn for: " + r.fab().title()));
    out.add(new Line("copper as drawn", "no added copper, no teardrops, no edits of tracks"));
    out.add(new Line("electrical test", test(r.spec().winding())));
    return out;
  }

  private static String outline(Spec.Board b) {
    String bore = b.boreMm() > 0 ? ", bore " + mm(b.boreMm()) : ", no bore";
    String tab =
        b.tab()
            .map(t -> ", tab of " + mm(t.widthMm()) + " standing out by " + mm(t.lengthMm()))
            .orElse("");
    return "round, " + mm(b.diameterMm()) + bore + tab;
  }

  private static String test(Spec.Winding w) {
    if (w.connection() != Spec.Connection.OPEN && w.phases() == 6) {
      return "each set of three phases is one net by design: test its continuity, and isolation"
          + " between the two sets";
    }
    return w.connection() == Spec.Connection.OPEN
        ? "each phase is one net by design: test its continuity, and isolation between phases"
        : "the winding is one net by design: test continuity, no isolation test between terminals";
  }

  /** The acceptance limits, one a line; empty where the tolerances could etch a track away. */
  public static List<String> resistance(ResistanceFigures figures) {
    List<PairLimits> pairs = PairLimits.lines(figures);
    if (pairs.isEmpty()) {
      return List.of();
    }
    return List.of(
        "resistance "
            + String.join(", ", pairs.stream().map(PairLimits::pair).toList())
            + " at 20 C: "
            + ohm(figures.meanTerminalOhm())
            + ", limits "
            + PairLimits.span(pairs));
  }

  static String ohm(double v) {
    return Numbers.engineering(v, "ohm", 4);
  }

  static String um(double mm) {
    return Numbers.trimmed(1000 * mm, 1) + " um";
  }

  static String mm(double v) {
    return Numbers.trimmed(v, 3) + " mm";
  }
}
