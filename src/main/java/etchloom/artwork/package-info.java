/**
 * The one immutable model of the copper: everything before it builds it, everything after reads it.
 */
package etchloom.artwork;
