/**
 * Findings about the user's input as data, and their rendering.
 *
 * <p>A {@link etchloom.diagnostic.Diagnostic} is a value: no stage prints, and nothing is ever
 * parsed back out of a message. {@link etchloom.diagnostic.DiagnosticText} is the one place where
 * they become text.
 */
package etchloom.diagnostic;
