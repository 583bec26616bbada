package etchloom.write;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.write.PublishFailure.Reason;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PublisherTest {
  @TempDir Path dir;

  /** A set of three files whose content tells which it is. */
  static SortedMap<String, byte[]> set(String which) {
    SortedMap<String, byte[]> files = new TreeMap<>();
    files.put("board.gbr", (which + " copper").repeat(500).getBytes(StandardCharsets.UTF_8));
    files.put("notes.txt", (which + " notes").getBytes(StandardCharsets.UTF_8));
    files.put("report-" + which + ".html", which.getBytes(StandardCharsets.UTF_8));
    files.put(Manifest.NAME, Manifest.of("0.1.0", files));
    return files;
  }

  /** Which set a folder holds, checked to the last byte; "none" where there is no folder. */
  static String held(Path folder) throws IOException {
    if (!Files.exists(folder, LinkOption.NOFOLLOW_LINKS)) {
      return "none";
    }
    for (String which : List.of("one", "two")) {
      SortedMap<String, byte[]> expected = set(which);
      if (Files.exists(folder.resolve("report-" + which + ".html"))) {
        try (Stream<Path> entries = Files.list(folder)) {
          assertEquals(
              List.copyOf(expected.keySet()),
              entries.map(p -> p.getFileName().toString()).sorted().toList());
        }
        for (var f : expected.entrySet()) {
          assertEquals(
              new String(f.getValue(), StandardCharsets.UTF_8),
              Files.readString(folder.resolve(f.getKey())));
        }
        return which;
      }
    }
    throw new AssertionError("neither set in " + folder);
  }

  @Test
  void aNewFolder_isMade_withItsParents_andNothingBesides() throws Exception {
    Path folder = dir.resolve("a/b/set");
    Publisher.publish(folder, set("one"));
    assertEquals("one", held(folder));
    assertEquals(List.of("set"), names(dir.resolve("a/b")));
  }

  @Test
  void anEarlierSet_isReplaced_andSoIsAnEmptyFolder() throws Exception {
    Path folder = dir.resolve("set");
    Files.createDirectory(folder);
    Publisher.publish(folder, set("one"));
    assertEquals("one", held(folder));
    Publisher.publish(folder, set("two"));
    assertEquals("two", held(folder));
    assertEquals(List.of("set"), names(dir));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "foreign",
        "file",
        "changed",
        "missing",
        "extra",
        "hidden",
        "subfolder",
        "link-to-set",
        "dangling-link",
        "linked-file",
        "folder-for-file",
        "broken-manifest",
        "linked-manifest",
        "huge-manifest"
      })
  void whatIsNotOurs_isLeftAsItIs(String what) throws Exception {
    Path folder = dir.resolve("set");
    Path elsewhere = dir.resolve("elsewhere");
    Publisher.publish(what.startsWith("link-to") ? elsewhere : folder, set("one"));
    Path notes = folder.resolve("notes.txt");
    Path manifest = folder.resolve(Manifest.NAME);
    switch (what) {
      case "foreign" -> {
        empty(folder);
        Files.writeString(folder.resolve("thesis.doc"), "years");
      }
      case "file" -> {
        empty(folder);
        Files.delete(folder);
        Files.writeString(folder, "a file");
      }
      case "changed" -> Files.writeString(notes, "one notez");
      case "missing" -> Files.delete(notes);
      case "extra" -> Files.writeString(folder.resolve("mine.txt"), "mine");
      case "hidden" -> Files.writeString(folder.resolve(".git"), "mine");
      case "subfolder" -> Files.createDirectory(folder.resolve("old"));
      case "link-to-set" -> Files.createSymbolicLink(folder, elsewhere);
      case "dangling-link" -> {
        empty(folder);
        Files.delete(folder);
        Files.createSymbolicLink(folder, dir.resolve("nowhere"));
      }
      case "linked-file" -> {
        Files.move(notes, elsewhere);
        Files.createSymbolicLink(notes, elsewhere);
      }
      case "folder-for-file" -> {
        Files.delete(notes);
        Files.createDirectory(notes);
      }
      case "broken-manifest" -> Files.writeString(manifest, "{\"tool\":\"etchloom\",");
      case "linked-manifest" -> {
        Files.move(manifest, elsewhere);
        Files.createSymbolicLink(manifest, elsewhere);
      }
      default ->
          Files.writeString(manifest, Files.readString(manifest) + " ".repeat(Manifest.MAX_BYTES));
    }
    List<String> before = tree(dir);
    PublishFailure f =
        assertThrows(PublishFailure.class, () -> Publisher.publish(folder, set("two")));
    boolean changed =
        List.of("changed", "missing", "linked-file", "folder-for-file").contains(what);
    assertEquals(changed ? Reason.CHANGED : Reason.NOT_OURS, f.reason(), f.getMessage());
    assertTrue(f.getMessage().startsWith(folder.toString()), f.getMessage());
    assertFalse(f.getMessage().contains("\n"), f.getMessage());
    assertEquals(before, tree(dir));
  }

  @Test
  void theCurrentFolder_andTheRoot_areRefused() {
    for (String path : List.of(".", "", "/")) {
      PublishFailure f =
          assertThrows(
              PublishFailure.class, () -> Publisher.publish(Path.of(path), set("one")), path);
      assertEquals(Reason.NOT_OURS, f.reason());
    }
  }

  @Test
  void aParentThatIsALink_isFollowed() throws Exception {
    Files.createDirectory(dir.resolve("real"));
    Files.createSymbolicLink(dir.resolve("alias"), dir.resolve("real"));
    Publisher.publish(dir.resolve("alias/set"), set("one"));
    assertEquals("one", held(dir.resolve("real/set")));
  }

  /** Ends the run where it stands, as a kill would: nothing is cleaned up but the lock falls. */
  private static final class Killed extends Error {
    private static final long serialVersionUID = 1;
  }

  @Test
  void killedBeforeAnyStep_leavesOneSetOrTheOther_andTheNextRunPutsAllRight() throws Exception {
    List<String> steps = new ArrayList<>();
    Publisher.publish(dir.resolve("count"), set("one"));
    Publisher.publish(dir.resolve("count"), set("two"), steps::add);
    assertTrue(steps.size() >= 9, steps.toString());
    for (int last = 0; last < steps.size(); last++) {
      Path parent = Files.createDirectory(dir.resolve("run" + last));
      Path folder = parent.resolve("set");
      Publisher.publish(folder, set("one"));
      kill(folder, "two", last);
      String step = steps.get(last);
      boolean between = step.equals("move in");
      boolean done = step.equals("retire") || step.equals("delete");
      assertEquals(between ? "none" : done ? "two" : "one", held(folder), "before " + step);
      if (between) {
        assertEquals("one", held(parent.resolve("set.etchloom-old")));
      }
      kill(folder, "two", last / 2); // a second kill, also amid the putting right
      Publisher.publish(folder, set("one"));
      assertEquals("one", held(folder), "after " + step);
      assertEquals(List.of("set"), names(parent), "after " + step);
    }
  }

  private static void kill(Path folder, String which, int steps) {
    int[] left = {steps};
    assertThrows(
        Killed.class,
        () ->
            Publisher.publish(
                folder,
                set(which),
                step -> {
                  if (left[0]-- == 0) {
                    throw new Killed();
                  }
                }));
  }

  @Test
  void leftoversThatSomebodyChanged_areKept() throws Exception {
    Path folder = dir.resolve("set");
    Publisher.publish(folder, set("one"));
    Path gone = dir.resolve("set.etchloom-gone");
    Publisher.publish(gone, set("two"));
    Files.writeString(gone.resolve("notes.txt"), "mine now");
    List<String> before = tree(dir);
    PublishFailure f =
        assertThrows(PublishFailure.class, () -> Publisher.publish(folder, set("two")));
    assertEquals(Reason.CHANGED, f.reason());
    assertEquals(before, tree(dir));
  }

  /** A foreign folder came to stand where a killed run had moved the old set away from. */
  @Test
  void anOldSetAside_isKept_whileSomethingForeignStandsInItsPlace() throws Exception {
    Path folder = dir.resolve("set");
    Publisher.publish(dir.resolve("set.etchloom-old"), set("one"));
    Files.createDirectory(folder);
    Files.writeString(folder.resolve("mine.txt"), "mine");
    List<String> before = tree(dir);
    assertThrows(PublishFailure.class, () -> Publisher.publish(folder, set("two")));
    assertEquals(before, tree(dir));
  }

  @Test
  void aNameThatLeavesTheFolder_isOurFault() {
    SortedMap<String, byte[]> files = set("one");
    files.put("../out.txt", new byte[0]);
    assertThrows(
        IllegalArgumentException.class, () -> Publisher.publish(dir.resolve("set"), files));
  }

  @Test
  void aFolderWithoutWritePermission_isTroubleWithTheDisk() throws Exception {
    Path locked = Files.createDirectory(dir.resolve("locked"));
    Files.setPosixFilePermissions(locked, PosixFilePermissions.fromString("r-xr-xr-x"));
    Path folder = locked.resolve("set");
    if (Files.isWritable(locked)) {
      String told = LockedOut.publish(folder);
      assertTrue(told.startsWith("DISK ") && told.contains("no permission"), told);
      return;
    }
    PublishFailure f =
        assertThrows(PublishFailure.class, () -> Publisher.publish(folder, set("one")));
    assertEquals(Reason.DISK, f.reason());
    assertTrue(f.getMessage().contains("no permission"), f.getMessage());
  }

  @Test
  void aReadOnlyDisk_isTroubleWithTheDisk() throws Exception {
    try (SmallDisk disk = SmallDisk.mount(dir.resolve("disk"), 256)) {
      Path folder = disk.path().resolve("set");
      Publisher.publish(folder, set("one"));
      disk.readOnly();
      PublishFailure f =
          assertThrows(PublishFailure.class, () -> Publisher.publish(folder, set("two")));
      assertEquals(Reason.DISK, f.reason());
      assertTrue(f.getMessage().toLowerCase(java.util.Locale.ROOT).contains("read-only"));
      assertEquals("one", held(folder));
    }
  }

  @Test
  void aFullDisk_isTroubleWithTheDisk_andIsCleanedUp() throws Exception {
    try (SmallDisk disk = SmallDisk.mount(dir.resolve("disk"), 64)) {
      Path folder = disk.path().resolve("a/set");
      SortedMap<String, byte[]> big = set("two");
      big.put("big.bin", new byte[200_000]);
      PublishFailure f = assertThrows(PublishFailure.class, () -> Publisher.publish(folder, big));
      assertEquals(Reason.DISK, f.reason());
      assertTrue(f.getMessage().contains("No space left"), f.getMessage());
      assertEquals(List.of(), names(disk.path()));
      Publisher.publish(folder, set("one"));
      assertThrows(PublishFailure.class, () -> Publisher.publish(folder, big));
      assertEquals("one", held(folder));
      assertEquals(List.of("set"), names(folder.getParent()));
    }
  }

  private static void empty(Path folder) throws IOException {
    for (String n : names(folder)) {
      Files.delete(folder.resolve(n));
    }
  }

  static List<String> names(Path folder) throws IOException {
    try (Stream<Path> entries = Files.list(folder)) {
      return entries.map(p -> p.getFileName().toString()).sorted().toList();
    }
  }

  /** Every path below, with what it is and holds; links are not followed. */
  private static List<String> tree(Path root) throws IOException {
    List<String> out = new ArrayList<>();
    try (Stream<Path> all = Files.walk(root)) {
      for (Path p : all.sorted().toList()) {
        String what =
            Files.isSymbolicLink(p)
                ? " -> " + Files.readSymbolicLink(p)
                : Files.isDirectory(p) ? "/" : "=" + Files.readString(p).hashCode();
        out.add(root.relativize(p) + what);
      }
    }
    return out;
  }
}
