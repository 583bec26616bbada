package etchloom.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Distance;
import etchloom.geometry.Nearest;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.ohm.CopperBuild;
import etchloom.proof.read.SetFolder;
import etchloom.proof.read.UnreadableFile;
import etchloom.proof.rules.CopperLimits;
import etchloom.proof.rules.CopperRuleReport;
import java.util.Collections;
import java.util.List;
import java.util.OptionalInt;
import java.util.SortedMap;
import java.util.TreeMap;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** Sets of which nothing is known but what their files say. */
class FolderCheckTest {
  private static Artwork wind;
  private static SortedMap<String, byte[]> windSet;

  @BeforeAll
  static void write() {
    wind = WrittenSets.fewTurns("wind-logger");
    windSet = WrittenSets.withoutSums(WrittenSets.write(wind));
  }

  private static ProofReport check(
      SortedMap<String, byte[]> files, OptionalInt circuits, String... layers) {
    SortedMap<String, byte[]> readable = new TreeMap<>(files);
    readable.keySet().removeIf(n -> n.endsWith(".txt") || n.endsWith(".zip"));
    try {
      return whole(readable, circuits, layers).proof();
    } catch (UnreadableFile u) {
      throw new AssertionError(u.getMessage(), u);
    }
  }

  private static FolderCheck.FolderReport whole(
      SortedMap<String, byte[]> files, OptionalInt circuits, String... layers)
      throws UnreadableFile {
    FolderCheck.Fab fab =
        (n, copperMm) ->
            new FolderCheck.Shop(
                new CopperLimits(
                    Collections.nCopies(n, new CopperLimits.Layer(0.18, 0.18)),
                    0.13,
                    0.2,
                    0.3,
                    8,
                    0.25,
                    0.2,
                    0.3,
                    0.5,
                    0.1,
                    400,
                    List.of(2, 4, 6)),
                copperMm.stream()
                    .map(t -> new CopperBuild.Layer(t.orElse(0.07), t.orElse(0.07) / 3))
                    .toList(),
                0.02);
    return FolderCheck.check(new SetFolder("set", files), List.of(layers), circuits, fab);
  }

  /** The wind logger is drawn for the standard class in 2 oz, whose numbers these are. */
  @Test
  void cleanSet_keepsTheRules_andMeasuresWhatTheSpecSays() throws UnreadableFile {
    SortedMap<String, byte[]> files = new TreeMap<>(windSet);
    files.keySet().removeIf(n -> n.endsWith(".txt") || n.endsWith(".zip"));
    CopperRuleReport r = whole(files, OptionalInt.empty()).rules();
    assertEquals(List.of(), r.findings());
    assertEquals(0.25, least(r, "track"), 3e-6); // coil.track
    assertEquals(0.2, least(r, "space"), 3e-6); // coil.space
    assertEquals(0.2, least(r, "ring"), 3e-6); // (via.pad - via.hole) / 2
    assertEquals(0.35, least(r, "hole"), 1e-9); // via.hole
    assertEquals(1.6 / 0.35, least(r, "aspect"), 1e-6); // board.thickness over via.hole
    assertEquals(132, least(r, "size"), 1e-6); // board.diameter
  }

  private static double least(CopperRuleReport r, String rule) {
    return r.minima().stream()
        .filter(f -> f.rule().equals(rule))
        .findFirst()
        .orElseThrow()
        .measured();
  }

  private static List<String> names(ProofReport r) {
    return r.findings().stream().map(ProofFinding::name).distinct().toList();
  }

  private static String xy(Point p) {
    return "X" + Math.round(p.x() * 1e6) + "Y" + Math.round(p.y() * 1e6);
  }

  private static SortedMap<String, byte[]> edited(String file, String from, String to) {
    SortedMap<String, byte[]> out = new TreeMap<>(windSet);
    String t = WrittenSets.text(out.get(file));
    int at = t.indexOf(from);
    assertTrue(at >= 0, () -> "no '" + from + "' in " + file);
    String edited = t.substring(0, at) + to + t.substring(at + from.length());
    out.put(file, edited.getBytes(WrittenSets.ASCII));
    return out;
  }

  @Test
  void cleanSet_countsItsCircuits_andSaysThatItCannotJudgeThem() {
    ProofReport r = check(windSet, OptionalInt.empty());
    assertEquals(List.of(), r.findings());
    assertEquals(0, r.circuits());
    assertEquals(3, r.nets());
    assertTrue(r.notes().stream().anyMatch(n -> n.contains("cannot be judged")), r::toString);
    assertEquals(List.of(), check(windSet, OptionalInt.of(0)).findings());
    assertEquals(List.of(ProofNames.CIRCUITS), names(check(windSet, OptionalInt.of(1))));
  }

