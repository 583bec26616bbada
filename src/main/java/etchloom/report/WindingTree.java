package etchloom.report;

import etchloom.spec.Spec;
import etchloom.winding.Winding;
import java.util.Locale;

/** {@code winding} of the report. */
final class WindingTree {
  private WindingTree() {}

  static JsonTree of(Results r) {
    Winding w = r.winding();
    Spec.Winding s = r.spec().winding();
    JsonTree axis = new JsonTree();
    for (int p = 0; p < w.phases(); p++) {
      axis.put(w.marks().get(p), Math.toDegrees(w.axisRad().get(p)));
    }
    return new JsonTree()
        .put("phases", w.phases())
        .put("coils", w.coils())
        .put("poles", w.poles())
        .put("connection", word(s.connection()))
        .put("parallelPaths", s.parallelPaths())
        .put("windingFactor", w.windingFactor())
        .put("distributionFactor", w.distributionFactor())
        .putObjects(
            "sequence",
            w.sequence().stream()
                .map(
                    c ->
                        new JsonTree()
                            .put("coil", c.coil())
                            .put("phase", w.marks().get(c.phase()))
                            .put("sign", c.sign()))
                .toList())
        .put("axisDegrees", axis);
  }

  static String word(Spec.Connection c) {
    return c.name().toLowerCase(Locale.ROOT);
  }
}
