package etchloom.proof;

import java.util.Collections;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * What a set of files was found to say.
 *
 * @param islands separate pieces of copper on each layer, from 1
 * @param loops gaps enclosed by copper on each layer, drilled pads left out
 * @param circuits independent closed circuits of the whole conductor
 * @param circuitsExpected what the design implies; absent where nobody said
 * @param nets pieces of copper through all layers
 * @param opens places where copper is apart that should be joined
 * @param shorts places where copper joins what should be apart
 * @param gerberDxfAreaDifferenceMm2 area that only one of the two shows, all layers; absent where
 *     there is no file of outlines
 * @param findings all that is wrong, sorted by file and place
 * @param notes what the reader should know, such as what could not be judged
 */
public record ProofReport(
    SortedMap<Integer, Integer> islands,
    SortedMap<Integer, Integer> loops,
    int circuits,
    OptionalInt circuitsExpected,
    int nets,
    int opens,
    int shorts,
    OptionalDouble gerberDxfAreaDifferenceMm2,
    List<ProofFinding> findings,
    List<String> notes) {
  public ProofReport {
    islands = Collections.unmodifiableSortedMap(new TreeMap<>(islands));
    loops = Collections.unmodifiableSortedMap(new TreeMap<>(loops));
    findings = List.copyOf(findings);
    notes = List.copyOf(notes);
  }

  public boolean passed() {
    return findings.isEmpty();
  }
}
