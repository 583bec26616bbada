package etchloom.report.area;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Arc;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.locationtech.jts.geom.Geometry;

/**
 * How much the tracks of one joint lie over each other outside the joint's own disc: beside the bar
 * of a row of vias, which is as wide as its pads, the next track leaves through the bar's side.
 *
 * <p>Only joints where two tracks leave so near to each other that they may overlap cost anything;
 * there the tracks' first stretches are laid over each other as polygons, longer ones until the
 * overlap ends before they do. Joints that are the same but for a turn of the board are reckoned
 * once.
 */
final class JointOverlap {
  /** An overlap is some 0.01 mm²; polygons this fine put it right to a hundredth of itself. */
  private static final double CHORD_ERROR_MM = 5e-4;

  private static final int QUADRANT = 16;

  /** Alike to so many mm or rad counts as the same joint. */
  private static final double GRID = 1e-6;

  private static final double FIRST_REACH = 4;

  private final Map<List<Long>, Double> known;
  private final Artwork artwork;
  private final int joint;
  private final double discMm;
  private final List<Conductor> tracks;

  /**
   * @param known what was reckoned before, by the joint's shape
   * @param discMm radius of the copper round the joint, at least half of every track's width
   */
  JointOverlap(
      Map<List<Long>, Double> known,
      Artwork artwork,
      int joint,
      double discMm,
      List<Conductor> tracks) {
    this.known = known;
    this.artwork = artwork;
    this.joint = joint;
    this.discMm = discMm;
    this.tracks = tracks;
  }

  /** What the widths times lengths of the tracks count twice or more outside the disc, mm². */
  double areaMm2() {
    return crowded() ? known(FIRST_REACH * discMm) : 0;
  }

  private boolean crowded() {
    for (int i = 0; i < tracks.size(); i++) {
      for (int j = i + 1; j < tracks.size(); j++) {
        Point u = CopperArea.outward(tracks.get(i), joint);
        Point v = CopperArea.outward(tracks.get(j), joint);
        double between = Math.abs(Math.atan2(u.cross(v), u.dot(v)));
        double sides = side(tracks.get(i)) + side(tracks.get(j));
        if (between < Math.min(sides, Math.PI) - GRID) {
          return true;
        }
      }
    }
    return false;
  }

  /** Half the angle over which a track leaves the disc, with room for one that bends in it. */
  private double side(Conductor c) {
    double straight = Math.asin(Math.min(1, c.widthMm() / 2 / discMm));
    return straight + outward(c).segments().get(0).match(l -> 0.0, a -> discMm / a.radiusMm());
  }

  private double known(double reach) {
    List<Long> shape = shape(reach);
    Double before = known.get(shape);
    if (before == null) {
      before = overlap(reach);
      known.put(shape, before);
    }
    return before;
  }

  /** Lengths, widths and bends, which a turn of the whole joint leaves as they are. */
  private List<Long> shape(double reach) {
    List<Long> key = new ArrayList<>();
    put(key, discMm);
    Point before = CopperArea.outward(tracks.get(0), joint);
    for (Conductor c : tracks) {
      put(key, c.widthMm());
      put(key, far(c).padMm());
      put(key, goesBeyond(c, reach) ? 1 : 0);
      for (Segment s : first(outward(c), reach).segments()) {
        Point t = s.tangent(0);
        put(key, Math.atan2(before.cross(t), before.dot(t)));
        put(key, s.lengthMm());
        put(key, s.match(line -> 0.0, Arc::sweepRad));
        before = s.tangent(1);
      }
    }
    return key;
  }

  private static void put(List<Long> key, double value) {
    key.add(Math.round(value / GRID));
  }

  private double overlap(double reach) {
    Geometry disc = MergedCopper.disc(artwork.joints().get(joint).at(), discMm, QUADRANT);
    Geometry all = null;
    double sum = 0;
    for (Conductor c : tracks) {
      Geometry track = copper(c, reach);
      if (all == null) {
        all = track;
        continue;
      }
      Geometry twice = all.intersection(track).difference(disc);
      if (tracks.stream().anyMatch(t -> runsOut(t, reach, twice))) {
        return overlap(2 * reach);
      }
      sum += twice.getArea();
      all = all.union(track);
    }
    return sum;
  }

  /** Whether the overlap still goes on where a track's stretch ends. */
  private boolean runsOut(Conductor c, double reach, Geometry twice) {
    if (!goesBeyond(c, reach) || twice.isEmpty()) {
      return false;
    }
    Point end = first(outward(c), reach).end();
    return twice.isWithinDistance(MergedCopper.point(end), c.widthMm());
  }

  /** A track's first stretch; with the pad at its far end where that comes within reach. */
  private Geometry copper(Conductor c, double reach) {
    Path path = first(outward(c), reach);
    Geometry track = MergedCopper.track(path, c.widthMm(), CHORD_ERROR_MM, QUADRANT);
    Joint far = far(c);
    if (goesBeyond(c, reach) || far.padMm() <= c.widthMm()) {
      return track;
    }
    return track.union(MergedCopper.disc(far.at(), far.padMm() / 2, QUADRANT));
  }

  private static boolean goesBeyond(Conductor c, double reach) {
    return c.path().lengthMm() > reach;
  }

  private Joint far(Conductor c) {
    return artwork.joints().get(c.fromJoint() == joint ? c.toJoint() : c.fromJoint());
  }

  private Path outward(Conductor c) {
    return c.fromJoint() == joint ? c.path() : c.path().reversed();
  }

  private static Path first(Path path, double reach) {
    List<Segment> out = new ArrayList<>();
    double left = reach;
    for (Segment s : path.segments()) {
      double length = s.lengthMm();
      if (length >= left) {
        out.add(length > left ? s.part(0, left / length) : s);
        break;
      }
      out.add(s);
      left -= length;
    }
    return new Path(out);
  }
}
