package etchloom.spec;

import static etchloom.units.Dimension.ANGLE;
import static etchloom.units.Dimension.COPPER;
import static etchloom.units.Dimension.CURRENT;
import static etchloom.units.Dimension.FLUX_DENSITY;
import static etchloom.units.Dimension.FREQUENCY;
import static etchloom.units.Dimension.HEAT_TRANSFER;
import static etchloom.units.Dimension.RATIO;
import static etchloom.units.Dimension.RESISTANCE;
import static etchloom.units.Dimension.SPEED;
import static etchloom.units.Dimension.TEMPERATURE;
import static etchloom.units.Dimension.TORQUE;
import static etchloom.units.Dimension.VOLTAGE;

import etchloom.spec.Spec.Board;
import etchloom.spec.Spec.Coil;
import etchloom.spec.Spec.Copper;
import etchloom.spec.Spec.Duty;
import etchloom.spec.Spec.Holes;
import etchloom.spec.Spec.Magnet;
import etchloom.spec.Spec.Rotor;
import etchloom.spec.Spec.Tab;
import etchloom.spec.Spec.Terminals;
import etchloom.spec.Spec.Via;
import etchloom.spec.Spec.Winding;
import etchloom.spec.yaml.YamlText;
import etchloom.units.Dimension;
import etchloom.units.QuantityText;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;

/** Writes a spec as a file with every key that it has, defaults filled in. */
public final class SpecWriter {
  private SpecWriter() {}

  /**
   * The file's text. {@link SpecReader} makes the same {@link Spec} of it, every number to the last
   * bit; the same spec gives the same text. Nothing is checked here: what the reader would refuse
   * it still refuses.
   *
   * @throws IllegalArgumentException if a number is not finite
   */
  public static String toYaml(Spec spec) {
    YamlText y = new YamlText().comment("The spec as used, defaults filled in.");
    y.value(SpecReader.VERSION_KEY, FormatVersion.KNOWN);
    y.text("title", spec.title()).text("revision", spec.revision());
    y.group("rotor", g -> rotor(g, spec.rotor()));
    y.group("winding", g -> winding(g, spec.winding()));
    y.group("coil", g -> coil(g, spec.coil()));
    y.group("rim", g -> mm(g, "track", spec.rim().trackMm()));
    y.group("via", g -> via(g, spec.via()));
    y.group("board", g -> board(g, spec.board()));
    y.text("fab", spec.fab());
    spec.duty().ifPresent(d -> y.group("duty", g -> duty(g, d)));
    return y.toString();
  }

  private static void rotor(YamlText y, Rotor r) {
    y.value("poles", Integer.toString(r.poles()));
    y.value("sides", Words.wordFor(RotorDraft.SIDES, r.twoSided()));
    optional(y, "air-gap", r.airGapMm(), Dimension.LENGTH, "mm");
    r.magnet().ifPresent(m -> y.group("magnet", g -> magnet(g, m)));
    optional(y, "outer-diameter", r.outerDiameterMm(), Dimension.LENGTH, "mm");
    y.value("iron", Words.wordFor(RotorDraft.IRON, r.ironBehindMagnets()));
    r.counterPlateGapMm().ifPresent(gap -> y.group("counter-plate", g -> mm(g, "gap", gap)));
  }

  private static void magnet(YamlText y, Magnet m) {
    y.value("outline", Words.wordFor(MagnetDraft.OUTLINES, m.outline()));
    switch (m.outline()) {
      case DISC -> mm(y, "diameter", m.diameterMm());
      case SECTOR -> {
        mm(y, "inner-radius", m.innerRadiusMm());
        mm(y, "outer-radius", m.outerRadiusMm());
        quantity(y, "span", m.spanRad(), ANGLE, "deg");
      }
      case BLOCK -> {
        mm(y, "length", m.lengthMm());
        mm(y, "width", m.widthMm());
      }
    }
    if (MagnetDraft.keysOf(m.outline()).contains("pitch-radius")) {
      mm(y, "pitch-radius", m.pitchRadiusMm());
    }
    mm(y, "thickness", m.thicknessMm());
    quantity(y, "remanence", m.remanenceTesla(), FLUX_DENSITY, "T");
    quantity(y, "remanence-drift", m.remanenceDriftPerKelvin(), RATIO, "%");
    quantity(y, "temperature", m.temperatureC(), TEMPERATURE, "C");
    y.value("density", QuantityText.bare(m.density()));
    quantity(y, "limit", m.limitC(), TEMPERATURE, "C");
  }

  private static void winding(YamlText y, Winding w) {
    y.value("phases", Integer.toString(w.phases()));
    y.value("coils", Integer.toString(w.coils()));
    y.value("connection", WindingDraft.word(w.connection()));
    y.value("parallel-paths", Integer.toString(w.parallelPaths()));
  }

