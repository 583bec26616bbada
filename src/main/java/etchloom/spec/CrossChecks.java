package etchloom.spec;

import etchloom.spec.Spec.CoilOutline;
import etchloom.spec.Spec.Connection;
import java.util.Optional;

/**
 * Checks between groups of the spec that need neither fab nor geometry. NaN, the mark of a faulty
 * value, makes every comparison here false.
 */
final class CrossChecks {
  private CrossChecks() {}

  static void check(WindingDraft winding, CoilDraft coil, BoardDraft board) {
    coilCount(winding, coil);
    coilOnBoard(coil, board);
    board.holes().ifPresent(h -> h.checkPlace(board.diameter(), board.bore(), coil));
    starPoint(winding, board);
  }

  private static void coilCount(WindingDraft winding, CoilDraft coil) {
    boolean wedge = coil.outline().equals(Optional.of(CoilOutline.WEDGE));
    int coils = winding.coils();
    if (wedge && coils != CountField.FAULTY && coils < Limits.WEDGE_COILS_MIN) {
      winding
          .section()
          .error(
              Codes.COIL_COUNT,
              "coils",
              coils + " was found; wedge coils need at least " + Limits.WEDGE_COILS_MIN);
    }
    double pitch = 2 * Math.PI * coil.outerRadius() / coils;
    if (wedge && coils != CountField.FAULTY && pitch < 2 * (coil.track() + coil.space())) {
      winding
          .section()
          .error(
              Codes.COIL_COUNT,
              "coils",
              coils
                  + " coils leave "
                  + Show.mm(pitch)
                  + " each at coil.outer-radius, less than the two sides of one turn with their spaces, "
                  + Show.mm(2 * (coil.track() + coil.space())));
    }
  }

  private static void coilOnBoard(CoilDraft coil, BoardDraft board) {
    if (coil.outerRadius() >= board.diameter() / 2) {
      coil.section()
          .error(
              Codes.BOARD,
              "outer-radius",
              Show.mm(coil.outerRadius())
                  + " is not inside the board, which ends at board.diameter / 2 = "
                  + Show.mm(board.diameter() / 2));
    }
    if (board.bore() > 0 && coil.innerRadius() <= board.bore() / 2) {
      coil.section()
          .error(
              Codes.BOARD,
              "inner-radius",
              Show.mm(coil.innerRadius())
                  + " is not outside the bore, which ends at board.bore / 2 = "
                  + Show.mm(board.bore() / 2));
    }
  }

  private static void starPoint(WindingDraft winding, BoardDraft board) {
    Optional<Connection> connection = winding.connection();
    boolean star = connection.equals(Optional.of(Connection.STAR));
    if (board.starPointOut() && connection.isPresent() && !star) {
      board
          .section()
          .error(
              Codes.KEY_CONFLICT,
              "star-point",
              "there is no star point to bring out with `connection: "
                  + WindingDraft.word(connection.get())
                  + "`");
    }
    if (winding.phases() == 2 && star && !board.starPointOut()) {
      winding
          .section()
          .error(
              Codes.CONNECTION,
              "connection",
              "two phases in star need the star point: add `star-point: terminal` to board");
    }
  }
}
