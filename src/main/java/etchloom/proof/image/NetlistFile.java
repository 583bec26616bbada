package etchloom.proof.image;

import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/**
 * An IPC-D-356A bare-board netlist.
 *
 * @param header the P records by name, UNITS and JOB among them
 * @param points test records, net name aliases resolved
 * @param lines conductors and outlines
 */
public record NetlistFile(
    String fileName,
    Map<String, String> header,
    List<TestPoint> points,
    List<NetLine> lines,
    List<ReadWarning> warnings) {
  public NetlistFile {
    points = List.copyOf(points);
    lines = List.copyOf(lines);
    warnings = List.copyOf(warnings);
  }

  /**
   * @param operation 317 through hole, 327 surface feature, 367 tooling hole, 307 blind or buried
   * @param net full name; {@code N/C} for a point of no net
   * @param refdes {@code VIA} for vias
   * @param mid true for a point within the net, false for an end point
   * @param holeMm drilled diameter
   * @param plating UNKNOWN when there is no hole
   * @param access 0 both sides, 1 top, else the number of the layer; empty when not said
   * @param widthMm of the feature; 0 when left out
   * @param heightMm of the feature; 0 stands for round
   * @param mask 0 none, 1 top covered, 2 bottom covered, 3 both; empty when not said
   * @param fromLayer of a 307 record, else 0
   * @param toLayer of a 307 record, else 0
   */
  public record TestPoint(
      int operation,
      String net,
      String refdes,
      String pin,
      boolean mid,
      OptionalDouble holeMm,
      Plating plating,
      OptionalInt access,
      Point at,
      double widthMm,
      double heightMm,
      double rotationRad,
      OptionalInt mask,
      int fromLayer,
      int toLayer,
      int line) {}

  /**
   * A conductor (378) or an outline (389).
   *
   * @param name the net, or the outline's kind such as {@code BOARD_EDGE}
   * @param layer of a conductor; 0 for an outline
   * @param widthMm the pen
   */
  public record NetLine(
      int operation, String name, int layer, double widthMm, List<Path> paths, int line) {
    public NetLine {
      paths = List.copyOf(paths);
    }
  }
}
