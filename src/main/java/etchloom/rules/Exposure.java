package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.artwork.Joint;
import etchloom.artwork.Opening;
import java.util.List;

/** Which pads the openings of the mask lay bare. */
final class Exposure {
  private final int layers;
  private final boolean[] top;
  private final boolean[] bottom;

  Exposure(Artwork artwork) {
    layers = artwork.layers();
    top = bare(artwork, artwork.maskTop(), 1);
    bottom = bare(artwork, artwork.maskBottom(), layers);
  }

  private static boolean[] bare(Artwork artwork, List<Opening> openings, int layer) {
    boolean[] out = new boolean[artwork.joints().size()];
    for (Joint j : artwork.joints()) {
      out[j.id()] = j.on(layer) && openings.stream().anyMatch(o -> owns(o, j));
    }
    return out;
  }

  /** Whether an opening is the pad's own: both have the same middle. */
  static boolean owns(Opening o, Joint j) {
    return j.padMm() > 0 && o.at().distanceTo(j.at()) <= Board.SLACK_MM;
  }

  /** Whether a piece is a pad that stands bare in an opening of the mask. */
  boolean bare(int layer, Piece p) {
    if (!p.isPad()) {
      return false;
    }
    return (layer == 1 && top[p.joint()]) || (layer == layers && bottom[p.joint()]);
  }
}
