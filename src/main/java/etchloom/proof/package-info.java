/** Readers for the formats written, copper rebuilt, connectivity, comparison. */
package etchloom.proof;
