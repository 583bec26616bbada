package etchloom.rules;

import java.util.Locale;

/** The rules by the names that the spec page binds, in its order. */
enum RuleName {
  TRACK,
  SPACE,
  RING,
  HOLE,
  ASPECT,
  HOLE_GAP,
  HOLE_COPPER,
  EDGE,
  MASK_WEB,
  LEGEND,
  COPPER_WEIGHT,
  LAYERS,
  SIZE,
  VOLTAGE,
  KEEP_OUT,
  LAMINATE;

  private final String word = name().toLowerCase(Locale.ROOT).replace('_', '-');

  String word() {
    return word;
  }
}
