package etchloom.proof;

import etchloom.geometry.Point;
import etchloom.proof.ProofExpectation.Pad;
import etchloom.proof.ProofExpectation.Stroke;
import etchloom.proof.ProofExpectation.Track;
import etchloom.proof.copper.DrawnPiece;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.TreeMap;
import java.util.TreeSet;

/** The pads of one layer that tracks of the layer join: what each of its islands must hold. */
final class LayerGroups {
  final int layer;
  private final ProofExpectation expected;
  private final List<Track> tracks;
  private final List<Group> groups = new ArrayList<>();
  private final int[] groupOf;

  /**
   * @param pads numbers of pads
   */
  record Group(String net, List<Integer> pads, List<Track> tracks, String what) {}

  LayerGroups(ProofExpectation expected, int layer) {
    this.expected = expected;
    this.layer = layer;
    this.tracks = expected.tracks().stream().filter(t -> t.layer() == layer).toList();
    int n = expected.pads().size();
    int[] root = new int[n];
    Arrays.setAll(root, i -> i);
    for (Track t : tracks) {
      join(root, t.from(), t.to());
    }
    TreeMap<Integer, List<Integer>> members = new TreeMap<>();
    for (int p = 0; p < n; p++) {
      if (expected.pads().get(p).on(layer)) {
        members.computeIfAbsent(find(root, p), k -> new ArrayList<>()).add(p);
      }
    }
    TreeMap<Integer, List<Track>> joined = new TreeMap<>();
    for (Track t : tracks) {
      joined.computeIfAbsent(find(root, t.from()), k -> new ArrayList<>()).add(t);
    }
    groupOf = new int[n];
    Arrays.fill(groupOf, -1);
    members.forEach((r, pads) -> add(pads, joined.getOrDefault(r, List.of())));
  }

  private void add(List<Integer> pads, List<Track> some) {
    TreeSet<String> words = new TreeSet<>();
    some.forEach(t -> words.add(t.what()));
    pads.stream()
        .map(p -> expected.pads().get(p))
        .filter(Pad::terminal)
        .forEach(p -> words.add(p.what()));
    if (words.isEmpty()) {
      pads.forEach(p -> words.add(expected.pads().get(p).what()));
    }
    List<String> list = new ArrayList<>(words);
    String what =
        list.size() <= 3
            ? String.join("; ", list)
            : String.join("; ", list.subList(0, 2)) + " and " + (list.size() - 2) + " more";
    for (int p : pads) {
      groupOf[p] = groups.size();
    }
    groups.add(new Group(expected.pads().get(pads.get(0)).net(), pads, some, what));
  }

  static int find(int[] root, int v) {
    int r = v;
    while (root[r] != r) {
      root[r] = root[root[r]];
      r = root[r];
    }
    return r;
  }

  static void join(int[] root, int a, int b) {
    int x = find(root, a);
    int y = find(root, b);
    root[Math.max(x, y)] = Math.min(x, y);
  }

  List<Group> groups() {
    return groups;
  }

  Group group(int g) {
    return groups.get(g);
  }

  Pad pad(int p) {
    return expected.pads().get(p);
  }

  /** The group of a pad, or -1 when it is not on this layer. */
  int groupOf(int pad) {
    return groupOf[pad];
  }

  /** The layer's copper as the design has it; pieces are known by their group. */
  List<DrawnPiece> pieces() {
    List<DrawnPiece> out = new ArrayList<>();
    for (int g = 0; g < groups.size(); g++) {
      for (Track t : groups.get(g).tracks()) {
        for (Stroke s : t.strokes()) {
          DrawnPiece.add(s.path(), s.widthMm(), g, out);
        }
      }
      for (int p : groups.get(g).pads()) {
        if (pad(p).diameterMm() > 0) {
          out.add(DrawnPiece.disc(pad(p).at(), pad(p).diameterMm(), g));
        }
      }
    }
    return out;
  }

  /** The same, to be rebuilt. */
  List<DrawnObject> objects() {
    List<DrawnObject> out = new ArrayList<>();
    for (Track t : tracks) {
      for (Stroke s : t.strokes()) {
        ApertureShape pen = new ApertureShape.Circle(s.widthMm(), 0);
        out.add(new DrawnObject.Stroke(s.path(), pen, true, Attributes.NONE, 0));
      }
    }
    for (Group g : groups) {
      for (int p : g.pads()) {
        Point at = pad(p).at();
        if (pad(p).diameterMm() > 0) {
          ApertureShape shape = new ApertureShape.Circle(pad(p).diameterMm(), 0);
          out.add(new DrawnObject.Flash(at, shape, 0, true, Attributes.NONE, 0));
        }
      }
    }
    return out;
  }
}
