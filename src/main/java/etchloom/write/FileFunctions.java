package etchloom.write;

/**
 * The {@code .FileFunction} texts, in one place: the job file must repeat each file's own text.
 * Source: Gerber Layer Format Specification 2024.05, attribute .FileFunction.
 */
final class FileFunctions {
  static final String MASK_TOP = "Soldermask,Top";
  static final String MASK_BOTTOM = "Soldermask,Bot";
  static final String LEGEND_TOP = "Legend,Top";
  static final String PROFILE = "Profile,NP";

  private FileFunctions() {}

  static String copper(int layer, int layers) {
    String side = layer == 1 ? "Top" : layer == layers ? "Bot" : "Inr";
    return "Copper,L" + layer + "," + side;
  }

  static String plated(int layers) {
    return "Plated,1," + layers + ",PTH";
  }

  static String nonPlated(int layers) {
    return "NonPlated,1," + layers + ",NPTH";
  }
}
