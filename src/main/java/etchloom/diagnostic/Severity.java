package etchloom.diagnostic;

/** How much a diagnostic weighs: an error stops the way through, a warning does not. */
public enum Severity {
  ERROR,
  WARNING
}
