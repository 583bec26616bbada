package etchloom.proof;

import etchloom.geometry.Arc;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.copper.CopperDifference.Patch;
import etchloom.proof.copper.DrawnPiece;
import etchloom.proof.copper.Hole;
import etchloom.proof.copper.OutlineMatch;
import etchloom.proof.copper.PieceMatch;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.DxfFile;
import etchloom.proof.image.LayerImage;
import etchloom.proof.image.SvgFile;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.IntStream;

/** Holds the drawings, DXF and SVG, against the Gerber and drill files. */
final class PictureProof {
  /** The picture is rounded to micrometres, which moves the middle of a half circle by ten. */
  private static final PieceMatch.Tolerance PICTURE = new PieceMatch.Tolerance(0.0015, 0.02);

  private static final String PROFILE = "PROFILE";

  private final SetFiles set;
  private final List<Hole> holes;
  private final Findings out;

  /** What the Gerber and drill files draw, by the drawing's names of layers. */
  private final Map<String, List<DrawnPiece>> drawn;

  PictureProof(SetFiles set, List<Hole> holes, Findings out) {
    this.set = set;
    this.holes = holes;
    this.out = out;
    drawn = drawn();
  }

  /** Centre lines, pads, holes and sheets of the drawing. */
  void drawing(DxfFile dxf) {
    Map<String, List<DrawnPiece>> byLayer = new LinkedHashMap<>();
    drawn.keySet().forEach(k -> byLayer.put(k, new ArrayList<>()));
    for (DxfFile.Entity x : dxf.entities()) {
      List<DrawnPiece> found = byLayer.get(x.layer());
      if (found == null) {
        String message =
            "something is drawn on a layer " + x.layer() + ", which is none of the set";
        out.add(
            new ProofFinding(
                ProofNames.DXF, dxf.fileName(), x.line(), "", Optional.empty(), message));
      } else if (x instanceof DxfFile.Polyline p) {
        boolean edge = x.layer().equals(PROFILE);
        DrawnPiece.add(p.path(), edge ? 0 : p.widthMm(), p.line(), found);
      } else if (x instanceof DxfFile.Circle c) {
        found.add(DrawnPiece.disc(c.centre(), 2 * c.radiusMm(), c.line()));
      }
    }
    each(
        layer ->
            compare(
                ProofNames.DXF,
                dxf.fileName(),
                layer,
                byLayer.get(layer),
                drawn.get(layer),
                PieceMatch.Tolerance.GRID));
  }

  /** The layers of the picture; the board itself is an area there, and is judged by its edge. */
  void picture(SvgFile svg) {
    each(
        layer ->
            compare(
                ProofNames.SVG,
                svg.fileName(),
                layer,
                pictured(svg, layer),
                drawn.get(layer),
                PICTURE));
  }

  private List<DrawnPiece> pictured(SvgFile svg, String layer) {
    boolean edge = layer.equals(PROFILE);
    String id = layer.toLowerCase(Locale.ROOT).replace('_', '-').replace("copper-l", "copper-L");
    List<DrawnPiece> found = new ArrayList<>();
    for (DrawnObject o : svg.objects(id)) {
      o.match(
          s -> add(s, found),
          f -> false,
          r -> {
            r.contours().forEach(c -> area(c, edge, r.line(), found));
            return true;
          });
    }
    if (edge) {
      // The board is one area here, and the cuts that lead to its holes are no edges.
      found.retainAll(matched(found, drawn.get(layer)));
    }
    return found;
  }

  /** Judges the layers side by side; what is found comes in their order. */
  private void each(Function<String, List<ProofFinding>> judge) {
    drawn.keySet().stream().toList().parallelStream()
        .map(judge)
        .forEachOrdered(found -> found.forEach(out::add));
  }

  private static List<DrawnPiece> matched(List<DrawnPiece> some, List<DrawnPiece> wanted) {
    List<DrawnPiece> out = new ArrayList<>(some);
    out.removeAll(PieceMatch.match(some, wanted, PICTURE).onlyFirst());
    return out;
  }

  private static boolean add(DrawnObject.Stroke s, List<DrawnPiece> out) {
    DrawnPiece.add(s.path(), s.widthMm(), s.line(), out);
    return true;
  }

  private static void area(Path contour, boolean edge, int line, List<DrawnPiece> out) {
    Optional<DrawnPiece> disc = disc(contour, line);
    if (edge || disc.isEmpty()) {
      DrawnPiece.add(contour, 0, line, out);
    } else {
      out.add(disc.get());
    }
  }

