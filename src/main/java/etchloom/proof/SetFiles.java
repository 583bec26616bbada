package etchloom.proof;

import etchloom.proof.image.DrillFile;
import etchloom.proof.image.JobFile;
import etchloom.proof.image.LayerImage;
import etchloom.proof.image.NetlistFile;
import etchloom.proof.image.ReadWarning;
import etchloom.proof.read.DrillReader;
import etchloom.proof.read.GerberDrill;
import etchloom.proof.read.GerberReader;
import etchloom.proof.read.JobReader;
import etchloom.proof.read.NetlistReader;
import etchloom.proof.read.UnreadableFile;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * The files of a set, read and sorted by what they say they are.
 *
 * <p>A file's name only tells its format; which layer it is comes from its attributes, unless the
 * caller says so.
 */
final class SetFiles {
  private static final int SNIFFED = 4096;

  private final Findings out;
  private final Map<String, Integer> said;
  private final TreeMap<Integer, LayerImage> copper = new TreeMap<>();
  private final TreeMap<String, LayerImage> byFunction = new TreeMap<>();
  private final List<DrillFile> gerberDrills = new ArrayList<>();
  private final List<DrillFile> ncDrills = new ArrayList<>();
  private final List<ProofFinding> warnings = new ArrayList<>();
  private final List<LayerImage> unnamed = new ArrayList<>();
  private Optional<JobFile> job = Optional.empty();
  private Optional<NetlistFile> netlist = Optional.empty();

  /**
   * @param said copper layers of files whose attributes do not tell, by file name
   */
  SetFiles(SortedMap<String, byte[]> files, Map<String, Integer> said, Findings out) {
    this.out = out;
    this.said = said;
    for (Map.Entry<String, byte[]> e : files.entrySet()) {
      try {
        read(e.getKey(), e.getValue());
      } catch (UnreadableFile u) {
        out.add(
            new ProofFinding(
                ProofNames.UNREADABLE, u.file(), u.line(), "", Optional.empty(), u.reason()));
      }
    }
  }

  /** Formats by name; a folder of another tool has other names, so the first bytes tell too. */
  private void read(String name, byte[] bytes) throws UnreadableFile {
    String low = name.toLowerCase(Locale.ROOT);
    String head =
        new String(bytes, 0, Math.min(bytes.length, SNIFFED), StandardCharsets.ISO_8859_1);
    if (low.endsWith(".gbrjob")) {
      job = Optional.of(JobReader.read(name, bytes));
      warn(job.get().warnings());
    } else if (low.endsWith(".ipc") || low.endsWith(".356") || low.endsWith(".d356")) {
      netlist = Optional.of(NetlistReader.read(name, bytes));
      warn(netlist.get().warnings());
    } else if (low.endsWith(".xnc") || head.contains("M48")) {
      DrillFile drill = DrillReader.read(name, bytes);
      ncDrills.add(drill);
      warn(drill.warnings());
    } else if (low.endsWith(".gbr") || said.containsKey(name) || head.contains("%FS")) {
      gerber(GerberReader.read(name, bytes));
    }
  }

  private void warn(List<ReadWarning> some) {
    for (ReadWarning w : some) {
      warnings.add(
          new ProofFinding(
              ProofNames.DOUBTFUL, w.file(), w.line(), "", Optional.empty(), w.message()));
    }
  }

  private void gerber(LayerImage image) throws UnreadableFile {
    warn(image.warnings());
    List<String> function = image.fileAttribute(".FileFunction");
    String kind = function.isEmpty() ? "" : function.get(0);
    int layer = said.getOrDefault(image.fileName(), kind.equals("Copper") ? layer(function) : 0);
    if (layer > 0) {
      LayerImage before = copper.putIfAbsent(layer, image);
      if (before != null) {
        duplicate(image, before, "copper L" + layer);
      }
    } else if (kind.equals("Plated") || kind.equals("NonPlated")) {
      gerberDrills.add(GerberDrill.of(image));
    } else if (kind.isEmpty()) {
      unnamed.add(image);
    } else {
      String full =
          kind.equals("Profile") ? kind : kind + (function.size() > 1 ? "," + function.get(1) : "");
      LayerImage before = byFunction.putIfAbsent(full, image);
      if (before != null) {
        duplicate(image, before, full);
      }
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

  /** Gerber files that do not say what they are. */
  List<LayerImage> unnamed() {
    return unnamed;
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
}
