package etchloom.electric.machine;

/**
 * Something the reader must know about the figures, or physics that cannot be.
 *
 * @param code a short name, {@code no-stable-temperature}
 * @param message with numbers and units, in the user's words
 */
public record Caution(String code, String message) {}
