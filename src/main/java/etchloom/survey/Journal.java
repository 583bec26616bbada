package etchloom.survey;

import com.fasterxml.jackson.jr.ob.JSON;
import java.io.BufferedInputStream;
import java.io.BufferedReader;
import java.io.Closeable;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import java.util.stream.Stream;

/**
 * A survey's memory on the disk: a line that says what is surveyed, then a line for each finished
 * variant, in their order. What an interruption left unfinished at the end is cut off when it is
 * opened again; a lock keeps a second survey out.
 */
final class Journal implements Closeable {
  static final String NAME = "survey.journal";

  private final FileChannel file;
  private long next;

  private Journal(FileChannel file) {
    this.file = file;
  }

  /**
   * Begins a survey in a folder, or goes on with it.
   *
   * @throws SurveyTrouble where the folder holds anything else, or is in use
   */
  static Journal open(Path dir, Plan plan) throws IOException {
    Files.createDirectories(dir);
    if (!Files.exists(dir.resolve(NAME)) && !empty(dir)) {
      throw new SurveyTrouble(
          dir + ": holds something that is no survey; name another folder with -o");
    }
    return open(dir, NAME, plan, plan.first());
  }

  /**
   * A journal beside the survey's own, in a folder that is known to be the survey's.
   *
   * @param first the first row's number
   */
  static Journal open(Path dir, String name, Plan plan, long first) throws IOException {
    Path path = dir.resolve(name);
    FileChannel file =
        FileChannel.open(
            path, StandardOpenOption.CREATE, StandardOpenOption.READ, StandardOpenOption.WRITE);
    Journal j = new Journal(file);
    try {
      j.lock(dir);
      j.resume(dir, path, plan, first);
    } catch (IOException | RuntimeException e) {
      file.close();
      throw e;
    }
    return j;
  }

  private static boolean empty(Path dir) throws IOException {
    try (Stream<Path> some = Files.list(dir)) {
      return some.findAny().isEmpty();
    }
  }

  private void lock(Path dir) throws IOException {
    FileLock lock;
    try {
      lock = file.tryLock();
    } catch (OverlappingFileLockException e) {
      lock = null;
    }
    if (lock == null) {
      throw new SurveyTrouble(dir + ": another survey is at work in it");
    }
  }

  private void resume(Path dir, Path path, Plan plan, long first) throws IOException {
    String head = head(plan);
    byte[] wanted = (head + "\n").getBytes(StandardCharsets.UTF_8);
    byte[] found = new byte[wanted.length];
    int n = 0;
    try (InputStream in = Files.newInputStream(path)) {
      n = in.readNBytes(found, 0, found.length);
    }
    if (Arrays.equals(found, wanted)) {
      scan(path, first, wanted.length);
    } else if (n < wanted.length && Arrays.equals(found, 0, n, wanted, 0, n)) {
      file.truncate(0);
      file.position(0);
      write(wanted);
      next = first;
    } else {
      throw new SurveyTrouble(
          dir
              + ": holds another survey (of another spec, rules, values or version); name another"
              + " folder with -o");
    }
  }

  /** Finds the end of the last whole line that belongs where it stands, and cuts what follows. */
  private void scan(Path path, long first, long from) throws IOException {
    long good = from;
    next = first;
    try (InputStream in = new BufferedInputStream(Files.newInputStream(path), 1 << 16)) {
      in.skipNBytes(from);
      long at = from;
      byte[] start = start(next);
      int matched = 0;
      int before = 0;
      for (int b = in.read(); b >= 0; b = in.read()) {
        at++;
        if (b == '\n') {
          if (matched != start.length || before != '}') {
            break;
          }
          good = at;
          next++;
          start = start(next);
          matched = 0;
        } else if (matched >= 0 && matched < start.length) {
          matched = b == start[matched] ? matched + 1 : -1;
        }
        before = b;
      }
    }
    file.truncate(good);
    file.position(good);
  }

  private static byte[] start(long variant) {
    return ("{\"variant\":" + variant + ",").getBytes(StandardCharsets.UTF_8);
  }

  /** The variant that the next row must be of. */
  long next() {
    return next;
  }

  void append(Row row) {
    if (row.variant() != next) {
      throw new IllegalStateException("row " + row.variant() + " where " + next + " belongs");
    }
    try {
      write((RowJson.write(row) + "\n").getBytes(StandardCharsets.UTF_8));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    next++;
  }

  private void write(byte[] bytes) throws IOException {
    ByteBuffer b = ByteBuffer.wrap(bytes);
    while (b.hasRemaining()) {
      file.write(b);
    }
  }

  @Override
  public void close() throws IOException {
    file.close();
  }

  private static String head(Plan plan) throws IOException {
    Map<String, Object> head = new LinkedHashMap<>();
    head.put("etchloomSurvey", 1);
    head.put("fingerprint", plan.fingerprint());
    head.put("version", plan.toolVersion());
    head.put("title", plan.title());
    head.put("slug", plan.slug());
    head.put("kind", plan.kind());
    head.put("count", plan.count());
    head.put("part", plan.part().toString());
    Map<String, Object> axes = new LinkedHashMap<>();
    plan.axes().forEach(a -> axes.put(a.key(), a.values()));
    head.put("vary", axes);
    return JSON.std.asString(head);
  }

  /**
   * What a folder's survey is about.
   *
   * @throws SurveyTrouble where it holds none
   */
  @SuppressWarnings("unchecked")
  static Plan plan(Path dir) throws IOException {
    Path path = dir.resolve(NAME);
    if (!Files.exists(path)) {
      throw new SurveyTrouble(dir + ": holds no survey");
    }
    try (BufferedReader in = reader(path)) {
      String line = in.readLine();
      Map<String, Object> head = JSON.std.mapFrom(line == null ? "" : line);
      List<Axis> axes =
          ((Map<String, List<String>>) head.get("vary"))
              .entrySet().stream().map(e -> new Axis(e.getKey(), e.getValue())).toList();
      return new Plan(
          (String) head.get("fingerprint"),
          (String) head.get("version"),
          (String) head.get("title"),
          (String) head.get("slug"),
          (String) head.get("kind"),
          axes,
          ((Number) head.get("count")).longValue(),
          Part.read((String) head.get("part")).orElseThrow());
    } catch (RuntimeException | com.fasterxml.jackson.core.JacksonException e) {
      throw new SurveyTrouble(path + ": is no survey's journal");
    }
  }

  /** Every row of a folder's journal in turn. */
  static void each(Path dir, Consumer<Row> sink) throws IOException {
    each(dir, NAME, sink);
  }

  /** As above, of a journal beside the survey's own. */
  static void each(Path dir, String name, Consumer<Row> sink) throws IOException {
    try (BufferedReader in = reader(dir.resolve(name))) {
      in.readLine();
      String line = in.readLine();
      while (line != null) {
        String after = in.readLine();
        if (after != null || line.endsWith("}}")) { // else torn by an interruption
          sink.accept(RowJson.read(line));
        }
        line = after;
      }
    }
  }

  private static BufferedReader reader(Path path) throws IOException {
    return new BufferedReader(
        new InputStreamReader(Files.newInputStream(path), StandardCharsets.UTF_8), 1 << 16);
  }
}
