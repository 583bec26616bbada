package etchloom.proof;

import etchloom.geometry.Box;
import etchloom.geometry.Segment;
import etchloom.proof.image.DrillFile;
import etchloom.proof.image.JobFile;
import etchloom.proof.image.LayerImage;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/** Holds the job file against the files that it speaks of. */
final class JobProof {
  /** Sizes in job files are given in mm with few places. */
  private static final double SAME_MM = 0.0011;

  private final JobFile job;
  private final SetFiles set;
  private final Findings out;

  JobProof(JobFile job, SetFiles set, Findings out) {
    this.job = job;
    this.set = set;
    this.out = out;
  }

  /**
   * @param names all files of the set
   */
  void check(Set<String> names, int layers) {
    files(names);
    if (job.layerNumber().isPresent() && job.layerNumber().getAsInt() != layers) {
      wrong("says " + job.layerNumber().getAsInt() + " copper layers, there are " + layers);
    }
    size();
    stackup(layers);
    one(".SameCoordinates");
    one(".ProjectId");
  }

  /** An attribute that all files of one drawing share. */
  private void one(String attribute) {
    Map<List<String>, String> values = new LinkedHashMap<>();
    set.images().forEach(i -> values.putIfAbsent(i.fileAttribute(attribute), i.fileName()));
    set.gerberDrills()
        .forEach(
            d ->
                values.putIfAbsent(
                    d.fileAttributes().getOrDefault(attribute, List.of()), d.fileName()));
    if (values.size() > 1) {
      wrong("files do not share their " + attribute + ": " + String.join(", ", values.values()));
    }
  }

  private void files(Set<String> names) {
    Map<String, Map<String, List<String>>> read = new TreeMap<>();
    set.images().forEach(i -> read.put(i.fileName(), i.fileAttributes()));
    set.gerberDrills().forEach(d -> read.put(d.fileName(), d.fileAttributes()));
    set.ncDrills().forEach(d -> read.put(d.fileName(), d.fileAttributes()));
    Set<String> listed = new TreeSet<>();
    for (JobFile.Entry e : job.files()) {
      listed.add(e.path());
      Map<String, List<String>> attributes = read.get(e.path());
      if (!names.contains(e.path())) {
        wrong("lists " + e.path() + ", which is not there");
      } else if (attributes != null) {
        compare(e, attributes);
      }
    }
    List<String> wanted = new ArrayList<>();
    set.images().stream().map(LayerImage::fileName).forEach(wanted::add);
    set.gerberDrills().stream().map(DrillFile::fileName).forEach(wanted::add);
    for (String name : wanted) {
      if (!listed.contains(name)) {
        wrong("does not list " + name);
      }
    }
  }

  private void compare(JobFile.Entry e, Map<String, List<String>> attributes) {
    List<String> function = attributes.getOrDefault(".FileFunction", List.of());
    List<String> polarity = attributes.getOrDefault(".FilePolarity", List.of());
    if (!function.equals(e.function())) {
      wrong(
          "says that "
              + e.path()
              + " is "
              + String.join(",", e.function())
              + "; the file says "
              + String.join(",", function));
    }
    String says = String.join(",", polarity);
    boolean gerber = e.path().endsWith(".gbr");
    if (!e.polarity().isEmpty() && (gerber || !says.isEmpty()) && !says.equals(e.polarity())) {
      wrong("says that " + e.path() + " is " + e.polarity() + "; the file says '" + says + "'");
    }
  }

  private void size() {
    LayerImage profile = set.image("Profile").orElse(null);
    if (profile == null) {
      return;
    }
    Box box = null;
    for (var o : profile.objects()) {
      List<Segment> pieces =
          o.match(s -> s.path().segments(), f -> List.<Segment>of(), r -> List.<Segment>of());
      for (Segment s : pieces) {
        box = box == null ? Box.of(s) : box.join(Box.of(s));
      }
    }
    if (box != null) {
      size("X", job.sizeXMm(), box.widthMm());
      size("Y", job.sizeYMm(), box.heightMm());
    }
  }

  private void size(String axis, OptionalDouble said, double is) {
    if (said.isPresent() && Math.abs(said.getAsDouble() - is) > SAME_MM) {
      wrong(
          "says that the board is " + mm(said.getAsDouble()) + " in " + axis + ", it is " + mm(is));
    }
  }

  private void stackup(int layers) {
    int copper = 0;
    double sum = 0;
    boolean known = !job.stackup().isEmpty();
    for (JobFile.StackupLayer l : job.stackup()) {
      boolean counts = l.type().equals("Copper") || l.type().equals("Dielectric");
      copper += l.type().equals("Copper") ? 1 : 0;
      known &= !counts || l.thicknessMm().isPresent();
      sum += counts ? l.thicknessMm().orElse(0) : 0;
    }
    if (!job.stackup().isEmpty() && copper != layers) {
      wrong("stacks up " + copper + " copper layers, there are " + layers);
    }
    double thick = job.boardThicknessMm().orElse(sum);
    if (known && Math.abs(thick - sum) > SAME_MM) {
      wrong("copper and dielectrics add up to " + mm(sum) + ", the board to " + mm(thick));
    }
  }

  private static String mm(double v) {
    return String.format(Locale.ROOT, "%.3f mm", v);
  }

  private void wrong(String message) {
    out.add(ProofNames.JOB_FILE, job.fileName(), message);
  }
}
