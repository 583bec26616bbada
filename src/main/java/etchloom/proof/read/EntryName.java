package etchloom.proof.read;

import java.util.Optional;

/** Names of files within a set, as zip files and job files give them: relative, slashes forward. */
final class EntryName {
  private static final int MAX_LENGTH = 240;
  private static final int MAX_DEPTH = 8;

  private EntryName() {}

  /** What is wrong with a name, to follow it in a message; empty when it is fine. */
  static Optional<String> fault(String name) {
    if (name.isEmpty() || name.length() > MAX_LENGTH) {
      return Optional.of("is empty or longer than " + MAX_LENGTH + " characters");
    }
    if (name.startsWith("/") || name.indexOf(':') >= 0) {
      return Optional.of("is not relative");
    }
    for (int i = 0; i < name.length(); i++) {
      if (name.charAt(i) < 32 || name.charAt(i) == 127 || name.charAt(i) == '\\') {
        return Optional.of("holds a control character or a backslash");
      }
    }
    int parts = 0;
    for (int from = 0; from <= name.length(); parts++) {
      int to = name.indexOf('/', from);
      to = to < 0 ? name.length() : to;
      String part = name.substring(from, to);
      if (part.equals("..") || part.equals(".") || part.isEmpty()) {
        return Optional.of("leads out of its folder or holds an empty step");
      }
      from = to + 1;
    }
    return parts > MAX_DEPTH
        ? Optional.of("is more than " + MAX_DEPTH + " folders deep")
        : Optional.empty();
  }
}
