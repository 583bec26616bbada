package etchloom.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.diagnostic.DiagnosticText;
import etchloom.diagnostic.Staged;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Everything that ships as a template reads without a word. */
class TemplatesTest {
  static List<String> specs() {
    return Templates.names();
  }

  static List<String> fabs() {
    return Templates.fabNames();
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("specs")
  void startingSpecReadsClean(String name) {
    Staged<SpecFile> read = SpecReader.read(name + ".yaml", Templates.bytes(name));
    assertEquals("", DiagnosticText.text(read.diagnostics()));
    assertTrue(read.value().isPresent());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("fabs")
  void fabClassReadsClean(String name) {
    Staged<FabRules> read = FabReader.read(name + ".yaml", Templates.fabBytes(name));
    assertEquals("", DiagnosticText.text(read.diagnostics()));
    assertTrue(read.value().isPresent());
  }

  /** Copper rows, widths, gaps, holes and rings of each template against its own class. */
  @ParameterizedTest(name = "{0}")
  @MethodSource("specs")
  void startingSpecSuitsItsClass(String name) {
    Spec spec = SpecReader.read(name, Templates.bytes(name)).value().orElseThrow().spec();
    FabRules fab = FabReader.builtIn(spec.fab());
    assertTrue(fab.layers().contains(spec.board().layers()));
    FabRules.CopperRow outer = fab.row(spec.board().outerCopper(), true).orElseThrow();
    FabRules.CopperRow inner = fab.row(spec.board().innerCopper(), false).orElseThrow();
    assertTrue(spec.coil().trackMm() >= Math.max(outer.trackMm(), inner.trackMm()));
    assertTrue(spec.coil().spaceMm() >= Math.max(outer.spaceMm(), inner.spaceMm()));
    assertTrue(spec.via().holeMm() >= fab.hole().minMm());
    assertTrue(spec.board().thicknessMm() <= fab.hole().aspect() * spec.via().holeMm());
    assertTrue((spec.via().padMm() - spec.via().holeMm()) / 2 >= fab.ring().viaMm());
    assertTrue(spec.board().diameterMm() <= fab.sizeMm());
  }

  @Test
  void everyTemplateHasADescription() {
    for (String name : Templates.names()) {
      assertFalse(Templates.description(name).isEmpty());
    }
    assertTrue(Templates.description("filter-wheel").startsWith("Filter wheel: "));
    assertTrue(Templates.fabDescription("fine").startsWith("Fine class: "));
  }

  @Test
  void unknownTemplateIsRefused() {
    assertThrows(IllegalArgumentException.class, () -> Templates.bytes("../secret"));
    assertThrows(IllegalArgumentException.class, () -> Templates.fabBytes("none"));
  }
}
