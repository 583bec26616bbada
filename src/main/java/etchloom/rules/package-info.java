/** The clearance and fab checks. */
package etchloom.rules;
