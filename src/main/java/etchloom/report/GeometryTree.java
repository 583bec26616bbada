package etchloom.report;

import etchloom.electric.resistance.ResistanceFigures;
import etchloom.spec.Spec;
import java.util.ArrayList;
import java.util.List;

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
        .put("boardDiameterMm", spec.board().diameterMm());
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
                    .put("lengthMm", c.lengthMm())
                    .put("ohm", c.ohm()))
        .toList();
  }

  private static List<JsonTree> copperLayers(Results r) {
    List<Double> areas = CopperArea.of(r.artwork(), r.rules());
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