  private static void coil(YamlText y, Coil c) {
    y.value("outline", Words.wordFor(CoilDraft.OUTLINES, c.outline()));
    mm(y, "inner-radius", c.innerRadiusMm());
    mm(y, "outer-radius", c.outerRadiusMm());
    optional(y, "width", c.widthMm(), Dimension.LENGTH, "mm");
    y.value("turns", c.turns().isPresent() ? Integer.toString(c.turns().getAsInt()) : "fill");
    mm(y, "track", c.trackMm());
    mm(y, "space", c.spaceMm());
    optional(y, "corner", c.cornerMm(), Dimension.LENGTH, "mm");
    y.value("layers", Words.wordFor(CoilDraft.LAYERS, c.parallelLayers()));
    if (c.taper()) {
      y.value("taper", Words.wordFor(CoilDraft.TAPER, true));
    }
  }

  private static void via(YamlText y, Via v) {
    mm(y, "hole", v.holeMm());
    mm(y, "pad", v.padMm());
    y.value("count", Integer.toString(v.count()));
  }

  private static void board(YamlText y, Board b) {
    y.value("layers", Integer.toString(b.layers()));
    mm(y, "thickness", b.thicknessMm());
    y.group(
        "copper",
        g -> g.value("outer", copper(b.outerCopper())).value("inner", copper(b.innerCopper())));
    if (!b.stackupMm().isEmpty()) {
      y.list("stackup", lengths(b.stackupMm().stream()));
    }
    mm(y, "diameter", b.diameterMm());
    mm(y, "bore", b.boreMm());
    b.holes().ifPresent(h -> y.group("holes", g -> holes(g, h)));
    y.group("terminals", g -> terminals(g, b.terminals()));
    b.tab().ifPresent(t -> y.group("tab", g -> tab(g, t)));
    y.value("star-point", Words.wordFor(BoardDraft.STAR_POINT, b.starPointOut()));
    y.text("finish", b.finish()).text("mask", b.mask());
    y.group("laminate", g -> quantity(g, "tg", b.laminateTgC(), TEMPERATURE, "C"));
  }

  private static String copper(Copper c) {
    return c.ounces().isPresent()
        ? QuantityText.of(c.ounces().getAsDouble(), COPPER, "oz")
        : QuantityText.of(c.thicknessMm().orElseThrow(), COPPER, "um");
  }

  private static void holes(YamlText y, Holes h) {
    y.value("count", Integer.toString(h.count()));
    mm(y, "diameter", h.diameterMm());
    mm(y, "circle", h.circleMm());
    quantity(y, "start", h.startRad(), ANGLE, "deg");
    mm(y, "keep-out", h.keepOutMm());
  }

  private static void terminals(YamlText y, Terminals t) {
    y.value("kind", Words.wordFor(TerminalsDraft.KINDS, t.kind()));
    quantity(y, "start", t.startRad(), ANGLE, "deg");
    mm(y, "pitch", t.pitchMm());
    mm(y, "hole", t.holeMm());
    mm(y, "pad", t.padMm());
  }

  private static void tab(YamlText y, Tab t) {
    quantity(y, "angle", t.angleRad(), ANGLE, "deg");
    mm(y, "width", t.widthMm());
    mm(y, "length", t.lengthMm());
  }

  private static void duty(YamlText y, Duty d) {
    y.value("use", Words.wordFor(DutyDraft.USES, d.generator()));
    optional(y, "torque", d.torqueNm(), TORQUE, "mN m");
    optional(y, "load", d.loadOhm(), RESISTANCE, "ohm");
    optional(y, "bus", d.busVolt(), VOLTAGE, "V");
    optional(y, "speed", d.speedRadPerSecond(), SPEED, "rpm");
    optional(y, "current", d.currentAmpereRms(), CURRENT, "A");
    optional(y, "switching", d.switchingHertz(), FREQUENCY, "kHz");
    optional(y, "bandwidth", d.bandwidthHertz(), FREQUENCY, "kHz");
    quantity(y, "ambient", d.ambientC(), TEMPERATURE, "C");
    quantity(y, "copper-limit", d.copperLimitC(), TEMPERATURE, "C");
    quantity(y, "cooling", d.coolingWattPerSquareMetreKelvin(), HEAT_TRANSFER, "W/m2K");
  }

  static List<String> lengths(Stream<Double> mm) {
    return mm.map(v -> QuantityText.of(v, Dimension.LENGTH, "mm")).toList();
  }

  static void mm(YamlText y, String key, double value) {
    quantity(y, key, value, Dimension.LENGTH, "mm");
  }

  static void quantity(YamlText y, String key, double value, Dimension dimension, String unit) {
    y.value(key, QuantityText.of(value, dimension, unit));
  }

  private static void optional(
      YamlText y, String key, OptionalDouble value, Dimension dimension, String unit) {
    value.ifPresent(v -> quantity(y, key, v, dimension, unit));
  }
}
