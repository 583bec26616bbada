package etchloom.report;

import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;

/**
 * A plot of a few lines, as SVG: told apart by their dashes and names, not by colour alone. All
 * values must be finite.
 */
final class LinePlot {
  private static final int WIDTH = 640;
  private static final int HEIGHT = 300;
  private static final int LEFT = 84;
  private static final int RIGHT = 24;
  private static final int TOP = 34;
  private static final int BOTTOM = 48;
  private static final int TICKS = 6;
  private static final double FULL_TURN = 360;
  private static final String INK = "#1b201e";
  private static final List<String> PAINTS =
      List.of("#8a3f10", "#1d4e89", "#1c6337", "#6b2a73", "#5b5210", "#1f5f66");
  private static final List<String> DASHES =
      List.of("", "9 4", "2 4", "12 4 2 4", "16 5", "12 4 2 4 2 4");

  /** One line through the points (x[i], y[i]). */
  record Series(String name, List<Double> x, List<Double> y) {
    Series {
      x = List.copyOf(x);
      y = List.copyOf(y);
    }
  }

  /** From the least to the greatest value shown. */
  private record Span(double low, double high, double step) {
    static Span of(double low, double high) {
      double width = high > low ? high - low : 1;
      double power = Math.pow(10, Math.floor(Math.log10(width / TICKS)));
      double step = power;
      for (double k : new double[] {1, 2, 5, 10}) {
        step = k * power;
        if (width / step <= TICKS) {
          break;
        }
      }
      return new Span(step * Math.floor(low / step), step * Math.ceil((low + width) / step), step);
    }

    int ticks() {
      return (int) Math.round((high - low) / step);
    }

    double at(int i) {
      return low + i * step;
    }

    String label(int i) {
      return Numbers.trimmed(at(i), Math.max(0, 1 - (int) Math.floor(Math.log10(step))));
    }
  }

  private final StringBuilder b = new StringBuilder();
  private final Span x;
  private final Span y;

  private LinePlot(Span x, Span y) {
    this.x = x;
    this.y = y;
  }

  /**
   * @param label what the picture shows, for those who do not see it
   */
  static String draw(String label, String xName, String yName, List<Series> series) {
    List<Double> xs = series.stream().flatMap(s -> s.x().stream()).toList();
    List<Double> ys = new ArrayList<>(series.stream().flatMap(s -> s.y().stream()).toList());
    ys.add(0.0);
    LinePlot p = new LinePlot(xSpan(xs), span(ys));
    p.b.append("<svg viewBox=\"0 0 ").append(WIDTH).append(' ').append(HEIGHT);
    p.b.append("\" role=\"img\" aria-label=\"").append(Html.escaped(label));
    p.b
        .append("\" font-family=\"sans-serif\" font-size=\"13\" fill=\"")
        .append(INK)
        .append("\">\n");
    p.axes(xName, yName);
    for (int i = 0; i < series.size(); i++) {
      p.line(series.get(i), i, series.size());
    }
    return p.b.append("</svg>\n").toString();
  }

  /** Steps of 60 for degrees of one turn, else of 1, 2 or 5 times a power of ten. */
  private static Span xSpan(List<Double> values) {
    Span s = span(values);
    boolean turn = s.low() == 0 && values.stream().anyMatch(v -> v == FULL_TURN);
    return turn ? new Span(0, FULL_TURN, FULL_TURN / 6) : s;
  }

  private static Span span(List<Double> values) {
    double low = values.stream().mapToDouble(v -> v).min().orElse(0);
    double high = values.stream().mapToDouble(v -> v).max().orElse(1);
    return Span.of(low, high);
  }

  private double px(double v) {
    return LEFT + (v - x.low) / (x.high - x.low) * (WIDTH - LEFT - RIGHT);
  }

  private double py(double v) {
    return HEIGHT - BOTTOM - (v - y.low) / (y.high - y.low) * (HEIGHT - TOP - BOTTOM);
  }

  private void axes(String xName, String yName) {
    for (int i = 0; i <= x.ticks(); i++) {
      double at = px(x.at(i));
      rule(at, TOP, at, HEIGHT - BOTTOM, x.at(i) == 0);
      text(at, HEIGHT - BOTTOM + 18, "middle", x.label(i));
    }
    for (int i = 0; i <= y.ticks(); i++) {
      double at = py(y.at(i));
      rule(LEFT, at, WIDTH - RIGHT, at, Math.abs(y.at(i)) < y.step / 2);
      text(LEFT - 8, at + 4, "end", y.label(i));
    }
    text(WIDTH - RIGHT, HEIGHT - 10, "end", xName);
    text(8, 16, "start", yName);
  }

  private void rule(double x1, double y1, double x2, double y2, boolean strong) {
    b.append("<path d=\"M").append(n(x1)).append(' ').append(n(y1)).append('L').append(n(x2));
    b.append(' ').append(n(y2)).append("\" fill=\"none\" stroke=\"");
    b.append(strong ? INK : "#cfcabd").append("\"/>\n");
  }

  private void text(double x, double y, String anchor, String s) {
    b.append("<text x=\"").append(n(x)).append("\" y=\"").append(n(y));
    b.append("\" text-anchor=\"").append(anchor).append("\">");
    b.append(Html.escaped(s)).append("</text>\n");
  }

  private void line(Series s, int index, int count) {
    String paint = PAINTS.get(index % PAINTS.size());
    String dash = DASHES.get(index % DASHES.size());
    b.append("<path fill=\"none\" stroke-width=\"2\" stroke=\"").append(paint);
    b.append("\" stroke-dasharray=\"").append(dash.isEmpty() ? "none" : dash).append("\" d=\"");
    for (int i = 0; i < s.x().size(); i++) {
      b.append(i == 0 ? 'M' : 'L').append(n(px(s.x().get(i)))).append(' ');
      b.append(n(py(s.y().get(i))));
    }
    b.append("\"/>\n");
    if (!s.name().isEmpty()) {
      double at = WIDTH - RIGHT - 60.0 * (count - index);
      b.append("<path fill=\"none\" stroke-width=\"2\" stroke=\"").append(paint);
      b.append("\" stroke-dasharray=\"").append(dash.isEmpty() ? "none" : dash);
      b.append("\" d=\"M").append(n(at)).append(" 12h26\"/>\n");
      text(at + 30, 16, "start", s.name());
    }
  }

  private static String n(double v) {
    return Numbers.trimmed(v, 2);
  }
}
