package etchloom.survey;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** All spans of a search as a cube with sides from 0 to 1. */
record Space(List<Span> spans) {
  Space {
    spans = List.copyOf(spans);
  }

  int size() {
    return spans.size();
  }

  /** The keys' values at a point. */
  Map<String, String> values(double[] point) {
    Map<String, String> out = new LinkedHashMap<>();
    for (int i = 0; i < point.length; i++) {
      out.put(spans.get(i).key(), spans.get(i).value(point[i]));
    }
    return out;
  }

  /** Distance of two points over the longest there is. */
  double distance(double[] a, double[] b) {
    double squares = 0;
    for (int i = 0; i < a.length; i++) {
      squares += (a[i] - b[i]) * (a[i] - b[i]);
    }
    return Math.sqrt(squares / a.length);
  }
}
