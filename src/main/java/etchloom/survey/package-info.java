/**
 * Many variants of one spec, each drawn, checked and solved by {@link etchloom.run.Pipeline} as
 * {@code draw} does it: a grid of values, or a search for the best.
 *
 * <p>Every finished variant is a line of a journal in the survey's folder, in the order of the
 * variants whatever thread was first; tables and pages are made from the journal alone. So memory
 * does not grow with their number, and an interrupted survey goes on where its journal ends and
 * comes to the same bytes.
 */
package etchloom.survey;
