package etchloom.rim;

import java.util.List;

/** The coils of one path of a phase in the order in which its current passes them. */
record Chain(String phase, List<Pin> entries, List<Pin> exits) {
  Chain {
    entries = List.copyOf(entries);
    exits = List.copyOf(exits);
  }

  List<Integer> coils() {
    return entries.stream().map(Pin::coil).toList();
  }

  Pin first() {
    return entries.get(0);
  }

  Pin last() {
    return exits.get(exits.size() - 1);
  }
}
