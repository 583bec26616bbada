package etchloom.write;

import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;

/**
 * A file system of its own, of a few kB, where the user may mount one; else the test is skipped.
 */
final class SmallDisk implements AutoCloseable {
  private final Path path;

  private SmallDisk(Path path) {
    this.path = path;
  }

  static SmallDisk mount(Path path, int kilobytes) throws Exception {
    Files.createDirectories(path);
    boolean done =
        run("mount", "-t", "tmpfs", "-o", "size=" + kilobytes + "k", "tmpfs", path.toString());
    assumeTrue(done, "this user may not mount a small disk to fill");
    return new SmallDisk(path);
  }

  Path path() {
    return path;
  }

  void readOnly() {
    assumeTrue(run("mount", "-o", "remount,ro", path.toString()), "cannot make it read-only");
  }

  private static boolean run(String... command) {
    try {
      Process p =
          new ProcessBuilder(List.of(command))
              .redirectErrorStream(true)
              .redirectOutput(ProcessBuilder.Redirect.DISCARD)
              .start();
      return p.waitFor(10, TimeUnit.SECONDS) && p.exitValue() == 0;
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return false;
    } catch (IOException e) {
      return false; // there is no such program
    }
  }

  @Override
  public void close() {
    run("umount", path.toString());
  }
}
