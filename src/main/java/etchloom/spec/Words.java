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

  static <E> Words<E> of(String word, E meaning) {
    return new Words<E>().and(word, meaning);
  }
}
