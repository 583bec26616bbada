package etchloom.proof.copper;

import etchloom.geometry.Point;
import etchloom.proof.plane.Figure;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * What hangs together: the islands of every layer, joined through plated holes.
 *
 * <p>A plated hole joins every island that its finished circle touches on the layers it passes.
 */
public final class Connectivity {
  /**
   * An enclosed gap no larger is no gap: it is 3 µm square, no process etches it, and rounding to
   * the nanometre leaves some like it where tracks touch in a tangent. A short between turns
   * encloses a gap at least as wide as the space and as long as the way round to it.
   */
  private static final double SLIVER_MM2 = 1e-5;

  private final List<Figure> layers;
  private final List<Hole> plated;
  private final int[] offset;

  /** Union-find over islands, then plated holes. */
  private final int[] group;

  private final List<int[]> contacts = new ArrayList<>();
  private int contactCount;
  private final List<Loop> loops = new ArrayList<>();
  private final int pieces;

  /**
   * A hole in the copper of one island.
   *
   * @param layer from 1
   * @param ring its number in the layer's figure
   * @param areaMm2 of the hole
   * @param at where the copper that closes it most likely is
   */
  public record Loop(int layer, int island, int ring, double areaMm2, Point at) {}

  /**
   * @param layers the copper from L1 down
   */
  public Connectivity(List<Figure> layers, List<Hole> holes) {
    this.layers = List.copyOf(layers);
    this.plated = holes.stream().filter(Hole::plated).toList();
    offset = new int[layers.size() + 1];
    for (int l = 0; l < layers.size(); l++) {
      offset[l + 1] = offset[l] + layers.get(l).islands();
    }
    group = new int[offset[layers.size()] + plated.size()];
    Arrays.setAll(group, i -> i);
    for (int h = 0; h < plated.size(); h++) {
      join(h);
    }
    findLoops();
    int roots = 0;
    for (int i = 0; i < group.length; i++) {
      roots += find(i) == i ? 1 : 0;
    }
    pieces = roots;
  }

  private void join(int h) {
    Hole hole = plated.get(h);
    int node = offset[layers.size()] + h;
    List<Integer> touched = new ArrayList<>();
    for (int l = 1; l <= layers.size(); l++) {
      if (hole.through(l)) {
        for (int island : islandsTouched(hole, layers.get(l - 1))) {
          touched.add(offset[l - 1] + island);
        }
      }
    }
    for (int t : touched) {
      int a = find(node);
      int b = find(t);
      group[Math.max(a, b)] = Math.min(a, b);
    }
    contactCount += touched.size();
    contacts.add(touched.stream().mapToInt(i -> i).toArray());
  }

  /** The islands of a layer that a hole's finished circle touches. */
  public int[] islandsTouched(Hole hole, int layer) {
    return islandsTouched(hole, layers.get(layer - 1));
  }

  private static int[] islandsTouched(Hole hole, Figure f) {
    double r = hole.diameterMm() / 2 * RingPen.NM;
    if (hole.slot().isEmpty()) {
      return f.islandsWithin(Place.nm(hole.at().x()), Place.nm(hole.at().y()), r);
    }
    return hole.samples().stream()
        .flatMapToInt(p -> Arrays.stream(f.islandsWithin(Place.nm(p.x()), Place.nm(p.y()), r)))
        .distinct()
        .sorted()
        .toArray();
  }

  private void findLoops() {
    DrilledAway drilled = new DrilledAway(plated);
    for (int l = 1; l <= layers.size(); l++) {
      Figure f = layers.get(l - 1);
      for (int r = 0; r < f.rings(); r++) {
        if (f.hole(r) && -f.ringAreaMm2(r) > SLIVER_MM2 && !drilled.covers(f, r, l)) {
          loops.add(new Loop(l, f.island(r), r, -f.ringAreaMm2(r), Fold.place(f, r)));
        }
      }
    }
  }

  private int find(int v) {
    int r = v;
    while (group[r] != r) {
      group[r] = group[group[r]];
      r = group[r];
    }
    return r;
  }

  public int layers() {
    return layers.size();
  }

  public Figure copper(int layer) {
    return layers.get(layer - 1);
  }

  public List<Hole> plated() {
    return plated;
  }

  public List<Loop> loops() {
    return List.copyOf(loops);
  }

  public int loopsOn(int layer) {
    return (int) loops.stream().filter(l -> l.layer() == layer).count();
  }

  /**
   * Independent closed circuits of the whole conductor: those of the graph of islands and plated
   * holes, and one for every hole in an island.
   */
  public int circuits() {
    return contactCount - group.length + pieces + loops.size();
  }

  /** The piece of copper that an island belongs to, the same number for all that is joined. */
  public int piece(int layer, int island) {
    return find(offset[layer - 1] + island);
  }

  /** The piece at a point of a layer, or -1. */
  public int pieceAt(int layer, Point p) {
    int island = islandAt(layer, p);
    return island < 0 ? -1 : piece(layer, island);
  }

  /** The piece at a point of a layer or at most a little beside it, or -1. */
  public int pieceNear(int layer, Point p, double withinMm) {
    Figure f = layers.get(layer - 1);
    int[] some = f.islandsWithin(Place.nm(p.x()), Place.nm(p.y()), withinMm * RingPen.NM);
    return some.length == 0 ? -1 : piece(layer, some[0]);
  }

  /** The piece of a plated hole by its number in {@link #plated}. */
  public int pieceOfHole(int hole) {
    return find(offset[layers.size()] + hole);
  }

  public int islandAt(int layer, Point p) {
    return layers.get(layer - 1).islandAt(Place.nm(p.x()), Place.nm(p.y()));
  }

  /** Pieces of copper, each with all that is joined to it. */
  public int pieces() {
    boolean[] seen = new boolean[group.length];
    int n = 0;
    for (int i = 0; i < offset[layers.size()]; i++) {
      int root = find(i);
      n += seen[root] ? 0 : 1;
      seen[root] = true;
    }
    return n;
  }

  /** Whether a plated hole touches any copper at all on a layer. */
  public boolean touches(int hole, int layer) {
    for (int t : contacts.get(hole)) {
      if (t >= offset[layer - 1] && t < offset[layer]) {
        return true;
      }
    }
    return false;
  }

  /** A point of the copper of an island: on its rim. */
  public Point somePoint(int layer, int island) {
    Figure f = layers.get(layer - 1);
    for (int r = 0; r < f.rings(); r++) {
      if (f.island(r) == island) {
        int e = f.firstEdge(r);
        return Place.mm(f.fromX(e), f.fromY(e));
      }
    }
    throw new IllegalArgumentException("no island " + island + " on L" + layer);
  }
}
