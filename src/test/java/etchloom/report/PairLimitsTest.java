package etchloom.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.electric.resistance.ResistanceFigures.Limits;
import java.util.List;
import org.junit.jupiter.api.Test;

class PairLimitsTest {
  @Test
  void withoutStarPoint_extremesAreTheReports() {
    Results r = Samples.template(Samples.SMALL);
    List<PairLimits> all = PairLimits.of(r.resistance());
    Limits worst = r.resistance().worst().orElseThrow();
    assertEquals(
        worst.minTerminalOhm(), all.stream().mapToDouble(PairLimits::least).min().orElseThrow());
    assertEquals(
        worst.maxTerminalOhm(), all.stream().mapToDouble(PairLimits::greatest).max().orElseThrow());
    assertEquals(all, PairLimits.lines(r.resistance()));
  }

  @Test
  void starPointsPairs_haveLimitsOfTheirOwn() {
    Results r = Samples.template("reaction-wheel");
    List<PairLimits> all = PairLimits.of(r.resistance());
    assertEquals(6, all.size());
    for (PairLimits p : all) {
      assertTrue(p.least() < p.expected() && p.expected() < p.greatest(), p.toString());
      // one phase against two in series: about half, so their spans do not meet
      assertTrue(p.pair().endsWith("-N") ? p.greatest() < 30 : p.least() > 25, p.toString());
    }
    assertEquals(3, PairLimits.lines(r.resistance()).size());
  }
}
