package etchloom.run;

import etchloom.board.Assembly;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;

/** A board as it is drawn: all that its files need, before anything else is known of it. */
public record Laid(Spec spec, FabRules fab, Assembly assembly, ResistanceFigures resistance) {}
