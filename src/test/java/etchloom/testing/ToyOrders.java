package etchloom.testing;

import etchloom.write.OrderInfo;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** What the toy boards are ordered with. */
public final class ToyOrders {
  private ToyOrders() {}

  /** Without a creation date. */
  public static OrderInfo plain(double thicknessMm) {
    return at(thicknessMm, Optional.empty());
  }

  public static OrderInfo at(double thicknessMm, Optional<Instant> created) {
    return new OrderInfo(
        "0.1.0",
        created,
        thicknessMm,
        "ENIG",
        "green",
        150,
        "+/-0.08 mm",
        "Standard class",
        new OrderInfo.Drawn(0.2, 0.2, OptionalDouble.empty()),
        Optional.of(new OrderInfo.Drawn(0.2, 0.2, OptionalDouble.empty())),
        "open: one net for each phase",
        List.of("U1-U2 0.123 ohm at 20 C (0.110 to 0.140 ohm)"));
  }
}
