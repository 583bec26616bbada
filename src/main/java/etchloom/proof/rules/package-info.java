/**
 * The fab's rules measured on rebuilt copper alone: nothing is known of what it is meant for.
 * Distances are exact on the true lines and circles that its boundary stands for.
 */
package etchloom.proof.rules;
