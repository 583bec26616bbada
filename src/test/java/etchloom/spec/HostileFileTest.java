package etchloom.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.diagnostic.Staged;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Files that are no specs at all, broken YAML, and files made to exhaust the reader. */
class HostileFileTest {
  private static final String WHEEL = Found.file("wheel.yaml");
  private static final int MIB = 1 << 20;

  /** Ten times what the slowest takes on a slow machine that does other things as well. */
  private static final Duration BOUND = Duration.ofSeconds(30);

  private static Staged<SpecFile> read(byte[] bytes) {
    return assertTimeoutPreemptively(BOUND, () -> SpecReader.read("x.yaml", bytes));
  }

  private static Staged<SpecFile> read(String text) {
    return read(Found.utf8(text));
  }

  private static void refused(String says, Staged<?> read, String... found) {
    assertEquals(List.of(found), Found.in(read), Found.words(read));
    assertTrue(Found.words(read).contains(says), Found.words(read));
  }

  @Test
  void nothingInIt() {
    refused("it must start with `etchloom: 1`", read(""), "1:1 empty-file");
    refused("the command `new`", read(" \n# a comment\n\n"), "1:1 empty-file");
    refused("empty", read("---\n"), "1:1 empty-file");
    refused("empty", read("\ufeff"), "1:1 empty-file");
    Staged<FabRules> fab = FabReader.read("x.yaml", new byte[0]);
    refused("it must start with `etchloom-fab: 1`", fab, "1:1 empty-file");
  }

  @Test
  void noKeys() {
    refused("keys with values", read("hello"), "1:1 yaml");
    refused("keys with values", read("- a\n- b\n"), "1:1 yaml");
    refused(
        "version of the format",
        read("{}"),
        "1:1 missing-key etchloom",
        "1:1 missing-key title",
        "1:1 missing-key rotor",
        "1:1 missing-key winding",
        "1:1 missing-key coil",
        "1:1 missing-key via",
        "1:1 missing-key board",
        "1:1 missing-key fab");
  }

  @Test
  void noText() {
    byte[] png = {(byte) 0x89, 'P', 'N', 'G', '\r', '\n', 0x1a, '\n'}; // PNG signature, RFC 2083
    refused("byte 0x89 here (byte 1 of the file) is not UTF-8", read(png), "1:1 encoding");
    refused("U+0003", read("PK\u0003\u0004"), "1:3 encoding");
    refused("U+0000", read("etchloom: 1\ntitle: a\u0000b\n"), "2:9 encoding");
    byte[] utf16 = WHEEL.getBytes(StandardCharsets.UTF_16);
    refused("save it as UTF-8", read(utf16), "1:1 encoding");
    byte[] latin = "etchloom: 1\ntitle: K\u00fchler\n".getBytes(StandardCharsets.ISO_8859_1);
    refused("byte 0xFC here (byte 21 of the file)", read(latin), "2:9 encoding");
  }

  @ParameterizedTest(name = "seed {0}")
  @CsvSource({"1", "2", "3", "4", "5"})
  void binaryGarbage(long seed) {
    byte[] bytes = new byte[5000];
    new Random(seed).nextBytes(bytes);
    Staged<SpecFile> read = read(bytes);
    assertEquals(1, read.diagnostics().size());
    assertEquals("encoding", read.diagnostics().get(0).code());
  }

  @Test
  void tooLarge() {
    byte[] two = new byte[2 * MIB];
    Arrays.fill(two, (byte) '#');
    refused("at most 1048576 bytes", read(two), "1:1 file-too-big");
    byte[] most = (WHEEL + "#".repeat(MIB)).substring(0, MIB).getBytes(StandardCharsets.UTF_8);
    assertEquals(List.of(), Found.in(read(most)));
    byte[] oneMore = Arrays.copyOf(most, MIB + 1);
    refused("too large", read(oneMore), "1:1 file-too-big");
  }

  @Test
  void aByteOrderMark_isTaken() {
    assertEquals(List.of(), Found.in(read("\ufeff" + WHEEL)));
    String text = "\ufeff" + Found.with(WHEEL, "etchloom: 1", "etchloom: 1.5");
    refused("this program reads 1", read(text), "1:11 format etchloom");
  }

  @Test
  void otherLineEnds_areCountedAlike() {
    String wrong = Found.with(WHEEL, "coils: 9", "coils: 0");
    refused("1 to 360", read(wrong.replace("\n", "\r\n")), "19:10 out-of-range winding.coils");
    refused("1 to 360", read(wrong.replace("\n", "\r")), "19:10 out-of-range winding.coils");
  }

