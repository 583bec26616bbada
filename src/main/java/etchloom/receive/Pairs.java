package etchloom.receive;

import etchloom.electric.resistance.Network;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The pairs of a board's terminals, numbered in the order of the marks. */
final class Pairs {
  private final List<String> marks;
  private final Map<String, Integer> number = new LinkedHashMap<>();
  private final List<int[]> ends = new ArrayList<>();

  Pairs(List<String> marks) {
    this.marks = List.copyOf(marks);
    for (int i = 0; i < marks.size(); i++) {
      for (int j = i + 1; j < marks.size(); j++) {
        number.put(key(marks.get(i), marks.get(j)), ends.size());
        number.put(key(marks.get(j), marks.get(i)), ends.size());
        ends.add(new int[] {i, j});
      }
    }
  }

  int size() {
    return ends.size();
  }

  int terminals() {
    return marks.size();
  }

  /** The pair's number, whichever end is named first. */
  int of(String from, String to) {
    return number.get(key(from, to));
  }

  /** {@code U1-V1}. */
  String key(int pair) {
    return key(marks.get(ends.get(pair)[0]), marks.get(ends.get(pair)[1]));
  }

  /** Whether one end is a star point. */
  boolean star(int pair) {
    return marks.get(ends.get(pair)[0]).endsWith("N") || marks.get(ends.get(pair)[1]).endsWith("N");
  }

  private static String key(String from, String to) {
    return from + "-" + to;
  }

  /** Every pair's resistance, infinite where nothing joins it. */
  double[] ohms(Network network) {
    double[] out = new double[size()];
    for (int p = 0; p < out.length; p++) {
      String from = marks.get(ends.get(p)[0]);
      String to = marks.get(ends.get(p)[1]);
      out[p] = network.terminalOhm(from, to).orElse(Double.POSITIVE_INFINITY);
    }
    return out;
  }

  /** What the pairs show when two terminals have changed places. */
  double[] swapped(double[] ohms, int a, int b) {
    double[] out = new double[size()];
    for (int p = 0; p < out.length; p++) {
      String from = marks.get(moved(ends.get(p)[0], a, b));
      String to = marks.get(moved(ends.get(p)[1], a, b));
      out[p] = ohms[of(from, to)];
    }
    return out;
  }

  private static int moved(int terminal, int a, int b) {
    return terminal == a ? b : terminal == b ? a : terminal;
  }

  String mark(int terminal) {
    return marks.get(terminal);
  }
}
