package etchloom.proof.read;

/** The units of a netlist: P UNITS CUST 0 (0.0001 inch), 1 (0.001 mm), 2 (0.0001 inch, radians). */
final class NetUnits {
  private static final double INCH_MM = 25.4;
  private static final double STEPS_PER_INCH = 10_000;
  private static final double STEPS_PER_MM = 1000;

  private final Reading reading;
  private boolean set;
  private boolean used;
  private boolean inch = true;
  private boolean radians;

  NetUnits(Reading reading) {
    this.reading = reading;
  }

  void set(String value, int line) throws UnreadableFile {
    boolean nextInch;
    boolean nextRadians = false;
    switch (value) {
      case "CUST 0", "CUST", "CUST0" -> nextInch = true;
      case "CUST 1", "CUST1", "SI" -> nextInch = false;
      case "CUST 2", "CUST2" -> {
        nextInch = true;
        nextRadians = true;
      }
      default ->
          throw reading.fail(
              line,
              "unit",
              "cannot read the unit '"
                  + GerberLexer.printable(value)
                  + "', wanted CUST 0, CUST 1 or CUST 2");
    }
    if ((set || used) && (nextInch != inch || nextRadians != radians)) {
      throw reading.fail(line, "unit", "the unit changes within the file");
    }
    set = true;
    inch = nextInch;
    radians = nextRadians;
  }

  double mm(long steps, int line) {
    used = true;
    if (!set) {
      reading.warnOnce(line, "unit", "no UNITS record; taken as CUST 0, 0.0001 inch");
    }
    // Divided, so that the result is the double nearest to the decimal written.
    return inch ? steps * INCH_MM / STEPS_PER_INCH : steps / STEPS_PER_MM;
  }

  double rad(long value) {
    return radians ? value : Math.toRadians(value % 360);
  }
}
