package etchloom.board;

import etchloom.artwork.Stackup;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** The board's build: the spec's dielectrics, else the fab's, else equal ones. */
final class StackupBuilder {
  /** A fab's standard build stands for a board thickness within this, mm. */
  private static final double SAME_THICKNESS_MM = 0.051;

  /** The dielectrics' sum may be this far from what the thickness leaves, as a share of it. */
  private static final double FIT = 0.15;

  private StackupBuilder() {}

  static Stackup build(Spec spec, FabRules fab, Problems problems) {
    Spec.Board b = spec.board();
    int n = b.layers();
    List<Stackup.Copper> copper = new ArrayList<>();
    double sum = 0;
    Stackup.Copper outer = copper(spec, fab, true, problems);
    // Said once, however many inner layers there are.
    Stackup.Copper inner = n > 2 ? copper(spec, fab, false, problems) : outer;
    for (int layer = 1; layer <= n; layer++) {
      Stackup.Copper c = layer == 1 || layer == n ? outer : inner;
      copper.add(c);
      sum += c.thicknessMm();
    }
    List<Double> dielectrics = dielectrics(b, fab, sum, problems);
    return new Stackup(copper, dielectrics, fab.hole().platingMm());
  }

  private static Stackup.Copper copper(Spec spec, FabRules fab, boolean outer, Problems problems) {
    Spec.Copper wanted = outer ? spec.board().outerCopper() : spec.board().innerCopper();
    var row = fab.row(wanted, outer);
    if (row.isEmpty()) {
      problems.add(
          "copper-weight",
          "board.copper",
          String.format(
              Locale.ROOT,
              "the fab class '%s' has no %s copper of %s; it offers %s",
              fab.title(),
              outer ? "outer" : "inner",
              wanted.ounces().isPresent()
                  ? ounces(wanted.ounces().getAsDouble())
                  : Numbers.trimmed(wanted.thicknessMm().orElse(0), 4) + " mm",
              offers(fab, outer)));
      return new Stackup.Copper(0.035, 1, 0);
    }
    FabRules.CopperRow r = row.get();
    double t = FabRules.finishedMm(wanted, r);
    double undercut = r.etchFactor().isPresent() ? t / r.etchFactor().getAsDouble() : 0;
    return new Stackup.Copper(t, r.ounces(), undercut);
  }

  private static String ounces(double oz) {
    return Numbers.trimmed(oz, 3) + " oz";
  }

  private static String offers(FabRules fab, boolean outer) {
    List<String> out = new ArrayList<>();
    for (FabRules.CopperRow r : fab.copper()) {
      if (r.outer() == outer) {
        out.add(ounces(r.ounces()));
      }
    }
    return out.isEmpty() ? "none" : String.join(", ", out);
  }

  private static List<Double> dielectrics(
      Spec.Board b, FabRules fab, double copperMm, Problems problems) {
    double rest = b.thicknessMm() - copperMm;
    int gaps = b.layers() - 1;
    if (!(rest > 0)) {
      problems.add(
          "stackup",
          "board.thickness",
          String.format(
              Locale.ROOT,
              "%d copper layers are %.3f mm thick together, which leaves nothing of %.3f mm",
              b.layers(),
              copperMm,
              b.thicknessMm()));
      rest = 0.1 * gaps;
    }
    double room = rest;
    List<Double> given = b.stackupMm();
    if (given.isEmpty()) {
      given =
          fab.stackups().stream()
              .filter(s -> s.layers() == b.layers())
              .filter(s -> Math.abs(s.thicknessMm() - b.thicknessMm()) < SAME_THICKNESS_MM)
              .map(FabRules.Stackup::dielectricsMm)
              .filter(d -> fits(d, room)) // made for lighter copper: not this board's
              .findFirst()
              .orElse(List.of());
    }
    if (given.isEmpty()) {
      List<Double> equal = new ArrayList<>();
      for (int i = 0; i < gaps; i++) {
        equal.add(rest / gaps);
      }
      return equal;
    }
    return fitted(given, rest, problems);
  }

  private static boolean fits(List<Double> given, double rest) {
    double sum = given.stream().mapToDouble(Double::doubleValue).sum();
    return Math.abs(rest - sum) <= FIT * rest;
  }

  /** The thickest dielectrics take up what is left over, so that all adds up to the thickness. */
  private static List<Double> fitted(List<Double> given, double rest, Problems problems) {
    double sum = given.stream().mapToDouble(Double::doubleValue).sum();
    double over = rest - sum;
    if (!fits(given, rest)) {
      problems.add(
          "stackup",
          "board.stackup",
          String.format(
              Locale.ROOT,
              "the dielectrics add up to %.3f mm, board.thickness less the copper leaves %.3f mm",
              sum,
              rest));
      return given;
    }
    double thickest = given.stream().mapToDouble(Double::doubleValue).max().orElse(0);
    long sharers = given.stream().filter(d -> d == thickest).count();
    return given.stream().map(d -> d == thickest ? d + over / sharers : d).toList();
  }
}
