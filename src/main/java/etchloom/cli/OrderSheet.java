package etchloom.cli;

import etchloom.report.OrderLines;
import etchloom.run.Laid;
import etchloom.spec.Spec;
import etchloom.write.OrderInfo;
import java.time.DateTimeException;
import java.time.Instant;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/** What the written files say beyond the artwork. */
final class OrderSheet {
  /** Common practice for plated holes that take wires and pins. */
  private static final String HOLE_TOLERANCE = "+/-0.08 mm";

  private OrderSheet() {}

  static OrderInfo of(Laid laid, Optional<Instant> created) {
    Spec spec = laid.spec();
    Spec.Board board = spec.board();
    double outerTrack = Math.min(spec.coil().trackMm(), spec.rim().trackMm());
    OrderInfo.Drawn drawn =
        new OrderInfo.Drawn(outerTrack, spec.coil().spaceMm(), OptionalDouble.empty());
    OrderInfo.Drawn inner =
        new OrderInfo.Drawn(spec.coil().trackMm(), spec.coil().spaceMm(), OptionalDouble.empty());
    return new OrderInfo(
        Version.TEXT,
        created,
        board.thicknessMm(),
        board.finish(),
        board.mask(),
        board.laminateTgC(),
        HOLE_TOLERANCE,
        laid.fab().title(),
        drawn,
        board.layers() > 2 ? Optional.of(inner) : Optional.empty(),
        circuits(spec.winding()),
        OrderLines.resistance(laid.resistance()));
  }

  private static String circuits(Spec.Winding w) {
    if (w.connection() == Spec.Connection.OPEN) {
      return "open, one net for each phase";
    }
    String name = w.connection().name().toLowerCase(Locale.ROOT);
    return w.phases() == 6
        ? "two " + name + "s of three phases, one net for each"
        : name + ", the whole winding is one net";
  }

  /**
   * The instant that the environment gives the written files, so that builds can be repeated.
   *
   * @return empty where it gives none: the files then hold no date
   */
  static Optional<Instant> created(Console console) {
    Optional<String> text = console.variable("SOURCE_DATE_EPOCH");
    try {
      return text.map(t -> Instant.ofEpochSecond(Long.parseLong(t)));
    } catch (NumberFormatException | DateTimeException e) {
      throw BadInput.of(
          "SOURCE_DATE_EPOCH",
          "epoch",
          "this is no number of seconds since 1970: '" + text.orElse("") + "'");
    }
  }
}
