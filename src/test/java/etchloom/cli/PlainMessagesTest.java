package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.spec.Templates;
import etchloom.testing.Run;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What a person reads who slipped: once, in plain words, with what to type instead. */
class PlainMessagesTest {
  @TempDir private Path dir;

  private String wheel(String from, String to) throws IOException {
    String text = new String(Templates.bytes("filter-wheel"), StandardCharsets.UTF_8);
    assertTrue(text.contains(from), from);
    Path file = dir.resolve("wheel.yaml");
    Files.writeString(file, text.replace(from, to));
    return file.toString();
  }

  @Test
  void copperThatTheFabDoesNotOffer_isSaidOnce_withTrimmedNumbers() throws IOException {
    String spec = wheel("copper: 1 oz ", "copper: {outer: 1 oz, inner: 0.5 oz} ");
    Run r = Run.of("draw", spec, "--fab", "economy", "-o", dir.resolve("o").toString());
    assertEquals(1, r.err().split("error\\[copper-weight\\]", -1).length - 1, r.err());
    assertFalse(r.err().contains(".0 oz"), r.err());
  }

  private static void says(Run r, String... parts) {
    for (String part : parts) {
      assertTrue(r.err().contains(part), r.err());
    }
  }

  @Test
  void misspeltWords_getTheNearestOne() throws IOException {
    says(Run.of("draww", "x.yaml"), "no such command: draww", "did you mean `draw`?");
    says(Run.of("draw", "x.yaml", "--fabb", "fine"), "no such option: --fabb", "`--fab`");
    says(Run.of("new", "filter-whel"), "did you mean `filter-wheel`?");
    says(Run.of("draw", wheel("A", "A"), "--fab", "finee"), "did you mean `fine`?");
  }

  @Test
  void newIntoAFolderThatIsNot_saysSo() {
    Path file = dir.resolve("nowhere").resolve("a.yaml");
    says(Run.of("new", "dosing-pump", file.toString()), "there is no such folder");
  }

  @Test
  void screwOnATerminal_theErrorComesBeforeWhatFollowsFromIt() throws IOException {
    String spec = wheel("start: 45 deg, keep-out", "start: 90 deg, keep-out");
    Run r = Run.of("draw", spec, "-o", dir.resolve("o").toString());
    int error = r.err().indexOf("error[terminals]");
    int warning = r.err().indexOf("warning[");
    assertTrue(error >= 0 && (warning < 0 || error < warning), r.err());
  }

  @Test
  void aRulesFileThatIsNotThere_isNamedWithTheSpecsLine() throws IOException {
    Run r = Run.of("draw", wheel("fab: standard ", "fab: ./mine.yaml "));
    assertEquals(ExitCode.DISK, r.code());
    says(r, "wheel.yaml:", ": fab: " + dir.resolve("mine.yaml") + ": there is no such file");
  }
}
