package etchloom.board;

import etchloom.artwork.Artwork;
import etchloom.rim.Rim;
import etchloom.winding.Winding;

/** A drawn board, with what the way there decided. */
public record Assembly(Artwork artwork, Winding winding, Rim rim) {}
