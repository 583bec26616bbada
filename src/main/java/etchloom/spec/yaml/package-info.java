/**
 * YAML as far as Etchloom's files need it: a tree of groups, lists and values in which every part
 * knows its place, read with hard limits from bytes that may be hostile, and written back.
 *
 * <p>The tree is built from the parser's events rather than by its composer, so that nesting is
 * bounded while reading, and anchors, tags and second documents are all found in one run.
 */
package etchloom.spec.yaml;
