package etchloom.artwork;

import etchloom.geometry.Grid;
import etchloom.geometry.Path;
import java.util.List;

/**
 * The stator's copper and board, complete and immutable: everything before builds it, everything
 * after only reads it. Lengths in mm, origin on the shaft axis, seen from L1.
 *
 * @param profile closed paths: the board's edge first (counter-clockwise), then the bore if any
 * @param maskTop openings on L1's side; vias are tented
 * @param turnsPerLayer turns of each coil on each layer
 * @param expectedCircuits independent closed circuits that the design implies
 * @param draft whether rules are broken and the set was forced
 */
public record Artwork(
    String title,
    String slug,
    String revision,
    boolean draft,
    Stackup stackup,
    List<Path> profile,
    List<Joint> joints,
    List<Conductor> conductors,
    List<MountingHole> mountingHoles,
    List<Opening> maskTop,
    List<Opening> maskBottom,
    List<Stroke> legend,
    List<Coil> coils,
    List<Phase> phases,
    int turnsPerLayer,
    int expectedCircuits) {
  public Artwork {
    profile = List.copyOf(profile);
    joints = List.copyOf(joints);
    conductors = List.copyOf(conductors);
    mountingHoles = List.copyOf(mountingHoles);
    maskTop = List.copyOf(maskTop);
    maskBottom = List.copyOf(maskBottom);
    legend = List.copyOf(legend);
    coils = List.copyOf(coils);
    phases = List.copyOf(phases);
  }

  public int layers() {
    return stackup.layers();
  }

  /** The terminals in the order of their marks along the row. */
  public List<Joint> terminals() {
    return joints.stream().filter(Joint::terminal).toList();
  }

  public List<Conductor> conductorsOn(int layer) {
    return conductors.stream().filter(c -> c.layer() == layer).toList();
  }

  /** The joints with a pad on the layer; a joint where tracks just meet has none. */
  public List<Joint> padsOn(int layer) {
    return joints.stream().filter(j -> j.on(layer) && j.padMm() > 0).toList();
  }

  /**
   * The same artwork on the 1 nm grid, every point rounded once. Writers take this one; the rule
   * check takes the one before rounding.
   */
  public Artwork onGrid() {
    return new Artwork(
        title,
        slug,
        revision,
        draft,
        stackup,
        profile.stream().map(p -> p.mapped(Grid::snap)).toList(),
        joints.stream()
            .map(
                j ->
                    new Joint(
                        j.id(),
                        j.kind(),
                        Grid.snap(j.at()),
                        j.padMm(),
                        j.hole(),
                        j.firstLayer(),
                        j.lastLayer(),
                        j.net(),
                        j.mark(),
                        j.what()))
            .toList(),
        conductors.stream()
            .map(
                c ->
                    new Conductor(
                        c.id(),
                        c.layer(),
                        c.widthMm(),
                        c.widthsMm(),
                        c.path().mapped(Grid::snap),
                        c.fromJoint(),
                        c.toJoint(),
                        c.net(),
                        c.what()))
            .toList(),
        mountingHoles.stream()
            .map(h -> new MountingHole(Grid.snap(h.at()), h.diameterMm(), h.keepOutMm()))
            .toList(),
        maskTop.stream().map(Artwork::snap).toList(),
        maskBottom.stream().map(Artwork::snap).toList(),
        legend.stream()
            .map(s -> new Stroke(s.path().mapped(Grid::snap), s.widthMm(), s.what(), s.letterMm()))
            .toList(),
        coils,
        phases,
        turnsPerLayer,
        expectedCircuits);
  }

  private static Opening snap(Opening o) {
    return new Opening(Grid.snap(o.at()), o.diameterMm(), o.what());
  }
}
