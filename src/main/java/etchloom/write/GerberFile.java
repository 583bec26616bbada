package etchloom.write;

import etchloom.artwork.Artwork;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * One Gerber X2 file in the making: frame, apertures, objects.
 *
 * <p>Format 4.6 in millimetres, so that a coordinate is the whole number of nanometres itself.
 * Source: Gerber Layer Format Specification 2024.05. Attributes are written in their {@code %T..%}
 * form only. Named deletes only: a strict reader fails on the bare one.
 */
final class GerberFile {
  /** Some readers keep aperture numbers in four digits. */
  private static final int LAST_APERTURE = 9999;

  /** First coordinate beyond format 4.6, nm. */
  private static final long LIMIT_NM = 10_000_000_000L;

  private record Aperture(String function, long diameterNm) {}

  private final Artwork art;
  private final OrderInfo info;
  private final String what;
  private final String fileFunction;
  private final boolean positive;
  private final Map<Aperture, Integer> apertures = new LinkedHashMap<>();
  private final StringBuilder body = new StringBuilder();
  private int selected;
  private String mode = "G01";
  private Optional<String> net = Optional.empty();

  /**
   * @param what for people, in the first comment
   */
  GerberFile(Artwork art, OrderInfo info, String what, String fileFunction, boolean positive) {
    this.art = art;
    this.info = info;
    this.what = what;
    this.fileFunction = fileFunction;
    this.positive = positive;
  }

  /** The objects that follow belong to this net; empty: they carry no net attribute. */
  void net(Optional<String> name) {
    if (name.equals(net)) {
      return;
    }
    if (name.isPresent()) {
      line("%TO.N," + Ascii.gerberField(name.get()) + "*%");
    } else {
      line("%TD.N*%");
    }
    net = name;
  }

  /** Draws a round pen along a path. */
  void draw(Trace t, String function, long diameterNm) {
    select(function, diameterNm);
    point(t.x(), t.y());
    line("D02*");
    long x = t.x();
    long y = t.y();
    for (Trace.Step s : t.steps()) {
      mode(s.turn() == 0 ? "G01" : s.turn() < 0 ? "G02" : "G03");
      point(s.x(), s.y());
      if (s.arc()) {
        body.append('I').append(s.cx() - x).append('J').append(s.cy() - y);
      }
      line("D01*");
      x = s.x();
      y = s.y();
    }
  }

  void flash(long x, long y, String function, long diameterNm) {
    select(function, diameterNm);
    point(x, y);
    line("D03*");
  }

  /** A flash that is the pad of a terminal. */
  void terminal(long x, long y, String function, long diameterNm, String mark) {
    select(function, diameterNm);
    line("%TO.P,X1," + Ascii.gerberField(mark) + "*%");
    flash(x, y, function, diameterNm);
    line("%TD.P*%");
  }

  byte[] finish() {
    net(Optional.empty());
    StringBuilder s = header();
    s.append(body);
    String sum = md5(s);
    s.append("%TF.MD5,").append(sum).append("*%\nM02*\n");
    return Ascii.bytes(s);
  }

  private StringBuilder header() {
    StringBuilder s = new StringBuilder(body.length() + 1000);
    s.append("G04 ").append(Ascii.plain(what).replaceAll("[%*]", "?")).append("*\n");
    if (art.draft()) {
      s.append("G04 DRAFT: rules are broken, not for production*\n");
    }
    file(
        s,
        "GenerationSoftware",
        Project.VENDOR + "," + Project.APPLICATION + "," + Ascii.gerberField(info.toolVersion()));
    info.created().ifPresent(c -> file(s, "CreationDate", c.toString()));
    file(
        s,
        "ProjectId",
        Ascii.gerberField(art.title())
            + ","
            + Project.guid(art)
            + ","
            + Ascii.gerberField(art.revision()));
    file(s, "Part", "Single");
    file(s, "SameCoordinates", Project.coordinates(art));
    file(s, "FileFunction", fileFunction);
    file(s, "FilePolarity", positive ? "Positive" : "Negative");
    s.append("%FSLAX46Y46*%\n%MOMM*%\n");
    String last = "";
    for (Map.Entry<Aperture, Integer> a : apertures.entrySet()) {
      if (!a.getKey().function.equals(last)) {
        last = a.getKey().function;
        s.append("%TA.AperFunction,").append(last).append("*%\n");
      }
      s.append("%ADD").append(a.getValue()).append("C,");
      s.append(Numbers.mm(a.getKey().diameterNm)).append("*%\n");
    }
    if (!last.isEmpty()) {
      s.append("%TD.AperFunction*%\n");
    }
    return s.append("%LPD*%\nG75*\nG01*\n");
  }

  private static void file(StringBuilder s, String name, String value) {
    s.append("%TF.").append(name).append(',').append(value).append("*%\n");
  }

  private void select(String function, long diameterNm) {
    if (diameterNm <= 0) {
      throw new IllegalArgumentException("an aperture needs a size, got " + diameterNm + " nm");
    }
    int n =
        apertures.computeIfAbsent(new Aperture(function, diameterNm), k -> 10 + apertures.size());
    if (n > LAST_APERTURE) {
      throw new IllegalArgumentException("more than 9990 apertures in " + fileFunction);
    }
    if (n != selected) {
      line("D" + n + "*");
      selected = n;
    }
  }

  private void mode(String wanted) {
    if (!wanted.equals(mode)) {
      line(wanted + "*");
      mode = wanted;
    }
  }

  private void point(long x, long y) {
    if (Math.abs(x) >= LIMIT_NM || Math.abs(y) >= LIMIT_NM) {
      throw new IllegalArgumentException("beyond Gerber format 4.6: " + x + ", " + y + " nm");
    }
    body.append('X').append(x).append('Y').append(y);
  }

  private void line(String s) {
    body.append(s).append('\n');
  }

  /** Over all characters but line ends, as the format asks of {@code .MD5}. */
  private static String md5(StringBuilder text) {
    try {
      MessageDigest md = MessageDigest.getInstance("MD5");
      md.update(text.toString().replace("\n", "").getBytes(StandardCharsets.US_ASCII));
      return HexFormat.of().formatHex(md.digest());
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has MD5", e);
    }
  }
}
