package etchloom.report;

import etchloom.artwork.Stackup;
import etchloom.units.Numbers;

/** The stack as a small drawing: copper and dielectrics by their order, thickness in words. */
final class StackSvg {
  private static final int WIDTH = 480;
  private static final int BOARD = 250;
  private static final int COPPER = 12;
  private static final int MARGIN = 12;

  private StackSvg() {}

  static String draw(Stackup s) {
    int y = MARGIN;
    StringBuilder b = new StringBuilder();
    for (int i = 0; i < s.layers(); i++) {
      boolean plane = i == 0 || i == s.layers() - 1;
      tracks(b, y, plane ? 5 : 6);
      label(b, y + COPPER, "L" + (i + 1) + "  " + OrderLines.um(s.copper().get(i).thicknessMm()));
      y += COPPER;
      if (i < s.layers() - 1) {
        double mm = s.dielectricMm().get(i);
        int height = 22 + (int) Math.round(20 * Math.min(1, mm));
        rect(b, MARGIN, y, BOARD, height, "#d9d2a8");
        label(b, y + height / 2 + 6, "dielectric  " + OrderLines.mm(mm));
        y += height;
      }
    }
    int height = y + MARGIN;
    return "<svg viewBox=\"0 0 "
        + WIDTH
        + " "
        + height
        + "\" role=\"img\" aria-label=\"Cross-section of the board: "
        + s.layers()
        + " copper layers, "
        + Numbers.trimmed(s.thicknessMm(), 3)
        + " mm in all; the table that follows says the same\" font-family=\"sans-serif\""
        + " font-size=\"14\">\n"
        + b
        + "</svg>\n";
  }

  private static void tracks(StringBuilder b, int y, int count) {
    int pitch = BOARD / count;
    for (int k = 0; k < count; k++) {
      rect(b, MARGIN + k * pitch + pitch / 6, y, pitch * 2 / 3, COPPER, "#b06a34");
    }
  }

  private static void rect(StringBuilder b, int x, int y, int w, int h, String fill) {
    b.append("<rect x=\"").append(x).append("\" y=\"").append(y).append("\" width=\"").append(w);
    b.append("\" height=\"").append(h).append("\" fill=\"").append(fill).append("\"/>\n");
  }

  private static void label(StringBuilder b, int y, String text) {
    b.append("<text x=\"").append(MARGIN + BOARD + 16).append("\" y=\"").append(y);
    b.append("\" fill=\"#1b201e\">").append(Html.escaped(Words.symbols(text))).append("</text>\n");
  }
}
