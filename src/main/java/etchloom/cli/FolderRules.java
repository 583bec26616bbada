package etchloom.cli;

import etchloom.proof.FolderCheck;
import etchloom.proof.ohm.CopperBuild;
import etchloom.proof.ohm.FileResistance;
import etchloom.proof.rules.CopperFinding;
import etchloom.proof.rules.CopperLimits;
import etchloom.proof.rules.CopperRuleReport;
import etchloom.rules.Finding;
import etchloom.rules.RuleReport;
import etchloom.spec.FabRules;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;

/** A fab's rules as a folder of files can be held against them, and what that found. */
final class FolderRules {
  /** What is most often ordered; taken where the files do not tell the copper. */
  private static final double USUAL_COPPER_MM = 0.035;

  private FolderRules() {}

  /**
   * @param copperMm finished copper of each layer from L1 down, where the files tell
   */
  static FolderCheck.Shop shop(FabRules fab, int layers, List<OptionalDouble> copperMm) {
    List<CopperLimits.Layer> out = new ArrayList<>();
    List<CopperBuild.Layer> copper = new ArrayList<>();
    for (int l = 1; l <= layers; l++) {
      double thickness = copperMm.get(l - 1).orElse(USUAL_COPPER_MM);
      FabRules.CopperRow row = row(fab, l == 1 || l == layers, thickness);
      out.add(new CopperLimits.Layer(row.trackMm(), row.spaceMm()));
      double undercut =
          row.etchFactor().isPresent() ? thickness / row.etchFactor().getAsDouble() : 0;
      copper.add(new CopperBuild.Layer(thickness, undercut));
    }
    return new FolderCheck.Shop(limits(fab, out), copper, fab.hole().platingMm());
  }

  private static CopperLimits limits(FabRules fab, List<CopperLimits.Layer> out) {
    return new CopperLimits(
        out,
        fab.ring().viaMm(),
        fab.ring().terminalMm(),
        fab.hole().minMm(),
        fab.hole().aspect(),
        fab.hole().gapMm(),
        fab.hole().copperGapMm(),
        fab.edge().copperMm(),
        fab.edge().holeMm(),
        fab.mask().webMm(),
        fab.sizeMm(),
        fab.layers());
  }

  /** The fab's row of the nearest thickness; a fab has rows for outer layers at least. */
  private static FabRules.CopperRow row(FabRules fab, boolean outer, double thicknessMm) {
    Comparator<FabRules.CopperRow> nearest =
        Comparator.comparingDouble(r -> Math.abs(r.thicknessMm() - thicknessMm));
    return fab.copper().stream()
        .filter(r -> r.outer() == outer)
        .min(nearest)
        .or(() -> fab.copper().stream().min(nearest))
        .orElseThrow();
  }

  /** {@code U1-V1 43.94 ohm}, one a pair; with the error where there is one. */
  static List<String> words(FileResistance.Ohms ohms) {
    String error =
        ohms.error() > 0 ? " (within " + Numbers.trimmed(100 * ohms.error(), 2) + " %)" : "";
    return ohms.pairs().stream()
        .map(p -> p.from() + "-" + p.to() + " " + Numbers.engineering(p.ohm(), "ohm", 4) + error)
        .toList();
  }

  static RuleReport report(CopperRuleReport r) {
    return new RuleReport(
        r.minima().stream().map(FolderRules::finding).toList(),
        r.findings().stream().map(FolderRules::finding).toList(),
        r.notes());
  }

  private static Finding finding(CopperFinding f) {
    return new Finding(f.rule(), f.layer(), f.at(), f.measured(), f.required(), f.unit(), f.what());
  }
}
