/**
 * Inductance of coils and phases, from the copper's own filaments.
 *
 * <p>Takes the artwork, how its terminals are wired, and planes of ideal iron; gives the first
 * coil's inductance, all phases' self and mutual inductances, and what a drive sees. Conductors
 * become straight bars with their etched mean width, their thickness and their true height; holes
 * become tubes. Neumann's integral over all pairs of bars, near ones at the mean distances of their
 * sections, far ones through a tree of clusters with multipole expansions of the vector potential.
 * Iron by images. Where all coils are one coil turned, that coil against the others stands for all.
 *
 * <p>Current is even over each section and shared between parallel ways as their resistances have
 * it: the value for frequencies at which the width is below about two skin depths. Left out: pads,
 * leads from a phase's ends to its terminals, images of the holes (together below some 1e-3), the
 * magnets' own permeability, and iron that ends or saturates.
 *
 * <p>Partial inductances of open ways depend on nothing but the way itself. Images are taken of
 * conductors closed by a straight way back, since an open one has none of finite size between two
 * plates.
 */
package etchloom.electric.inductance;
