package etchloom.report;

import etchloom.artwork.Artwork;
import etchloom.board.Assembler;
import etchloom.board.Assembly;
import etchloom.electric.field.IronPlanes;
import etchloom.electric.field.MagnetArray;
import etchloom.electric.inductance.Inductance;
import etchloom.electric.inductance.InductanceFigures;
import etchloom.electric.machine.InductanceValues;
import etchloom.electric.machine.Machine;
import etchloom.electric.machine.MachineFigures;
import etchloom.electric.resistance.Resistance;
import etchloom.geometry.Point;
import etchloom.proof.ProofReport;
import etchloom.rules.Finding;
import etchloom.rules.RuleCheck;
import etchloom.rules.RuleContext;
import etchloom.rules.RuleReport;
import etchloom.spec.Positions;
import etchloom.spec.Spec;
import etchloom.spec.SpecFile;
import etchloom.spec.SpecReader;
import etchloom.spec.Templates;
import etchloom.testing.Specs;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.TreeMap;

/** Results of whole boards, drawn and checked. */
final class Samples {
  static final String VERSION = "9.8.7";

  /** Six coils of two layers, the smallest of the templates. */
  static final String SMALL = "dosing-pump";

  private Samples() {}

  static Results template(String name) {
    SpecFile file = SpecReader.read(name, Templates.bytes(name)).value().orElseThrow();
    return of(file.spec(), etchloom.spec.FabReader.builtIn(file.spec().fab()));
  }

  /** A board whose spec has neither magnet nor duty. */
  static Results bare(Specs.Shape shape) {
    return bare(Specs.spec(shape));
  }

  /** The same of a whole spec. */
  static Results bare(Spec spec) {
    return of(spec, Specs.fab());
  }

  private static Results of(Spec spec, etchloom.spec.FabRules fab) {
    Assembly a = Assembler.assemble(spec, fab, new Positions("", Map.of())).value().orElseThrow();
    return Results.of(
        VERSION,
        spec,
        fab,
        a.artwork(),
        a.winding(),
        RuleCheck.check(a.artwork(), spec, fab, RuleContext.NONE),
        Resistance.of(a.artwork(), fab.tolerance()));
  }

  static Results with(Results r, RuleReport rules) {
    return Results.of(
        r.toolVersion(), r.spec(), r.fab(), r.artwork(), r.winding(), rules, r.resistance());
  }

  static Results titled(Results r, String title) {
    Artwork a = r.artwork();
    Artwork named =
        new Artwork(
            title,
            a.slug(),
            a.revision(),
            a.draft(),
            a.stackup(),
            a.profile(),
            a.joints(),
            a.conductors(),
            a.mountingHoles(),
            a.maskTop(),
            a.maskBottom(),
            a.legend(),
            a.coils(),
            a.phases(),
            a.turnsPerLayer(),
            a.expectedCircuits());
    return Results.of(
        r.toolVersion(), r.spec(), r.fab(), named, r.winding(), r.rules(), r.resistance());
  }

  static Finding close() {
    return new Finding(
        "space",
        "L1",
        Point.polar(18.5, Math.toRadians(10.3)),
        0.112,
        0.127,
        "mm",
        "phase U, coil 4, turn 7 and phase U, coil 4, turn 8");
  }

  static Finding deep() {
    return new Finding("aspect", "", new Point(-3, 0), 10, 8, "1", "coil 1, eye via 1");
  }

  static RuleReport broken() {
    return new RuleReport(
        List.of(close(), deep()), List.of(close(), deep()), List.of("space: 51 places"));
  }

  static ProofReport proof() {
    return new ProofReport(
        new TreeMap<>(Map.of(1, 7, 2, 6)),
        new TreeMap<>(Map.of(1, 0, 2, 1)),
        0,
        OptionalInt.of(0),
        1,
        0,
        0,
        OptionalDouble.of(2.5e-7),
        List.of(),
        List.of());
  }

  /** The same with inductances and machine worked out; a second or so. */
  static Results electric(Results r) {
    Spec spec = r.spec();
    boolean field = spec.rotor().magnet().isPresent() && spec.rotor().airGapMm().isPresent();
    IronPlanes iron =
        field
            ? MagnetArray.of(spec.rotor(), r.artwork().stackup().thicknessMm()).iron()
            : IronPlanes.NONE;
    InductanceFigures l = Inductance.of(r.artwork(), spec.winding().connection(), iron);
    InductanceValues values =
        new InductanceValues(
            l.phaseSelfHenry(),
            l.phaseMutualHenry().orElse(0),
            l.synchronousHenry(),
            l.terminalHenry());
    MachineFigures m = Machine.of(r.artwork(), spec, r.fab(), r.winding(), r.resistance(), values);
    return r.withElectrics(l, m);
  }

  /** The smallest template, another connection, as generator or motor. */
  static Results small(Spec.Connection connection, boolean generator) {
    SpecFile file = SpecReader.read(SMALL, Templates.bytes(SMALL)).value().orElseThrow();
    Spec s = file.spec();
    Spec.Winding w = s.winding();
    Spec.Duty d = s.duty().orElseThrow();
    Spec changed =
        new Spec(
            s.title(),
            s.slug(),
            s.revision(),
            s.rotor(),
            new Spec.Winding(w.phases(), w.coils(), connection, w.parallelPaths()),
            s.coil(),
            s.rim(),
            s.via(),
            s.board(),
            s.fab(),
            Optional.of(
                new Spec.Duty(
                    generator,
                    generator ? OptionalDouble.empty() : d.torqueNm(),
                    generator ? OptionalDouble.of(22) : OptionalDouble.empty(),
                    d.busVolt(),
                    d.speedRadPerSecond(),
                    d.currentAmpereRms(),
                    d.switchingHertz(),
                    d.bandwidthHertz(),
                    d.ambientC(),
                    d.copperLimitC(),
                    d.coolingWattPerSquareMetreKelvin())));
    return of(changed, etchloom.spec.FabReader.builtIn(s.fab()));
  }

  /** Computed once for all tests. */
  static final class Electric {
    static final Results STAR = electric(template(SMALL));
    static final Results BARE = electric(bare(etchloom.testing.Specs.wheel(2)));

    private Electric() {}
  }
}
