package etchloom.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Phase;
import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.Staged;
import etchloom.proof.ProofExpectation;
import etchloom.proof.ProofFinding;
import etchloom.proof.ProofReport;
import etchloom.proof.Prover;
import etchloom.testing.SampledGap;
import etchloom.testing.ToyOrders;
import etchloom.testing.WindingSpecs;
import etchloom.write.LayerSet;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Every count of phases, every connection, paths in parallel: drawn, checked, read back. */
class WindingsTest {
  private static final String PADS = "{kind: pad, pitch: 4 mm, pad: 2.5 mm}";
  private static final String OUT = "star-point: terminal";

  /** A winding, its terminals in order, its pieces of copper, its closed circuits. */
  static Stream<Arguments> windings() {
    return Stream.of(
        Arguments.of(WindingSpecs.of(1, 6, 6, "open"), "U1 U2", 1, 0),
        Arguments.of(WindingSpecs.of(2, 8, 6, "open"), "U1 V1 U2 V2", 2, 0),
        Arguments.of(WindingSpecs.of(2, 8, 10, "star").board(OUT), "U1 V1 N", 1, 0),
        Arguments.of(WindingSpecs.of(5, 10, 8, "star"), "U1 V1 W1 S1 T1", 1, 0),
        Arguments.of(WindingSpecs.of(5, 20, 18, "open"), "U1 V1 W1 S1 T1 U2 V2 W2 S2 T2", 5, 0),
        Arguments.of(
            WindingSpecs.of(6, 12, 10, "star").board(OUT), "1U1 1V1 1W1 2U1 2V1 2W1 1N 2N", 2, 0),
        Arguments.of(WindingSpecs.of(6, 24, 20, "star"), "1U1 1V1 1W1 2U1 2V1 2W1", 2, 0),
        Arguments.of(
            WindingSpecs.of(6, 12, 14, "open"),
            "1U1 1V1 1W1 2U1 2V1 2W1 1U2 1V2 1W2 2U2 2V2 2W2",
            6,
            0),
        Arguments.of(WindingSpecs.of(1, 6, 6, "open").paths(3), "U1 U2", 1, 2),
        Arguments.of(WindingSpecs.of(2, 16, 12, "open").paths(4), "U1 V1 U2 V2", 2, 6),
        Arguments.of(WindingSpecs.of(3, 9, 12, "star").paths(3), "U1 V1 W1", 1, 6),
        Arguments.of(WindingSpecs.of(3, 12, 10, "star").paths(2).board(OUT), "U1 V1 W1 N", 1, 3),
        Arguments.of(WindingSpecs.of(3, 18, 24, "delta").paths(3), "U1 V1 W1", 1, 7),
        Arguments.of(WindingSpecs.of(3, 12, 14, "open").paths(2), "U1 V1 W1 U2 V2 W2", 3, 3),
        Arguments.of(WindingSpecs.of(5, 20, 16, "star").paths(4), "U1 V1 W1 S1 T1", 1, 15),
        Arguments.of(
            WindingSpecs.of(3, 9, 12, "star")
                .terminals(PADS)
                .board("tab: {angle: 200 deg, width: 14 mm, length: 9 mm}"),
            "U1 V1 W1",
            1,
            0),
        Arguments.of(
            WindingSpecs.of(5, 20, 18, "open").board("tab: {width: 36 mm, length: 5 mm}"),
            "U1 V1 W1 S1 T1 U2 V2 W2 S2 T2",
            5,
            0),
        Arguments.of(WindingSpecs.of(2, 8, 6, "open").terminals(PADS), "U1 V1 U2 V2", 2, 0),
        Arguments.of(WindingSpecs.of(6, 24, 20, "star").paths(2), "1U1 1V1 1W1 2U1 2V1 2W1", 2, 6));
  }

  @ParameterizedTest
  @MethodSource("windings")
  void boardIsCleanAndReadsBackAsMeant(WindingSpecs w, String marks, int nets, int circuits) {
    Drawn d = w.drawn();
    Artwork art = d.assembly().artwork();
    assertEquals(marks, String.join(" ", art.terminals().stream().map(Joint::mark).toList()));
    assertEquals(List.of(), d.rules().findings());
    for (int layer = 1; layer <= art.layers(); layer++) {
      SampledGap.Gap gap = SampledGap.least(art, layer, 0.2);
      assertTrue(gap.mm() >= 0.2 - 1e-6, gap::toString);
    }
    Artwork grid = art.onGrid();
    ProofReport r =
        Prover.prove(LayerSet.write(grid, ToyOrders.plain(1.2)), ProofExpectation.of(grid));
    assertEquals(List.of(), r.findings().stream().map(ProofFinding::text).toList());
    assertEquals(nets, r.nets());
    assertEquals(circuits, r.circuits());
    assertEquals(nets, art.joints().stream().map(Joint::net).distinct().count());
  }

  /** What clashes is refused, with all keys that would help. */
  @ParameterizedTest
  @MethodSource("clashes")
  void clashIsRefusedByKey(WindingSpecs w, String key, String words) {
    Staged<Drawn> staged = w.run();
    assertTrue(staged.value().isEmpty());
    Diagnostic d = staged.diagnostics().get(0);
    assertEquals(key, d.key());
    assertTrue(d.message().contains(words), d::message);
  }

  static Stream<Arguments> clashes() {
    WindingSpecs star = WindingSpecs.of(3, 9, 12, "star");
    String screws =
        "holes: {count: 4, diameter: 3.2 mm, circle: 106 mm, start: %s, keep-out: 6.4 mm}";
    return Stream.of(
        Arguments.of(
            star.board(screws.formatted("90 deg")), "board.terminals.start", "board.holes.start"),
        Arguments.of(
            star.board("tab: {width: 8 mm, length: 6 mm}"),
            "board.tab.width",
            "needs a tab of 8.400 mm"),
        Arguments.of(
            star.board("tab: {width: 9 mm, length: 300 mm}"), "board.terminals.pitch", "converge"),
        Arguments.of(star.paths(3).rotor("outer-diameter: 112 mm"), "rotor.outer-diameter", "V1"),
        Arguments.of(
            WindingSpecs.of(3, 9, 8, "star").paths(3), "winding.parallel-paths", "paths are: 1"),
        Arguments.of(
            WindingSpecs.of(3, 12, 10, "star").paths(4), "winding.parallel-paths", "are: 1, 2"),
        Arguments.of(WindingSpecs.of(5, 15, 10, "star"), "winding.coils", "5-phase"));
  }

  /** Each path passes each spiral of each of its coils once, end to end, in the coil's sense. */
  @ParameterizedTest
  @MethodSource("windings")
  void everyCoilIsInOnePathOfItsPhase(WindingSpecs w) {
    Artwork art = w.drawn().assembly().artwork();
    int[] passes = new int[art.conductors().size()];
    for (Phase p : art.phases()) {
      assertEquals(w.paths(), p.paths().size());
      for (List<Phase.Step> path : p.paths()) {
        int at = p.entryJoint();
        for (Phase.Step s : path) {
          Conductor c = art.conductors().get(s.conductor());
          assertEquals(at, s.forward() ? c.fromJoint() : c.toJoint());
          at = s.forward() ? c.toJoint() : c.fromJoint();
          passes[s.conductor()] += s.forward() ? 1 : -1;
        }
        assertEquals(p.exitJoint(), at);
      }
    }
    art.coils().forEach(c -> c.conductors().forEach(id -> assertEquals(c.sign(), passes[id])));
  }
}
