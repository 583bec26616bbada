package etchloom.cli;

/** The program's version, as in the build file. */
final class Version {
  static final String TEXT = "0.1.0";

  private Version() {}
}
