package etchloom.electric.inductance;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Stackup;
import etchloom.electric.field.IronPlanes;
import etchloom.electric.resistance.Currents;
import etchloom.electric.resistance.Edge;
import etchloom.electric.resistance.Section;
import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** A board's conductors as filaments and its holes as barrels, all at their true heights. */
final class BoardCopper {
  /**
   * Chord error over the track's width. On the boards measured this moves a coil's inductance by
   * less than 1e-4.
   */
  private static final double CHORD_ERROR = 0.05;

  /** Longest filament over the track's width: about as long as the gaps to the next turns. */
  private static final double LONGEST = 4;

  /**
   * Widths of a track that widens count as the nearest in this ratio: over its length the errors,
   * at most a tenth, cancel, and the number of sections, whose distances cost its square, stays
   * small.
   */
  private static final double CLASS_RATIO = 1.2;

  private final Artwork artwork;
  private final List<CrossSection> sections = new ArrayList<>();
  private final Map<CrossSection, Integer> numbers = new HashMap<>();
  private final int[] sectionOf;

  BoardCopper(Artwork artwork) {
    this.artwork = artwork;
    sectionOf = new int[artwork.conductors().size()];
    for (Conductor c : artwork.conductors()) {
      sectionOf[c.id()] = number(c, c.widthMm());
      if (c.tapered()) {
        c.stretches().forEach(s -> number(c, classMm(c, s.widthMm())));
      }
    }
  }

  private static double classMm(Conductor c, double widthMm) {
    double steps = Math.rint(Math.log(widthMm / c.widthMm()) / Math.log(CLASS_RATIO));
    return c.widthMm() * Math.pow(CLASS_RATIO, steps);
  }

  /** A section's number, which it gets where it is new. */
  private int number(Conductor c, double widthMm) {
    Stackup stackup = artwork.stackup();
    Stackup.Copper copper = stackup.copper().get(c.layer() - 1);
    CrossSection s =
        new CrossSection(
            Section.meanWidthMm(widthMm, copper),
            copper.thicknessMm(),
            stackup.heightMm(c.layer()));
    Integer known = numbers.putIfAbsent(s, sections.size());
    if (known != null) {
      return known;
    }
    sections.add(s);
    return sections.size() - 1;
  }

  /**
   * @throws IllegalArgumentException where iron stands in the copper or on the wrong side of it
   */
  void requireClearOf(IronPlanes iron) {
    double above = iron.aboveMm().orElse(Double.POSITIVE_INFINITY);
    double below = iron.belowMm().orElse(Double.NEGATIVE_INFINITY);
    for (CrossSection s : sections) {
      double half = s.thicknessMm() / 2;
      if (!(s.heightMm() + half <= above && s.heightMm() - half >= below)) {
        throw new IllegalArgumentException(
            "copper at " + s.heightMm() + " mm is not between iron at " + below + " and " + above);
      }
    }
  }

  List<CrossSection> sections() {
    return List.copyOf(sections);
  }

  /** A conductor's filaments; a positive current runs along its path. */
  void add(int conductor, double ampere, Filaments out) {
    Conductor c = artwork.conductors().get(conductor);
    if (!c.tapered()) {
      flattening(c.widthMm()).add(c.path(), sectionOf[conductor], ampere, out);
      return;
    }
    for (Conductor.Stretch s : c.stretches()) {
      int section = number(c, classMm(c, s.widthMm()));
      flattening(s.widthMm()).add(s.path(), section, ampere, out);
    }
  }

  /** A straight way from one joint to another in the plane and with the section of a conductor. */
  void addStraight(int fromJoint, int toJoint, int like, double ampere, Filaments out) {
    Point from = artwork.joints().get(fromJoint).at();
    Point to = artwork.joints().get(toJoint).at();
    Conductor c = artwork.conductors().get(like);
    flattening(c.widthMm()).addLine(from, to, sectionOf[like], ampere, out);
  }

  private static Flattening flattening(double widthMm) {
    return new Flattening(CHORD_ERROR * widthMm, LONGEST * widthMm);
  }

  /** The stretches of plated holes that carry a share of the current. */
  List<Barrel> barrels(Currents currents) {
    Stackup stackup = artwork.stackup();
    List<Barrel> out = new ArrayList<>();
    for (int i = 0; i < currents.edges().size(); i++) {
      Edge e = currents.edges().get(i);
      if (e.barrel() && currents.ofEdge(i) != 0) {
        Joint joint = artwork.joints().get(e.from().joint());
        double inner = joint.hole().orElseThrow() / 2;
        out.add(
            new Barrel(
                joint.at(),
                stackup.heightMm(e.from().layer()),
                stackup.heightMm(e.to().layer()),
                MeanDistance.annulusMm(inner + stackup.platingMm(), inner),
                currents.ofEdge(i)));
      }
    }
    return out;
  }
}
