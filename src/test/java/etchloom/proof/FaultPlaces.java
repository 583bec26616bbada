package etchloom.proof;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Distance;
import etchloom.geometry.Nearest;
import etchloom.geometry.Segment;
import java.util.List;

/** Places on a board where a fault would be likely, or hard to see. */
final class FaultPlaces {
  private FaultPlaces() {}

  static Conductor spiral(Artwork art, int coil, int layer) {
    return art.conductors().get(art.coils().get(coil - 1).conductors().get(layer - 1));
  }

  /** The nearest places of two pieces of a spiral that lie side by side. */
  static Nearest besideEachOther(Conductor c, int from) {
    List<Segment> s = c.path().segments();
    Segment a = s.get(from).part(0.45, 0.55);
    Nearest best = null;
    for (int k = 0; k < s.size(); k++) {
      Nearest n = Distance.between(a, s.get(k));
      if (Math.abs(k - from) > 4 && (best == null || n.distanceMm() < best.distanceMm())) {
        best = n;
      }
    }
    return best;
  }

  /** The middle of the longest piece of a spiral. */
  static int longest(Conductor c) {
    List<Segment> s = c.path().segments();
    int best = 0;
    for (int k = 1; k < s.size(); k++) {
      best = s.get(k).lengthMm() > s.get(best).lengthMm() ? k : best;
    }
    return best;
  }

  static Joint joint(Artwork art, Joint.Kind kind, int index) {
    return art.joints().stream().filter(j -> j.kind() == kind).skip(index).findFirst().get();
  }
}
