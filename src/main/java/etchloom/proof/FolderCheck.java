package etchloom.proof;

import etchloom.geometry.Point;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.copper.CopperBuilder;
import etchloom.proof.copper.Hole;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.LayerImage;
import etchloom.proof.plane.Figure;
import etchloom.proof.plane.OutOfRange;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Predicate;

/**
 * Judges a folder of layer and drill files from any tool by what they say themselves: what hangs
 * together, and whether that is what the net names claim.
 *
 * <p>A winding is one net, so names cannot show a short between its turns; the number of closed
 * circuits can, if the caller knows how many there should be.
 */
public final class FolderCheck {
  /** Loops that are told by place. */
  private static final int TOLD = 12;

  private final Request request;
  private final Findings out = new Findings();
  private final SetFiles set;

  /**
   * @param layersByFile copper layers of files that do not say it themselves, by file name
   * @param circuits independent closed circuits that the whole conductor should have
   */
  public record Request(Map<String, Integer> layersByFile, OptionalInt circuits) {
    public Request {
      layersByFile = new TreeMap<>(layersByFile);
    }
  }

  private FolderCheck(SortedMap<String, byte[]> files, Request request) {
    this.request = request;
    this.set = new SetFiles(files, request.layersByFile(), out);
  }

  public static ProofReport check(SortedMap<String, byte[]> files, Request request) {
    FolderCheck c = new FolderCheck(files, request);
    try {
      return c.check(files);
    } catch (OutOfRange r) {
      c.out.add(ProofNames.UNREADABLE, "", r.getMessage());
      return c.report(Optional.empty());
    }
  }

  private ProofReport check(SortedMap<String, byte[]> files) {
    set.warnings().forEach(w -> out.note(w.text()));
    for (String name : request.layersByFile().keySet()) {
      if (!files.containsKey(name)) {
        out.add(ProofNames.MISSING_FILE, name, "there is no such file");
      }
    }
    set.unnamed()
        .forEach(i -> out.note(i.fileName() + " does not say what it is and was left out"));
    int layers = set.copper().isEmpty() ? 0 : set.copper().lastKey();
    for (int l = 1; l <= layers; l++) {
      if (!set.copper().containsKey(l)) {
        out.add(ProofNames.MISSING_FILE, "", "no file says that it is copper L" + l);
      }
    }
    if (layers == 0) {
      out.add(
          ProofNames.MISSING_FILE,
          "",
          "no file says that it is copper; name the layers with --layer L1=FILE");
    }
    set.job().ifPresent(j -> new JobProof(j, set, out).check(files.keySet(), layers));
    if (layers == 0 || set.copper().size() < layers) {
      return report(Optional.empty());
    }
    List<Figure> figures = figures(set.copper());
    List<Hole> holes = holes(figures);
    Connectivity net = new Connectivity(figures, holes);
    nets(net, holes);
    circuits(net);
    return report(Optional.of(net));
  }

  private static List<Figure> figures(SortedMap<Integer, LayerImage> copper) {
    CopperBuilder builder = new CopperBuilder();
    return copper.values().stream().map(i -> builder.build(i.objects())).toList();
  }

  /** A hole of which no file says whether it is plated counts as plated where it is in copper. */
  private List<Hole> holes(List<Figure> copper) {
    Predicate<Point> inCopper =
        p -> copper.stream().anyMatch(f -> f.islandAt(Nm.of(p.x()), Nm.of(p.y())) >= 0);
    List<Hole> gerber = DrilledHoles.of(set.gerberDrills(), copper.size(), inCopper);
    List<Hole> nc = DrilledHoles.of(set.ncDrills(), copper.size(), inCopper);
    if (gerber.isEmpty() && nc.isEmpty()) {
      out.note("there is no drill file: layers count as not joined");
    }
    if (!gerber.isEmpty() && !nc.isEmpty()) {
      HoleProof.compare(gerber, nc, out);
    }
    return gerber.isEmpty() ? nc : gerber;
  }

  /** Parts etched from copper join nets by intent, so names are judged without them. */
  private void nets(Connectivity whole, List<Hole> holes) {
    TreeMap<Integer, LayerImage> wired = new TreeMap<>();
    boolean parts = false;
    for (Map.Entry<Integer, LayerImage> e : set.copper().entrySet()) {
      LayerImage i = e.getValue();
      List<DrawnObject> some =
          i.objects().stream()
              .filter(o -> !o.attributes().function().equals("EtchedComponent"))
              .toList();
      parts |= some.size() < i.objects().size();
      wired.put(e.getKey(), new LayerImage(i.fileName(), i.fileAttributes(), some, List.of()));
    }
    Connectivity net = parts ? new Connectivity(figures(wired), holes) : whole;
    DeclaredNets names = new DeclaredNets(net, wired, out);
    names.check(set.netlist());
    if (names.names() == 0) {
      out.note("no file names any net: opens and shorts between nets cannot be judged");
    }
  }

  private void circuits(Connectivity net) {
    int is = net.circuits();
    List<String> places =
        net.loops().stream()
            .sorted(
                Comparator.comparingInt(Connectivity.Loop::layer)
                    .thenComparing(l -> -l.areaMm2())
                    .thenComparing(l -> l.at().x()))
            .limit(TOLD)
            .map(FolderCheck::words)
            .toList();
    String loops =
        places.isEmpty()
            ? ""
            : "; copper encloses a gap "
                + String.join(", ", places)
                + (net.loops().size() > TOLD
                    ? " and at " + (net.loops().size() - TOLD) + " more places"
                    : "");
    String found = "the conductor closes on itself in " + is + (is == 1 ? " way" : " ways");
    if (request.circuits().isEmpty()) {
      out.note(
          found
              + "; whether that is right cannot be judged unless --circuits says how many are meant"
              + loops);
    } else if (request.circuits().getAsInt() != is) {
      Optional<Point> at = net.loops().stream().map(Connectivity.Loop::at).findFirst();
      String message = found + ", it should in " + request.circuits().getAsInt() + loops;
      out.add(new ProofFinding(ProofNames.CIRCUITS, "", 0, "", at, message));
    }
  }

  private static String words(Connectivity.Loop l) {
    return String.format(
        Locale.ROOT,
        "on L%d at (%.3f, %.3f) mm (%.3f mm2)",
        l.layer(),
        l.at().x() + 0.0,
        l.at().y() + 0.0,
        l.areaMm2());
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
        request.circuits(),
        net.map(Connectivity::pieces).orElse(0),
        out.count(ProofNames.OPEN),
        out.count(ProofNames.SHORT),
        OptionalDouble.empty(),
        out.sorted(),
        out.notes());
  }
}
