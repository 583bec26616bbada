package etchloom.proof.image;

/**
 * Something in a file that was read all the same, but that another reader may take differently.
 *
 * @param line from 1; 0 when the whole file is meant
 * @param code short lower-case word with hyphens, the same for every such warning
 * @param message what was found and how it was taken
 */
public record ReadWarning(String file, int line, String code, String message) {}
