package etchloom.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.DiagnosticText;
import etchloom.diagnostic.SourceSpan;
import etchloom.diagnostic.Staged;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.function.Function;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Templates with random damage: never a trace, always a place inside the file, always soon. What is
 * still taken must survive being written and read again. Seven files, 500 mutants each.
 */
class MutationFuzzTest {
  private static final int MUTANTS = 500;

  /** Thousands of times what one takes (0.3 to 1 ms), so that a busy machine does not fail it. */
  private static final long SLOWEST_NS = 5_000_000_000L;

  private static final byte[] NASTY =
      ":{}[],\t\0\"'&*!|>%@`#?-\\\n\r ~=<0.e+"
          .concat("\u00ff\u00c3\u00ed\u00a0\u00ef\u00bf\u00be\u0085")
          .getBytes(StandardCharsets.ISO_8859_1);

  private static final List<String> VALUES =
      List.of(
          "",
          "~",
          "0",
          "-1",
          "1e999 mm",
          "1e-999999999 mm",
          "0 mm",
          "NaN",
          ".inf mm",
          "[]",
          "{}",
          "[[1]]",
          "{a: {b: c}}",
          "&a x",
          "*a",
          "!!str x",
          "|",
          ">",
          "\"",
          "'",
          "\"\\x00\"",
          "\"\\ud800\"",
          "\"\\U99999999\"",
          "../x",
          "<b>",
          "999999999999",
          "1 mm",
          "1mm",
          "3 V",
          "- 1",
          "? x",
          "@",
          "%",
          "\ud83d\ude00",
          "\u202e",
          "true",
          "1 oz",
          "20 %",
          "0.001 mm");

  private static final List<String> LINES =
      List.of(
          "---",
          "...",
          "%YAML 1.2",
          "%TAG ! x",
          "\tx: 1",
          "x",
          "? [a]: b",
          "<<: *a",
          "- x",
          "&a",
          "#",
          "  : :",
          "coil: {}",
          "rotor:",
          "\"a\": 1",
          "etchloom: 2",
          "}",
          "]");

  static Stream<Arguments> files() {
    Stream<Arguments> specs =
        IntStream.range(0, Templates.names().size())
            .mapToObj(i -> Arguments.of(100L + i, Templates.names().get(i), false));
    Stream<Arguments> fabs =
        IntStream.range(0, Templates.fabNames().size())
            .mapToObj(i -> Arguments.of(200L + i, Templates.fabNames().get(i), true));
    return Stream.concat(specs, fabs);
  }

  @ParameterizedTest(name = "seed {0}, {1}")
  @MethodSource("files")
  void damagedTemplates(long seed, String name, boolean fab) {
    Random random = new Random(seed);
    byte[] whole = fab ? Templates.fabBytes(name) : Templates.bytes(name);
    int taken = 0;
    for (int i = 0; i < MUTANTS; i++) {
      byte[] mutant = i % 2 == 0 ? bytes(whole, random) : lines(whole, random);
      boolean ok;
      try {
        ok = fab ? fab(mutant) : spec(mutant);
      } catch (RuntimeException | StackOverflowError | AssertionError e) {
        throw new AssertionError(
            "mutant " + i + " of seed " + seed + ":\n" + new String(mutant, StandardCharsets.UTF_8),
            e);
      }
      taken += ok ? 1 : 0;
    }
    // Damage to a comment does no harm, so some must pass; and most damage must be seen.
    assertTrue(taken > MUTANTS / 20 && taken < MUTANTS * 3 / 4, taken + " were taken");
  }

  private static boolean spec(byte[] mutant) {
    Staged<SpecFile> read = timed(mutant, b -> SpecReader.read("m.yaml", b));
    check(read, mutant);
    read.value()
        .ifPresent(
            f -> {
              byte[] written = Found.utf8(SpecWriter.toYaml(f.spec()));
              Staged<SpecFile> again = SpecReader.read("m.yaml", written);
              assertEquals(f.spec(), again.value().orElseThrow().spec());
            });
    return read.value().isPresent();
  }

  private static boolean fab(byte[] mutant) {
    Staged<FabRules> read = timed(mutant, b -> FabReader.read("m.yaml", b));
    check(read, mutant);
    read.value()
        .ifPresent(
            r -> {
              byte[] written = Found.utf8(FabWriter.toYaml(r));
              assertEquals(r, FabReader.read("m.yaml", written).value().orElseThrow());
            });
    return read.value().isPresent();
  }

