package etchloom.proof;

import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.proof.ProofExpectation.Disc;
import etchloom.proof.copper.DrawnPiece;
import etchloom.proof.copper.PieceMatch;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.LayerImage;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Holds the profile and the mask openings against the design's. */
final class SheetProof {
  private final SetFiles set;
  private final Findings out;

  SheetProof(SetFiles set, Findings out) {
    this.set = set;
    this.out = out;
  }

  void check(ProofExpectation expected) {
    profile(expected.profile());
    mask("Soldermask,Top", expected.maskTop());
    mask("Soldermask,Bot", expected.maskBottom());
  }

  private LayerImage image(String function) {
    LayerImage image = set.image(function).orElse(null);
    if (image == null && out.count(ProofNames.UNREADABLE) == 0) {
      out.add(ProofNames.MISSING_FILE, "", "no file says that it is " + function);
    }
    return image;
  }

  /** The centre of the line is the edge, so pens do not count. */
  private void profile(List<Path> wanted) {
    LayerImage image = image("Profile");
    if (image == null) {
      return;
    }
    List<DrawnPiece> found = new ArrayList<>();
    for (DrawnObject o : image.objects()) {
      if (o instanceof DrawnObject.Stroke s && o.dark()) {
        DrawnPiece.add(s.path(), 0, s.line(), found);
      } else {
        String message = "a profile is drawn in lines and arcs; this is something else";
        out.add(ProofNames.PROFILE, image.fileName(), o.line(), 0, place(o), message);
      }
    }
    List<DrawnPiece> edge = new ArrayList<>();
    wanted.forEach(p -> DrawnPiece.add(p, 0, 0, edge));
    PieceMatch m = PieceMatch.match(found, edge);
    for (DrawnPiece p : m.onlyFirst()) {
      String message = "this is no edge of the board";
      out.add(ProofNames.PROFILE, image.fileName(), p.tag(), 0, p.shape().at(0.5), message);
    }
    for (DrawnPiece p : m.onlySecond()) {
      String message = "the edge of the board is not drawn here";
      out.add(ProofNames.PROFILE, image.fileName(), 0, 0, p.shape().at(0.5), message);
    }
  }

  private void mask(String function, List<Disc> wanted) {
    LayerImage image = image(function);
    if (image == null) {
      return;
    }
    List<DrawnPiece> found = DrawnPiece.of(image.objects()).orElse(null);
    if (found == null) {
      String message = "openings are discs; the file draws something else";
      out.add(ProofNames.MASK, image.fileName(), message);
      return;
    }
    List<DrawnPiece> discs =
        wanted.stream().map(d -> DrawnPiece.disc(d.at(), d.diameterMm(), 0)).toList();
    PieceMatch m = PieceMatch.match(found, discs);
    for (DrawnPiece p : m.onlyFirst()) {
      String message = "an opening of " + mm(p.widthMm()) + " is not in the design";
      out.add(ProofNames.MASK, image.fileName(), p.tag(), 0, p.shape().at(0.5), message);
    }
    for (DrawnPiece p : m.onlySecond()) {
      String message = "an opening of " + mm(p.widthMm()) + " is not there";
      out.add(ProofNames.MASK, image.fileName(), 0, 0, p.shape().start(), message);
    }
  }

  static Point place(DrawnObject o) {
    return o.match(s -> s.path().start(), f -> f.at(), r -> r.contours().get(0).start());
  }

  static String mm(double v) {
    return String.format(Locale.ROOT, "%.4f mm", v);
  }
}
