package etchloom.rim;

import java.util.List;
import java.util.Optional;

/**
 * Coil ends, and at most one terminal, that are to be joined.
 *
 * @param phase the phase's mark where the link belongs to one, else empty
 * @param terminal the mark of its terminal
 * @param what in the user's words
 */
record Link(String phase, List<Pin> pins, Optional<String> terminal, String what) {
  Link {
    pins = List.copyOf(pins);
  }
}
