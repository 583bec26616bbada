package etchloom.electric.machine;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.electric.machine.emf.Coupling;
import etchloom.electric.machine.emf.FluxSeries;
import etchloom.electric.machine.heat.CirculatingCurrent;
import etchloom.electric.machine.heat.EddyLoss;
import etchloom.electric.machine.heat.LayerSharing;
import etchloom.electric.resistance.Copper;
import etchloom.spec.Spec;
import etchloom.winding.StarOfSlots;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The winding in the rotor's field.
 *
 * @param fluxWeber peak of one winding's fundamental linkage: of the part of the phases that turns
 *     with the rotor in the order of the marks
 * @param sharing among layers side by side
 * @param counterClockwise whether that part, and not its mirror, is the larger one
 */
record Linked(
    Coupling coupling,
    double fluxWeber,
    boolean counterClockwise,
    EddyLoss eddy,
    Optional<CirculatingCurrent> circulating,
    Optional<LayerSharing> sharing) {
  private static final int SAMPLES = 120;
  private static final int LEAST_HARMONICS = 7;
  private static final double FAINT = 1e-5;

  static Linked of(Setting s, Coupling coupling) {
    List<FluxSeries> phases = coupling.phases();
    double forward = sequence(phases, 1);
    double backward = sequence(phases, -1);
    boolean delta = s.circuit().connection() == Spec.Connection.DELTA;
    return new Linked(
        coupling,
        Math.max(forward, backward) / coupling.polePairs(),
        forward >= backward,
        EddyLoss.of(s.artwork(), coupling),
        delta ? Optional.of(new CirculatingCurrent(s.circuit(), phases)) : Optional.empty(),
        LayerSharing.of(s.artwork()));
  }

  /** W at 20 °C for each (rad/s)² that currents among layers side by side lose. */
  OptionalDouble layersWatt() {
    return sharing.isPresent()
        ? OptionalDouble.of(sharing.get().watt(coupling, 1, Copper.REFERENCE_C))
        : OptionalDouble.empty();
  }

  /** Peak of the symmetrical component of the fundamental, V·s/rad (textbook, Fortescue). */
  private static double sequence(List<FluxSeries> phases, int way) {
    double re = 0;
    double im = 0;
    for (int k = 0; k < phases.size(); k++) {
      double a = -way * StarOfSlots.phaseAngle(phases.size(), k);
      FluxSeries p = phases.get(k);
      re += p.re(0) * Math.cos(a) - p.im(0) * Math.sin(a);
      im += p.re(0) * Math.sin(a) + p.im(0) * Math.cos(a);
    }
    return Math.hypot(re, im) / phases.size();
  }

  EmfFigures emf(Setting s, OptionalDouble circulatingAmpere) {
    double phase = coupling.polePairs() * fluxWeber;
    double terminal = s.circuit().terminalShare() * phase;
    List<EmfFigures.PhaseEmf> phases = new ArrayList<>();
    double turn = 2 * Math.PI / coupling.polePairs();
    for (int k = 0; k < coupling.phases().size(); k++) {
      FluxSeries p = coupling.phases().get(k);
      double rest = (p.axisRad() + turn / 2) % turn;
      phases.add(
          new EmfFigures.PhaseEmf(
              s.artwork().phases().get(k).mark(), p.amplitude(0), p.axisRad(), rest));
    }
    return new EmfFigures(
        fluxWeber,
        phase,
        terminal,
        30 / Math.PI / terminal,
        harmonics(),
        waveform(),
        circulatingAmpere,
        phases,
        counterClockwise);
  }

  TorqueFigures torque(Circuit c) {
    double peak = c.torqueNm(fluxWeber, 1);
    double line = peak / c.lineAmpere(1);
    double loss = c.phases() / 2.0 * c.windingOhm20();
    return new TorqueFigures(
        peak, peak * Math.sqrt(2), line, line * Math.sqrt(2), peak / Math.sqrt(loss));
  }

  private List<EmfFigures.Harmonic> harmonics() {
    List<EmfFigures.Harmonic> out = new ArrayList<>();
    int last = 0;
    for (int i = 0; i < coupling.orders(); i++) {
      double sum = 0;
      for (FluxSeries p : coupling.phases()) {
        sum += p.amplitude(i);
      }
      double mean = sum / coupling.phases().size();
      out.add(new EmfFigures.Harmonic(2 * i + 1, mean));
      if (i < LEAST_HARMONICS || mean > FAINT * out.get(0).phasePeakVoltSecondPerRadian()) {
        last = i;
      }
    }
    return out.subList(0, last + 1);
  }

  private List<EmfFigures.Sample> waveform() {
    List<EmfFigures.Sample> out = new ArrayList<>();
    for (int i = 0; i < SAMPLES; i++) {
      double degrees = 360.0 * i / SAMPLES;
      double rotor = Math.toRadians(degrees) / coupling.polePairs();
      out.add(
          new EmfFigures.Sample(
              degrees, coupling.phases().stream().map(p -> p.slope(rotor)).toList()));
    }
    return out;
  }
}
