package etchloom.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;

import etchloom.artwork.Artwork;
import etchloom.electric.resistance.Resistance;
import etchloom.electric.resistance.ResistanceFigures.TerminalOhm;
import etchloom.proof.ohm.FileResistance;
import etchloom.spec.FabRules;
import etchloom.spec.Templates;
import java.util.List;
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
    FileResistance.Ohms files =
        Prover.ohms(
            WrittenSets.write(art), ProofExpectation.of(art), WrittenSets.build(art.stackup()));
    List<TerminalOhm> report = Resistance.of(art, new FabRules.Tolerance(0, 0, 0)).terminals();
    assertEquals(
        report.stream().map(TerminalOhm::key).toList(),
        files.pairs().stream().map(p -> p.from() + "-" + p.to()).toList());
    for (int i = 0; i < report.size(); i++) {
      assertEquals(report.get(i).ohm(), files.pairs().get(i).ohm(), 1e-6 * report.get(i).ohm());
    }
    assertEquals(0, files.error());
  }
}
