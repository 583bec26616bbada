package etchloom.proof;

import etchloom.geometry.Point;
import etchloom.proof.ProofExpectation.Pad;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.LayerImage;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;

/** Holds the whole conductor, through all layers, against the design's. */
final class NetProof {
  /** A pad's flash stands where the pad does, to half of the coarsest unit in use. */
  private static final double SAME_MM = 0.0006;

  private final ProofExpectation expected;
  private final Connectivity net;
  private final Findings out;

  NetProof(ProofExpectation expected, Connectivity net, Findings out) {
    this.expected = expected;
    this.net = net;
    this.out = out;
  }

  /** Every terminal reaches exactly what it should. */
  void pieces() {
    int n = expected.pads().size();
    int[] root = new int[n];
    Arrays.setAll(root, i -> i);
    expected.tracks().forEach(t -> LayerGroups.join(root, t.from(), t.to()));
    TreeMap<Integer, TreeMap<Integer, Integer>> found = new TreeMap<>();
    TreeMap<Integer, TreeMap<Integer, Integer>> wanted = new TreeMap<>();
    for (int p = 0; p < n; p++) {
      int want = LayerGroups.find(root, p);
      for (int piece : piecesAt(expected.pads().get(p))) {
        found.computeIfAbsent(want, k -> new TreeMap<>()).putIfAbsent(piece, p);
        wanted.computeIfAbsent(piece, k -> new TreeMap<>()).putIfAbsent(want, p);
      }
    }
    // What a layer or a hole has told already is not told again.
    if (out.count(ProofNames.OPEN) == 0) {
      found.values().stream().filter(m -> m.size() > 1).forEach(this::apart);
    }
    if (out.count(ProofNames.SHORT) == 0) {
      wanted.values().stream().filter(m -> m.size() > 1).forEach(this::together);
    }
  }

  private SortedSet<Integer> piecesAt(Pad p) {
    TreeSet<Integer> out = new TreeSet<>();
    for (int l = p.fromLayer(); l <= p.toLayer(); l++) {
      int piece = net.pieceAt(l, p.at());
      if (piece >= 0) {
        out.add(piece);
      }
    }
    return out;
  }

  private void apart(Map<Integer, Integer> pads) {
    List<Integer> some = new ArrayList<>(pads.values());
    Pad a = pad(some, 0);
    Pad b = pad(some, 1);
    String message =
        "net " + a.net() + " is in " + some.size() + " pieces: " + a.what() + " | " + b.what();
    out.add(ProofNames.OPEN, "", 0, 0, b.at(), message);
  }

  private void together(Map<Integer, Integer> pads) {
    List<Integer> some = new ArrayList<>(pads.values());
    Pad a = pad(some, 0);
    Pad b = pad(some, 1);
    out.add(ProofNames.SHORT, "", 0, 0, b.at(), a.what() + " is joined to " + b.what());
  }

  private Pad pad(List<Integer> some, int i) {
    return expected.pads().get(some.get(i));
  }

  /** After all else, so that the place of what was found stands for the whole. */
  void circuits() {
    int is = net.circuits();
    if (is == expected.circuits()) {
      return;
    }
    String message =
        "the conductor closes on itself in "
            + is
            + " ways, the design in "
            + expected.circuits()
            + (is > expected.circuits() ? ": more means a short" : ": fewer means an open");
    out.add(
        new ProofFinding(
            ProofNames.CIRCUITS,
            "",
            0,
            "",
            out.firstPlace(
                ProofNames.SHORT,
                ProofNames.LOOP,
                ProofNames.OPEN,
                ProofNames.MISSING_HOLE,
                ProofNames.MOVED_HOLE,
                ProofNames.EXTRA_HOLE),
            message));
  }

  /** Each terminal's pad carries its mark, and no other place does. */
  void terminals(Iterable<LayerImage> copper) {
    TreeSet<Integer> marked = new TreeSet<>();
    List<Integer> terminals = new ArrayList<>();
    for (int p = 0; p < expected.pads().size(); p++) {
      if (expected.pads().get(p).terminal()) {
        terminals.add(p);
      }
    }
    for (LayerImage image : copper) {
      for (DrawnObject o : image.objects()) {
        Attributes a = o.attributes();
        if (!a.pin().isEmpty() && o instanceof DrawnObject.Flash f) {
          mark(image, f, a.pin(), terminals, marked);
        }
      }
    }
    for (int p : terminals) {
      if (!marked.contains(p)) {
        Pad t = expected.pads().get(p);
        String message = "no pad here carries the mark " + t.mark();
        out.add(ProofNames.TERMINAL, "", 0, t.fromLayer(), t.at(), message);
      }
    }
  }

  private void mark(
      LayerImage image,
      DrawnObject.Flash f,
      String pin,
      List<Integer> some,
      SortedSet<Integer> marked) {
    Point at = f.at();
    for (int p : some) {
      Pad t = expected.pads().get(p);
      if (t.at().distanceTo(at) <= SAME_MM) {
        if (t.mark().equals(pin)) {
          marked.add(p);
        } else {
          String message = "the pad of " + t.mark() + " carries the mark " + pin;
          out.add(ProofNames.TERMINAL, image.fileName(), f.line(), 0, at, message);
        }
        return;
      }
    }
    String message = "there is no terminal here, but the pad carries the mark " + pin;
    out.add(ProofNames.TERMINAL, image.fileName(), f.line(), 0, at, message);
  }
}
