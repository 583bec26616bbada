package etchloom.report;

import etchloom.artwork.Stackup;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import etchloom.winding.PhaseCoil;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What the board looks like: picture, cross-section, sizes and winding. */
final class HtmlBoard {
  private HtmlBoard() {}

  static void add(Html h, Results r, Optional<String> picture) {
    h.open("figure");
    Optional<String> svg = picture.flatMap(HtmlBoard::inline);
    if (svg.isPresent()) {
      String label = "The board seen from L1, all copper layers";
      h.open("div", "class=\"sheet\"", "role=\"img\"", "aria-label=\"" + label + "\"");
      h.raw(svg.get()).close("div");
    }
    h.element(
        "figcaption",
        svg.isPresent()
            ? "The board seen from L1, the face that looks at the rotor. The set holds the same"
                + " picture as a file."
            : "No picture here: it is in the set's SVG file.");
    h.close("figure");
    sizes(h, r);
    winding(h, r);
    h.open("figure").open("div", "class=\"sheet stack\"");
    h.raw(StackSvg.draw(r.artwork().stackup())).close("div");
    h.element("figcaption", "Cross-section, not to scale. The same in words:").close("figure");
    stack(h, r.artwork().stackup());
  }

  /** The {@code svg} element alone; a file's head has no place inside a page. */
  private static Optional<String> inline(String file) {
    int at = file.indexOf("<svg");
    return at < 0 ? Optional.empty() : Optional.of(file.substring(at));
  }

  private static void sizes(Html h, Results r) {
    Spec s = r.spec();
    List<List<String>> rows = new ArrayList<>();
    String bore = s.board().boreMm() > 0 ? OrderLines.mm(s.board().boreMm()) : "none";
    rows.add(List.of("Board diameter", OrderLines.mm(s.board().diameterMm())));
    rows.add(List.of("Bore", bore));
    s.board()
        .tab()
        .ifPresent(
            t ->
                rows.add(
                    List.of(
                        "Tab, width and length",
                        OrderLines.mm(t.widthMm()) + ", " + OrderLines.mm(t.lengthMm()))));
    rows.add(List.of("Thickness over the copper", OrderLines.mm(s.board().thicknessMm())));
    rows.add(
        List.of(
            "Coil copper, radius",
            OrderLines.mm(s.coil().innerRadiusMm())
                + " to "
                + OrderLines.mm(s.coil().outerRadiusMm())));
    rows.add(List.of("Turns of a coil on each layer", "" + r.artwork().turnsPerLayer()));
    rows.add(List.of("Track, space", track(r)));
    rows.add(List.of("Vias", "" + r.vias()));
    h.table("Sizes", List.of("What", "Value"), rows, 1);
  }

  private static String track(Results r) {
    Spec.Coil c = r.spec().coil();
    String widest = r.taper().map(t -> " to " + OrderLines.mm(t.widestMm())).orElse("");
    return OrderLines.mm(c.trackMm()) + widest + ", " + OrderLines.mm(c.spaceMm());
  }

  private static void winding(Html h, Results r) {
    List<List<String>> rows = new ArrayList<>();
    for (int p = 0; p < r.winding().phases(); p++) {
      int phase = p;
      List<String> coils =
          r.winding().sequence().stream()
              .filter(c -> c.phase() == phase)
              .map(HtmlBoard::coil)
              .toList();
      rows.add(
          List.of(
              "Phase " + r.winding().marks().get(p),
              Numbers.fixed(Math.toDegrees(r.winding().axisRad().get(p)), 2) + "\u00b0",
              String.join(", ", coils)));
    }
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
    h.table(name, List.of("Phase", "Axis, mechanical", "Coils, \u2212 reversed"), rows, 1);
  }

  private static String coil(PhaseCoil c) {
    return (c.sign() < 0 ? "\u2212" : "") + c.coil();
  }

  private static void stack(Html h, Stackup s) {
    List<List<String>> rows = new ArrayList<>();
    for (int i = 0; i < s.layers(); i++) {
      Stackup.Copper c = s.copper().get(i);
      rows.add(
          List.of(
              "Copper L" + (i + 1),
              OrderLines.um(c.thicknessMm()),
              "ordered as " + Numbers.trimmed(c.ounces(), 2) + " oz, finished"));
      if (i < s.layers() - 1) {
        rows.add(List.of("Dielectric", OrderLines.mm(s.dielectricMm().get(i)), ""));
      }
    }
    h.table("Stack from L1 down", List.of("Layer", "Thickness", "Note"), rows, 1);
  }
}
