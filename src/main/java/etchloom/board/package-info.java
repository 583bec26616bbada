/**
 * Puts the artwork together: winding, coils and rim into copper, then edge, holes, mask and legend.
 *
 * <p>Takes a checked spec and the fab's rules; gives an artwork, or says which key keeps it from
 * being one. Whether the artwork keeps the fab's rules is not asked here.
 */
package etchloom.board;
