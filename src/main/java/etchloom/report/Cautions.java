package etchloom.report;

import etchloom.spec.Spec;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** What can hurt the one who builds this machine, the same words wherever they are shown. */
public final class Cautions {
  /** Direct voltage up to which dry skin contact is commonly held harmless, V (IEC 61140). */
  static final double EXTRA_LOW_VOLT = 60;

  private static final Caution MAGNETS =
      new Caution(
          "magnets",
          "Strong magnets snap together and onto iron: they crush fingers and shatter. Keep them"
              + " away from pacemakers and other implants, wear eye protection, and lower a rotor"
              + " onto the board with a jig, never by hand.");
  private static final Caution ROTOR =
      new Caution(
          "spinning rotor",
          "A rotor that sheds a magnet throws it. Guard it, keep hair and sleeves away, spin it up"
              + " slowly from a distance, and prove the bond before you trust a speed.");
  private static final Caution HEAT =
      new Caution(
          "hot copper",
          "Copper and laminate burn skin well below the temperature at which anything is seen or"
              + " smelt. Measure the temperature, fuse the supply, and leave nothing running"
              + " unattended.");
  private static final Caution SUPPLY =
      new Caution(
          "live supply",
          "Switch off and let capacitors discharge before touching anything. A turning rotor keeps"
              + " voltage on the terminals with the supply switched off; batteries have no switch.");
  private static final Caution LAW =
      new Caution(
          "local codes",
          "This report is no proof of safety. Where mains, buildings, vehicles, medical use or"
              + " other people's safety are concerned, the codes that hold where you are and a"
              + " licensed practitioner decide.");
  private static final Caution MEASURE =
      new Caution(
          "computed values",
          "Every figure here is computed from the drawing, none is measured. Build one, measure it"
              + " against the acceptance limits, and only then build more.");

  private Cautions() {}

  /** Those of this board first, then those of every machine. */
  public static List<Caution> of(Results r) {
    List<Caution> out = new ArrayList<>(own(r));
    out.addAll(List.of(MAGNETS, ROTOR, HEAT, SUPPLY));
    out.add(spacing(r.spec().duty().map(Spec.Duty::busVolt).orElse(OptionalDouble.empty())));
    out.add(LAW);
    out.add(MEASURE);
    return out;
  }

  /** What the figures of this very machine give cause for. */
  static List<Caution> own(Results r) {
    return r.machine().stream()
        .flatMap(m -> m.cautions().stream())
        .map(c -> new Caution(c.code().replace('-', ' '), Words.capital(c.message()) + "."))
        .toList();
  }

  private static Caution spacing(OptionalDouble busVolt) {
    String more =
        busVolt.isPresent() && busVolt.getAsDouble() > EXTRA_LOW_VOLT
            ? " At more than 60 V d.c. a touch can kill: the insulation standards that apply to"
                + " the finished equipment decide the distances, and they ask for more."
            : "";
    return new Caution(
        "insulation",
        "The gaps between copper, and the solder mask, keep the winding working; they are no"
            + " protection against electric shock."
            + more);
  }

  /** The topics that hold for every machine, in one line. */
  static String line() {
    return String.join(
        ", ", List.of(MAGNETS, ROTOR, HEAT, SUPPLY, LAW).stream().map(Caution::topic).toList());
  }
}
