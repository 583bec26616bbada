package etchloom.cli;

import etchloom.diagnostic.Diagnostic;
import etchloom.proof.FolderCheck;
import etchloom.proof.FolderCheck.FolderReport;
import etchloom.proof.read.FolderReader;
import etchloom.proof.read.SetFolder;
import etchloom.proof.read.UnreadableFile;
import etchloom.report.FindingText;
import etchloom.report.FolderSummary;
import etchloom.report.ReportJson;
import etchloom.rules.RuleReport;
import etchloom.spec.FabRules;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.OptionalInt;

/** {@code check DIR}: artwork from any tool, judged by its files alone. */
final class FolderCheckRun {
  /** Rules to hold files against where nobody named any. */
  private static final String USUAL_FAB = "standard";

  private FolderCheckRun() {}

  /** Whether a path is a folder or zip file, not a spec. */
  static boolean meant(Path path) {
    return Files.isDirectory(path) || path.toString().toLowerCase(Locale.ROOT).endsWith(".zip");
  }

  static int run(
      Path path, List<String> layers, OptionalInt circuits, CommonOptions o, Console console) {
    FabRules fab = InputFiles.fab(o.fab().orElse(USUAL_FAB));
    FolderReport found;
    try (Pace pace = new Pace(console, o.quiet(), "checking")) {
      SetFolder folder = FolderReader.read(path);
      double usual = usualSeconds(folder);
      pace.left(usual);
      found =
          FolderCheck.check(
              folder,
              layers,
              circuits,
              (n, copper) -> FolderRules.shop(fab, n, copper),
              share -> pace.left((1 - share) * usual));
    } catch (UnreadableFile e) {
      throw new BadInput(List.of(Diagnostic.error(e.code(), e.where(), "", e.reason())));
    } catch (IOException e) {
      throw new DiskTrouble(path + ": cannot be read: " + InputFiles.reason(e));
    }
    RuleReport rules = FolderRules.report(found.rules());
    found
        .proof()
        .findings()
        .forEach(f -> console.err().println("error[" + f.name() + "]: " + rest(f.text())));
    rules.findings().forEach(f -> console.err().println(FindingText.line(f)));
    List<String> terminals = found.ohms().map(FolderRules::words).orElse(List.of());
    if (o.json()) {
      console.print(ReportJson.writeCheck(Version.TEXT, rules, found.proof()));
    } else if (!o.quiet()) {
      console
          .out()
          .print(
              FolderSummary.text(
                  path.toString(), fab.title(), rules, found.proof(), terminals, console.colour()));
    }
    return rules.passed() && found.proof().passed() ? ExitCode.DONE : ExitCode.REFUSED;
  }

  /** On a machine with two processors, by measurement; {@link Pace} compares. */
  private static double usualSeconds(SetFolder folder) {
    return folder.files().values().stream().mapToLong(f -> f.length).sum() * 1e-6;
  }

  /** A finding's text without its name, which stands before it already. */
  private static String rest(String text) {
    return text.substring(text.indexOf(": ") + 2);
  }
}
