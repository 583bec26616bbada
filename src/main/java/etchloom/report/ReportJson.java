package etchloom.report;

import etchloom.electric.machine.MachineFigures;
import etchloom.electric.machine.Need;
import etchloom.proof.ProofReport;
import etchloom.rules.RuleReport;
import java.util.List;
import java.util.Map;

/**
 * The report for programs. Its keys are bound by the spec page; what is not known has no key.
 *
 * <p>Numbers hold {@link JsonTree#DIGITS} significant digits. Layers are named {@code L1} to {@code
 * Ln}.
 */
public final class ReportJson {
  private ReportJson() {}

  /** The whole of {@code report.json}, UTF-8. */
  public static byte[] write(Results r) {
    return tree(r).bytes();
  }

  /** What {@code check SPEC --json} prints: the version, what was checked, and {@code check}. */
  public static byte[] writeCheck(Results r) {
    return head(r).put("check", CheckTree.of(r.rules())).bytes();
  }

  /** The check of a folder of files, which have neither title nor revision. */
  public static byte[] writeCheck(String toolVersion, RuleReport rules, ProofReport proof) {
    return new JsonTree()
        .put("tool", new JsonTree().put("version", toolVersion))
        .put("check", CheckTree.of(rules))
        .put("proof", ProofTree.withFindings(proof))
        .bytes();
  }

  /**
   * The report's single figures by their path, {@code resistance.phaseOhm.U}, in the file's order:
   * a {@code Double}, {@code Long}, {@code Boolean} or {@code String} each.
   */
  public static Map<String, Object> figures(Results r) {
    return tree(r).flat();
  }

  private static JsonTree head(Results r) {
    return new JsonTree()
        .put("tool", new JsonTree().put("version", r.toolVersion()))
        .put("title", r.artwork().title())
        .put("revision", r.artwork().revision());
  }

  private static JsonTree tree(Results r) {
    JsonTree out =
        head(r)
            .put("winding", WindingTree.of(r))
            .put("geometry", GeometryTree.of(r))
            .put("resistance", ResistanceTree.of(r));
    r.inductance().ifPresent(l -> out.put("inductance", MachineTree.inductance(l)));
    r.machine().ifPresent(m -> machine(out, m, r.winding().marks()));
    out.put("verdict", verdict(r));
    r.machine().ifPresent(m -> out.put("rotor", MachineTree.rotor(m.rotor())));
    out.put("check", CheckTree.of(r.rules()));
    r.proof().ifPresent(p -> out.put("proof", ProofTree.of(p)));
    return out;
  }

  private static void machine(JsonTree out, MachineFigures m, List<String> marks) {
    m.sharing().ifPresent(x -> out.put("sharing", MachineTree.sharing(x)));
    m.emf().ifPresent(e -> out.put("emf", MachineTree.emf(e, marks)));
    m.torque().ifPresent(t -> out.put("torque", MachineTree.torque(t)));
    out.put("loss", MachineTree.loss(m.loss()))
        .put("thermal", MachineTree.thermal(m.thermal()))
        .put("drive", MachineTree.drive(m.drive()));
    m.generator().ifPresent(g -> out.put("generator", MachineTree.generator(g)));
    out.put("spread", MachineTree.spread(m.spread()));
  }

  private static JsonTree verdict(Results r) {
    JsonTree out = new JsonTree().put("made", r.rules().passed());
    List<Need> duty = r.machine().map(MachineFigures::verdict).orElse(List.of());
    return duty.isEmpty()
        ? out
        : out.putObjects("duty", duty.stream().map(MachineTree::duty).toList());
  }
}
