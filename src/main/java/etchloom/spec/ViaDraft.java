package etchloom.spec;

import etchloom.spec.Spec.Via;

/** The vias' keys as read. */
record ViaDraft(Section section, double hole, double pad, int count) {
  static ViaDraft read(Section s) {
    double hole = s.length("hole", Limits.HOLE).required();
    double pad = s.length("pad", Limits.PAD).required();
    int count = s.count("count", 1, Limits.VIAS_MAX, false).or(1);
    s.close();
    if (pad <= hole) {
      s.error(Codes.PAD, "pad", Show.mm(pad) + " is not more than the hole, " + Show.mm(hole));
    }
    return new ViaDraft(s, hole, pad, count);
  }

  Via build() {
    return new Via(hole, pad, count);
  }
}
