package etchloom.report;

import etchloom.rules.Finding;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Broken rules for the terminal: of each rule the first few places, and the keys to look at. */
public final class FindingBrief {
  /** One number in the spec breaks a rule at every turn, and the first places tell as much. */
  private static final int SHOWN = 5;

  /** The spec's keys that decide what a rule measures, the likeliest first. */
  private static final Map<String, String> KEYS =
      Map.ofEntries(
          Map.entry("track", "coil.track, rim.track"),
          Map.entry("space", "coil.space"),
          Map.entry("ring", "via.pad, via.hole, board.terminals"),
          Map.entry("hole", "via.hole"),
          Map.entry("aspect", "via.hole, board.thickness"),
          Map.entry("hole-gap", "via.pad, coil.space, board.terminals"),
          Map.entry("hole-copper", "via.pad, coil.space"),
          Map.entry("edge", "board.diameter, board.bore, board.terminals"),
          Map.entry("mask-web", "board.terminals, via.pad"),
          Map.entry("legend", "board.diameter"),
          Map.entry("copper-weight", "board.copper"),
          Map.entry("layers", "board.layers"),
          Map.entry("size", "board.diameter, board.thickness"),
          Map.entry("voltage", "coil.space, duty.bus, duty.speed"),
          Map.entry("keep-out", "board.holes, rotor.outer-diameter"),
          Map.entry("laminate", "board.laminate, duty.copper-limit"));

  private FindingBrief() {}

  /** Lines without ends, in the order of the findings; none where there are none. */
  public static List<String> lines(List<Finding> findings) {
    Map<String, List<Finding>> byRule = new LinkedHashMap<>();
    findings.forEach(f -> byRule.computeIfAbsent(f.rule(), k -> new ArrayList<>()).add(f));
    List<String> out = new ArrayList<>();
    byRule.forEach((rule, some) -> add(rule, some, out));
    return out;
  }

  private static void add(String rule, List<Finding> some, List<String> out) {
    some.stream().limit(SHOWN).map(FindingText::line).forEach(out::add);
    if (some.size() > SHOWN) {
      out.add("  " + (some.size() - SHOWN) + " more like these are listed by `check --json`");
    }
    out.add("  hint: in the spec see " + KEYS.get(rule));
  }
}
