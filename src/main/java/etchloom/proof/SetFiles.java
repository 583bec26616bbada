package etchloom.proof;

import etchloom.proof.image.DrillFile;
import etchloom.proof.image.DxfFile;
import etchloom.proof.image.JobFile;
import etchloom.proof.image.LayerImage;
import etchloom.proof.image.NetlistFile;
import etchloom.proof.image.ReadWarning;
import etchloom.proof.image.SvgFile;
import etchloom.proof.read.DrillReader;
import etchloom.proof.read.DxfReader;
import etchloom.proof.read.GerberDrill;
import etchloom.proof.read.GerberReader;
import etchloom.proof.read.JobReader;
import etchloom.proof.read.NetlistReader;
import etchloom.proof.read.SvgReader;
import etchloom.proof.read.UnreadableFile;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * The files of a set that was just written, read and sorted by what they say they are: a file's
 * name only tells its format, which layer it is comes from its attributes. A file that cannot be
 * read is a finding, and the others are read all the same.
 */
final class SetFiles {
  private final Findings out;
  private final TreeMap<Integer, LayerImage> copper = new TreeMap<>();
  private final TreeMap<String, LayerImage> byFunction = new TreeMap<>();
  private final List<DrillFile> gerberDrills = new ArrayList<>();
  private final List<DrillFile> ncDrills = new ArrayList<>();
  private final List<ProofFinding> warnings = new ArrayList<>();
  private Optional<JobFile> job = Optional.empty();
  private Optional<NetlistFile> netlist = Optional.empty();
  private Optional<DxfFile> drawing = Optional.empty();
  private Optional<DxfFile> outlines = Optional.empty();
  private Optional<SvgFile> picture = Optional.empty();

  SetFiles(SortedMap<String, byte[]> files, Findings out) {
    this.out = out;
    List<Runnable> takes =
        List.copyOf(files.entrySet()).parallelStream()
            .map(e -> read(e.getKey(), e.getValue()))
            .toList();
    takes.forEach(Runnable::run);
  }

  /** Reads one file, on whatever thread, and gives what takes it in. */
  private Runnable read(String name, byte[] bytes) {
    try {
      if (name.endsWith(".gbr")) {
        LayerImage image = GerberReader.read(name, bytes);
        return () -> gerber(image);
      } else if (name.endsWith(".xnc")) {
        DrillFile drill = DrillReader.read(name, bytes);
        return () -> nc(drill);
      } else if (name.endsWith(".gbrjob")) {
        JobFile read = JobReader.read(name, bytes);
        return () -> job(read);
      } else if (name.endsWith(".ipc")) {
        NetlistFile read = NetlistReader.read(name, bytes);
        return () -> netlist(read);
      } else if (name.endsWith(".dxf")) {
        DxfFile read = DxfReader.read(name, bytes);
        return () -> dxf(read);
      } else if (name.endsWith(".svg")) {
        SvgFile read = SvgReader.read(name, bytes);
        return () -> picture = Optional.of(read);
      }
      return () -> {};
    } catch (UnreadableFile u) {
      return () -> unreadable(u);
    }
  }

  private void unreadable(UnreadableFile u) {
    out.add(
        new ProofFinding(
            ProofNames.UNREADABLE, u.file(), u.line(), "", Optional.empty(), u.reason()));
  }

  private void nc(DrillFile read) {
    ncDrills.add(read);
    warn(read.warnings());
  }

  private void job(JobFile read) {
    job = Optional.of(read);
    warn(read.warnings());
  }

  private void netlist(NetlistFile read) {
    netlist = Optional.of(read);
    warn(read.warnings());
  }

  private void dxf(DxfFile read) {
    warn(read.warnings());
    if (read.fileName().endsWith("-outlines.dxf")) {
      outlines = Optional.of(read);
    } else {
      drawing = Optional.of(read);
    }
  }

  private void warn(List<ReadWarning> some) {
    for (ReadWarning w : some) {
      warnings.add(
          new ProofFinding(
              ProofNames.DOUBTFUL, w.file(), w.line(), "", Optional.empty(), w.message()));
    }
  }

  private void gerber(LayerImage image) {
    warn(image.warnings());
    List<String> function = image.fileAttribute(".FileFunction");
    String kind = function.isEmpty() ? "" : function.get(0);
    int layer = kind.equals("Copper") ? layer(function) : 0;
    if (layer > 0) {
      LayerImage before = copper.putIfAbsent(layer, image);
      if (before != null) {
        duplicate(image, before, "copper L" + layer);
      }
    } else if (kind.equals("Plated") || kind.equals("NonPlated")) {
      gerberDrill(image);
    } else {
      String full =
          kind.equals("Profile") ? kind : kind + (function.size() > 1 ? "," + function.get(1) : "");
      LayerImage before = byFunction.putIfAbsent(full, image);
      if (before != null) {
        duplicate(image, before, full);
      }
    }
  }

  private void gerberDrill(LayerImage image) {
    try {
      gerberDrills.add(GerberDrill.of(image));
    } catch (UnreadableFile u) {
      unreadable(u);
    }
  }

  private void duplicate(LayerImage image, LayerImage before, String what) {
    out.add(
        ProofNames.DUPLICATE_FILE,
        image.fileName(),
        "says that it is " + what + ", as " + before.fileName() + " does");
  }

  /** {@code [Copper, L2, Inr]}. */
  private static int layer(List<String> function) {
    String s = function.size() > 1 ? function.get(1) : "";
    if (s.length() < 2 || s.length() > 4 || s.charAt(0) != 'L') {
      return 0;
    }
    int n = 0;
    for (int i = 1; i < s.length(); i++) {
      if (s.charAt(i) < '0' || s.charAt(i) > '9') {
        return 0;
      }
      n = 10 * n + s.charAt(i) - '0';
    }
    return n;
  }

  SortedMap<Integer, LayerImage> copper() {
    return copper;
  }

  /**
   * @param function {@code Profile}, {@code Soldermask,Top}
   */
  Optional<LayerImage> image(String function) {
    return Optional.ofNullable(byFunction.get(function));
  }

  List<DrillFile> gerberDrills() {
    return gerberDrills;
  }

  List<DrillFile> ncDrills() {
    return ncDrills;
  }

  /** All Gerber files that say what they are, drill files left out. */
  List<LayerImage> images() {
    List<LayerImage> all = new ArrayList<>(copper.values());
    all.addAll(byFunction.values());
    return all;
  }

  /** What the readers took with a doubt. */
  List<ProofFinding> warnings() {
    return warnings;
  }

  Optional<JobFile> job() {
    return job;
  }

  Optional<NetlistFile> netlist() {
    return netlist;
  }

  /** Centre lines with width. */
  Optional<DxfFile> drawing() {
    return drawing;
  }

  /** Closed outlines of the copper. */
  Optional<DxfFile> outlines() {
    return outlines;
  }

  Optional<SvgFile> picture() {
    return picture;
  }
}
