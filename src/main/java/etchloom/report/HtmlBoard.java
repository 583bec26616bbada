package etchloom.report;

import etchloom.artwork.Coil;
import etchloom.artwork.Stackup;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import etchloom.winding.PhaseCoil;
import java.util.List;
import java.util.Optional;

/** What the board looks like: picture, cross-section, sizes and winding. */
final class HtmlBoard {
  private HtmlBoard() {}

  static void add(Html h, Results r, Optional<String> picture) {
    Optional<String> svg = picture.flatMap(HtmlBoard::inline);
    if (svg.isPresent()) {
      new BoardView(h, r, svg.get()).write();
    } else {
      h.element("p", "No picture here: it is in the set's SVG file.");
    }
    sizes(h, r);
    winding(h, r);
    coils(h, r);
    stack(h, r.artwork().stackup());
  }

  /** The {@code svg} element alone; a file's head has no place inside a page. */
  private static Optional<String> inline(String file) {
    int at = file.indexOf("<svg");
    return at < 0 ? Optional.empty() : Optional.of(file.substring(at));
  }

  private static void sizes(Html h, Results r) {
    Spec s = r.spec();
    Table t = new Table("Sizes", 1, "What", "Value");
    t.row(Cell.of("Board diameter"), mm(s.board().diameterMm(), "geometry.boardDiameterMm"));
    t.row(
        Cell.of("Bore"),
        s.board().boreMm() > 0 ? mm(s.board().boreMm(), "geometry.boreMm") : Cell.of("none"));
    s.board()
        .tab()
        .ifPresent(
            tab -> {
              t.row(Cell.of("Tab, width"), mm(tab.widthMm(), "geometry.tabWidthMm"));
              t.row(Cell.of("Tab, standing out by"), mm(tab.lengthMm(), "geometry.tabLengthMm"));
            });
    t.row(
        Cell.of("Thickness over the copper"), mm(s.board().thicknessMm(), "geometry.thicknessMm"));
    t.row(
        Cell.of("Coil copper, inner radius"),
        mm(s.coil().innerRadiusMm(), "geometry.coilInnerRadiusMm"));
    t.row(
        Cell.of("Coil copper, outer radius"),
        mm(s.coil().outerRadiusMm(), "geometry.coilOuterRadiusMm"));
    t.row(
        Cell.of("Turns of a coil on each layer"),
        Cell.of("" + r.artwork().turnsPerLayer(), "geometry.turnsPerLayer"));
    t.row(Cell.of("Track"), mm(s.coil().trackMm(), "geometry.trackMm"));
    r.taper().ifPresent(x -> t.row(Cell.of("Track, widest"), mm(x.widestMm(), "taper.widestMm")));
    t.row(Cell.of("Space"), mm(s.coil().spaceMm(), "geometry.spaceMm"));
    t.row(Cell.of("Vias"), Cell.of("" + r.vias(), "geometry.vias"));
    t.write(h);
  }

  private static Cell mm(double v, String key) {
    return Cell.of(OrderLines.mm(v), key);
  }

  private static void winding(Html h, Results r) {
    String name =
        "Winding: "
            + WindingTree.word(r.spec().winding().connection())
            + ", "
            + Words.count(r.winding().coils(), "coil")
            + (r.spec().winding().parallelPaths() > 1
                ? " in " + r.spec().winding().parallelPaths() + " parallel paths a phase"
                : "")
            + ", "
            + r.winding().poles()
            + " poles, winding factor "
            + Numbers.fixed(r.winding().windingFactor(), 4);
    Table t = new Table(name, 1, "Phase", "Axis, mechanical", "Coils, \u2212 reversed");
    for (int p = 0; p < r.winding().phases(); p++) {
      int phase = p;
      List<String> coils =
          r.winding().sequence().stream()
              .filter(c -> c.phase() == phase)
              .map(HtmlBoard::coil)
              .toList();
      String mark = r.winding().marks().get(p);
      double axis = Math.toDegrees(r.winding().axisRad().get(p));
      t.row(
          Cell.of("Phase " + mark),
          Cell.of(Numbers.fixed(axis, 2) + "\u00b0", "winding.axisDegrees." + mark),
          Cell.of(String.join(", ", coils)));
    }
    t.write(h);
  }

  /** The picture's script reads these rows. */
  private static void coils(Html h, Results r) {
    Table t =
        new Table(
            "Coils, each alone, at 20 \u00b0C",
            "coils-table",
            4,
            List.of("Coil", "Stands at", "Turns on each layer", "Length", "Resistance", "Phase"));
    for (int i = 0; i < r.artwork().coils().size(); i++) {
      Coil c = r.artwork().coils().get(i);
      ResistanceFigures.CoilOhm o = r.resistance().coils().get(i);
      String stem = "geometry.coils[" + i + "].";
      t.row(
          Cell.of("Coil " + c.number(), stem + "coil"),
          Cell.of(Numbers.fixed(Math.toDegrees(c.axisRad()), 2) + "\u00b0", stem + "axisDegrees"),
          Cell.of("" + r.artwork().turnsPerLayer(), "geometry.turnsPerLayer"),
          Cell.of(Numbers.fixed(o.lengthMm(), 1) + " mm", stem + "lengthMm"),
          Cell.of(OrderLines.ohm(o.ohm()), stem + "ohm"),
          Cell.of(c.phase() + (c.sign() < 0 ? ", reversed" : "")));
    }
    h.open("details").element("summary", "Every coil in words");
    t.write(h);
    h.close("details");
  }

  private static String coil(PhaseCoil c) {
    return (c.sign() < 0 ? "\u2212" : "") + c.coil();
  }

  private static void stack(Html h, Stackup s) {
    Table t = new Table("Stack from L1 down", 1, "Layer", "Thickness", "Note");
    for (int i = 0; i < s.layers(); i++) {
      Stackup.Copper c = s.copper().get(i);
      String stem = "geometry.stack[" + i + "].";
      t.row(
          Cell.of("Copper L" + (i + 1)),
          Cell.of(OrderLines.um(c.thicknessMm()), stem + "copperMm"),
          Cell.of("ordered as " + Numbers.trimmed(c.ounces(), 2) + " oz, finished"));
      if (i < s.layers() - 1) {
        t.row(
            Cell.of("Dielectric"), mm(s.dielectricMm().get(i), stem + "dielectricMm"), Cell.of(""));
      }
    }
    t.write(h);
  }
}
