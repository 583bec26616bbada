package etchloom.spec;

/** Whether the magnets of a rotor have room beside each other and on their disc. */
final class MagnetFit {
  private MagnetFit() {}

  /** Magnets may touch; this much overlap, mm and rad, is rounding. */
  private static final double SLACK = 1e-9;

  /** Keeps a whole number of thousandths from being rounded down to the one below. */
  private static final double ROUNDING = 1e-7;

  static void check(MagnetDraft m, int poles, double discDiameter) {
    if (m.outline().isEmpty()) {
      return;
    }
    if (poles != CountField.FAULTY) {
      switch (m.outline().get()) {
        case DISC -> discs(m, poles);
        case SECTOR -> sectors(m, poles);
        case BLOCK -> blocks(m, poles);
      }
    }
    if (m.outline().get() == Spec.MagnetOutline.SECTOR) {
      radii(m);
    }
    double reach = reachMm(m);
    if (reach > discDiameter / 2 + SLACK) {
      m.section()
          .error(
              Codes.MAGNET_OVERLAP,
              keyOfReach(m),
              "the magnets reach out to radius "
                  + Show.mm(reach)
                  + ", beyond rotor.outer-diameter / 2 = "
                  + Show.mm(discDiameter / 2));
    }
  }

  /** Neighbouring centres are a chord 2R·sin(π/poles) apart. */
  private static void discs(MagnetDraft m, int poles) {
    double chord = 2 * m.pitchRadius() * Math.sin(Math.PI / poles);
    if (m.diameter() > chord + SLACK) {
      overlap(m, "diameter", Show.mm(m.diameter()), poles, "at most " + mmDown(chord));
    }
  }

  private static void sectors(MagnetDraft m, int poles) {
    double room = 2 * Math.PI / poles;
    if (m.span() > room + SLACK) {
      overlap(m, "span", Show.degrees(m.span()), poles, "at most " + degreesDown(room));
    }
  }

  private static void radii(MagnetDraft m) {
    if (m.innerRadius() >= m.outerRadius()) {
      m.section()
          .error(
              Codes.RADII,
              "inner-radius",
              Show.mm(m.innerRadius())
                  + " is not less than outer-radius, "
                  + Show.mm(m.outerRadius()));
    }
  }

  /**
   * Neighbours mirror each other in the line halfway between them, so they overlap exactly when one
   * crosses that line, and its inner corner does so first.
   */
  private static void blocks(MagnetDraft m, int poles) {
    double half = Math.PI / poles;
    double innerEdge = m.pitchRadius() - m.length() / 2;
    if (m.width() / 2 * Math.cos(half) > innerEdge * Math.sin(half) + SLACK) {
      double room = 2 * innerEdge * Math.tan(half);
      String most = room > 0 ? "at most " + mmDown(room) : "a larger pitch-radius";
      overlap(m, "width", Show.mm(m.width()), poles, most);
    }
  }

  private static void overlap(MagnetDraft m, String key, String found, int poles, String room) {
    m.section()
        .error(
            Codes.MAGNET_OVERLAP,
            key,
            found
                + " makes neighbouring magnets overlap; there is room for "
                + room
                + " with "
                + poles
                + " poles");
  }

  private static String mmDown(double mm) {
    return Show.mm(Math.floor(mm * 1000 + ROUNDING) / 1000);
  }

  private static String degreesDown(double rad) {
    return Show.degrees(Math.toRadians(Math.floor(Math.toDegrees(rad) * 1000 + ROUNDING) / 1000));
  }

  private static double reachMm(MagnetDraft m) {
    return switch (m.outline().orElseThrow()) {
      case DISC -> m.pitchRadius() + m.diameter() / 2;
      case SECTOR -> m.outerRadius();
      case BLOCK -> Math.hypot(m.pitchRadius() + m.length() / 2, m.width() / 2);
    };
  }

  private static String keyOfReach(MagnetDraft m) {
    return m.section().has("pitch-radius") ? "pitch-radius" : "outer-radius";
  }
}
