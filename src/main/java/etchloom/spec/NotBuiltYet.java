package etchloom.spec;

import etchloom.spec.Spec.CoilOutline;
import etchloom.spec.Spec.TerminalKind;
import java.util.Optional;

/**
 * Keys of the format whose capability comes later. They are read and checked like all others and
 * then refused here, in one place; a capability that lands takes its lines out.
 */
final class NotBuiltYet {
  private NotBuiltYet() {}

  static void check(WindingDraft winding, CoilDraft coil, ViaDraft via, BoardDraft board) {
    Optional<CoilOutline> outline = coil.outline();
    if (outline.isPresent() && outline.get() != CoilOutline.WEDGE) {
      refuse(coil.section(), "outline", "only `outline: wedge`");
    }
    if (coil.parallelLayers()) {
      refuse(coil.section(), "layers", "only `layers: series`");
    }
    if (coil.taper()) {
      refuse(coil.section(), "taper", "only `taper: off`");
    }
    if (via.count() > 1) {
      refuse(via.section(), "count", "only `count: 1`");
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
