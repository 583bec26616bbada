package etchloom.electric.machine.emf;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Phase;
import etchloom.artwork.Stackup;
import etchloom.electric.field.AxialField;
import etchloom.electric.field.RadialField;
import etchloom.electric.resistance.Currents;
import etchloom.electric.resistance.Edge;
import etchloom.electric.resistance.Section;
import etchloom.geometry.Path;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;

/**
 * The rotor's field along all copper of a board. Coils that repeat the first one, turned about the
 * shaft, are not integrated again but turned too.
 */
public final class Coupling {
  /** Two paths are the same one turned where no end is farther off than this, mm. */
  private static final double SAME_MM = 2e-6;

  private final Artwork artwork;
  private final AxialField field;
  private final TrackIntegral[] tracks;
  private final List<FluxSeries> phases = new ArrayList<>();

  private Coupling(Artwork artwork, AxialField field, double panel) {
    this.artwork = artwork;
    this.field = field;
    tracks = new TrackIntegral[artwork.conductors().size()];
    PathIntegrator integrator = new PathIntegrator(field, panel);
    coils(integrator);
    for (Conductor c : artwork.conductors()) {
      if (tracks[c.id()] == null) {
        tracks[c.id()] = along(integrator, c);
      }
    }
  }

  /** All conductors and phases in one rotor's field. */
  public static <F extends AxialField & RadialField> Coupling of(Artwork artwork, F field) {
    return of(artwork, field, PathIntegrator.PANEL);
  }

  static <F extends AxialField & RadialField> Coupling of(Artwork artwork, F field, double panel) {
    Coupling c = new Coupling(artwork, field, panel);
    c.join(field);
    return c;
  }

  private void coils(PathIntegrator integrator) {
    for (Coil coil : artwork.coils()) {
      Coil first = artwork.coils().get(0);
      double turn = coil.axisRad() - first.axisRad();
      for (int i = 0; i < coil.conductors().size(); i++) {
        Conductor c = artwork.conductors().get(coil.conductors().get(i));
        Conductor model = artwork.conductors().get(first.conductors().get(i));
        boolean again = c.id() != model.id() && repeats(model, c, turn);
        tracks[c.id()] =
            again ? tracks[model.id()].rotated(field.polePairs(), turn) : along(integrator, c);
      }
    }
  }

  private TrackIntegral along(PathIntegrator integrator, Conductor c) {
    if (!c.tapered()) {
      return integrator.along(c.layer(), c.path());
    }
    Stackup.Copper copper = artwork.stackup().copper().get(c.layer() - 1);
    double least = Section.meanWidthMm(c.widthMm(), copper);
    return integrator.along(
        c.layer(), c.path(), k -> Math.pow(Section.meanWidthMm(c.widthMm(k), copper) / least, 3));
  }

  private static boolean repeats(Conductor model, Conductor c, double turnRad) {
    Path a = model.path();
    Path b = c.path();
    if (model.layer() != c.layer()
        || !model.widthsMm().equals(c.widthsMm())
        || a.segments().size() != b.segments().size()) {
      return false;
    }
    for (int i = 0; i < a.segments().size(); i++) {
      Segment s = a.segments().get(i);
      Segment t = b.segments().get(i);
      if (s.at(0.5).rotated(turnRad).distanceTo(t.at(0.5)) > SAME_MM
          || s.end().rotated(turnRad).distanceTo(t.end()) > SAME_MM) {
        return false;
      }
    }
    return a.start().rotated(turnRad).distanceTo(b.start()) <= SAME_MM;
  }

  private void join(RadialField radial) {
    BarrelIntegrals barrels = new BarrelIntegrals(radial, field.orders());
    PhaseCopper copper = new PhaseCopper(artwork);
    for (Phase p : artwork.phases()) {
      phases.add(series(copper.shares(p), barrels));
    }
  }

  private FluxSeries series(Currents shares, BarrelIntegrals barrels) {
    double[] re = new double[field.orders()];
    double[] im = new double[field.orders()];
    for (int e = 0; e < shares.edges().size(); e++) {
      double share = shares.ofEdge(e);
      Edge edge = shares.edges().get(e);
      if (share == 0) {
        continue;
      }
      TrackIntegral t = edge.barrel() ? barrel(edge, barrels) : tracks[edge.conductor().getAsInt()];
      for (int i = 0; i < re.length; i++) {
        re[i] += share * t.re(i);
        im[i] += share * t.im(i);
      }
    }
    return new FluxSeries(field.polePairs(), re, im);
  }

  private TrackIntegral barrel(Edge edge, BarrelIntegrals barrels) {
    Joint joint = artwork.joints().get(edge.from().joint());
    int upper = edge.from().layer();
    int lower = edge.to().layer();
    double[] down =
        barrels.down(
            joint.at().norm(),
            upper,
            artwork.stackup().heightMm(upper),
            lower,
            artwork.stackup().heightMm(lower));
    return new TrackIntegral(down, new double[down.length], new double[0])
        .rotated(field.polePairs(), joint.at().angleRad());
  }

  public int polePairs() {
    return field.polePairs();
  }

  public int orders() {
    return field.orders();
  }

  /** Each phase's series, in the order of the artwork's phases. */
  public List<FluxSeries> phases() {
    return List.copyOf(phases);
  }

  /** One conductor's own part of dλ/dθ for a current along its path. */
  public FluxSeries track(int conductor) {
    return tracks[conductor].series(field.polePairs());
  }

  /**
   * {@code ∫ b² (w/w₀)³ dl} along a conductor for the order 2i + 1, T²·m: w its mean width, w₀ the
   * least of it.
   */
  public double squareTeslaMetre(int conductor, int i) {
    return tracks[conductor].square(i) * 1e-3;
  }

  /** Amplitudes at a place, as {@link AxialField#amplitudes}. */
  public void amplitudes(int layer, double radiusMm, double[] out) {
    field.amplitudes(layer, radiusMm, out);
  }
}
