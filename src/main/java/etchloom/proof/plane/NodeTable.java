package etchloom.proof.plane;

import java.util.Arrays;

/** Numbers points of the grid in the order in which they are first asked for. */
final class NodeTable {
  private int size;
  private int[] x = new int[64];
  private int[] y = new int[64];
  private int[] slots;

  NodeTable(int expected) {
    slots = new int[Integer.highestOneBit(Math.max(16, expected)) * 4];
  }

  int size() {
    return size;
  }

  int[] x() {
    return Arrays.copyOf(x, size);
  }

  int[] y() {
    return Arrays.copyOf(y, size);
  }

  /** The number of a point, or -1 when it has none. */
  int find(int px, int py) {
    int k = hash(px, py) & (slots.length - 1);
    while (slots[k] != 0) {
      int id = slots[k] - 1;
      if (x[id] == px && y[id] == py) {
        return id;
      }
      k = (k + 1) & (slots.length - 1);
    }
    return -1;
  }

  int id(int px, int py) {
    int k = hash(px, py) & (slots.length - 1);
    while (slots[k] != 0) {
      int id = slots[k] - 1;
      if (x[id] == px && y[id] == py) {
        return id;
      }
      k = (k + 1) & (slots.length - 1);
    }
    if (size == x.length) {
      x = Arrays.copyOf(x, size * 2);
      y = Arrays.copyOf(y, size * 2);
    }
    x[size] = px;
    y[size] = py;
    slots[k] = ++size;
    if (size * 2 > slots.length) {
      enlarge();
    }
    return size - 1;
  }

  private void enlarge() {
    slots = new int[slots.length * 2];
    for (int i = 0; i < size; i++) {
      int k = hash(x[i], y[i]) & (slots.length - 1);
      while (slots[k] != 0) {
        k = (k + 1) & (slots.length - 1);
      }
      slots[k] = i + 1;
    }
  }

  static int hash(int a, int b) {
    long h = a * 0x9E3779B97F4A7C15L + b * 0xC2B2AE3D27D4EB4FL;
    h ^= h >>> 29;
    h *= 0xBF58476D1CE4E5B9L;
    return (int) (h >>> 32);
  }
}
