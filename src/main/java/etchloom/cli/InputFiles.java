package etchloom.cli;

import etchloom.diagnostic.SourceSpan;
import etchloom.diagnostic.Staged;
import etchloom.spec.FabReader;
import etchloom.spec.FabRules;
import etchloom.spec.Positions;
import etchloom.spec.SpecFile;
import etchloom.spec.SpecReader;
import etchloom.spec.Templates;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/** The files a command starts from, read whole and within bounds. */
final class InputFiles {
  private InputFiles() {}

  /**
   * A spec and the rules it is held against, with the texts as read.
   *
   * @param fabName the class, or the path as the user gave it
   */
  record Inputs(
      Path specPath,
      SpecFile file,
      String specText,
      String fabName,
      FabRules fab,
      String fabText,
      List<etchloom.diagnostic.Diagnostic> warnings) {
    Inputs {
      warnings = List.copyOf(warnings);
    }
  }

  /**
   * @param fabOption stands for the spec's own {@code fab} where given
   * @throws BadInput for anything wrong in either file
   * @throws DiskTrouble where a file cannot be read
   */
  static Inputs read(String spec, Optional<String> fabOption) {
    Path path = path(spec);
    byte[] bytes = bytes(path, spec, "spec");
    Staged<SpecFile> staged = SpecReader.read(spec, bytes);
    SpecFile file = staged.value().orElseThrow(() -> new BadInput(staged.diagnostics()));
    String fab = fabOption.orElse(file.spec().fab());
    if (!isPath(fab)) {
      if (!Templates.fabNames().contains(fab)) {
        throw unknownClass(fab, fabOption.isPresent() ? Optional.empty() : Optional.of(file));
      }
      byte[] fabBytes = Templates.fabBytes(fab);
      return new Inputs(
          path,
          file,
          text(bytes),
          fab,
          FabReader.builtIn(fab),
          text(fabBytes),
          staged.diagnostics());
    }
    Path fabPath = fabOption.isPresent() ? path(fab) : beside(path, fab);
    byte[] fabBytes =
        bytes(fabPath, (fabOption.isPresent() ? "" : askedBy(file)) + fabPath, "rules file");
    Staged<FabRules> rules = FabReader.read(fabPath.toString(), fabBytes);
    return new Inputs(
        path,
        file,
        text(bytes),
        fab,
        rules.value().orElseThrow(() -> new BadInput(rules.diagnostics())),
        text(fabBytes),
        staged.diagnostics());
  }

  /** {@code wheel.yaml:70:6: fab: }, for a file that is not there. */
  private static String askedBy(SpecFile file) {
    SourceSpan at = file.positions().at("fab");
    return at.file() + ":" + at.line() + ":" + at.column() + ": fab: ";
  }

  /** A path in a spec starts where the spec lies. */
  private static Path beside(Path spec, String fab) {
    return Optional.ofNullable(spec.toAbsolutePath().getParent())
        .orElse(spec)
        .resolve(path(fab))
        .normalize();
  }

  /**
   * The rules file that a spec's bytes call for; empty where it is a built-in class, and where the
   * spec cannot be understood.
   */
  static Optional<Path> rulesFile(Path spec, byte[] bytes, Optional<String> fabOption) {
    if (fabOption.isPresent()) {
      return fabOption.filter(InputFiles::isPath).map(InputFiles::path);
    }
    return SpecReader.read(spec.toString(), bytes)
        .value()
        .map(f -> f.spec().fab())
        .filter(InputFiles::isPath)
        .map(f -> beside(spec, f));
  }

  /**
   * Rules named on the command line.
   *
   * @param name a class, or a path
   */
  static FabRules fab(String name) {
    if (!isPath(name)) {
      if (!Templates.fabNames().contains(name)) {
        throw unknownClass(name, Optional.empty());
      }
      return FabReader.builtIn(name);
    }
    Staged<FabRules> rules = FabReader.read(name, bytes(path(name), name, "rules file"));
    return rules.value().orElseThrow(() -> new BadInput(rules.diagnostics()));
  }

  /** As read: the readers take nothing but UTF-8, so this loses nothing. */
  private static String text(byte[] bytes) {
    return new String(bytes, StandardCharsets.UTF_8);
  }

  static boolean isPath(String fab) {
    return fab.indexOf('.') >= 0 || fab.indexOf('/') >= 0;
  }

  private static BadInput unknownClass(String fab, Optional<SpecFile> file) {
    String message =
        "there is no fab class '"
            + fab
            + "'; the built-in ones are "
            + String.join(", ", Templates.fabNames())
            + ", and a rules file of your own is named with its path";
    if (file.isEmpty()) {
      String[] near = BadInput.nearest(fab, Templates.fabNames());
      return BadInput.of("--fab", "unknown-fab", message, near);
    }
    Positions p = file.get().positions();
    return new BadInput(
        List.of(etchloom.diagnostic.Diagnostic.error("unknown-fab", p.at("fab"), "fab", message)));
  }

  static Path path(String text) {
    try {
      return Path.of(text);
    } catch (InvalidPathException e) {
      throw BadInput.of(
          text.replaceAll("\\p{Cntrl}", "?"), "path", "this is no path: " + e.getReason());
    }
  }

  /** The whole file; one byte more than is allowed is enough to refuse it. */
  static byte[] bytes(Path path, String name, String what) {
    return bytes(path, name, what, SpecReader.MAX_BYTES);
  }

  /** As above, with a bound of its own. */
  static byte[] bytes(Path path, String name, String what, int most) {
    if (Files.isDirectory(path)) {
      throw BadInput.of(name, "directory", "this is a folder; a " + what + " is one file");
    }
    try (InputStream in = Files.newInputStream(path)) {
      return in.readNBytes(most + 1);
    } catch (NoSuchFileException e) {
      throw new DiskTrouble(name + ": there is no such file");
    } catch (IOException e) {
      throw new DiskTrouble(name + ": cannot be read: " + reason(e));
    }
  }

  static String reason(IOException e) {
    if (e instanceof NoSuchFileException) {
      return "there is no such folder";
    }
    if (e instanceof java.nio.file.AccessDeniedException) {
      return "no permission";
    }
    return e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
  }
}
