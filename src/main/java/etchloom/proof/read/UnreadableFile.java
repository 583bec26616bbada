package etchloom.proof.read;

import etchloom.diagnostic.SourceSpan;

/** A file that cannot be read: which, where, and what is wrong with it. */
public final class UnreadableFile extends Exception {
  private static final long serialVersionUID = 1L;

  private final String file;
  private final int line;
  private final String code;
  private final String reason;

  /**
   * @param line from 1; 0 when the whole file is meant
   * @param code short lower-case word with hyphens, the same for every such error
   * @param reason what was found and what was wanted, with numbers and units
   */
  public UnreadableFile(String file, int line, String code, String reason) {
    super(file + (line > 0 ? ":" + line : "") + ": " + reason);
    this.file = file;
    this.line = line;
    this.code = code;
    this.reason = reason;
  }

  public String file() {
    return file;
  }

  public int line() {
    return line;
  }

  public String code() {
    return code;
  }

  public String reason() {
    return reason;
  }

  /** The place, for a diagnostic. */
  public SourceSpan where() {
    return new SourceSpan(file, line, 0, 0, "");
  }
}
