package etchloom.receive;

import java.util.Locale;

/** What a rejected board most likely suffers from, by the pattern of its resistances. */
public enum Cause {
  NONE("nothing is wrong"),
  OPEN_PHASE("a break in a phase, its vias or a terminal"),
  SWAPPED_TERMINALS("two terminals have changed places"),
  SHORTED_LAYERS("two layers of a coil touch"),
  COPPER_THICKNESS("all off by one factor: copper too thin or too thick"),
  ONE_PHASE("one phase is off: etching, or a bad via"),
  UNCLEAR("no single fault explains the readings");

  private final String meaning;

  Cause(String meaning) {
    this.meaning = meaning;
  }

  /** In plain words, for people. */
  public String meaning() {
    return meaning;
  }

  /** {@code open-phase}, as bound by the spec page. */
  public String word() {
    return name().toLowerCase(Locale.ROOT).replace('_', '-');
  }
}
