package etchloom.proof.ohm;

import etchloom.geometry.Point;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.copper.Hole;
import etchloom.proof.image.LayerImage;
import etchloom.units.Constants;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Works out the resistances between terminals of a board from its layer and drill files. */
public final class FileResistance {
  /** Ω·mm at 20 °C. */
  static final double RESISTIVITY_OHM_MM = Constants.COPPER_RESISTIVITY_20C * 1e3;

  private FileResistance() {}

  /**
   * A place to measure at.
   *
   * @param layer on which its pad is, from 1
   */
  public record Terminal(String mark, int layer, Point at) {}

  public record TerminalOhm(String from, String to, double ohm) {}

  /**
   * @param pairs each pair of terminals that copper joins, in the order given
   * @param error share by which they may be off where copper is not drawn in strokes; 0 where all
   *     is
   */
  public record Ohms(List<TerminalOhm> pairs, double error) {
    public Ohms {
      pairs = List.copyOf(pairs);
    }
  }

  /**
   * @param copper the images from L1 down
   * @param board what they were rebuilt to
   */
  public static Ohms between(
      List<LayerImage> copper, Connectivity board, CopperBuild build, List<Terminal> terminals) {
    OhmNetwork net = new OhmNetwork();
    int[][] walls = new int[board.plated().size()][copper.size()];
    int[] ends = new int[terminals.size()];
    double error = 0;
    for (int l = 1; l <= copper.size(); l++) {
      LayerOhms layer =
          new LayerOhms(net, copper.get(l - 1), board.copper(l), build.layers().get(l - 1));
      for (int h = 0; h < walls.length; h++) {
        Hole hole = board.plated().get(h);
        if (hole.through(l)) {
          walls[h][l - 1] = layer.contact(hole.at(), hole.diameterMm());
        }
      }
      for (int t = 0; t < ends.length; t++) {
        if (terminals.get(t).layer() == l) {
          ends[t] = layer.contact(terminals.get(t).at(), 0);
        }
      }
      error = Math.max(error, layer.connect());
    }
    for (int h = 0; h < walls.length; h++) {
      barrel(net, board.plated().get(h), walls[h], build);
    }
    return new Ohms(pairs(terminals, net.between(ends)), error);
  }

  private static List<TerminalOhm> pairs(List<Terminal> terminals, List<OptionalDouble> ohm) {
    List<TerminalOhm> out = new ArrayList<>();
    int k = 0;
    for (int i = 0; i < terminals.size(); i++) {
      for (int j = i + 1; j < terminals.size(); j++) {
        OptionalDouble r = ohm.get(k++);
        if (r.isPresent()) {
          out.add(
              new TerminalOhm(terminals.get(i).mark(), terminals.get(j).mark(), r.getAsDouble()));
        }
      }
    }
    return out;
  }

  /** A tube of plating outside the finished hole, from each layer's middle to the next one's. */
  private static void barrel(OhmNetwork net, Hole h, int[] wall, CopperBuild build) {
    double area = Math.PI * build.platingMm() * (h.diameterMm() + build.platingMm());
    for (int l = h.fromLayer(); l < h.toLayer(); l++) {
      net.resistor(wall[l - 1], wall[l], RESISTIVITY_OHM_MM * build.stepMm(l) / area);
    }
  }
}
