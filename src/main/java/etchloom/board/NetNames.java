package etchloom.board;

import etchloom.spec.Spec;
import etchloom.winding.Winding;

/** The nets' names: copper that is joined is one net. */
final class NetNames {
  private static final int OF_A_SET = 3;

  private final Winding winding;
  private final Spec.Connection connection;

  NetNames(Winding winding, Spec.Connection connection) {
    this.winding = winding;
    this.connection = connection;
  }

  /**
   * The net of a coil, from 1: its phase's mark where windings are open, else the whole winding;
   * two sets of three are joined each by itself.
   */
  String of(int coil) {
    int phase = winding.sequence().get(coil - 1).phase();
    if (connection == Spec.Connection.OPEN) {
      return winding.marks().get(phase);
    }
    return winding.phases() == 2 * OF_A_SET ? "WINDING" + (phase / OF_A_SET + 1) : "WINDING";
  }
}
