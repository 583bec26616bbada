package etchloom.spec;

import java.util.Optional;

/** A whole spec as read. Turned into a {@link Spec} only when nothing in it is faulty. */
record SpecDraft(
    String title,
    String revision,
    RotorDraft rotor,
    WindingDraft winding,
    CoilDraft coil,
    double rimTrack,
    ViaDraft via,
    BoardDraft board,
    String fab,
    Optional<DutyDraft> duty) {

  static SpecDraft read(Section top) {
    String title = Titles.title(top);
    String revision = Titles.revision(top);
    RotorDraft rotor = RotorDraft.read(top.group("rotor"));
    WindingDraft winding = WindingDraft.read(top.group("winding"));
    CoilDraft coil = CoilDraft.read(top.group("coil"));
    double rim = top.optionalGroup("rim").map(s -> rimTrack(s, coil)).orElse(2 * coil.track());
    ViaDraft via = ViaDraft.read(top.group("via"));
    BoardDraft board = BoardDraft.read(top.group("board"));
    String fab = Titles.fab(top);
    Optional<DutyDraft> duty = top.optionalGroup("duty").map(DutyDraft::read);
    top.close();
    if (top.whole()) {
      CrossChecks.check(winding, coil, board);
    }
    return new SpecDraft(title, revision, rotor, winding, coil, rim, via, board, fab, duty);
  }

  private static double rimTrack(Section s, CoilDraft coil) {
    double track = s.length("track", Limits.COPPER_SIZE).or(2 * coil.track());
    s.close();
    return track;
  }

  Spec build() {
    return new Spec(
        title,
        Slug.of(title),
        revision,
        rotor.build(),
        winding.build(),
        coil.build(),
        new Spec.Rim(rimTrack),
        via.build(),
        board.build(),
        fab,
        duty.map(DutyDraft::build));
  }
}
