package etchloom.survey;

import etchloom.report.JsonTree;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;

/**
 * What a survey is to do; two with the same fingerprint come to the same rows.
 *
 * @param slug of the spec's title
 * @param kind {@code grid}, or what the search is for
 * @param axes the varied keys; of a search, each with its two ends
 * @param count of variants in all parts
 */
record Plan(
    String fingerprint,
    String toolVersion,
    String title,
    String slug,
    String kind,
    List<Axis> axes,
    long count,
    Part part) {
  static final String GRID = "grid";

  Plan {
    axes = List.copyOf(axes);
  }

  /** The plan of all parts together. */
  Plan whole() {
    return new Plan(fingerprint, toolVersion, title, slug, kind, axes, count, Part.WHOLE);
  }

  long first() {
    return part.first(count);
  }

  long last() {
    return part.last(count);
  }

  /** Of everything that the rows depend on. */
  static String fingerprint(Bench bench, String kind, List<Axis> axes) {
    try {
      MessageDigest sha = MessageDigest.getInstance("SHA-256");
      add(sha, bench.toolVersion().getBytes(StandardCharsets.UTF_8));
      add(sha, bench.spec());
      add(sha, bench.shelf().forced().orElse("").getBytes(StandardCharsets.UTF_8));
      bench
          .shelf()
          .rules()
          .forEach(
              (name, r) -> {
                add(sha, name.getBytes(StandardCharsets.UTF_8));
                add(sha, r.text().getBytes(StandardCharsets.UTF_8));
              });
      add(sha, kind.getBytes(StandardCharsets.UTF_8));
      for (Axis a : axes) {
        add(sha, a.key().getBytes(StandardCharsets.UTF_8));
        a.values().forEach(v -> add(sha, v.getBytes(StandardCharsets.UTF_8)));
        add(sha, new byte[0]);
      }
      return HexFormat.of().formatHex(sha.digest());
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("Java without SHA-256", e);
    }
  }

  private static void add(MessageDigest sha, byte[] bytes) {
    sha.update(Integer.toString(bytes.length).getBytes(StandardCharsets.UTF_8));
    sha.update((byte) ':');
    sha.update(bytes);
  }

  JsonTree json() {
    return new JsonTree()
        .put("tool", new JsonTree().put("version", toolVersion))
        .put("title", title)
        .put("kind", kind)
        .put("count", count)
        .putObjects(
            "vary",
            axes.stream()
                .map(a -> new JsonTree().put("key", a.key()).putTexts("values", a.values()))
                .toList());
  }
}
