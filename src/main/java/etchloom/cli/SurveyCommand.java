package etchloom.cli;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.Staged;
import etchloom.survey.Axis;
import etchloom.survey.AxisReader;
import etchloom.survey.Bench;
import etchloom.survey.Done;
import etchloom.survey.Grid;
import etchloom.survey.Part;
import etchloom.survey.Seek;
import etchloom.survey.Span;
import etchloom.survey.SpanReader;
import etchloom.survey.Survey;
import etchloom.survey.SurveyTrouble;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code survey SPEC}: many variants of one spec, drawn, checked and solved. */
@Command(
    name = "survey",
    mixinStandardHelpOptions = true,
    description = "Draws, checks and solves many variants of one spec, to choose among them.",
    sortOptions = false,
    synopsisHeading = "Usage: ",
    footer = {
      "",
      "VALUES  a list a,b,c; whole numbers 4..13; or equal steps: 0.15mm..0.3mm/5",
      "        is five steps, so six values, both ends included",
      "KEY     of --keep, --rank and --seek: a path in report.json, or the end of",
      "        one; with :low or :high behind it, which way is best",
      "",
      "--seek uses CMA-ES of Apache Commons Math, seeded; what it finds is good, not",
      "provably the best.",
      "",
      "The same command goes on where it was interrupted. Examples:",
      "  etchloom survey wheel.yaml --vary coil.track=0.15mm..0.3mm/6 board.layers=2,4",
      "  etchloom survey wheel.yaml --seek motorConstant --within coil.turns=5..25"
    })
final class SurveyCommand implements Callable<Integer> {
  private final Console console;

  @Parameters(arity = "0..*", paramLabel = "SPEC", description = "the spec; --join: the parts")
  private List<String> paths = new ArrayList<>();

  @Option(
      names = "--vary",
      arity = "1..*",
      paramLabel = "KEY=VALUES",
      description = "a key of the spec and its values, the last key varying fastest")
  private List<String> vary = new ArrayList<>();

  @Option(
      names = "--keep",
      paramLabel = "EXPR",
      description = "only variants of which this holds, such as \"terminalOhm < 5\"")
  private String keep = "";

  @Option(names = "--rank", paramLabel = "KEY", description = "best first by this figure")
  private String rank = "";

  @Option(
      names = "--seek",
      paramLabel = "KEY",
      description = "instead of --vary: search for the best value of this figure")
  private String seek;

  @Option(
      names = "--within",
      arity = "1..*",
      paramLabel = "KEY=LOW..HIGH",
      description = "--seek: a key and its range; left out: track, space and radii of the coil")
  private List<String> within = new ArrayList<>();

  @Option(
      names = "--trials",
      paramLabel = "N",
      description = "--seek: how many boards to draw (default: ${DEFAULT-VALUE})")
  private int trials = 400;

  @Option(
      names = "--seed",
      paramLabel = "N",
      description = "--seek: another number searches by other ways (default: ${DEFAULT-VALUE})")
  private long seed = 1;

  @Option(
      names = "--part",
      paramLabel = "K/N",
      description = "do the K-th of N parts only, for job arrays")
  private String part;

  @Option(names = "--join", description = "put the parts in the folders DIR... together")
  private boolean join;

  @Option(
      names = "-o",
      paramLabel = "DIR",
      description = "folder of the survey; TITLE-survey beside the spec if left out")
  private String folder;

  @Mixin private CommonOptions options;

  SurveyCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    takeBack(vary);
    takeBack(within);
    try {
      return join ? joined() : seek != null ? sought() : surveyed();
    } catch (SurveyTrouble e) {
      throw new DiskTrouble(e.getMessage());
    } catch (UncheckedIOException e) {
      throw trouble(e.getCause());
    } catch (IOException e) {
      throw trouble(e);
    }
  }

  /** An option that takes several values takes what follows them too. */
  private void takeBack(List<String> values) {
    values.stream().filter(v -> v.indexOf('=') < 0).forEach(paths::add);
    values.removeIf(v -> v.indexOf('=') < 0);
  }

  private static DiskTrouble trouble(IOException e) {
    String file = e instanceof FileSystemException f && f.getFile() != null ? f.getFile() : "";
    String place = file.isEmpty() ? "the survey's folder" : file;
    return new DiskTrouble(place + ": cannot be read or written: " + InputFiles.reason(e));
  }

  private int surveyed() throws IOException {
    if (paths.size() != 1) {
      throw usage("one spec is wanted, found " + paths.size());
    }
    if (vary.isEmpty() || !within.isEmpty()) {
      throw usage("--vary KEY=VALUES is wanted, or --seek KEY with --within KEY=LOW..HIGH");
    }
    Grid grid = new Grid(axes());
    if (grid.count() > Grid.MOST) {
      throw usage("there are more than " + Grid.MOST + " variants");
    }
    Part own = part == null ? Part.WHOLE : part();
    InputFiles.Inputs in = InputFiles.read(paths.get(0), options.fab());
    Bench bench = bench(in, grid.axes());
    String slug = in.file().spec().slug();
    Path dir = folder == null ? beside(in, slug, own) : InputFiles.path(folder);
    Survey.Spec name = new Survey.Spec(in.file().spec().title(), slug);
    ProgressLine progress = new ProgressLine(console, options.quiet());
    return told(dir, Survey.grid(dir, bench, name, grid, own, wish(), progress));
  }

  private int sought() throws IOException {
    if (paths.size() != 1) {
      throw usage("one spec is wanted, found " + paths.size());
    }
    if (!vary.isEmpty() || part != null || !rank.isBlank()) {
      throw usage("--seek goes with --within and --keep; not with --vary, --part or --rank");
    }
    if (trials < Seek.LEAST_TRIALS || trials > 1_000_000) {
      throw usage("--trials takes " + Seek.LEAST_TRIALS + " to 1000000; found " + trials);
    }
    InputFiles.Inputs in = InputFiles.read(paths.get(0), options.fab());
    List<Span> spans = within.isEmpty() ? UsualSpans.of(in) : spans();
    String slug = in.file().spec().slug();
    Path dir = folder == null ? beside(in, slug, Part.WHOLE) : InputFiles.path(folder);
    Survey.Spec name = new Survey.Spec(in.file().spec().title(), slug);
    Seek.Wish wish = new Seek.Wish(seek.strip(), spans, keep.strip(), trials, seed);
    ProgressLine progress = new ProgressLine(console, options.quiet());
    return told(dir, Seek.run(dir, bench(in, List.of()), name, wish, progress));
  }

  private List<Span> spans() {
    List<Span> out = new ArrayList<>();
    List<Diagnostic> wrong = new ArrayList<>();
    Set<String> keys = new HashSet<>();
    for (String w : within) {
      Staged<Span> span = SpanReader.read(w);
      wrong.addAll(span.diagnostics());
      span.value().ifPresent(out::add);
      if (span.value().isPresent() && !keys.add(span.value().get().key())) {
        throw usage("--within names " + span.value().get().key() + " twice");
      }
    }
    if (!wrong.isEmpty()) {
      throw new BadInput(wrong);
    }
    return out;
  }

  private Bench bench(InputFiles.Inputs in, List<Axis> axes) {
    List<String> fabs =
        axes.stream().filter(a -> a.key().equals("fab")).flatMap(a -> a.values().stream()).toList();
    byte[] text = in.specText().getBytes(java.nio.charset.StandardCharsets.UTF_8);
    return new Bench(paths.get(0), text, FabShelf.of(in, options.fab(), fabs), Version.TEXT);
  }

  private static Path beside(InputFiles.Inputs in, String slug, Part part) {
    String more = part.equals(Part.WHOLE) ? "" : "-part-" + part.number() + "-of-" + part.of();
    return in.specPath().resolveSibling(slug + "-survey" + more);
  }

  private int joined() throws IOException {
    if (paths.isEmpty() || !vary.isEmpty() || part != null) {
      throw usage("--join takes the folders of the parts, and neither --vary nor --part");
    }
    List<Path> parts = paths.stream().map(InputFiles::path).toList();
    Path dir = folder == null ? Survey.placeFor(parts) : InputFiles.path(folder);
    return told(dir, Survey.join(parts, dir, wish()));
  }

  private int told(Path dir, Staged<Done> staged) throws IOException {
    Done done = staged.value().orElseThrow(() -> new BadInput(staged.diagnostics()));
    if (options.json()) {
      Files.copy(dir.resolve("survey.json"), console.out());
      console.out().flush();
    } else if (!options.quiet()) {
      console.out().print(done.text(dir.resolve("survey.html").toString()));
    }
    if (done.faults() > 0) {
      return ExitCode.FAULT;
    }
    return done.passed() > 0 ? ExitCode.DONE : ExitCode.REFUSED;
  }

  private Survey.Wish wish() {
    return new Survey.Wish(keep.strip(), rank.strip());
  }

  private List<Axis> axes() {
    List<Axis> out = new ArrayList<>();
    List<Diagnostic> wrong = new ArrayList<>();
    Set<String> keys = new HashSet<>();
    for (String v : vary) {
      Staged<Axis> axis = AxisReader.read(v);
      wrong.addAll(axis.diagnostics());
      axis.value().ifPresent(out::add);
      if (axis.value().isPresent() && !keys.add(axis.value().get().key())) {
        throw usage("--vary names " + axis.value().get().key() + " twice");
      }
    }
    if (!wrong.isEmpty()) {
      throw new BadInput(wrong);
    }
    return out;
  }

  private Part part() {
    return Part.read(part)
        .orElseThrow(() -> usage("--part takes K/N, the K-th of N parts, as 1/8; found " + part));
  }

  private static BadInput usage(String message) {
    return BadInput.of("survey", "usage", message, "etchloom survey --help");
  }
}
