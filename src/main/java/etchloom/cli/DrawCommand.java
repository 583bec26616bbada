package etchloom.cli;

import java.util.concurrent.Callable;

final class DrawCommand implements Callable<Integer> {
  DrawCommand(Console console) {}

  @Override
  public Integer call() {
    return 0;
  }
}
