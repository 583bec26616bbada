package etchloom.proof.read;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Random;

/**
 * Feeds every reader with spoilt files, the same ones each time. A reader may read them or refuse
 * them with {@link UnreadableFile}; anything else ends the run with the input printed.
 *
 * <p>Run by {@link ReaderFuzzTest} in a virtual machine of its own with 512 MB.
 */
final class ReaderFuzz {
  /** Far more processor time than any input may take, s. */
  private static final double LONGEST_S = 5;

  private static final ThreadMXBean THREADS = ManagementFactory.getThreadMXBean();

  /** What stands for a reader here: bytes in, anything with a telling text out. */
  interface Reader {
    Object read(byte[] bytes) throws UnreadableFile, IOException;
  }

  record Target(String name, Reader reader, List<byte[]> samples, int inputs) {}

  private int read;
  private int refused;
  private double slowestS;
  private String slowest = "";

  private ReaderFuzz() {}

  public static void main(String[] args) throws Exception {
    ReaderFuzz fuzz = new ReaderFuzz();
    for (Target t : FuzzTargets.all(Path.of(args[0]))) {
      fuzz.spoil(t);
    }
    List<FuzzBombs.Bomb> bombs = FuzzBombs.all();
    for (FuzzBombs.Bomb b : bombs) {
      fuzz.one(b.name(), b.reader(), b.text().getBytes(StandardCharsets.UTF_8));
    }
    System.out.println(
        (fuzz.read + fuzz.refused)
            + " inputs, "
            + fuzz.read
            + " read, "
            + fuzz.refused
            + " refused, slowest "
            + Math.round(1000 * fuzz.slowestS)
            + " ms: "
            + fuzz.slowest);
  }

  private void spoil(Target t) throws IOException {
    Random random = new Random(t.name().hashCode());
    byte[] all = joined(t.samples());
    for (int i = 0; i < t.inputs(); i++) {
      byte[] bytes = t.samples().get(i % t.samples().size());
      for (int n = 1 + random.nextInt(2) * random.nextInt(4); n > 0; n--) {
        bytes = mutated(bytes, all, random);
      }
      one(t.name() + " " + i, t.reader(), bytes);
    }
  }

  private void one(String name, Reader reader, byte[] bytes) throws IOException {
    long start = THREADS.getCurrentThreadCpuTime();
    try {
      String text = reader.read(bytes).toString();
      if (text.contains("NaN") || text.contains("Infinity")) {
        fail(name, bytes, new IllegalStateException("a number that is none: " + text));
      }
      read++;
    } catch (UnreadableFile e) {
      refused++;
      if (!e.getMessage().equals(Shown.clean(e.getMessage())) || e.reason().isEmpty()) {
        fail(name, bytes, e);
      }
    } catch (RuntimeException | StackOverflowError | OutOfMemoryError e) {
      fail(name, bytes, e);
    }
    double s = (THREADS.getCurrentThreadCpuTime() - start) * 1e-9;
    if (s > slowestS) {
      slowestS = s;
      slowest = name;
    }
    if (s > LONGEST_S) {
      fail(name, bytes, new IllegalStateException("took " + s + " s"));
    }
  }

  private static void fail(String name, byte[] bytes, Throwable why) {
    System.out.println("FAILED on " + name + ", " + bytes.length + " bytes:");
    System.out.println(
        new String(bytes, 0, Math.min(bytes.length, 3000), StandardCharsets.ISO_8859_1));
    why.printStackTrace(System.out);
    System.exit(1);
  }

  private static byte[] joined(List<byte[]> samples) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    samples.forEach(out::writeBytes);
    return out.toByteArray();
  }

  private static final String[] TOKENS = {
    "999999999",
    "-",
    "0",
    ".",
    "1e308",
    "99999",
    "0.0000001",
    "*",
    "%",
    "\n",
    ",",
    "X",
    "$1",
    "(",
    "\0",
    "\u00ff",
    "D01*",
    "G36*",
    "G37*",
    "M02*",
    "%AB*%",
    "%SRX9Y9I1J1*%",
    "<g>",
    "</g>",
    "\"",
    "{",
    "]",
    "Z",
    "A1 1 0 1 0 2 2",
    "T1",
    "M15",
    "R99",
    "0\nSECTION\n",
    " ",
    "\\u",
    "-0"
  };

  /** One change: a bit, a run cut out or doubled, a token or a piece of a sample put in. */
  private static byte[] mutated(byte[] b, byte[] all, Random random) {
    if (b.length == 0) {
      return b;
    }
    int at = random.nextInt(b.length);
    int most = random.nextInt(4) == 0 ? b.length : 12;
    int end = Math.min(b.length, at + 1 + random.nextInt(most));
    switch (random.nextInt(10)) {
      case 0 -> {
        byte[] out = b.clone();
        out[at] ^= (byte) (1 << random.nextInt(8));
        return out;
      }
      case 1 -> {
        return spliced(b, at, end, new byte[0]);
      }
      case 2 -> {
        return spliced(b, at, at, Arrays.copyOfRange(b, at, end));
      }
      case 3 -> {
        String token = TOKENS[random.nextInt(TOKENS.length)];
        return spliced(b, at, at, token.getBytes(StandardCharsets.ISO_8859_1));
      }
      case 4 -> {
        int from = random.nextInt(all.length);
        int to = Math.min(all.length, from + 1 + random.nextInt(60));
        return spliced(b, at, at, Arrays.copyOfRange(all, from, to));
      }
      case 5 -> {
        int i = digit(b, at);
        byte[] sign = {(byte) (random.nextBoolean() ? '-' : '.')};
        return spliced(b, i, i, sign);
      }
      case 6 -> {
        int i = digit(b, at);
        return spliced(b, i, i, "9".repeat(1 + random.nextInt(8)).getBytes(StandardCharsets.UTF_8));
      }
      default -> {
        byte[] out = b.clone();
        int i = digit(b, at);
        out[Math.min(i, b.length - 1)] = (byte) ('0' + random.nextInt(10));
        return out;
      }
    }
  }

  /** Where the next digit stands; the end when there is none. */
  private static int digit(byte[] b, int at) {
    int i = at;
    while (i < b.length && (b[i] < '0' || b[i] > '9')) {
      i++;
    }
    return i;
  }

  private static byte[] spliced(byte[] b, int from, int to, byte[] put) {
    ByteArrayOutputStream out = new ByteArrayOutputStream(b.length + put.length);
    out.write(b, 0, from);
    out.writeBytes(put);
    out.write(b, to, b.length - to);
    return out.toByteArray();
  }
}
