package etchloom.spec;

import etchloom.spec.Spec.CoilOutline;
import java.util.Optional;

/**
 * Keys of the format whose capability comes later. They are read and checked like all others and
 * then refused here, in one place; a capability that lands takes its lines out.
 */
final class NotBuiltYet {
  private NotBuiltYet() {}

  static void check(CoilDraft coil, ViaDraft via) {
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
  }

  private static void refuse(Section section, String key, String built) {
    section.error(Codes.NOT_BUILT_YET, key, "not built yet; so far " + built + " is");
  }
}
