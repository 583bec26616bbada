package etchloom.receive;

import java.util.List;

/**
 * All that is known about a delivery.
 *
 * @param title of the drawn board
 * @param leadOhm what was taken off the readings
 * @param badRows rows of the file that could not be taken
 */
public record Outcome(
    String toolVersion,
    String title,
    String revision,
    double leadOhm,
    int badRows,
    List<Verdict> boards,
    Batch batch) {
  public Outcome {
    boards = List.copyOf(boards);
  }

  /** Judges all boards of a file. */
  public static Outcome of(
      String toolVersion, String title, String revision, Model model, Readings readings) {
    List<Verdict> boards = Judge.boards(model, readings);
    return new Outcome(
        toolVersion,
        title,
        revision,
        readings.leadOhm(),
        readings.faults().size(),
        boards,
        Judge.batch(model, boards));
  }

  /** Whether every board is accepted. */
  public boolean accepted() {
    return batch.rejected() == 0;
  }
}
