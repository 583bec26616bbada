package etchloom.proof.rules;

import etchloom.proof.copper.CopperBuilder;
import etchloom.proof.image.LayerImage;
import etchloom.proof.plane.Figure;
import java.util.Optional;

/**
 * What is known of the board besides copper and holes.
 *
 * @param maskTop the openings, as a figure
 */
public record BoardSheets(
    Optional<BoardEdge> edge, Optional<Figure> maskTop, Optional<Figure> maskBottom) {

  public static BoardSheets of(
      Optional<LayerImage> profile, Optional<LayerImage> top, Optional<LayerImage> bottom) {
    CopperBuilder builder = new CopperBuilder();
    return new BoardSheets(
        profile.map(BoardEdge::of).filter(e -> !e.pieces().isEmpty()),
        top.map(i -> builder.build(i.objects())),
        bottom.map(i -> builder.build(i.objects())));
  }
}
