package etchloom;

import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.syntax.ArchRuleDefinition;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The table of packages in DEVELOPERS.md, held against the compiled classes. */
class ArchitectureTest {
  private static final JavaClasses CLASSES =
      new ClassFileImporter()
          .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
          .importPackages("etchloom");

  /** What runs many specs, or judges what came of one, sees whatever a run sees. */
  private static final List<String> WITH_RUN =
      List.of(
          "run",
          "board",
          "artwork",
          "winding",
          "spec",
          "rules",
          "electric",
          "proof",
          "report",
          "units",
          "geometry",
          "diagnostic");

  /** Package to the packages it may use, itself left out. */
  private static final Map<String, List<String>> MAY_USE =
      Map.ofEntries(
          Map.entry("units", List.of()),
          Map.entry("diagnostic", List.of()),
          Map.entry("geometry", List.of()),
          Map.entry("spec", List.of("units", "diagnostic")),
          Map.entry("winding", List.of("diagnostic")),
          Map.entry("coil", List.of("geometry", "spec", "diagnostic")),
          Map.entry(
              "rim",
              List.of("geometry", "spec", "winding", "coil", "artwork", "diagnostic", "units")),
          Map.entry("artwork", List.of("geometry")),
          Map.entry("rules", List.of("artwork", "geometry", "spec", "units", "diagnostic")),
          Map.entry(
              "electric", List.of("artwork", "geometry", "winding", "spec", "units", "diagnostic")),
          Map.entry(
              "board",
              List.of(
                  "geometry", "spec", "winding", "coil", "rim", "artwork", "diagnostic", "units")),
          Map.entry("write", List.of("artwork", "geometry", "units")),
          Map.entry("proof", List.of("artwork", "geometry", "units", "diagnostic")),
          Map.entry("watch", List.of("report")),
          Map.entry("survey", WITH_RUN),
          Map.entry("receive", WITH_RUN),
          Map.entry(
              "run",
              List.of(
                  "board",
                  "artwork",
                  "winding",
                  "spec",
                  "rules",
                  "electric",
                  "proof",
                  "report",
                  "units",
                  "geometry",
                  "diagnostic")),
          Map.entry(
              "report",
              List.of(
                  "artwork",
                  "winding",
                  "spec",
                  "rules",
                  "electric",
                  "proof",
                  "units",
                  "geometry",
                  "diagnostic")));

  static Stream<String> packages() {
    return MAY_USE.keySet().stream().sorted();
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("packages")
  void usesOnlyWhatTheTableAllows(String name) {
    List<String> allowed =
        Stream.concat(Stream.of(name), MAY_USE.get(name).stream())
            .map(p -> "etchloom." + p + "..")
            .toList();
    ArchRule rule =
        ArchRuleDefinition.classes()
            .that()
            .resideInAPackage("etchloom." + name + "..")
            .should()
            .onlyDependOnClassesThat(
                com.tngtech.archunit.base.DescribedPredicate.describe(
                    "are outside etchloom or in " + allowed,
                    c ->
                        !c.getPackageName().startsWith("etchloom.")
                            || allowed.stream()
                                .map(a -> a.substring(0, a.length() - 2))
                                .anyMatch(
                                    a ->
                                        c.getPackageName().equals(a)
                                            || c.getPackageName().startsWith(a + "."))))
            .allowEmptyShould(true);
    rule.check(CLASSES);
  }

  /** A mistake that both would share could not show in what is read back. */
  @Test
  void readersAndWritersDoNotSeeEachOther() {
    for (List<String> pair : List.of(List.of("proof", "write"), List.of("write", "proof"))) {
      ArchRuleDefinition.noClasses()
          .that()
          .resideInAPackage("etchloom." + pair.get(0) + "..")
          .should()
          .dependOnClassesThat()
          .resideInAPackage("etchloom." + pair.get(1) + "..")
          .check(CLASSES);
    }
  }

  @Test
  void packagesHaveNoCycles() {
    slices().matching("etchloom.(*)..").should().beFreeOfCycles().check(CLASSES);
  }
}
