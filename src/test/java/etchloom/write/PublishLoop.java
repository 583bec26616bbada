package etchloom.write;

import java.nio.file.Path;

/** A process that publishes sets by turns: {@code FOLDER TIMES FIRST}; killed by its tests. */
final class PublishLoop {
  private PublishLoop() {}

  public static void main(String[] args) throws Exception {
    Path folder = Path.of(args[0]);
    int times = Integer.parseInt(args[1]);
    boolean one = args[2].equals("one");
    System.out.println("ready");
    System.out.flush();
    for (int i = 0; i < times; i++) {
      Publisher.publish(folder, PublisherTest.set(one ? "one" : "two"));
      one = !one;
    }
  }
}
