package etchloom.receive;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Joint;
import etchloom.board.Assembler;
import etchloom.spec.FabReader;
import etchloom.spec.FabRules;
import etchloom.spec.SpecFile;
import etchloom.spec.SpecReader;
import etchloom.spec.Templates;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.function.Function;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Boards with a known fault, made and measured by {@link BenchBoard}, must be named right. */
class SeededFaultsTest {
  private static final int TRIALS = 30;
  private static final double RIGHT = 0.95;
  private static final String HEAD = "board,from,to,ohm,celsius\nlead,,,0.1,\n";

  private record Drawing(Artwork artwork, FabRules.Tolerance tolerance, Model model) {}

  private static final Map<String, Drawing> DRAWN = new HashMap<>();

  private static Drawing drawing(String name) {
    return DRAWN.computeIfAbsent(name, SeededFaultsTest::draw);
  }

  /** A template, or one with another connection: {@code dosing-pump delta}. */
  private static Drawing draw(String name) {
    String[] words = name.split(" ");
    Map<String, String> other =
        words.length > 1 ? Map.of("winding.connection", words[1]) : Map.of();
    SpecFile f = SpecReader.read(name, Templates.bytes(words[0]), other).value().orElseThrow();
    FabRules fab = FabReader.builtIn(f.spec().fab());
    Artwork a = Assembler.assemble(f.spec(), fab, f.positions()).value().orElseThrow().artwork();
    Model m = new Model(a, fab.tolerance(), true, OptionalDouble.empty());
    return new Drawing(a, fab.tolerance(), m);
  }

  private static List<Verdict> judge(Drawing d, String rows) {
    List<String> marks = d.artwork().terminals().stream().map(Joint::mark).toList();
    byte[] bytes = (HEAD + rows).getBytes(StandardCharsets.UTF_8);
    Readings r = ReadingsReader.read("bench.csv", bytes, marks).value().orElseThrow();
    assertEquals(List.of(), r.faults());
    return Judge.boards(d.model(), r);
  }

  private static List<Verdict> trials(
      String name, long seed, int count, Function<BenchBoard, BenchBoard> fault) {
    Drawing d = drawing(name);
    Random random = new Random(seed);
    StringBuilder rows = new StringBuilder();
    for (int i = 0; i < count; i++) {
      BenchBoard b = fault.apply(BenchBoard.good(d.artwork(), d.tolerance(), random));
      rows.append(b.rows("B" + i, i % 2 == 0));
    }
    return judge(d, rows.toString());
  }

  private static void named(Cause cause, List<Verdict> all) {
    long right = all.stream().filter(v -> v.cause() == cause && !v.accepted()).count();
    assertTrue(
        right >= RIGHT * all.size(),
        () -> right + " of " + all.size() + " named " + cause.word() + ": " + all);
  }

  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "dosing-pump",
    "dosing-pump delta",
    "reaction-wheel",
    "wind-logger",
    "focuser",
    "sample-stirrer"
  })
  void openPhase(String name) {
    named(Cause.OPEN_PHASE, trials(name, 1, TRIALS, BenchBoard::broken));
  }

  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "dosing-pump",
    "dosing-pump delta",
    "reaction-wheel",
    "wind-logger",
    "focuser",
    "sample-stirrer"
  })
  void shortedLayers(String name) {
    named(Cause.SHORTED_LAYERS, trials(name, 2, TRIALS, BenchBoard::shorted));
  }

  @ParameterizedTest(name = "{0}, copper times {1}")
  @CsvSource({
    "dosing-pump,0.5",
    "dosing-pump,2",
    "dosing-pump delta,0.5",
    "reaction-wheel,0.5",
    "reaction-wheel,2",
    "wind-logger,0.5",
    "wind-logger,2"
  })
  void copperThickness(String name, double factor) {
    List<Verdict> all = trials(name, 3, TRIALS, b -> b.copper(factor));
    named(Cause.COPPER_THICKNESS, all);
    double drawn = drawing(name).model().copperUm();
    for (Verdict v : all) { // within the tolerances of track and copper that the board drew
      assertEquals(factor, v.copperUm().orElseThrow() / drawn, 0.35 * factor);
    }
  }

  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "dosing-pump",
    "dosing-pump delta",
    "reaction-wheel",
    "wind-logger",
    "focuser",
    "sample-stirrer"
  })
  void onePhaseEtched(String name) {
    named(Cause.ONE_PHASE, trials(name, 4, TRIALS, b -> b.etched(1.25)));
  }

  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "dosing-pump",
    "dosing-pump delta",
    "reaction-wheel",
    "wind-logger",
    "focuser",
    "sample-stirrer"
  })
  void onePhaseBadVia(String name) {
    named(Cause.ONE_PHASE, trials(name, 5, TRIALS, b -> b.badVia(0.4)));
  }

  /**
   * Star without its point and delta look the same whichever way round they are: no reading can
   * tell.
   */
  @ParameterizedTest(name = "{0}: {1} and {2}")
  @CsvSource({"reaction-wheel,0,3", "reaction-wheel,2,3", "wind-logger,1,3", "wind-logger,0,4"})
  void swappedTerminals(String name, int a, int b) {
    named(Cause.SWAPPED_TERMINALS, trials(name, 6, TRIALS, board -> board.swapped(a, b)));
  }

  /** Stated rate: under one good board in a thousand. */
  @ParameterizedTest(name = "{0}")
  @CsvSource({"dosing-pump", "dosing-pump delta", "reaction-wheel"})
  void goodBoardsAreAccepted(String name) {
    List<Verdict> all = trials(name, 7, 300, b -> b);
    List<Verdict> bad = all.stream().filter(v -> !v.accepted()).toList();
    assertTrue(bad.isEmpty(), () -> bad.size() + ": " + bad);
    all.stream().filter(Verdict::accepted).forEach(v -> assertEquals(Cause.NONE, v.cause()));
  }

  @Test
  void twoPhasesBroken() {
    Drawing d = drawing("wind-logger");
    String rows =
        "B,U1,U2,OL,20\nB,V1,V2,open,20\nB,W1,W2,16.8,20\nB,U1,V2,OL,20\nB,V1,U2,inf,20\nB,U1,V1,OL,20\nB,U2,V2,OL,20\n";
    Verdict v = judge(d, rows).get(0);
    assertEquals(Cause.OPEN_PHASE, v.cause());
    assertEquals("phases U and V", v.where());
  }
}
