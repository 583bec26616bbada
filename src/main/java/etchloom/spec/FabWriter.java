package etchloom.spec;

import etchloom.spec.FabRules.CopperRow;
import etchloom.spec.yaml.YamlText;
import etchloom.units.Dimension;
import etchloom.units.QuantityText;

/** Writes a fab's rules as a file. */
public final class FabWriter {
  private FabWriter() {}

  /**
   * The file's text, with the same promises as {@link SpecWriter#toYaml}.
   *
   * @throws IllegalArgumentException if a number is not finite
   */
  public static String toYaml(FabRules rules) {
    YamlText y = new YamlText().comment("The fab's rules as used.");
    y.value(FabReader.VERSION_KEY, FormatVersion.KNOWN).text("title", rules.title());
    y.list("layers", rules.layers().stream().map(n -> Integer.toString(n)).toList());
    if (!rules.stackups().isEmpty()) {
      y.groups("stackups", rules.stackups(), FabWriter::stackup);
    }
    y.group("thickness", g -> mm(g, "min", rules.thicknessMinMm(), "max", rules.thicknessMaxMm()));
    SpecWriter.mm(y, "size", rules.sizeMm());
    y.groups("copper", rules.copper(), FabWriter::row);
    y.group("hole", g -> hole(g, rules.hole()));
    y.group("ring", g -> mm(g, "via", rules.ring().viaMm(), "terminal", rules.ring().terminalMm()));
    y.group("edge", g -> mm(g, "copper", rules.edge().copperMm(), "hole", rules.edge().holeMm()));
    y.group(
        "mask", g -> mm(g, "expansion", rules.mask().expansionMm(), "web", rules.mask().webMm()));
    y.group("legend", g -> legend(g, rules.legend()));
    y.group("tolerance", g -> tolerance(g, rules.tolerance()));
    return y.toString();
  }

  private static void stackup(YamlText y, FabRules.Stackup s) {
    y.value("layers", Integer.toString(s.layers()));
    SpecWriter.mm(y, "thickness", s.thicknessMm());
    y.list("dielectrics", SpecWriter.lengths(s.dielectricsMm().stream()));
  }

  private static void row(YamlText y, CopperRow row) {
    SpecWriter.quantity(y, "weight", row.ounces(), Dimension.COPPER_WEIGHT, "oz");
    y.value("on", Words.wordFor(CopperRows.SIDES, row.outer()));
    SpecWriter.quantity(y, "thickness", row.thicknessMm(), Dimension.LENGTH, "um");
    mm(y, "track", row.trackMm(), "space", row.spaceMm());
    row.etchFactor().ifPresent(f -> y.value("etch-factor", QuantityText.bare(f)));
  }

  private static void hole(YamlText y, FabRules.Hole h) {
    SpecWriter.mm(y, "min", h.minMm());
    y.value("aspect", QuantityText.bare(h.aspect()));
    mm(y, "gap", h.gapMm(), "copper-gap", h.copperGapMm());
    SpecWriter.quantity(y, "plating", h.platingMm(), Dimension.LENGTH, "um");
  }

  private static void legend(YamlText y, FabRules.Legend l) {
    mm(y, "line", l.lineMm(), "height", l.heightMm());
    SpecWriter.mm(y, "gap", l.gapMm());
  }

  private static void tolerance(YamlText y, FabRules.Tolerance t) {
    SpecWriter.quantity(y, "track", t.track(), Dimension.RATIO, "%");
    SpecWriter.quantity(y, "copper", t.copper(), Dimension.RATIO, "%");
    SpecWriter.quantity(y, "plating", t.plating(), Dimension.RATIO, "%");
  }

  private static void mm(YamlText y, String first, double a, String second, double b) {
    SpecWriter.mm(y, first, a);
    SpecWriter.mm(y, second, b);
  }
}
