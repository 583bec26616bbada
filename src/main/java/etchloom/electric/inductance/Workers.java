package etchloom.electric.inductance;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.IntConsumer;

/** Runs independent tasks on all processors; which thread takes which task makes no difference. */
final class Workers {
  private Workers() {}

  /** Calls the task once with each number below the count, and returns when all are done. */
  static void run(int count, IntConsumer task) {
    AtomicInteger next = new AtomicInteger();
    AtomicReference<Throwable> fault = new AtomicReference<>();
    Runnable loop =
        () -> {
          try {
            for (int i = next.getAndIncrement(); i < count; i = next.getAndIncrement()) {
              task.accept(i);
            }
          } catch (RuntimeException | Error e) {
            next.set(count);
            fault.compareAndSet(null, e);
          }
        };
    List<Thread> others = new ArrayList<>();
    int threads = Math.min(count, Runtime.getRuntime().availableProcessors());
    for (int i = 1; i < threads; i++) {
      Thread t = new Thread(loop, "inductance-" + i);
      t.setDaemon(true);
      t.start();
      others.add(t);
    }
    loop.run();
    for (Thread t : others) {
      join(t);
    }
    Throwable e = fault.get();
    if (e instanceof Error error) {
      throw error;
    }
    if (e instanceof RuntimeException runtime) {
      throw runtime;
    }
  }

  private static void join(Thread t) {
    boolean interrupted = false;
    while (true) {
      try {
        t.join();
        break;
      } catch (InterruptedException e) {
        interrupted = true;
      }
    }
    if (interrupted) {
      Thread.currentThread().interrupt();
    }
  }
}
