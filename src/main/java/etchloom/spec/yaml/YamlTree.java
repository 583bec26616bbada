package etchloom.spec.yaml;

import etchloom.spec.yaml.YamlNode.Mapping;

/**
 * A file's keys as read.
 *
 * @param whole whether the file was read to its end. Where it was not, what the keys that are there
 *     say can still be checked, but not what is missing
 */
public record YamlTree(Mapping root, boolean whole) {}
