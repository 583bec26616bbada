package etchloom.electric.inductance;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * Couplings of pairs of bodies, asked for first and then worked out together on all processors.
 *
 * <p>Large ones are cut into parts along their clusters, and the parts are added up in the order in
 * which they were cut, so that no result depends on the number of processors.
 */
final class Sums {
  /** How often a large coupling is cut in two, one after the other. */
  private static final int CUTS = 4;

  /** Pairs of filaments from which a coupling counts as large. */
  private static final long LARGE = 200_000;

  private record Job(Clusters a, Clusters b, Mirror mirror, Distances distances) {
    Coupling coupling() {
      return new Coupling(a, b, mirror, distances);
    }
  }

  /** A cluster with itself (second is -1) or with another. */
  private record Part(int job, int first, int second, int weight) {}

  private final List<Job> jobs = new ArrayList<>();
  private final List<Part> parts = new ArrayList<>();

  /**
   * Asks for the coupling of a body with another, or with an image; with itself if both are the
   * same and the mirror is none.
   */
  void add(Clusters a, Clusters b, Mirror mirror, Distances distances) {
    Job job = new Job(a, b, mirror, distances);
    int cuts = (long) a.size() * b.size() < LARGE ? 0 : CUTS;
    Coupling coupling = job.coupling();
    if (a == b && mirror.equals(Mirror.NONE)) {
      within(coupling, a, 0, cuts);
    } else {
      between(coupling, a, b, 0, 0, 1, cuts);
    }
    jobs.add(job);
  }

  private void within(Coupling coupling, Clusters a, int c, int cuts) {
    int child = a.child[c];
    if (cuts == 0 || child == 0) {
      parts.add(new Part(jobs.size(), c, -1, 1));
    } else {
      within(coupling, a, child, cuts - 1);
      within(coupling, a, child + 1, cuts - 1);
      between(coupling, a, a, child, child + 1, 2, cuts - 1);
    }
  }

  private void between(
      Coupling coupling, Clusters a, Clusters b, int i, int j, int weight, int cuts) {
    int ci = a.child[i];
    int cj = b.child[j];
    if (cuts == 0 || ci == 0 && cj == 0 || coupling.far(i, j)) {
      parts.add(new Part(jobs.size(), i, j, weight));
    } else if (coupling.splitFirst(i, j)) {
      between(coupling, a, b, ci, j, weight, cuts - 1);
      between(coupling, a, b, ci + 1, j, weight, cuts - 1);
    } else {
      between(coupling, a, b, i, cj, weight, cuts - 1);
      between(coupling, a, b, i, cj + 1, weight, cuts - 1);
    }
  }

  /** One value for each coupling asked for, mm, in the order of asking. */
  double[] run() {
    double[] of = new double[parts.size()];
    IntStream.range(0, of.length)
        .parallel()
        .forEach(
            k -> {
              Part p = parts.get(k);
              Coupling c = jobs.get(p.job()).coupling();
              double value =
                  p.second() < 0 ? c.within(p.first()) : c.between(p.first(), p.second());
              of[k] = p.weight() * value;
            });
    double[] out = new double[jobs.size()];
    for (int k = 0; k < of.length; k++) {
      out[parts.get(k).job()] += of[k];
    }
    return out;
  }
}
