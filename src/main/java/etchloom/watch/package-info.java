/**
 * The page that follows a spec: waits for a file to change, and serves a set from memory to this
 * machine's own browser.
 *
 * <p>Takes finished files as names and bytes, and errors as text. Promises that nothing but those
 * files is ever served, that nobody but this machine can ask, and that the files on the disk hold
 * nothing of what makes the served page reload. Draws nothing and writes nothing.
 */
package etchloom.watch;
