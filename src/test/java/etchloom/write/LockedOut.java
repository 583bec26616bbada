package etchloom.write;

import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;

/** Publishes as root without root's right to write anywhere, in a process of its own. */
final class LockedOut {
  private LockedOut() {}

  /** What came of it: {@code DISK message}, or {@code published}. */
  static String publish(Path folder) throws Exception {
    List<String> drop = List.of("setpriv", "--bounding-set=-dac_override");
    assumeTrue(
        run(drop, "true").equals("0 "), "this user may write anywhere and cannot be kept from it");
    return run(
            drop,
            Path.of(System.getProperty("java.home"), "bin", "java").toString(),
            "-cp",
            System.getProperty("java.class.path"),
            LockedOut.class.getName(),
            folder.toString())
        .substring(2);
  }

  /** The exit code, a blank, and what was said. */
  private static String run(List<String> before, String... command) throws Exception {
    List<String> all = new java.util.ArrayList<>(before);
    all.addAll(List.of(command));
    try {
      Process p = new ProcessBuilder(all).redirectErrorStream(true).start();
      String said = new String(p.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
      return p.waitFor(60, TimeUnit.SECONDS) ? p.exitValue() + " " + said.strip() : "never ended";
    } catch (java.io.IOException e) {
      return "no such program";
    }
  }

  public static void main(String[] args) {
    TreeMap<String, byte[]> files = new TreeMap<>();
    files.put("a.txt", new byte[] {1});
    files.put(Manifest.NAME, Manifest.of("0", files));
    try {
      Publisher.publish(Path.of(args[0]), files);
      System.out.println("published");
    } catch (PublishFailure e) {
      System.out.println(e.reason() + " " + e.getMessage());
    }
  }
}
