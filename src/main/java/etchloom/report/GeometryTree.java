package etchloom.report;

import etchloom.artwork.Stackup;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.spec.Spec;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** {@code geometry} of the report. */
final class GeometryTree {
  private GeometryTree() {}

  static JsonTree of(Results r) {
    Spec spec = r.spec();
    return new JsonTree()
        .put("turnsPerLayer", r.artwork().turnsPerLayer())
        .put("layers", r.artwork().layers())
        .put("trackMm", spec.coil().trackMm())
        .put("spaceMm", spec.coil().spaceMm())
        .putObjects("coilLayers", coilLayers(r.resistance()))
        .putObjects("copperLayers", copperLayers(r))
        .putObjects("coils", coils(r))
        .put("vias", r.vias())
        .put("boardDiameterMm", spec.board().diameterMm())
        .put("boreMm", spec.board().boreMm())
        .put("thicknessMm", spec.board().thicknessMm())
        .put("coilInnerRadiusMm", spec.coil().innerRadiusMm())
        .put("coilOuterRadiusMm", spec.coil().outerRadiusMm())
        .put("tabWidthMm", tab(spec, Spec.Tab::widthMm))
        .put("tabLengthMm", tab(spec, Spec.Tab::lengthMm))
        .putObjects("stack", stack(r.artwork().stackup()));
  }

  private static Optional<Double> tab(Spec spec, Function<Spec.Tab, Double> size) {
    return spec.board().tab().map(size);
  }

  /** From L1 down; {@code dielectricMm} lies below the layer. */
  private static List<JsonTree> stack(Stackup s) {
    List<JsonTree> out = new ArrayList<>();
    for (int i = 0; i < s.layers(); i++) {
      JsonTree layer =
          new JsonTree()
              .put("layer", "L" + (i + 1))
              .put("copperMm", s.copper().get(i).thicknessMm())
              .put("ounces", s.copper().get(i).ounces());
      out.add(i < s.layers() - 1 ? layer.put("dielectricMm", s.dielectricMm().get(i)) : layer);
    }
    return out;
  }

  private static List<JsonTree> coilLayers(ResistanceFigures f) {
    return f.coilLayers().stream()
        .map(
            c ->
                new JsonTree()
                    .put("layer", "L" + c.layer())
                    .put("lengthMm", c.lengthMm())
                    .put("ohm", c.ohm()))
        .toList();
  }

  private static List<JsonTree> coils(Results r) {
    return r.resistance().coils().stream()
        .map(
            c ->
                new JsonTree()
                    .put("coil", c.number())
                    .put("axisDegrees", axisDegrees(r, c.number()))
                    .put("lengthMm", c.lengthMm())
                    .put("ohm", c.ohm()))
        .toList();
  }

  private static double axisDegrees(Results r, int coil) {
    return Math.toDegrees(r.artwork().coils().get(coil - 1).axisRad());
  }

  private static List<JsonTree> copperLayers(Results r) {
    List<Double> areas = r.copperAreaMm2();
    List<JsonTree> out = new ArrayList<>();
    for (ResistanceFigures.CopperLayer c : r.resistance().copperLayers()) {
      out.add(
          new JsonTree()
              .put("layer", "L" + c.layer())
              .put("areaMm2", areas.get(c.layer() - 1))
              .put("trackLengthMm", c.trackLengthMm()));
    }
    return out;
  }
}
