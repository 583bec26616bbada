package etchloom.proof.read;

import etchloom.proof.image.DrillFile;
import etchloom.proof.image.Plating;

/**
 * Reads NC drill files: the exchange format XNC (revision 2021.11), and of the older dialects what
 * has one meaning only: zero suppression, G81, G90, M71, M72, repeated hits, arcs by I and J.
 *
 * <p>Time and memory are linear in the size of the file and of its repeats, these within {@link
 * Reading#MAX_PIECES}.
 */
public final class DrillReader {
  private final Reading reading;
  private final Lines lines;
  private final AttributeStore attributes;
  private final DrillNumbers numbers;
  private final NcTools tools;
  private final NcWords words = new NcWords();
  private final NcBody body;

  private DrillReader(Reading reading, byte[] bytes) {
    this.reading = reading;
    this.lines = new Lines(bytes);
    this.attributes = new AttributeStore(reading);
    this.numbers = new DrillNumbers(reading);
    this.tools = new NcTools(reading, attributes, numbers);
    this.body = new NcBody(reading, numbers, tools, attributes);
  }

  /**
   * @param name for messages
   * @throws UnreadableFile at the first thing that cannot be read
   */
  public static DrillFile read(String name, byte[] bytes) throws UnreadableFile {
    return read(new Reading(name), bytes);
  }

  static DrillFile read(Reading reading, byte[] bytes) throws UnreadableFile {
    return new DrillReader(reading, bytes).file();
  }

  private DrillFile file() throws UnreadableFile {
    start();
    header();
    while (!body.ended() && next()) {
      if (!words.cut(lines.bytes(), lines.from, lines.to)) {
        if (!lines.starts("M47") && !lines.is("%")) {
          throw reading.fail(lines.line, "syntax", "cannot read the line " + lines.shown());
        }
        continue;
      }
      body.obey(words, lines.line);
    }
    body.finish(lines.line);
    if (next()) {
      reading.warn(lines.line, "after-end", "there is more after the end; it is not read");
    }
    DrillSpan span = DrillSpan.of(attributes.file());
    return new DrillFile(
        reading.file(),
        span.plating(),
        span.fromLayer(),
        span.toLayer(),
        attributes.file(),
        body.holes(),
        body.slots(),
        reading.warnings());
  }

  /** Steps to the next line that is neither empty nor a comment; obeys attributes in comments. */
  private boolean next() throws UnreadableFile {
    while (lines.next()) {
      lines.strip();
      if (lines.from == lines.to) {
        continue;
      }
      if (!lines.starts(";")) {
        return true;
      }
      comment(lines.text().substring(1).strip());
    }
    return false;
  }

  private void comment(String text) throws UnreadableFile {
    if (text.startsWith("#@!")) {
      attributes.command(text.substring(3).strip(), lines.line);
      body.attributesChanged(lines.line);
    } else if (text.equals("TYPE=PLATED")) {
      tools.typed(Plating.PLATED);
    } else if (text.equals("TYPE=NON_PLATED")) {
      tools.typed(Plating.NON_PLATED);
    } else {
      numbers.comment(text);
    }
  }

  private void start() throws UnreadableFile {
    boolean any = next();
    if (any && lines.is("%")) {
      any = next();
    }
    if (!any || !lines.is("M48")) {
      throw reading.fail(
          lines.line,
          "not-a-drill-file",
          "an NC drill file starts with M48, not with " + (any ? lines.shown() : "nothing"));
    }
  }

  private void header() throws UnreadableFile {
    while (next()) {
      if (lines.is("%") || lines.is("M95")) {
        return;
      }
      headerLine();
    }
    throw reading.fail(lines.line, "truncated", "the file ends within its header; % ends that");
  }

  private void headerLine() throws UnreadableFile {
    if (lines.starts("METRIC") || lines.starts("INCH")) {
      numbers.unit(lines.text(), lines.line);
    } else if (lines.is("M71") || lines.is("M72")) {
      numbers.set(lines.is("M72"), lines.line);
    } else if (lines.starts("T") && words.cut(lines.bytes(), lines.from, lines.to)) {
      tools.define(words, lines.line);
    } else if (lines.is("ICI") || lines.is("ICI,ON") || lines.is("G91")) {
      throw reading.fail(lines.line, "incremental", "incremental coordinates are not read");
    } else if (!lines.is("FMAT,2")
        && !lines.is("ICI,OFF")
        && !lines.is("G90")
        && !lines.is("G05")) {
      reading.warn(lines.line, "header-line", "the header line " + lines.shown() + " is not read");
    }
  }
}
