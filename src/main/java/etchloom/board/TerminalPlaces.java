package etchloom.board;

import etchloom.artwork.Joint;
import etchloom.artwork.MountingHole;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import java.util.List;
import java.util.Locale;

/** Whether the terminals stand clear of screws and of the rotor's disc; else which keys clash. */
final class TerminalPlaces {
  private static final double SLACK_MM = 1e-9;

  private final Spec spec;
  private final FabRules fab;
  private final Problems problems;

  TerminalPlaces(Spec spec, FabRules fab, Problems problems) {
    this.spec = spec;
    this.fab = fab;
    this.problems = problems;
  }

  void check(List<Joint> joints, List<MountingHole> holes) {
    List<Joint> terminals = joints.stream().filter(Joint::terminal).toList();
    for (int i = 0; i < holes.size(); i++) {
      screw(terminals, holes.get(i), i + 1);
    }
    spec.rotor().outerDiameterMm().ifPresent(d -> disc(terminals, d / 2));
  }

  /** The one that is nearest to the screw speaks for all. */
  private void screw(List<Joint> terminals, MountingHole hole, int number) {
    double keep = Math.max(hole.keepOutMm() / 2, hole.diameterMm() / 2 + fab.hole().copperGapMm());
    double most = 0;
    Joint worst = null;
    for (Joint t : terminals) {
      double over = keep + t.padMm() / 2 - t.at().distanceTo(hole.at());
      if (over > most + SLACK_MM) {
        most = over;
        worst = t;
      }
    }
    if (worst != null) {
      problems.add(
          "terminals",
          "board.terminals.start",
          String.format(
              Locale.ROOT,
              "terminal %s stands %.3f mm too near to mounting hole %d and its screw head; another"
                  + " board.terminals.start, board.holes.start or board.holes.circle, or a smaller"
                  + " board.terminals.pitch or board.holes.keep-out would do",
              worst.mark(),
              most,
              number));
    }
  }

  private void disc(List<Joint> terminals, double discMm) {
    double least = Double.POSITIVE_INFINITY;
    Joint worst = null;
    for (Joint t : terminals) {
      double at = t.at().norm() - t.padMm() / 2;
      if (at < least && at < discMm - SLACK_MM) {
        least = at;
        worst = t;
      }
    }
    if (worst != null) {
      problems.add(
          "terminals",
          "rotor.outer-diameter",
          String.format(
              Locale.ROOT,
              "the rotor's disc turns over terminal %s, whose pad begins at radius %.3f mm; a"
                  + " smaller rotor.outer-diameter, a larger board.diameter or a board.tab would do",
              worst.mark(),
              least));
    }
  }
}
