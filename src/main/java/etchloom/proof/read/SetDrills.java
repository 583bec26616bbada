package etchloom.proof.read;

import etchloom.proof.image.DrillFile;
import etchloom.proof.image.DrillFile.DrilledHole;
import etchloom.proof.image.DrillFile.Slot;
import etchloom.proof.image.Plating;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** The drill files of a set: spans and plating made complete, and every hole once. */
final class SetDrills {
  private final Reading reading;
  private final int layers;
  private final List<DrillFile> gerber = new ArrayList<>();
  private final List<DrillFile> nc = new ArrayList<>();
  private final List<DrillFile> chosen = new ArrayList<>();

  SetDrills(Reading reading, int layers) {
    this.reading = reading;
    this.layers = layers;
  }

  /**
   * @param role drill, or plated or nonplated, which hold against what the file says
   * @param function the file function, which may come from the job file
   * @param named whether the user has named the file
   */
  void add(DrillFile f, String role, List<String> function, boolean isNc, boolean named)
      throws UnreadableFile {
    DrillSpan span = DrillSpan.of(Map.of(".FileFunction", function));
    Plating plating = f.plating() == Plating.UNKNOWN ? span.plating() : f.plating();
    plating = role.equals(Roles.PLATED) ? Plating.PLATED : plating;
    plating = role.equals(Roles.NON_PLATED) ? Plating.NON_PLATED : plating;
    int from = f.fromLayer() == 0 ? span.fromLayer() : f.fromLayer();
    int to = f.toLayer() == 0 ? span.toLayer() : f.toLayer();
    from = from == 0 ? 1 : from;
    to = to == 0 ? layers : to;
    if (from > to || to > layers) {
      throw new UnreadableFile(
          f.fileName(),
          0,
          "drill-span",
          "drills from layer " + from + " to " + to + ", but there are " + layers);
    }
    boolean all = !role.equals(Roles.DRILL);
    DrillFile complete = plated(f, plating, from, to, DrillTool.ofHole(plating), all);
    (named ? chosen : isNc ? nc : gerber).add(complete);
  }

  List<DrillFile> all() throws UnreadableFile {
    List<DrillFile> out = new ArrayList<>(chosen);
    out.addAll(new DrillChoice(reading).of(gerber, nc));
    return out.stream().map(this::settled).toList();
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
    return plated(f, f.plating(), f.fromLayer(), f.toLayer(), Plating.PLATED, false);
  }

  /**
   * @param hole for holes that do not say, or for all
   */
  private static DrillFile plated(
      DrillFile f, Plating file, int from, int to, Plating hole, boolean all) {
    return new DrillFile(
        f.fileName(),
        file,
        from,
        to,
        f.fileAttributes(),
        f.holes().stream()
            .map(h -> all || h.plating() == Plating.UNKNOWN ? with(h, hole) : h)
            .toList(),
        f.slots().stream()
            .map(s -> all || s.plating() == Plating.UNKNOWN ? with(s, hole) : s)
            .toList(),
        f.warnings());
  }

  private static DrilledHole with(DrilledHole h, Plating p) {
    return new DrilledHole(h.at(), h.diameterMm(), p, h.function(), h.nets(), h.tool(), h.line());
  }

  private static Slot with(Slot s, Plating p) {
    return new Slot(s.path(), s.widthMm(), p, s.function(), s.nets(), s.tool(), s.line());
  }
}
