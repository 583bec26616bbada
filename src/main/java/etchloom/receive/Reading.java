package etchloom.receive;

/**
 * One measurement between two terminals, leads already taken off.
 *
 * @param line in the file, from 1
 * @param ohm infinite where the meter found no connection
 * @param celsius of the copper
 */
record Reading(int line, String board, String from, String to, double ohm, double celsius) {}
