package etchloom.proof.read;

import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject;
import java.util.List;
import java.util.Map;

/** A defined aperture: a shape, or a block of objects, with its attributes. */
final class Aperture {
  private final int number;
  private final ApertureShape shape;
  private final List<DrawnObject> block;
  private final int blockPieces;
  private final Map<String, List<String>> attributes;

  private Attributes lastAttributes = Attributes.NONE;
  private int lastVersion = -1;
  private Placement lastPlacement = Placement.NONE;
  private ApertureShape lastShape;

  private Aperture(
      int number,
      ApertureShape shape,
      List<DrawnObject> block,
      int blockPieces,
      Map<String, List<String>> attributes) {
    this.number = number;
    this.shape = shape;
    this.lastShape = shape;
    this.block = block;
    this.blockPieces = blockPieces;
    this.attributes = attributes;
  }

  static Aperture of(int number, ApertureShape shape, Map<String, List<String>> attributes) {
    return new Aperture(number, shape, List.of(), 0, attributes);
  }

  static Aperture ofBlock(
      int number, List<DrawnObject> block, int pieces, Map<String, List<String>> attributes) {
    ApertureShape none = new ApertureShape.Composite("block", List.of());
    return new Aperture(number, none, List.copyOf(block), Math.max(1, pieces), attributes);
  }

  int number() {
    return number;
  }

  boolean isBlock() {
    return blockPieces > 0;
  }

  List<DrawnObject> block() {
    return block;
  }

  int blockPieces() {
    return blockPieces;
  }

  /** The shape placed; kept, since a placement seldom changes between two flashes. */
  ApertureShape shape(Placement placement, Reading reading, int line) throws UnreadableFile {
    if (!placement.equals(lastPlacement)) {
      reading.charge(Placement.pieces(shape), line);
      lastShape = placement.shape(shape);
      lastPlacement = placement;
    }
    return lastShape;
  }

  /** The attributes of an object made with this aperture now; the same object until they change. */
  Attributes attributes(AttributeStore store, int line) throws UnreadableFile {
    if (lastVersion != store.version()) {
      lastAttributes = store.objectNow(attributes, line);
      lastVersion = store.version();
    }
    return lastAttributes;
  }
}
