package etchloom.proof.plane;

import java.util.Arrays;

/** The circles that flattened edges stand for, nm. */
final class CircleTable {
  private int size;
  private double[] cx = new double[16];
  private double[] cy = new double[16];
  private double[] radius = new double[16];

  int add(double x, double y, double r) {
    if (size == cx.length) {
      cx = Arrays.copyOf(cx, size * 2);
      cy = Arrays.copyOf(cy, size * 2);
      radius = Arrays.copyOf(radius, size * 2);
    }
    cx[size] = x;
    cy[size] = y;
    radius[size] = r;
    return size++;
  }

  /** Appends all of another table, moved; returns what to add to its indices. */
  int addAll(CircleTable o, double dx, double dy) {
    int shift = size;
    for (int i = 0; i < o.size; i++) {
      add(o.cx[i] + dx, o.cy[i] + dy, o.radius[i]);
    }
    return shift;
  }

  double cx(int i) {
    return cx[i];
  }

  double cy(int i) {
    return cy[i];
  }

  double radius(int i) {
    return radius[i];
  }
}
