/**
 * The magnets' field at the copper: closed forms at a point, harmonics over a pole pair.
 *
 * <p>Takes lengths in mm and gives teslas. Magnets are rigid, uniformly magnetised along the shaft
 * and as permeable as air; iron is ideal and endless. Left out: the magnets' recoil permeability
 * (about 1.05 for neodymium, which lowers the field by one to three per cent in iron-backed
 * rotors), saturation and the iron's rim.
 */
package etchloom.electric.field;
