package etchloom.electric.inductance;

import java.util.Arrays;
import java.util.List;

/**
 * Sorts filaments into a binary tree: each lot is cut across the longest side of the box that holds
 * it, in the middle, until few are left in each. Parents stand before their children.
 */
final class Halving {
  private final Filaments filaments;
  private final List<CrossSection> sections;

  /** For each place in the new order, the filament that stands there. */
  final int[] order;

  /** Each lot's range in that order. */
  int[] from = new int[64];

  int[] to = new int[64];

  /** Each lot's first child, the second follows it; 0 for a leaf. */
  int[] child = new int[64];

  int count;

  /**
   * @param leaf most filaments of a lot that is not cut
   */
  Halving(Filaments filaments, List<CrossSection> sections, int leaf) {
    this.filaments = filaments;
    this.sections = sections;
    order = new int[filaments.size()];
    for (int i = 0; i < order.length; i++) {
      order[i] = i;
    }
    add(0, order.length);
    for (int lot = 0; lot < count; lot++) {
      if (to[lot] - from[lot] > leaf) {
        int middle = cut(lot);
        child[lot] = add(from[lot], middle);
        add(middle, to[lot]);
      }
    }
  }

  private int add(int first, int last) {
    if (count == from.length) {
      from = Arrays.copyOf(from, 2 * count);
      to = Arrays.copyOf(to, 2 * count);
      child = Arrays.copyOf(child, 2 * count);
    }
    from[count] = first;
    to[count] = last;
    return count++;
  }

  private int cut(int lot) {
    int axis = 0;
    double longest = -1;
    double middle = 0;
    for (int k = 0; k < 3; k++) {
      double least = Double.POSITIVE_INFINITY;
      double most = Double.NEGATIVE_INFINITY;
      for (int i = from[lot]; i < to[lot]; i++) {
        double at = place(order[i], k);
        least = Math.min(least, at);
        most = Math.max(most, at);
      }
      if (most - least > longest) {
        longest = most - least;
        middle = (least + most) / 2;
        axis = k;
      }
    }
    int at = part(from[lot], to[lot], axis, middle);
    // Filaments all in one place cannot be told apart: halve them by count.
    return at == from[lot] || at == to[lot] ? (from[lot] + to[lot]) / 2 : at;
  }

  private double place(int i, int axis) {
    return axis == 0
        ? filaments.x(i)
        : axis == 1 ? filaments.y(i) : sections.get(filaments.section(i)).heightMm();
  }

  /** Puts those below the cut first; gives where the others begin. */
  private int part(int first, int last, int axis, double cut) {
    int low = first;
    int high = last - 1;
    while (low <= high) {
      if (place(order[low], axis) < cut) {
        low++;
      } else {
        int swap = order[low];
        order[low] = order[high];
        order[high--] = swap;
      }
    }
    return low;
  }
}
