package etchloom.proof.read;

import etchloom.proof.image.Plating;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** The tools a drill program defines. */
final class NcTools {
  /** Wider than any drill or cutter, mm. */
  private static final double MAX_DIAMETER_MM = 1000;

  private record Definition(double diameterMm, List<String> function, Plating typed) {}

  private final Reading reading;
  private final AttributeStore attributes;
  private final DrillNumbers numbers;
  private final Map<Integer, Definition> tools = new HashMap<>();
  private Plating typed = Plating.UNKNOWN;

  NcTools(Reading reading, AttributeStore attributes, DrillNumbers numbers) {
    this.reading = reading;
    this.attributes = attributes;
    this.numbers = numbers;
  }

  /** What a customary comment says of the tools that follow it. */
  void typed(Plating plating) {
    typed = plating;
  }

  /**
   * Obeys {@code T01C0.400}; feed, speed and the like may stand between.
   *
   * @return the tool's number, 0 for none
   */
  int define(NcWords words, int line) throws UnreadableFile {
    int number = words.whole(0);
    if (number < 0) {
      throw reading.fail(line, "syntax", "no tool number after T");
    }
    double diameter = Double.NaN;
    for (int i = 1; i < words.count(); i++) {
      char letter = words.letter(i);
      if (letter == 'C') {
        diameter = words.mm(i, numbers, line);
      } else if ("FSBHZ".indexOf(letter) < 0) {
        throw reading.fail(line, "syntax", "cannot read '" + letter + "' of tool T" + number);
      }
    }
    if (!Double.isNaN(diameter)) {
      put(number, diameter, line);
    }
    return number;
  }

  private void put(int number, double diameter, int line) throws UnreadableFile {
    if (!(diameter > 0 && diameter <= MAX_DIAMETER_MM)) {
      throw reading.fail(
          line, "tool-size", "tool T" + number + " has the diameter " + Shown.mm(diameter) + " mm");
    }
    List<String> function = attributes.apertureNow(line).getOrDefault(".AperFunction", List.of());
    Definition old = tools.put(number, new Definition(diameter, function, typed));
    reading.charge(1, line);
    if (old != null && old.diameterMm != diameter) {
      throw reading.fail(line, "tool-twice", "tool T" + number + " is defined twice, differently");
    }
  }

  DrillTool select(int number, int line) throws UnreadableFile {
    Definition d = tools.get(number);
    if (d == null) {
      throw reading.fail(line, "undefined-tool", "tool T" + number + " has no diameter");
    }
    Plating file = DrillTool.ofHole(DrillSpan.of(attributes.file()).plating());
    return DrillTool.of(
        number, d.diameterMm, d.typed == Plating.UNKNOWN ? file : d.typed, d.function);
  }
}
