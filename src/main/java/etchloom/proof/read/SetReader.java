package etchloom.proof.read;

import etchloom.proof.image.DrillFile;
import etchloom.proof.image.DrillFile.DrilledHole;
import etchloom.proof.image.DrillFile.Slot;
import etchloom.proof.image.JobFile;
import etchloom.proof.image.LayerImage;
import etchloom.proof.image.LayerSet;
import etchloom.proof.image.NetlistFile;
import etchloom.proof.image.Plating;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Reads a layer set from any tool: copper, masks, legends, profile, drill files, job file and
 * netlist, each found by its X2 file function, by the job file, or by what the user says.
 *
 * <p>What all files of a set come to shares the bound of {@link Reading#MAX_PIECES}.
 */
public final class SetReader {
  private final SetFolder folder;
  private final Reading reading;
  private final Reading.Budget budget = new Reading.Budget();
  private final RoleTable roles;

  private SetReader(SetFolder folder) {
    this.folder = folder;
    this.reading = new Reading(folder.name(), budget);
    this.roles = new RoleTable(folder, reading);
  }

  /**
   * @param layerOptions such as {@code L1=FILE}, {@code drill=FILE}, {@code plated=FILE}, {@code
   *     nonplated=FILE}, {@code profile=FILE}, {@code mask-top=FILE}, {@code mask-bottom=FILE},
   *     {@code legend-top=FILE}, {@code legend-bottom=FILE}, {@code netlist=FILE}, {@code
   *     job=FILE}; where a drill file is named, only those named count
   * @throws UnreadableFile when a file cannot be read, an option is wrong, or the copper layers are
   *     not complete
   */
  public static LayerSet read(SetFolder folder, List<String> layerOptions) throws UnreadableFile {
    return new SetReader(folder).set(layerOptions);
  }

  private LayerSet set(List<String> options) throws UnreadableFile {
    for (String o : options) {
      roles.option(o);
    }
    Optional<String> jobName = roles.only(Roles.JOB, FileKind.JOB);
    Optional<JobFile> job = Optional.empty();
    if (jobName.isPresent()) {
      job = Optional.of(JobReader.read(jobName.get(), bytes(jobName.get())));
    }
    roles.fromFunctions(job);
    List<LayerImage> copper = copper();
    if (job.isPresent() && job.get().layerNumber().orElse(copper.size()) != copper.size()) {
      reading.warn(
          0,
          "job-differs",
          "the job file says "
              + job.get().layerNumber().getAsInt()
              + " copper layers, found "
              + copper.size());
    }
    Optional<LayerImage> maskTop = gerber(Roles.MASK_TOP);
    Optional<LayerImage> maskBottom = gerber(Roles.MASK_BOTTOM);
    Optional<LayerImage> legendTop = gerber(Roles.LEGEND_TOP);
    Optional<LayerImage> legendBottom = gerber(Roles.LEGEND_BOTTOM);
    Optional<LayerImage> profile = gerber(Roles.PROFILE);
    List<DrillFile> drills = drills(copper.size());
    Optional<NetlistFile> netlist = netlist();
    return new LayerSet(
        folder.name(),
        copper,
        maskTop,
        maskBottom,
        legendTop,
        legendBottom,
        profile,
        drills,
        job,
        netlist,
        reading.warnings());
  }

  private byte[] bytes(String file) {
    return folder.files().get(file);
  }

  private LayerImage image(String file) throws UnreadableFile {
    return GerberReader.read(new Reading(file, budget), bytes(file));
  }

  private Optional<LayerImage> gerber(String role) throws UnreadableFile {
    Optional<String> file = roles.single(role);
    return file.isEmpty() ? Optional.empty() : Optional.of(image(file.get()));
  }

  private List<LayerImage> copper() throws UnreadableFile {
    int n = 0;
    for (int k = 1; k <= Roles.MAX_LAYER; k++) {
      n = roles.of("L" + k).isEmpty() ? n : k;
    }
    if (n == 0) {
      throw reading.fail(
          0, "no-copper", "there is no copper layer; --layer L1=FILE names the file of one");
    }
    List<LayerImage> out = new ArrayList<>();
    for (int k = 1; k <= n; k++) {
      Optional<String> file = roles.single("L" + k);
      if (file.isEmpty()) {
        throw reading.fail(
            0,
            "layer-missing",
            "there is a copper layer L"
                + n
                + " but no L"
                + k
                + "; --layer L"
                + k
                + "=FILE names it");
      }
      LayerImage image = image(file.get());
      check(image, k, n);
      out.add(image);
    }
    return out;
  }

  private void check(LayerImage image, int layer, int layers) throws UnreadableFile {
    List<String> function = image.fileAttribute(".FileFunction");
    String side = function.size() < 3 ? "" : function.get(2);
    String wanted = layer == 1 ? "Top" : layer == layers ? "Bot" : "Inr";
    if (!side.isEmpty() && !side.equals(wanted)) {
      reading.warn(
          0,
          "layer-side",
          image.fileName()
              + " says L"
              + layer
              + " is "
              + side
              + ", of "
              + layers
              + " layers it is "
              + wanted);
    }
    if (image.fileAttribute(".FilePolarity").equals(List.of("Negative"))) {
      throw new UnreadableFile(
          image.fileName(), 0, "negative", "copper drawn in negative is not read");
    }
  }

  private List<DrillFile> drills(int layers) throws UnreadableFile {
    List<DrillFile> gerber = new ArrayList<>();
    List<DrillFile> nc = new ArrayList<>();
    List<DrillFile> chosen = new ArrayList<>();
    for (String role : List.of(Roles.DRILL, Roles.PLATED, Roles.NON_PLATED)) {
      for (String file : roles.of(role)) {
        boolean isNc = FileKind.of(bytes(file)) == FileKind.NC_DRILL;
        DrillFile read =
            isNc
                ? DrillReader.read(new Reading(file, budget), bytes(file))
                : GerberDrill.of(image(file));
        DrillFile complete = complete(read, role, layers);
        boolean asked = !role.equals(Roles.DRILL) || roles.chosen(file);
        (asked ? chosen : isNc ? nc : gerber).add(complete);
      }
    }
    chosen.addAll(new DrillChoice(reading).of(gerber, nc));
    return chosen.stream().map(f -> settled(f)).toList();
  }

  /** With the plating and the span that the user or the number of layers gives. */
  private DrillFile complete(DrillFile f, String role, int layers) throws UnreadableFile {
    int from = f.fromLayer() == 0 ? 1 : f.fromLayer();
    int to = f.toLayer() == 0 ? layers : f.toLayer();
    if (from > to || to > layers) {
      throw new UnreadableFile(
          f.fileName(),
          0,
          "drill-span",
          "drills from layer " + from + " to " + to + ", but there are " + layers);
    }
    Plating plating =
        role.equals(Roles.PLATED)
            ? Plating.PLATED
            : role.equals(Roles.NON_PLATED) ? Plating.NON_PLATED : f.plating();
    boolean forced = !role.equals(Roles.DRILL);
    return new DrillFile(
        f.fileName(),
        plating,
        from,
        to,
        f.fileAttributes(),
        f.holes().stream().map(h -> forced ? with(h, plating) : h).toList(),
        f.slots().stream().map(s -> forced ? with(s, plating) : s).toList(),
        f.warnings());
  }

  /** Every hole plated or not. */
  private DrillFile settled(DrillFile f) {
    boolean unsaid =
        f.holes().stream().anyMatch(h -> h.plating() == Plating.UNKNOWN)
            || f.slots().stream().anyMatch(s -> s.plating() == Plating.UNKNOWN);
    if (!unsaid) {
      return f;
    }
    reading.warn(
        0,
        "plating-unknown",
        f.fileName()
            + " does not say whether its holes are plated; taken as plated; --layer"
            + " nonplated=FILE says otherwise");
    return new DrillFile(
        f.fileName(),
        f.plating(),
        f.fromLayer(),
        f.toLayer(),
        f.fileAttributes(),
        f.holes().stream()
            .map(h -> h.plating() == Plating.UNKNOWN ? with(h, Plating.PLATED) : h)
            .toList(),
        f.slots().stream()
            .map(s -> s.plating() == Plating.UNKNOWN ? with(s, Plating.PLATED) : s)
            .toList(),
        f.warnings());
  }

  private static DrilledHole with(DrilledHole h, Plating p) {
    return new DrilledHole(h.at(), h.diameterMm(), p, h.function(), h.nets(), h.tool(), h.line());
  }

  private static Slot with(Slot s, Plating p) {
    return new Slot(s.path(), s.widthMm(), p, s.function(), s.nets(), s.tool(), s.line());
  }

  private Optional<NetlistFile> netlist() throws UnreadableFile {
    Optional<String> file = roles.only(Roles.NETLIST, FileKind.NETLIST);
    return file.isEmpty()
        ? Optional.empty()
        : Optional.of(NetlistReader.read(file.get(), bytes(file.get())));
  }
}
