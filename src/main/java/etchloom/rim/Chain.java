package etchloom.rim;

import java.util.List;

/** A phase's coils in the order in which its current passes them. */
record Chain(String phase, List<Pin> entries, List<Pin> exits) {
  Chain {
    entries = List.copyOf(entries);
    exits = List.copyOf(exits);
  }

  Pin first() {
    return entries.get(0);
  }

  Pin last() {
    return exits.get(exits.size() - 1);
  }
}
