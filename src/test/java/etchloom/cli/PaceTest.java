package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.testing.Run;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PaceTest {
  private final ByteArrayOutputStream err = new ByteArrayOutputStream();
  private final AtomicLong now = new AtomicLong(77);

  @TempDir Path folder;

  private Console console(boolean terminal) {
    PrintStream to = new PrintStream(err, true, StandardCharsets.UTF_8);
    return new Console(to, to, Map.of(), terminal);
  }

  private void pass(double seconds) {
    now.addAndGet((long) (seconds * 1e9));
  }

  @Test
  void firstTheUsualTime_thenWhatThisMachineNeeds() {
    try (Pace pace = new Pace(console(false), false, "drawing", now::get)) {
      pace.left(10);
      pass(0.9);
      assertEquals("", pace.line(), "less than a second is not worth a line");
      pass(1.1);
      assertEquals("drawing: 2 s, about 8 s left", pace.line());
      pass(2);
      pace.left(8); // two usual seconds took four
      assertEquals("drawing: 4 s, about 16 s left", pace.line());
      pass(6);
      assertEquals("drawing: 10 s, about 10 s left", pace.line());
      pass(200);
      assertEquals(
          "drawing: 3 min", pace.line(), "over the time it was given: nothing is promised");
      pace.left(0);
      assertEquals("drawing: 3 min", pace.line());
    }
  }

  @Test
  void aSecondPieceOfWork_keepsThePace() {
    try (Pace pace = new Pace(console(false), false, "drawing", now::get)) {
      pace.left(1);
      pass(3);
      pace.left(0);
      pace.left(5); // the same again, as --force does
      assertEquals("drawing: 3 s, about 15 s left", pace.line());
    }
  }

  @Test
  void onATerminalTheLineComesAndGoes_withoutEscapes() throws InterruptedException {
    try (Pace pace = new Pace(console(true), false, "drawing")) {
      pace.left(100);
      long end = System.nanoTime() + 20_000_000_000L;
      while (!text().contains("left") && System.nanoTime() < end) {
        Thread.sleep(50);
      }
    }
    String shown = text();
    assertTrue(shown.matches("(?s)(\rdrawing: .*)+\r {79}\r"), shown);
    assertFalse(shown.contains("\u001b"), shown);
    assertFalse(shown.contains("\n"), shown);
  }

  @Test
  void pipedOrQuiet_nothingIsSaid() throws InterruptedException {
    try (Pace piped = new Pace(console(false), false, "drawing");
        Pace quiet = new Pace(console(true), true, "drawing")) {
      piped.left(100);
      quiet.left(100);
      Thread.sleep(1700);
    }
    assertEquals("", text());
  }

  private String text() {
    return err.toString(StandardCharsets.UTF_8);
  }

  @Test
  void drawAndCheck_pipedSayNothing_andOnATerminalLeaveACleanLine() throws IOException {
    Path spec = folder.resolve("spec.yaml");
    Files.write(spec, etchloom.spec.Templates.bytes("dosing-pump"));
    Run draw = Run.onTerminal(Map.of(), "draw", spec.toString(), "-o", folder + "/set");
    assertEquals(ExitCode.DONE, draw.code(), draw.err());
    Run check = Run.of("check", folder + "/set", "--circuits", "0");
    assertEquals("", check.err(), "piped");
    // On a terminal the line may be there or not, as fast as the machine is; but it is taken away.
    String told = Run.onTerminal(Map.of(), "check", folder + "/set", "--circuits", "0").err();
    for (String text : new String[] {draw.err(), told}) {
      assertTrue(text.isEmpty() || text.endsWith("\r" + " ".repeat(79) + "\r"), text);
    }
  }
}
