package etchloom.proof.read;

import etchloom.proof.image.JobFile;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;

/**
 * Which file of a set plays which part: by the option, else by the file's own file function, else
 * by that of the job file.
 */
final class RoleTable {
  private final SetFolder folder;
  private final Reading reading;
  private final Map<String, List<String>> files = new TreeMap<>();
  private final Map<String, List<String>> functions = new HashMap<>();
  private final Set<String> taken = new HashSet<>();

  RoleTable(SetFolder folder, Reading reading) {
    this.folder = folder;
    this.reading = reading;
  }

  /** The files of a role, in the order of their names. */
  List<String> of(String role) {
    return files.getOrDefault(role, List.of());
  }

  Optional<String> single(String role) {
    return of(role).stream().findFirst();
  }

  /** Whether an option has named the file. */
  boolean chosen(String file) {
    return taken.contains(file);
  }

  /** The file function of a drill or Gerber file, its own or that of the job file. */
  List<String> function(String file) {
    return functions.getOrDefault(file, List.of());
  }

  /** Obeys {@code L1=FILE}. */
  void option(String text) throws UnreadableFile {
    int equals = text.indexOf('=');
    String role = equals < 0 ? "" : text.substring(0, equals).strip();
    if (!Roles.known(role)) {
      throw wrong(text, "wanted ROLE=FILE, where ROLE is one of " + Roles.all());
    }
    String file = find(text.substring(equals + 1).strip(), text);
    if (!taken.add(file)) {
      throw wrong(text, "this file is given a part twice");
    }
    List<String> list = files.computeIfAbsent(role, k -> new ArrayList<>());
    if (!list.isEmpty() && !Roles.ofDrill(role)) {
      throw wrong(text, "a second file for " + role);
    }
    list.add(file);
  }

  private UnreadableFile wrong(String option, String reason) {
    return new UnreadableFile(
        "--layer " + GerberLexer.printable(option), 0, "layer-option", Shown.clean(reason));
  }

  /** The whole name, or the last part of it where only one file has that. */
  private String find(String name, String option) throws UnreadableFile {
    if (folder.files().containsKey(name)) {
      return name;
    }
    List<String> ends =
        folder.files().keySet().stream().filter(f -> f.endsWith("/" + name)).toList();
    if (name.isEmpty() || ends.size() != 1) {
      throw wrong(
          option,
          ends.size() > 1
              ? "more than one file of " + folder.name() + " has this name"
              : "there is no such file that can be read in " + folder.name());
    }
    return ends.get(0);
  }

  /** Gives every file that no option has named the part it says it plays. */
  void fromFunctions(Optional<JobFile> job) throws UnreadableFile {
    Map<String, List<String>> listed = listed(job);
    Set<String> given = Set.copyOf(files.keySet());
    boolean drillsGiven = given.stream().anyMatch(Roles::ofDrill);
    for (Map.Entry<String, byte[]> e : folder.files().entrySet()) {
      String file = e.getKey();
      FileKind kind = FileKind.of(e.getValue());
      if (kind != FileKind.GERBER && kind != FileKind.NC_DRILL) {
        continue;
      }
      List<String> function = function(file, e.getValue(), listed);
      functions.put(file, function);
      if (taken.contains(file)) {
        continue;
      }
      Optional<String> role =
          kind == FileKind.NC_DRILL ? Optional.of(Roles.DRILL) : Roles.of(function);
      if (function.isEmpty() && role.isEmpty()) {
        reading.warn(
            0,
            "no-function",
            file + " has no file function and is left out; --layer ROLE=FILE gives it a part");
      }
      boolean named =
          role.isPresent()
              && (Roles.ofDrill(role.get()) ? drillsGiven : given.contains(role.get()));
      if (role.isPresent() && !named) {
        add(role.get(), file);
      }
    }
  }

  private void add(String role, String file) throws UnreadableFile {
    List<String> list = files.computeIfAbsent(role, k -> new ArrayList<>());
    if (!list.isEmpty() && !Roles.ofDrill(role)) {
      throw reading.fail(
          0,
          "role-twice",
          list.get(0)
              + " and "
              + file
              + " both say they are "
              + role
              + "; --layer "
              + role
              + "=FILE chooses one");
    }
    list.add(file);
  }

  private List<String> function(String file, byte[] bytes, Map<String, List<String>> listed) {
    List<String> own = FileKind.function(bytes);
    List<String> byJob = listed.getOrDefault(file, List.of());
    if (!own.isEmpty() && !byJob.isEmpty() && !same(own, byJob)) {
      reading.warn(
          0,
          "job-differs",
          file
              + " says it is "
              + String.join(",", own)
              + ", the job file says "
              + String.join(",", byJob)
              + "; its own word holds");
    }
    return own.isEmpty() ? byJob : own;
  }

  /** One of the two may go into more detail. */
  private static boolean same(List<String> a, List<String> b) {
    int n = Math.min(a.size(), b.size());
    return a.subList(0, n).equals(b.subList(0, n));
  }

  /** File functions by the job file, paths taken from the job file's own folder. */
  private Map<String, List<String>> listed(Optional<JobFile> job) {
    Map<String, List<String>> out = new HashMap<>();
    if (job.isPresent()) {
      String name = job.get().fileName();
      String base = name.substring(0, name.lastIndexOf('/') + 1);
      for (JobFile.Entry e : job.get().files()) {
        String file = base + e.path();
        out.put(file, e.function());
        if (!folder.files().containsKey(file)) {
          reading.warn(0, "job-missing", "the job file lists " + file + ", which is not there");
        }
      }
    }
    return out;
  }

  /** The only file of a kind, an option before it; a warning where there are several. */
  Optional<String> only(String role, FileKind kind) {
    if (!of(role).isEmpty()) {
      return single(role);
    }
    List<String> found =
        folder.files().entrySet().stream()
            .filter(e -> FileKind.of(e.getValue()) == kind)
            .map(Map.Entry::getKey)
            .toList();
    if (found.size() > 1) {
      reading.warn(
          0,
          role + "-twice",
          "none of " + String.join(", ", found) + " is used; --layer " + role + "=FILE chooses");
    }
    return found.size() == 1 ? Optional.of(found.get(0)) : Optional.empty();
  }
}
