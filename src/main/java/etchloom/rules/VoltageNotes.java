package etchloom.rules;

import etchloom.units.Numbers;
import java.util.List;
import java.util.OptionalDouble;

/** What the reader must know about the rule {@code voltage}: which columns apply, and why. */
final class VoltageNotes implements Rule {
  /** Up to here a direct voltage counts as harmless to touch: IEC 61140, IEC 62368-1. */
  private static final double HARMLESS_VOLT = 60;

  @Override
  public void check(Board board, Verdicts verdicts) {
    Potentials p = board.potentials();
    OptionalDouble full = p.fullVolt();
    if (full.isEmpty()) {
      verdicts.note(
          "voltage: the spec gives no duty.bus and no back-EMF is known, so there is no working"
              + " voltage and the spacing by voltage is not checked");
      return;
    }
    double volt = full.getAsDouble();
    List<String> why =
        List.of(
            source(p, volt),
            columns(board, volt),
            "voltage: this is spacing that lets the winding work, up to 3050 m above the sea; it is"
                + " no safety insulation between the winding and people");
    verdicts.note(
        why,
        "voltage: "
            + volt(volt)
            + ", no safety insulation; "
            + why.size()
            + " notes in the report");
    if (volt > HARMLESS_VOLT) {
      verdicts.note(
          "voltage: "
              + volt(volt)
              + " is above 60 V d.c., where touching may harm: insulation must follow the standards"
              + " for the product, such as IEC 60664-1 and IEC 62368-1, which ask for more than"
              + " this check");
    }
  }

  private static String source(Potentials p, double volt) {
    OptionalDouble bus = p.busVolt();
    OptionalDouble emf = p.emfVolt();
    String why;
    if (emf.isEmpty()) {
      why = "duty.bus; the back-EMF at speed is not known and not counted";
    } else if (bus.isEmpty()) {
      why = "the peak line back-EMF at speed with 10 % in hand; there is no duty.bus";
    } else if (bus.getAsDouble() >= emf.getAsDouble()) {
      why =
          "duty.bus; the peak line back-EMF with 10 % in hand is less, " + volt(emf.getAsDouble());
    } else {
      why =
          "the peak line back-EMF at speed with 10 % in hand, more than duty.bus, "
              + volt(bus.getAsDouble());
    }
    return "voltage: "
        + volt(volt)
        + " between phases and to terminals, rim and screws ("
        + why
        + "); within a phase that voltage times the share of the phase's length between the two"
        + " points";
  }

  private static String volt(double volt) {
    return Numbers.trimmed(volt, 2) + " V";
  }

  private static String columns(Board board, double volt) {
    String inner =
        board.artwork().layers() > 2 ? part(Spacing2221.B1, "inner layers", volt) + ", " : "";
    return "voltage: spacing by IPC-2221 table 6-1 at that voltage: "
        + inner
        + part(Spacing2221.B4, "outer layers, which the mask covers", volt)
        + ", "
        + part(Spacing2221.A6, "between bare terminals and screws in the mask's openings", volt);
  }

  private static String part(Spacing2221 column, String where, double volt) {
    return Numbers.trimmed(column.requiredMm(volt), 3)
        + " mm in column "
        + column
        + " ("
        + where
        + ")";
  }
}
