package etchloom.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.diagnostic.DiagnosticText;
import etchloom.diagnostic.Staged;
import etchloom.testing.Specs;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** What is written reads back as the same spec, every number to the last bit. */
class RoundTripTest {
  private static Spec again(Spec spec) {
    String text = SpecWriter.toYaml(spec);
    Staged<SpecFile> read = SpecReader.read("spec.yaml", Found.utf8(text));
    assertTrue(read.value().isPresent(), () -> DiagnosticText.text(read.diagnostics()));
    return read.value().get().spec();
  }

  private static Spec template(String name) {
    return SpecReader.read(name, Templates.bytes(name)).value().orElseThrow().spec();
  }

  static List<String> templates() {
    return Templates.names();
  }

  static List<String> classes() {
    return Templates.fabNames();
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("templates")
  void templates_areTheSame(String name) {
    Spec spec = template(name);
    assertEquals(spec, again(spec));
    assertEquals(SpecWriter.toYaml(spec), SpecWriter.toYaml(again(spec)));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("classes")
  void classes_areTheSame(String name) {
    FabRules rules = FabReader.builtIn(name);
    String text = FabWriter.toYaml(rules);
    FabRules read = FabReader.read("fab.yaml", Found.utf8(text)).value().orElseThrow();
    assertEquals(rules, read);
    assertEquals(text, FabWriter.toYaml(read));
  }

  @Test
  void rulesWithoutStackups_areTheSame() {
    FabRules rules = Specs.fab();
    assertEquals(
        rules, FabReader.read("f", Found.utf8(FabWriter.toYaml(rules))).value().orElseThrow());
  }

  static Stream<Arguments> seeds() {
    return templates().stream()
        .flatMap(name -> LongStream.range(0, 40).mapToObj(seed -> Arguments.of(name, seed)));
  }

  /** Values with all their digits, as no one types them but a survey may have them. */
  @ParameterizedTest(name = "{0}, seed {1}")
  @MethodSource("seeds")
  void valuesOfManyDigits_areTheSame(String name, long seed) {
    Spec spec = new Jitter(new Random(seed)).of(template(name));
    assertEquals(spec, again(spec));
  }

  @Test
  void oddTexts_areTheSame() {
    for (String title :
        List.of(
            "a: b # c",
            "null",
            "~1",
            "- x",
            "1.0",
            "\"quoted\" 'twice'",
            "{x}",
            "&x *y !z",
            "% @ `x`",
            "K\u00fchler \u4e2d x",
            "x \ud83d\ude00",
            "[x",
            "true",
            "etchloom: 1")) {
      Spec spec = titled(template("dosing-pump"), title);
      assertEquals(spec, again(spec));
    }
  }

  /** Without magnet, duty, holes and every optional number. */
  @Test
  void aBareSpec_isTheSame() {
    Spec spec = Specs.spec(Specs.wheel(4).connected(Spec.Connection.DELTA));
    assertEquals(spec, again(spec));
    assertEquals(Optional.empty(), again(spec).duty());
  }

  @Test
  void aValueFromTheCommandLine_isWritten() {
    byte[] wheel = Templates.bytes("filter-wheel");
    Spec spec =
        SpecReader.read("w", wheel, java.util.Map.of("coil.track", "8mil", "duty.speed", "30rad/s"))
            .value()
            .orElseThrow()
            .spec();
    String text = SpecWriter.toYaml(spec);
    assertTrue(text.contains("  track: 0.2032 mm\n"), text); // 8 mil of 0.0254 mm
    assertEquals(spec, again(spec));
  }

  /** The text itself, so that a change of it is seen. */
  @Test
  void theText() {
    Spec spec = SpecReader.read("w", Found.utf8(Found.file("wheel.yaml"))).value().get().spec();
    assertEquals(Found.file("wheel-as-used.yaml"), SpecWriter.toYaml(spec));
    FabRules rules = FabReader.read("f", Found.utf8(Found.file("fab.yaml"))).value().get();
    assertEquals(Found.file("fab-as-used.yaml"), FabWriter.toYaml(rules));
  }

  @Test
  void theLocale_doesNotMatter() {
    Spec spec = template("wind-logger");
    String text = SpecWriter.toYaml(spec);
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(new Locale("ar", "EG"));
      assertEquals(text, SpecWriter.toYaml(spec));
      Locale.setDefault(Locale.GERMANY);
      assertEquals(text, SpecWriter.toYaml(spec));
      assertEquals(spec, again(spec));
    } finally {
      Locale.setDefault(before);
    }
  }

  /** Whoever opens the file finds every key of the format that this spec can have. */
  @Test
  void everyKey_isWritten() {
    String text = SpecWriter.toYaml(template("filter-wheel"));
    String keys =
        text.lines()
            .filter(l -> l.contains(":"))
            .map(l -> l.strip().split(":")[0])
            .distinct()
            .collect(Collectors.joining(" "));
    for (String key :
        List.of(
            "title",
            "revision",
            "sides",
            "remanence-drift",
            "density",
            "limit",
            "iron",
            "parallel-paths",
            "layers",
            "count",
            "bore",
            "keep-out",
            "kind",
            "star-point",
            "finish",
            "mask",
            "tg",
            "use",
            "bandwidth",
            "ambient",
            "copper-limit",
            "cooling")) {
      assertTrue((" " + keys + " ").contains(" " + key + " "), key + " in " + keys);
    }
  }

  @Test
  void notANumber_isRefused() {
    Spec spec =
        new Jitter(new Random(1)) {
          @Override
          double of(double v) {
            return Double.NaN;
          }
        }.of(template("dosing-pump"));
    assertThrows(IllegalArgumentException.class, () -> SpecWriter.toYaml(spec));
  }

  private static Spec titled(Spec s, String title) {
    return new Spec(
        title,
        Slug.of(title),
        s.revision(),
        s.rotor(),
        s.winding(),
        s.coil(),
        s.rim(),
        s.via(),
        s.board(),
        s.fab(),
        s.duty());
  }

  /** Moves every number by up to half a percent, so that what fits still fits. */
  private static class Jitter {
    private final Random random;

    Jitter(Random random) {
      this.random = random;
    }

    double of(double v) {
      return v * (1 + 0.01 * (random.nextDouble() - 0.5)) + 0.0; // + 0.0: no negative zero
    }

    OptionalDouble of(OptionalDouble v) {
      return v.isPresent() ? OptionalDouble.of(of(v.getAsDouble())) : v;
    }

    Spec of(Spec s) {
      return new Spec(
          s.title(),
          s.slug(),
          s.revision(),
          of(s.rotor()),
          s.winding(),
          of(s.coil()),
          new Spec.Rim(of(s.rim().trackMm())),
          new Spec.Via(of(s.via().holeMm()), of(s.via().padMm()), s.via().count()),
          of(s.board()),
          s.fab(),
          s.duty().map(this::of));
    }

    private Spec.Rotor of(Spec.Rotor r) {
      return new Spec.Rotor(
          r.poles(),
          r.twoSided(),
          of(r.airGapMm()),
          r.magnet().map(this::of),
          of(r.outerDiameterMm()),
          r.ironBehindMagnets(),
          of(r.counterPlateGapMm()));
    }

    private Spec.Magnet of(Spec.Magnet m) {
      return new Spec.Magnet(
          m.outline(),
          of(m.diameterMm()),
          of(m.innerRadiusMm()),
          of(m.outerRadiusMm()),
          of(m.spanRad()),
          of(m.lengthMm()),
          of(m.widthMm()),
          of(m.pitchRadiusMm()),
          of(m.thicknessMm()),
          of(m.remanenceTesla()),
          of(m.remanenceDriftPerKelvin()),
          of(m.temperatureC()),
          of(m.density()),
          of(m.limitC()));
    }

    private Spec.Coil of(Spec.Coil c) {
      return new Spec.Coil(
          c.outline(),
          of(c.innerRadiusMm()),
          of(c.outerRadiusMm()),
          of(c.widthMm()),
          c.turns(),
          of(c.trackMm()),
          of(c.spaceMm()),
          c.outline() == Spec.CoilOutline.ROUND ? c.cornerMm() : OptionalDouble.of(of(c.trackMm())),
          c.parallelLayers(),
          c.taper());
    }

    private Spec.Board of(Spec.Board b) {
      Spec.Terminals terminals = of(b.terminals());
      return new Spec.Board(
          b.layers(),
          of(b.thicknessMm()),
          of(b.outerCopper()),
          new Spec.Copper(OptionalDouble.empty(), OptionalDouble.of(of(0.035))),
          b.stackupMm().stream().map(this::of).toList(),
          of(b.diameterMm()),
          of(b.boreMm()),
          b.holes().map(this::of),
          terminals,
          b.starPointOut(),
          b.finish(),
          b.mask(),
          of(b.laminateTgC()),
          Optional.of(new Spec.Tab(terminals.startRad(), of(20.0), of(8.0))));
    }

    private Spec.Copper of(Spec.Copper c) {
      return new Spec.Copper(of(c.ounces()), of(c.thicknessMm()));
    }

    private Spec.Holes of(Spec.Holes h) {
      return new Spec.Holes(
          h.count(), of(h.diameterMm()), of(h.circleMm()), of(h.startRad()), of(h.keepOutMm()));
    }

    private Spec.Terminals of(Spec.Terminals t) {
      return new Spec.Terminals(
          t.kind(), of(t.startRad()), of(t.pitchMm()), of(t.holeMm()), of(t.padMm()));
    }

    private Spec.Duty of(Spec.Duty d) {
      return new Spec.Duty(
          d.generator(),
          of(d.torqueNm()),
          of(d.loadOhm()),
          of(d.busVolt()),
          of(d.speedRadPerSecond()),
          of(d.currentAmpereRms()),
          of(d.switchingHertz()),
          of(d.bandwidthHertz()),
          of(d.ambientC()),
          of(d.copperLimitC()),
          of(d.coolingWattPerSquareMetreKelvin()));
    }
  }
}
