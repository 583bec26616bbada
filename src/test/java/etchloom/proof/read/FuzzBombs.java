package etchloom.proof.read;

import java.util.ArrayList;
import java.util.List;

/** Small files that stand for something huge, and files built to make a reader work. */
final class FuzzBombs {
  /**
   * @param text the file
   */
  record Bomb(String name, ReaderFuzz.Reader reader, String text) {}

  private FuzzBombs() {}

  static List<Bomb> all() {
    List<Bomb> out = new ArrayList<>();
    gerber(out, "repeat", "%ADD10C,1*%D10*%SRX1200Y1200I2J2*%X0Y0D03*%SR*%");
    gerber(
        out,
        "repeat of arcs",
        "%ADD10C,1*%D10*%SRX700Y700I2J2*%G03*X2000000Y0D02*"
            + "X-2000000Y0I-2000000J0D01*X2000000Y0I2000000J0D01*%SR*%");
    gerber(
        out,
        "repeat of regions",
        "%SRX700Y700I2J2*%G36*G01*X0Y0D02*X1D01*Y1D01*X0Y0D01*G37*" + "%SR*%");
    gerber(out, "nested blocks", nested(12, 8));
    gerber(out, "deep blocks", "%ABD10*%".repeat(30));
    gerber(
        out,
        "macro of many parts",
        "%AMA*" + "1,1,1,0,0*".repeat(3000) + "%%ADD10A*%D10*" + turned(2000));
    gerber(
        out,
        "macro of a long sum",
        "%AMA*1,1," + "1+".repeat(100_000) + "1,0,0*%" + apertures("A", 2000));
    gerber(out, "macro of brackets", "%AMA*1,1," + "(".repeat(100_000) + ",0,0*%%ADD10A*%");
    gerber(out, "macro of signs", "%AMA*1,1," + "-".repeat(1_000_000) + "1,0,0*%%ADD10A*%");
    gerber(
        out,
        "rings without end",
        "%AMA*6,0,0,9,0.00001,0.00001,999999,0,0,0*%" + apertures("A", 3000));
    gerber(out, "attributes", attributes());
    gerber(out, "long text", "%TF.X," + "y,".repeat(500_000) + "*%");
    gerber(out, "one command", "G04 " + "x".repeat(3_000_000) + "*");
    add(
        out,
        "drill repeats",
        b -> DrillReader.read("f", b).holes().size(),
        "M48\nMETRIC\nT1C1.0\n%\nT1\nX0.0Y0.0\n" + "R999999X0.001\n".repeat(9) + "M30\n");
    add(out, "svg depth", b -> SvgReader.read("f", b), "<svg>" + "<g>".repeat(10_000));
    add(out, "svg nested contours", b -> SvgReader.read("f", b), rings());
    add(out, "svg attributes", b -> SvgReader.read("f", b), "<svg " + many("a#='1' ", 50_000));
    add(out, "json depth", b -> JobReader.read("f", b), "[".repeat(100_000));
    add(
        out,
        "json number",
        b -> JobReader.read("f", b),
        "{\"FilesAttributes\":[],\"GeneralSpecs\":{\"LayerNumber\":" + "9".repeat(900) + "}}");
    add(
        out,
        "dxf corners",
        b -> DxfReader.read("f", b).entities().size(),
        "0\nSECTION\n2\nENTITIES\n0\nLWPOLYLINE\n8\nA\n"
            + "10\n0\n20\n0\n10\n1\n20\n1\n".repeat(200_000)
            + "0\nENDSEC\n0\nEOF\n");
    add(
        out,
        "dxf kinds",
        b -> DxfReader.read("f", b),
        "0\nSECTION\n2\nENTITIES\n" + many("0\nK#\n8\nL#\n", 100_000) + "0\nENDSEC\n0\nEOF\n");
    add(
        out,
        "netlist points",
        b -> NetlistReader.read("f", b).lines().size(),
        "P  UNITS CUST 1\n378A              L01 X300 " + "X0Y0 X1Y1*".repeat(300_000) + "\n999\n");
    return out;
  }

  private static void add(List<Bomb> out, String name, ReaderFuzz.Reader r, String text) {
    out.add(new Bomb(name, r, text));
  }

  private static void gerber(List<Bomb> out, String name, String body) {
    add(out, name, b -> GerberReader.read("f", b).objects().size(), Samples.MM + body + "M02*\n");
  }

  /** Each block flashes the one before it several times. */
  private static String nested(int depth, int times) {
    StringBuilder s = new StringBuilder("%ADD10C,1*%%ABD11*%D10*X0Y0D03*%AB*%");
    for (int i = 1; i < depth; i++) {
      s.append("%ABD").append(11 + i).append("*%D").append(10 + i).append('*');
      s.append("X1000000Y0D03*".repeat(times)).append("%AB*%");
    }
    return s + "D" + (10 + depth) + "*X0Y0D03*";
  }

  private static String turned(int times) {
    return many("%LR#.5*%X0Y0D03*", times);
  }

  private static String apertures(String macro, int times) {
    StringBuilder s = new StringBuilder();
    for (int i = 0; i < times; i++) {
      s.append("%ADD").append(10 + i).append(macro).append("*%");
    }
    return s.toString();
  }

  private static String attributes() {
    return "%ADD10C,1*%D10*" + many("%TA.A#,1*%", 190) + many("%TO.N,#*%X0Y0D03*", 100_000);
  }

  private static String rings() {
    StringBuilder s = new StringBuilder("<svg><path d='");
    for (int i = 1; i <= 20_000; i++) {
      s.append('M').append(-i).append(' ').append(-i).append("H").append(i).append('V').append(i);
      s.append("H").append(-i).append('Z');
    }
    return s + "'/></svg>";
  }

  /** The text over and over, each # replaced by a running number. */
  private static String many(String text, int times) {
    StringBuilder s = new StringBuilder();
    for (int i = 0; i < times; i++) {
      s.append(text.replace("#", Integer.toString(i)));
    }
    return s.toString();
  }
}
