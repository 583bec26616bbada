package etchloom.spec.yaml;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.SourceSpan;
import etchloom.diagnostic.Staged;
import etchloom.spec.yaml.YamlNode.Broken;
import etchloom.spec.yaml.YamlNode.Entry;
import etchloom.spec.yaml.YamlNode.Mapping;
import etchloom.spec.yaml.YamlNode.Scalar;
import etchloom.spec.yaml.YamlNode.Sequence;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Parse;
import org.snakeyaml.engine.v2.events.CollectionStartEvent;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.events.NodeEvent;
import org.snakeyaml.engine.v2.events.ScalarEvent;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;

/**
 * Reads one YAML document, a group at its top, from bytes. Time and memory are bounded by the size
 * limit; nesting by {@link #MAX_DEPTH}.
 */
public final class YamlFile {
  /** Largest file that is read: 1 MiB. */
  public static final int MAX_BYTES = 1 << 20;

  /** Deepest nesting; the formats need three levels. */
  public static final int MAX_DEPTH = 16;

  private final SourceText source;
  private final Findings findings;
  private final Iterator<Event> events;

  private YamlFile(SourceText source, Findings findings) {
    this.source = source;
    this.findings = findings;
    LoadSettings settings = LoadSettings.builder().setCodePointLimit(2 * MAX_BYTES).build();
    this.events = new Parse(settings).parseString(source.text()).iterator();
  }

  /**
   * Reads a file. Whatever is wrong goes to {@code findings}, with the rest still returned where
   * there is a rest: refused parts are {@link Broken}. Empty when nothing could be made of it.
   */
  public static Optional<Mapping> read(String file, byte[] bytes, Findings findings) {
    Staged<SourceText> decoded = SourceText.decode(file, bytes, MAX_BYTES);
    decoded.diagnostics().forEach(findings::add);
    if (decoded.value().isEmpty()) {
      return Optional.empty();
    }
    SourceText source = decoded.value().get();
    try {
      return new YamlFile(source, findings).document(file);
    } catch (YamlEngineException e) {
      SyntaxFault.report(e, source, file, findings);
    } catch (TooDeep e) {
      findings.error(
          YamlCodes.DEPTH, e.where, "", "groups are nested more than " + MAX_DEPTH + " deep here");
    }
    return Optional.empty();
  }

  private Optional<Mapping> document(String file) {
    events.next(); // the start of the stream
    Event first = events.next();
    if (first.getEventId() == Event.ID.StreamEnd) {
      return empty(file);
    }
    Event top = events.next();
    YamlNode root = node(top, "", 0);
    events.next(); // the end of the document
    Event after = events.next();
    if (after.getEventId() == Event.ID.DocumentStart) {
      findings.error(
          YamlCodes.DOCUMENTS,
          span(after),
          "",
          "a second document starts here; a file holds one, without `---` between its parts");
    }
    return root.match(
        scalar -> scalar.isNull() ? empty(file) : notAGroup(scalar.span()),
        Optional::of,
        sequence -> notAGroup(sequence.span()),
        broken -> Optional.empty());
  }

  private Optional<Mapping> empty(String file) {
    findings.error(
        YamlCodes.EMPTY,
        SourceSpan.ofFile(file),
        "",
        "the file is empty; a spec starts with `etchloom: 1`",
        "copy a starting spec with the command `new`");
    return Optional.empty();
  }

  private Optional<Mapping> notAGroup(SourceSpan where) {
    findings.error(
        YamlCodes.SYNTAX, where, "", "the file must hold keys with values, such as `etchloom: 1`");
    return Optional.empty();
  }

  private YamlNode node(Event event, String path, int depth) {
    SourceSpan span = span(event);
    if (depth > MAX_DEPTH) {
      throw new TooDeep(span);
    }
    refuseMarks(event, span, path);
    switch (event.getEventId()) {
      case Scalar -> {
        ScalarEvent s = (ScalarEvent) event;
        return new Scalar(s.getValue(), s.isPlain(), span);
      }
      case MappingStart -> {
        return mapping(span, path, depth);
      }
      case SequenceStart -> {
        return sequence(span, path, depth);
      }
      default -> {
        return new Broken(span); // an alias, reported above
      }
    }
  }

  private Mapping mapping(SourceSpan span, String path, int depth) {
    List<Entry> entries = new ArrayList<>();
    Set<String> seen = new HashSet<>();
    while (true) {
      Event keyEvent = events.next();
      if (keyEvent.getEventId() == Event.ID.MappingEnd) {
        return new Mapping(entries, span);
      }
      YamlNode key = node(keyEvent, path, depth + 1);
      String name = key.match(Scalar::text, m -> "", q -> "", b -> "");
      String full = path.isEmpty() ? name : path + "." + name;
      YamlNode value = node(events.next(), full, depth + 1);
      if (key instanceof Broken) {
        continue;
      }
      if (name.isEmpty()) {
        findings.error(YamlCodes.KEY_SHAPE, key.span(), path, "a key must be a single word");
      } else if (seen.add(name)) {
        entries.add(new Entry(name, key.span(), value));
      } else {
        findings.error(
            YamlCodes.DUPLICATE_KEY,
            key.span(),
            full,
            "this key is already given in the same group; delete one of them");
      }
    }
  }

  private Sequence sequence(SourceSpan span, String path, int depth) {
    List<YamlNode> items = new ArrayList<>();
    while (true) {
      Event event = events.next();
      if (event.getEventId() == Event.ID.SequenceEnd) {
        return new Sequence(items, span);
      }
      items.add(node(event, path + "[" + items.size() + "]", depth + 1));
    }
  }

  private void refuseMarks(Event event, SourceSpan span, String path) {
    if (event.getEventId() == Event.ID.Alias) {
      findings.error(
          YamlCodes.ANCHOR,
          span,
          path,
          "aliases (`*name`) are not allowed; write the value itself");
    } else if (((NodeEvent) event).getAnchor().isPresent()) {
      findings.error(
          YamlCodes.ANCHOR, span, path, "anchors (`&name`) are not allowed; leave it out");
    }
    Optional<String> tag =
        event instanceof ScalarEvent s
            ? s.getTag()
            : event instanceof CollectionStartEvent c ? c.getTag() : Optional.empty();
    if (tag.isPresent()) {
      findings.error(YamlCodes.TAG, span, path, "tags (`!name`) are not allowed; leave it out");
    }
  }

  private SourceSpan span(Event event) {
    Mark start = event.getStartMark().orElseThrow();
    Mark end = event.getEndMark().orElseThrow();
    return source.span(start.getLine(), start.getColumn(), end.getLine(), end.getColumn());
  }

  /** Leaves the recursion at once; never seen outside this class. */
  private static final class TooDeep extends RuntimeException {
    private final transient SourceSpan where;

    TooDeep(SourceSpan where) {
      super("nested too deep", null, false, false);
      this.where = where;
    }
  }
}
