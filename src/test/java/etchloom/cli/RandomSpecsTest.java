package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.artwork.Phase;
import etchloom.diagnostic.Diagnostic;
import etchloom.proof.ProofExpectation;
import etchloom.proof.ProofFinding;
import etchloom.proof.ProofReport;
import etchloom.proof.Prover;
import etchloom.rules.Finding;
import etchloom.run.Drawn;
import etchloom.spec.Spec;
import etchloom.testing.RandomSpecs;
import etchloom.testing.TightSpace;
import etchloom.testing.ToyOrders;
import etchloom.write.LayerSet;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.LongFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Whatever the spec: a whole board, or a refusal that names a key. */
class RandomSpecsTest {
  private static final int SEEDS = Integer.getInteger("etchloom.seeds", 300);

  /** The files of every drawn board are proved where more seeds are asked for, else of some. */
  private static final boolean ALL_PROVED = Integer.getInteger("etchloom.seeds") != null;

  /** Each so many seeds the whole set is written, with its report, and read back. */
  private static final int PROVED = 3;

  @TempDir Path folder;

  @Test
  void everySpecIsDrawnCleanOrRefusedByKey() throws IOException {
    drawOrRefuse(RandomSpecs::yaml, SEEDS * 3 / 5, SEEDS * 3 / 20, PROVED);
  }

  /** All outlines, layers side by side, rows of vias; the written files proven for some. */
  @Test
  void everyShapeIsDrawnCleanOrRefusedByKey() throws IOException {
    drawOrRefuse(RandomSpecs::shapes, SEEDS * 3 / 10, SEEDS / 10, 5 * PROVED);
  }

  /**
   * @param atLeast so many must be drawn
   * @param proveEvery the files of every so-manieth seed are written and read back
   */
  private void drawOrRefuse(LongFunction<String> yamlOf, int seeds, int atLeast, int proveEvery)
      throws IOException {
    int drawn = 0;
    Map<String, Integer> refusals = new TreeMap<>();
    for (long seed = 0; seed < seeds; seed++) {
      String yaml = yamlOf.apply(seed);
      String name = "seed " + seed + "\n" + yaml;
      Path spec = Files.writeString(folder.resolve("s" + seed + ".yaml"), yaml);
      try {
        InputFiles.Inputs in = InputFiles.read(spec.toString(), Optional.empty());
        Attempt attempt = Attempt.of(in, false);
        Drawn d = attempt.drawn();
        assertEquals(List.of(), d.rules().findings(), name);
        everyPhaseIsOneChain(d, name);
        everyNumberIsFinite(d, name);
        TightSpace.held(d, name);
        if (seed % proveEvery == 0) {
          assertTrue(
              SetFiles.of(attempt, Optional.empty()).results().proof().orElseThrow().passed(),
              name);
        } else if (ALL_PROVED) {
          assertTrue(LayerFiles.of(d.laid(), Optional.empty()).proof().passed(), name);
        }
        drawn++;
      } catch (FailedProof e) {
        throw new AssertionError(name, e);
      } catch (BadInput e) {
        for (Diagnostic x : e.diagnostics()) {
          assertFalse(x.key().isEmpty(), () -> name + x);
          assertTrue(x.where().line() > 0 || x.key().contains("."), () -> name + x);
          refusals.merge(x.key(), 1, Integer::sum);
        }
      }
    }
    assertTrue(drawn >= atLeast, drawn + " of " + seeds + " drawn; refused: " + refusals);
    System.out.println(drawn + " of " + seeds + " drawn; refused: " + refusals);
  }

