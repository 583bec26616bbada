package etchloom.proof.image;

/** What a file says of the walls of its holes. */
public enum Plating {
  PLATED,
  NON_PLATED,
  /** Of a file that holds both kinds; never of a single hole. */
  MIXED,
  UNKNOWN
}
