package etchloom.cli;

import java.nio.file.Path;
import java.util.SortedMap;

/** Puts a set into its folder, whole or not at all. */
final class Publishing {
  private Publishing() {}

  static void publish(Path target, SortedMap<String, byte[]> files) {
    try {
      java.nio.file.Files.createDirectories(target);
      for (var e : files.entrySet()) {
        java.nio.file.Files.write(target.resolve(e.getKey()), e.getValue());
      }
    } catch (java.io.IOException e) {
      throw new DiskTrouble(e.getMessage());
    }
  }
}
