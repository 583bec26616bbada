package etchloom.board;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.diagnostic.Staged;
import etchloom.rules.Finding;
import etchloom.rules.RuleCheck;
import etchloom.rules.RuleContext;
import etchloom.spec.FabReader;
import etchloom.spec.FabRules;
import etchloom.spec.SpecFile;
import etchloom.spec.SpecReader;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Tracks from a hair to as wide as the coil, past the width of the vias they end in: what {@code
 * fill} counts keeps the space, by the rule check, which measures the drawn copper and knows
 * nothing of how turns are counted.
 */
class WideTracksTest {
  private static final FabRules FAB = FabReader.builtIn("standard");

  @ParameterizedTest
  @ValueSource(
      strings = {
        "outline: wedge, inner-radius: 12 mm",
        "outline: wedge, inner-radius: 12 mm, taper: on",
        "outline: wedge, inner-radius: 12 mm, layers: parallel",
        "outline: round, inner-radius: 22 mm",
        "outline: racetrack, inner-radius: 19 mm, width: 11 mm"
      })
  void fillKeepsTheSpace_andOneMoreIsRefused(String coil) {
    int drawn = 0;
    for (double track = 0.13; track <= 3; track += 0.19) {
      String at = String.format(Locale.ROOT, "%s, track: %.2f mm", coil, track);
      Staged<Assembly> board = draw(at + ", turns: fill");
      if (board.value().isEmpty()) {
        assertEquals("coil.outer-radius", board.diagnostics().get(0).key(), at);
        continue;
      }
      drawn++;
      int turns = board.value().orElseThrow().artwork().turnsPerLayer();
      assertEquals(List.of(), tooNear(at), at);
      Staged<Assembly> more = draw(at + ", turns: " + (turns + 1));
      assertEquals(
          (turns + 1) + " turns do not fit; the rules leave room for " + turns,
          more.diagnostics().get(0).message(),
          at);
    }
    assertTrue(drawn > 5, drawn + " drawn");
  }

  private static List<Finding> tooNear(String coil) {
    SpecFile f = spec(coil + ", turns: fill");
    return RuleCheck.check(
            draw(coil + ", turns: fill").value().orElseThrow().artwork(),
            f.spec(),
            FAB,
            RuleContext.NONE)
        .findings()
        .stream()
        .filter(x -> x.rule().equals("space"))
        .toList();
  }

  private static Staged<Assembly> draw(String coil) {
    SpecFile f = spec(coil);
    return Assembler.assemble(f.spec(), FAB, f.positions());
  }

  private static SpecFile spec(String coil) {
    String yaml =
        """
        etchloom: 1
        title: Wide tracks
        rotor: {poles: 12}
        winding: {phases: 3, coils: 9, connection: star}
        coil: {outer-radius: 30 mm, space: 0.2 mm, %s}
        rim: {track: 0.4 mm}
        via: {hole: 0.3 mm, pad: 0.6 mm}
        board:
          layers: 4
          thickness: 1.2 mm
          copper: 1 oz
          diameter: 100 mm
          bore: 14 mm
          terminals: {kind: hole, start: 90 deg, pitch: 3.5 mm, hole: 1.0 mm, pad: 2.0 mm}
        fab: standard
        """
            .formatted(coil);
    Staged<SpecFile> read = SpecReader.read("wide.yaml", yaml.getBytes(StandardCharsets.UTF_8));
    return read.value().orElseThrow(() -> new AssertionError(read.diagnostics() + "\n" + yaml));
  }
}
