package etchloom.proof;

/** The names of what a proof may find. */
public final class ProofNames {
  /** A file that cannot be read; get it from its maker again. */
  public static final String UNREADABLE = "unreadable";

  /** Something that was read, but that another reader may take differently. */
  public static final String DOUBTFUL = "doubtful";

  /** A file that the set should hold is not there, or nothing says what a file is. */
  public static final String MISSING_FILE = "missing-file";

  /** Two files say that they are the same thing. */
  public static final String DUPLICATE_FILE = "duplicate-file";

  /** Copper joins what should be apart: two groups of pads on one layer, or two nets. */
  public static final String SHORT = "short";

  /** Copper is apart that should be joined: pads of one group on a layer, or one net. */
  public static final String OPEN = "open";

  /** Copper encloses a gap: a bridge between two turns does so. */
  public static final String LOOP = "loop";

  /** The conductor closes on itself in more or fewer ways than the design does. */
  public static final String CIRCUITS = "circuits";

  /** Copper that holds no pad at all. */
  public static final String STRAY_COPPER = "stray-copper";

  /** Copper of the design that the file does not draw. */
  public static final String MISSING_COPPER = "missing-copper";

  /** Copper that the file draws and the design does not. */
  public static final String EXTRA_COPPER = "extra-copper";

  /** A layer's file draws another layer. */
  public static final String SWAPPED_LAYERS = "swapped-layers";

  /** Something carries another net's name than the conductor it belongs to. */
  public static final String NET_NAME = "net-name";

  /** A terminal's pad does not carry its mark, or another pad does. */
  public static final String TERMINAL = "terminal";

  /** A track, pad or hole is said to be for something that it is not for. */
  public static final String FUNCTION = "function";

  public static final String MISSING_HOLE = "missing-hole";
  public static final String EXTRA_HOLE = "extra-hole";

  /** A hole stands beside its place. */
  public static final String MOVED_HOLE = "moved-hole";

  public static final String HOLE_SIZE = "hole-size";

  /** Two files of one thing disagree: netlist, job file, profile, mask, drawings, archive. */
  public static final String NETLIST = "netlist";

  public static final String JOB_FILE = "job-file";
  public static final String PROFILE = "profile";
  public static final String MASK = "mask";
  public static final String DXF = "dxf";
  public static final String OUTLINES = "outlines";
  public static final String SVG = "svg";

  /** The copper of the files resists otherwise than the report says. */
  public static final String RESISTANCE = "resistance";

  public static final String ARCHIVE = "archive";

  private ProofNames() {}
}
