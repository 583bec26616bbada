package etchloom.cli;

/** Exit codes, as bound by the spec page. */
public final class ExitCode {
  /** Done, every rule kept. */
  public static final int DONE = 0;

  /** Done its work, and the answer is no. */
  public static final int REFUSED = 1;

  /** The spec, rules file, readings or command line is wrong. */
  public static final int BAD_INPUT = 2;

  /** Could not read or write. */
  public static final int DISK = 3;

  /** A fault in the program itself. */
  public static final int FAULT = 70;

  private ExitCode() {}
}
