package etchloom.proof;

import etchloom.geometry.Point;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.copper.CopperBuilder;
import etchloom.proof.copper.Hole;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.JobFile;
import etchloom.proof.image.LayerImage;
import etchloom.proof.image.LayerSet;
import etchloom.proof.image.ReadWarning;
import etchloom.proof.ohm.CopperBuild;
import etchloom.proof.ohm.FileResistance;
import etchloom.proof.plane.Figure;
import etchloom.proof.plane.OutOfRange;
import etchloom.proof.read.SetFolder;
import etchloom.proof.read.SetReader;
import etchloom.proof.read.UnreadableFile;
import etchloom.proof.rules.BoardSheets;
import etchloom.proof.rules.CopperLimits;
import etchloom.proof.rules.CopperRuleReport;
import etchloom.proof.rules.CopperRules;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.DoubleConsumer;

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

  /** Shares of the time that a large set takes, by measurement. */
  private static final double READ = 0.08;

  private static final double BUILT = 0.32;
  private static final double JUDGED = 0.93;

  private final OptionalInt circuits;
  private final Findings out = new Findings();
  private final LayerSet set;
  private final TreeMap<Integer, LayerImage> copper = new TreeMap<>();

  private FolderCheck(LayerSet set, OptionalInt circuits) {
    this.circuits = circuits;
    this.set = set;
    for (LayerImage i : set.copper()) {
      copper.put(copper.size() + 1, i);
    }
  }

  /**
   * @param layerOptions as of {@link SetReader#read}
   * @param circuits independent closed circuits that the whole conductor should have
   * @throws UnreadableFile when a file cannot be read, an option is wrong, or the copper layers are
   *     not complete
   */
  public static FolderReport check(
      SetFolder folder, List<String> layerOptions, OptionalInt circuits, Fab fab)
      throws UnreadableFile {
    return check(folder, layerOptions, circuits, fab, share -> {});
  }

  /**
   * @param done is told what share of the work is done, as it usually is in time
   */
  public static FolderReport check(
      SetFolder folder,
      List<String> layerOptions,
      OptionalInt circuits,
      Fab fab,
      DoubleConsumer done)
      throws UnreadableFile {
    LayerSet set = SetReader.read(folder, layerOptions);
    done.accept(READ);
    try {
      return new FolderCheck(set, circuits).check(fab, done);
    } catch (OutOfRange r) {
      throw new UnreadableFile(folder.name(), 0, "copper", r.getMessage());
    }
  }

  /** Whose rules are asked for, once the files have told the layers. */
  @FunctionalInterface
  public interface Fab {
    /**
     * @param copperMm finished copper of each layer from L1 down, where the job file tells
     */
    Shop of(int layers, List<OptionalDouble> copperMm);
  }

  /**
   * What the fab asks and what it makes.
   *
   * @param copper of each layer from L1 down
   */
  public record Shop(CopperLimits limits, List<CopperBuild.Layer> copper, double platingMm) {
    public Shop {
      copper = List.copyOf(copper);
    }
  }

  /**
   * @param rules what the copper alone keeps of the fab's rules
   * @param ohms between pads marked as pins; empty where fewer than two are
   */
  public record FolderReport(
      ProofReport proof, CopperRuleReport rules, Optional<FileResistance.Ohms> ohms) {}

  private FolderReport check(Fab fab, DoubleConsumer done) {
    for (ReadWarning w : set.allWarnings()) {
      out.note(w.file() + (w.line() > 0 ? ":" + w.line() : "") + ": " + w.message());
    }
    List<Hole> holes = DrilledHoles.of(set.drills(), copper.size());
    if (holes.isEmpty()) {
      out.note("there is no drill file: layers count as not joined");
    }
    Connectivity net = new Connectivity(figures(copper), holes);
    done.accept(BUILT);
    DeclaredNets names = nets(net, holes);
    circuits(net);
    Shop shop = fab.of(copper.size(), copperMm());
    CopperRuleReport rules =
        CopperRules.check(
            net,
            holes,
            BoardSheets.of(set.profile(), set.maskTop(), set.maskBottom()),
            shop.limits(),
            set.job()
                .map(JobFile::boardThicknessMm)
                .filter(OptionalDouble::isPresent)
                .map(OptionalDouble::getAsDouble),
            (layer, island) -> names.words(net.piece(layer, island)));
    done.accept(JUDGED);
    Optional<FileResistance.Ohms> ohms =
        new FolderOhms(List.copyOf(copper.values()), set.job())
            .between(net, shop.copper(), shop.platingMm());
    return new FolderReport(report(net), rules, ohms);
  }

  private List<OptionalDouble> copperMm() {
    List<OptionalDouble> out = new ArrayList<>();
    set.job()
        .ifPresent(
            j ->
                j.stackup().stream()
                    .filter(l -> l.type().equals("Copper"))
                    .forEach(l -> out.add(l.thicknessMm())));
    while (out.size() < copper.size()) {
      out.add(OptionalDouble.empty());
    }
    return out.subList(0, copper.size());
  }

  private static List<Figure> figures(SortedMap<Integer, LayerImage> copper) {
    CopperBuilder builder = new CopperBuilder();
    return copper.values().stream().map(i -> builder.build(i.objects())).toList();
  }

  /** Parts etched from copper join nets by intent, so names are judged without them. */
  private DeclaredNets nets(Connectivity board, List<Hole> holes) {
    TreeMap<Integer, LayerImage> wired = new TreeMap<>();
    boolean parts = false;
    for (Map.Entry<Integer, LayerImage> e : copper.entrySet()) {
      LayerImage i = e.getValue();
      List<DrawnObject> some =
          i.objects().stream()
              .filter(o -> !o.attributes().function().equals("EtchedComponent"))
              .toList();
      parts |= some.size() < i.objects().size();
      wired.put(e.getKey(), new LayerImage(i.fileName(), i.fileAttributes(), some, List.of()));
    }
    Connectivity net = parts ? new Connectivity(figures(wired), holes) : board;
    DeclaredNets names = new DeclaredNets(net, wired, out);
    names.check(set.netlist());
    if (names.names() == 0) {
      out.note("no file names any net: opens and shorts between nets cannot be judged");
    }
    if (!parts) {
      return names;
    }
    DeclaredNets whole = new DeclaredNets(board, copper, new Findings());
    whole.check(set.netlist());
    return whole;
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
    if (circuits.isEmpty()) {
      out.note(
          found
              + "; whether that is right cannot be judged unless --circuits says how many are meant"
              + loops);
    } else if (circuits.getAsInt() != is) {
      Optional<Point> at = net.loops().stream().map(Connectivity.Loop::at).findFirst();
      String message = found + ", it should in " + circuits.getAsInt() + loops;
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

  private ProofReport report(Connectivity net) {
    TreeMap<Integer, Integer> islands = new TreeMap<>();
    TreeMap<Integer, Integer> loops = new TreeMap<>();
    for (int l = 1; l <= net.layers(); l++) {
      islands.put(l, net.copper(l).islands());
      loops.put(l, net.loopsOn(l));
    }
    return new ProofReport(
        islands,
        loops,
        net.circuits(),
        circuits,
        net.pieces(),
        out.count(ProofNames.OPEN),
        out.count(ProofNames.SHORT),
        OptionalDouble.empty(),
        out.sorted(),
        out.notes());
  }
}
