package etchloom.electric.machine.heat;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.electric.machine.emf.Coupling;
import etchloom.electric.machine.emf.FluxSeries;
import etchloom.electric.resistance.Chains;
import etchloom.electric.resistance.Copper;
import etchloom.electric.resistance.Currents;
import etchloom.electric.resistance.Tracks;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * Layers side by side in one coil: how the coil's current splits among them, and the current that
 * their unequal voltages drive through each other.
 *
 * <p>The split is that of the resistances, vias included. For the rest, layers of one group lie
 * between the same two nodes: with the voltage E and the resistance R of each, the nodes stand at
 * {@code ΣE/R / Σ1/R}, and what is left over R flows (Millman's theorem, textbook). Leakage between
 * the layers is left out: at their few millimetres it is a hundredth of the resistance up to some
 * kilohertz, and it could only lower the current. All coils of a board are alike in this.
 */
public final class LayerSharing {
  /**
   * @param layer from 1
   * @param share of the coil's current
   * @param evenShare what it would be if all layers of its group were alike
   * @param ohm of its spiral at 20 °C
   */
  public record Layer(int layer, int conductor, double share, double evenShare, double ohm) {}

  private final Artwork artwork;
  private final List<List<Layer>> groups;

  private LayerSharing(Artwork artwork, List<List<Layer>> groups) {
    this.artwork = artwork;
    this.groups = groups;
  }

  /** Empty where every layer of a coil carries all its current. */
  public static Optional<LayerSharing> of(Artwork artwork) {
    if (artwork.coils().isEmpty()) {
      return Optional.empty();
    }
    Coil coil = artwork.coils().get(0);
    Map<List<Integer>, List<Conductor>> between = new TreeMap<>(LayerSharing::compare);
    for (int id : coil.conductors()) {
      Conductor c = artwork.conductors().get(id);
      between.computeIfAbsent(List.of(c.fromJoint(), c.toJoint()), k -> new ArrayList<>()).add(c);
    }
    if (between.values().stream().allMatch(g -> g.size() == 1)) {
      return Optional.empty();
    }
    Currents currents = Chains.coil(artwork, coil, Copper.REFERENCE_C);
    List<List<Layer>> groups = new ArrayList<>();
    for (List<Conductor> some : between.values()) {
      List<Layer> group = new ArrayList<>();
      for (Conductor c : some) {
        double ohm =
            Tracks.ohm(c, artwork.stackup().copper().get(c.layer() - 1), Copper.REFERENCE_C);
        double share = Math.abs(currents.ofConductor(c.id()));
        group.add(new Layer(c.layer(), c.id(), share, 1.0 / some.size(), ohm));
      }
      groups.add(group);
    }
    return Optional.of(new LayerSharing(artwork, groups));
  }

  private static int compare(List<Integer> a, List<Integer> b) {
    int from = Integer.compare(a.get(0), b.get(0));
    return from != 0 ? from : Integer.compare(a.get(1), b.get(1));
  }

  /** The layers of each group, the inward ones first. */
  public List<List<Layer>> groups() {
    return groups.stream().map(List::copyOf).toList();
  }

  /** How much the most loaded layer carries over its even share, as a ratio. */
  public double worstOverload() {
    return groups.stream()
        .flatMap(List::stream)
        .mapToDouble(l -> l.share() / l.evenShare() - 1)
        .max()
        .orElse(0);
  }

  /** A layer's flux linkage over the mean of its group, fundamental. */
  public double linkageRatio(Coupling coupling, Layer layer) {
    List<Layer> group = groups.stream().filter(g -> g.contains(layer)).findFirst().orElseThrow();
    double sum = 0;
    for (Layer l : group) {
      sum += coupling.track(l.conductor()).amplitude(0);
    }
    double own = coupling.track(layer.conductor()).amplitude(0);
    return sum > 0 ? own / (sum / group.size()) : 1;
  }

  /** A rms through a layer that does no work: no current outside is needed for it. */
  public double ampereRms(Coupling coupling, Layer layer, double radPerSecond, double tempC) {
    List<Layer> group = groups.stream().filter(g -> g.contains(layer)).findFirst().orElseThrow();
    double square = 0;
    for (int i = 0; i < coupling.orders(); i++) {
      double re = 0;
      double im = 0;
      double siemens = 0;
      for (Layer l : group) {
        FluxSeries f = coupling.track(l.conductor());
        re += f.re(i) / l.ohm();
        im += f.im(i) / l.ohm();
        siemens += 1 / l.ohm();
      }
      FluxSeries own = coupling.track(layer.conductor());
      double volt = Math.hypot(re / siemens - own.re(i), im / siemens - own.im(i)) * radPerSecond;
      double ampere = volt / (layer.ohm() * Copper.factor(tempC));
      square += ampere * ampere / 2;
    }
    return Math.sqrt(square);
  }

  /** The greatest such current in any layer, A rms. */
  public double mostAmpereRms(Coupling coupling, double radPerSecond, double tempC) {
    return groups.stream()
        .flatMap(List::stream)
        .mapToDouble(l -> ampereRms(coupling, l, radPerSecond, tempC))
        .max()
        .orElse(0);
  }

  /** W in all coils from it. */
  public double watt(Coupling coupling, double radPerSecond, double tempC) {
    double sum = 0;
    for (List<Layer> group : groups) {
      for (Layer l : group) {
        double a = ampereRms(coupling, l, radPerSecond, tempC);
        sum += a * a * l.ohm() * Copper.factor(tempC);
      }
    }
    return sum * artwork.coils().size();
  }
}
