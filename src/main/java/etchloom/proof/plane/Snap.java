package etchloom.proof.plane;

/** Moves the corners of one figure onto those of another where they are all but the same. */
final class Snap {
  private final int tolerance;
  private final NodeTable cells;
  private final int[] cornerX;
  private final int[] cornerY;
  private final int[] nextInCell;
  private final int[] firstInCell;

  Snap(Figure target, int toleranceNm) {
    tolerance = toleranceNm;
    int n = target.edges();
    cells = new NodeTable(n);
    cornerX = new int[n];
    cornerY = new int[n];
    nextInCell = new int[n];
    firstInCell = new int[n];
    for (int e = 0; e < n; e++) {
      cornerX[e] = target.fromX(e);
      cornerY[e] = target.fromY(e);
      int before = cells.size();
      int c = cells.id(cell(cornerX[e]), cell(cornerY[e]));
      nextInCell[e] = c == before ? -1 : firstInCell[c];
      firstInCell[c] = e;
    }
  }

  private int cell(int v) {
    return Math.floorDiv(v, Math.max(1, 4 * tolerance));
  }

  EdgeSet moved(Figure f) {
    int n = f.edges();
    int[] near = new int[n];
    for (int e = 0; e < n; e++) {
      near[e] = nearest(f.fromX(e), f.fromY(e));
    }
    EdgeSet out = new EdgeSet();
    for (int e = 0; e < n; e++) {
      int a = near[e];
      int b = near[f.next(e)];
      out.add(
          a < 0 ? f.fromX(e) : cornerX[a],
          a < 0 ? f.fromY(e) : cornerY[a],
          b < 0 ? f.toX(e) : cornerX[b],
          b < 0 ? f.toY(e) : cornerY[b],
          1,
          EdgeSet.STRAIGHT);
    }
    return out;
  }

  private int nearest(int x, int y) {
    int best = -1;
    long bestSquare = (long) tolerance * tolerance + 1;
    for (int cx = cell(x - tolerance); cx <= cell(x + tolerance); cx++) {
      for (int cy = cell(y - tolerance); cy <= cell(y + tolerance); cy++) {
        int c = cells.find(cx, cy);
        for (int k = c < 0 ? -1 : firstInCell[c]; k >= 0; k = nextInCell[k]) {
          long dx = (long) cornerX[k] - x;
          long dy = (long) cornerY[k] - y;
          if (dx * dx + dy * dy < bestSquare) {
            bestSquare = dx * dx + dy * dy;
            best = k;
          }
        }
      }
    }
    return best;
  }
}
