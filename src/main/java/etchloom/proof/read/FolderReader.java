package etchloom.proof.read;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Enumeration;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.zip.ZipEntry;
import java.util.zip.ZipException;
import java.util.zip.ZipFile;

/**
 * Takes in the files of a layer set: those that stand directly in a folder, or all of a zip file.
 * Files of kinds that no reader is for are left out, whatever their size; the rest is bounded in
 * number, size and sum, so that no archive can fill the memory. Nothing is written anywhere, and
 * names that lead out of the archive are refused.
 */
public final class FolderReader {
  private static final int MAX_FILES = 2000;
  static final int MAX_FILE_BYTES = 50_000_000;
  static final int MAX_ALL_BYTES = 100_000_000;

  /** So much of a file tells what it is. */
  private static final int HEAD_BYTES = 4096;

  private final String name;
  private final SortedMap<String, byte[]> files = new TreeMap<>();
  private int seen;
  private long total;

  private FolderReader(String name) {
    this.name = name;
  }

  /**
   * @param path a folder, or a zip file
   * @throws UnreadableFile when it is neither, or beyond the limits
   * @throws IOException when the disk fails
   */
  public static SetFolder read(Path path) throws UnreadableFile, IOException {
    FolderReader reader = new FolderReader(path.toString());
    if (Files.isDirectory(path)) {
      reader.folder(path);
    } else if (!Files.exists(path)) {
      throw new NoSuchFileException(path.toString());
    } else {
      reader.zip(path);
    }
    return new SetFolder(path.toString(), reader.files);
  }

  private UnreadableFile fail(String code, String reason) {
    return new UnreadableFile(name, 0, code, Shown.clean(reason));
  }

  private void folder(Path path) throws UnreadableFile, IOException {
    List<Path> found = new ArrayList<>();
    try (DirectoryStream<Path> stream = Files.newDirectoryStream(path)) {
      for (Path p : stream) {
        count();
        if (Files.isRegularFile(p)) {
          found.add(p);
        }
      }
    }
    for (Path p : found) {
      String file = String.valueOf(p.getFileName());
      if (!file.startsWith(".")) {
        try (InputStream in = Files.newInputStream(p)) {
          take(file, in);
        }
      }
    }
  }

  private void count() throws UnreadableFile {
    if (++seen > MAX_FILES) {
      throw fail("too-large", "more than " + MAX_FILES + " files");
    }
  }

  private void zip(Path path) throws UnreadableFile, IOException {
    try (InputStream in = Files.newInputStream(path)) {
      byte[] head = in.readNBytes(4);
      if (head.length < 4 || head[0] != 'P' || head[1] != 'K') {
        throw fail("not-a-set", "neither a folder nor a zip file");
      }
    }
    if (Files.size(path) > MAX_ALL_BYTES) {
      throw fail("too-large", "a zip file of more than " + MAX_ALL_BYTES + " bytes");
    }
    // Names that are not UTF-8 come out wrong in this charset, but they come out.
    try (ZipFile zip = new ZipFile(path.toFile(), StandardCharsets.ISO_8859_1)) {
      Enumeration<? extends ZipEntry> entries = zip.entries();
      while (entries.hasMoreElements()) {
        entry(zip, entries.nextElement());
      }
    } catch (ZipException e) {
      throw fail("zip", "the zip file is damaged: " + e.getMessage());
    } catch (java.io.EOFException e) {
      throw fail("zip", "the zip file is damaged: an entry ends too early");
    }
  }

  private void entry(ZipFile zip, ZipEntry entry) throws UnreadableFile, IOException {
    count();
    if (entry.isDirectory()) {
      return;
    }
    String file = entry.getName().replace('\\', '/');
    Optional<String> fault = EntryName.fault(file);
    if (fault.isPresent()) {
      throw fail("zip-name", "the entry '" + file + "' " + fault.get());
    }
    if (file.startsWith("__MACOSX/") || file.startsWith(".") || file.contains("/.")) {
      return;
    }
    InputStream in = zip.getInputStream(entry);
    if (in == null) {
      throw fail("zip", "the zip file is damaged: no content for '" + file + "'");
    }
    try (in) {
      take(file, in);
    }
  }

  private void take(String file, InputStream in) throws UnreadableFile, IOException {
    byte[] head = in.readNBytes(HEAD_BYTES);
    if (FileKind.of(head) == FileKind.OTHER) {
      return;
    }
    byte[] rest = in.readNBytes(MAX_FILE_BYTES - HEAD_BYTES + 1);
    total += head.length + rest.length;
    if (head.length + rest.length > MAX_FILE_BYTES || total > MAX_ALL_BYTES) {
      throw fail(
          "too-large",
          "'"
              + file
              + "' takes the set beyond "
              + MAX_ALL_BYTES
              + " bytes, or has more than "
              + MAX_FILE_BYTES
              + " itself");
    }
    byte[] all = new byte[head.length + rest.length];
    System.arraycopy(head, 0, all, 0, head.length);
    System.arraycopy(rest, 0, all, head.length, rest.length);
    if (files.put(file, all) != null) {
      throw fail("zip-name", "the entry '" + file + "' stands twice");
    }
  }
}