  /** A closed contour of arcs about one centre. */
  private static Optional<DrawnPiece> disc(Path contour, int line) {
    Point centre = null;
    double radius = 0;
    for (Segment s : contour.segments()) {
      if (!(s instanceof Arc a) || (centre != null && a.centre().distanceTo(centre) > 1e-9)) {
        return Optional.empty();
      }
      centre = a.centre();
      radius = a.radiusMm();
    }
    return Optional.of(DrawnPiece.disc(centre, 2 * radius, line));
  }

  private Map<String, List<DrawnPiece>> drawn() {
    Map<String, List<DrawnPiece>> all = new LinkedHashMap<>();
    set.copper().forEach((l, i) -> put(all, "COPPER_L" + l, i));
    set.image("Soldermask,Top").ifPresent(i -> put(all, "MASK_TOP", i));
    set.image("Soldermask,Bot").ifPresent(i -> put(all, "MASK_BOTTOM", i));
    set.image("Legend,Top").ifPresent(i -> put(all, "LEGEND_TOP", i));
    List<DrawnPiece> edge = new ArrayList<>();
    set.image("Profile")
        .ifPresent(
            i ->
                i.objects()
                    .forEach(
                        o -> {
                          if (o instanceof DrawnObject.Stroke s) {
                            DrawnPiece.add(s.path(), 0, s.line(), edge);
                          }
                        }));
    all.put(PROFILE, edge);
    all.put("DRILL_PLATED", discs(true));
    all.put("DRILL_NONPLATED", discs(false));
    return all;
  }

  private static void put(Map<String, List<DrawnPiece>> all, String name, LayerImage image) {
    DrawnPiece.of(image.objects()).ifPresent(p -> all.put(name, p));
  }

  private List<DrawnPiece> discs(boolean plated) {
    return holes.stream()
        .filter(h -> h.plated() == plated && h.slot().isEmpty())
        .map(h -> DrawnPiece.disc(h.at(), h.diameterMm(), 0))
        .toList();
  }

  private static List<ProofFinding> compare(
      String name,
      String file,
      String layer,
      List<DrawnPiece> found,
      List<DrawnPiece> wanted,
      PieceMatch.Tolerance tolerance) {
    PieceMatch m = PieceMatch.match(found, wanted, tolerance);
    String of = layer.startsWith("COPPER_") ? layer.substring(7) : "";
    List<ProofFinding> all = new ArrayList<>();
    for (DrawnPiece p : m.onlyFirst()) {
      String message = layer + " draws this, the Gerber and drill files do not";
      all.add(new ProofFinding(name, file, p.tag(), of, middle(p), message));
    }
    for (DrawnPiece p : m.onlySecond()) {
      String message = layer + " lacks what the Gerber and drill files draw here";
      all.add(new ProofFinding(name, file, 0, of, middle(p), message));
    }
    return all;
  }

  private static Optional<Point> middle(DrawnPiece p) {
    return Optional.of(p.shape().at(0.5));
  }

  /** The closed outlines of the copper; gives the area that only one of the two shows. */
  OptionalDouble outlines(DxfFile dxf, Connectivity net) {
    List<List<Path>> rings = new ArrayList<>();
    for (int l = 1; l <= net.layers(); l++) {
      rings.add(new ArrayList<>());
      for (DxfFile.Entity x : dxf.entities()) {
        if (x.layer().equals("COPPER_L" + l)) {
          ring(dxf, l, x, rings.get(l - 1));
        }
      }
    }
    List<OutlineMatch> matches =
        IntStream.rangeClosed(1, net.layers())
            .parallel()
            .mapToObj(l -> OutlineMatch.of(net.copper(l), rings.get(l - 1)))
            .toList();
    double sum = 0;
    for (int l = 1; l <= net.layers(); l++) {
      OutlineMatch m = matches.get(l - 1);
      sum += m.areaDifferenceMm2();
      for (Patch p : m.patches()) {
        String size = String.format(Locale.ROOT, "%.4f mm2", p.areaMm2());
        String message =
            p.extra()
                ? "the outlines leave out " + size + " of the copper in the Gerber file"
                : "the outlines enclose " + size + " that is no copper in the Gerber file";
        out.add(ProofNames.OUTLINES, dxf.fileName(), 0, l, p.at(), message);
      }
    }
    return OptionalDouble.of(sum);
  }

  private void ring(DxfFile dxf, int layer, DxfFile.Entity x, List<Path> rings) {
    if (x instanceof DxfFile.Polyline p && p.path().closed()) {
      rings.add(p.path());
    } else if (x instanceof DxfFile.Circle c) {
      rings.add(Path.circle(c.centre(), c.radiusMm()));
    } else if (x instanceof DxfFile.Polyline p) {
      String message = "an open line among the outlines";
      out.add(ProofNames.OUTLINES, dxf.fileName(), x.line(), layer, p.path().start(), message);
    }
  }
}
