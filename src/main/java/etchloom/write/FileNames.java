package etchloom.write;

/**
 * The names of a set's files. The meaning of a file is carried by its attributes; the names are
 * bound by the spec page, for users' scripts.
 *
 * @param slug the title's, {@code a-z 0-9 -}
 */
record FileNames(String slug) {
  FileNames {
    if (!slug.matches("[a-z0-9][a-z0-9-]*")) {
      throw new IllegalArgumentException("no slug: " + slug);
    }
  }

  String copper(int layer) {
    return slug + "-copper-L" + layer + ".gbr";
  }

  String maskTop() {
    return slug + "-mask-top.gbr";
  }

  String maskBottom() {
    return slug + "-mask-bottom.gbr";
  }

  String legendTop() {
    return slug + "-legend-top.gbr";
  }

  String profile() {
    return slug + "-profile.gbr";
  }

  String platedGerber() {
    return slug + "-plated.gbr";
  }

  String nonPlatedGerber() {
    return slug + "-nonplated.gbr";
  }

  String platedXnc() {
    return slug + "-plated.xnc";
  }

  String nonPlatedXnc() {
    return slug + "-nonplated.xnc";
  }

  String job() {
    return slug + ".gbrjob";
  }

  String netlist() {
    return slug + ".ipc";
  }

  String dxf() {
    return slug + ".dxf";
  }

  String outlines() {
    return slug + "-outlines.dxf";
  }

  String picture() {
    return slug + ".svg";
  }

  String notes() {
    return slug + "-notes.txt";
  }

  String fabZip() {
    return slug + "-fab.zip";
  }
}
