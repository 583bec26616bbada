package etchloom.report;

import java.util.Locale;

/** Where a figure comes from and how far it can be trusted. */
enum Basis {
  RESISTANCE(
      "Resistance",
      "drawn length, etched section; IEC 60028; pads ideal, no bend crowding",
      "length of the drawn copper over its etched cross-section and finished thickness, via barrels"
          + " included, at 20 C",
      "copper 1/58 ohm mm2/m and 0.393 % per kelvin, IEC 60028 (recalled)",
      "pads are ideal, no crowding of current in bends; plated copper is often 1 to 3 % worse"),
  LIMITS(
      "Acceptance limits",
      "fab tolerances at their ends (rss: root of squares); no faulty board",
      "every tolerance of the fab at its end at once (rss: their single effects as root of the sum"
          + " of squares)",
      "the rules file's tolerance of track, copper and plating",
      "as good as the fab's numbers; no faulty board is considered"),
  HOT(
      "Hot resistance",
      "linear law, 0.393 %/K; IEC 60028; whole winding at one temperature",
      "the mean between terminals, scaled to the temperature by the linear law",
      "IEC 60028 (recalled)",
      "the whole winding at one temperature"),
  INDUCTANCE(
      "Inductance",
      "Neumann's integral on the copper; Grover 1946; low frequency",
      "Neumann's integral over the drawn copper as partial inductances, mean distances of the"
          + " sections for copper close by",
      "Rosa 1908, Grover 1946 (recalled)",
      "low frequency, even current over each section; iron only as ideal planes; no magnets' recoil"),
  EMF(
      "Back-EMF",
      "field in closed form along the copper; charge sheets; no saturation",
      "field of evenly magnetised magnets in closed form, integrated along the drawn copper with"
          + " vias and rim, harmonic by harmonic",
      "charge sheets and images; remanence from the magnets' data sheet",
      "no saturation, no field of the current, magnets all alike; remanence is often 3 % off"),
  TORQUE(
      "Torque constant",
      "m/2 p lambda, i_d = 0; amplitude-invariant dq; mean torque",
      "m/2 times pole pairs times flux linkage, current in phase with the back-EMF (i_d = 0)",
      "amplitude-invariant dq transform",
      "mean torque; for one phase it pulsates between nought and twice the mean"),
  TAPER(
      "Tracks that widen",
      "the same turns drawn anew in even tracks; same formulas",
      "the same spec drawn without taper, and again with the widest even track, in hundredths of a"
          + " millimetre, in which its turns still fit; each with its own resistance, torque and"
          + " eddy loss by the formulas of this page",
      "the drawn copper",
      "a widening track is a row of even pieces; the spreading of the current at their steps is"
          + " left out, some thousandths of a square each"),
  LOSS(
      "Losses",
      "I2R hot, with the PWM's ripple; eddy loss of a strip; no iron, bearings, drive",
      "I2R of the current asked at the copper's temperature; PWM ripple at the modulation that"
          + " speed and current need, at its worst where they are not known; eddy loss of a strip in an alternating field,"
          + " (pi f B w)2/(6 rho) for each volume, summed over the copper and the field's harmonics",
      "texts on eddy currents in thin strips",
      "no loss in iron, magnets, bearings, air or drive"),
  THERMAL(
      "Temperature",
      "surface balance with R(T), IPC-2221 chart; one mean coefficient",
      "loss against the heat given off by both faces, iterated with the resistance at temperature",
      "the spec's mean surface coefficient; chart current from IPC-2221 for the narrowest track",
      "one temperature for the board; a guess of the coefficient is a guess of the temperature"),
  DRIVE(
      "Drive values",
      "equivalent star, pole cancelled, centred PWM; ideal switches",
      "star equivalent between terminals; gains by cancelling the winding's pole; ripple in a"
          + " line as worst case of centred modulation, R and L in steady state, copper hot",
      "texts on field-oriented control",
      "ideal switches and sensors; tune on the machine before trusting them"),
  GENERATOR(
      "Generator",
      "EMF behind R and synchronous L; phasor diagram; fundamental only",
      "phase back-EMF behind resistance and synchronous inductance, on the spec's load",
      "phasor diagram of a synchronous machine",
      "one harmonic, steady speed, losses as listed"),
  SPREAD(
      "Spread",
      "the fab's tolerances, taken as independent; magnets' spread on top",
      "tolerances of the fab at their ends, as root of the sum of squares, and drawn at random with"
          + " a fixed seed: what 95 of 100 boards keep",
      "the rules file's tolerances",
      "tolerances taken as independent; the magnets' own spread comes on top"),
  ROTOR(
      "Forces on the magnets",
      "m r w2, charge sheets and images; no imbalance, shock or overspeed",
      "mass times radius times speed squared; charge sheets against their images for the axial pull",
      "mechanics; magnetostatics of charge sheets",
      "no imbalance, no overspeed, no shock; prove the bond with a safety factor of your own");

  private final String title;
  private final String line;
  private final String method;
  private final String source;
  private final String limits;

  Basis(String title, String line, String method, String source, String limits) {
    this.title = title;
    this.line = line;
    this.method = method;
    this.source = source;
    this.limits = limits;
  }

  /** Where the page tells it. */
  String anchor() {
    return "basis-" + name().toLowerCase(Locale.ROOT);
  }

  String title() {
    return title;
  }

  String method() {
    return method;
  }

  String source() {
    return source;
  }

  String limits() {
    return limits;
  }

  /** Method, source and limits in one line of a terminal. */
  String line() {
    return line;
  }
}
