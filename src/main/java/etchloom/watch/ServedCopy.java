package etchloom.watch;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A page as it is served: with the script that reloads it, and a policy that lets this script ask
 * whether there is something new. What was written to the disk has none of this.
 *
 * @param html UTF-8
 * @param policy the page's own, which the copy no longer holds, with leave for the script
 */
record ServedCopy(byte[] html, String policy) {
  static final String SCRIPT = "-/reload.js";
  static final String STYLE = "-/watch.css";
  static final String VERSION = "-/version";

  private static final String META = "<meta http-equiv=\"Content-Security-Policy\" content=\"";
  private static final String META_END = "\"/>\n";
  private static final String NOTHING = "default-src 'none'";

  /**
   * @param notice markup to put on top; may be empty
   */
  static ServedCopy of(String page, String version, String notice) {
    StringBuilder html = new StringBuilder(page);
    String policy = NOTHING;
    int meta = html.indexOf(META);
    int end = meta < 0 ? -1 : html.indexOf(META_END, meta);
    if (end > 0) {
      policy = html.substring(meta + META.length(), end);
      html.delete(meta, end + META_END.length());
    }
    int head = html.indexOf("</head>");
    html.insert(Math.max(head, 0), "<link rel=\"stylesheet\" href=\"/" + STYLE + "\"/>\n");
    String script = "<script src=\"/" + SCRIPT + "\" data-version=\"" + version + "\"></script>\n";
    int last = html.lastIndexOf("</body>");
    html.insert(last < 0 ? html.length() : last, script);
    if (!notice.isEmpty()) {
      int body = html.indexOf("<body");
      html.insert(body < 0 ? 0 : html.indexOf(">", body) + 1, notice);
    }
    return new ServedCopy(html.toString().getBytes(StandardCharsets.UTF_8), wider(policy));
  }

  /** The policy, and besides: script and style of this server, and asking it. */
  private static String wider(String policy) {
    Map<String, String> directives = new LinkedHashMap<>();
    for (String directive : policy.split(";")) {
      String[] parts = directive.strip().split(" ", 2);
      directives.put(parts[0], parts.length > 1 ? parts[1] : "");
    }
    for (String more : List.of("script-src", "style-src", "connect-src")) {
      String before = directives.getOrDefault(more, "'none'");
      directives.put(more, before.equals("'none'") ? "'self'" : before + " 'self'");
    }
    directives.put("frame-ancestors", "'none'");
    List<String> out = new ArrayList<>();
    directives.forEach((name, sources) -> out.add((name + " " + sources).strip()));
    return String.join("; ", out);
  }
}
