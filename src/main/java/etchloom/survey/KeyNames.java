package etchloom.survey;

import java.util.List;

/** Keys of the spec as heads of narrow columns. */
final class KeyNames {
  private KeyNames() {}

  /** The last word of each, {@code track} for {@code coil.track}, where no other has the same. */
  static List<String> inShort(List<String> keys) {
    List<String> last = keys.stream().map(k -> k.substring(k.lastIndexOf('.') + 1)).toList();
    return keys.stream()
        .map(
            k -> {
              String word = k.substring(k.lastIndexOf('.') + 1);
              return last.stream().filter(word::equals).count() == 1 ? word : k;
            })
        .toList();
  }
}
