package etchloom.cli;

import etchloom.spec.Templates;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** {@code new}: lists the starting specs, or copies one. */
@Command(
    name = "new",
    mixinStandardHelpOptions = true,
    description = "Lists the starting specs, or copies one to a file of yours.",
    sortOptions = false,
    synopsisHeading = "Usage: ",
    footer = {
      "",
      "A fab class can be copied too, to put your fab's own numbers in:",
      "  etchloom new standard my-fab.yaml     then, in the spec: fab: ./my-fab.yaml"
    })
final class NewCommand implements Callable<Integer> {
  private final Console console;

  @Parameters(index = "0", arity = "0..1", paramLabel = "NAME", description = "which one")
  private String name;

  @Parameters(
      index = "1",
      arity = "0..1",
      paramLabel = "FILE",
      description = "where to; NAME.yaml if left out. An existing file is never overwritten.")
  private String file;

  NewCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    if (name == null) {
      list();
      return ExitCode.DONE;
    }
    byte[] bytes = content();
    String target = file == null ? name + ".yaml" : file;
    Path path = InputFiles.path(target);
    try {
      Files.write(path, bytes, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE);
    } catch (FileAlreadyExistsException e) {
      throw new DiskTrouble(target + ": is there already, and is left as it is");
    } catch (IOException e) {
      throw new DiskTrouble(target + ": cannot be written: " + InputFiles.reason(e));
    }
    console.out().println("wrote " + target);
    if (Templates.names().contains(name)) {
      console.out().println("next: etchloom draw " + target);
    }
    return ExitCode.DONE;
  }

  private byte[] content() {
    if (Templates.names().contains(name)) {
      return Templates.bytes(name);
    }
    if (Templates.fabNames().contains(name)) {
      return Templates.fabBytes(name);
    }
    List<String> all = new ArrayList<>(Templates.names());
    all.addAll(Templates.fabNames());
    throw BadInput.of(
        "new",
        "unknown-name",
        "there is no '" + name + "'; there are " + String.join(", ", all),
        BadInput.nearest(name, all));
  }

  private void list() {
    PrintStream out = console.out();
    out.println("Starting specs:");
    Templates.names().forEach(n -> row(n, Templates.description(n)));
    out.println();
    out.println("Fab classes:");
    Templates.fabNames().forEach(n -> row(n, Templates.fabDescription(n)));
    out.println();
    out.println("etchloom new NAME [FILE] copies one.");
  }

  private void row(String n, String description) {
    int colon = description.indexOf(": ");
    String text = colon < 0 ? description : description.substring(colon + 2);
    String indent = " ".repeat(19);
    StringBuilder line = new StringBuilder("  " + n + " ".repeat(Math.max(1, 17 - n.length())));
    for (String word : text.split(" ")) {
      int start = line.lastIndexOf("\n") + 1;
      if (line.length() - start + word.length() > 79) {
        line.append('\n').append(indent);
      }
      line.append(word).append(' ');
    }
    console.out().println(line.toString().replaceAll(" +\n", "\n").stripTrailing());
  }
}
