package etchloom.receive;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.Findings;
import etchloom.diagnostic.SourceSpan;
import etchloom.diagnostic.Staged;
import etchloom.units.Quantity;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.Collectors;

/**
 * Reads measured resistances: {@code board,from,to,ohm,celsius}, one row a measurement. A bad row
 * is named by its line and left out; the others are taken.
 *
 * <p>Where a meter shows no connection the row says {@code OL}, {@code open} or {@code inf}. Rows
 * of the board {@code lead} give the leads' own resistance: their mean is taken off every reading.
 */
public final class ReadingsReader {
  /** Far more boards than a bench sees in a year. */
  public static final int MAX_BYTES = 64 << 20;

  static final List<String> COLUMNS = List.of("board", "from", "to", "ohm", "celsius");

  private static final String LEAD = "lead";
  private static final List<String> OPEN_WORDS = List.of("ol", "open", "inf", "infinity");
  private static final int NAME_MAX = 80;
  private static final double COLDEST_C = -60;
  private static final double HOTTEST_C = 200;

  private final String file;
  private final Map<String, String> marks;
  private final Findings findings = new Findings();
  private final List<Reading> taken = new ArrayList<>();
  private final List<Double> leads = new ArrayList<>();
  private int[] column = {};

  private ReadingsReader(String file, List<String> marks) {
    this.file = file;
    this.marks =
        marks.stream().collect(Collectors.toMap(ReadingsReader::folded, Function.identity()));
  }

  /**
   * @param file for messages only
   * @param marks the board's terminals
   * @return no value where the file as a whole cannot be used
   */
  public static Staged<Readings> read(String file, byte[] bytes, List<String> marks) {
    if (bytes.length > MAX_BYTES) {
      return failed(file, 0, "", "the file is larger than " + (MAX_BYTES >> 20) + " MiB");
    }
    Optional<String> text = decoded(bytes);
    if (text.isEmpty()) {
      return failed(file, 0, "", "the file is not UTF-8 text");
    }
    return new ReadingsReader(file, marks).read(text.get());
  }

  private static Optional<String> decoded(byte[] bytes) {
    try {
      String text =
          StandardCharsets.UTF_8
              .newDecoder()
              .onMalformedInput(CodingErrorAction.REPORT)
              .onUnmappableCharacter(CodingErrorAction.REPORT)
              .decode(ByteBuffer.wrap(bytes))
              .toString();
      return Optional.of(text.startsWith("\uFEFF") ? text.substring(1) : text);
    } catch (CharacterCodingException e) {
      return Optional.empty();
    }
  }

  private static Staged<Readings> failed(String file, int line, String text, String message) {
    String hint = "the first row is: " + String.join(",", COLUMNS);
    SourceSpan at = new SourceSpan(file, line, 0, 0, text);
    return Staged.failed(List.of(Diagnostic.error("readings", at, "", message, hint)));
  }

  private Staged<Readings> read(String text) {
    int number = 0;
    for (String line : (Iterable<String>) text.lines()::iterator) {
      number++;
      if (line.isBlank()) {
        continue;
      }
      if (column.length > 0) {
        row(number, line);
      } else if (!header(line)) {
        return failed(file, number, line, "the columns' names are not in the first row");
      }
    }
    if (column.length == 0) {
      return failed(file, 0, "", "the file is empty");
    }
    double lead = leads.stream().mapToDouble(Double::doubleValue).average().orElse(0);
    List<Reading> net = new ArrayList<>();
    for (Reading r : taken) {
      if (r.ohm() > lead) {
        net.add(new Reading(r.line(), r.board(), r.from(), r.to(), r.ohm() - lead, r.celsius()));
      } else {
        bad(r.line(), "", "ohm", "the leads alone have as much, " + lead + " ohm");
      }
    }
    return Staged.of(new Readings(net, lead, findings.sorted()));
  }

