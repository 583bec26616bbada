package etchloom.cli;

import etchloom.diagnostic.DiagnosticText;
import etchloom.diagnostic.Staged;
import etchloom.receive.Model;
import etchloom.receive.Outcome;
import etchloom.receive.Readings;
import etchloom.receive.ReadingsReader;
import etchloom.receive.ReceiveCsv;
import etchloom.receive.ReceiveJson;
import etchloom.receive.ReceivePage;
import etchloom.receive.ReceiveText;
import etchloom.run.Drawn;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code receive SPEC READINGS}: judges delivered boards by their measured resistances. */
@Command(
    name = "receive",
    mixinStandardHelpOptions = true,
    description = "Judges delivered boards by their measured resistances.",
    sortOptions = false,
    synopsisHeading = "Usage: ",
    footer = {
      "",
      "READINGS begins with the row board,from,to,ohm,celsius; then comes a row for",
      "each measurement. OL stands where nothing connects; the board name lead gives",
      "the leads' own resistance.",
      "",
      "A pair outside what the fab's tolerances allow rejects its board, and so do",
      "pairs more unlike than those of good boards: fewer than one good board in a",
      "thousand is rejected for that."
    })
final class ReceiveCommand implements Callable<Integer> {
  private final Console console;

  @Parameters(index = "0", paramLabel = "SPEC", description = "the spec the boards were drawn from")
  private String spec;

  @Parameters(index = "1", paramLabel = "READINGS", description = "the readings, a CSV file")
  private String readings;

  @Option(
      names = "-o",
      paramLabel = "DIR",
      description = "folder for the result as csv, json and html; not written if left out")
  private String folder;

  @Mixin private CommonOptions options;

  ReceiveCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    InputFiles.Inputs in = InputFiles.read(spec, options.fab());
    byte[] bytes =
        InputFiles.bytes(
            InputFiles.path(readings), readings, "readings file", ReadingsReader.MAX_BYTES);
    Attempt attempt = Attempt.watched(in, console, options.quiet());
    Drawn drawn = attempt.drawn();
    Staged<Readings> staged = ReadingsReader.read(readings, bytes, Model.marks(drawn));
    Readings read = staged.value().orElseThrow(() -> new BadInput(staged.diagnostics()));
    console.err().print(DiagnosticText.text(read.faults()));
    if (read.all().isEmpty()) {
      throw BadInput.of(readings, "readings", "there is no reading that can be used");
    }
    Outcome outcome =
        Outcome.of(
            Version.TEXT,
            in.file().spec().title(),
            in.file().spec().revision(),
            Model.of(drawn),
            read);
    if (folder != null) {
      write(InputFiles.path(folder), outcome);
    }
    if (options.json()) {
      console.print(ReceiveJson.write(outcome));
    } else if (!options.quiet()) {
      console.out().print(ReceiveText.text(outcome));
    }
    if (!outcome.accepted()) {
      return ExitCode.REFUSED;
    }
    return read.faults().isEmpty() ? ExitCode.DONE : ExitCode.BAD_INPUT;
  }

  private static void write(Path dir, Outcome outcome) {
    try {
      Files.createDirectories(dir);
      Files.write(dir.resolve("receive.csv"), ReceiveCsv.write(outcome));
      Files.write(dir.resolve("receive.json"), ReceiveJson.write(outcome));
      Files.write(dir.resolve("receive.html"), ReceivePage.write(outcome));
    } catch (IOException e) {
      throw new DiskTrouble(dir + ": cannot be written: " + InputFiles.reason(e));
    }
  }
}
