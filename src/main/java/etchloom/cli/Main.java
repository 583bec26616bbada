package etchloom.cli;

/** Entry point of the command-line program. */
public final class Main {
  private Main() {}

  public static void main(String[] args) {
    System.out.println("etchloom");
  }
}
