/** One coil's spirals through the layers: outlines, turns, eye vias, rim nodes. */
package etchloom.coil;
