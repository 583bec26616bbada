/** Findings about the user's input as data, and their rendering. */
package etchloom.diagnostic;
