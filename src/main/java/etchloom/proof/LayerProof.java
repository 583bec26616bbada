package etchloom.proof;

import etchloom.geometry.Distance;
import etchloom.geometry.Nearest;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.LayerGroups.Group;
import etchloom.proof.ProofExpectation.Pad;
import etchloom.proof.ProofExpectation.Track;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.copper.CopperDifference.Patch;
import etchloom.proof.copper.DrawnPiece;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.LayerImage;
import etchloom.proof.plane.Figure;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;

/** Holds one layer of copper against the design: what its islands hold, and where it differs. */
final class LayerProof {
  private final LayerGroups groups;
  private final LayerImage image;
  private final Figure copper;
  private final Connectivity net;
  private final Findings out;

  /** The islands on which each group's pads stand. */
  private final List<TreeSet<Integer>> islandsOf = new ArrayList<>();

  /** The groups whose pads stand on each island. */
  private final TreeMap<Integer, TreeSet<Integer>> groupsOn = new TreeMap<>();

  private Optional<LayerChanges> changes = Optional.empty();

  LayerProof(LayerGroups groups, LayerImage image, Connectivity net, Findings out) {
    this.groups = groups;
    this.image = image;
    this.net = net;
    this.copper = net.copper(groups.layer);
    this.out = out;
  }

  /**
   * @param same whether the file is known to draw just the design's pieces; where not, the two are
   *     laid over each other
   */
  void check(boolean same) {
    if (!same) {
      changes = Optional.of(new LayerChanges(groups, copper));
      changes.get().patches().forEach(this::patch);
    }
    sort();
    shorts();
    opens();
    strays();
    loops();
  }

  private void patch(Patch p) {
    SortedSet<Integer> touched = changes.orElseThrow().touched(p);
    String where = touched.isEmpty() ? "" : " at " + words(touched);
    String size = String.format(Locale.ROOT, "%.4f mm2", p.areaMm2());
    if (p.extra()) {
      add(ProofNames.EXTRA_COPPER, p.at(), size + " more than designed" + where);
    } else {
      add(ProofNames.MISSING_COPPER, p.at(), size + " of the design is not there" + where);
    }
  }

  private void sort() {
    for (int g = 0; g < groups.groups().size(); g++) {
      TreeSet<Integer> islands = new TreeSet<>();
      for (int p : groups.group(g).pads()) {
        int i = island(groups.pad(p));
        if (i >= 0) {
          islands.add(i);
          groupsOn.computeIfAbsent(i, k -> new TreeSet<>()).add(g);
        }
      }
      islandsOf.add(islands);
    }
  }

  private int island(Pad p) {
    int x = Nm.of(p.at().x());
    int y = Nm.of(p.at().y());
    int here = copper.islandAt(x, y);
    if (here >= 0 || p.diameterMm() == 0) {
      return here;
    }
    int[] near = copper.islandsWithin(x, y, p.diameterMm() / 2 * Nm.PER_MM);
    return near.length == 0 ? -1 : near[0];
  }

  private void shorts() {
    TreeSet<Integer> told = new TreeSet<>();
    if (changes.isPresent()) {
      for (Patch p : changes.get().patches()) {
        SortedSet<Integer> touched = p.extra() ? changes.get().touched(p) : new TreeSet<>();
        if (touched.size() > 1) {
          add(ProofNames.SHORT, p.at(), "this joins " + words(touched));
          told.addAll(touched);
        }
      }
    }
    for (SortedSet<Integer> on : groupsOn.values()) {
      if (on.size() > 1 && !told.containsAll(on)) {
        add(ProofNames.SHORT, closest(on), "one piece of copper joins " + words(on));
      }
    }
  }

  /** Where the design's copper of two groups comes nearest. */
  private Point closest(SortedSet<Integer> some) {
    List<DrawnPiece> mine = groups.pieces().stream().filter(p -> some.contains(p.tag())).toList();
    Nearest best = null;
    double least = Double.POSITIVE_INFINITY;
    for (DrawnPiece a : mine) {
      for (DrawnPiece b : mine) {
        if (a.tag() < b.tag()) {
          Nearest n = Distance.between(a.shape(), b.shape());
          double gap = n.distanceMm() - (a.widthMm() + b.widthMm()) / 2;
          if (gap < least) {
            least = gap;
            best = n;
          }
        }
      }
    }
    return best == null ? groups.pad(groups.group(some.first()).pads().get(0)).at() : best.middle();
  }

