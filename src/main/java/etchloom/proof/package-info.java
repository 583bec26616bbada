/**
 * Is what was written what was meant? Reads a set of files back, rebuilds its copper and holds it
 * against the design ({@link etchloom.proof.Prover}), or judges a folder of any tool by its own
 * words ({@link etchloom.proof.FolderCheck}). Shares no code with the writers.
 *
 * <p>Copper that is joined is one net, so a winding hides its shorts from any check of nets. What
 * is judged is membership (each piece of copper on a layer holds just the pads of one group of the
 * design), loops (no copper encloses a gap) and circuits (the whole conductor closes on itself as
 * often as the design does).
 */
package etchloom.proof;