  @Test
  void bridgeBetweenTwoNets_isAShortWhereTheyTouch() {
    Conductor a = spiral(1);
    Conductor b = spiral(2);
    Nearest n = null;
    for (Segment s : a.path().segments()) {
      for (Segment t : b.path().segments()) {
        Nearest m = Distance.between(s.part(0.4, 0.6), t);
        n = n == null || m.distanceMm() < n.distanceMm() ? m : n;
      }
    }
    String file = wind.slug() + "-copper-L2.gbr";
    String draw =
        "%ADD90C,0.1*%\n%TO.N,"
            + a.net()
            + "*%\nD90*\n"
            + xy(n.onFirst())
            + "D02*\nG01*\n"
            + xy(n.onSecond())
            + "D01*\nM02*";
    ProofReport r = check(edited(file, "M02*", draw), OptionalInt.empty());
    assertEquals(List.of(ProofNames.SHORT), names(r));
    ProofFinding f = r.findings().get(0);
    assertEquals("L2", f.layer());
    assertTrue(f.at().orElseThrow().distanceTo(n.onSecond()) < 0.3, f.text());
    assertTrue(f.message().contains(a.net()) && f.message().contains(b.net()), f.text());
  }

  private static Conductor spiral(int coil) {
    return wind.conductors().get(wind.coils().get(coil - 1).conductors().get(1));
  }

  @Test
  void missingVia_isAnOpenNet() {
    Joint j = wind.joints().stream().filter(x -> x.kind() == Joint.Kind.EYE).findFirst().get();
    String file = wind.slug() + "-plated.gbr";
    SortedMap<String, byte[]> set = edited(file, xy(j.at()) + "D03*\n", "");
    ProofReport r = check(set, OptionalInt.empty(), "plated=" + file);
    assertEquals(List.of(ProofNames.OPEN), names(r));
    assertTrue(r.findings().get(0).message().contains(j.net()), r::toString);
    assertThrows(AssertionError.class, () -> check(set, OptionalInt.empty()));
  }

  @Test
  void filesWithoutAttributes_areNamedByTheCaller() {
    SortedMap<String, byte[]> files = new TreeMap<>();
    files.put("a.gtl", gerber("X0Y0D02*\nX5000000Y0D01*\n"));
    files.put("b.gbl", gerber("X5000000Y0D02*\nX9000000Y0D01*\n"));
    files.put("h.drl", "M48\nMETRIC\nT01C0.3\n%\nT01\nX5.0Y0.0\nM30\n".getBytes(WrittenSets.ASCII));
    ProofReport r = check(files, OptionalInt.of(0), "L1=a.gtl", "L2=b.gbl");
    assertEquals(List.of(), r.findings());
    assertEquals(1, r.nets());
    assertTrue(r.notes().stream().anyMatch(n -> n.contains("no file names any net")), r::toString);
  }

  private static byte[] gerber(String body) {
    return ("%FSLAX46Y46*%\n%MOMM*%\n%ADD10C,0.5*%\n%LPD*%\nG01*\nD10*\n" + body + "M02*\n")
        .getBytes(WrittenSets.ASCII);
  }

  /** A part etched from copper joins two nets by intent; the same line as a track does not. */
  @Test
  void etchedComponent_joinsNetsByIntent() {
    for (String function : List.of("EtchedComponent", "Conductor")) {
      String text =
          "%TF.FileFunction,Copper,L1,Top*%\n%FSLAX46Y46*%\n%MOMM*%\n%TA.AperFunction,ViaPad*%\n"
              + "%ADD10C,1*%\n%TA.AperFunction,"
              + function
              + "*%\n%ADD11C,0.2*%\n%TD.AperFunction*%\n%LPD*%\nG01*\n"
              + "%TO.N,A*%\nD10*\nX0Y0D03*\n%TO.N,B*%\nX9000000Y0D03*\n%TD.N*%\n"
              + "D11*\nX0Y0D02*\nX9000000Y0D01*\nM02*\n";
      SortedMap<String, byte[]> files = new TreeMap<>();
      files.put("x.gbr", text.getBytes(WrittenSets.ASCII));
      ProofReport r = check(files, OptionalInt.empty());
      assertEquals(function.equals("Conductor") ? List.of(ProofNames.SHORT) : List.of(), names(r));
    }
  }
}
