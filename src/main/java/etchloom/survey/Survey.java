package etchloom.survey;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.SourceSpan;
import etchloom.diagnostic.Staged;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Surveys on a grid of values: doing them, going on with them, joining their parts. */
public final class Survey {
  private Survey() {}

  /**
   * How the rows are to be shown, as typed.
   *
   * @param keep a condition; empty for none
   * @param rank a figure; empty for none
   */
  public record Wish(String keep, String rank) {}

  /**
   * Does what is left to do of a part, and writes its tables.
   *
   * @param dir its folder, made or gone on with
   * @return no value where the keys, values or names of figures are wrong
   * @throws SurveyTrouble where the folder cannot be used
   */
  public static Staged<Done> grid(
      Path dir, Bench bench, Spec spec, Grid grid, Part part, Wish wish, Progress progress)
      throws IOException {
    boolean named = !(wish.keep() + wish.rank()).isEmpty();
    Map<String, Object> sample = named ? sample(bench, grid.values(1)) : Map.of();
    Staged<Listing> listing = listing(wish, sample);
    List<Diagnostic> wrong = new ArrayList<>(keys(bench, grid));
    wrong.addAll(listing.diagnostics());
    if (!wrong.isEmpty()) {
      return Staged.failed(wrong);
    }
    String print = Plan.fingerprint(bench, Plan.GRID, grid.axes());
    Plan plan =
        new Plan(
            print,
            bench.toolVersion(),
            spec.title(),
            spec.slug(),
            Plan.GRID,
            grid.axes(),
            grid.count(),
            part);
    work(dir, bench, grid, plan, progress);
    return Staged.of(done(dir, plan, listing.value().orElseThrow()));
  }

  /** What names a survey. */
  public record Spec(String title, String slug) {}

  private static Done done(Path dir, Plan plan, Listing listing) throws IOException {
    Summary summary = Folder.tables(dir, plan, listing, Optional.empty());
    return new Done(plan, summary, Optional.empty());
  }

  private static void work(Path dir, Bench bench, Grid grid, Plan plan, Progress progress)
      throws IOException {
    try (Journal journal = Journal.open(dir, plan)) {
      Folder.variants(dir);
      Folder.rules(dir, bench.shelf());
      long first = journal.next();
      long todo = plan.last() - first + 1;
      progress.at(0, todo, "");
      Crew.run(
          first,
          plan.last(),
          n -> bench.run(grid.values(n)),
          (n, trial) -> {
            if (trial.yaml().isPresent()) {
              Folder.variant(dir, n, trial.yaml().get());
            }
            trial.fault().ifPresent(f -> progress.fault(n, f));
            journal.append(trial.row(n, grid.values(n)));
            progress.at(n - first + 1, todo, "");
          });
    }
  }

  /** Figures of the first variant, or else of the spec itself; none where neither can be drawn. */
  static Map<String, Object> sample(Bench bench, Map<String, String> values) {
    Map<String, Object> figures = bench.run(values).figures();
    return figures.isEmpty() ? bench.run(Map.of()).figures() : figures;
  }

  static Staged<Listing> listing(Wish wish, Map<String, Object> sample) {
    List<Diagnostic> wrong = new ArrayList<>();
    Optional<Expression> keep = Optional.empty();
    if (!wish.keep().isEmpty()) {
      Staged<Expression> read = ExpressionReader.read("--keep", wish.keep());
      keep = read.value();
      wrong.addAll(read.diagnostics());
      keep.ifPresent(k -> wrong.addAll(Names.check("--keep", k.names(), sample)));
    }
    Optional<Ranking> rank = Optional.empty();
    if (!wish.rank().isEmpty()) {
      rank = Optional.of(Ranking.read(wish.rank(), sample));
      wrong.addAll(Names.check("--rank", List.of(rank.get().name()), sample));
    }
    return wrong.isEmpty() ? Staged.of(new Listing(wish.keep(), keep, rank)) : Staged.failed(wrong);
  }

