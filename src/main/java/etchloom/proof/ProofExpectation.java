package etchloom.proof;

import etchloom.artwork.Artwork;
import etchloom.artwork.Joint;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;
import java.util.OptionalDouble;

/**
 * What the files of a set must say, as plain places and lines; lengths in mm, seen from L1.
 *
 * @param pads places that copper must join, in the order of their numbers
 * @param tracks the copper between them
 * @param nonPlated the mounting holes
 * @param profile closed paths: the edge of the board, then the bore if any
 * @param circuits independent closed circuits of the whole conductor
 */
public record ProofExpectation(
    int layers,
    List<Pad> pads,
    List<Track> tracks,
    List<Disc> nonPlated,
    List<Path> profile,
    List<Disc> maskTop,
    List<Disc> maskBottom,
    int circuits) {
  public ProofExpectation {
    pads = List.copyOf(pads);
    tracks = List.copyOf(tracks);
    nonPlated = List.copyOf(nonPlated);
    profile = List.copyOf(profile);
    maskTop = List.copyOf(maskTop);
    maskBottom = List.copyOf(maskBottom);
  }

  /**
   * A place where copper is joined.
   *
   * @param diameterMm of its pad on each of its layers; 0 where tracks just meet
   * @param holeMm finished diameter of its plated hole
   * @param fromLayer the topmost of its layers, from 1
   * @param mark of a terminal, else empty
   * @param what in the user's words
   */
  public record Pad(
      Point at,
      double diameterMm,
      OptionalDouble holeMm,
      int fromLayer,
      int toLayer,
      String net,
      String mark,
      String what) {
    public boolean on(int layer) {
      return layer >= fromLayer && layer <= toLayer;
    }

    public boolean terminal() {
      return !mark.isEmpty();
    }
  }

  /**
   * @param strokes its stretches of one width, each beginning where the one before it ends
   * @param from number of the pad where the path starts
   * @param to number of the pad where it ends
   */
  public record Track(int layer, List<Stroke> strokes, int from, int to, String net, String what) {
    public Track {
      strokes = List.copyOf(strokes);
    }

    /** A track of one width. */
    public Track(int layer, Path path, double widthMm, int from, int to, String net, String what) {
      this(layer, List.of(new Stroke(path, widthMm)), from, to, net, what);
    }
  }

  /** A stretch of one width, with round ends. */
  public record Stroke(Path path, double widthMm) {}

  public record Disc(Point at, double diameterMm) {}

  /**
   * @param art on the grid: {@code artwork.onGrid()}
   */
  public static ProofExpectation of(Artwork art) {
    return new ProofExpectation(
        art.layers(),
        art.joints().stream().map(ProofExpectation::pad).toList(),
        art.conductors().stream()
            .map(
                c ->
                    new Track(
                        c.layer(),
                        c.stretches().stream().map(s -> new Stroke(s.path(), s.widthMm())).toList(),
                        c.fromJoint(),
                        c.toJoint(),
                        c.net(),
                        c.what().describe(-1)))
            .toList(),
        art.mountingHoles().stream().map(h -> new Disc(h.at(), h.diameterMm())).toList(),
        art.profile(),
        art.maskTop().stream().map(o -> new Disc(o.at(), o.diameterMm())).toList(),
        art.maskBottom().stream().map(o -> new Disc(o.at(), o.diameterMm())).toList(),
        art.expectedCircuits());
  }

  private static Pad pad(Joint j) {
    return new Pad(
        j.at(),
        j.padMm(),
        j.hole().isPresent() ? OptionalDouble.of(j.hole().get()) : OptionalDouble.empty(),
        j.firstLayer(),
        j.lastLayer(),
        j.net(),
        j.mark(),
        j.what());
  }
}
