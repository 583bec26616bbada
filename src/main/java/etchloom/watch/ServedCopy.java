package etchloom.watch;

import java.nio.charset.StandardCharsets;

/**
 * A page as it is served: with the script that reloads it, and a policy that lets this script ask
 * whether there is something new. What was written to the disk has none of this.
 *
 * @param html UTF-8
 * @param policy the page's own, which the copy no longer holds, with leave for the script
 */
record ServedCopy(byte[] html, String policy) {
  static final String SCRIPT = "-/reload.js";
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
    String script = "<script src=\"/" + SCRIPT + "\" data-version=\"" + version + "\"></script>\n";
    int last = html.lastIndexOf("</body>");
    html.insert(last < 0 ? html.length() : last, script);
    if (!notice.isEmpty()) {
      int body = html.indexOf("<body");
      html.insert(body < 0 ? 0 : html.indexOf(">", body) + 1, notice);
    }
    return new ServedCopy(html.toString().getBytes(StandardCharsets.UTF_8), wider(policy));
  }

  private static String wider(String policy) {
    StringBuilder out = new StringBuilder();
    boolean scripts = false;
    for (String directive : policy.split(";")) {
      String d = directive.strip();
      if (d.startsWith("script-src ")) {
        d = d.equals("script-src 'none'") ? "script-src 'self'" : d + " 'self'";
        scripts = true;
      }
      if (!d.startsWith("connect-src ")) {
        out.append(d).append("; ");
      }
    }
    return out
        + (scripts ? "" : "script-src 'self'; ")
        + "connect-src 'self'; frame-ancestors 'none'";
  }
}
