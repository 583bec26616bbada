package etchloom.proof.read;

import etchloom.proof.image.DrillFile;
import etchloom.proof.image.JobFile;
import etchloom.proof.image.LayerImage;
import etchloom.proof.image.LayerSet;
import etchloom.proof.image.NetlistFile;
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
    SetDrills drills = new SetDrills(reading, layers);
    for (String role : List.of(Roles.DRILL, Roles.PLATED, Roles.NON_PLATED)) {
      for (String file : roles.of(role)) {
        boolean nc = FileKind.of(bytes(file)) == FileKind.NC_DRILL;
        DrillFile read =
            nc
                ? DrillReader.read(new Reading(file, budget), bytes(file))
                : GerberDrill.of(image(file));
        drills.add(read, role, roles.function(file), nc, roles.chosen(file));
      }
    }
    return drills.all();
  }

  private Optional<NetlistFile> netlist() throws UnreadableFile {
    Optional<String> file = roles.only(Roles.NETLIST, FileKind.NETLIST);
    return file.isEmpty()
        ? Optional.empty()
        : Optional.of(NetlistReader.read(file.get(), bytes(file.get())));
  }
}
