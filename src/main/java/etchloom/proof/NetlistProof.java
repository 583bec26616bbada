package etchloom.proof;

import etchloom.proof.ProofExpectation.Pad;
import etchloom.proof.image.NetlistFile;
import etchloom.proof.image.NetlistFile.TestPoint;
import etchloom.proof.image.Plating;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Holds a bare-board netlist against the design: every test point, and a point at every hole. */
final class NetlistProof {
  /** Micrometres in the file, rounded. */
  private static final double SAME_MM = 0.00072;

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

  private void wrong(TestPoint t, String message) {
    out.add(ProofNames.NETLIST, file.fileName(), t.line(), 0, t.at(), message);
  }
}
