package etchloom.electric.inductance;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * The copper of a board as bodies of filaments, and how the wanted couplings follow from couplings
 * of bodies. Wanted are the first coil with itself, then all phases with each other, row by row.
 */
final class PhaseBodies {
  /**
   * @param share what each wanted coupling takes of this one
   */
  private record Term(int a, int b, double[] share) {}

  private final int phases;
  private final List<Filaments> filaments = new ArrayList<>();

  /** By how much each body is turned from the one that its filaments are. */
  private final List<Double> turnRad = new ArrayList<>();

  private final List<Term> terms = new ArrayList<>();
  private Clusters[] bodies = {};

  private PhaseBodies(int phases) {
    this.phases = phases;
  }

  /** Every phase one body: for boards whose coils do not repeat. */
  static PhaseBodies whole(Flow flow, BoardCopper copper, boolean closed) {
    int n = flow.phases().size();
    PhaseBodies out = new PhaseBodies(n);
    int coil = out.body(flow.coilFilaments(copper, closed));
    out.term(coil, coil)[0] = 1;
    List<Filaments> all = new ArrayList<>();
    for (int p = 0; p < n; p++) {
      all.add(flow.phaseFilaments(copper, p, true, closed));
    }
    out.eachPair(all);
    return out.clustered(copper);
  }

  /**
   * One coil against itself and its neighbours up to the opposite one, which gives all couplings of
   * coils; the links between a phase's coils are a body of their own, and turned back onto the
   * first coil they are another.
   */
  static PhaseBodies repeated(Flow flow, BoardCopper copper, Repeats repeats, boolean closed) {
    PhaseBodies out = new PhaseBodies(flow.phases().size());
    Filaments coil = flow.coilFilaments(copper, closed);
    out.coils(coil, repeats);
    List<Filaments> links = new ArrayList<>();
    for (int p = 0; p < out.phases; p++) {
      Filaments f = flow.phaseFilaments(copper, p, false, closed);
      if (closed) {
        flow.addWaysBack(copper, p, repeats, f);
      }
      links.add(f);
    }
    out.eachPair(links);
    out.linksWithCoils(links, repeats);
    return out.clustered(copper);
  }

  private void coils(Filaments coil, Repeats repeats) {
    int n = repeats.coils();
    for (int k = 0; k <= n / 2; k++) {
      double[] share = term(0, body(coil, k * repeats.pitchRad()));
      share[0] = k == 0 ? 1 : 0;
      for (int i = 0; i < n; i++) {
        for (int j = 0; j < n; j++) {
          int apart = Math.abs(i - j);
          if (Math.min(apart, n - apart) == k && repeats.phase(i) >= 0 && repeats.phase(j) >= 0) {
            share[at(repeats.phase(i), repeats.phase(j))] += repeats.factor(i) * repeats.factor(j);
          }
        }
      }
    }
  }

  private void linksWithCoils(List<Filaments> links, Repeats repeats) {
    for (int p = 0; p < phases; p++) {
      for (int q = 0; q < phases; q++) {
        Filaments onto = new Filaments();
        for (int k = 0; k < repeats.coils(); k++) {
          if (repeats.phase(k) == q) {
            onto.addTurned(links.get(p), -k * repeats.pitchRad(), repeats.factor(k));
          }
        }
        if (onto.size() > 0) {
          double[] share = term(body(onto), 0);
          share[at(p, q)] += 1;
          share[at(q, p)] += 1;
        }
      }
    }
  }

  /** Each phase's body with each phase's; a phase may have none. */
  private void eachPair(List<Filaments> ofPhases) {
    int[] bodyOf = new int[phases];
    for (int p = 0; p < phases; p++) {
      bodyOf[p] = ofPhases.get(p).size() == 0 ? -1 : body(ofPhases.get(p));
    }
    for (int p = 0; p < phases; p++) {
      for (int q = p; q < phases; q++) {
        if (bodyOf[p] >= 0 && bodyOf[q] >= 0) {
          double[] share = term(bodyOf[p], bodyOf[q]);
          share[at(p, q)] = 1;
          share[at(q, p)] = 1;
        }
      }
    }
  }

  private int at(int p, int q) {
    return 1 + p * phases + q;
  }

  private int body(Filaments f) {
    return body(f, 0);
  }

  private int body(Filaments f, double rad) {
    filaments.add(f);
    turnRad.add(rad);
    return filaments.size() - 1;
  }

  private double[] term(int a, int b) {
    double[] share = new double[1 + phases * phases];
    terms.add(new Term(a, b, share));
    return share;
  }

  private PhaseBodies clustered(BoardCopper copper) {
    bodies = new Clusters[filaments.size()];
    IntStream.range(0, bodies.length)
        .parallel()
        .forEach(
            i -> {
              if (turnRad.get(i) == 0) {
                bodies[i] = new Clusters(filaments.get(i), copper.sections());
              }
            });
    IntStream.range(0, bodies.length)
        .parallel()
        .forEach(
            i -> {
              if (turnRad.get(i) != 0) {
                bodies[i] = bodies[filaments.indexOf(filaments.get(i))].turned(turnRad.get(i));
              }
            });
    return this;
  }

  /** How many couplings are wanted. */
  int wanted() {
    return 1 + phases * phases;
  }

  /** Asks for what {@link #add} needs; the second body of each coupling is seen in the mirror. */
  void ask(Sums sums, Mirror mirror, Distances distances) {
    for (Term t : terms) {
      sums.add(bodies[t.a()], bodies[t.b()], mirror, distances);
    }
  }

  /**
   * Adds up the wanted couplings, mm.
   *
   * @param answers what the sums gave
   * @param from where the answers to one call of {@link #ask} begin
   * @return where the next ones begin
   */
  int add(double[] answers, int from, double[] out) {
    for (int t = 0; t < terms.size(); t++) {
      double[] share = terms.get(t).share();
      for (int i = 0; i < out.length; i++) {
        out[i] += share[i] * answers[from + t];
      }
    }
    return from + terms.size();
  }
}