  /** Columns count characters as a person does, not bytes or halves of characters. */
  @Test
  void columns_countCharacters() {
    String text =
        Found.with(WHEEL, "holes: {count: 4", "holes: {\"\ud83d\ude00\u00fc\": 1, count: 4");
    refused("has no key", read(text), "37:11 unknown-key board.holes.\ud83d\ude00\u00fc");
    String two = Found.with(text, "circle: 78 mm", "circle: 78");
    assertTrue(Found.in(read(two)).contains("37:56 missing-unit board.holes.circle"));
  }

  @Test
  void tabs() {
    String text = Found.with(WHEEL, "  coils: 9\n", "\tcoils: 9\n");
    text = Found.with(text, "  space", "  \tspace");
    refused("only spaces", read(text), "19:1 tab", "27:3 tab");
    String after = Found.with(WHEEL, "coils: 9", "coils:\t9");
    refused("only spaces", read(after), "19:9 yaml");
  }

  @Test
  void severalDocuments() {
    refused("holds one", read(WHEEL + "---\n" + WHEEL), "42:1 documents");
    assertEquals(List.of(), Found.in(read("---\n" + WHEEL + "...\n")));
    refused("nothing may stand here", read(WHEEL + "...\nmore\n"), "43:1 yaml");
  }

  /** What stands before the fault is checked all the same; what stands after it is not missed. */
  @Test
  void brokenYaml_doesNotHideOtherMistakes() {
    String text = Found.with(WHEEL, "poles: 12", "poles: 13");
    refused("never closed", read(Found.with(text, "title: ", "title: \"")), "2:8 yaml");
    refused(
        "the closing `}` is missing",
        read(Found.with(text, "start: 45 deg}", "start: 45 deg")),
        "5:10 out-of-range rotor.poles",
        "38:4 yaml");
    refused(
        "a key without a `:`",
        read(Found.with(text, "  track: ", "  track ")),
        "5:10 out-of-range rotor.poles",
        "26:3 yaml");
    refused(
        "indentation",
        read(Found.with(text, "  track", " track")),
        "5:10 out-of-range rotor.poles",
        "26:2 yaml");
    refused(
        "a second `:`",
        read(Found.with(text, "fab: standard", "fab: a: b")),
        "5:10 out-of-range rotor.poles",
        "38:7 yaml");
    refused(
        "cannot begin with `@`",
        read(Found.with(text, "1 oz", "@1 oz")),
        "5:10 out-of-range rotor.poles",
        "34:11 yaml");
    refused(
        "no Unicode character",
        read(Found.with(text, "1 oz", "\"\\UFFFFFFFF\"")),
        "5:10 out-of-range rotor.poles",
        "34:12 yaml");
  }

  @Test
  void deepNesting() {
    refused(
        "more than 16 deep",
        read(WHEEL + "x: " + "[".repeat(500_000)),
        "42:20 depth x" + "[0]".repeat(16));
    refused("more than 16 deep", read("{".repeat(MIB)), "1:18 depth");
    refused("more than 16 deep", read("? ".repeat(MIB / 2)), "1:35 depth");
    String steps =
        IntStream.range(0, 1000)
            .mapToObj(i -> " ".repeat(i) + "a:\n")
            .collect(Collectors.joining());
    refused("more than 16 deep", read(steps), "18:18 depth a" + ".a".repeat(16));
  }

  @Test
  void floods() {
    String keys =
        IntStream.range(0, 90_000).mapToObj(i -> "k" + i).collect(Collectors.joining(": 1\n"));
    many(keys + ": 1\n");
    many("{" + keys.replace('\n', ',') + ": 1}");
    many("k: 1\n".repeat(200_000));
    many("coil:\n" + "  track: 1\n".repeat(90_000));
    many("board:\n  stackup: [" + "0.2 mm, ".repeat(100_000) + "]\n");
    many(
        IntStream.range(0, 60_000)
            .mapToObj(i -> "k" + i + ": &a" + i + " 1\n")
            .collect(Collectors.joining()));
    many("a: &a 1\n" + "b: *a\n".repeat(150_000));
  }

  private static void many(String text) {
    Staged<SpecFile> read = read(text.substring(0, Math.min(MIB, text.length())));
    assertTrue(
        read.diagnostics().stream()
            .anyMatch(d -> d.code().equals("too-many-values") || d.code().equals("too-many")),
        () -> Found.words(read));
  }

  @Test
  void longPieces() {
    String x = "x".repeat(MIB - 2000);
    refused("at most 120", read(Found.with(WHEEL, "Test wheel", x)), "2:8 text title");
    refused(
        "a finite number belongs here",
        read(Found.with(WHEEL, "0.2 mm", "1".repeat(MIB - 2000) + " mm")),
        "26:10 not-a-number coil.track");
    Staged<SpecFile> key = read(WHEEL + "? " + x + "\n: 1\n");
    assertEquals(1, key.diagnostics().size());
    assertEquals("...", key.diagnostics().get(0).key().substring(60));
    assertTrue(Found.words(key).length() < 400);
  }
}
