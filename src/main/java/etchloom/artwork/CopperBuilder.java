package etchloom.artwork;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Collects joints and conductors and gives them their numbers; used while the copper is built. */
public final class CopperBuilder {
  private final List<Joint> joints = new ArrayList<>();
  private final List<Conductor> conductors = new ArrayList<>();
  private int circuits;

  /** A plated hole with a pad on layers 1 to {@code layers}; gives its number. */
  public int drilled(
      Joint.Kind kind, Point at, double padMm, double holeMm, int layers, String net, String what) {
    return add(kind, at, padMm, Optional.of(holeMm), 1, layers, net, "", what);
  }

  /** A place on one layer where tracks just meet. */
  public int bare(Joint.Kind kind, Point at, int layer, String net, String what) {
    return add(kind, at, 0, Optional.empty(), layer, layer, net, "", what);
  }

  /** A terminal, with a hole through {@code layers} layers or as a bare pad on L1. */
  public int terminal(
      Point at, double padMm, Optional<Double> hole, int layers, String net, String mark) {
    int last = hole.isPresent() ? layers : 1;
    return add(Joint.Kind.TERMINAL, at, padMm, hole, 1, last, net, mark, "terminal " + mark);
  }

  private int add(
      Joint.Kind kind,
      Point at,
      double padMm,
      Optional<Double> hole,
      int first,
      int last,
      String net,
      String mark,
      String what) {
    int id = joints.size();
    joints.add(new Joint(id, kind, at, padMm, hole, first, last, net, mark, what));
    return id;
  }

  /** A track from one joint to another; gives its number. */
  public int track(
      int layer, double widthMm, Path path, int from, int to, String net, Feature what) {
    return track(layer, widthMm, List.of(), path, from, to, net, what);
  }

  /**
   * A track whose width changes; gives its number.
   *
   * @param widthsMm one a segment, as in {@link Conductor}
   */
  public int track(
      int layer,
      double widthMm,
      List<Double> widthsMm,
      Path path,
      int from,
      int to,
      String net,
      Feature what) {
    int id = conductors.size();
    conductors.add(new Conductor(id, layer, widthMm, widthsMm, path, from, to, net, what));
    return id;
  }

  /**
   * Joins vias of one joint by straight tracks, which makes closed circuits of them.
   *
   * @param joints the vias in line
   * @param layers where the joint is reached by copper
   * @return the tracks from the first via to the last, those side by side one after the other
   */
  public List<Phase.Step> row(
      List<Integer> joints, List<Integer> layers, double widthMm, String net, Feature what) {
    List<Phase.Step> out = new ArrayList<>();
    for (int k = 0; k + 1 < joints.size(); k++) {
      int from = joints.get(k);
      int to = joints.get(k + 1);
      for (int layer : layers) {
        Path path = Path.of(new Line(joint(from).at(), joint(to).at()));
        out.add(new Phase.Step(track(layer, widthMm, path, from, to, net, what), true));
      }
      circuits += layers.size() - 1;
    }
    return out;
  }

  /** Counts circuits that copper drawn otherwise closes. */
  public void closes(int more) {
    circuits += more;
  }

  /** Independent closed circuits made on purpose so far. */
  public int circuits() {
    return circuits;
  }

  public Joint joint(int id) {
    return joints.get(id);
  }

  public List<Joint> joints() {
    return List.copyOf(joints);
  }

  public List<Conductor> conductors() {
    return List.copyOf(conductors);
  }
}
