package etchloom.spec.yaml;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.SourceSpan;
import etchloom.diagnostic.Staged;
import etchloom.spec.yaml.YamlEvents.Stop;
import etchloom.spec.yaml.YamlNode.Broken;
import etchloom.spec.yaml.YamlNode.Entry;
import etchloom.spec.yaml.YamlNode.Mapping;
import etchloom.spec.yaml.YamlNode.Scalar;
import etchloom.spec.yaml.YamlNode.Sequence;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.snakeyaml.engine.v2.events.CollectionStartEvent;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.events.NodeEvent;
import org.snakeyaml.engine.v2.events.ScalarEvent;

/**
 * Reads one YAML document, a group at its top, from bytes. Time and memory are bounded by the size
 * limit and the number of values; nesting by {@link #MAX_DEPTH}.
 */
public final class YamlFile {
  /** Largest file that is read: 1 MiB. */
  public static final int MAX_BYTES = 1 << 20;

  /** Deepest nesting; the formats need four levels. */
  public static final int MAX_DEPTH = 16;

  private final Findings findings;
  private final YamlEvents events;
  private boolean whole = true;

  /** Whether a value of a top key is being read, so that the entries before it are finished. */
  private boolean inTopValue;

  private YamlFile(SourceText source, Findings findings) {
    this.findings = findings;
    this.events = new YamlEvents(source, findings);
  }

  /**
   * Reads a file. Whatever is wrong goes to {@code findings}, with the rest still returned where
   * there is a rest: refused parts are {@link Broken}. Empty when nothing could be made of it.
   *
   * @param start how such a file starts, for the message when it is empty: {@code etchloom: 1}
   */
  public static Optional<YamlTree> read(
      String file, byte[] bytes, String start, Findings findings) {
    Staged<SourceText> decoded = SourceText.decode(file, bytes, MAX_BYTES);
    decoded.diagnostics().forEach(findings::add);
    if (decoded.value().isEmpty()) {
      return Optional.empty();
    }
    YamlFile yaml = new YamlFile(decoded.value().get(), findings);
    try {
      Optional<Mapping> root = yaml.document(file, start);
      return root.map(m -> new YamlTree(m, yaml.whole));
    } catch (Stop reported) {
      return Optional.empty();
    }
  }

  private Optional<Mapping> document(String file, String start) {
    events.next(); // the start of the stream
    Event first = events.next();
    if (first.getEventId() == Event.ID.StreamEnd) {
      return empty(file, start);
    }
    YamlNode root = node(events.next(), "", 0);
    if (whole) {
      checkEnd();
    }
    return root.match(
        scalar -> scalar.isNull() ? empty(file, start) : notAGroup(scalar.span(), start),
        Optional::of,
        sequence -> notAGroup(sequence.span(), start),
        broken -> Optional.empty());
  }

  /** Nothing may follow the document. */
  private void checkEnd() {
    try {
      events.next(); // the end of the document
      Event after = events.next();
      if (after.getEventId() == Event.ID.DocumentStart) {
        findings.error(
            YamlCodes.DOCUMENTS,
            events.span(after),
            "",
            "a second document starts here; a file holds one, without `---` between its parts");
      }
    } catch (Stop reported) {
      return;
    }
  }

  private Optional<Mapping> empty(String file, String start) {
    findings.error(
        YamlCodes.EMPTY,
        SourceText.start(file),
        "",
        "the file is empty; it must start with `" + start + "`",
        "copy a starting file with the command `new`");
    return Optional.empty();
  }

  private Optional<Mapping> notAGroup(SourceSpan where, String start) {
    findings.error(
        YamlCodes.SYNTAX,
        where,
        "",
        "the file must hold keys with values, each `key: value`, and start with `" + start + "`");
    return Optional.empty();
  }

  private YamlNode node(Event event, String path, int depth) {
    SourceSpan span = events.span(event);
    refuseMarks(event, span, path);
    if (depth > MAX_DEPTH && event instanceof CollectionStartEvent) {
      String found = "groups are nested more than " + MAX_DEPTH + " deep here";
      throw events.stop(YamlCodes.DEPTH, span, path, found);
    }
    switch (event.getEventId()) {
      case Scalar -> {
        ScalarEvent s = (ScalarEvent) event;
        return new Scalar(s.getValue(), s.isPlain(), false, span);
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
    try {
      entries(entries, path, depth);
    } catch (Stop reported) {
      if (depth > 0) {
        throw reported;
      }
      cutShort(entries);
    }
    return new Mapping(entries, span);
  }

  /**
   * Keeps the top groups before the fault, so that their mistakes are found in the same run. A
   * group that seems to end just before the fault may owe its end to it: nothing is said about it.
   */
  private void cutShort(List<Entry> entries) {
    whole = false;
    if (!inTopValue && !entries.isEmpty()) {
      Entry last = entries.remove(entries.size() - 1);
      entries.add(new Entry(last.key(), last.keySpan(), new Broken(last.keySpan())));
    }
  }

  private void entries(List<Entry> entries, String path, int depth) {
    Set<String> seen = new HashSet<>();
    while (true) {
      Event keyEvent = events.next();
      if (keyEvent.getEventId() == Event.ID.MappingEnd) {
        return;
      }
      YamlNode key = node(keyEvent, path, depth + 1);
      String name = key.match(Scalar::text, m -> "", q -> "", b -> "");
      String full = path.isEmpty() ? Entry.label(name) : path + "." + Entry.label(name);
      inTopValue |= depth == 0;
      YamlNode value = node(events.next(), full, depth + 1);
      inTopValue &= depth > 0;
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
}
