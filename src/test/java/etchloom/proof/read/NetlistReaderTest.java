package etchloom.proof.read;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import etchloom.geometry.Point;
import etchloom.proof.image.NetlistFile;
import etchloom.proof.image.NetlistFile.NetLine;
import etchloom.proof.image.NetlistFile.TestPoint;
import etchloom.proof.image.Plating;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Records by the columns of IPC-D-356A, recalled from a field-by-field application note. */
class NetlistReaderTest {
  private static final String HEAD = "P  UNITS CUST 1\n";

  private static NetlistFile read(String text) throws UnreadableFile {
    return NetlistReader.read("t.ipc", text.getBytes(StandardCharsets.UTF_8));
  }

  @Test
  void sample() throws UnreadableFile {
    NetlistFile f = NetlistReader.read("round.ipc", Samples.file("round.ipc"));
    assertEquals(List.of(), f.warnings());
    assertEquals("CUST 1", f.header().get("UNITS"));
    assertEquals("IPC-D-356A", f.header().get("VER"));
    assertEquals("PRIMARY", f.header().get("IMAGE"));
    assertEquals(5, f.points().size());
    TestPoint via = f.points().get(0);
    assertEquals(317, via.operation());
    assertEquals("PH_A", via.net());
    assertEquals("VIA", via.refdes());
    assertEquals(0.4, via.holeMm().getAsDouble());
    assertEquals(Plating.PLATED, via.plating());
    assertEquals(OptionalInt.of(0), via.access());
    assertEquals(new Point(11, 0), via.at());
    assertEquals(0.8, via.widthMm());
    assertEquals(0, via.heightMm());
    assertEquals(OptionalInt.of(3), via.mask());
    TestPoint terminal = f.points().get(2);
    assertEquals("J1", terminal.refdes());
    assertEquals("2", terminal.pin());
    assertEquals(new Point(-8, -4), terminal.at());
    TestPoint mounting = f.points().get(3);
    assertEquals(367, mounting.operation());
    assertEquals("N/C", mounting.net());
    assertEquals(Plating.NON_PLATED, mounting.plating());
    NetLine edge = f.lines().get(0);
    assertEquals("BOARD_EDGE", edge.name());
    assertEquals(0.1, edge.widthMm());
    // A regular polygon of 36 corners on a circle of 20 mm, each rounded to a micrometre.
    assertEquals(36, edge.paths().get(0).segments().size());
    assertEquals(2 * 36 * 20 * Math.sin(Math.PI / 36), edge.paths().get(0).lengthMm(), 0.01);
  }

  @Test
  void aliasesRotationBlindViaContinuation() throws UnreadableFile {
    NetlistFile f =
        read(
            HEAD
                + "P  NNAME1     PHASE_A_COIL_GROUP_1\n"
                + "327NNAME1           TP1   -1   M      A02X+005000Y-007500X1500Y1000R045 S1\n"
                + "307NNAME1           VIA   -     D0200P   X-001000Y 002000               S0L01L03\n"
                + "017                                   A04X+001000Y+002000X0500          S2\n"
                + "999\n");
    TestPoint p = f.points().get(0);
    assertEquals("PHASE_A_COIL_GROUP_1", p.net());
    assertEquals(true, p.mid());
    assertEquals(Math.PI / 4, p.rotationRad(), 1e-15);
    assertEquals(1.5, p.widthMm());
    assertEquals(1.0, p.heightMm());
    assertEquals(new Point(5, -7.5), p.at());
    assertEquals(true, p.holeMm().isEmpty());
    assertEquals(Plating.UNKNOWN, p.plating());
    TestPoint blind = f.points().get(1);
    assertEquals(1, blind.fromLayer());
    assertEquals(3, blind.toLayer());
    assertEquals(new Point(-1, 2), blind.at());
    TestPoint more = f.points().get(2);
    assertEquals(317, more.operation());
    assertEquals("PHASE_A_COIL_GROUP_1", more.net());
    assertEquals("VIA", more.refdes());
    assertEquals(OptionalInt.of(4), more.access());
  }

  @Test
  void inch_isTheDefault() throws UnreadableFile {
    String record = "327A                TP1   -1          A01X+010000Y-000001X0100\n999\n";
    NetlistFile f = read("P  UNITS CUST 0\n" + record);
    assertEquals(25.4, f.points().get(0).at().x(), 1e-12);
    assertEquals(-0.00254, f.points().get(0).at().y(), 1e-12);
    NetlistFile unsaid = read("P  JOB   X\n" + record);
    assertEquals(f.points().get(0).at(), unsaid.points().get(0).at());
    assertEquals("unit", unsaid.warnings().get(0).code());
  }

  @Test
  void conductor_modalValuesAndNewStarts() throws UnreadableFile {
    NetlistFile f =
        read(
            HEAD
                + "378A              L03 X300Y200 X+001000Y+002000 X+003000*X0Y0 Y+001000\n"
                + "078 X+001000\n"
                + "999\n");
    NetLine l = f.lines().get(0);
    assertEquals(3, l.layer());
    assertEquals(0.2, l.widthMm());
    assertEquals(2, l.paths().size());
    assertEquals(new Point(3, 2), l.paths().get(0).end());
    assertEquals(new Point(1, 1), l.paths().get(1).end());
    assertEquals(2.0, l.paths().get(1).lengthMm());
  }

  @ParameterizedTest(name = "{1}: {0}")
  @CsvSource({
    "'', not-a-netlist",
    "'P  UNITS CUST 1;', missing-end",
    "'P  UNITS CUST 7;999;', unit",
    "'P  UNITS CUST 1;P  UNITS CUST 0;999;', unit",
    "'P  UNITS CUST 1;hello;999;', syntax",
    "'P  UNITS CUST 1;017;999;', continuation",
    "'P  UNITS CUST 1;078 X0Y0;999;', continuation",
    "'P  UNITS CUST 1;317;999;', no-net",
    "'P  UNITS CUST 1;317A;999;', syntax",
    "'P  UNITS CUST 1;378A              L0x X300;999;', syntax",
    "'P  UNITS CUST 1;378A              L01 300;999;', syntax",
    "'P  UNITS CUST 1;378A              L01 X300 Z3;999;', syntax"
  })
  void refused(String text, String code) {
    UnreadableFile e = assertThrows(UnreadableFile.class, () -> read(text.replace(';', '\n')));
    assertEquals(code, e.code(), e.getMessage());
  }
}
