package etchloom.write;

import etchloom.write.PublishFailure.Reason;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.attribute.BasicFileAttributes;
import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;

/** A folder that may hold a set we wrote before. Links are looked at, never followed. */
final class EarlierSet {
  private static final int NAMES_SHOWN = 3;
  private static final int BUFFER = 1 << 16;

  private final Path folder;
  private final Path named;

  EarlierSet(Path folder) {
    this(folder, folder);
  }

  /**
   * @param named the folder as the user knows it, for messages
   */
  EarlierSet(Path folder, Path named) {
    this.folder = folder;
    this.named = named;
  }

  /** What stands at a path, without following links; empty where there is nothing. */
  static Optional<BasicFileAttributes> at(Path path) throws IOException {
    try {
      return Optional.of(
          Files.readAttributes(path, BasicFileAttributes.class, LinkOption.NOFOLLOW_LINKS));
    } catch (NoSuchFileException e) {
      return Optional.empty();
    }
  }

  /**
   * Whether a set must be moved aside: false where there is nothing, or an empty folder.
   *
   * @throws PublishFailure where there is anything but one whole, unchanged set of ours
   */
  boolean isThere() throws IOException {
    Optional<BasicFileAttributes> a = at(folder);
    if (a.isEmpty()) {
      return false;
    }
    if (a.get().isSymbolicLink()) {
      throw left(Reason.NOT_OURS, "is a symbolic link; name the folder itself");
    }
    if (!a.get().isDirectory()) {
      throw left(Reason.NOT_OURS, "is there already and is no folder");
    }
    List<String> names = names();
    if (names.isEmpty()) {
      return false;
    }
    check(names, false);
    return true;
  }

  /**
   * Deletes a set that was moved aside, the manifest last, so that a rest of it is still known.
   *
   * @throws PublishFailure where anything in it is not ours; then all is left
   */
  void delete() throws IOException {
    List<String> names = names();
    if (!names.isEmpty()) {
      check(names, true);
    }
    for (String name : names) {
      if (!name.equals(Manifest.NAME)) {
        Files.delete(folder.resolve(name));
      }
    }
    Files.deleteIfExists(folder.resolve(Manifest.NAME));
    Files.delete(folder);
  }

  /** Deletes a half-written set: files only, whatever they hold. */
  void discard() throws IOException {
    for (String name : names()) {
      Path file = folder.resolve(name);
      if (at(file).map(BasicFileAttributes::isDirectory).orElse(false)) {
        throw left(Reason.NOT_OURS, "holds a folder, '" + shown(name) + "'; please remove it");
      }
      Files.deleteIfExists(file);
    }
    Files.delete(folder);
  }

  private List<String> names() throws IOException {
    List<String> out = new ArrayList<>();
    try (DirectoryStream<Path> entries = Files.newDirectoryStream(folder)) {
      entries.forEach(p -> out.add(p.getFileName().toString()));
    } catch (java.nio.file.DirectoryIteratorException e) {
      throw e.getCause();
    }
    Collections.sort(out);
    return out;
  }

  /**
   * @param partly whether files of the set may be missing
   */
  private void check(List<String> names, boolean partly) throws IOException {
    Optional<SortedMap<String, String>> listed = manifest(names);
    if (listed.isEmpty()) {
      throw left(Reason.NOT_OURS, "holds what Etchloom did not write (" + some(names) + ")");
    }
    List<String> others = new ArrayList<>(names);
    others.remove(Manifest.NAME);
    others.removeAll(listed.get().keySet());
    if (!others.isEmpty()) {
      throw left(
          Reason.NOT_OURS, "holds more than the set that was written (" + some(others) + ")");
    }
    for (var f : listed.get().entrySet()) {
      if (!names.contains(f.getKey())) {
        if (!partly) {
          throw left(Reason.CHANGED, "lacks a file of the set that was written: " + f.getKey());
        }
      } else if (!f.getValue().equals(sum(f.getKey()))) {
        throw left(Reason.CHANGED, "holds a file changed since it was written: " + f.getKey());
      }
    }
  }

  private Optional<SortedMap<String, String>> manifest(List<String> names) throws IOException {
    Path file = folder.resolve(Manifest.NAME);
    if (!names.contains(Manifest.NAME) || !regular(file)) {
      return Optional.empty();
    }
    try (InputStream in = Files.newInputStream(file, LinkOption.NOFOLLOW_LINKS)) {
      byte[] bytes = in.readNBytes(Manifest.MAX_BYTES + 1);
      return bytes.length > Manifest.MAX_BYTES ? Optional.empty() : Manifest.read(bytes);
    }
  }

  /** The sum of a file; of anything but a plain file none. */
  private String sum(String name) throws IOException {
    Path file = folder.resolve(name);
    if (!regular(file)) {
      return "";
    }
    MessageDigest sha = Manifest.sha256();
    byte[] buffer = new byte[BUFFER];
    try (InputStream in = Files.newInputStream(file, LinkOption.NOFOLLOW_LINKS)) {
      for (int n = in.read(buffer); n >= 0; n = in.read(buffer)) {
        sha.update(buffer, 0, n);
      }
    }
    return Manifest.hex(sha.digest());
  }

  private static boolean regular(Path file) throws IOException {
    return at(file).map(BasicFileAttributes::isRegularFile).orElse(false);
  }

  private static String some(List<String> names) {
    StringBuilder s = new StringBuilder();
    for (int i = 0; i < Math.min(NAMES_SHOWN, names.size()); i++) {
      s.append(i > 0 ? ", " : "").append(shown(names.get(i)));
    }
    int rest = names.size() - NAMES_SHOWN;
    return rest > 0 ? s + " and " + rest + " more" : s.toString();
  }

  /** A file's name may hold anything; a message is one line. */
  private static String shown(String name) {
    StringBuilder s = new StringBuilder();
    name.codePoints().forEach(c -> s.appendCodePoint(Character.isISOControl(c) ? '?' : c));
    return s.toString();
  }

  private PublishFailure left(Reason reason, String what) {
    return new PublishFailure(reason, named + " " + what + "; it is left as it is");
  }
}
