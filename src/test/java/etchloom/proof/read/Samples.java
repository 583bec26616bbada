package etchloom.proof.read;

import etchloom.proof.image.LayerImage;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** Files for the tests: those under resources, and Gerber files put together from their middle. */
final class Samples {
  static final String MM = "%FSLAX46Y46*%\n%MOMM*%\nG75*\n";

  private Samples() {}

  static byte[] file(String name) {
    try (InputStream in = Samples.class.getResourceAsStream("/proof/read/" + name)) {
      return in.readAllBytes();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static LayerImage gerber(String text) throws UnreadableFile {
    return GerberReader.read("t.gbr", text.getBytes(StandardCharsets.UTF_8));
  }

  /** A millimetre file with six decimals whose objects are {@code body}. */
  static LayerImage mm(String body) throws UnreadableFile {
    return gerber(MM + body + "M02*\n");
  }

  static double area(String body) throws UnreadableFile {
    return TestCopper.of(mm(body)).getArea();
  }
}
