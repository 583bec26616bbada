package etchloom.artwork;

import java.util.List;

/**
 * What a piece of copper is, in the user's words.
 *
 * @param phase the phase's mark, empty where it belongs to none or several
 * @param coil from 1; 0 where it belongs to none
 * @param turns for a spiral: the turn, from 1, of each segment of its path; else empty
 */
public record Feature(Kind kind, String phase, int coil, List<Integer> turns) {
  public Feature {
    turns = List.copyOf(turns);
  }

  public enum Kind {
    SPIRAL("spiral"),
    RING("ring"),
    RADIAL("radial"),
    TERMINAL_TRACK("terminal track"),
    LINK("link");

    private final String word;

    Kind(String word) {
      this.word = word;
    }

    public String word() {
      return word;
    }
  }

  /** {@code phase U, coil 4, turn 7}; the turn is left out where {@code segment} is negative. */
  public String describe(int segment) {
    StringBuilder s = new StringBuilder();
    if (kind != Kind.SPIRAL) {
      s.append(kind.word());
    }
    if (!phase.isEmpty()) {
      s.append(s.isEmpty() ? "" : ", ").append("phase ").append(phase);
    }
    if (coil > 0) {
      s.append(s.isEmpty() ? "" : ", ").append("coil ").append(coil);
    }
    if (segment >= 0 && segment < turns.size()) {
      s.append(", turn ").append(turns.get(segment));
    }
    return s.toString();
  }
}
