package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.report.Text;
import etchloom.spec.Templates;
import etchloom.testing.Run;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What every command leaves on a terminal: within 80 columns, and plain where it must be. */
class TerminalTest {
  private static final String ESCAPE = "\u001b";

  @TempDir Path folder;

  static Stream<String> templates() {
    return Templates.names().stream();
  }

  private static void fits(String text) {
    text.lines()
        .forEach(
            l -> {
              assertTrue(Text.columns(l) <= 80, l);
              assertEquals(l.stripTrailing(), l, "blanks at the end of a line");
            });
    assertTrue(text.isEmpty() || text.endsWith("\n"), "the last line has no end");
    assertFalse(text.contains(ESCAPE), text);
  }

  private Path template(String name) throws IOException {
    return Files.write(folder.resolve(name + ".yaml"), Templates.bytes(name));
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "new", "draw", "check", "report", "survey", "receive"})
  void helpFits_withoutGapsAndColours(String command) {
    String[] args = command.isEmpty() ? new String[] {"--help"} : new String[] {command, "--help"};
    Run help = Run.onTerminal(Map.of(), args);
    assertEquals(ExitCode.DONE, help.code());
    fits(help.out());
    assertFalse(help.out().contains("\n\n\n"), help.out());
    assertTrue(help.out().startsWith("Usage: etchloom"), help.out());
  }

  @ParameterizedTest
  @MethodSource("templates")
  void aTemplatesSummaryFits_withNotesInShort(String name) throws IOException {
    String spec = template(name).toString();
    Run check = Run.of("check", spec);
    fits(check.out());
    assertTrue(check.out().contains("\nMAY BE MADE: "), check.out());
    assertTrue(check.out().contains("note          voltage: "), check.out());
    assertFalse(check.out().contains("IPC-2221"), "the explanation is for the report");
  }

  @ParameterizedTest
  @ValueSource(strings = {"dosing-pump", "reaction-wheel", "rover-wheel"})
  void aReportFits_withAllNotes(String name) throws IOException {
    Run report = Run.of("report", template(name).toString());
    fits(report.out());
    assertTrue(report.out().contains("IPC-2221 table 6-1"), report.out());
  }

  @Test
  void theListOfTemplatesFits() {
    fits(Run.of("new").out());
  }

  @Test
  void drawAndTheCheckOfItsFolderFit_pipedAndOnATerminalWithoutColour() throws IOException {
    String spec = template("dosing-pump").toString();
    String set = folder.resolve("a-folder-with-a-long-name-" + "x".repeat(70)).toString();
    Run draw = Run.of("draw", spec, "-o", set);
    assertEquals(ExitCode.DONE, draw.code(), draw.err());
    fits(draw.out());
    fits(Run.of("check", set, "--circuits", "0").out());
    assertEquals(
        draw.out(), Run.onTerminal(Map.of("NO_COLOR", "1"), "draw", spec, "-o", set).out());
  }

  @Test
  void colourIsForTerminalsOnly_andSaysNothingThatWordsDoNot() throws IOException {
    String spec = template("dosing-pump").toString();
    String piped = Run.of("check", spec).out();
    String painted = Run.onTerminal(Map.of("TERM", "xterm"), "check", spec).out();
    assertTrue(painted.contains(ESCAPE + "["), painted);
    assertEquals(piped, painted.replaceAll(ESCAPE + "\\[[0-9;]*m", ""));
    for (Map<String, String> plain :
        java.util.List.of(Map.of("NO_COLOR", "1"), Map.of("TERM", "dumb"))) {
      assertEquals(piped, Run.onTerminal(plain, "check", spec).out());
    }
    // no-color.org: only where it is present and not empty
    assertEquals(painted, Run.onTerminal(Map.of("NO_COLOR", ""), "check", spec).out());
  }

  @Test
  void aSurveyFits_howeverManyKeysItHas_andNamesThemInShort() throws IOException {
    String spec = template("dosing-pump").toString();
    Run survey =
        Run.of(
            "survey",
            spec,
            "-o",
            folder.resolve("survey").toString(),
            "--rank",
            "torque.motorConstant",
            "--vary",
            "coil.turns=8,400",
            "coil.track=0.15mm",
            "coil.space=0.15mm",
            "board.thickness=1.6mm",
            "coil.inner-radius=6mm",
            "coil.outer-radius=17mm",
            "rim.track=0.5mm");
    fits(survey.out());
    String head = survey.out().lines().findFirst().orElseThrow();
    assertTrue(head.startsWith("variant  turns  coil.track    space"), "rim.track too: " + head);
    assertTrue(head.contains("motorConstant"), "what was asked for stays: " + head);
    assertTrue(survey.out().contains("error[turns]"), survey.out());
  }

  @Test
  void boardsThatArriveFit_withTheirCausesBelow() throws IOException {
    Path readings =
        Files.writeString(
            folder.resolve("r.csv"),
            "board,from,to,ohm,celsius\n"
                + "7,U1,V1,11.62,24.5\n7,V1,W1,11.60,24.5\n7,W1,U1,11.65,24.5\n"
                + "a-very-long-name-of-a-board,U1,V1,OL,24.5\n"
                + "a-very-long-name-of-a-board,V1,W1,11.60,24.5\n"
                + "a-very-long-name-of-a-board,W1,U1,OL,24.5\n");
    Run run = Run.of("receive", template("dosing-pump").toString(), readings.toString());
    assertEquals(ExitCode.REFUSED, run.code(), run.err());
    fits(run.out());
    assertTrue(run.out().contains("\n       likely open-phase (phase U)\n"), run.out());
  }
}
