package etchloom.spec;

/**
 * Codes of findings about the keys of a spec or rules file. The doc of each says what is wrong and
 * how to mend it; codes about the file as such are in {@link etchloom.spec.yaml.YamlCodes}.
 */
public final class Codes {
  private Codes() {}

  /** A key that the format does not have, mostly misspelt; see the hint. */
  public static final String UNKNOWN_KEY = "unknown-key";

  /** A key that must be there is not; add it. */
  public static final String MISSING_KEY = "missing-key";

  /** A key without a value after its colon. */
  public static final String EMPTY_VALUE = "empty-value";

  /** A group or list where one value belongs, or the other way round. */
  public static final String WRONG_SHAPE = "wrong-shape";

  /** The value does not begin with a number, or is NaN or infinite. */
  public static final String NOT_A_NUMBER = "not-a-number";

  /** A bare number where a quantity belongs; write the unit after one space. */
  public static final String MISSING_UNIT = "missing-unit";

  /** A unit that this kind of quantity does not have. */
  public static final String WRONG_UNIT = "wrong-unit";

  /** Not exactly one space between number and unit. */
  public static final String UNIT_SPACE = "unit-space";

  /** A count must be a whole number without unit, point or quotes. */
  public static final String NOT_WHOLE = "not-whole";

  /** Outside the stated range. */
  public static final String OUT_OF_RANGE = "out-of-range";

  /** A word that the key does not take; see the hint. */
  public static final String UNKNOWN_WORD = "unknown-word";

  /** Not a file of this format, or of a version this program cannot read. */
  public static final String FORMAT = "format";

  /** A text that cannot be printed, is too long, or leaves nothing for file names. */
  public static final String TEXT = "text";

  /** A key that does not go with what another key says. */
  public static final String KEY_CONFLICT = "key-conflict";

  /** A key that has no effect with what another key says (a warning). */
  public static final String UNUSED_KEY = "unused-key";

  /** Coil radii that leave no room for a coil. */
  public static final String RADII = "radii";

  /** The board is too small for what the spec puts on it. */
  public static final String BOARD = "board";

  /** Mounting holes that meet each other, the coils, the bore or the edge. */
  public static final String HOLES = "holes";

  /** A pad that is no larger than its hole, or terminals closer than their pads. */
  public static final String PAD = "pad";

  /** A stackup that does not fit the layers or the thickness. */
  public static final String STACKUP = "stackup";

  /** Magnets that would stand in each other's way or outside their disc. */
  public static final String MAGNET_OVERLAP = "magnet-overlap";

  /** The magnet is hotter than it may get (a warning). */
  public static final String MAGNET_HEAT = "magnet-heat";

  /** A connection that this number of phases does not have. */
  public static final String CONNECTION = "connection";

  /** Coils that cannot be dealt out evenly to phases and paths. */
  public static final String COIL_COUNT = "coil-count";

  /** Duty values that contradict each other. */
  public static final String DUTY = "duty";

  /** Rows or limits of a rules file that contradict each other. */
  public static final String FAB = "fab";
}
