package etchloom.diagnostic;

/**
 * A place in a file of the user's.
 *
 * @param file the name as the user gave it
 * @param line from 1; 0 when the whole file is meant
 * @param column from 1; 0 when the whole line is meant
 * @param length how many characters the marked text has; 0 when unknown
 * @param text the source line, without its line end; empty when unknown
 */
public record SourceSpan(String file, int line, int column, int length, String text) {
  /** The file as a whole. */
  public static SourceSpan ofFile(String file) {
    return new SourceSpan(file, 0, 0, 0, "");
  }
}
