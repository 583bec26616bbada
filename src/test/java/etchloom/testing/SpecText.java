package etchloom.testing;

import java.util.List;
import java.util.Locale;
import java.util.Random;

/** A spec's text, written line by line from seeded random numbers. */
abstract class SpecText {
  final Random random;
  private final StringBuilder out = new StringBuilder();

  SpecText(long seed) {
    random = new Random(seed);
  }

  final String text() {
    return out.toString();
  }

  final void line(String text) {
    out.append(text).append('\n');
  }

  final <T> T pick(List<T> some) {
    return some.get(random.nextInt(some.size()));
  }

  final double between(double low, double high) {
    return low + (high - low) * random.nextDouble();
  }

  static String mm(double value) {
    return String.format(Locale.ROOT, "%.3f mm", value);
  }
}
