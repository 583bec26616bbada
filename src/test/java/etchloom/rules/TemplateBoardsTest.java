package etchloom.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.board.Assembler;
import etchloom.spec.FabReader;
import etchloom.spec.FabRules;
import etchloom.spec.Positions;
import etchloom.spec.Spec;
import etchloom.spec.SpecReader;
import etchloom.spec.Templates;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The boards that ship with the program keep the rules of the fab class they name. */
class TemplateBoardsTest {
  private record Drawn(Artwork artwork, Spec spec, FabRules fab) {
    RuleReport check() {
      return RuleCheck.check(artwork, spec, fab, RuleContext.NONE);
    }
  }

  static Stream<String> templates() {
    return Templates.names().stream();
  }

  private static Drawn draw(String name) {
    Spec spec = SpecReader.read(name, Templates.bytes(name)).value().orElseThrow().spec();
    FabRules fab = FabReader.builtIn(spec.fab());
    Artwork art =
        Assembler.assemble(spec, fab, Positions.unknown(name)).value().orElseThrow().artwork();
    return new Drawn(art, spec, fab);
  }

  @ParameterizedTest
  @MethodSource("templates")
  void noFindings_andAMinimumForEveryRule(String name) {
    Drawn d = draw(name);
    RuleReport r = d.check();
    assertEquals(List.of(), r.findings());
    List<String> expected =
        new ArrayList<>(Arrays.stream(RuleName.values()).map(RuleName::word).toList());
    if (d.spec().duty().orElseThrow().busVolt().isEmpty()) {
      expected.remove("voltage");
    }
    if (d.spec().board().holes().isEmpty() && d.spec().rotor().outerDiameterMm().isEmpty()) {
      expected.remove("keep-out");
    }
    assertEquals(expected, r.minima().stream().map(Finding::rule).toList());
    double round = d.spec().board().diameterMm() / 2;
    double edge =
        d.spec()
            .board()
            .tab()
            .map(t -> Math.hypot(round + t.lengthMm(), t.widthMm() / 2))
            .orElse(round);
    for (Finding f : r.minima()) {
      assertTrue(f.at().norm() <= edge, f::toString);
      assertTrue(Double.isFinite(f.measured()) && Double.isFinite(f.required()), f::toString);
    }
  }

  /** The spec's space is drawn to the last digit, so it is the least gap of the board. */
  @ParameterizedTest
  @MethodSource("templates")
  void leastGap_isTheDrawnSpace(String name) {
    Drawn d = draw(name);
    RuleReport r = d.check();
    assertEquals(
        d.spec().coil().spaceMm(),
        Boards.minimum(r, "space").orElseThrow().measured(),
        Board.SLACK_MM);
    double track = d.spec().coil().trackMm();
    assertEquals(track, Boards.minimum(r, "track").orElseThrow().measured(), 1e-12);
  }

  @ParameterizedTest
  @MethodSource("templates")
  void sameBoard_sameReport(String name) {
    Drawn d = draw(name);
    RuleReport first = d.check();
    for (int i = 0; i < 3; i++) {
      assertEquals(first, d.check());
    }
    assertEquals(first, draw(name).check());
  }

  /** A fab that asks for a hair more than is drawn: every layer breaks the rule, and is named. */
  @ParameterizedTest
  @MethodSource("templates")
  void aFabThatAsksForMore_isRefusedOnEveryLayer(String name) {
    Drawn d = draw(name);
    double asked = d.spec().coil().spaceMm() + 0.001;
    List<FabRules.CopperRow> rows =
        d.fab().copper().stream()
            .map(
                c ->
                    new FabRules.CopperRow(
                        c.ounces(), c.outer(), c.thicknessMm(), c.trackMm(), asked, c.etchFactor()))
            .toList();
    FabRules f = d.fab();
    FabRules stricter =
        new FabRules(
            f.title(),
            f.layers(),
            f.stackups(),
            f.thicknessMinMm(),
            f.thicknessMaxMm(),
            f.sizeMm(),
            rows,
            f.hole(),
            f.ring(),
            f.edge(),
            f.mask(),
            f.legend(),
            f.tolerance());
    RuleReport r = RuleCheck.check(d.artwork(), d.spec(), stricter, RuleContext.NONE);
    List<Finding> space = Boards.findings(r, "space");
    assertEquals(r.findings(), space);
    assertEquals(Verdicts.LISTED, space.size());
    assertTrue(space.stream().allMatch(x -> x.measured() < asked && x.required() == asked));
    assertTrue(r.notes().stream().anyMatch(n -> n.startsWith("space: broken at ")));
  }
}
