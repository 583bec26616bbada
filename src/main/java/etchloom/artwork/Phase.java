package etchloom.artwork;

import java.util.ArrayList;
import java.util.List;

/**
 * One phase from its entry to its exit: coils and the links between them. A phase of one path
 * leaves out its leads and the copper that it shares with others; one of parallel paths takes in
 * the copper that joins them, from the place where its lead leaves to the place where its exit's
 * does.
 *
 * @param steps the conductors in the order in which the phase current passes them, path by path;
 *     conductors that run side by side from one joint to the next follow each other
 * @param starts where in the steps each path begins; every path runs from the entry to the exit
 */
public record Phase(
    String mark, int entryJoint, int exitJoint, List<Step> steps, List<Integer> starts) {
  public Phase {
    steps = List.copyOf(steps);
    starts = List.copyOf(starts);
  }

  /** A phase of one path. */
  public Phase(String mark, int entryJoint, int exitJoint, List<Step> steps) {
    this(mark, entryJoint, exitJoint, steps, List.of(0));
  }

  /** The steps of each parallel path; copper that joins them may be in several. */
  public List<List<Step>> paths() {
    List<List<Step>> out = new ArrayList<>();
    for (int i = 0; i < starts.size(); i++) {
      int end = i + 1 < starts.size() ? starts.get(i + 1) : steps.size();
      out.add(steps.subList(starts.get(i), end));
    }
    return out;
  }

  /**
   * @param forward whether the current runs along the conductor's path
   */
  public record Step(int conductor, boolean forward) {}
}
