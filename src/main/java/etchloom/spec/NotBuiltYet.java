package etchloom.spec;

/**
 * Keys of the format whose capability comes later. They are read and checked like all others and
 * then refused here, in one place; a capability that lands takes its lines out.
 */
final class NotBuiltYet {
  private NotBuiltYet() {}

  static void check(CoilDraft coil) {
    if (coil.taper()) {
      refuse(coil.section(), "taper", "only `taper: off`");
    }
  }

  private static void refuse(Section section, String key, String built) {
    section.error(Codes.NOT_BUILT_YET, key, "not built yet; so far " + built + " is");
  }
}
