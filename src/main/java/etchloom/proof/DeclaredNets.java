package etchloom.proof;

import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.copper.CopperBuilder;
import etchloom.proof.copper.Hole;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.LayerImage;
import etchloom.proof.image.NetlistFile;
import etchloom.proof.plane.Figure;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;

/** Net names that files declare for places of the copper, held against what is joined. */
final class DeclaredNets {
  /** Where a name is said of copper's very edge: rounding. */
  private static final double BESIDE_MM = 2e-6;

  private record Declared(String net, int layer, Point at, String file, int line) {}

  private final Connectivity net;
  private final SortedMap<Integer, LayerImage> copper;
  private final Findings out;
  private final TreeMap<Integer, TreeMap<String, Declared>> namesOf = new TreeMap<>();
  private final TreeMap<String, TreeMap<Integer, Declared>> piecesOf = new TreeMap<>();

  /**
   * @param copper from L1 down, as many layers as the connectivity has
   */
  DeclaredNets(Connectivity net, SortedMap<Integer, LayerImage> copper, Findings out) {
    this.net = net;
    this.copper = copper;
    this.out = out;
  }

  void check(Optional<NetlistFile> list) {
    copper.forEach(this::drawn);
    for (int h = 0; h < net.plated().size(); h++) {
      Hole hole = net.plated().get(h);
      for (String name : hole.nets()) {
        declare(net.pieceOfHole(h), new Declared(name, 0, hole.at(), hole.file(), hole.line()));
      }
    }
    list.ifPresent(this::listed);
    namesOf.values().stream().filter(m -> m.size() > 1).forEach(this::together);
    piecesOf.values().stream().filter(m -> m.size() > 1).forEach(this::apart);
  }

  /** How many different nets the files name. */
  int names() {
    return piecesOf.size();
  }

  /** A piece of copper by the names it carries: {@code net U}, or {@code copper}. */
  String words(int piece) {
    TreeMap<String, Declared> names = namesOf.get(piece);
    return names == null ? "copper" : "net " + String.join(", ", names.keySet());
  }

  private void drawn(int layer, LayerImage image) {
    for (DrawnObject o : image.objects()) {
      if (o.dark() && o.attributes().nets().size() == 1) {
        Point at = SheetProof.place(o);
        int piece = net.pieceNear(layer, at, BESIDE_MM);
        declare(piece, new Declared(o.attributes().net(), layer, at, image.fileName(), o.line()));
      }
    }
  }

  private void listed(NetlistFile list) {
    for (NetlistFile.TestPoint t : list.points()) {
      boolean single = t.net().equals("N/C") || t.operation() == 367;
      int access = t.access().orElse(0);
      int layer = Math.min(net.layers(), Math.max(1, access));
      if (!single) {
        // Micrometres: a point on a pad of its own size is well inside.
        int piece = net.pieceNear(layer, t.at(), 0.001);
        declare(piece, new Declared(t.net(), layer, t.at(), list.fileName(), t.line()));
      }
    }
  }

  private void declare(int piece, Declared d) {
    if (piece >= 0 && !d.net().isEmpty() && !d.net().equals("N/C")) {
      namesOf.computeIfAbsent(piece, k -> new TreeMap<>()).putIfAbsent(d.net(), d);
      piecesOf.computeIfAbsent(d.net(), k -> new TreeMap<>()).putIfAbsent(piece, d);
    }
  }

  private void apart(SortedMap<Integer, Declared> places) {
    Declared a = places.get(places.firstKey());
    Declared b = places.get(places.lastKey());
    String more = places.size() > 2 ? " (" + places.size() + " pieces)" : "";
    String message =
        "net "
            + b.net()
            + " is not joined to itself"
            + more
            + ": this, and "
            + Findings.layerName(a.layer())
            + " "
            + ProofFinding.place(a.at());
    out.add(ProofNames.OPEN, b.file(), b.line(), b.layer(), b.at(), message);
  }

  private void together(SortedMap<String, Declared> places) {
    TreeSet<String> others = new TreeSet<>(places.keySet());
    String first = others.pollFirst();
    String message = "nets " + first + " and " + String.join(", ", others) + " are joined";
    for (var e : copper.entrySet()) {
      Optional<Contact> c = contact(e.getValue(), first, others);
      if (c.isPresent()) {
        String file = e.getValue().fileName();
        out.add(ProofNames.SHORT, file, c.get().line(), e.getKey(), c.get().at(), message);
        return;
      }
    }
    Declared d = places.get(others.first());
    out.add(ProofNames.SHORT, d.file(), d.line(), d.layer(), d.at(), message);
  }

  private record Contact(Point at, int line) {}

  /** An object of one of the others that touches copper drawn for the first net. */
  private static Optional<Contact> contact(
      LayerImage image, String first, SortedSet<String> others) {
    List<DrawnObject> own =
        image.objects().stream()
            .filter(o -> o.dark() && o.attributes().net().equals(first))
            .toList();
    if (own.isEmpty()) {
      return Optional.empty();
    }
    Figure f = new CopperBuilder().build(own);
    for (DrawnObject o : image.objects()) {
      if (o.dark() && others.contains(o.attributes().net())) {
        for (Sample s : samples(o)) {
          boolean touches =
              f.islandsWithin(Nm.of(s.at().x()), Nm.of(s.at().y()), s.radiusMm() * Nm.PER_MM).length
                  > 0;
          if (touches) {
            return Optional.of(new Contact(s.at(), o.line()));
          }
        }
      }
    }
    return Optional.empty();
  }

  private record Sample(Point at, double radiusMm) {}

  private static List<Sample> samples(DrawnObject o) {
    List<Sample> out = new ArrayList<>();
    o.match(
        s -> along(s.path().segments(), Math.max(0.01, s.widthMm() / 2), out),
        f -> out.add(new Sample(f.at(), radius(f.shape()))),
        r -> {
          r.contours().forEach(c -> along(c.segments(), 0.01, out));
          return true;
        });
    return out;
  }

  private static boolean along(List<Segment> pieces, double step, List<Sample> out) {
    for (Segment s : pieces) {
      int n = (int) Math.min(10_000, 1 + Math.ceil(s.lengthMm() / step));
      for (int k = 0; k <= n; k++) {
        out.add(new Sample(s.at(k / (double) n), step));
      }
    }
    return true;
  }

  private static double radius(ApertureShape shape) {
    return shape instanceof ApertureShape.Circle c
        ? c.diameterMm() / 2
        : shape instanceof ApertureShape.Rectangle r
            ? Math.min(r.widthMm(), r.heightMm()) / 2
            : shape instanceof ApertureShape.Obround b
                ? Math.min(b.widthMm(), b.heightMm()) / 2
                : 0.01;
  }
}
