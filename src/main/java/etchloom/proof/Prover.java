package etchloom.proof;

import etchloom.proof.copper.Connectivity;
import etchloom.proof.copper.CopperBuilder;
import etchloom.proof.copper.DrawnPiece;
import etchloom.proof.copper.Hole;
import etchloom.proof.copper.PieceMatch;
import etchloom.proof.image.DrillFile;
import etchloom.proof.image.LayerImage;
import etchloom.proof.image.Plating;
import etchloom.proof.ohm.CopperBuild;
import etchloom.proof.plane.Figure;
import etchloom.proof.plane.OutOfRange;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * Reads a written set back and says whether it is what the design means.
 *
 * <p>The copper is rebuilt from the Gerber files and judged by membership, loops and circuits, not
 * by net names, for a whole winding may be one net. All else in the set is held against it.
 */
public final class Prover {
  /** Of each there is one; what else must be there is told by what is in the files. */
  private static final List<String> KINDS =
      List.of(".gbrjob", ".ipc", ".dxf", "-outlines.dxf", ".svg", "-fab.zip");

  private final ProofExpectation expected;
  private final Findings out = new Findings();
  private final SetFiles set;
  private final SortedMap<String, byte[]> files;
  private Optional<ResistanceProof> reported = Optional.empty();
  private OptionalDouble areaDifferenceMm2 = OptionalDouble.empty();

  private Prover(SortedMap<String, byte[]> files, ProofExpectation expected) {
    this.expected = expected;
    this.files = files;
    this.set = new SetFiles(files, out);
  }

  /**
   * @param files by name, as written
   */
  public static ProofReport prove(SortedMap<String, byte[]> files, ProofExpectation expected) {
    return new Prover(files, expected).prove();
  }

  /**
   * The same, and the resistances between the terminals from the copper of the files against those
   * reported: a finding where they differ by more than 1 %.
   *
   * @param terminalOhm by pairs of marks, {@code U1-V1}, at 20 °C
   */
  public static ProofReport prove(
      SortedMap<String, byte[]> files,
      ProofExpectation expected,
      CopperBuild build,
      SortedMap<String, Double> terminalOhm) {
    Prover p = new Prover(files, expected);
    p.reported = Optional.of(new ResistanceProof(build, terminalOhm, p.out));
    return p.prove();
  }

  private ProofReport prove() {
    set.warnings().forEach(out::add);
    for (int l = 1; l <= expected.layers(); l++) {
      if (!set.copper().containsKey(l)) {
        out.add(ProofNames.MISSING_FILE, "", "no file says that it is copper L" + l);
      }
    }
    for (Map.Entry<Integer, LayerImage> e : set.copper().entrySet()) {
      if (e.getKey() > expected.layers()) {
        String message = "says that it is copper L" + e.getKey() + " of " + expected.layers();
        out.add(ProofNames.MISSING_FILE, e.getValue().fileName(), message);
      }
    }
    for (String kind : KINDS) {
      if (files.keySet().stream().noneMatch(n -> n.endsWith(kind))) {
        out.add(ProofNames.MISSING_FILE, "", "no file's name ends in " + kind);
      }
    }
    List<Hole> holes = holes();
    new SheetProof(set, out).check(expected);
    set.job().ifPresent(j -> new JobProof(j, set, out).check(files.keySet(), expected.layers()));
    for (String name : files.keySet()) {
      if (name.endsWith(".zip")) {
        new ZipProof(name, out).check(files.get(name), files);
      }
    }
    set.netlist().ifPresent(n -> new NetlistProof(n, out).check(expected));
    boolean all = true;
    for (int l = 1; l <= expected.layers(); l++) {
      all &= set.copper().containsKey(l);
    }
    if (!all) {
      out.note("the copper was not judged, since not all of it could be read");
      return report(Optional.empty());
    }
    try {
      return copper(holes);
    } catch (OutOfRange r) {
      out.add(ProofNames.UNREADABLE, "", r.getMessage());
      return report(Optional.empty());
    }
  }

