package etchloom.rules;

import etchloom.artwork.Stackup;
import etchloom.geometry.Point;
import etchloom.rules.Verdicts.Measured;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.List;
import java.util.Optional;

/**
 * What the fab builds at all: {@code copper-weight}, {@code layers}, and {@code size}, which is the
 * board's sides and its thickness.
 */
final class OrderRules implements Rule {
  @Override
  public void check(Board board, Verdicts verdicts) {
    copper(board, verdicts);
    layers(board, verdicts);
    size(board, verdicts);
    stackup(board, verdicts);
  }

  private static void copper(Board board, Verdicts verdicts) {
    List<Stackup.Copper> all = board.artwork().stackup().copper();
    for (int layer = 1; layer <= all.size(); layer++) {
      Stackup.Copper c = all.get(layer - 1);
      Optional<FabRules.CopperRow> row = board.row(layer);
      if (row.isPresent()) {
        thickness(layer, c, row.get(), verdicts);
      } else {
        boolean outer = board.outer(layer);
        double nearest = nearestWeight(board.fab(), outer, c.ounces());
        String side = outer ? "outer" : "inner";
        Words what =
            Double.isNaN(nearest)
                ? Words.of("the fab offers no copper on ", side, " layers")
                : Words.of(
                    "the fab does not offer this copper on ",
                    side,
                    " layers; the nearest is given");
        verdicts.add(broken(RuleName.COPPER_WEIGHT, layer, c.ounces(), nearest, "oz", what));
      }
    }
  }

  /** The finished copper that the board was reckoned with against what the fab delivers. */
  private static void thickness(
      int layer, Stackup.Copper c, FabRules.CopperRow row, Verdicts verdicts) {
    double off = Math.abs(c.thicknessMm() / row.thicknessMm() - 1);
    Words what =
        Words.of("finished copper; the fab's row of ", Numbers.trimmed(row.ounces(), 3), " oz");
    verdicts.add(
        new Measured(
            RuleName.COPPER_WEIGHT,
            layer,
            Point.ORIGIN,
            c.thicknessMm(),
            row.thicknessMm(),
            "mm",
            off <= FabRules.THICKNESS_MATCH + 1e-9,
            -off,
            layer,
            0,
            what));
  }

  private static double nearestWeight(FabRules fab, boolean outer, double ounces) {
    double best = Double.NaN;
    for (FabRules.CopperRow r : fab.copper()) {
      if (r.outer() == outer && !(Math.abs(r.ounces() - ounces) >= Math.abs(best - ounces))) {
        best = r.ounces();
      }
    }
    return best;
  }

  private static void layers(Board board, Verdicts verdicts) {
    int layers = board.artwork().layers();
    int nearest = layers;
    int off = Integer.MAX_VALUE;
    for (int offered : board.fab().layers()) {
      if (Math.abs(offered - layers) < off) {
        nearest = offered;
        off = Math.abs(offered - layers);
      }
    }
    verdicts.add(
        new Measured(
            RuleName.LAYERS,
            0,
            Point.ORIGIN,
            layers,
            nearest,
            "1",
            off == 0,
            -off,
            0,
            0,
            Words.of("copper layers; the fab builds ", either(board.fab().layers()))));
  }

  /** {@code 2, 4 or 6}. */
  private static String either(List<Integer> counts) {
    List<String> all = counts.stream().map(String::valueOf).toList();
    int last = all.size() - 1;
    return last < 1
        ? String.join("", all)
        : String.join(", ", all.subList(0, last)) + " or " + all.get(last);
  }

  private static void size(Board board, Verdicts verdicts) {
    double[] sides = board.outline().sizeMm();
    FabRules fab = board.fab();
    add(
        verdicts,
        Math.max(sides[0], sides[1]),
        fab.sizeMm(),
        true,
        Words.of("the board's greatest side"),
        0);
    double thick = board.artwork().stackup().thicknessMm();
    add(verdicts, thick, fab.thicknessMaxMm(), true, Words.of("the board's thickness, at most"), 1);
    add(
        verdicts,
        thick,
        fab.thicknessMinMm(),
        false,
        Words.of("the board's thickness, at least"),
        2);
  }

  /** Lengths of different kinds: ranked by what is left as a share of the limit. */
  private static void add(
      Verdicts verdicts, double mm, double limitMm, boolean most, Words what, int id) {
    double left = most ? limitMm - mm : mm - limitMm;
    verdicts.add(
        new Measured(
            RuleName.SIZE,
            0,
            Point.ORIGIN,
            mm,
            limitMm,
            "mm",
            left >= -Board.SLACK_MM,
            limitMm > 0 ? left / limitMm : left,
            id,
            0,
            what));
  }

  private static Measured broken(
      RuleName rule, int layer, double value, double required, String unit, Words what) {
    double shown = Double.isNaN(required) ? 0 : required;
    return new Measured(
        rule,
        layer,
        Point.ORIGIN,
        value,
        shown,
        unit,
        false,
        Double.NEGATIVE_INFINITY,
        layer,
        0,
        what);
  }

  /** Not a rule that can be broken, but a fab asks back about every build that is not its own. */
  private static void stackup(Board board, Verdicts verdicts) {
    Spec.Board b = board.spec().board();
    boolean own =
        board.fab().stackups().stream()
            .anyMatch(
                s ->
                    s.layers() == b.layers()
                        && Math.abs(s.thicknessMm() - b.thicknessMm()) < 0.05
                        && (b.stackupMm().isEmpty() || b.stackupMm().equals(s.dielectricsMm())));
    if (!own) {
      verdicts.note(
          "layers: "
              + b.layers()
              + " layers in "
              + Numbers.trimmed(b.thicknessMm(), 3)
              + " mm with these dielectrics are none of the fab's standard builds; ask whether it"
              + " can be had");
    }
  }
}
