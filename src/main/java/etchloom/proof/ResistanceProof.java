package etchloom.proof;

import etchloom.proof.ProofExpectation.Pad;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.image.LayerImage;
import etchloom.proof.ohm.CopperBuild;
import etchloom.proof.ohm.FileResistance;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;

/** Holds the resistances of the files' copper against those that the report states. */
final class ResistanceProof {
  private static final double SHARE = 0.01;

  private final CopperBuild build;
  private final SortedMap<String, Double> reported;
  private final Findings out;

  ResistanceProof(CopperBuild build, SortedMap<String, Double> reported, Findings out) {
    this.build = build;
    this.reported = new TreeMap<>(reported);
    this.out = out;
  }

  void check(List<LayerImage> copper, Connectivity net, ProofExpectation expected) {
    FileResistance.Ohms ohms =
        FileResistance.between(
            copper,
            net,
            build,
            expected.pads().stream()
                .filter(Pad::terminal)
                .map(t -> new FileResistance.Terminal(t.mark(), t.fromLayer(), t.at()))
                .toList());
    TreeMap<String, Double> found = new TreeMap<>();
    ohms.pairs().forEach(p -> found.put(p.from() + "-" + p.to(), p.ohm()));
    TreeSet<String> all = new TreeSet<>(reported.keySet());
    all.addAll(found.keySet());
    for (String pair : all) {
      compare(pair, found.get(pair), reported.get(pair), SHARE + ohms.error());
    }
  }

  private void compare(String pair, Double is, Double said, double share) {
    boolean agree = is != null && said != null && Math.abs(is - said) <= share * said;
    if (!agree) {
      String message =
          pair + ": the copper of the files has " + ohm(is) + ", the report says " + ohm(said);
      out.add(new ProofFinding(ProofNames.RESISTANCE, "", 0, "", Optional.empty(), message));
    }
  }

  private static String ohm(Double v) {
    return v == null ? "no resistance" : String.format(Locale.ROOT, "%.4f ohm", v);
  }
}
