/** Star of slots, phase belts, winding factors. */
package etchloom.winding;
