package etchloom.board;

import etchloom.artwork.Artwork;
import etchloom.artwork.CopperBuilder;
import etchloom.artwork.MountingHole;
import etchloom.artwork.Opening;
import etchloom.artwork.Stackup;
import etchloom.artwork.Stroke;
import etchloom.coil.CoilPlan;
import etchloom.coil.CoilSize;
import etchloom.coil.Coils;
import etchloom.diagnostic.Staged;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.rim.Rim;
import etchloom.rim.RimBuilder;
import etchloom.rim.RimSize;
import etchloom.spec.FabRules;
import etchloom.spec.Positions;
import etchloom.spec.Spec;
import etchloom.winding.ParallelPaths;
import etchloom.winding.StarOfSlots;
import etchloom.winding.Winding;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/** The one way from a spec to the artwork: winding, coils, rim, board. */
public final class Assembler {
  private final Spec spec;
  private final FabRules fab;
  private final boolean draft;
  private final Problems problems;

  private Assembler(Spec spec, FabRules fab, Positions positions, boolean draft) {
    this.spec = spec;
    this.fab = fab;
    this.draft = draft;
    problems = new Problems(positions);
  }

  /** Draws the board, or says which keys keep it from being drawn. */
  public static Staged<Assembly> assemble(Spec spec, FabRules fab, Positions positions) {
    return assemble(spec, fab, positions, false);
  }

  /**
   * Draws the board, or says which keys keep it from being drawn.
   *
   * @param draft whether the board breaks rules and is to say so in its legend
   */
  public static Staged<Assembly> assemble(
      Spec spec, FabRules fab, Positions positions, boolean draft) {
    Assembler a = new Assembler(spec, fab, positions, draft);
    Optional<Assembly> out = a.assemble();
    return a.problems.any()
        ? Staged.failed(a.problems.list())
        : Staged.of(out.orElseThrow(), a.problems.list());
  }

  /** The widest even track in which the coils still have room for so many turns, if any wider. */
  public static OptionalDouble widestTrackMm(Spec spec, FabRules fab, int turns) {
    CoilSize size = new Assembler(spec, fab, Positions.unknown(""), false).coilSize();
    return Coils.widestTrackMm(size, turns);
  }

