package etchloom.write;

import etchloom.artwork.Artwork;
import etchloom.artwork.Joint;
import etchloom.artwork.MountingHole;
import etchloom.geometry.Grid;
import etchloom.geometry.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * The bare-board netlist, IPC-D-356A: every pad and hole with its net, and the board's outline.
 *
 * <p>A winding is one piece of copper from terminal to terminal and therefore one net: a netlist
 * that named its ends differently would make the tester report a short. Vias lie under mask and are
 * points within the net ({@code M}); terminals are its end points. Conductors (378) are left out:
 * the format has no arcs, and a bare-board tester needs points only.
 *
 * <p>Source: IPC-D-356A by a published field-by-field application note. Units record {@code CUST
 * 1}: numbers are whole micrometres. Records have 80 columns at most and end in CR LF.
 */
final class IpcWriter {
  private static final int NET_COLUMNS = 14;
  private static final int ALIAS_COLUMNS = 58;
  private static final int VALUE_COLUMNS = 63;
  private static final int COMMENT_COLUMNS = 69;
  private static final int SIZE_LIMIT_UM = 9_999;
  private static final int PLACE_LIMIT_UM = 999_999;
  private static final int FIRST_LINE_POINTS = 3;
  private static final int NEXT_LINE_POINTS = 4;

  /** Columns 73 and 74: neither side covered, and both. */
  private static final String OPEN = "S0";

  private static final String TENTED = "S3";

  private final Artwork art;
  private final StringBuilder out = new StringBuilder(8_000);
  private final Map<String, String> nets = new TreeMap<>();

  private IpcWriter(Artwork art) {
    this.art = art;
  }

  static byte[] write(Artwork art) {
    return new IpcWriter(art).file();
  }

  private byte[] file() {
    header();
    names();
    List<Joint> points = new ArrayList<>();
    for (Joint j : art.joints()) {
      if (j.terminal() || j.hole().isPresent()) {
        points.add(j);
      }
    }
    points.sort(Comparator.comparing(Joint::net).thenComparingInt(Joint::id));
    points.forEach(this::point);
    art.mountingHoles().forEach(this::toolingHole);
    art.profile().forEach(this::outline);
    line("999");
    return Ascii.bytes(out);
  }

  private void header() {
    comment(art.title() + " " + art.revision());
    if (art.draft()) {
      comment("DRAFT: rules are broken, not for production");
    }
    comment("The winding is copper from terminal to terminal: one net by design.");
    comment("Test continuity; no isolation between terminals of one net.");
    if (tooLarge()) {
      comment("Sizes over 9.999 mm are beyond the format and given as 9.999 mm.");
    }
    parameter("JOB", art.slug());
    parameter("CODE", "00");
    parameter("UNITS", "CUST 1");
    parameter("TITLE", art.title());
    parameter("NUM", "001");
    parameter("REV", art.revision());
    parameter("VER", "IPC-D-356A");
    parameter("IMAGE", "PRIMARY");
  }

  private boolean tooLarge() {
    return art.joints().stream()
            .anyMatch(j -> um(Math.max(j.padMm(), j.hole().orElse(0.0))) > SIZE_LIMIT_UM)
        || art.mountingHoles().stream().anyMatch(h -> um(h.diameterMm()) > SIZE_LIMIT_UM);
  }

  /** Long names get a number in the records and are spelt out once. */
  private void names() {
    for (Joint j : art.joints()) {
      String name = Ascii.plain(j.net()).replace(' ', '_');
      if (nets.containsKey(j.net())) {
        continue;
      }
      if (name.length() <= NET_COLUMNS) {
        nets.put(j.net(), name);
      } else {
        String alias = "NNAME" + (nets.size() + 1);
        nets.put(j.net(), alias);
        line("P  " + left(alias, 10) + " " + cut(name, ALIAS_COLUMNS));
      }
    }
  }

  private void point(Joint j) {
    boolean hole = j.hole().isPresent();
    out.append(hole ? "317" : "327").append(left(nets.get(j.net()), NET_COLUMNS)).append("   ");
    out.append(left(j.terminal() ? "X1" : "VIA", 6)).append('-');
    out.append(left(j.terminal() ? cut(Ascii.plain(j.mark()), 4) : "", 4));
    out.append(j.terminal() ? ' ' : 'M');
    if (hole) {
      hole(j.hole().orElseThrow(), 'P');
    } else {
      out.append("      ");
    }
    out.append(hole ? "A00" : "A" + Numbers.padded(j.firstLayer(), 2));
    place(Trace.steps(j.at().x()), Trace.steps(j.at().y()));
    size(j.padMm(), j.terminal() ? OPEN : TENTED);
  }

  private void toolingHole(MountingHole h) {
    out.append("367").append(left("N/C", NET_COLUMNS)).append("   ").append(left("MH", 6));
    out.append("-     ");
    hole(h.diameterMm(), 'U');
    out.append("A00");
    place(Trace.steps(h.at().x()), Trace.steps(h.at().y()));
    size(h.diameterMm(), OPEN);
  }

  private void hole(double diameterMm, char plating) {
    out.append('D').append(Numbers.padded(limited(diameterMm), 4)).append(plating);
  }

  private void size(double diameterMm, String mask) {
    out.append('X').append(Numbers.padded(limited(diameterMm), 4));
    line("     R000 " + mask);
  }

  /** The edge by chords that leave it by no more than 5 um, always with the sign. */
  private void outline(Path path) {
    List<long[]> points = Flat.points(path);
    out.append("389").append(left("BOARD_EDGE", NET_COLUMNS)).append("     X0100");
    int room = FIRST_LINE_POINTS;
    for (long[] p : points) {
      if (room == 0) {
        line("");
        out.append("089");
        room = NEXT_LINE_POINTS;
      }
      out.append(' ');
      place(p[0], p[1]);
      room--;
    }
    line("");
  }

  private void place(long xNm, long yNm) {
    out.append('X');
    signed(xNm);
    out.append('Y');
    signed(yNm);
  }

  private void signed(long nm) {
    long um = Numbers.micrometres(nm);
    if (Math.abs(um) > PLACE_LIMIT_UM) {
      throw new IllegalArgumentException("beyond IPC-D-356A, six digits of um: " + um);
    }
    out.append(um < 0 ? '-' : '+').append(Numbers.padded(Math.abs(um), 6));
  }

  private void comment(String text) {
    line("C  " + cut(Ascii.plain(text), COMMENT_COLUMNS));
  }

  private void parameter(String name, String value) {
    line("P  " + left(name, 6) + cut(Ascii.plain(value).strip(), VALUE_COLUMNS));
  }

  private void line(String text) {
    out.append(text).append("\r\n");
  }

  private static long um(double mm) {
    return Numbers.micrometres(Grid.nm(mm));
  }

  private static long limited(double mm) {
    return Math.min(SIZE_LIMIT_UM, um(mm));
  }

  private static String left(String text, int columns) {
    return text + " ".repeat(columns - text.length());
  }

  private static String cut(String text, int columns) {
    return text.length() <= columns ? text : text.substring(0, columns);
  }
}
