package etchloom.cli;

/** Entry point of the command-line program. */
public final class Main {
  private Main() {}

  public static void main(String[] args) {
    Console console = new Console(System.out, System.err, System.getenv(), onTerminal());
    int code;
    try {
      code = App.run(args, console);
    } catch (RuntimeException | Error e) {
      code = App.crashed(e, console);
    }
    System.out.flush();
    System.err.flush();
    System.exit(code);
  }

  /** Java 17 gives a console only where both input and output are a terminal; later ones always. */
  @SuppressWarnings("SystemConsoleNull")
  private static boolean onTerminal() {
    return System.console() != null && System.getenv("TERM") != null;
  }
}
