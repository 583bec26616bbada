package etchloom.write;

import etchloom.write.PublishFailure.Reason;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Map;
import java.util.SortedMap;

/**
 * Puts a finished set in its folder, whole or not at all.
 *
 * <p>The set is written to a sibling, {@code NAME.etchloom-new}, and moved into place by one
 * rename. An earlier set of ours is first moved aside to {@code NAME.etchloom-old}, since no rename
 * replaces a folder that holds files, and deleted last under {@code NAME.etchloom-gone}. A process
 * killed in between leaves the old set or the new one, in place or (for the moment between two
 * renames) under {@code -old}; the next run puts right what was left. A lock keeps runs of other
 * processes apart. Files are not forced to the medium: against a loss of power the file system's
 * own order of writes must do.
 */
public final class Publisher {
  /** Called before each step on the disk, by its name; a test may end the run there. */
  interface Watch {
    void before(String step);
  }

  private final Path given;
  private final Watch watch;
  private final Deque<Path> made = new ArrayDeque<>();
  private Path place;
  private Path fresh;
  private Path old;
  private Path gone;

  private Publisher(Path given, Watch watch) {
    this.given = given;
    this.watch = watch;
  }

  /**
   * Writes a set to a folder, which need not exist, nor its parents.
   *
   * @param files by name, {@link Manifest#NAME} among them
   * @throws PublishFailure when something foreign is in the way or the disk fails; then what was
   *     there before still is
   */
  public static void publish(Path folder, SortedMap<String, byte[]> files) throws PublishFailure {
    publish(folder, files, step -> {});
  }

  /** Locks belong to a process: its own threads take turns. */
  static synchronized void publish(Path folder, SortedMap<String, byte[]> files, Watch watch)
      throws PublishFailure {
    if (!files.containsKey(Manifest.NAME)) {
      throw new IllegalArgumentException("a set without a " + Manifest.NAME);
    }
    for (String name : files.keySet()) {
      if (!Manifest.plain(name) && !name.equals(Manifest.NAME)) {
        throw new IllegalArgumentException("a file name that leaves the folder: " + name);
      }
    }
    new Publisher(folder, watch).run(files);
  }

  @SuppressWarnings("try") // the lock is only held
  private void run(SortedMap<String, byte[]> files) throws PublishFailure {
    try {
      resolve();
      watch.before("lock");
      try (FolderLock lock = FolderLock.acquire(sibling(".", "lock"), given)) {
        recover();
        boolean replace = new EarlierSet(place, given).isThere();
        write(files);
        exchange(replace);
      }
    } catch (IOException e) {
      removeMade();
      throw PublishFailure.of(e, given);
    }
  }

  /** Links in the parent's path are followed once, here; the folder itself must not be one. */
  private void resolve() throws IOException {
    Path whole = given.toAbsolutePath();
    Path name = whole.getFileName();
    if (name == null || name.toString().equals(".") || name.toString().equals("..")) {
      whole = whole.toRealPath();
    }
    Path parent = whole.getParent();
    if (parent == null) {
      throw new PublishFailure(Reason.NOT_OURS, given + " is no folder to write a set to");
    }
    makeParents(parent);
    place = parent.toRealPath().resolve(whole.getFileName());
    if (Files.isDirectory(place) && Files.isSameFile(place, Path.of(""))) {
      throw new PublishFailure(
          Reason.NOT_OURS,
          given + " is the current folder; name another, it is made if it is not there");
    }
    fresh = sibling("", "new");
    old = sibling("", "old");
    gone = sibling("", "gone");
  }

  private void makeParents(Path parent) throws IOException {
    Deque<Path> missing = new ArrayDeque<>();
    for (Path p = parent; p != null && !Files.exists(p); p = p.getParent()) {
      missing.push(p);
    }
    for (Path p : missing) {
      Files.createDirectory(p);
      made.push(p);
    }
  }

  private void removeMade() {
    try {
      for (Path p : made) {
        Files.deleteIfExists(p);
      }
    } catch (IOException e) {
      // Not empty any more: somebody else uses it now.
    }
  }

  private Path sibling(String before, String what) {
    return place.resolveSibling(before + place.getFileName() + ".etchloom-" + what);
  }

  /** Puts right what a killed run left. */
  private void recover() throws IOException {
    if (EarlierSet.at(gone).isPresent()) {
      new EarlierSet(gone).delete();
    }
    if (EarlierSet.at(old).isPresent()) {
      if (new EarlierSet(place, given).isThere()) {
        retire();
      } else {
        watch.before("put back");
        move(old, place);
      }
    }
    if (EarlierSet.at(fresh).isPresent()) {
      new EarlierSet(fresh).discard();
    }
  }

  private void write(SortedMap<String, byte[]> files) throws IOException {
    watch.before("make folder");
    Files.createDirectory(fresh);
    try {
      for (Map.Entry<String, byte[]> f : files.entrySet()) {
        watch.before("write " + f.getKey());
        Files.write(
            fresh.resolve(f.getKey()),
            f.getValue(),
            StandardOpenOption.CREATE_NEW,
            StandardOpenOption.WRITE);
      }
    } catch (IOException e) {
      discardAfter(e);
      throw e;
    }
  }

  private void exchange(boolean replace) throws IOException {
    try {
      if (replace) {
        watch.before("move aside");
        move(place, old);
      }
      watch.before("move in");
      move(fresh, place);
    } catch (IOException e) {
      if (EarlierSet.at(old).isPresent() && EarlierSet.at(place).isEmpty()) {
        move(old, place);
      }
      discardAfter(e);
      throw e;
    }
    if (replace) {
      try {
        retire();
      } catch (IOException e) {
        throw PublishFailure.after(e, given);
      }
    }
  }

  /** The new set is in place; what was moved aside goes. */
  private void retire() throws IOException {
    watch.before("retire");
    move(old, gone);
    watch.before("delete");
    new EarlierSet(gone).delete();
  }

  private void discardAfter(IOException reason) {
    try {
      new EarlierSet(fresh).discard();
    } catch (IOException e) {
      reason.addSuppressed(e);
    }
  }

  private static void move(Path from, Path to) throws IOException {
    Files.move(from, to, StandardCopyOption.ATOMIC_MOVE);
  }
}
