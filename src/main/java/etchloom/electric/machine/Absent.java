package etchloom.electric.machine;

/**
 * A figure that could not be had.
 *
 * @param figure its path in the report, {@code drive.speedLimitRpm}
 * @param key the spec's key that would bring it, {@code duty.bus}
 */
public record Absent(String figure, String key) {}
