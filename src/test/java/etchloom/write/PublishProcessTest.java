package etchloom.write;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The publisher against real processes: killed by the system, and two of them at once. */
class PublishProcessTest {
  /** More with {@code -Detchloom.kills=50}; each costs the start of a Java machine. */
  private static final int KILLS = Integer.getInteger("etchloom.kills", 20);

  private static final int FOREVER = 1_000_000;

  @TempDir Path dir;

  @Test
  void aKilledProcess_leavesOneWholeSet() throws Exception {
    Path folder = dir.resolve("set");
    Publisher.publish(folder, PublisherTest.set("one"));
    Random random = new Random(7);
    for (int i = 0; i < KILLS; i++) {
      Process p = start(folder, FOREVER, i % 2 == 0 ? "one" : "two");
      assertEquals('r', p.getInputStream().read());
      TimeUnit.MICROSECONDS.sleep(random.nextInt(60_000));
      p.destroyForcibly(); // SIGKILL
      assertTrue(p.waitFor(10, TimeUnit.SECONDS));
      assertNotEquals(0, p.exitValue());
      String held = PublisherTest.held(folder);
      if (held.equals("none")) {
        held = PublisherTest.held(dir.resolve("set.etchloom-old"));
      }
      assertNotEquals("none", held, "kill " + i);
      if (i % 3 == 2) {
        Publisher.publish(folder, PublisherTest.set("one"));
        assertEquals("one", PublisherTest.held(folder));
        assertEquals(List.of("set"), PublisherTest.names(dir));
      }
    }
  }

  @Test
  void twoProcessesAtOnce_takeTurns() throws Exception {
    Path folder = dir.resolve("set");
    Process a = start(folder, 60, "one");
    Process b = start(folder, 60, "two");
    assertTrue(a.waitFor(60, TimeUnit.SECONDS));
    assertTrue(b.waitFor(60, TimeUnit.SECONDS));
    assertEquals(0, a.exitValue());
    assertEquals(0, b.exitValue());
    assertNotEquals("none", PublisherTest.held(folder));
    assertEquals(List.of("set"), PublisherTest.names(dir));
  }

  private Process start(Path folder, int times, String first) throws IOException {
    return new ProcessBuilder(
            Path.of(System.getProperty("java.home"), "bin", "java").toString(),
            "-Xshare:auto",
            "-XX:TieredStopAtLevel=1",
            "-XX:+UseSerialGC",
            "-XX:-UsePerfData",
            "-Xmx64m",
            "-cp",
            System.getProperty("java.class.path"),
            "etchloom.write.PublishLoop",
            folder.toString(),
            Integer.toString(times),
            first)
        .redirectError(ProcessBuilder.Redirect.INHERIT)
        .start();
  }
}
