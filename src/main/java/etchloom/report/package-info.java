/** The report as JSON, HTML and terminal tables. */
package etchloom.report;
