package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.artwork.Joint;
import etchloom.artwork.MountingHole;
import etchloom.geometry.Nearest;
import etchloom.geometry.Point;
import etchloom.rules.Verdicts.Measured;
import java.util.List;

/**
 * {@code keep-out} for what stands on the board: screw heads stay clear of each other and of the
 * rotor's disc, and so do the terminals with their wires. Copper under screw heads is {@link
 * ScrewRule}'s.
 */
final class KeepOutRule implements Rule {
  @Override
  public void check(Board board, Verdicts verdicts) {
    List<MountingHole> holes = board.artwork().mountingHoles();
    for (int i = 0; i < holes.size(); i++) {
      for (int j = i + 1; j < holes.size(); j++) {
        heads(holes, i, j, verdicts);
      }
    }
    if (board.spec().rotor().outerDiameterMm().isPresent()) {
      rotor(board, board.spec().rotor().outerDiameterMm().getAsDouble() / 2, verdicts);
    }
  }

  private static void heads(List<MountingHole> holes, int i, int j, Verdicts verdicts) {
    MountingHole a = holes.get(i);
    MountingHole b = holes.get(j);
    Nearest n = new Nearest(a.at().distanceTo(b.at()), a.at(), b.at());
    verdicts.add(
        Measured.atLeast(
                RuleName.KEEP_OUT,
                0,
                n.middle(),
                n.distanceMm() - (a.keepOutMm() + b.keepOutMm()) / 2,
                0,
                Words.of("screw heads of mounting holes ", i + 1, " and ", j + 1))
            .ids(i, j));
  }

  private static void rotor(Board board, double discMm, Verdicts verdicts) {
    Artwork a = board.artwork();
    int number = 0;
    for (MountingHole h : a.mountingHoles()) {
      Words what = Words.of("mounting hole ", ++number, "'s screw head");
      clear(board, h.at(), h.keepOutMm() / 2, discMm, what, number, verdicts);
    }
    for (Joint j : a.joints()) {
      if (j.terminal()) {
        Words what = Words.of(LayerCopper.jointWords(j));
        clear(board, j.at(), j.padMm() / 2, discMm, what, j.id(), verdicts);
      }
    }
  }

  private static void clear(
      Board board,
      Point at,
      double radiusMm,
      double discMm,
      Words what,
      int id,
      Verdicts verdicts) {
    double gap = at.norm() - radiusMm - discMm;
    int last = board.spec().rotor().twoSided() ? board.artwork().layers() : 1;
    // The disc turns in front of L1, and with two of them in front of the bottom as well.
    for (int layer : new int[] {1, last}) {
      verdicts.add(
          Measured.atLeast(
                  RuleName.KEEP_OUT, layer, at, gap, 0, Words.of(what, " and the rotor's disc"))
              .ids(id, 0));
    }
  }
}
