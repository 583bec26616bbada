package etchloom.artwork;

import java.util.List;

/**
 * One coil of the board.
 *
 * @param number from 1, counter-clockwise from angle 0
 * @param sign +1 where phase current enters at the start, -1 where at the finish
 * @param axisRad angle of its axis
 * @param startJoint joint of the start; from here the current turns counter-clockwise seen from L1
 * @param conductors ids of its spirals in order of layers L1..Ln
 */
public record Coil(
    int number,
    String phase,
    int sign,
    double axisRad,
    int startJoint,
    int finishJoint,
    List<Integer> conductors) {
  public Coil {
    conductors = List.copyOf(conductors);
  }
}
