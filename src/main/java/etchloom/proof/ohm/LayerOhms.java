package etchloom.proof.ohm;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.copper.CopperBuilder;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.LayerImage;
import etchloom.proof.plane.Figure;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * The copper of one layer as resistors: pieces drawn in dark round strokes and discs alone along
 * their centre lines, all others as sheets.
 */
final class LayerOhms {
  private static final double NM = 1e6;

  private final OhmNetwork net;
  private final LayerImage image;
  private final Figure copper;
  private final CopperBuild.Layer build;
  private final CentreLines lines;
  private final TreeSet<Integer> sheets = new TreeSet<>();
  private final List<Contact> contacts = new ArrayList<>();

  private record Contact(Point at, double diameterMm, int node) {}

  LayerOhms(OhmNetwork net, LayerImage image, Figure copper, CopperBuild.Layer build) {
    this.net = net;
    this.image = image;
    this.copper = copper;
    this.build = build;
    this.lines = new CentreLines(net, build);
    findSheets();
    for (DrawnObject o : image.objects()) {
      if (o.dark() && stroked(o) && !sheets.contains(island(place(o)))) {
        lay(o);
      }
    }
  }

  private static boolean stroked(DrawnObject o) {
    return o.match(
        s -> s.pen() instanceof ApertureShape.Circle,
        f -> f.shape() instanceof ApertureShape.Circle c && c.holeDiameterMm() == 0,
        r -> false);
  }

  private static Point place(DrawnObject o) {
    return o.match(s -> s.path().start(), f -> f.at(), r -> r.contours().get(0).start());
  }

  private int island(Point p) {
    int[] near = copper.islandsWithin((int) Math.rint(p.x() * NM), (int) Math.rint(p.y() * NM), 2);
    return near.length == 0 ? -1 : near[0];
  }

  /** What a clear object has cut is not told by the strokes any more, wherever it lies. */
  private void findSheets() {
    for (DrawnObject o : image.objects()) {
      if (!o.dark()) {
        for (int i = 0; i < copper.islands(); i++) {
          sheets.add(i);
        }
      } else if (!stroked(o)) {
        sheets.add(island(place(o)));
      }
    }
  }

  private void lay(DrawnObject o) {
    if (o instanceof DrawnObject.Stroke s) {
      lines.stroke(s.path(), s.widthMm());
    } else if (o instanceof DrawnObject.Flash f && f.shape() instanceof ApertureShape.Circle c) {
      lines.disc(f.at(), c.diameterMm());
    }
  }

  /** A place of one potential: a hole's wall, or a terminal's pad; gives its node. */
  int contact(Point at, double diameterMm) {
    int[] near =
        copper.islandsWithin(
            (int) Math.rint(at.x() * NM), (int) Math.rint(at.y() * NM), diameterMm / 2 * NM);
    boolean sheet = false;
    for (int i : near) {
      sheet |= sheets.contains(i);
    }
    if (!sheet) {
      return lines.disc(at, diameterMm);
    }
    for (Contact c : contacts) {
      if (c.at().distanceTo(at) <= c.diameterMm() / 2) {
        return c.node();
      }
    }
    int node = net.node();
    contacts.add(new Contact(at, diameterMm > 0 ? diameterMm : padMm(at), node));
    return node;
  }

  /** The disc that fits into the pad at a place. */
  private double padMm(Point at) {
    double best = 0;
    for (DrawnObject o : image.objects()) {
      if (o instanceof DrawnObject.Flash f && f.at().distanceTo(at) < 1e-3) {
        best = Math.max(best, inner(f.shape()));
      }
    }
    return best;
  }

  private static double inner(ApertureShape shape) {
    return shape instanceof ApertureShape.Circle c
        ? c.diameterMm()
        : shape instanceof ApertureShape.Rectangle r
            ? Math.min(r.widthMm(), r.heightMm())
            : shape instanceof ApertureShape.Obround b ? Math.min(b.widthMm(), b.heightMm()) : 0;
  }

  /** Adds all resistors; gives the share by which the sheets' may be off. */
  double connect() {
    lines.connect();
    if (contacts.isEmpty()) {
      return 0;
    }
    Figure etched = etched();
    Map<Integer, List<Contact>> of = new TreeMap<>();
    for (Contact c : contacts) {
      int[] near =
          etched.islandsWithin(
              (int) Math.rint(c.at().x() * NM),
              (int) Math.rint(c.at().y() * NM),
              c.diameterMm() / 2 * NM);
      for (int i : near) {
        of.computeIfAbsent(i, k -> new ArrayList<>()).add(c);
      }
    }
    double error = 0;
    for (Map.Entry<Integer, List<Contact>> e : of.entrySet()) {
      if (e.getValue().size() > 1) {
        error = Math.max(error, sheet(etched, e.getKey(), e.getValue()));
      }
    }
    return error;
  }

  private double sheet(Figure etched, int island, List<Contact> on) {
    SheetIsland.Solution s =
        SheetIsland.solve(
            etched,
            island,
            on.stream().map(c -> new SheetIsland.Contact(c.at(), c.diameterMm() / 2)).toList());
    double ohmPerSquare = FileResistance.RESISTIVITY_OHM_MM / build.thicknessMm();
    for (int i = 0; i < on.size(); i++) {
      for (int j = 0; j < i; j++) {
        double squares = (s.squares()[i][j] + s.squares()[j][i]) / 2;
        if (squares > 0) {
          net.resistor(on.get(i).node(), on.get(j).node(), ohmPerSquare / squares);
        }
      }
    }
    return s.error();
  }

  /** The copper at half its height: half an undercut narrower on every side. */
  private Figure etched() {
    if (!(build.undercutMm() > 0)) {
      return copper;
    }
    List<DrawnObject> objects = new ArrayList<>(image.objects());
    ApertureShape pen = new ApertureShape.Circle(build.undercutMm(), 0);
    for (int r = 0; r < copper.rings(); r++) {
      if (sheets.contains(copper.island(r))) {
        List<Segment> rim = new ArrayList<>();
        int e = copper.firstEdge(r);
        do {
          rim.add(
              new Line(
                  new Point(copper.fromX(e) / NM, copper.fromY(e) / NM),
                  new Point(copper.toX(e) / NM, copper.toY(e) / NM)));
          e = copper.next(e);
        } while (e != copper.firstEdge(r));
        objects.add(new DrawnObject.Stroke(new Path(rim), pen, false, Attributes.NONE, 0));
      }
    }
    return new CopperBuilder().build(objects);
  }
}
