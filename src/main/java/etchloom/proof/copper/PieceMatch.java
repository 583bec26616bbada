package etchloom.proof.copper;

import java.util.List;

/**
 * Which pieces of two drawings are the same: the same pen along the same curve, whichever way it is
 * walked and however an arc is cut up.
 *
 * <p>A piece that appears twice counts once. N log N where few pieces have an end on one vertical
 * line.
 *
 * @param onlyFirst pieces of the first drawing that the second lacks
 * @param onlySecond pieces of the second drawing that the first lacks
 */
public record PieceMatch(List<DrawnPiece> onlyFirst, List<DrawnPiece> onlySecond) {
  /**
   * How far places may differ.
   *
   * @param endMm of ends and of widths
   * @param bowMm of the middle of an arc, which rounded ends may push out
   */
  public record Tolerance(double endMm, double bowMm) {
    /** Coordinates on the nanometre grid, and arcs worked out from bulges, differ by less. */
    public static final Tolerance GRID = new Tolerance(1e-5, 1e-5);
  }

  public boolean same() {
    return onlyFirst.isEmpty() && onlySecond.isEmpty();
  }

  public static PieceMatch match(List<DrawnPiece> first, List<DrawnPiece> second) {
    return match(first, second, Tolerance.GRID);
  }

  public static PieceMatch match(
      List<DrawnPiece> first, List<DrawnPiece> second, Tolerance tolerance) {
    return new PieceMatcher(tolerance).match(first, second);
  }
}
