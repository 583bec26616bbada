package etchloom.proof.read;

import java.util.Arrays;

/** A line of an NC program cut into words: a letter and the number that follows it. */
final class NcWords {
  private byte[] bytes = new byte[0];
  private int[] letters = new int[16];
  private int[] from = new int[16];
  private int[] to = new int[16];
  private int count;

  /** Cuts {@code b[start .. end)}; false when it is no run of such words. */
  boolean cut(byte[] b, int start, int end) {
    bytes = b;
    count = 0;
    int i = start;
    while (i < end) {
      int letter = b[i++];
      if (letter == ' ' || letter == '\t') {
        continue;
      }
      if (letter < 'A' || letter > 'Z') {
        return false;
      }
      int first = i;
      while (i < end && (Decimals.digit(b[i]) || b[i] == '.' || b[i] == '+' || b[i] == '-')) {
        i++;
      }
      add(letter, first, i);
    }
    return count > 0;
  }

  private void add(int letter, int first, int last) {
    if (count == letters.length) {
      letters = Arrays.copyOf(letters, 2 * count);
      from = Arrays.copyOf(from, 2 * count);
      to = Arrays.copyOf(to, 2 * count);
    }
    letters[count] = letter;
    from[count] = first;
    to[count++] = last;
  }

  int count() {
    return count;
  }

  char letter(int index) {
    return (char) letters[index];
  }

  /** The number as a whole one from 0 to 999999; -1 when it is anything else. */
  int whole(int index) {
    int v = 0;
    int length = to[index] - from[index];
    for (int i = from[index]; i < to[index]; i++) {
      if (!Decimals.digit(bytes[i]) || length > 6) {
        return -1;
      }
      v = 10 * v + bytes[i] - '0';
    }
    return length == 0 ? -1 : v;
  }

  double mm(int index, DrillNumbers numbers, int line) throws UnreadableFile {
    return numbers.mm(bytes, from[index], to[index], line);
  }
}
