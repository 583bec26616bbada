package etchloom.spec;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** A fab's rules as read. Lengths in mm, ratios as plain numbers. */
public record FabRules(
    String title,
    List<Integer> layers,
    List<Stackup> stackups,
    double thicknessMinMm,
    double thicknessMaxMm,
    double sizeMm,
    List<CopperRow> copper,
    Hole hole,
    Ring ring,
    Edge edge,
    Mask mask,
    Legend legend,
    Tolerance tolerance) {
  public FabRules {
    layers = List.copyOf(layers);
    stackups = List.copyOf(stackups);
    copper = List.copyOf(copper);
  }

  /** A standard build: dielectrics from L1 down. */
  public record Stackup(int layers, double thicknessMm, List<Double> dielectricsMm) {
    public Stackup {
      dielectricsMm = List.copyOf(dielectricsMm);
    }
  }

  /**
   * What the fab can etch in one copper weight.
   *
   * @param outer whether the row is for outer layers
   * @param thicknessMm finished copper as delivered
   * @param etchFactor thickness over the undercut of one side; absent: straight walls
   */
  public record CopperRow(
      double ounces,
      boolean outer,
      double thicknessMm,
      double trackMm,
      double spaceMm,
      OptionalDouble etchFactor) {}

  public record Hole(
      double minMm, double aspect, double gapMm, double copperGapMm, double platingMm) {}

  public record Ring(double viaMm, double terminalMm) {}

  public record Edge(double copperMm, double holeMm) {}

  public record Mask(double expansionMm, double webMm) {}

  public record Legend(double lineMm, double heightMm, double gapMm) {}

  public record Tolerance(double track, double copper, double plating) {}

  /** A thickness counts as a row's when it is within this share of the row's finished copper. */
  public static final double THICKNESS_MATCH = 0.15;

  /**
   * The row that stands for a copper spec: by weight, or the nearest finished thickness within
   * {@link #THICKNESS_MATCH}.
   */
  public Optional<CopperRow> row(Spec.Copper wanted, boolean outer) {
    CopperRow best = null;
    double bestOff = Double.POSITIVE_INFINITY;
    for (CopperRow row : copper) {
      if (row.outer() != outer) {
        continue;
      }
      double off;
      if (wanted.ounces().isPresent()) {
        off = Math.abs(row.ounces() - wanted.ounces().getAsDouble());
        if (off > 1e-9) {
          continue;
        }
      } else {
        off = Math.abs(wanted.thicknessMm().orElseThrow() / row.thicknessMm() - 1);
        if (off > THICKNESS_MATCH) {
          continue;
        }
      }
      if (off < bestOff) {
        best = row;
        bestOff = off;
      }
    }
    return Optional.ofNullable(best);
  }

  /** Finished thickness, mm: the spec's own where it is given as a length, else the row's. */
  public static double finishedMm(Spec.Copper wanted, CopperRow row) {
    return wanted.thicknessMm().orElse(row.thicknessMm());
  }
}
