package etchloom.cli;

/** Something could not be read or written; the message says what and why. */
final class DiskTrouble extends RuntimeException {
  private static final long serialVersionUID = 1L;

  DiskTrouble(String message) {
    super(message, null, false, false);
  }
}
