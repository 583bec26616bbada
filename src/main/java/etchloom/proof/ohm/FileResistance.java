package etchloom.proof.ohm;

import etchloom.geometry.Point;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.copper.Hole;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.DrawnObject;
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
   * Each pair of terminals that copper joins, in the order given.
   *
   * @param copper the images from L1 down
   * @param board what they were rebuilt to
   */
  public static List<TerminalOhm> between(
      List<LayerImage> copper, Connectivity board, CopperBuild build, List<Terminal> terminals) {
    OhmNetwork net = new OhmNetwork();
    int[][] walls = new int[board.plated().size()][copper.size()];
    int[] ends = new int[terminals.size()];
    for (int l = 1; l <= copper.size(); l++) {
      CentreLines lines = new CentreLines(net, build.layers().get(l - 1));
      for (DrawnObject o : copper.get(l - 1).objects()) {
        lay(o, lines);
      }
      for (int h = 0; h < walls.length; h++) {
        Hole hole = board.plated().get(h);
        if (hole.through(l)) {
          walls[h][l - 1] = lines.disc(hole.at(), hole.diameterMm());
        }
      }
      for (int t = 0; t < ends.length; t++) {
        if (terminals.get(t).layer() == l) {
          ends[t] = lines.disc(terminals.get(t).at(), 0);
        }
      }
      lines.connect();
    }
    for (int h = 0; h < walls.length; h++) {
      barrel(net, board.plated().get(h), walls[h], build);
    }
    List<OptionalDouble> ohm = net.between(ends);
    List<TerminalOhm> out = new ArrayList<>();
    int k = 0;
    for (int i = 0; i < ends.length; i++) {
      for (int j = i + 1; j < ends.length; j++) {
        OptionalDouble r = ohm.get(k++);
        if (r.isPresent()) {
          out.add(
              new TerminalOhm(terminals.get(i).mark(), terminals.get(j).mark(), r.getAsDouble()));
        }
      }
    }
    return out;
  }

  private static void lay(DrawnObject o, CentreLines lines) {
    if (o instanceof DrawnObject.Stroke s) {
      lines.stroke(s.path(), s.widthMm());
    } else if (o instanceof DrawnObject.Flash f && f.shape() instanceof ApertureShape.Circle c) {
      lines.disc(f.at(), c.diameterMm());
    }
  }

  /** A tube of plating outside the finished hole, from each layer's middle to the next one's. */
  private static void barrel(OhmNetwork net, Hole h, int[] wall, CopperBuild build) {
    double area = Math.PI * build.platingMm() * (h.diameterMm() + build.platingMm());
    for (int l = h.fromLayer(); l < h.toLayer(); l++) {
      net.resistor(wall[l - 1], wall[l], RESISTIVITY_OHM_MM * build.stepMm(l) / area);
    }
  }
}
