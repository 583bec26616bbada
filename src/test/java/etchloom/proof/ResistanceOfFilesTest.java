package etchloom.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;

import etchloom.artwork.Artwork;
import etchloom.electric.resistance.Resistance;
import etchloom.electric.resistance.ResistanceFigures.TerminalOhm;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.copper.CopperBuilder;
import etchloom.proof.image.LayerImage;
import etchloom.proof.ohm.FileResistance;
import etchloom.spec.FabRules;
import etchloom.spec.Templates;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The report's terminal resistances against those of the written Gerber and drill files. */
class ResistanceOfFilesTest {
  static List<String> templates() {
    return Templates.names();
  }

  @ParameterizedTest
  @MethodSource("templates")
  void filesResist_whatTheReportSays(String name) {
    Artwork art = WrittenSets.template(name);
    SetFiles set = new SetFiles(WrittenSets.write(art), new Findings());
    List<LayerImage> copper = List.copyOf(set.copper().values());
    Connectivity net =
        new Connectivity(
            copper.stream().map(i -> new CopperBuilder().build(i.objects())).toList(),
            DrilledHoles.of(set.gerberDrills(), art.layers()));
    FileResistance.Ohms files =
        FileResistance.between(
            copper,
            net,
            WrittenSets.build(art.stackup()),
            art.terminals().stream()
                .map(t -> new FileResistance.Terminal(t.mark(), t.firstLayer(), t.at()))
                .toList());
    List<TerminalOhm> report = report(art);
    assertEquals(
        report.stream().map(TerminalOhm::key).toList(),
        files.pairs().stream().map(p -> p.from() + "-" + p.to()).toList());
    for (int i = 0; i < report.size(); i++) {
      assertEquals(report.get(i).ohm(), files.pairs().get(i).ohm(), 1e-6 * report.get(i).ohm());
    }
    assertEquals(0, files.error());
  }

  private static List<TerminalOhm> report(Artwork art) {
    return Resistance.of(art, new FabRules.Tolerance(0, 0, 0)).terminals();
  }

  @Test
  void reportThatSaysOtherwise_isFound() {
    Artwork art = WrittenSets.smallWheel();
    TreeMap<String, Double> said = new TreeMap<>();
    report(art).forEach(t -> said.put(t.key(), t.ohm()));
    assertEquals(List.of(), prove(art, said));
    said.put("U1-W1", said.get("U1-W1") * 1.02);
    said.remove("U1-V1");
    assertEquals(List.of("resistance", "resistance"), prove(art, said));
  }

  private static List<String> prove(Artwork art, SortedMap<String, Double> said) {
    return Prover.prove(
            WrittenSets.write(art),
            ProofExpectation.of(art),
            WrittenSets.build(art.stackup()),
            said)
        .findings()
        .stream()
        .map(ProofFinding::name)
        .toList();
  }
}
