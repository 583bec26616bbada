package etchloom.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Mistakes in a rules file, and all that is said about them. */
class FabFindingsTest {
  private static final String FAB = Found.file("fab.yaml");

  static Stream<Mistake> mistakes() {
    return Mistake.in("fab-findings.txt");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("mistakes")
  void oneMistake(Mistake m) {
    m.check(FabReader.read("fab.yaml", m.madeIn(FAB)));
  }

  @Test
  void theFileItself_readsClean() {
    assertEquals(List.of(), Found.in(FabReader.read("fab.yaml", Found.utf8(FAB))));
  }
}
