package etchloom.cli;

import java.util.concurrent.Callable;

final class CheckCommand implements Callable<Integer> {
  CheckCommand(Console console) {}

  @Override
  public Integer call() {
    return 0;
  }
}
