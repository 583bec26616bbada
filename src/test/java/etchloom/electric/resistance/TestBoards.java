package etchloom.electric.resistance;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.artwork.Feature;
import etchloom.artwork.Joint;
import etchloom.artwork.Phase;
import etchloom.artwork.Stackup;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Small boards of straight tracks, laid out for their circuit only. */
final class TestBoards {
  private final Stackup stackup;
  private final List<Joint> joints = new ArrayList<>();
  private final List<Conductor> conductors = new ArrayList<>();
  private final List<Coil> coils = new ArrayList<>();
  private final List<Phase> phases = new ArrayList<>();

  TestBoards(Stackup stackup) {
    this.stackup = stackup;
  }

  static Stackup twoLayers(double copperMm, double undercutMm) {
    Stackup.Copper c = new Stackup.Copper(copperMm, 1, undercutMm);
    return new Stackup(List.of(c, c), List.of(1.6 - 2 * copperMm), 0.02);
  }

  int joint(Joint.Kind kind, String mark) {
    int id = joints.size();
    Optional<Double> hole = Optional.of(0.3);
    joints.add(
        new Joint(
            id, kind, new Point(id, 0), 0.6, hole, 1, stackup.layers(), "", mark, "joint " + id));
    return id;
  }

  int terminal(String mark) {
    return joint(Joint.Kind.TERMINAL, mark);
  }

  int node() {
    return joint(Joint.Kind.NODE, "");
  }

  int track(int from, int to, int layer, double lengthMm, double widthMm) {
    int id = conductors.size();
    Path path = Path.of(new Line(new Point(0, id), new Point(lengthMm, id)));
    Feature what = new Feature(Feature.Kind.SPIRAL, "", 0, List.of());
    conductors.add(new Conductor(id, layer, widthMm, path, from, to, "", what));
    return id;
  }

  void coil(int start, int finish, List<Integer> ids) {
    coils.add(new Coil(coils.size() + 1, "U", 1, 0, start, finish, ids));
  }

  void phase(String mark, int entry, int exit, List<Integer> ids) {
    List<Phase.Step> steps = ids.stream().map(id -> new Phase.Step(id, true)).toList();
    phases.add(new Phase(mark, entry, exit, steps));
  }

  Artwork build() {
    return new Artwork(
        "Test",
        "test",
        "A",
        false,
        stackup,
        List.of(),
        joints,
        conductors,
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        coils,
        phases,
        1,
        0);
  }

  /**
   * A star, delta or open board of three phases with coils of two layers.
   *
   * @param from where each phase's chain begins
   * @param to where it ends
   */
  void threePhases(int[] from, int[] to, int coilsEach, double layerMm, double widthMm) {
    String[] marks = {"U", "V", "W"};
    for (int p = 0; p < 3; p++) {
      List<Integer> steps = new ArrayList<>();
      int at = from[p];
      for (int c = 0; c < coilsEach; c++) {
        int eye = joint(Joint.Kind.EYE, "");
        int next = c == coilsEach - 1 ? to[p] : node();
        int down = track(at, eye, 1, layerMm, widthMm);
        int up = track(eye, next, 2, layerMm, widthMm);
        coil(at, next, List.of(down, up));
        steps.addAll(List.of(down, up));
        at = next;
      }
      phase(marks[p], from[p], to[p], steps);
    }
  }
}
