package etchloom.cli;

import etchloom.diagnostic.DiagnosticText;
import etchloom.spec.Suggest;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.function.Supplier;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** The program: its commands, and what becomes of what goes wrong in them. */
@Command(
    name = "etchloom",
    mixinStandardHelpOptions = true,
    version = "etchloom " + Version.TEXT,
    description =
        "Draws printed-circuit stators: reads one YAML spec, writes the copper, drill, mask, legend"
            + " and netlist files a board fab needs, checks them against the fab's rules, and"
            + " reports the electrical properties of the copper it drew.",
    synopsisHeading = "Usage: ",
    commandListHeading = "%nCommands:%n",
    footer = {
      "",
      "Start:   etchloom new filter-wheel wheel.yaml",
      "         etchloom draw wheel.yaml",
      "",
      "Exit:    0  done, every rule kept",
      "         1  done, and the answer is no: broken rules, a failed check or rejected",
      "            boards. A duty that is not met does not count; the verdict says it",
      "         2  wrong input",
      "         3  cannot read or write",
      "        70  a fault in the program"
    })
public final class App implements Runnable {
  @Spec private CommandSpec spec;

  /** Runs one command line and gives its exit code; never throws, never exits. */
  public static int run(String[] args, Console console) {
    CommandLine line = new CommandLine(new App());
    boolean named = args.length > 0 && commands(console).containsKey(args[0]);
    commands(console)
        .forEach(
            (name, command) -> {
              // Looking into a command's options takes time; only the one asked for is needed.
              if (!named || name.equals(args[0])) {
                line.addSubcommand(name, command.get());
              }
            });
    PrintWriter out = new PrintWriter(console.out(), true, StandardCharsets.UTF_8);
    PrintWriter err = new PrintWriter(console.err(), true, StandardCharsets.UTF_8);
    line.setOut(out).setErr(err);
    headings(line);
    line.getSubcommands().values().forEach(App::headings);
    line.setUsageHelpWidth(80).setUsageHelpAutoWidth(false);
    line.setColorScheme(CommandLine.Help.defaultColorScheme(CommandLine.Help.Ansi.OFF));
    line.setParameterExceptionHandler(App::misused);
    line.setExecutionExceptionHandler((e, c, r) -> failed(e, console));
    int code = line.execute(args);
    out.flush();
    err.flush();
    return code;
  }

  private static void headings(CommandLine line) {
    line.getCommandSpec()
        .usageMessage()
        .parameterListHeading("%n")
        .optionListHeading("%nOptions:%n");
  }

  private static Map<String, Supplier<Object>> commands(Console console) {
    Map<String, Supplier<Object>> all = new LinkedHashMap<>();
    all.put("new", () -> new NewCommand(console));
    all.put("draw", () -> new DrawCommand(console));
    all.put("check", () -> new CheckCommand(console));
    all.put("report", () -> new ReportCommand(console));
    all.put("survey", () -> new SurveyCommand(console));
    all.put("receive", () -> new ReceiveCommand(console));
    return all;
  }

  @Override
  public void run() {
    spec.commandLine().usage(spec.commandLine().getOut());
  }

  private static int misused(CommandLine.ParameterException e, String[] args) {
    PrintWriter err = e.getCommandLine().getErr();
    if (e instanceof CommandLine.UnmatchedArgumentException u && !u.getUnmatched().isEmpty()) {
      unmatched(u, err);
    } else {
      err.println("error[usage]: " + e.getMessage());
    }
    err.println("  hint: " + e.getCommandLine().getCommandSpec().qualifiedName() + " --help");
    return ExitCode.BAD_INPUT;
  }

  private static void unmatched(CommandLine.UnmatchedArgumentException e, PrintWriter err) {
    CommandLine at = e.getCommandLine();
    String word = e.getUnmatched().get(0);
    String name = word.split("=", 2)[0];
    boolean option = word.startsWith("-");
    Set<String> known =
        option ? at.getCommandSpec().optionsMap().keySet() : at.getSubcommands().keySet();
    String what =
        option
            ? "no such option: " + name
            : known.isEmpty() ? "one argument too many: " + word : "no such command: " + word;
    err.println("error[usage]: " + what.replaceAll("\\p{Cntrl}", "?"));
    Suggest.nearest(option ? name : word, known)
        .ifPresent(k -> err.println("  hint: did you mean `" + k + "`?"));
  }

  /** Says what went wrong, and gives the exit code for it. */
  static int failed(Exception e, Console console) {
    if (e instanceof BadInput b) {
      console.err().print(DiagnosticText.text(b.diagnostics()));
      return ExitCode.BAD_INPUT;
    }
    if (e instanceof DiskTrouble) {
      console.err().println("error[disk]: " + e.getMessage());
      return ExitCode.DISK;
    }
    return crashed(e, console);
  }

  /** Where the full trace was put; a user gets one line. */
  private static String trace(Throwable e) {
    StringWriter text = new StringWriter();
    e.printStackTrace(new PrintWriter(text));
    try {
      Path file = Files.createTempFile("etchloom-fault-", ".txt");
      Files.writeString(file, text.toString());
      return headline(e) + "; the full trace is in " + file;
    } catch (IOException io) {
      return e + "; no trace could be kept";
    }
  }

  private static String headline(Throwable e) {
    String message =
        e.getMessage() == null ? "" : ": " + e.getMessage().lines().findFirst().orElse("");
    return e.getClass().getSimpleName() + message;
  }

  /** A fault outside picocli's reach, such as memory running out. */
  static int crashed(Throwable t, Console console) {
    console.err().println("error[fault]: a fault in Etchloom itself: " + trace(t));
    return ExitCode.FAULT;
  }
}
