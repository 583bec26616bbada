package etchloom.spec;

/** A spec with the places of its keys in the file it came from. */
public record SpecFile(Spec spec, Positions positions) {}
