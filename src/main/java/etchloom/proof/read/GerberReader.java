package etchloom.proof.read;

import etchloom.proof.image.LayerImage;

/**
 * Reads the Gerber Layer Format, revision 2024.05, its whole drawing part: standard and macro
 * apertures, lines, arcs, regions, polarity, mirror, rotation and scale, blocks, step and repeat,
 * and attributes, also in comments.
 *
 * <p>Deprecated constructs are read with a warning where every reader takes them alike, and refused
 * where they would change the image in ways readers differ on. Blocks and repeats come out
 * expanded, up to {@link Reading#MAX_PIECES} pieces. Time and memory are linear in the size of the
 * file and of what it expands to.
 */
public final class GerberReader {
  private GerberReader() {}

  /**
   * @param name for messages
   * @throws UnreadableFile at the first thing that cannot be read
   */
  public static LayerImage read(String name, byte[] bytes) throws UnreadableFile {
    return read(new Reading(name), bytes);
  }

  static LayerImage read(Reading reading, byte[] bytes) throws UnreadableFile {
    GerberLexer lexer = new GerberLexer(bytes, reading);
    GerberFormat format = new GerberFormat(reading);
    AttributeStore attributes = new AttributeStore(reading);
    GerberPlotter plotter = new GerberPlotter(reading, format, attributes);
    GerberWords words = new GerberWords(reading, format, plotter, attributes, lexer);
    GerberCommands commands =
        new GerberCommands(reading, bytes, lexer, format, plotter, attributes);
    while (!words.ended() && lexer.next()) {
      if (lexer.extended) {
        commands.command();
      } else {
        words.word();
      }
    }
    if (!words.ended()) {
      throw reading.fail(lexer.line, "missing-end", "the file does not end in M02");
    }
    if (lexer.more()) {
      reading.warn(lexer.line, "after-end", "there is more after M02; it is not read");
    }
    plotter.finish(lexer.line);
    return new LayerImage(
        reading.file(), attributes.file(), plotter.sink().finished(lexer.line), reading.warnings());
  }
}
