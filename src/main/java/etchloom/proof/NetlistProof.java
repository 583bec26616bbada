package etchloom.proof;

import etchloom.geometry.Distance;
import etchloom.geometry.Path;
import etchloom.geometry.Segment;
import etchloom.proof.ProofExpectation.Pad;
import etchloom.proof.image.NetlistFile;
import etchloom.proof.image.NetlistFile.TestPoint;
import etchloom.proof.image.Plating;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/** Holds a bare-board netlist against the design: every test point, and a point at every hole. */
final class NetlistProof {
  /** Micrometres in the file, rounded. */
  private static final double SAME_MM = 0.00072;

  /** Chords stand in for arcs, which the format does not have. */
  private static final double CHORD_MM = 0.01;

  private static final double LENGTH = 1e-3;

  private final NetlistFile file;
  private final Findings out;

  NetlistProof(NetlistFile file, Findings out) {
    this.file = file;
    this.out = out;
  }

  private record Place(etchloom.geometry.Point at, Pad pad) {}

  void check(ProofExpectation expected) {
    List<Place> places = new ArrayList<>();
    for (Pad p : expected.pads()) {
      if (p.holeMm().isPresent() || p.terminal()) {
        places.add(new Place(p.at(), p));
      }
    }
    places.sort(Comparator.comparingDouble(p -> p.at().x()));
    boolean[] tested = new boolean[places.size()];
    for (TestPoint t : file.points()) {
      int k = find(places, t);
      if (k >= 0) {
        tested[k] = true;
        compare(places.get(k).pad(), t);
      } else if (t.operation() != 367) {
        wrong(t, "there is no pad of the design here");
      }
    }
    for (int k = 0; k < tested.length; k++) {
      if (!tested[k]) {
        Pad p = places.get(k).pad();
        out.add(ProofNames.NETLIST, file.fileName(), 0, 0, p.at(), p.what() + " has no test point");
      }
    }
    outline(expected.profile());
    long tooling = file.points().stream().filter(t -> t.operation() == 367).count();
    if (tooling != expected.nonPlated().size()) {
      String message =
          tooling + " non-plated holes are listed, the design has " + expected.nonPlated().size();
      out.add(ProofNames.NETLIST, file.fileName(), message);
    }
  }

  private static int find(List<Place> places, TestPoint t) {
    int lo = 0;
    int hi = places.size();
    while (lo < hi) {
      int mid = (lo + hi) >>> 1;
      if (places.get(mid).at().x() < t.at().x() - SAME_MM) {
        lo = mid + 1;
      } else {
        hi = mid;
      }
    }
    for (int k = lo; k < places.size() && places.get(k).at().x() <= t.at().x() + SAME_MM; k++) {
      if (places.get(k).at().distanceTo(t.at()) <= SAME_MM) {
        return k;
      }
    }
    return -1;
  }

  private void compare(Pad p, TestPoint t) {
    if (!t.net().equals(p.net())) {
      wrong(t, p.what() + " carries net " + t.net() + ", not " + p.net());
    }
    if (p.terminal() && !t.pin().equals(p.mark())) {
      wrong(t, p.what() + " is called pin " + t.pin());
    }
    if (!p.terminal() && !t.pin().isEmpty()) {
      wrong(t, p.what() + " is called pin " + t.pin() + ", it is none");
    }
    if (p.holeMm().isPresent() != (t.operation() == 317)
        || t.access().orElse(-1) != (p.holeMm().isPresent() ? 0 : 1)) {
      wrong(t, p.what() + " is listed as another kind of point");
    }
    if (p.holeMm().isPresent() != t.holeMm().isPresent()) {
      wrong(
          t, p.what() + (t.holeMm().isPresent() ? " has no hole" : " has a hole, none is listed"));
    } else if (p.holeMm().isPresent()) {
      double is = t.holeMm().getAsDouble();
      if (Math.abs(is - p.holeMm().getAsDouble()) > SAME_MM) {
        wrong(t, p.what() + ": hole of " + SheetProof.mm(is) + " listed");
      }
      if (t.plating() != Plating.PLATED) {
        wrong(t, p.what() + ": the hole is plated, the list does not say so");
      }
    }
    if (t.widthMm() > 0 && Math.abs(t.widthMm() - p.diameterMm()) > SAME_MM) {
      wrong(t, p.what() + ": pad of " + SheetProof.mm(t.widthMm()) + " listed");
    }
  }

  /** Chords of the board's edge, which leave it by no more than the format's usage bears. */
  private void outline(List<Path> profile) {
    double wanted = profile.stream().mapToDouble(Path::lengthMm).sum();
    double found = 0;
    for (NetlistFile.NetLine line : file.lines()) {
      if (line.operation() == 389) {
        for (Path p : line.paths()) {
          found += p.lengthMm();
          edge(p, line.line(), profile);
        }
      }
    }
    if (Math.abs(found - wanted) > LENGTH * wanted) {
      String message =
          String.format(
              Locale.ROOT, "the board's edge is %.3f mm long here, it is %.3f mm", found, wanted);
      out.add(ProofNames.NETLIST, file.fileName(), message);
    }
  }

  private void edge(Path p, int line, List<Path> profile) {
    for (Segment s : p.segments()) {
      for (double t : new double[] {0, 0.5, 1}) {
        double off = Double.POSITIVE_INFINITY;
        for (Path edge : profile) {
          for (Segment e : edge.segments()) {
            off = Math.min(off, Distance.between(s.at(t), e).distanceMm());
          }
        }
        if (off > (t == 0.5 ? CHORD_MM : SAME_MM)) {
          String message = "the board's edge is " + SheetProof.mm(off) + " from here";
          out.add(ProofNames.NETLIST, file.fileName(), line, 0, s.at(t), message);
        }
      }
    }
  }

  private void wrong(TestPoint t, String message) {
    out.add(ProofNames.NETLIST, file.fileName(), t.line(), 0, t.at(), message);
  }
}
