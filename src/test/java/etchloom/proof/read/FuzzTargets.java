package etchloom.proof.read;

import etchloom.proof.image.DrillFile;
import etchloom.proof.image.LayerImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeMap;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.params.provider.Arguments;

/** The readers and the small samples that are spoilt for each. */
final class FuzzTargets {
  private FuzzTargets() {}

  static List<ReaderFuzz.Target> all(Path scratch) throws IOException {
    return List.of(
        new ReaderFuzz.Target("gerber", FuzzTargets::gerber, gerberSamples(), 9000),
        new ReaderFuzz.Target("drill", FuzzTargets::drill, drillSamples(), 4000),
        new ReaderFuzz.Target("netlist", b -> NetlistReader.read("f", b), texts(NETLIST), 2000),
        new ReaderFuzz.Target(
            "job", b -> JobReader.read("f", b), List.of(Samples.file("round.gbrjob")), 2000),
        new ReaderFuzz.Target("dxf", FuzzTargets::dxf, texts(DXF, DXF_OLD), 3000),
        new ReaderFuzz.Target("svg", b -> SvgReader.read("f", b), texts(SVG, SVG_TREE), 3000),
        new ReaderFuzz.Target("set", FuzzTargets::set, drillSamples(), 500),
        new ReaderFuzz.Target("zip", b -> zip(b, scratch), List.of(zipped()), 500));
  }

  private static Object gerber(byte[] bytes) throws UnreadableFile {
    LayerImage image = GerberReader.read("f", bytes);
    return image.objects().size() < 3000 ? image : image.objects().size();
  }

  private static Object drill(byte[] bytes) throws UnreadableFile {
    DrillFile file = DrillReader.read("f", bytes);
    return file.holes().size() < 3000 ? file : file.holes().size();
  }

  private static Object dxf(byte[] bytes) throws UnreadableFile {
    var file = DxfReader.read("f", bytes);
    try {
      DxfImage.outlines(file, "A");
      DxfImage.centreLines(file, "A");
    } catch (UnreadableFile e) {
      return file + e.getMessage();
    }
    return file;
  }

  private static Object set(byte[] bytes) throws UnreadableFile {
    TreeMap<String, byte[]> files = new TreeMap<>();
    files.put("L1.gbr", Samples.file("round-L1.gbr"));
    files.put("L2.gbr", Samples.file("round-L2.gbr"));
    files.put("holes.xnc", bytes);
    files.put("holes.gbr", Samples.file("round-pth.gbr"));
    return SetReader.read(new SetFolder("f", files), List.of());
  }

  private static Object zip(byte[] bytes, Path scratch) throws UnreadableFile, IOException {
    Path path = scratch.resolve("f.zip");
    Files.write(path, bytes);
    return FolderReader.read(path).files().keySet();
  }

