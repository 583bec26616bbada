package etchloom.spec;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** The words that a key takes, in the order in which messages list them. */
final class Words<E> {
  private final Map<String, E> words = new LinkedHashMap<>();

  Words<E> and(String word, E meaning) {
    words.put(word, meaning);
    return this;
  }

  Map<String, E> map() {
    return Collections.unmodifiableMap(words);
  }

  /** The word that stands for a meaning. */
  static <E> String wordFor(Map<String, E> words, E meaning) {
    for (Map.Entry<String, E> e : words.entrySet()) {
      if (e.getValue().equals(meaning)) {
        return e.getKey();
      }
    }
    throw new IllegalArgumentException("no word stands for " + meaning);
  }

  static <E> Words<E> of(String word, E meaning) {
    return new Words<E>().and(word, meaning);
  }
}
