package etchloom.artwork;

import etchloom.geometry.Point;
import java.util.Optional;

/**
 * A place where conductors meet, with a pad on each layer it needs.
 *
 * @param id its place in {@link Artwork#joints()}
 * @param padMm diameter of the pad on each of its layers; 0 where tracks just meet (then no hole)
 * @param hole diameter of the plated hole that joins its layers; empty for a joint of one layer
 * @param firstLayer the topmost layer with a pad, from 1
 * @param lastLayer the lowest layer with a pad
 * @param mark a terminal's mark ({@code U1}), else empty
 * @param what {@code coil 4, eye via 1}, in the user's words
 */
public record Joint(
    int id,
    Kind kind,
    Point at,
    double padMm,
    Optional<Double> hole,
    int firstLayer,
    int lastLayer,
    String net,
    String mark,
    String what) {

  public enum Kind {
    /** The via in a coil's eye. */
    EYE,
    /** A coil's connection point at the rim. */
    NODE,
    /** Where a radial drops to its ring. */
    DROP,
    TERMINAL
  }

  public boolean on(int layer) {
    return layer >= firstLayer && layer <= lastLayer;
  }

  public boolean terminal() {
    return kind == Kind.TERMINAL;
  }
}