  /**
   * Every phase count and parallel paths, tabs, pads and screws: clean and proved, or refused by
   * key. Only screws that meet rings or leads are left to the rule check.
   */
  @Test
  void everyWindingIsDrawnCleanAndProvedOrRefusedByKey() throws IOException {
    int seeds = SEEDS / 5;
    int drawn = 0;
    Map<String, Integer> refusals = new TreeMap<>();
    for (long seed = 0; seed < seeds; seed++) {
      String yaml = RandomSpecs.wide(seed);
      String name = "wide seed " + seed + "\n" + yaml;
      Path spec = Files.writeString(folder.resolve("w" + seed + ".yaml"), yaml);
      try {
        InputFiles.Inputs in = InputFiles.read(spec.toString(), Optional.empty());
        Drawn d = Attempt.of(in, false).drawn();
        List<Finding> others =
            d.rules().findings().stream()
                .filter(f -> !yaml.contains("holes:") || !f.toString().contains("mounting hole"))
                .toList();
        assertEquals(List.of(), others, name);
        everyNumberIsFinite(d, name);
        Artwork art = d.assembly().artwork().onGrid();
        ProofReport r =
            Prover.prove(LayerSet.write(art, ToyOrders.plain(1.2)), ProofExpectation.of(art));
        assertEquals(List.of(), r.findings().stream().map(ProofFinding::text).toList(), name);
        drawn++;
      } catch (BadInput e) {
        for (Diagnostic x : e.diagnostics()) {
          assertFalse(x.key().isEmpty(), () -> name + x);
          refusals.merge(x.key(), 1, Integer::sum);
        }
      }
    }
    String all = drawn + " of " + seeds + " windings drawn; refused: " + refusals;
    assertTrue(drawn >= seeds / 3, all);
    System.out.println(all);
  }

  /** Each phase passes each spiral of each of its coils once, end to end, in the coil's sense. */
  private static void everyPhaseIsOneChain(Drawn d, String name) {
    Artwork art = d.assembly().artwork();
    int[] passes = new int[art.conductors().size()];
    for (Phase p : art.phases()) {
      int at = p.entryJoint();
      int before = -1;
      for (Phase.Step s : p.steps()) {
        Conductor c = art.conductors().get(s.conductor());
        int from = s.forward() ? c.fromJoint() : c.toJoint();
        int to = s.forward() ? c.toJoint() : c.fromJoint();
        boolean sideBySide = from == before && to == at;
        assertEquals(sideBySide ? before : at, from, name + p.mark());
        before = from;
        at = to;
        passes[s.conductor()] += s.forward() ? 1 : -1;
      }
      assertEquals(p.exitJoint(), at, name + p.mark());
    }
    for (Coil c : art.coils()) {
      for (int id : c.copper()) {
        assertEquals(1, Math.abs(passes[id]), name + "coil " + c.number());
      }
      for (int id : c.conductors()) {
        assertEquals(c.sign(), passes[id], name + "coil " + c.number());
      }
    }
    Spec.Connection connection = d.spec().winding().connection();
    int pieces = pieces(art);
    int nodes = art.joints().size();
    int loops = art.conductors().size() - nodes + pieces;
    assertEquals(connection == Spec.Connection.OPEN ? 3 : 1, pieces, name);
    assertEquals(art.expectedCircuits(), loops, name);
    if (d.spec().via().count() == 1 && !d.spec().coil().parallelLayers()) {
      assertEquals(connection == Spec.Connection.DELTA ? 1 : 0, loops, name);
    }
  }

  /** Connected pieces of the whole copper as a graph. */
  private static int pieces(Artwork art) {
    Map<Integer, List<Integer>> next = new HashMap<>();
    for (Conductor c : art.conductors()) {
      next.computeIfAbsent(c.fromJoint(), k -> new ArrayList<>()).add(c.toJoint());
      next.computeIfAbsent(c.toJoint(), k -> new ArrayList<>()).add(c.fromJoint());
    }
    boolean[] seen = new boolean[art.joints().size()];
    int pieces = 0;
    for (int j = 0; j < seen.length; j++) {
      if (seen[j]) {
        continue;
      }
      pieces++;
      List<Integer> stack = new ArrayList<>(List.of(j));
      while (!stack.isEmpty()) {
        int k = stack.remove(stack.size() - 1);
        if (!seen[k]) {
          seen[k] = true;
          stack.addAll(next.getOrDefault(k, List.of()));
        }
      }
    }
    return pieces;
  }

  private static void everyNumberIsFinite(Drawn d, String name) {
    assertTrue(
        Double.isFinite(d.electrics().resistance().coilOhm())
            && d.electrics().resistance().coilOhm() > 0,
        name);
    d.electrics()
        .resistance()
        .terminals()
        .forEach(t -> assertTrue(t.ohm() > 0 && t.ohm() < 1e6, name));
    assertTrue(d.electrics().resistance().imbalancePercent() >= 0, name);
  }
}
