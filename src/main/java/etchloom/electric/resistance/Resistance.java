package etchloom.electric.resistance;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Stackup;
import etchloom.electric.resistance.ResistanceFigures.CoilLayer;
import etchloom.electric.resistance.ResistanceFigures.CoilOhm;
import etchloom.electric.resistance.ResistanceFigures.CopperLayer;
import etchloom.electric.resistance.ResistanceFigures.Limits;
import etchloom.electric.resistance.ResistanceFigures.PairOhm;
import etchloom.electric.resistance.ResistanceFigures.PhaseOhm;
import etchloom.electric.resistance.ResistanceFigures.TerminalOhm;
import etchloom.spec.FabRules;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Works out all resistances of a board from its conductors. */
public final class Resistance {
  private Resistance() {}

  /**
   * All figures at 20 °C.
   *
   * @param tolerance the fab's, as ratios of track width, copper and plating thickness
   * @throws IllegalArgumentException if a track is narrower than its undercut
   * @throws IllegalStateException if a phase or coil is not one piece, or no two terminals are
   *     joined
   */
  public static ResistanceFigures of(Artwork artwork, FabRules.Tolerance tolerance) {
    double tempC = Copper.REFERENCE_C;
    Coil coil = artwork.coils().get(0);
    List<CoilOhm> coils = artwork.coils().stream().map(c -> coil(artwork, c)).toList();
    List<TerminalOhm> terminals = terminals(artwork, Variation.NONE);
    if (terminals.isEmpty()) {
      throw new IllegalStateException("no two terminals are joined");
    }
    List<PairOhm> pairs = pairs(artwork, tolerance, terminals);
    return new ResistanceFigures(
        coil.conductors().stream().map(id -> coilLayer(artwork, id)).toList(),
        copperLayers(artwork),
        coils,
        coils.get(0).ohm(),
        artwork.phases().stream()
            .map(p -> new PhaseOhm(p.mark(), Chains.phase(artwork, p, tempC).ohm()))
            .toList(),
        terminals,
        imbalancePercent(ResistanceFigures.lineToLine(terminals)),
        pairs,
        worst(pairs),
        rss(artwork, tolerance, terminals));
  }

  private static CoilOhm coil(Artwork artwork, Coil coil) {
    double mm = 0;
    for (int id : coil.copper()) {
      mm += artwork.conductors().get(id).path().lengthMm();
    }
    double ohm = Chains.coil(artwork, coil, Copper.REFERENCE_C).ohm();
    return new CoilOhm(coil.number(), mm, ohm);
  }

  private static CoilLayer coilLayer(Artwork artwork, int id) {
    Conductor c = artwork.conductors().get(id);
    Stackup.Copper copper = artwork.stackup().copper().get(c.layer() - 1);
    double ohm = Tracks.ohm(c, copper, Copper.REFERENCE_C);
    return new CoilLayer(c.layer(), c.path().lengthMm(), ohm);
  }

  private static List<CopperLayer> copperLayers(Artwork artwork) {
    double[] mm = new double[artwork.layers()];
    for (Conductor c : artwork.conductors()) {
      mm[c.layer() - 1] += c.path().lengthMm();
    }
    List<CopperLayer> out = new ArrayList<>();
    for (int i = 0; i < mm.length; i++) {
      out.add(new CopperLayer(i + 1, mm[i]));
    }
    return out;
  }

  /** Every pair of terminals that copper joins, at 20 °C. */
  public static List<TerminalOhm> terminals(Artwork artwork, Variation variation) {
    List<Joint> all = artwork.terminals();
    Network network =
        Network.of(artwork, variation, Copper.REFERENCE_C)
            .onto(all.stream().map(Network::terminalNode).toList());
    List<TerminalOhm> out = new ArrayList<>();
    for (int i = 0; i < all.size(); i++) {
      for (int j = i + 1; j < all.size(); j++) {
        Joint a = all.get(i);
        Joint b = all.get(j);
        network
            .ohm(Network.terminalNode(a), Network.terminalNode(b))
            .ifPresent(ohm -> out.add(new TerminalOhm(a.mark(), b.mark(), ohm)));
      }
    }
    return out;
  }

  private static double imbalancePercent(List<TerminalOhm> pairs) {
    double mean = pairs.stream().mapToDouble(TerminalOhm::ohm).average().orElseThrow();
    return 100 * (max(pairs) - min(pairs)) / mean;
  }

  private static double min(List<TerminalOhm> pairs) {
    return pairs.stream().mapToDouble(TerminalOhm::ohm).min().orElseThrow();
  }

  private static double max(List<TerminalOhm> pairs) {
    return pairs.stream().mapToDouble(TerminalOhm::ohm).max().orElseThrow();
  }

  private static boolean possible(Artwork artwork, Variation v) {
    return artwork.conductors().stream()
        .allMatch(c -> v.leaves(c.widthMm(), artwork.stackup().copper().get(c.layer() - 1)));
  }

  /** Each pair by itself: one with the star point has half of the others' resistance. */
  private static List<PairOhm> pairs(
      Artwork artwork, FabRules.Tolerance t, List<TerminalOhm> nominal) {
    Variation thin = new Variation(1 - t.track(), 1 - t.copper(), 1 - t.plating());
    if (!possible(artwork, thin)) {
      return List.of();
    }
    Variation fat = new Variation(1 + t.track(), 1 + t.copper(), 1 + t.plating());
    List<TerminalOhm> low = terminals(artwork, fat);
    List<TerminalOhm> high = terminals(artwork, thin);
    List<PairOhm> out = new ArrayList<>();
    for (int i = 0; i < nominal.size(); i++) {
      TerminalOhm n = nominal.get(i);
      out.add(new PairOhm(n.key(), n.ohm(), low.get(i).ohm(), high.get(i).ohm()));
    }
    return out;
  }

  private static Optional<Limits> worst(List<PairOhm> pairs) {
    return pairs.isEmpty()
        ? Optional.empty()
        : Optional.of(
            new Limits(
                pairs.stream().mapToDouble(PairOhm::leastOhm).min().orElseThrow(),
                pairs.stream().mapToDouble(PairOhm::greatestOhm).max().orElseThrow()));
  }

  /**
   * Each tolerance alone moves the extreme pairs by so much; the moves are added as root of the sum
   * of squares, upward and downward apart since resistance is not linear in them.
   */
  private static Optional<Limits> rss(
      Artwork artwork, FabRules.Tolerance t, List<TerminalOhm> nominal) {
    double up = 0;
    double down = 0;
    for (int side = -1; side <= 1; side += 2) {
      List<Variation> each =
          List.of(
              new Variation(1 + side * t.track(), 1, 1),
              new Variation(1, 1 + side * t.copper(), 1),
              new Variation(1, 1, 1 + side * t.plating()));
      for (Variation v : each) {
        if (!possible(artwork, v)) {
          return Optional.empty();
        }
        List<TerminalOhm> moved = terminals(artwork, v);
        if (side < 0) {
          up += square(max(moved) - max(nominal));
        } else {
          down += square(min(moved) - min(nominal));
        }
      }
    }
    return Optional.of(new Limits(min(nominal) - Math.sqrt(down), max(nominal) + Math.sqrt(up)));
  }

  private static double square(double x) {
    return x * x;
  }
}