  private static byte[] zipped() throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (ZipOutputStream zip = new ZipOutputStream(out)) {
      for (String name : List.of("round-pth.xnc", "round.ipc")) {
        zip.putNextEntry(new ZipEntry(name));
        zip.write(Samples.file(name));
        zip.closeEntry();
      }
    }
    return out.toByteArray();
  }

  /** Every construct of the area tests in a file of its own, and a whole layer. */
  private static List<byte[]> gerberSamples() {
    List<byte[]> out = new ArrayList<>();
    out.add(Samples.file("round-L1.gbr"));
    Stream.of(
            GerberAreaTest.standardApertures(),
            GerberAreaTest.macros(),
            GerberAreaTest.draws(),
            GerberAreaTest.regions(),
            GerberAreaTest.transforms(),
            GerberAreaTest.repeats())
        .flatMap(s -> s)
        .map(Arguments::get)
        .forEach(a -> out.add((Samples.MM + a[2] + "M02*\n").getBytes(StandardCharsets.UTF_8)));
    return out;
  }

  private static List<byte[]> drillSamples() {
    List<byte[]> out = texts(DRILL, DRILL.replace("R3X1.0Y-1.0\n", ""));
    out.add(Samples.file("round-pth.xnc"));
    out.add(Samples.file("round-npth.xnc"));
    return out;
  }

  private static List<byte[]> texts(String... all) {
    List<byte[]> out = new ArrayList<>();
    for (String s : all) {
      out.add(s.getBytes(StandardCharsets.UTF_8));
    }
    return out;
  }

  private static final String DRILL =
      """
      M48
      METRIC,TZ
      T1C0.3
      T02C1.0
      %
      G90
      T1
      X1.0Y1.0
      X2
      R3X1.0Y-1.0
      T02
      G00X0.0Y0.0
      M15
      G01X3.0Y0.0
      G03X3.0Y4.0A2.0
      G02X1.0Y4.0I-1.0J0.0
      M16
      G05
      X0.0Y0.0G85X9.0Y9.0
      M30
      """;

  private static final String NETLIST =
      """
      C  x
      P  JOB   X
      P  UNITS CUST 1
      P  NNAME1     PHASE_A
      317NNAME1           VIA   -     D0400PA00X+011000Y+000000X0800     R000 S3
      327NNAME1           TP1   -1   M      A02X+005000Y-007500X1500Y1000R045 S1
      307NNAME1           VIA   -     D0200P   X-001000Y 002000               S0L01L03
      017                                   A04X+001000Y+002000X0500          S2
      378A              L03 X300Y200 X+001000Y+002000 X+003000*X0Y0 Y+001000
      078 X+001000
      389BOARD_EDGE         X0100 X+020000Y+000000 X+000000Y+020000
      999
      """;

  private static final String DXF =
      ("0 SECTION 2 HEADER 9 $ACADVER 1 AC1015 9 $INSUNITS 70 4 0 ENDSEC 0 SECTION 2 TABLES 0 TABLE"
              + " 2 LAYER 0 LAYER 2 A 70 0 0 ENDTAB 0 ENDSEC 0 SECTION 2 ENTITIES"
              + " 0 LWPOLYLINE 8 A 90 3 70 1 43 0.0 10 1.0 20 0.0 42 1.0 10 -1.0 20 0.0 10 0 20 -3"
              + " 0 CIRCLE 8 A 10 0 20 0 40 0.5 0 ARC 8 B 10 0 20 0 40 1 50 270 51 90"
              + " 0 TEXT 8 B 10 1 20 1 40 0.1 1 U1 0 LINE 8 B 10 0 20 0 11 1 21 1"
              + " 0 ENDSEC 0 EOF")
          .replace(' ', '\n');

  private static final String DXF_OLD =
      ("0 SECTION 2 ENTITIES 0 POLYLINE 8 A 70 0 40 0.3 41 0.3 0 VERTEX 10 0 20 0 42 0.5"
              + " 0 VERTEX 10 2 20 0 0 VERTEX 10 2 20 2 0 SEQEND 0 ENDSEC 0 EOF")
          .replace(' ', '\n');

  private static final String SVG =
      "<svg width='20mm' height='20mm' viewBox='0 0 20 20'><g id='A' transform='scale(1,-1)'"
          + " fill='none' stroke='#000' stroke-width='.3' stroke-linecap='round'>"
          + "<path d='M11 0A1.2 1.2 0 0 0 8.6 0a1.4 1.4 0 1 0 2.8 0L3-4h2v-1zm1 1 2 2'/>"
          + "<circle cx='1' cy='2' r='.5'/></g></svg>";

  private static final String SVG_TREE =
      "<?xml version='1.0'?><!-- x --><svg><g id='B' style='fill:red'><g transform='rotate(30 1 1)"
          + " matrix(0 2 -2 0 1 1)'><path fill-rule='evenodd' d='M0 0H9V9H0ZM1 1V8H8V1ZM2 2H3V3Z'/>"
          + "</g></g><text>&lt;x</text><![CDATA[y]]></svg>";
}
