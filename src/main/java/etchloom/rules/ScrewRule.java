package etchloom.rules;

import etchloom.artwork.MountingHole;
import etchloom.geometry.Line;
import etchloom.geometry.Nearest;
import etchloom.geometry.Point;
import etchloom.rules.Verdicts.Measured;
import java.util.List;

/**
 * Copper near the mounting holes: {@code hole-copper} from the hole's edge, {@code keep-out} from
 * the screw head, and {@code voltage} from what metal the screw has on the layer, which may be
 * earthed: its head outside, its thread inside.
 */
final class ScrewRule implements LayerRule {
  @Override
  public void check(Layer layer, Verdicts verdicts) {
    List<MountingHole> holes = layer.board().artwork().mountingHoles();
    for (int i = 0; i < holes.size(); i++) {
      new Screw(layer, holes.get(i), "mounting hole " + (i + 1), verdicts).look();
    }
  }

  private static final class Screw {
    private final Layer layer;
    private final MountingHole hole;
    private final String what;
    private final Verdicts verdicts;
    private final double edgeMm;
    private final double metalMm;

    Screw(Layer layer, MountingHole hole, String what, Verdicts verdicts) {
      this.layer = layer;
      this.hole = hole;
      this.what = what;
      this.verdicts = verdicts;
      edgeMm = hole.diameterMm() / 2;
      metalMm = layer.outer() ? Math.max(edgeMm, hole.keepOutMm() / 2) : edgeMm;
    }

    void look() {
      double volt = layer.board().potentials().fullVolt().orElse(0);
      double spacing = volt > 0 ? VoltageRule.column(layer, true).requiredMm(volt) : 0;
      double reach = Math.max(edgeMm + layer.board().fab().hole().copperGapMm(), metalMm + spacing);
      layer
          .copper()
          .nearby(Double.POSITIVE_INFINITY)
          .look(
              new Line(hole.at(), hole.at()),
              0,
              reach,
              (i, gap, n) -> {
                judge(i, gap, n, volt);
                return gap;
              });
    }

    /**
     * @param fromMiddleMm from the hole's middle to the edge of the copper
     */
    private void judge(int i, double fromMiddleMm, Nearest n, double volt) {
      Piece p = layer.copper().pieces().get(i);
      Point at = Board.middle(n, edgeMm, p.fatMm());
      double copperGap = layer.board().fab().hole().copperGapMm();
      add(RuleName.HOLE_COPPER, i, p, at, fromMiddleMm - edgeMm, copperGap, "");
      if (layer.outer()) {
        double head = fromMiddleMm - hole.keepOutMm() / 2;
        add(RuleName.KEEP_OUT, i, p, at, head, 0, "'s screw head");
      }
      if (volt > 0) {
        boolean bare = layer.board().exposure().bare(layer.number(), p);
        Spacing2221 column = VoltageRule.column(layer, bare);
        verdicts.add(
            Measured.atLeast(
                    RuleName.VOLTAGE,
                    layer.number(),
                    at,
                    fromMiddleMm - metalMm,
                    column.requiredMm(volt),
                    VoltageRule.words(words("'s screw", p), volt, column))
                .byMargin()
                .ids(i, i));
      }
    }

    private void add(
        RuleName rule, int i, Piece p, Point at, double gapMm, double requiredMm, String part) {
      verdicts.add(
          Measured.atLeast(rule, layer.number(), at, gapMm, requiredMm, words(part, p)).ids(i, i));
    }

    private Words words(String part, Piece p) {
      return Words.of(what, part, " and ", layer.words(p));
    }
  }
}
