package etchloom.proof.read;

/** The transform attribute: translate, scale, rotate and matrix. SVG 1.1, section 7.6. */
final class SvgTransforms {
  private static final SvgTransform NONE = SvgTransform.scale(1, 1);

  private SvgTransforms() {}

  static SvgTransform parse(String text, Reading reading, int line) throws UnreadableFile {
    if (text.isEmpty()) {
      return NONE;
    }
    SvgScanner s = new SvgScanner(text, reading, line);
    SvgTransform all = NONE;
    while (s.peek() != 0) {
      String name = s.word();
      double[] v = new double[6];
      int n = 0;
      if (s.take() != '(') {
        throw s.wrong("a bracket after the transform's name");
      }
      while (s.atNumber() && n < 6) {
        v[n++] = s.number();
      }
      if (s.take() != ')') {
        throw s.wrong("a closing bracket");
      }
      all = all.after(one(name, v, n, s));
    }
    return all;
  }

  private static SvgTransform one(String name, double[] v, int n, SvgScanner s)
      throws UnreadableFile {
    if (name.equals("matrix") && n == 6) {
      return new SvgTransform(v[0], v[1], v[2], v[3], v[4], v[5]);
    }
    if (name.equals("translate") && (n == 1 || n == 2)) {
      return new SvgTransform(1, 0, 0, 1, v[0], v[1]);
    }
    if (name.equals("scale") && (n == 1 || n == 2)) {
      return SvgTransform.scale(v[0], n == 1 ? v[0] : v[1]);
    }
    if (name.equals("rotate") && (n == 1 || n == 3)) {
      double rad = Math.toRadians(v[0] % 360);
      double c = Math.cos(rad);
      double sin = Math.sin(rad);
      SvgTransform turn = new SvgTransform(c, sin, -sin, c, 0, 0);
      SvgTransform there = new SvgTransform(1, 0, 0, 1, v[1], v[2]);
      SvgTransform back = new SvgTransform(1, 0, 0, 1, -v[1], -v[2]);
      return there.after(turn).after(back);
    }
    throw s.wrong("translate, scale, rotate or matrix with its values");
  }
}
