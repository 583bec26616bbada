package etchloom.write;

import etchloom.artwork.Artwork;
import etchloom.geometry.Grid;

/** What surrounds the board in its picture: page, datum, scale bar, key of colours, title. */
final class SvgFrame {
  private static final String INK = "#26323d";

  /** Sizes as shares of the board's width. */
  private static final double MARGIN = 0.07;

  private static final double LETTER = 0.032;
  private static final double LINE = 1.6 * LETTER;

  /** A letter of an ordinary typeface is about this wide, as a share of its height. */
  private static final double LETTER_ASPECT = 0.6;

  private static final int MOST_LETTERS = 70;

  private final Artwork art;
  private final StringBuilder out;
  private final Box board;
  private final double size;

  SvgFrame(Artwork art, StringBuilder out) {
    this.art = art;
    this.out = out;
    board = Box.of(art.profile().get(0));
    size = board.width();
  }

  void open() {
    double x = board.minX() - MARGIN * size;
    double y = -board.maxY() - MARGIN * size;
    double width = board.width() + 2 * MARGIN * size;
    double height = board.height() + 2 * MARGIN * size + 3 * LINE * size;
    out.append("<svg xmlns=\"http://www.w3.org/2000/svg\" version=\"1.1\" width=\"");
    mm(width);
    out.append("mm\" height=\"");
    mm(height);
    out.append("mm\" viewBox=\"");
    mm(x);
    out.append(' ');
    mm(y);
    out.append(' ');
    mm(width);
    out.append(' ');
    mm(height);
    out.append("\">\n<title>").append(Ascii.xml(caption())).append("</title>\n");
    out.append("<rect id=\"page\" fill=\"#ffffff\"");
    rectangle(x, y, width, height);
  }

  /** A cross on the shaft axis and a triangle outside the edge at angle 0. */
  void datum() {
    double arm = 0.015 * size;
    double gap = 0.01 * size;
    double edge = board.maxX();
    out.append("<g id=\"datum\">\n<title>Shaft axis and angle 0</title>\n");
    out.append("<path fill=\"none\" stroke=\"").append(INK);
    out.append("\" stroke-width=\"");
    mm(0.003 * size);
    out.append("\" d=\"M");
    points(-arm, 0, arm, 0);
    out.append('M');
    points(0, -arm, 0, arm);
    out.append("\"/>\n");
    out.append("<path fill=\"" + INK + "\" d=\"M");
    points(edge + gap, 0, edge + 2.5 * gap, 0.9 * gap);
    out.append('L');
    mm(edge + 2.5 * gap);
    out.append(' ');
    mm(-0.9 * gap);
    out.append("Z\"/>\n</g>\n");
  }

  void footer() {
    double left = board.minX();
    double line = -board.minY() + MARGIN * size * 0.6;
    out.append("<g id=\"notes\" fill=\"" + INK + "\" font-family=\"sans-serif\">\n");
    double letter = LETTER * size;
    text(board.maxX() + 0.029 * size, 0.35 * letter * 0.8, 0.8 * letter, "0\u00b0");
    String caption = caption();
    double fit = Math.min(letter, size / (LETTER_ASPECT * caption.length()));
    text(left, line + letter, fit, caption);
    scale(left, line + 1.2 * LINE * size);
    key(left, line + 2.2 * LINE * size);
    out.append("</g>\n");
  }

  private String caption() {
    String text = art.title() + ", revision " + art.revision();
    if (text.length() > MOST_LETTERS) {
      text = text.substring(0, text.offsetByCodePoints(0, shorter(text))) + "...";
    }
    return (art.draft() ? "DRAFT - " : "") + text;
  }

  private static int shorter(String text) {
    return Math.min(text.codePointCount(0, text.length()), MOST_LETTERS - 3);
  }

  /** A bar of a round length, about a quarter of the board. */
  private void scale(double left, double top) {
    double bar = round(size / 4);
    double thick = 0.008 * size;
    out.append("<rect");
    rectangle(left, top + 0.4 * LETTER * size, bar, thick);
    String diameter = brief(Numbers.mm(board.width()));
    text(
        left + bar + 0.02 * size,
        top + 0.75 * LETTER * size,
        0.8 * LETTER * size,
        brief(Numbers.mm(bar)) + " mm; board " + diameter + " mm, seen from L1");
  }

  private void key(double left, double top) {
    double letter = 0.8 * LETTER * size;
    double step = Math.min(size / art.layers(), 5 * letter);
    for (int layer = 1; layer <= art.layers(); layer++) {
      double x = left + (layer - 1) * step;
      out.append("<rect fill=\"").append(SvgWriter.colour(layer, art.layers())).append('"');
      rectangle(x, top, 0.3 * step, letter);
      text(x + 0.36 * step, top + 0.85 * letter, Math.min(letter, 0.3 * step), "L" + layer);
    }
  }

  /** The largest of 1, 2, 5 times a power of ten that does not exceed the length. */
  private static double round(double length) {
    double power = 1e-3;
    while (power * 10 <= length) {
      power *= 10;
    }
    return length >= 5 * power ? 5 * power : length >= 2 * power ? 2 * power : power;
  }

  private void rectangle(double x, double y, double width, double height) {
    out.append(" x=\"");
    mm(x);
    out.append("\" y=\"");
    mm(y);
    out.append("\" width=\"");
    mm(width);
    out.append("\" height=\"");
    mm(height);
    out.append("\"/>\n");
  }

  private void text(double x, double y, double height, String text) {
    out.append("<text x=\"");
    mm(x);
    out.append("\" y=\"");
    mm(y);
    out.append("\" font-size=\"");
    mm(height);
    out.append("\">").append(Ascii.xml(text)).append("</text>\n");
  }

  private void points(double x0, double y0, double x1, double y1) {
    mm(x0);
    out.append(' ');
    mm(y0);
    out.append('L');
    mm(x1);
    out.append(' ');
    mm(y1);
  }

  /** To the micrometre. */
  private void mm(double value) {
    Numbers.fixed(out, Numbers.micrometres(Grid.nm(value)), 3);
  }

  private static String brief(String number) {
    return number.endsWith(".0") ? number.substring(0, number.length() - 2) : number;
  }
}
