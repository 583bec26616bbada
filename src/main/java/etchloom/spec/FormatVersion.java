package etchloom.spec;

import etchloom.spec.yaml.YamlNode.Scalar;
import java.util.Optional;

/** The key that says which format a file is in, and in which version. */
final class FormatVersion {
  private FormatVersion() {}

  static final String KNOWN = "1";

  /**
   * Whether the file can be read further. A missing version is reported and the reading goes on; a
   * file of the other format, or of another version, is not read at all.
   *
   * @param otherKey the version key of the format that this file might be mistaken for
   */
  static boolean check(Section top, String key, String otherKey, String otherName) {
    if (!top.has(key) && top.has(otherKey)) {
      top.error(
          Codes.FORMAT,
          otherKey,
          "this is " + otherName + "; here belongs a file with `" + key + ": 1`");
      return false;
    }
    top.missing(key, "the version of the format: `" + key + ": 1`");
    Optional<Scalar> version = top.scalar(key);
    if (version.isPresent() && !version.get().text().equals(KNOWN)) {
      top.error(
          Codes.FORMAT,
          key,
          "format version "
              + Show.found(version.get().text())
              + " was found; this program reads 1");
      return false;
    }
    return true;
  }
}
