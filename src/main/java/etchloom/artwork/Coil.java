package etchloom.artwork;

import java.util.List;
import java.util.stream.Stream;

/**
 * One coil of the board.
 *
 * @param number from 1, counter-clockwise from angle 0
 * @param sign +1 where phase current enters at the start, -1 where at the finish
 * @param axisRad angle of its axis
 * @param startJoint joint of the start; from here the current turns counter-clockwise seen from L1
 * @param conductors ids of its spirals in order of layers L1..Ln
 * @param way all its copper in the order in which a current from start to finish passes it, as in
 *     {@link Phase#steps()}: the spirals, and the tracks that join several vias of one joint
 */
public record Coil(
    int number,
    String phase,
    int sign,
    double axisRad,
    int startJoint,
    int finishJoint,
    List<Integer> conductors,
    List<Phase.Step> way) {
  public Coil {
    conductors = List.copyOf(conductors);
    way = List.copyOf(way);
  }

  /** A coil whose spirals follow each other, each joint one via. */
  public Coil(
      int number,
      String phase,
      int sign,
      double axisRad,
      int startJoint,
      int finishJoint,
      List<Integer> conductors) {
    this(
        number,
        phase,
        sign,
        axisRad,
        startJoint,
        finishJoint,
        conductors,
        conductors.stream().map(id -> new Phase.Step(id, true)).toList());
  }

  /** Ids of all its copper: the spirals by their layers, then the rest. */
  public List<Integer> copper() {
    return Stream.concat(
            conductors.stream(),
            way.stream().map(Phase.Step::conductor).filter(id -> !conductors.contains(id)))
        .toList();
  }
}
