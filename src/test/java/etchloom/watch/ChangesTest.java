package etchloom.watch;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.attribute.FileTime;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ChangesTest {
  private static final long SOON_MS = 10_000;

  /** Longer than a look and a rest. */
  private static final long QUIET_MS = 500;

  @TempDir Path folder;

  private final ExecutorService thread = Executors.newSingleThreadExecutor();
  private final CountDownLatch stop = new CountDownLatch(1);
  private Path spec;
  private Path rules;
  private Changes changes;

  @BeforeEach
  void begin() throws IOException {
    spec = Files.writeString(folder.resolve("spec"), "rules");
    rules = Files.writeString(folder.resolve("rules"), "one");
    changes = new Changes(spec, this::named);
  }

  /** The spec of this test is nothing but the name of the rules file. */
  private Optional<Path> named(byte[] bytes) {
    String name = new String(bytes, StandardCharsets.UTF_8);
    return name.startsWith("broken") ? Optional.empty() : Optional.of(folder.resolve(name.strip()));
  }

  @AfterEach
  void end() {
    stop.countDown();
    thread.shutdownNow();
  }

  private Future<Boolean> waiting() {
    return thread.submit(() -> changes.await(stop));
  }

  private void comes() throws Exception {
    assertTrue(waiting().get(SOON_MS, TimeUnit.MILLISECONDS));
  }

  private void nothingComes() throws Exception {
    Future<Boolean> next = waiting();
    try {
      next.get(QUIET_MS, TimeUnit.MILLISECONDS);
      assertFalse(true, "a change was told where there was none");
    } catch (TimeoutException e) {
      next.cancel(true);
    }
  }

  @Test
  void aFileWrittenInPlace_orReplacedByAnother_isAChange() throws Exception {
    Files.writeString(spec, "rules ");
    comes();
    Path other = Files.writeString(folder.resolve("spec~"), "rules  ");
    Files.move(other, spec, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    comes();
    nothingComes();
  }

  @Test
  void sameLengthAndTime_otherContent_isAChange() throws Exception {
    FileTime time = Files.getLastModifiedTime(rules);
    Files.writeString(rules, "two");
    Files.setLastModifiedTime(rules, time);
    comes();
  }

  @Test
  void touchedOrReplacedByTheSame_isNoChange() throws Exception {
    Files.setLastModifiedTime(spec, FileTime.fromMillis(1_000_000));
    Files.delete(rules);
    Files.writeString(rules, "one");
    nothingComes();
  }

  @Test
  void whatChangesBetweenTwoWaits_isNotMissed() throws Exception {
    Files.writeString(spec, "rules ");
    comes();
    Files.writeString(rules, "two");
    Thread.sleep(QUIET_MS);
    comes();
  }

  @Test
  void theRulesAreThoseOfTheSpecAsItIs_orAsItLastWas() throws Exception {
    Path other = Files.writeString(folder.resolve("other"), "1");
    Files.writeString(spec, "other");
    comes();
    Files.writeString(rules, "of no more interest");
    nothingComes();
    Files.writeString(other, "2");
    comes();
    Files.writeString(spec, "broken");
    comes();
    Files.writeString(other, "3");
    comes();
  }

  /** One change on an idle machine; a busy one may let the file rest in between. */
  @Test
  void severalWritesInShortTurn_areNotToldOneByOne() throws Exception {
    AtomicInteger told = new AtomicInteger();
    Future<?> counting =
        thread.submit(
            () -> {
              while (changes.await(stop)) {
                told.incrementAndGet();
              }
              return null;
            });
    for (int i = 0; i < 20; i++) {
      Files.writeString(spec, "rules" + " ".repeat(i + 1));
      Thread.sleep(20);
    }
    Thread.sleep(2 * QUIET_MS);
    stop.countDown();
    counting.get(SOON_MS, TimeUnit.MILLISECONDS);
    assertTrue(told.get() >= 1 && told.get() <= 5, told + " changes");
  }

  @Test
  void aFileThatIsGone_andThenBack_isAChangeOnceItDiffers() throws Exception {
    Files.delete(spec);
    comes();
    Files.writeString(spec, "rules");
    comes();
  }

  @Test
  void stopEndsTheWait() throws Exception {
    Future<Boolean> waiting = waiting();
    stop.countDown();
    assertFalse(waiting.get(SOON_MS, TimeUnit.MILLISECONDS));
  }
}