  private static <T> T timed(byte[] mutant, Function<byte[], T> read) {
    long start = System.nanoTime();
    T result = read.apply(mutant);
    long took = System.nanoTime() - start;
    assertTrue(took < SLOWEST_NS, took + " ns");
    return result;
  }

  private static void check(Staged<?> read, byte[] mutant) {
    assertTrue(read.value().isPresent() || !read.diagnostics().isEmpty());
    String text = new String(mutant, StandardCharsets.UTF_8);
    boolean isText = Arrays.equals(mutant, Found.utf8(text));
    String[] lines = text.replace("\ufeff", "").split("\r\n|\r|\n", -1);
    for (Diagnostic d : read.diagnostics()) {
      SourceSpan at = d.where();
      assertEquals("m.yaml", at.file());
      assertTrue(at.line() >= 1 && at.line() <= lines.length, () -> at.toString());
      String line = lines[at.line() - 1];
      int length = line.codePointCount(0, line.length());
      assertTrue(at.column() >= 1 && at.column() <= length + 1, () -> at.toString());
      if (isText && !at.text().isEmpty() && !text.contains("\ufeff")) {
        assertEquals(line, at.text());
      }
      assertFalse(d.message().isBlank());
      assertFalse(d.message().contains("xception"), d.message());
    }
    assertFalse(DiagnosticText.text(read.diagnostics()).contains("\0"));
  }

  /**
   * One to four bytes changed, put in, or taken out; sometimes a run doubled or the end cut off.
   */
  private static byte[] bytes(byte[] whole, Random random) {
    byte[] b = whole.clone();
    int times = 1 + random.nextInt(4);
    for (int t = 0; t < times; t++) {
      int at = random.nextInt(b.length);
      byte nasty = NASTY[random.nextInt(NASTY.length)];
      switch (random.nextInt(7)) {
        case 0 -> b[at] = nasty;
        case 1 -> b[at] ^= (byte) (1 << random.nextInt(8));
        case 2 -> b = spliced(b, at, at, new byte[] {nasty});
        case 3 -> b = spliced(b, at, Math.min(b.length, at + 1 + random.nextInt(8)), new byte[0]);
        case 4 -> {
          int end = Math.min(b.length, at + 1 + random.nextInt(40));
          b = spliced(b, at, at, Arrays.copyOfRange(b, at, end));
        }
        case 5 ->
            b = spliced(b, at, Math.min(b.length, at + 1), new byte[] {(byte) random.nextInt()});
        default -> {
          if (random.nextInt(4) == 0) {
            b = Arrays.copyOf(b, Math.max(1, at));
          }
        }
      }
    }
    return b;
  }

  private static byte[] spliced(byte[] b, int from, int to, byte[] by) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    out.write(b, 0, from);
    out.writeBytes(by);
    out.write(b, to, b.length - to);
    return out.size() == 0 ? new byte[] {'#'} : out.toByteArray();
  }

  /** Lines dropped, doubled, swapped, moved sideways, put in, or given another value. */
  private static byte[] lines(byte[] whole, Random random) {
    List<String> all =
        new ArrayList<>(List.of(new String(whole, StandardCharsets.UTF_8).split("\n", -1)));
    int times = 1 + random.nextInt(3);
    for (int t = 0; t < times; t++) {
      int at = random.nextInt(all.size());
      int other = random.nextInt(all.size());
      String line = all.get(at);
      switch (random.nextInt(8)) {
        case 0 -> all.set(at, "");
        case 1 -> all.add(other, line);
        case 2 -> {
          all.set(at, all.get(other));
          all.set(other, line);
        }
        case 3 -> all.set(at, " ".repeat(1 + random.nextInt(3)) + line);
        case 4 -> all.set(at, line.stripLeading());
        case 5 -> all.add(at, LINES.get(random.nextInt(LINES.size())));
        default -> all.set(at, withValue(line, VALUES.get(random.nextInt(VALUES.size()))));
      }
    }
    return Found.utf8(String.join("\n", all));
  }

  private static String withValue(String line, String value) {
    int colon = line.indexOf(": ");
    return colon < 0 ? line + " " + value : line.substring(0, colon + 2) + value;
  }
}
