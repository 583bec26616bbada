package etchloom.spec;

import etchloom.spec.FabRules.Edge;
import etchloom.spec.FabRules.Hole;
import etchloom.spec.FabRules.Legend;
import etchloom.spec.FabRules.Mask;
import etchloom.spec.FabRules.Ring;
import etchloom.spec.FabRules.Stackup;
import etchloom.spec.FabRules.Tolerance;
import etchloom.units.Constants;
import etchloom.units.Dimension;
import java.util.ArrayList;
import java.util.List;

/** Reads the groups of a rules file. Faulty values are NaN; the caller then drops the result. */
final class FabDraft {
  private FabDraft() {}

  static FabRules read(Section top) {
    String title = Titles.fabTitle(top);
    top.missing("layers", "the layer counts that the fab builds, such as `[2, 4]`");
    List<Integer> layers = top.counts("layers", Limits.LAYERS_MIN, Limits.LAYERS_MAX, true);
    List<Stackup> stackups = stackups(top, layers);
    Section thickness = top.group("thickness");
    double thin = rule(thickness, "min");
    double thick = rule(thickness, "max");
    thickness.close();
    if (thin > thick) {
      thickness.error(Codes.FAB, "min", Show.mm(thin) + " is more than max, " + Show.mm(thick));
    }
    FabRules rules =
        new FabRules(
            title,
            layers,
            stackups,
            thin,
            thick,
            top.length("size", Limits.DIAMETER).required(),
            CopperRows.read(top, layers),
            hole(top.group("hole")),
            ring(top.group("ring")),
            edge(top.group("edge")),
            mask(top.group("mask")),
            legend(top.group("legend")),
            tolerance(top.group("tolerance")));
    top.close();
    return rules;
  }

  private static double rule(Section s, String key) {
    return s.length(key, Limits.RULE).required();
  }

  private static List<Stackup> stackups(Section top, List<Integer> layers) {
    List<Stackup> all = new ArrayList<>();
    for (Section s : top.groups("stackups")) {
      int n = s.count("layers", Limits.LAYERS_MIN, Limits.LAYERS_MAX, true).required();
      double thickness = s.length("thickness", Limits.BOARD_THICKNESS).required();
      s.missing("dielectrics", "a list of lengths from L1 down");
      List<Double> dielectrics = s.numbers("dielectrics", Dimension.LENGTH, Limits.DIELECTRIC);
      s.close();
      Stackup stackup = new Stackup(n, thickness, dielectrics);
      checkStackup(s, stackup, layers);
      all.add(stackup);
    }
    return all;
  }

  private static void checkStackup(Section s, Stackup stackup, List<Integer> layers) {
    int n = stackup.layers();
    if (n == CountField.FAULTY) {
      return;
    }
    if (!layers.isEmpty() && !layers.contains(n)) {
      s.error(Codes.FAB, "layers", n + " layers are not among the counts that the fab builds");
    }
    List<Double> dielectrics = stackup.dielectricsMm();
    if (s.has("dielectrics") && dielectrics.size() != n - 1) {
      s.error(
          Codes.STACKUP,
          "dielectrics",
          n
              + " layers have "
              + (n - 1)
              + " dielectrics between them; the list has "
              + dielectrics.size());
      return;
    }
    StackupSum sum =
        StackupSum.of(dielectrics, n * Constants.NOMINAL_OUNCE_MM, stackup.thicknessMm());
    if (!sum.fits()) {
      s.error(Codes.STACKUP, "dielectrics", sum.message("thickness"));
    }
  }

  private static Hole hole(Section s) {
    Hole hole =
        new Hole(
            s.length("min", Limits.HOLE).required(),
            s.bare("aspect", Limits.ASPECT).required(),
            rule(s, "gap"),
            rule(s, "copper-gap"),
            s.length("plating", Limits.PLATING).required());
    s.close();
    return hole;
  }

  private static Ring ring(Section s) {
    Ring ring = new Ring(rule(s, "via"), rule(s, "terminal"));
    s.close();
    return ring;
  }

  private static Edge edge(Section s) {
    Edge edge = new Edge(rule(s, "copper"), rule(s, "hole"));
    s.close();
    return edge;
  }

  private static Mask mask(Section s) {
    Mask mask = new Mask(rule(s, "expansion"), rule(s, "web"));
    s.close();
    return mask;
  }

  private static Legend legend(Section s) {
    Legend legend =
        new Legend(
            s.length("line", Limits.COPPER_SIZE).required(),
            s.length("height", Limits.PAD).required(),
            rule(s, "gap"));
    s.close();
    return legend;
  }

  private static Tolerance tolerance(Section s) {
    Tolerance tolerance = new Tolerance(share(s, "track"), share(s, "copper"), share(s, "plating"));
    s.close();
    return tolerance;
  }

  private static double share(Section s, String key) {
    return s.number(key, Dimension.RATIO, Limits.TOLERANCE).required();
  }
}
