package etchloom.survey;

import java.io.BufferedWriter;
import java.io.Closeable;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/**
 * A file that is made of rows, one after the other. It is written beside its place and moved there
 * when it is whole.
 */
abstract class RowWriter implements Closeable {
  private final Path place;
  private final Path draft;
  private final BufferedWriter out;

  RowWriter(Path place) throws IOException {
    this.place = place;
    draft = place.resolveSibling("." + place.getFileName() + ".part");
    out = Files.newBufferedWriter(draft, StandardCharsets.UTF_8);
  }

  final RowWriter put(String text) throws IOException {
    out.write(text);
    return this;
  }

  abstract void row(Row row) throws IOException;

  /** What follows the last row. */
  abstract void end() throws IOException;

  final void finish() throws IOException {
    end();
    out.close();
    Files.move(draft, place, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.ATOMIC_MOVE);
  }

  @Override
  public void close() throws IOException {
    out.close();
    Files.deleteIfExists(draft);
  }
}
