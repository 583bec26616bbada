package etchloom.survey;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.SourceSpan;
import etchloom.diagnostic.Staged;
import etchloom.spec.SpecFile;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicLong;

/** Finds the best values of some keys by a seeded search instead of a grid. */
public final class Seek {
  /** Independent searches, however many processors there are, so that the result is the same. */
  private static final int SEARCHES = 4;

  /** The share of the trials that go into polishing what the searches found. */
  private static final int POLISH = 3;

  public static final int LEAST_TRIALS = 40;

  /**
   * What is asked for.
   *
   * @param figure as typed
   * @param keep conditions the best must fulfil; empty for none
   * @param trials how many boards may be drawn
   */
  public record Wish(String figure, List<Span> spans, String keep, int trials, long seed) {
    public Wish {
      spans = List.copyOf(spans);
    }
  }

  private final Path dir;
  private final Bench bench;
  private final Wish wish;
  private final Space space;
  private final Goal goal;
  private final Row own;
  private final Plan plan;
  private final Progress progress;

  private Seek(
      Path dir, Bench bench, Survey.Spec spec, Wish wish, Row own, Goal goal, Progress progress) {
    this.dir = dir;
    this.bench = bench;
    this.wish = wish;
    this.own = own;
    this.goal = goal;
    this.progress = progress;
    space = new Space(wish.spans());
    List<Axis> axes = wish.spans().stream().map(s -> new Axis(s.key(), List.of(s.text()))).toList();
    String kind =
        "seek "
            + wish.figure()
            + (wish.keep().isEmpty() ? "" : " where " + wish.keep())
            + ", "
            + wish.trials()
            + " trials, seed "
            + wish.seed();
    plan =
        new Plan(
            Plan.fingerprint(bench, kind, axes),
            bench.toolVersion(),
            spec.title(),
            spec.slug(),
            kind,
            axes,
            wish.trials(),
            Part.WHOLE);
  }

  /**
   * Searches, or goes on with a search, and writes its tables.
   *
   * @return no value where keys, ranges or names of figures are wrong
   * @throws SurveyTrouble where the folder cannot be used
   */
  public static Staged<Done> run(
      Path dir, Bench bench, Survey.Spec spec, Wish wish, Progress progress) throws IOException {
    Trial base = bench.run(Map.of());
    Map<String, Object> sample =
        base.figures().isEmpty() ? middle(bench, wish).figures() : base.figures();
    Staged<Listing> listing = Survey.listing(new Survey.Wish(wish.keep(), wish.figure()), sample);
    List<Diagnostic> wrong = new ArrayList<>(Survey.keys(bench, ends(wish)));
    wrong.addAll(listing.diagnostics());
    if (listing.value().isPresent()) {
      wrong.addAll(notANumber(listing.value().get().rank().orElseThrow(), sample));
    }
    if (!wrong.isEmpty()) {
      return Staged.failed(wrong);
    }
    Listing l = listing.value().orElseThrow();
    Ranking ranking = l.rank().orElseThrow();
    Row own = base.row(0, Map.of());
    double scale = ranking.of(own).map(Math::abs).filter(s -> s > 0).orElse(1.0);
    Seek seek = new Seek(dir, bench, spec, wish, own, new Goal(ranking, l.keep(), scale), progress);
    return Staged.of(seek.run(l));
  }

  private static Trial middle(Bench bench, Wish wish) {
    double[] half = new double[wish.spans().size()];
    java.util.Arrays.fill(half, 0.5);
    return bench.run(new Space(wish.spans()).values(half));
  }

  private static Grid ends(Wish wish) {
    return new Grid(
        wish.spans().stream().map(s -> new Axis(s.key(), List.of(s.value(0)))).toList());
  }

  private static List<Diagnostic> notANumber(Ranking r, Map<String, Object> sample) {
    boolean known = sample.isEmpty() || r.name().number(sample).isPresent();
    SourceSpan at = SourceSpan.ofFile("--seek " + r.name().name());
    return known
        ? List.of()
        : List.of(Diagnostic.error("figure", at, "", "this figure is no number"));
  }

