package etchloom.write;

import etchloom.artwork.Artwork;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneOffset;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.zip.CRC32;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;

/**
 * What a fab needs, once, in one archive: holes as XNC only, and a job file that lists just these.
 *
 * <p>Entries are stored, not compressed: the compressor is the Java platform's, and two platforms'
 * compressors need not give the same bytes.
 */
final class FabZip {
  /** Stands in every entry where no date is given. */
  private static final LocalDateTime FIXED = LocalDateTime.of(2000, 1, 1, 0, 0);

  /** The format's years; before its first day Java adds a field that hangs on the time zone. */
  private static final LocalDateTime FIRST = LocalDateTime.of(1980, 1, 2, 0, 0);

  private static final LocalDateTime LAST = LocalDateTime.of(2099, 12, 31, 0, 0);

  private FabZip() {}

  /**
   * @param all the files written so far, by name
   */
  static byte[] write(Artwork art, OrderInfo info, SortedMap<String, byte[]> all) {
    SortedMap<String, byte[]> wanted = new TreeMap<>();
    FileNames names = new FileNames(art.slug());
    for (int layer = 1; layer <= art.layers(); layer++) {
      take(all, names.copper(layer), wanted);
    }
    take(all, names.maskTop(), wanted);
    take(all, names.maskBottom(), wanted);
    take(all, names.legendTop(), wanted);
    take(all, names.profile(), wanted);
    take(all, names.netlist(), wanted);
    take(all, names.notes(), wanted);
    if (!Holes.plated(art).isEmpty()) {
      take(all, names.platedXnc(), wanted);
    }
    if (!Holes.nonPlated(art).isEmpty()) {
      take(all, names.nonPlatedXnc(), wanted);
    }
    wanted.put(names.job(), JobWriter.fab(art, info));
    return zip(wanted, info.created().map(FabZip::clamped).orElse(FIXED));
  }

  private static void take(
      SortedMap<String, byte[]> all, String name, SortedMap<String, byte[]> to) {
    byte[] bytes = all.get(name);
    if (bytes == null) {
      throw new IllegalStateException("the fab's archive needs " + name + ", which is not written");
    }
    to.put(name, bytes);
  }

  private static LocalDateTime clamped(Instant when) {
    if (when.isBefore(FIRST.toInstant(ZoneOffset.UTC))) {
      return FIRST;
    }
    return when.isAfter(LAST.toInstant(ZoneOffset.UTC))
        ? LAST
        : LocalDateTime.ofInstant(when, ZoneOffset.UTC);
  }

  private static byte[] zip(SortedMap<String, byte[]> files, LocalDateTime when) {
    int size = files.values().stream().mapToInt(b -> b.length).sum();
    ByteArrayOutputStream out = new ByteArrayOutputStream(size + 4_000);
    try (ZipOutputStream zip = new ZipOutputStream(out)) {
      zip.setMethod(ZipOutputStream.STORED);
      for (Map.Entry<String, byte[]> f : files.entrySet()) {
        ZipEntry e = new ZipEntry(f.getKey());
        CRC32 crc = new CRC32();
        crc.update(f.getValue());
        e.setCrc(crc.getValue());
        e.setSize(f.getValue().length);
        e.setTimeLocal(when);
        zip.putNextEntry(e);
        zip.write(f.getValue());
        zip.closeEntry();
      }
    } catch (IOException e) {
      throw new UncheckedIOException("writing to memory failed", e);
    }
    return out.toByteArray();
  }
}