  private ProofReport copper(List<Hole> holes) {
    List<Figure> figures =
        set.copper().values().parallelStream()
            .map(i -> new CopperBuilder().build(i.objects()))
            .toList();
    Connectivity net = new Connectivity(figures, holes);
    List<LayerGroups> groups = new ArrayList<>();
    for (int l = 1; l <= expected.layers(); l++) {
      groups.add(new LayerGroups(expected, l));
    }
    SortedSet<Integer> same = asDesigned(groups);
    SortedSet<Integer> swapped = swapped(groups, same);
    for (LayerGroups g : groups) {
      if (!swapped.contains(g.layer)) {
        LayerProof proof = new LayerProof(g, set.copper().get(g.layer), net, out);
        proof.check(same.contains(g.layer));
        proof.nets();
        proof.functions();
      }
    }
    NetProof whole = new NetProof(expected, net, out);
    if (swapped.isEmpty()) {
      whole.pieces();
    }
    whole.circuits();
    whole.terminals(set.copper().values());
    reported.ifPresent(r -> r.check(List.copyOf(set.copper().values()), net, expected));
    PictureProof pictures = new PictureProof(set, holes, out);
    set.drawing().ifPresent(pictures::drawing);
    set.picture().ifPresent(pictures::picture);
    set.outlines().ifPresent(d -> areaDifferenceMm2 = pictures.outlines(d, net));
    return report(Optional.of(net));
  }

  /** Layers whose file draws the design to the last piece. */
  private SortedSet<Integer> asDesigned(List<LayerGroups> groups) {
    List<Integer> found =
        groups.parallelStream().filter(g -> draws(g.layer, g)).map(g -> g.layer).toList();
    return new TreeSet<>(found);
  }

  /** Layers whose file draws another layer of the design to the last piece. */
  private SortedSet<Integer> swapped(List<LayerGroups> groups, SortedSet<Integer> same) {
    TreeSet<Integer> found = new TreeSet<>();
    for (LayerGroups g : groups) {
      for (LayerGroups other : groups) {
        if (!same.contains(g.layer) && !found.contains(g.layer) && draws(g.layer, other)) {
          found.add(g.layer);
          String message = "the file of L" + g.layer + " draws the copper of L" + other.layer;
          String file = set.copper().get(g.layer).fileName();
          String layer = Findings.layerName(g.layer);
          out.add(
              new ProofFinding(
                  ProofNames.SWAPPED_LAYERS, file, 0, layer, Optional.empty(), message));
        }
      }
    }
    return found;
  }

  private boolean draws(int layer, LayerGroups design) {
    return DrawnPiece.of(set.copper().get(layer).objects())
        .map(p -> PieceMatch.match(p, design.pieces()).same())
        .orElse(false);
  }

  /** Both sets of drill files are held against the design; the Gerber ones join the copper. */
  private List<Hole> holes() {
    List<Hole> gerber = holes(set.gerberDrills(), "the Gerber drill files");
    List<Hole> nc = holes(set.ncDrills(), "the NC drill files");
    return gerber.isEmpty() ? nc : gerber;
  }

  private List<Hole> holes(List<DrillFile> files, String what) {
    List<Hole> holes = DrilledHoles.of(files, expected.layers());
    boolean any = expected.pads().stream().anyMatch(p -> p.holeMm().isPresent());
    if (files.isEmpty() && any && out.count(ProofNames.UNREADABLE) == 0) {
      out.add(ProofNames.MISSING_FILE, "", what + " are not there");
    }
    if (!files.isEmpty()) {
      HoleProof.check(expected, holes, p -> name(files, p).orElse(what), out);
    }
    return holes;
  }

  private static Optional<String> name(List<DrillFile> files, boolean plated) {
    Plating wanted = plated ? Plating.PLATED : Plating.NON_PLATED;
    return files.stream().filter(f -> f.plating() == wanted).map(DrillFile::fileName).findFirst();
  }

  private ProofReport report(Optional<Connectivity> net) {
    TreeMap<Integer, Integer> islands = new TreeMap<>();
    TreeMap<Integer, Integer> loops = new TreeMap<>();
    net.ifPresent(
        n -> {
          for (int l = 1; l <= n.layers(); l++) {
            islands.put(l, n.copper(l).islands());
            loops.put(l, n.loopsOn(l));
          }
        });
    return new ProofReport(
        islands,
        loops,
        net.map(Connectivity::circuits).orElse(0),
        OptionalInt.of(expected.circuits()),
        net.map(Connectivity::pieces).orElse(0),
        out.count(ProofNames.OPEN),
        out.count(ProofNames.SHORT),
        areaDifferenceMm2,
        out.sorted(),
        out.notes());
  }
}
