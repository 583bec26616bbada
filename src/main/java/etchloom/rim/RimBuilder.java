package etchloom.rim;

import etchloom.artwork.CopperBuilder;
import etchloom.spec.Spec;
import etchloom.winding.Winding;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.IntFunction;

/** Connects the coils at the rim and brings the terminals out. */
public final class RimBuilder {
  private RimBuilder() {}

  /** Why a rim cannot be had, with the key that would change it. */
  public record Refusal(String key, String message) {}

  /** Either a planned rim or a refusal. */
  public record Result(Optional<Planned> planned, Optional<Refusal> refusal) {}

  /** A rim that fits, ready to be drawn. */
  public static final class Planned {
    private final RimSize size;
    private final RimPlan plan;

    private Planned(RimSize size, RimPlan plan) {
      this.size = size;
      this.plan = plan;
    }

    /**
     * Adds the rim's joints and conductors.
     *
     * @param jointOf the joint of a coil's start (true) or finish (false), coils from 1
     * @param netOf the net of a coil, from 1
     */
    public Rim draw(
        CopperBuilder copper,
        BiFunction<Integer, Boolean, Integer> jointOf,
        IntFunction<String> netOf) {
      new RimRouter(
              size,
              plan,
              copper,
              p -> jointOf.apply(p.coil(), p.start()),
              l -> netOf.apply(l.pins().get(0).coil()))
          .draw();
      List<Rim.PhaseChain> chains =
          plan.connections().phases().stream()
              .map(p -> new Rim.PhaseChain(p.get(0).phase(), p.stream().map(Chain::coils).toList()))
              .toList();
      return new Rim(
          chains, plan.rings().rings().size(), plan.rings().overlap(), plan.leadsEdgeMm());
    }
  }

  /** Plans both ways round and keeps the one with fewer rings, counter-clockwise on a tie. */
  public static Result plan(
      Winding winding, Spec.Winding wired, boolean starPointOut, RimSize size) {
    Connections.Scheme scheme =
        new Connections.Scheme(wired.connection(), starPointOut, wired.parallelPaths());
    double nodePitch = size.nodeRadiusMm() * 2 * Math.abs(size.firstNodeRad()) / (size.nodes() - 1);
    if (nodePitch < size.besideMm() - 1e-9) {
      return refuse(
          "via.pad",
          "the coils' connection points stand %.3f mm apart at the rim, a joint and its space need"
              + " %.3f mm; %sa smaller via.pad or coil.space, fewer board.layers or fewer"
              + " winding.coils would do",
          nodePitch,
          size.besideMm(),
          size.viaCount() > 1 ? "a smaller via.count, " : "");
    }
    List<String> marks = Connections.marks(winding, scheme);
    Spec.Terminals t = size.terminals();
    if (marks.size() > 1 && t.pitchMm() < t.padMm() + size.spaceMm() - 1e-9) {
      return refuse(
          "board.terminals.pitch",
          "terminals %.3f mm apart leave no %.3f mm between their pads of %.3f mm",
          t.pitchMm(),
          size.spaceMm(),
          t.padMm());
    }
    Optional<Result> tooWide = tabWidth(size, marks);
    if (tooWide.isPresent()) {
      return tooWide.get();
    }
    Optional<TerminalRow> row = row(size, marks);
    if (row.isEmpty()) {
      return refuse(
          "board.terminals.pitch",
          "a row of %d terminals %.3f mm apart is longer than the board is wide; a smaller pitch, a"
              + " larger board.diameter or a board.tab would do",
          marks.size(),
          t.pitchMm());
    }
    return plan(winding, scheme, size, row.get());
  }

  private static Optional<Result> tabWidth(RimSize size, List<String> marks) {
    double width = size.tab().map(Spec.Tab::widthMm).orElse(Double.POSITIVE_INFINITY);
    double pitch = size.terminals().pitchMm();
    double needed = 2 * (TerminalRow.halfMm(marks, pitch) + size.terminalMarginMm());
    return needed <= width + 1e-9
        ? Optional.empty()
        : Optional.of(
            refuse(
                "board.tab.width",
                "a row of %d terminals %.3f mm apart needs a tab of %.3f mm; a wider board.tab.width"
                    + " or a smaller board.terminals.pitch would do",
                marks.size(),
                pitch,
                needed));
  }

  private static Optional<TerminalRow> row(RimSize size, List<String> marks) {
    Spec.Terminals t = size.terminals();
    double reach = size.boardRadiusMm() - size.terminalMarginMm();
    return size.tab().isPresent()
        ? Optional.of(
            TerminalRow.at(marks, t.startRad(), t.pitchMm(), reach + size.tab().get().lengthMm()))
        : TerminalRow.place(marks, t.startRad(), t.pitchMm(), reach);
  }

  private static Result plan(
      Winding winding, Connections.Scheme scheme, RimSize size, TerminalRow row) {
    Optional<RimPlan> best = Optional.empty();
    for (boolean ccw : new boolean[] {true, false}) {
      Connections c =
          Connections.make(
              winding, scheme, size::pinAngleRad, m -> row.spot(m).at().angleRad(), ccw);
      Optional<RimPlan> plan = RimPlan.make(size, row, c);
      if (plan.isPresent() && (best.isEmpty() || rings(plan) < rings(best))) {
        best = plan;
      }
    }
    if (best.isEmpty()) {
      return refuse(
          "via.pad",
          "the terminals' connections find no gap between the coils' connection points; a smaller"
              + " via.pad, a larger coil.outer-radius or another board.terminals.start would do");
    }
    return room(size, row, best.get());
  }

  private static int rings(Optional<RimPlan> plan) {
    return plan.orElseThrow().rings().rings().size();
  }

  /** The radial room: rings inside the edge, leads inside the terminals' pads. */
  private static Result room(RimSize size, TerminalRow row, RimPlan plan) {
    double edge = size.boardRadiusMm() - size.edgeCopperMm();
    double least = row.distanceMm() - size.terminals().padMm() / 2 - size.spaceMm();
    double overEdge = plan.ringsEdgeMm() - edge;
    double overPads = plan.leadsEdgeMm() - least;
    double over = Math.max(Math.max(overEdge, overPads), plan.leadsEdgeMm() - edge);
    if (over > 1e-9) {
      return refuse(
          "board.diameter",
          "the connections outside the coils need %.3f mm more room: %d rings reach to radius"
              + " %.3f mm, and %s; board.diameter larger by %.2f mm, a smaller coil.outer-radius,"
              + " or smaller via.pad, rim.track or board.terminals.pad would do",
          over,
          plan.rings().rings().size(),
          plan.ringsEdgeMm(),
          overPads >= overEdge
              ? String.format(
                  Locale.ROOT, "the terminals' pads begin at %.3f mm", least + size.spaceMm())
              : String.format(Locale.ROOT, "copper must end at %.3f mm", edge),
          2 * over + 0.01);
    }
    double leads = plan.leadsShortMm();
    if (leads > 1e-9) {
      return refuse(
          "board.terminals.pitch",
          "the terminals' leads converge towards the shaft and come %.3f mm too near to each other"
              + " or to a pad; a larger board.terminals.pitch, a smaller rim.track or"
              + " board.terminals.pad, or a shorter board.tab would do",
          leads);
    }
    return new Result(Optional.of(new Planned(size, plan)), Optional.empty());
  }

  private static Result refuse(String key, String format, Object... args) {
    String message = String.format(Locale.ROOT, format, args);
    return new Result(Optional.empty(), Optional.of(new Refusal(key, message)));
  }
}
