package etchloom.proof;

import etchloom.artwork.Artwork;
import etchloom.artwork.Stackup;
import etchloom.board.Assembler;
import etchloom.proof.ohm.CopperBuild;
import etchloom.spec.FabReader;
import etchloom.spec.Positions;
import etchloom.spec.Spec;
import etchloom.spec.SpecFile;
import etchloom.spec.SpecReader;
import etchloom.spec.Templates;
import etchloom.testing.Specs;
import etchloom.testing.ToyOrders;
import etchloom.write.LayerSet;
import java.nio.charset.StandardCharsets;
import java.util.SortedMap;
import java.util.TreeMap;

/** Sets as they are written, for tests that read them back. */
final class WrittenSets {
  private WrittenSets() {}

  /** The board of a template, on the grid. */
  static Artwork template(String name) {
    return drawn(name, Templates.bytes(name));
  }

  /** The filter wheel with five turns a layer: all its constructs, a third of its copper. */
  static Artwork smallWheel() {
    return fewTurns("filter-wheel");
  }

  /** A template's board with five turns a layer. */
  static Artwork fewTurns(String name) {
    String spec = text(Templates.bytes(name));
    return drawn(name, spec.replace("turns: fill", "turns: 5").getBytes(ASCII));
  }

  private static Artwork drawn(String name, byte[] spec) {
    SpecFile f = SpecReader.read(name, spec).value().orElseThrow();
    return Assembler.assemble(
            f.spec(), FabReader.builtIn(f.spec().fab()), f.positions(), /* draft= */ false)
        .value()
        .orElseThrow()
        .artwork()
        .onGrid();
  }

  /** A wheel of nine coils in delta on two layers. */
  static Artwork delta() {
    Spec spec = Specs.spec(Specs.wheel(2).connected(Spec.Connection.DELTA));
    return Assembler.assemble(spec, Specs.fab(), Positions.unknown("test"))
        .value()
        .orElseThrow()
        .artwork()
        .onGrid();
  }

  static SortedMap<String, byte[]> write(Artwork art) {
    return LayerSet.write(art, ToyOrders.plain(art.stackup().thicknessMm()));
  }

  /**
   * The same without checksums, so that a fault must be found by what it does; the archive is then
   * not the set's any more, which is found too.
   */
  static SortedMap<String, byte[]> withoutSums(SortedMap<String, byte[]> set) {
    SortedMap<String, byte[]> out = new TreeMap<>(set);
    out.replaceAll(
        (name, bytes) ->
            name.endsWith(".gbr")
                ? text(bytes).replaceAll("%TF\\.MD5,[0-9a-f]*\\*%\n", "").getBytes(ASCII)
                : bytes);
    return out;
  }

  static CopperBuild build(Stackup s) {
    return new CopperBuild(
        s.copper().stream()
            .map(c -> new CopperBuild.Layer(c.thicknessMm(), c.undercutMm()))
            .toList(),
        s.dielectricMm(),
        s.platingMm());
  }

  static final java.nio.charset.Charset ASCII = StandardCharsets.US_ASCII;

  static String text(byte[] bytes) {
    return new String(bytes, ASCII);
  }
}
