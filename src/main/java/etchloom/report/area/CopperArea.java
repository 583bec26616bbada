package etchloom.report.area;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.rules.RuleReport;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Area of the copper of each layer, what lies over each other counted once.
 *
 * <p>A track of lines and arcs tangent to each other covers width times length; a corner, what its
 * outer sector adds and its inner kite takes. At a joint the tracks' ends lie in the pad, and the
 * part of each that does is counted with the pad alone: exact for tracks that leave the pad
 * straight, else good to a small share of the pad. Where tracks of a joint lie over each other
 * outside the pad, that is taken off ({@link JointOverlap}). Where the rule check found copper
 * touching, or a track is too short to leave its pads, the layer is merged as polygons ({@link
 * MergedCopper}), which is slow.
 */
public final class CopperArea {
  /** Pads that only touch do not lie over each other, rounded to the grid or not. */
  private static final double TOUCH_MM = 1e-5;

  private final Artwork artwork;
  private final Map<Integer, List<Conductor>> ends = new HashMap<>();
  private final Map<List<Long>, Double> overlaps;
  private final int layer;

  private CopperArea(Artwork artwork, int layer, Map<List<Long>, Double> overlaps) {
    this.overlaps = overlaps;
    this.artwork = artwork;
    this.layer = layer;
    for (Conductor c : artwork.conductorsOn(layer)) {
      ends.computeIfAbsent(c.fromJoint(), k -> new ArrayList<>()).add(c);
      ends.computeIfAbsent(c.toJoint(), k -> new ArrayList<>()).add(c);
    }
  }

  /** One entry a layer, L1 first, mm². */
  public static List<Double> of(Artwork artwork, RuleReport rules) {
    List<Double> out = new ArrayList<>();
    Map<List<Long>, Double> overlaps = new HashMap<>();
    for (int layer = 1; layer <= artwork.layers(); layer++) {
      String name = "L" + layer;
      boolean touching =
          rules.findings().stream()
              .anyMatch(
                  f -> f.rule().equals("space") && f.layer().equals(name) && f.measured() <= 0);
      CopperArea a = new CopperArea(artwork, layer, overlaps);
      out.add(touching || a.crowded() ? MergedCopper.areaMm2(artwork, layer) : a.areaMm2());
    }
    return out;
  }

  private boolean crowded() {
    return artwork.conductorsOn(layer).stream()
        .anyMatch(
            c ->
                c.fromJoint() == c.toJoint()
                    || c.path().lengthMm() + TOUCH_MM
                        < discMm(c.fromJoint()) + discMm(c.toJoint()));
  }

  private double areaMm2() {
    double sum = 0;
    for (Conductor c : artwork.conductorsOn(layer)) {
      List<Segment> pieces = c.path().segments();
      for (int i = 0; i < pieces.size(); i++) {
        double w = c.widthMm(i);
        sum += w * pieces.get(i).lengthMm();
        if (i > 0 && c.widthMm(i - 1) != w) {
          sum += step(c.widthMm(i - 1), w);
        } else if (i > 0) {
          sum += corner(w, pieces.get(i - 1).tangent(1), pieces.get(i).tangent(0));
        }
      }
    }
    for (Joint j : artwork.joints()) {
      if (j.on(layer)) {
        sum += joint(j.id());
      }
    }
    return sum;
  }

  /** What a joint adds to the widths times lengths of its tracks, reckoned to its middle. */
  private double joint(int id) {
    List<Conductor> tracks = ends.getOrDefault(id, List.of());
    double r = discMm(id);
    if (r == 0) {
      return bare(id, tracks);
    }
    double sum = Math.PI * r * r;
    for (Conductor c : tracks) {
      double h = c.widthMm() / 2;
      sum -= h * Math.sqrt(r * r - h * h) + r * r * Math.asin(h / r);
    }
    return sum - new JointOverlap(overlaps, artwork, id, r, tracks).areaMm2();
  }

  /** Two tracks that meet without a pad make a corner, like two pieces of one track. */
  private static double bare(int id, List<Conductor> tracks) {
    if (tracks.size() != 2) {
      return 0;
    }
    Point in = outward(tracks.get(0), id).times(-1);
    return corner(tracks.get(0).widthMm(), in, outward(tracks.get(1), id));
  }

  static Point outward(Conductor c, int joint) {
    List<Segment> s = c.path().segments();
    return c.fromJoint() == joint ? s.get(0).tangent(0) : s.get(s.size() - 1).tangent(1).times(-1);
  }

  /** Radius of the copper round a joint: its pad, or the round end of its widest track; 0: none. */
  private double discMm(int id) {
    List<Conductor> tracks = ends.getOrDefault(id, List.of());
    double pad = artwork.joints().get(id).padMm();
    if (pad == 0 && tracks.size() == 2 && tracks.get(0).widthMm() == tracks.get(1).widthMm()) {
      return 0;
    }
    double width = tracks.stream().mapToDouble(Conductor::widthMm).max().orElse(0);
    return Math.max(pad, width) / 2;
  }

  /** The wider of two stretches in line has a round end over the narrower, and beside it. */
  private static double step(double a, double b) {
    double r = Math.max(a, b) / 2;
    double h = Math.min(a, b) / 2;
    return r * r * Math.acos(h / r) - h * Math.sqrt(r * r - h * h);
  }

  /** A corner by θ gains a sector outside and loses a kite inside. */
  private static double corner(double width, Point in, Point out) {
    double turn = Math.abs(Math.atan2(in.cross(out), in.dot(out)));
    return width * width / 4 * (turn / 2 - Math.tan(turn / 2));
  }
}
