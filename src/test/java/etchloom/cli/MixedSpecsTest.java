package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Stackup;
import etchloom.diagnostic.Diagnostic;
import etchloom.proof.ProofExpectation;
import etchloom.proof.ProofFinding;
import etchloom.proof.ProofReport;
import etchloom.proof.Prover;
import etchloom.proof.ohm.CopperBuild;
import etchloom.rules.Finding;
import etchloom.run.Drawn;
import etchloom.testing.MixedSpecs;
import etchloom.testing.TightSpace;
import etchloom.testing.ToyOrders;
import etchloom.write.LayerSet;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Everything that a spec may ask for, mixed: a clean board whose written files are the winding that
 * was meant, or a refusal that names a key. With {@code -Detchloom.seeds=2000} every set is proved.
 */
class MixedSpecsTest {
  private static final Optional<Integer> ASKED =
      Optional.ofNullable(Integer.getInteger("etchloom.seeds"));
  private static final int SEEDS = ASKED.orElse(120);
  private static final int PROVE_EVERY = ASKED.isPresent() ? 1 : 2;

  @TempDir Path folder;

  private final Map<String, Integer> refusals = new TreeMap<>();
  private final Map<String, Integer> kinds = new TreeMap<>();
  private int drawn;
  private int proved;
  private int tight;

  @Test
  void everyMixtureIsDrawnCleanAndProvedOrRefusedByKey() throws IOException {
    List<String> faults = new ArrayList<>();
    for (long seed = 0; seed < SEEDS; seed++) {
      String yaml = MixedSpecs.yaml(seed);
      try {
        one(seed, yaml);
      } catch (AssertionError | RuntimeException e) {
        faults.add("mixed seed " + seed + ": " + e + "\n" + yaml);
      }
    }
    String all =
        String.format(
            "%d of %d mixtures drawn, %d proved, %d tight to 1 um; %s; refused: %s",
            drawn, SEEDS, proved, tight, kinds, refusals);
    System.out.println(all);
    assertTrue(faults.isEmpty(), () -> faults.size() + " faults\n" + String.join("\n", faults));
    assertTrue(drawn >= SEEDS / 3, all);
  }

  private void one(long seed, String yaml) throws IOException {
    Path spec = Files.writeString(folder.resolve("m" + seed + ".yaml"), yaml);
    Drawn d;
    try {
      d = Attempt.of(InputFiles.read(spec.toString(), Optional.empty()), false).drawn();
    } catch (BadInput e) {
      for (Diagnostic x : e.diagnostics()) {
        assertFalse(x.key().isEmpty(), x::toString);
        refusals.merge(x.key(), 1, Integer::sum);
      }
      return;
    }
    drawn++;
    // Only screws that meet rings or leads are left to the rule check.
    boolean screws = yaml.contains("holes:");
    List<Finding> findings =
        d.rules().findings().stream()
            .filter(f -> !screws || !f.toString().contains("mounting hole"))
            .toList();
    assertEquals(List.of(), findings);
    if (d.rules().findings().isEmpty()) {
      tight += TightSpace.held(d, "") ? 1 : 0;
    }
    assertTrue(d.electrics().resistance().terminals().stream().allMatch(t -> t.ohm() > 0));
    if (seed % PROVE_EVERY == 0) {
      prove(d);
      proved++;
    }
    String kind = d.spec().winding().phases() + "-phase";
    kinds.merge(kind, 1, Integer::sum);
    kinds.merge(d.spec().coil().outline().toString(), 1, Integer::sum);
    if (d.spec().winding().parallelPaths() > 1
        && d.spec().coil().parallelLayers()
        && d.spec().via().count() > 1) {
      kinds.merge("paths, layers and vias side by side", 1, Integer::sum);
    }
  }

  private static void prove(Drawn d) {
    Artwork art = d.assembly().artwork().onGrid();
    TreeMap<String, Double> ohms = new TreeMap<>();
    d.electrics().resistance().terminals().forEach(t -> ohms.put(t.key(), t.ohm()));
    ProofReport r =
        Prover.prove(
            LayerSet.write(art, ToyOrders.plain(art.stackup().thicknessMm())),
            ProofExpectation.of(art),
            build(art.stackup()),
            ohms);
    assertEquals(List.of(), r.findings().stream().map(ProofFinding::text).toList());
    assertEquals(0, r.opens());
    assertEquals(0, r.shorts());
    assertTrue(r.loops().values().stream().allMatch(n -> n == 0), r::toString);
    assertEquals(art.expectedCircuits(), r.circuits());
  }

  private static CopperBuild build(Stackup s) {
    return new CopperBuild(
        s.copper().stream()
            .map(c -> new CopperBuild.Layer(c.thicknessMm(), c.undercutMm()))
            .toList(),
        s.dielectricMm(),
        s.platingMm());
  }
}
