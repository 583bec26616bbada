package etchloom.spec;

import etchloom.spec.Spec.TerminalKind;

/**
 * Keys of the format whose capability comes later. They are read and checked like all others and
 * then refused here, in one place; a capability that lands takes its lines out.
 */
final class NotBuiltYet {
  private NotBuiltYet() {}

  static void check(WindingDraft winding, CoilDraft coil, BoardDraft board) {
    if (coil.taper()) {
      refuse(coil.section(), "taper", "only `taper: off`");
    }
    if (winding.paths() > 1) {
      refuse(winding.section(), "parallel-paths", "only `parallel-paths: 1`");
    }
    if (winding.phases() != CountField.FAULTY && winding.phases() != 3) {
      refuse(winding.section(), "phases", "only `phases: 3`");
    }
    if (board.tab().isPresent()) {
      refuse(board.section(), "tab", "a round board without a tab");
    }
    TerminalsDraft terminals = board.terminals();
    if (terminals.kind() == TerminalKind.PAD) {
      refuse(terminals.section().orElseThrow(), "kind", "only `kind: hole`");
    }
  }

  private static void refuse(Section section, String key, String built) {
    section.error(Codes.NOT_BUILT_YET, key, "not built yet; so far " + built + " is");
  }
}