  private Optional<Assembly> assemble() {
    Stackup stackup = StackupBuilder.build(spec, fab, problems);
    Optional<Winding> winding = winding();
    Optional<CoilPlan> coil = coil();
    if (winding.isEmpty() || coil.isEmpty() || problems.any()) {
      return Optional.empty();
    }
    RimBuilder.Result rim =
        RimBuilder.plan(winding.get(), spec.winding(), spec.board().starPointOut(), rimSize());
    rim.refusal().ifPresent(r -> problems.add("rim", r.key(), r.message()));
    if (rim.planned().isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(draw(stackup, winding.get(), coil.get(), rim.planned().get()));
  }

  private Optional<Winding> winding() {
    int phases = spec.winding().phases();
    int coils = spec.winding().coils();
    int poles = spec.rotor().poles();
    Optional<Winding> w = StarOfSlots.wind(phases, coils, poles);
    if (w.isEmpty()) {
      String near =
          StarOfSlots.nearestCoils(phases, coils, poles).map(n -> n + " coils").orElse("no count")
              + " with "
              + poles
              + " poles, or "
              + StarOfSlots.nearestPoles(phases, coils, poles)
                  .map(n -> n + " poles")
                  .orElse("no count")
              + " with "
              + coils
              + " coils";
      problems.add(
          "winding",
          "winding.coils",
          coils
              + " coils and "
              + poles
              + " poles give no balanced "
              + phases
              + "-phase winding; nearest: "
              + near);
    }
    w.ifPresent(this::paths);
    return w;
  }

  private void paths(Winding w) {
    int paths = spec.winding().parallelPaths();
    if (!ParallelPaths.equal(w, paths)) {
      List<Integer> possible = ParallelPaths.possible(w);
      problems.add(
          "paths",
          "winding.parallel-paths",
          paths
              + " paths would not carry the same EMF and drive currents through each other; with "
              + w.coils()
              + " coils and "
              + w.poles()
              + " poles equal paths are: "
              + String.join(", ", possible.stream().map(String::valueOf).toList()),
          "`parallel-paths: " + possible.get(possible.size() - 1) + "`");
    }
  }

  private CoilSize coilSize() {
    Spec.Coil c = spec.coil();
    return new CoilSize(
        c.outline(),
        spec.winding().coils(),
        spec.board().layers(),
        c.parallelLayers(),
        c.innerRadiusMm(),
        c.outerRadiusMm(),
        c.widthMm(),
        c.trackMm(),
        c.spaceMm(),
        c.taper(),
        c.cornerMm(),
        spec.via().padMm(),
        spec.via().holeMm(),
        spec.via().count(),
        fab.hole().gapMm(),
        spec.rim().trackMm());
  }

  private Optional<CoilPlan> coil() {
    CoilSize size = coilSize();
    if (size.cornerMm().orElse(size.leastCornerMm()) < size.leastCornerMm() - 1e-9) {
      problems.add(
          "corner",
          "coil.corner",
          String.format(
              Locale.ROOT,
              "a corner of %.3f mm closes the gap at the coil's inner end; at least half of track"
                  + " and space: %.3f mm",
              size.cornerMm().orElseThrow(),
              size.leastCornerMm()),
          String.format(Locale.ROOT, "`corner: %.3f mm`", size.leastCornerMm()));
      return Optional.empty();
    }
    double over = Coils.overhangMm(size);
    if (over > 1e-9) {
      problems.add(
          "sector",
          size.widthMm().isPresent() ? "coil.width" : "coil.outer-radius",
          String.format(
              Locale.ROOT,
              "the coil with its space is %.3f mm wider than its sector, where neighbours touch; %s"
                  + " or fewer winding.coils would do",
              over,
              size.widthMm().isPresent()
                  ? "a smaller coil.width, a larger coil.inner-radius"
                  : "a smaller coil.outer-radius, a larger coil.inner-radius"));
      return Optional.empty();
    }
    int most = Coils.mostTurns(size);
    int turns = spec.coil().turns().orElse(most);
    if (most == 0) {
      problems.add(
          "turns",
          "coil.outer-radius",
          "the coil has no room for a single turn around its "
              + coilVias(size)
              + "; a larger coil.outer-radius, a "
              + (size.trackMm() > size.padMm() ? "narrower coil.track, " : "smaller via.pad, ")
              + (size.viaCount() > 1 ? "a smaller via.count, " : "")
              + "fewer board.layers or fewer winding.coils would do");
      return Optional.empty();
    }
    if (turns > most) {
      problems.add(
          "turns",
          "coil.turns",
          turns + " turns do not fit; the rules leave room for " + most,
          "`turns: " + most + "` or `turns: fill`");
      return Optional.empty();
    }
    return Coils.draw(size, turns);
  }

  private static String coilVias(CoilSize size) {
    int vias = (size.nodes() - 1) * size.viaCount();
    return vias == 1 ? "eye via" : vias + " eye vias";
  }

  private RimSize rimSize() {
    CoilSize coil = coilSize();
    return new RimSize(
        coil.coils(),
        coil.nodes(),
        coil.layers(),
        coil.nodeRadiusMm(),
        coil.jointMm(),
        coil.nodeAngleRad(0),
        spec.rim().trackMm(),
        spec.coil().spaceMm(),
        spec.via().padMm(),
        spec.via().holeMm(),
        spec.via().count(),
        coil.viaPitchMm(),
        spec.board().diameterMm() / 2,
        fab.edge().copperMm(),
        fab.edge().holeMm(),
        spec.board().terminals(),
        spec.board().tab());
  }

  private Assembly draw(
      Stackup stackup, Winding winding, CoilPlan coil, RimBuilder.Planned planned) {
    NetNames nets = new NetNames(winding, spec.winding().connection());
    CopperBuilder copper = new CopperBuilder();
    CoilPlacer placer = new CoilPlacer(spec, coil, winding, copper, nets);
    placer.place();
    Rim rim = planned.draw(copper, placer::joint, nets::of);
    List<MountingHole> holes = mountingHoles();
    List<Path> profile = BoardEdge.of(spec.board());
    new TerminalPlaces(spec, fab, problems).check(copper.joints(), holes);
    Mask mask = Mask.over(copper.joints(), holes, fab.mask().expansionMm());
    PlacedLegend legend =
        new LegendBuilder(spec, fab, copper.joints(), holes, mask.top()).build(draft);
    if (!legend.leftOut().isEmpty()) {
      problems.warn(
          "legend",
          "board.diameter",
          "the legend has no room for " + String.join(", ", legend.leftOut()));
    }
    Artwork art =
        new Artwork(
            spec.title(),
            spec.slug(),
            spec.revision(),
            draft,
            stackup,
            profile,
            copper.joints(),
            copper.conductors(),
            holes,
            mask.top(),
            mask.bottom(),
            legend.strokes(),
            placer.coils(),
            PhaseTracer.trace(copper, placer.coils(), rim),
            coil.turns(),
            circuits(copper));
    return new Assembly(art, winding, rim);
  }

  /**
   * A delta closes one circuit; each path beside the first closes one more in its phase; rows of
   * vias and layers side by side close theirs.
   */
  private int circuits(CopperBuilder copper) {
    Spec.Winding w = spec.winding();
    int delta = w.connection() == Spec.Connection.DELTA ? 1 : 0;
    return copper.circuits() + delta + w.phases() * (w.parallelPaths() - 1);
  }

  private List<MountingHole> mountingHoles() {
    List<MountingHole> out = new ArrayList<>();
    spec.board()
        .holes()
        .ifPresent(
            h -> {
              for (int i = 0; i < h.count(); i++) {
                double a = h.startRad() + 2 * Math.PI * i / h.count();
                Point at = Point.polar(h.circleMm() / 2, a);
                out.add(new MountingHole(at, h.diameterMm(), h.keepOutMm()));
              }
            });
    return out;
  }

  /** Mask openings: terminals and mounting holes; vias stay tented. */
  private record Mask(List<Opening> top, List<Opening> bottom) {
    static Mask over(
        List<etchloom.artwork.Joint> joints, List<MountingHole> holes, double expansionMm) {
      List<Opening> top = new ArrayList<>();
      List<Opening> bottom = new ArrayList<>();
      for (etchloom.artwork.Joint j : joints) {
        if (j.terminal()) {
          Opening o = new Opening(j.at(), j.padMm() + 2 * expansionMm, j.what());
          top.add(o);
          if (j.hole().isPresent()) {
            bottom.add(o);
          }
        }
      }
      for (int i = 0; i < holes.size(); i++) {
        MountingHole h = holes.get(i);
        Opening o =
            new Opening(h.at(), h.diameterMm() + 2 * expansionMm, "mounting hole " + (i + 1));
        top.add(o);
        bottom.add(o);
      }
      return new Mask(top, bottom);
    }
  }

  /** The legend's strokes, and what of it found no place. */
  record PlacedLegend(List<Stroke> strokes, List<String> leftOut) {}
}