  private void opens() {
    for (int g = 0; g < groups.groups().size(); g++) {
      Group group = groups.group(g);
      for (int p : group.pads()) {
        if (island(groups.pad(p)) < 0) {
          String message = "no copper at " + groups.pad(p).what();
          add(ProofNames.OPEN, groups.pad(p).at(), message);
        }
      }
      if (islandsOf.get(g).size() > 1) {
        List<Point> cuts = cuts(group);
        Point first = groups.pad(group.pads().get(0)).at();
        for (Point at : cuts.isEmpty() ? List.of(first) : cuts) {
          add(ProofNames.OPEN, at, group.what() + " is in " + islandsOf.get(g).size() + " pieces");
        }
      }
    }
  }

  /** The middles of the stretches between one island and another along the group's tracks. */
  private List<Point> cuts(Group group) {
    List<Point> found = new ArrayList<>();
    for (Track t : group.tracks()) {
      int last = -1;
      List<Point> bare = new ArrayList<>();
      for (Segment s : t.strokes().stream().flatMap(x -> x.path().segments().stream()).toList()) {
        double width = t.strokes().get(0).widthMm();
        int n = (int) Math.min(100_000, 1 + Math.ceil(4 * s.lengthMm() / width));
        for (int k = 0; k <= n; k++) {
          Point at = s.at(k / (double) n);
          int here = copper.islandAt(Nm.of(at.x()), Nm.of(at.y()));
          if (here >= 0 && last >= 0 && here != last) {
            found.add(bare.isEmpty() ? at : bare.get(bare.size() / 2));
          }
          if (here >= 0) {
            last = here;
            bare.clear();
          } else {
            bare.add(at);
          }
        }
      }
    }
    return found;
  }

  private void strays() {
    for (int i = 0; i < copper.islands(); i++) {
      if (!groupsOn.containsKey(i)) {
        add(
            ProofNames.STRAY_COPPER,
            net.somePoint(groups.layer, i),
            "a piece of copper without any pad");
      }
    }
  }

  private void loops() {
    for (Connectivity.Loop loop : net.loops()) {
      if (loop.layer() == groups.layer) {
        Point at =
            changes
                .flatMap(c -> c.closing(copper, loop.ring(), loop.at()))
                .map(Patch::at)
                .orElse(loop.at());
        SortedSet<Integer> on = groupsOn.getOrDefault(loop.island(), new TreeSet<>());
        String size = String.format(Locale.ROOT, "%.3f mm2", loop.areaMm2());
        add(ProofNames.LOOP, at, "copper encloses a gap of " + size + ": " + words(on));
      }
    }
  }

  /** Whether tracks are called tracks, and pads what they are for. */
  void functions() {
    TreeSet<Point> terminals = new TreeSet<>(BY_PLACE);
    for (Group g : groups.groups()) {
      g.pads().stream().map(groups::pad).filter(Pad::terminal).forEach(p -> terminals.add(p.at()));
    }
    for (DrawnObject o : image.objects()) {
      List<String> wanted =
          !(o instanceof DrawnObject.Flash f)
              ? List.of("Conductor")
              : terminals.contains(f.at())
                  ? List.of("ComponentPad", "SMDPad")
                  : List.of("ViaPad", "Conductor");
      if (!wanted.contains(o.attributes().function())) {
        String is = o.attributes().function().isEmpty() ? "nothing" : o.attributes().function();
        out.add(
            ProofNames.FUNCTION,
            image.fileName(),
            o.line(),
            groups.layer,
            SheetProof.place(o),
            "this is called " + is + ", it is " + String.join(" or ", wanted));
      }
    }
  }

  private static final Comparator<Point> BY_PLACE =
      Comparator.comparingDouble(Point::x).thenComparingDouble(Point::y);

  /** Whether a piece of the copper carries another net's name than the design's. */
  void nets() {
    for (DrawnObject o : image.objects()) {
      List<String> names = o.attributes().nets();
      Point at = SheetProof.place(o);
      TreeSet<String> wanted = new TreeSet<>();
      for (int i : copper.islandsWithin(Nm.of(at.x()), Nm.of(at.y()), 2)) {
        groupsOn.getOrDefault(i, new TreeSet<>()).forEach(g -> wanted.add(groups.group(g).net()));
      }
      if (!wanted.isEmpty() && (names.isEmpty() || !wanted.containsAll(names))) {
        out.add(
            ProofNames.NET_NAME,
            image.fileName(),
            o.line(),
            groups.layer,
            at,
            (names.isEmpty() ? "no net" : "net '" + String.join(", ", names) + "'")
                + " is said of copper of net "
                + String.join(", ", wanted));
      }
    }
  }

  private String words(SortedSet<Integer> some) {
    List<String> list = some.stream().limit(3).map(g -> groups.group(g).what()).toList();
    String more = some.size() > 3 ? " and " + (some.size() - 3) + " more" : "";
    return String.join(" | ", list) + more;
  }

  private void add(String name, Point at, String message) {
    out.add(name, image.fileName(), 0, groups.layer, at, message);
  }
}
