package etchloom.spec.yaml;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.SourceSpan;
import java.util.Iterator;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Parse;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;

/**
 * The parser's events, one after the other, up to the first fault: it is reported here, and {@link
 * Stop} is thrown. After that no event may be asked for.
 */
final class YamlEvents {
  /** The formats need a few hundred; with many more, every later stage would take its time. */
  static final int MOST = 10_000;

  private final SourceText source;
  private final Findings findings;
  private final Iterator<Event> events;
  private int count;
  private int line;

  YamlEvents(SourceText source, Findings findings) {
    this.source = source;
    this.findings = findings;
    int codePoints = source.text().length() + 1;
    LoadSettings settings = LoadSettings.builder().setCodePointLimit(codePoints).build();
    this.events = new Parse(settings).parseString(source.text()).iterator();
  }

  Event next() {
    Event event;
    try {
      event = events.next();
    } catch (YamlEngineException e) {
      SyntaxFault.report(e, source, findings);
      throw new Stop();
    } catch (IllegalArgumentException e) { // the parser's way with an escape beyond Unicode
      SyntaxFault.reportEscape(source, line, findings);
      throw new Stop();
    }
    line = event.getEndMark().orElseThrow().getLine();
    count++;
    if (count > MOST) {
      String found =
          "a file of more than " + MOST + " keys and values is no spec and no rules file";
      throw stop(YamlCodes.TOO_MANY, span(event), "", found);
    }
    return event;
  }

  SourceSpan span(Event event) {
    Mark start = event.getStartMark().orElseThrow();
    Mark end = event.getEndMark().orElseThrow();
    return source.span(start.getLine(), start.getColumn(), end.getLine(), end.getColumn());
  }

  /** Reports a fault that ends the reading; the caller throws what this gives back. */
  Stop stop(String code, SourceSpan where, String path, String message) {
    findings.error(code, where, path, message + SyntaxFault.NOTHING_BELOW);
    return new Stop();
  }

  /** Leaves the recursion at once; never seen outside this package. */
  static final class Stop extends RuntimeException {
    private static final long serialVersionUID = 1;

    private Stop() {
      super("reading ended at a fault, which was reported", null, false, false);
    }
  }
}
