package etchloom.rim;

import etchloom.spec.Spec;
import java.util.Optional;

/**
 * What the rim is made from. Lengths in mm.
 *
 * @param coils on the board
 * @param nodes of one coil
 * @param nodeRadiusMm of all nodes
 * @param nodeMm widest round copper at a node: its pad, or the end of a coil's track
 * @param firstNodeRad angle of a coil's first node from its axis; the last lies opposite
 * @param viaCount vias side by side at every joint
 * @param viaPitchMm distance between them
 * @param edgeCopperMm least distance of copper from the board's edge
 * @param edgeHoleMm least distance of a hole's edge from the board's edge
 */
public record RimSize(
    int coils,
    int nodes,
    int layers,
    double nodeRadiusMm,
    double nodeMm,
    double firstNodeRad,
    double trackMm,
    double spaceMm,
    double padMm,
    double holeMm,
    int viaCount,
    double viaPitchMm,
    double boardRadiusMm,
    double edgeCopperMm,
    double edgeHoleMm,
    Spec.Terminals terminals,
    Optional<Spec.Tab> tab) {

  /** The wider of pad and track. */
  double wideMm() {
    return Math.max(padMm, trackMm);
  }

  double pinAngleRad(Pin pin) {
    double axis = 2 * Math.PI * (pin.coil() - 1) / coils;
    return axis + (pin.start() ? firstNodeRad : -firstNodeRad);
  }

  /** A joint's row of vias is a chord of this length, both ends on its ring. */
  double rowMm() {
    return (viaCount - 1) * viaPitchMm;
  }

  /** Angle that a joint's row takes on a ring. */
  double rowRad(double ringMm) {
    return 2 * Math.asin(rowMm() / (2 * ringMm));
  }

  double firstRingMm() {
    return aboutRow(nodeRadiusMm + nodeMm / 2 + spaceMm + wideMm() / 2);
  }

  /** Radius of a ring, from 0 innermost. */
  double ringMm(int ring) {
    double r = firstRingMm();
    for (int i = 0; i < ring; i++) {
      r = aboutRow(r + ringPitchMm());
    }
    return r;
  }

  /** The middle of a row of vias stands further in than its ends. */
  private double aboutRow(double middleMm) {
    return viaCount == 1 ? middleMm : Math.hypot(middleMm, rowMm() / 2);
  }

  /** Distance of neighbouring rings, whose vias never share an angle: pad to track. */
  double ringPitchMm() {
    return wideMm() / 2 + spaceMm + trackMm / 2;
  }

  /** What a joint needs along its ring, with a second one's row beside it. */
  double besideMm() {
    return wideMm() + spaceMm + 2 * rowMm();
  }

  /** Least angle between two drops, or a drop and a radial, seen at the first ring. */
  double clearRad() {
    return Math.asin(Math.min(1, besideMm() / firstRingMm()));
  }

  /** Least distance of a terminal's centre from the board's edge. */
  double terminalMarginMm() {
    double copper = terminals.padMm() / 2 + edgeCopperMm;
    double hole =
        terminals.kind() == Spec.TerminalKind.HOLE ? terminals.holeMm() / 2 + edgeHoleMm : 0;
    return Math.max(copper, hole);
  }
}
