package etchloom.cli;

import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import etchloom.survey.Span;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Optional;

/** Ranges to seek in where none are named: the coil's track, space and radii. */
final class UsualSpans {
  private UsualSpans() {}

  /** From the fab's least track and space up to a few times the spec's own; radii round theirs. */
  static List<Span> of(InputFiles.Inputs in) {
    Spec.Coil coil = in.file().spec().coil();
    Optional<FabRules.CopperRow> row = in.fab().row(in.file().spec().board().outerCopper(), true);
    double track = row.map(FabRules.CopperRow::trackMm).orElse(coil.trackMm() / 2);
    double space = row.map(FabRules.CopperRow::spaceMm).orElse(coil.spaceMm() / 2);
    double edge = in.file().spec().board().diameterMm() / 2;
    return List.of(
        span("coil.track", track, 5 * Math.max(track, coil.trackMm())),
        span("coil.space", space, 3 * Math.max(space, coil.spaceMm())),
        span("coil.inner-radius", 0.5 * coil.innerRadiusMm(), 1.4 * coil.innerRadiusMm()),
        span(
            "coil.outer-radius",
            0.8 * coil.outerRadiusMm(),
            Math.min(edge, 1.2 * coil.outerRadiusMm())));
  }

  private static Span span(String key, double low, double high) {
    return new Span(key, mm(low), mm(high), "mm", false);
  }

  private static BigDecimal mm(double mm) {
    return new BigDecimal(mm).setScale(4, RoundingMode.HALF_EVEN).stripTrailingZeros();
  }
}
