package etchloom.proof;

import etchloom.geometry.Point;
import etchloom.proof.copper.CopperBuilder;
import etchloom.proof.copper.CopperDifference;
import etchloom.proof.copper.CopperDifference.Patch;
import etchloom.proof.plane.Figure;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;

/** Where a layer's copper is not that of the design, and what each patch of it touches. */
final class LayerChanges {
  /** Above the chord error and rounding, below any gap that is kept. */
  private static final double TOUCH_MM = 3 * CopperBuilder.CHORD_ERROR_MM;

  private final LayerGroups groups;
  private final Figure wanted;
  private final List<Patch> patches;

  /** The design's group on each island of its own copper, -1 where several share it. */
  private final TreeMap<Integer, Integer> groupOf = new TreeMap<>();

  LayerChanges(LayerGroups groups, Figure found) {
    this.groups = groups;
    this.wanted = new CopperBuilder().build(groups.objects());
    this.patches = CopperDifference.between(found, wanted);
    for (int g = 0; g < groups.groups().size(); g++) {
      for (int p : groups.group(g).pads()) {
        Point at = groups.pad(p).at();
        int island = wanted.islandAt(Nm.of(at.x()), Nm.of(at.y()));
        if (island >= 0) {
          groupOf.put(island, g);
        }
      }
    }
  }

  List<Patch> patches() {
    return patches;
  }

  /** Groups of the design that a patch touches, in ascending order. */
  SortedSet<Integer> touched(Patch patch) {
    TreeSet<Integer> out = new TreeSet<>();
    for (Point p : patch.rim()) {
      for (int island : wanted.islandsWithin(Nm.of(p.x()), Nm.of(p.y()), TOUCH_MM * Nm.PER_MM)) {
        Integer g = groupOf.get(island);
        if (g != null) {
          out.add(g);
        }
      }
    }
    return out;
  }

  /** The extra patch that closes a ring of the copper found, the one nearest to a point. */
  Optional<Patch> closing(Figure found, int ring, Point near) {
    List<Patch> all = new ArrayList<>();
    for (Patch p : patches) {
      if (p.extra() && touches(p, found, ring)) {
        all.add(p);
      }
    }
    return all.stream().min(java.util.Comparator.comparingDouble(p -> p.at().distanceTo(near)));
  }

  private static boolean touches(Patch patch, Figure found, int ring) {
    for (Point p : patch.rim()) {
      for (int e : found.edgesWithin(Nm.of(p.x()), Nm.of(p.y()), TOUCH_MM * Nm.PER_MM)) {
        if (found.ring(e) == ring) {
          return true;
        }
      }
    }
    return false;
  }

  String what(int group) {
    return groups.group(group).what();
  }
}
