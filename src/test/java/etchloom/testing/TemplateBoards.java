package etchloom.testing;

import etchloom.artwork.Artwork;
import etchloom.board.Assembler;
import etchloom.spec.FabReader;
import etchloom.spec.SpecFile;
import etchloom.spec.SpecReader;
import etchloom.spec.Templates;

/** The starting specs' boards, as drawn. */
public final class TemplateBoards {
  private TemplateBoards() {}

  /** On the nanometre grid. */
  public static Artwork onGrid(String template) {
    SpecFile f = SpecReader.read(template, Templates.bytes(template)).value().orElseThrow();
    return Assembler.assemble(f.spec(), FabReader.builtIn(f.spec().fab()), f.positions())
        .value()
        .orElseThrow()
        .artwork()
        .onGrid();
  }
}
