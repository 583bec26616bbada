/** How much copper each layer holds, by closed forms where they serve and by merging where not. */
package etchloom.report.area;
