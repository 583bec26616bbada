package etchloom.proof.read;

import java.util.List;
import java.util.Optional;

/** The parts files play in a set, as words: those of the option --layer. */
final class Roles {
  static final String PROFILE = "profile";
  static final String MASK_TOP = "mask-top";
  static final String MASK_BOTTOM = "mask-bottom";
  static final String LEGEND_TOP = "legend-top";
  static final String LEGEND_BOTTOM = "legend-bottom";
  static final String DRILL = "drill";
  static final String PLATED = "plated";
  static final String NON_PLATED = "nonplated";
  static final String NETLIST = "netlist";
  static final String JOB = "job";

  static final int MAX_LAYER = 99;

  private static final List<String> FIXED =
      List.of(
          PROFILE,
          MASK_TOP,
          MASK_BOTTOM,
          LEGEND_TOP,
          LEGEND_BOTTOM,
          DRILL,
          PLATED,
          NON_PLATED,
          NETLIST,
          JOB);

  private Roles() {}

  static boolean known(String role) {
    return FIXED.contains(role) || layer(role) > 0;
  }

  static String all() {
    return "L1, L2, …, " + String.join(", ", FIXED);
  }

  static boolean ofDrill(String role) {
    return role.equals(DRILL) || role.equals(PLATED) || role.equals(NON_PLATED);
  }

  /** The number of a copper layer, {@code L3}; 0 for another role. */
  static int layer(String role) {
    if (!role.startsWith("L") || role.length() > 3) {
      return 0;
    }
    long n = Card.digits(role.substring(1));
    return n >= 1 && n <= MAX_LAYER && !role.startsWith("L0") ? (int) n : 0;
  }

  /** The role that a file function stands for; empty for what no check needs. */
  static Optional<String> of(List<String> function) {
    String kind = function.isEmpty() ? "" : function.get(0);
    String second = function.size() < 2 ? "" : function.get(1);
    return switch (kind) {
      case "Copper" -> layer(second) > 0 ? Optional.of(second) : Optional.empty();
      case "Soldermask" -> side(second, MASK_TOP, MASK_BOTTOM);
      case "Legend" ->
          function.size() > 2 && !function.get(2).equals("1")
              ? Optional.empty()
              : side(second, LEGEND_TOP, LEGEND_BOTTOM);
      case "Profile" -> Optional.of(PROFILE);
      case "Plated", "NonPlated", "MixedPlating" -> Optional.of(DRILL);
      default -> Optional.empty();
    };
  }

  private static Optional<String> side(String word, String top, String bottom) {
    return word.equals("Top")
        ? Optional.of(top)
        : word.equals("Bot") ? Optional.of(bottom) : Optional.empty();
  }
}
