/** Connecting the nodes: rings, radials, terminals. */
package etchloom.rim;
