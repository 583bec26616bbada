package etchloom.geometry;

/** Splitting an index by a key at a given rank, in linear time on the average. */
final class Selection {
  private Selection() {}

  /**
   * Reorders {@code order[from..to)} so that the entries before {@code mid} have no greater key
   * than those from {@code mid} on; equal keys are told apart by the index, so that the halves do
   * not depend on the order found.
   */
  static void split(int[] order, double[] key, int from, int to, int mid) {
    int lo = from;
    int hi = to - 1;
    while (lo < hi) {
      int pivot = medianOfThree(order, key, lo, hi);
      int i = lo;
      int j = hi;
      while (i <= j) {
        while (before(key, order[i], pivot)) {
          i++;
        }
        while (before(key, pivot, order[j])) {
          j--;
        }
        if (i <= j) {
          int t = order[i];
          order[i++] = order[j];
          order[j--] = t;
        }
      }
      if (mid <= j) {
        hi = j;
      } else if (mid >= i) {
        lo = i;
      } else {
        return;
      }
    }
  }

  private static boolean before(double[] key, int a, int b) {
    return key[a] < key[b] || (key[a] == key[b] && a < b);
  }

  private static int medianOfThree(int[] order, double[] key, int lo, int hi) {
    int a = order[lo];
    int b = order[(lo + hi) >>> 1];
    int c = order[hi];
    if (before(key, a, b)) {
      if (before(key, b, c)) {
        return b;
      }
      return before(key, a, c) ? c : a;
    }
    if (before(key, a, c)) {
      return a;
    }
    return before(key, b, c) ? c : b;
  }
}
