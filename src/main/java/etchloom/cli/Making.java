package etchloom.cli;

import etchloom.diagnostic.Staged;
import etchloom.run.Laid;
import java.time.Instant;
import java.util.Optional;
import java.util.concurrent.ForkJoinTask;

/**
 * A board being made: its files are written and proved on another processor while its figures are
 * worked out. To be used from within a pool of the fork/join kind.
 */
record Making(Attempt attempt, ForkJoinTask<LayerFiles> layers) {

  /**
   * @param draft whether the board is to be marked as one that breaks rules
   * @throws BadInput where the spec cannot be drawn
   */
  static Making of(InputFiles.Inputs in, boolean draft, Optional<Instant> created, DrawPace pace) {
    Staged<Laid> laid = Attempt.laid(in, draft);
    Laid board = laid.value().orElseThrow();
    pace.laid(board);
    ForkJoinTask<LayerFiles> layers = ForkJoinTask.adapt(() -> files(board, created, pace)).fork();
    Attempt attempt = Attempt.judged(in, laid, pace);
    return new Making(attempt, layers);
  }

  private static LayerFiles files(Laid board, Optional<Instant> created, DrawPace pace) {
    LayerFiles files = LayerFiles.of(board, created);
    pace.files();
    return files;
  }

  /**
   * @throws FailedProof where the bytes are not the winding that was asked for
   */
  SetFiles whole() {
    return SetFiles.of(attempt, layers.join());
  }
}
