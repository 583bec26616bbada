package etchloom.write;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;

/**
 * Keeps other processes from the same folder: a lock of the operating system's on a file beside it,
 * which falls with the process however that ends. Threads of one process are not kept apart.
 *
 * <p>The file is deleted by its holder. A process that waited on a deleted file then holds a lock
 * on nothing, so each holder looks whether the name still stands for its file. It tells by a length
 * of its own choice: opening the file a second time would, on POSIX, give up the lock.
 */
final class FolderLock implements AutoCloseable {
  private static final long WAIT_NS = 10_000_000_000L;
  private static final int STEP_MS = 20;
  private static final int LENGTHS = 1 << 20;

  private final Path file;
  private final FileChannel channel;

  private FolderLock(Path file, FileChannel channel) {
    this.file = file;
    this.channel = channel;
  }

  /**
   * @param place the folder meant, for the message
   * @throws PublishFailure when another process holds it for 10 s
   */
  static FolderLock acquire(Path file, Path place) throws IOException {
    long end = System.nanoTime() + WAIT_NS;
    while (true) {
      FileChannel channel =
          FileChannel.open(
              file, StandardOpenOption.CREATE, StandardOpenOption.WRITE, LinkOption.NOFOLLOW_LINKS);
      try {
        FileLock lock = channel.tryLock();
        if (lock != null && named(file, channel)) {
          return new FolderLock(file, channel);
        }
      } catch (IOException e) {
        try (channel) {
          Files.deleteIfExists(file);
        }
        throw e;
      }
      channel.close();
      if (System.nanoTime() > end) {
        throw new PublishFailure(
            PublishFailure.Reason.BUSY, place + ": another run is writing there; try again");
      }
      pause();
    }
  }

  private static boolean named(Path file, FileChannel channel) throws IOException {
    long own =
        1L + Math.floorMod(ProcessHandle.current().pid() * 7919 + System.nanoTime(), LENGTHS);
    channel.truncate(0);
    channel.write(ByteBuffer.allocate(1), own - 1);
    try {
      return Files.size(file) == own;
    } catch (NoSuchFileException e) {
      return false;
    }
  }

  private static void pause() throws IOException {
    try {
      Thread.sleep(STEP_MS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IOException("interrupted", e);
    }
  }

  @Override
  public void close() throws IOException {
    try (channel) {
      Files.deleteIfExists(file);
    }
  }
}