  private Done run(Listing listing) throws IOException {
    try (Journal journal = Journal.open(dir, plan)) {
      Folder.variants(dir);
      Folder.rules(dir, bench.shelf());
      List<List<Row>> all = search();
      merge(journal, all);
    }
    Optional<Best> best = Optional.of(trace());
    return new Done(plan, Folder.tables(dir, plan, listing, best), best);
  }

  private List<List<Row>> search() throws IOException {
    AtomicLong count = new AtomicLong();
    Best best = new Best(goal);
    int polish = wish.trials() / POLISH;
    int each = (wish.trials() - polish) / SEARCHES;
    double[] anchor = anchor();
    double[][] points = new double[SEARCHES][];
    double[] scores = new double[SEARCHES];
    Crew.run(
        1,
        SEARCHES,
        k -> one((int) k, anchor, each, row -> tell(row, best, count)),
        (k, s) -> {
          points[(int) k - 1] = s.bestPoint();
          scores[(int) k - 1] = s.best();
        });
    int first = 0;
    for (int k = 1; k < SEARCHES; k++) {
      first = scores[k] < scores[first] ? k : first;
    }
    double[] from = points[first];
    String name = name(SEARCHES + 1);
    try (Journal j = Journal.open(dir, name, plan, 1)) {
      new Search(
              bench,
              space,
              goal,
              anchor,
              dir,
              name,
              j,
              polish,
              row -> tell(row, best, count),
              progress)
          .polish(from);
    }
    List<List<Row>> rows = new ArrayList<>();
    for (int k = 1; k <= SEARCHES + 1; k++) {
      List<Row> some = new ArrayList<>();
      Journal.each(dir, name(k), some::add);
      rows.add(some);
    }
    return rows;
  }

  private static String name(int k) {
    return "seek-" + k + ".journal";
  }

  private Search one(int k, double[] anchor, int budget, java.util.function.Consumer<Row> told) {
    String name = name(k);
    try (Journal j = Journal.open(dir, name, plan, 1)) {
      Search s = new Search(bench, space, goal, anchor, dir, name, j, budget, told, progress);
      s.evolve(wish.seed() * SEARCHES + k, k == 1);
      return s;
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
  }

  private void tell(Row row, Best best, AtomicLong count) {
    String words;
    synchronized (best) {
      best.add(row);
      words = best.words();
    }
    progress.at(count.incrementAndGet(), wish.trials(), words);
  }

  /** The spec's own values where they lie in the ranges, else the ranges' middle. */
  private double[] anchor() {
    double[] out = new double[space.size()];
    Optional<SpecFile> file = bench.file();
    for (int i = 0; i < out.length; i++) {
      Span s = space.spans().get(i);
      double share = file.flatMap(f -> OwnValue.of(f, s)).map(s::share).orElse(0.5);
      out[i] = share >= 0 && share <= 1 ? share : 0.5;
    }
    return out;
  }

  /** Into one journal as if the searches had taken turns, the polishing at the end. */
  private void merge(Journal journal, List<List<Row>> all) throws IOException {
    List<Row> rows = new ArrayList<>();
    int longest = all.subList(0, SEARCHES).stream().mapToInt(List::size).max().orElse(0);
    for (int i = 0; i < longest; i++) {
      for (List<Row> some : all.subList(0, SEARCHES)) {
        if (i < some.size()) {
          rows.add(some.get(i));
        }
      }
    }
    rows.addAll(all.get(SEARCHES));
    for (int i = (int) journal.next() - 1; i < rows.size(); i++) {
      Row r = rows.get(i);
      Optional<String> yaml = bench.yaml(r.values());
      if (yaml.isPresent()) {
        Folder.variant(dir, i + 1, yaml.get());
      }
      journal.append(new Row(i + 1, r.values(), r.passed(), r.reason(), r.figures()));
    }
  }

  private Best trace() throws IOException {
    Best best = new Best(goal);
    best.begin(own, wish.spans());
    Journal.each(dir, best::add);
    return best;
  }
}
