package etchloom.electric.inductance;

import java.util.Arrays;

/**
 * Straight pieces of conductor in planes along the board, each with a cross-section and a current;
 * the current's direction is the piece's. Lengths in mm.
 */
final class Filaments {
  private static final int VALUES = 6;

  /** Middle, direction, length and current of each, one after the other. */
  private double[] value = new double[64 * VALUES];

  private int[] section = new int[64];
  private int size;

  /** A piece from one point to another; one of no length is left out. */
  void add(double x0, double y0, double x1, double y1, int crossSection, double ampere) {
    double length = Math.hypot(x1 - x0, y1 - y0);
    if (length > 0) {
      put(
          (x0 + x1) / 2,
          (y0 + y1) / 2,
          (x1 - x0) / length,
          (y1 - y0) / length,
          length,
          crossSection,
          ampere);
    }
  }

  private void put(
      double x, double y, double ux, double uy, double length, int crossSection, double ampere) {
    if (size == section.length) {
      section = Arrays.copyOf(section, 2 * size);
      value = Arrays.copyOf(value, 2 * size * VALUES);
    }
    int at = size * VALUES;
    value[at] = x;
    value[at + 1] = y;
    value[at + 2] = ux;
    value[at + 3] = uy;
    value[at + 4] = length;
    value[at + 5] = ampere;
    section[size++] = crossSection;
  }

  /** All pieces of others, turned counter-clockwise about the shaft, the current times a factor. */
  void addTurned(Filaments others, double rad, double factor) {
    double c = Math.cos(rad);
    double s = Math.sin(rad);
    for (int i = 0; i < others.size; i++) {
      double x = others.x(i);
      double y = others.y(i);
      double ux = others.ux(i);
      double uy = others.uy(i);
      put(
          c * x - s * y,
          s * x + c * y,
          c * ux - s * uy,
          s * ux + c * uy,
          others.length(i),
          others.section(i),
          factor * others.ampere(i));
    }
  }

  int size() {
    return size;
  }

  double x(int i) {
    return value[i * VALUES];
  }

  double y(int i) {
    return value[i * VALUES + 1];
  }

  double ux(int i) {
    return value[i * VALUES + 2];
  }

  double uy(int i) {
    return value[i * VALUES + 3];
  }

  double length(int i) {
    return value[i * VALUES + 4];
  }

  double ampere(int i) {
    return value[i * VALUES + 5];
  }

  int section(int i) {
    return section[i];
  }
}
