package etchloom.report;

/**
 * A danger, in a word and in full.
 *
 * @param topic a few words, such as {@code hot copper}
 */
public record Caution(String topic, String text) {}
