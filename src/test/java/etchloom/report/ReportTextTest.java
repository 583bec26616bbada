package etchloom.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.testing.Specs;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;

class ReportTextTest {
  private static final Results SMALL = Samples.template(Samples.SMALL);
  private static final Results BARE = Samples.bare(Specs.wheel(2));

  @Test
  void everyLineFits() {
    for (Results r : List.of(SMALL, BARE)) {
      ReportText.text(r, false).lines().forEach(l -> assertTrue(Text.columns(l) <= 80, l));
    }
  }

  @Test
  void everyFigureShown_isFollowedByItsBasis() {
    String text = ReportText.text(SMALL, false);
    Set<Basis> used = new HashSet<>();
    Figures.shown(ReportJson.figures(SMALL))
        .values()
        .forEach(l -> l.forEach(s -> used.add(s.basis())));
    assertTrue(used.contains(Basis.RESISTANCE));
    used.forEach(b -> assertTrue(text.contains("\n  basis: " + b.line() + "\n"), b.name()));
  }

  @Test
  void withoutRotorAndDuty_saysWhichKeyBringsWhat() {
    String text = ReportText.text(BARE, false).replaceAll("\\s+", " ");
    assertTrue(text.contains("add rotor.magnet and rotor.air-gap for: back-emf, torque"), text);
    assertTrue(text.contains("add duty for: "), text);
    assertTrue(text.contains("add duty.bus and duty.switching for: "), text);
    assertFalse(text.contains("delta"), text);
  }

  @Test
  void ripple_cannotBeMissed() {
    double amps = SMALL.spec().duty().orElseThrow().currentAmpereRms().orElseThrow();
    double aim = 0.2 * Math.sqrt(2) * amps;
    String key = "drive.rippleAmperePeakToPeak";
    assertTrue(Verdicts.ripple(SMALL, Map.of()).isEmpty());
    assertTrue(Verdicts.ripple(SMALL, Map.of(key, 0.99 * aim)).isEmpty());
    List<String> words =
        Verdicts.ripple(SMALL, Map.of(key, 5 * aim, "drive.seriesInductanceForRippleHenry", 120e-6))
            .orElseThrow();
    assertEquals("PWM RIPPLE TOO GREAT", words.get(0));
    assertTrue(words.get(1).contains("100 % of the line current's peak"), words.get(1));
    assertTrue(words.get(1).contains("120.0 uH in series"), words.get(1));
    assertEquals("PWM RIPPLE", Verdicts.ripple(BARE, Map.of(key, 1.0)).orElseThrow().get(0));
  }
}
