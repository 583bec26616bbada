package etchloom.report;

import etchloom.spec.Spec;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;

/** What a figure needs of the spec, with the key that brings it. */
enum Need {
  MAGNET("rotor.magnet", s -> s.rotor().magnet().isPresent()),
  AIR_GAP("rotor.air-gap", s -> s.rotor().airGapMm().isPresent()),
  DUTY("duty", s -> s.duty().isPresent()),
  TORQUE("duty.torque", s -> given(s, Spec.Duty::torqueNm)),
  LOAD("duty.load", s -> given(s, Spec.Duty::loadOhm)),
  BUS("duty.bus", s -> given(s, Spec.Duty::busVolt)),
  SPEED("duty.speed", s -> given(s, Spec.Duty::speedRadPerSecond)),
  CURRENT("duty.current", s -> given(s, Spec.Duty::currentAmpereRms)),
  SWITCHING("duty.switching", s -> given(s, Spec.Duty::switchingHertz)),
  BANDWIDTH(
      "duty.bandwidth or duty.switching",
      s -> given(s, Spec.Duty::bandwidthHertz) || given(s, Spec.Duty::switchingHertz));

  private final String key;
  private final Function<Spec, Boolean> given;

  Need(String key, Function<Spec, Boolean> given) {
    this.key = key;
    this.given = given;
  }

  private static boolean given(Spec s, Function<Spec.Duty, OptionalDouble> value) {
    Optional<Spec.Duty> duty = s.duty();
    return duty.isPresent() && value.apply(duty.get()).isPresent();
  }

  String key() {
    return key;
  }

  boolean given(Spec spec) {
    return given.apply(spec);
  }
}
