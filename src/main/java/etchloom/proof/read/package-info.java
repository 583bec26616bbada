/**
 * Readers of the files of a layer set from any tool, written apart from the writers and sharing no
 * code with them. Bytes in, a record of {@code etchloom.proof.image} out, or {@link
 * etchloom.proof.read.UnreadableFile} with the line and what is wrong. Memory is bounded by a
 * multiple of the input's size and a fixed limit on what repetition may expand to.
 */
package etchloom.proof.read;
