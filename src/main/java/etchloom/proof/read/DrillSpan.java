package etchloom.proof.read;

import etchloom.proof.image.Plating;
import java.util.List;
import java.util.Map;

/** What the file function of a drill file says: {@code Plated,1,4,PTH}. */
record DrillSpan(Plating plating, int fromLayer, int toLayer) {
  static DrillSpan of(Map<String, List<String>> fileAttributes) {
    List<String> f = fileAttributes.getOrDefault(".FileFunction", List.of());
    Plating plating = f.isEmpty() ? Plating.UNKNOWN : DrillTool.plating(f.get(0));
    return plating == Plating.UNKNOWN
        ? new DrillSpan(plating, 0, 0)
        : new DrillSpan(plating, layer(f, 1), layer(f, 2));
  }

  private static int layer(List<String> fields, int index) {
    String s = index < fields.size() ? fields.get(index) : "";
    boolean number = !s.isEmpty() && s.length() < 4 && s.chars().allMatch(Decimals::digit);
    return number ? Integer.parseInt(s) : 0;
  }
}
