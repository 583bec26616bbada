package etchloom.survey;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.diagnostic.Staged;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class AxisReaderTest {
  private static List<String> values(String text) {
    return AxisReader.read(text).value().orElseThrow().values();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "a=0.15mm,0.2mm|0.15 mm;0.2 mm",
        "a= 0.15 mm , 0.2 mm|0.15 mm;0.2 mm",
        "a=star,delta|star;delta",
        "a=4..7|4;5;6;7",
        "a=-2..1|-2;-1;0;1",
        "a=0.15mm..0.3mm/5|0.15 mm;0.18 mm;0.21 mm;0.24 mm;0.27 mm;0.3 mm",
        "a=0.15..0.3mm/6|0.15 mm;0.175 mm;0.2 mm;0.225 mm;0.25 mm;0.275 mm;0.3 mm",
        "a=1mm..2mm/3|1 mm;1.33333333333 mm;1.66666666667 mm;2 mm",
        "a=5W/m2K..15W/m2K/2|5 W/m2K;10 W/m2K;15 W/m2K",
        "a=fill,4..6|fill;4;5;6",
        "fab=economy,../rules/own.yaml|economy;../rules/own.yaml"
      })
  void values(String text, String wanted) {
    assertEquals(List.of(wanted.split(";")), values(text));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "a|key and its values",
        "=1,2|key and its values",
        "a=|missing",
        "a=1,,2|missing",
        "a=1,2,1|twice",
        "a=0.1mm..0.2mm|steps",
        "a=0.1mm..0.2in/4|same unit",
        "a=0.2mm..0.1mm/4|lower",
        "a=4..4|lower",
        "a=0.1mm..0.2mm/0|steps",
        "a=0.1mm..0.2mm/-3|steps",
        "a=0.1mm..x/3|no end",
        "a=1e999999..2/3|no end",
        "a=0..9999999|more than"
      })
  void whatIsWrong(String text, String words) {
    Staged<Axis> s = AxisReader.read(text);
    assertTrue(s.value().isEmpty(), () -> "read as " + s.value());
    assertTrue(s.diagnostics().get(0).message().contains(words), s.diagnostics()::toString);
  }

  @Test
  void lastKeyVariesFastest() {
    Grid g =
        new Grid(List.of(new Axis("a", List.of("1", "2")), new Axis("b", List.of("x", "y", "z"))));
    assertEquals(6, g.count());
    assertEquals(Map.of("a", "1", "b", "x"), g.values(1));
    assertEquals(Map.of("a", "1", "b", "z"), g.values(3));
    assertEquals(Map.of("a", "2", "b", "x"), g.values(4));
    assertEquals(List.of("a", "b"), List.copyOf(g.values(6).keySet()));
  }

  @ParameterizedTest
  @CsvSource({"1,1,10", "2,1,10", "3,1,10", "7,3,10", "7,12,10"})
  void partsCoverAllOnce(int count, int of, int unused) {
    long next = 1;
    for (int k = 1; k <= of; k++) {
      Part p = new Part(k, of);
      assertEquals(next, p.first(count));
      next = p.last(count) + 1;
    }
    assertEquals(count + 1, next);
  }
}
