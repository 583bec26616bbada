/** One writer per output format. */
package etchloom.write;
