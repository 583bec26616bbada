/**
 * The copper of a layer as closed outlines of lines and arcs, overlapping tracks and pads united.
 *
 * <p>Takes artwork on the nanometre grid; gives paths on the same grid. Nothing is flattened: a
 * track's side is its centre line's line or arc, shifted.
 */
package etchloom.write.outline;
