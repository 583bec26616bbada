package etchloom.report;

import etchloom.spec.Spec;
import java.util.function.Function;

/** What a figure needs of the spec, with the key that brings it. */
enum SpecKey {
  MAGNET("rotor.magnet"),
  AIR_GAP("rotor.air-gap"),
  DUTY("duty"),
  LOAD("duty.load"),
  BUS("duty.bus"),
  SPEED("duty.speed"),
  CURRENT("duty.current"),
  SWITCHING("duty.switching"),
  BANDWIDTH("duty.bandwidth or duty.switching");

  private final String words;

  SpecKey(String words) {
    this.words = words;
  }

  String words() {
    return words;
  }

  boolean given(Spec s) {
    return switch (this) {
      case MAGNET -> s.rotor().magnet().isPresent();
      case AIR_GAP -> s.rotor().airGapMm().isPresent();
      case DUTY -> s.duty().isPresent();
      case LOAD -> given(s, d -> d.loadOhm().isPresent());
      case BUS -> given(s, d -> d.busVolt().isPresent());
      case SPEED -> given(s, d -> d.speedRadPerSecond().isPresent());
      case CURRENT -> given(s, d -> d.currentAmpereRms().isPresent());
      case SWITCHING -> given(s, d -> d.switchingHertz().isPresent());
      case BANDWIDTH ->
          given(s, d -> d.bandwidthHertz().isPresent() || d.switchingHertz().isPresent());
    };
  }

  private static boolean given(Spec s, Function<Spec.Duty, Boolean> value) {
    return s.duty().map(value).orElse(false);
  }
}
