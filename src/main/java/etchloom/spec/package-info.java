/**
 * The spec and the fab's rules: records, reading, checking, messages with line and column.
 *
 * <p>{@link etchloom.spec.Spec} and {@link etchloom.spec.FabRules} are plain values; reading them
 * never touches the geometry. What a value means for the copper is for the later stages.
 */
package etchloom.spec;
