package etchloom.watch;

import java.util.Optional;
import java.util.SortedMap;

/**
 * What the page shows.
 *
 * @param version changes with everything that is shown, also from one run to the next
 * @param set the last set that was drawn, if any was
 * @param trouble why the spec as it stands now is not drawn, if so
 */
record Showing(String version, Optional<SortedMap<String, byte[]>> set, Optional<String> trouble) {

  Optional<byte[]> file(String name) {
    return set.flatMap(s -> Optional.ofNullable(s.get(name)));
  }
}
