/** The commands, exit codes and progress. */
package etchloom.cli;
