package etchloom.write;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.testing.ToyBoards;
import etchloom.testing.ToyOrders;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import org.junit.jupiter.api.Test;

/** The set as a whole: its names, the order notes, the fab's archive, the manifest. */
class SetFilesTest {
  private final Artwork art = ToyBoards.fourLayers();
  private final SortedMap<String, byte[]> set = WriterContractTest.write(art);

  @Test
  void names_areThoseOfTheSpecPage() {
    Set<String> expected = new TreeSet<>();
    for (String end :
        List.of(
            "-copper-L1.gbr",
            "-copper-L2.gbr",
            "-copper-L3.gbr",
            "-copper-L4.gbr",
            "-mask-top.gbr",
            "-mask-bottom.gbr",
            "-legend-top.gbr",
            "-profile.gbr",
            "-plated.gbr",
            "-nonplated.gbr",
            "-plated.xnc",
            "-nonplated.xnc",
            ".gbrjob",
            ".ipc",
            ".dxf",
            "-outlines.dxf",
            ".svg",
            "-notes.txt",
            "-fab.zip")) {
      expected.add("toy-four" + end);
    }
    assertEquals(expected, set.keySet());
  }

  @Test
  void notes_sayWhatAFabMustKnow() {
    String notes = WriterContractTest.text(set, "toy-four-notes.txt").replaceAll("\\s+", " ");
    for (String needed :
        List.of(
            "Finished thickness 1.2,", // 0.035 + 0.2 + 0.03 + 0.67 + 0.03 + 0.2 + 0.035 mm
            "L1 copper, finished 35 um, from 1 oz",
            "L2 copper, finished 30 um, from 1 oz",
            "dielectric 0.67",
            "Finish ENIG",
            "Solder mask green",
            "tented",
            "tolerance +/-0.08 mm",
            "Tg at least 150 C",
            "0.3 6 holes, vias, plated, wall at least 20 um", // 2 coils: an eye and 2 nodes each
            "1 2 holes, terminals, plated",
            "3.2 2 holes, mounting, not plated",
            "open: one net for each phase",
            "no isolation test between terminals of one net",
            "No added copper",
            "no teardrops",
            "no changed tracks",
            "U1-U2 0.123 ohm")) {
      assertTrue(notes.contains(needed), needed + " in " + notes);
    }
    assertFalse(notes.contains("DRAFT"));
    String draft =
        WriterContractTest.text(
            WriterContractTest.write(ToyBoards.fourLayers("Toy", "U", "V", true)),
            "toy-four-notes.txt");
    assertTrue(draft.startsWith("DRAFT"));
  }

  @Test
  void theFabsArchive_holdsWhatAFabNeedsOnce() throws Exception {
    SortedMap<String, byte[]> zip = new TreeMap<>();
    List<LocalDateTime> times = new ArrayList<>();
    unzip(set.get("toy-four-fab.zip"), zip, times);
    Set<String> expected = new TreeSet<>(set.keySet());
    expected.removeAll(
        List.of(
            "toy-four-plated.gbr",
            "toy-four-nonplated.gbr",
            "toy-four.dxf",
            "toy-four-outlines.dxf",
            "toy-four.svg",
            "toy-four-fab.zip"));
    assertEquals(expected, zip.keySet());
    zip.forEach(
        (name, bytes) -> {
          if (!name.endsWith(".gbrjob")) {
            assertArrayEquals(set.get(name), bytes, name);
          }
        });
    Set<String> listed = new TreeSet<>();
    Matcher m =
        Pattern.compile("\"Path\" : \"([^\"]+)\"")
            .matcher(new String(zip.get("toy-four.gbrjob"), StandardCharsets.US_ASCII));
    while (m.find()) {
      listed.add(m.group(1));
    }
    expected.removeAll(List.of("toy-four.gbrjob", "toy-four.ipc", "toy-four-notes.txt"));
    assertEquals(expected, listed);
    assertEquals(Set.of(LocalDateTime.of(2000, 1, 1, 0, 0)), Set.copyOf(times));
  }

  @Test
  void theFabsArchive_carriesTheDateGiven() throws Exception {
    // 2023-11-14T22:13:20Z, by date -u -d @1700000000
    Optional<Instant> when = Optional.of(Instant.ofEpochSecond(1_700_000_000L));
    List<LocalDateTime> times = new ArrayList<>();
    unzip(
        LayerSet.write(art, ToyOrders.at(1.2, when)).get("toy-four-fab.zip"),
        new TreeMap<>(),
        times);
    assertEquals(Set.of(LocalDateTime.of(2023, 11, 14, 22, 13, 20)), Set.copyOf(times));
    for (long odd : new long[] {0, -5_000_000_000L, 99_000_000_000L}) {
      Instant far = Instant.ofEpochSecond(odd);
      LayerSet.write(art, ToyOrders.at(1.2, Optional.of(far))); // beyond the archive's years
    }
  }

  @Test
  void manifest_isReadBack() {
    byte[] bytes = Manifest.of("0.1.0", new TreeMap<>(java.util.Map.of("a.txt", bytes("abc"))));
    // FIPS 180-2, appendix B.1: the digest of "abc".
    String sum = "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad";
    assertEquals(Optional.of(new TreeMap<>(java.util.Map.of("a.txt", sum))), Manifest.read(bytes));
    assertTrue(new String(bytes, StandardCharsets.US_ASCII).contains("\"version\" : \"0.1.0\""));
  }

  @Test
  void manifest_ofAnythingElse_isNone() {
    String sum = "0".repeat(64);
    for (String text :
        List.of(
            "",
            "{",
            "[]",
            "null",
            "{}",
            "{\"files\":{\"a\":\"" + sum + "\"}}",
            "{\"tool\":\"other\",\"files\":{\"a\":\"" + sum + "\"}}",
            "{\"tool\":\"etchloom\",\"files\":{\"../a\":\"" + sum + "\"}}",
            "{\"tool\":\"etchloom\",\"files\":{\"a\":\"x\"}}",
            "{\"tool\":\"etchloom\",\"files\":{\"a\":{}}}",
            "{\"tool\":\"etchloom\",\"files\":{\"a\":\"" + sum + "\"}} more",
            "{\"tool\":\"etchloom\",\"files\":{\"a\":\"" + sum + "\",\"a\":\"" + sum + "\"}}",
            "{\"tool\":\"etchloom\",\"files\":{\"manifest.json\":\"" + sum + "\"}}")) {
      assertEquals(Optional.empty(), Manifest.read(bytes(text)), text);
    }
  }

  private static byte[] bytes(String s) {
    return s.getBytes(StandardCharsets.UTF_8);
  }

  private static void unzip(byte[] zip, SortedMap<String, byte[]> to, List<LocalDateTime> times)
      throws Exception {
    try (ZipInputStream in = new ZipInputStream(new ByteArrayInputStream(zip))) {
      for (ZipEntry e = in.getNextEntry(); e != null; e = in.getNextEntry()) {
        assertTrue(to.put(e.getName(), in.readAllBytes()) == null, e.getName() + " twice");
        times.add(e.getTimeLocal());
      }
    }
  }
}
