package etchloom.proof.read;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ReaderFuzzTest {
  @TempDir Path dir;

  @Test
  void twentyThousandSpoiltFiles_within512Mb() throws IOException, InterruptedException {
    Path log = dir.resolve("log");
    Process p =
        new ProcessBuilder(
                List.of(
                    Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                    "-Xmx512m",
                    "-XX:+UseSerialGC",
                    "-XX:TieredStopAtLevel=1",
                    "-cp",
                    System.getProperty("java.class.path"),
                    ReaderFuzz.class.getName(),
                    dir.toString()))
            .redirectErrorStream(true)
            .redirectOutput(log.toFile())
            .start();
    boolean done = p.waitFor(120, TimeUnit.SECONDS);
    if (!done) {
      p.destroyForcibly();
    }
    String text = Files.readString(log, StandardCharsets.ISO_8859_1);
    assertTrue(done, "still running after 120 s\n" + text);
    assertEquals(0, p.exitValue(), text);
    String last = text.strip().substring(text.strip().lastIndexOf('\n') + 1);
    int inputs = Integer.parseInt(last.substring(0, last.indexOf(' ')));
    assertTrue(inputs >= 20_000, last);
  }
}