  private boolean header(String line) {
    List<String> names = CsvRow.values(line).stream().map(s -> s.toLowerCase(Locale.ROOT)).toList();
    if (!names.containsAll(COLUMNS)) {
      return false;
    }
    column = COLUMNS.stream().mapToInt(names::indexOf).toArray();
    return true;
  }

  private void row(int number, String line) {
    List<String> values = CsvRow.values(line);
    int most = 0;
    for (int c : column) {
      most = Math.max(most, c + 1);
    }
    if (values.isEmpty()) {
      bad(number, line, "", "a quote is not closed");
      return;
    }
    if (values.size() < most || (most == COLUMNS.size() && values.size() > most)) {
      String point = values.size() > most ? "; a decimal point is a point, not a comma" : "";
      bad(number, line, "", values.size() + " values, wanted are " + most + point);
      return;
    }
    boolean lead = values.get(column[0]).equalsIgnoreCase(LEAD);
    Optional<String> board = name(number, line, values.get(column[0]));
    OptionalDouble ohm = ohm(number, line, values.get(column[3]), lead);
    if (lead) {
      ohm.ifPresent(leads::add);
      return;
    }
    Optional<String> from = mark(number, line, "from", values.get(column[1]));
    Optional<String> to = mark(number, line, "to", values.get(column[2]));
    OptionalDouble celsius = celsius(number, line, values.get(column[4]));
    if (from.isPresent() && from.equals(to)) {
      bad(number, line, "to", "a terminal cannot be measured against itself");
    } else if (board.isPresent()
        && from.isPresent()
        && to.isPresent()
        && ohm.isPresent()
        && celsius.isPresent()) {
      taken.add(
          new Reading(
              number, board.get(), from.get(), to.get(), ohm.getAsDouble(), celsius.getAsDouble()));
    }
  }

  private Optional<String> name(int number, String line, String value) {
    boolean printable =
        value
            .codePoints()
            .noneMatch(c -> Character.isISOControl(c) || Character.getType(c) == Character.FORMAT);
    if (value.isEmpty() || value.length() > NAME_MAX || !printable) {
      bad(number, line, "board", "a board's name has 1 to " + NAME_MAX + " printable characters");
      return Optional.empty();
    }
    return Optional.of(value);
  }

  private Optional<String> mark(int number, String line, String key, String value) {
    String mark = marks.get(folded(value));
    if (mark == null) {
      String all = marks.values().stream().sorted().collect(Collectors.joining(" "));
      bad(number, line, key, "there is no terminal " + shown(value) + "; there are " + all);
    }
    return Optional.ofNullable(mark);
  }

  private OptionalDouble ohm(int number, String line, String value, boolean lead) {
    if (!lead && OPEN_WORDS.contains(value.toLowerCase(Locale.ROOT))) {
      return OptionalDouble.of(Double.POSITIVE_INFINITY);
    }
    double ohm = Quantity.readBare(value).value();
    if (lead ? ohm >= 0 : ohm > 0) {
      return OptionalDouble.of(ohm);
    }
    String wanted = lead ? "ohms, 0 or more" : "ohms above 0, or OL where nothing connects";
    bad(number, line, "ohm", shown(value) + " was found; here belong " + wanted);
    return OptionalDouble.empty();
  }

  private OptionalDouble celsius(int number, String line, String value) {
    double c = Quantity.readBare(value).value();
    if (c >= COLDEST_C && c <= HOTTEST_C) {
      return OptionalDouble.of(c);
    }
    bad(
        number,
        line,
        "celsius",
        shown(value)
            + " was found; here belongs the copper's temperature in degrees Celsius, -60 to 200");
    return OptionalDouble.empty();
  }

  private static String folded(String mark) {
    return mark.toUpperCase(Locale.ROOT);
  }

  private static String shown(String value) {
    return value.isEmpty() ? "nothing" : value.length() > 40 ? value.substring(0, 40) : value;
  }

  private void bad(int number, String line, String key, String message) {
    findings.error("reading", new SourceSpan(file, number, 0, 0, line), key, message);
  }
}