  /** Keys that no spec has are wrong whatever their values. */
  static List<Diagnostic> keys(Bench bench, Grid grid) {
    List<Diagnostic> out = new ArrayList<>();
    for (Axis a : grid.axes()) {
      String value = a.values().get(0);
      String mark = a.key() + "=" + value + " on the command line";
      bench.reading(Map.of(a.key(), value)).stream()
          .filter(d -> d.where().file().equals(mark))
          .filter(d -> KEY_CODES.contains(d.code()))
          .forEach(out::add);
    }
    return out;
  }

  private static final List<String> KEY_CODES = List.of("unknown-key", "wrong-shape");

  /**
   * Puts the parts of one survey together, as if it had been done in one.
   *
   * @param parts their folders, in any order
   * @param dir where to
   * @return no value where the parts do not belong together or some are missing
   * @throws SurveyTrouble where a folder cannot be used
   */
  public static Staged<Done> join(List<Path> parts, Path dir, Wish wish) throws IOException {
    Map<Integer, Path> byNumber = new HashMap<>();
    Plan whole = null;
    int of = 0;
    for (Path p : parts) {
      Plan plan = Journal.plan(p);
      if (whole == null) {
        whole = plan.whole();
        of = plan.part().of();
      }
      if (!plan.whole().equals(whole) || plan.part().of() != of) {
        return failed(p, "is a part of another survey than " + parts.get(0));
      }
      if (byNumber.put(plan.part().number(), p) != null) {
        return failed(p, "part " + plan.part() + " is there twice");
      }
    }
    if (whole == null) {
      throw new IllegalArgumentException("no parts");
    }
    for (int k = 1; k <= of; k++) {
      if (!byNumber.containsKey(k)) {
        return failed(parts.get(0), "part " + k + "/" + of + " is missing");
      }
    }
    Map<String, Object> sample = new HashMap<>();
    try (Journal journal = Journal.open(dir, whole)) {
      Folder.variants(dir);
      for (int k = 1; k <= of; k++) {
        append(journal, byNumber.get(k), dir, sample);
        long last = new Part(k, of).last(whole.count());
        if (journal.next() != last + 1) {
          return failed(byNumber.get(k), "is not finished: run it again to go on with it");
        }
      }
    }
    Staged<Listing> listing = listing(wish, sample);
    if (listing.value().isEmpty()) {
      return Staged.failed(listing.diagnostics());
    }
    return Staged.of(done(dir, whole, listing.value().get()));
  }

  /** Where joined parts go if nothing is said: beside the first of them. */
  public static Path placeFor(List<Path> parts) throws IOException {
    String slug = Journal.plan(parts.get(0)).slug();
    return parts.get(0).toAbsolutePath().resolveSibling(slug + "-survey");
  }

  private static void append(Journal journal, Path part, Path dir, Map<String, Object> sample)
      throws IOException {
    try (var others = Files.newDirectoryStream(part, "fab*.yaml")) {
      for (Path rules : others) {
        copy(rules, dir.resolve(rules.getFileName()));
      }
    }
    Path from = part.resolve("variants");
    Journal.each(
        part,
        row -> {
          if (sample.isEmpty()) {
            sample.putAll(row.figures());
          }
          if (row.variant() == journal.next()) {
            String name = row.variant() + ".yaml";
            copy(from.resolve(name), dir.resolve("variants").resolve(name));
            journal.append(row);
          }
        });
  }

  private static void copy(Path from, Path to) {
    try {
      if (Files.exists(from)) {
        Files.copy(from, to, StandardCopyOption.REPLACE_EXISTING);
      }
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
  }

  private static Staged<Done> failed(Path where, String message) {
    SourceSpan at = SourceSpan.ofFile(where.toString());
    return Staged.failed(List.of(Diagnostic.error("parts", at, "", message)));
  }
}
