package etchloom.proof.rules;

/** What a piece of copper is called. */
@FunctionalInterface
public interface Names {
  String of(int layer, int island);
}
