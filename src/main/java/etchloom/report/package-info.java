/**
 * What came out, for people and for programs: {@code report.json}, the summary on the terminal, the
 * lines of broken rules, the order sheet and the cautions.
 *
 * <p>Takes {@link etchloom.report.Results} and computes nothing that is not in them (the copper's
 * area is worked out in {@code area}); no clock, no disk. What is not known is left out, never
 * nought.
 */
package etchloom.report;
