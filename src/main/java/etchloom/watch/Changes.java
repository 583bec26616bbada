package etchloom.watch;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.Function;

/**
 * Waits until a file, or another that it names, holds something else than before.
 *
 * <p>Looks at the content itself a few times a second: both files are small, and so it makes no
 * difference whether an editor writes in place or puts another file there, or what the file system
 * tells of changes. A change counts when the content has come to rest.
 */
public final class Changes {
  private static final long LOOK_MS = 200;
  private static final long REST_MS = 100;

  /** What is read of a file; readers refuse longer ones anyway. */
  private static final int MOST = 4 << 20;

  /** What both files held at one time; of a file that could not be read nothing. */
  private record Held(Optional<ByteBuffer> first, Optional<ByteBuffer> second) {}

  private final Path first;
  private final Function<byte[], Optional<Path>> named;
  private Optional<Path> second = Optional.empty();
  private Optional<ByteBuffer> understood = Optional.empty();
  private Held seen;

  /**
   * What the files hold now counts as seen.
   *
   * @param named the other file, from the bytes of the first; where it is empty, the one named
   *     before is still looked at
   */
  public Changes(Path first, Function<byte[], Optional<Path>> named) {
    this.first = first;
    this.named = named;
    seen = now();
  }

  /**
   * Waits for the next change; one that came since the last call is told at once.
   *
   * @return false where the wait was stopped
   */
  public boolean await(CountDownLatch stop) throws InterruptedException {
    while (!stop.await(LOOK_MS, TimeUnit.MILLISECONDS)) {
      Held held = now();
      if (held.equals(seen)) {
        continue;
      }
      Held before;
      do {
        before = held;
        if (stop.await(REST_MS, TimeUnit.MILLISECONDS)) {
          return false;
        }
        held = now();
      } while (!held.equals(before));
      if (!held.equals(seen)) {
        seen = held;
        return true;
      }
    }
    return false;
  }

  private Held now() {
    Optional<ByteBuffer> held = read(first);
    if (held.isPresent() && !held.equals(understood)) {
      understood = held;
      second = named.apply(held.get().array()).or(() -> second);
    }
    return new Held(held, second.flatMap(Changes::read));
  }

  private static Optional<ByteBuffer> read(Path file) {
    try (InputStream in = Files.newInputStream(file)) {
      return Optional.of(ByteBuffer.wrap(in.readNBytes(MOST)));
    } catch (IOException e) {
      return Optional.empty(); // not there between two steps of an editor; drawing will say so
    }
  }
}
