package etchloom.proof.plane;

/** A figure that is too large, or too tangled, to be worked out. */
public final class OutOfRange extends RuntimeException {
  private static final long serialVersionUID = 1L;

  public OutOfRange(String message) {
    super(message);
  }
}
