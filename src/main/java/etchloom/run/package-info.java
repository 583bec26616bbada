/**
 * One run from a spec to everything that is known about its board, for the commands and for all
 * that runs many specs. It takes values and gives values: no files, no clock, no terminal.
 */
package etchloom.run;
