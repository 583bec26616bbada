package etchloom.survey;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.diagnostic.Staged;
import java.util.LinkedHashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ExpressionTest {
  private static Map<String, Object> figures() {
    Map<String, Object> f = new LinkedHashMap<>();
    f.put("winding.connection", "star");
    f.put("geometry.layers", 4L);
    f.put("resistance.terminalOhm.U1-V1", 4.0);
    f.put("resistance.terminalOhm.V1-W1", 5.0);
    f.put("resistance.terminalOhm.U1-N", 2.0);
    f.put("resistance.imbalancePercent", 0.5);
    f.put("spread.imbalancePercent.rss", 1.5);
    f.put("spread.terminalOhmPercent.rss", 20.0);
    f.put("torque.motorConstant", 0.004);
    f.put("thermal.stable", true);
    return f;
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "motorConstant > 0.003;true",
        "torque.motorConstant>4e-3;false",
        "motorConstant >= 4e-3;true",
        "geometry.layers == 4;true",
        "layers = 4 and layers != 2;true",
        "3 < layers <= 4;true",
        "4 < layers <= 5;false",
        "terminalOhm == 4.5;true", // the mean of the lines, the star point left out
        "resistance.terminalOhm.U1-V1 == 4;true",
        "imbalancePercent < 1;true", // a figure goes before a group of the same name
        "connection == 'star';true",
        "connection == \"delta\";false",
        "connection < 'z';false",
        "stable;true",
        "not stable;false",
        "not (layers < 3 or layers > 5);true",
        "layers < 3 or layers > 5 or stable;true",
        "layers < 3 && stable || layers == 4;true",
        "layers < 3 and (stable or layers == 4);false",
        "loss.copperWatt < 5;false",
        "not loss.copperWatt < 5;false",
        "loss.copperWatt < 5 or stable;true",
        "-1 < motorConstant;true"
      })
  void holds(String text, boolean wanted) {
    Expression e = ExpressionReader.read("--keep", text).value().orElseThrow();
    assertEquals(wanted, e.holds(figures()));
    assertEquals(wanted, e.shortfall(figures()) == 0);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "5",
        "layers <",
        "layers < < 5",
        "< 5",
        "layers < 5 and",
        "(layers < 5",
        "layers < 5)",
        "layers < 5 mm",
        "layers + 1 < 5",
        "System.exit(1)",
        "connection == 'star",
        "and",
        "layers < 5; stable",
        "\u0000"
      })
  void whatIsWrong(String text) {
    Staged<Expression> s = ExpressionReader.read("--keep", text);
    assertTrue(s.value().isEmpty(), () -> text + " was read as " + s.value());
  }

  @Test
  void deepBracketsAreRefused() {
    String text = "(".repeat(900) + "a < 1" + ")".repeat(900);
    assertTrue(ExpressionReader.read("--keep", text).value().isEmpty());
  }

  /** Twice the allowed value falls short by half of what is there; nearer values by less. */
  @Test
  void shortfallGrowsWithTheDistance() {
    Expression e = ExpressionReader.read("--keep", "layers < 2").value().orElseThrow();
    assertEquals(0.5, e.shortfall(figures()), 1e-12);
    Expression near = ExpressionReader.read("--keep", "layers < 3.9").value().orElseThrow();
    assertTrue(near.shortfall(figures()) < 0.05);
  }

  @Test
  void namesAreHeldAgainstAReport() {
    assertEquals(
        0, Names.check("--rank", java.util.List.of(new FigureName("rss")), Map.of()).size());
    String twoMeanings =
        Names.check("--rank", java.util.List.of(new FigureName("rss")), figures()).get(0).message();
    assertTrue(twoMeanings.contains("spread.imbalancePercent.rss"), twoMeanings);
    var unknown =
        Names.check("--rank", java.util.List.of(new FigureName("motorKonstant")), figures());
    assertTrue(unknown.get(0).hints().get(0).contains("torque.motorConstant"), unknown::toString);
  }
}
