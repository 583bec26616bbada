package etchloom.survey;

import java.io.IOException;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.LongFunction;

/** Does numbered tasks on all processors and hands on their results in the order of the numbers. */
final class Crew {
  /** Results that may wait for a slower one before them, for each processor. */
  private static final int AHEAD = 4;

  private Crew() {}

  /** Takes a result; an exception of it ends the work. */
  interface Sink<T> {
    void take(long number, T result) throws IOException;
  }

  static <T> void run(long first, long last, LongFunction<T> task, Sink<T> sink)
      throws IOException {
    int cores = Runtime.getRuntime().availableProcessors();
    ExecutorService pool =
        Executors.newFixedThreadPool(
            cores,
            r -> {
              Thread t = new Thread(r, "survey");
              t.setDaemon(true);
              return t;
            });
    try {
      Deque<Future<T>> waiting = new ArrayDeque<>();
      long submitted = first;
      for (long number = first; number <= last; number++) {
        while (submitted <= last && waiting.size() < AHEAD * cores) {
          long own = submitted++;
          waiting.add(pool.submit((Callable<T>) () -> task.apply(own)));
        }
        sink.take(number, result(waiting.remove()));
      }
    } finally {
      pool.shutdownNow();
    }
  }

  private static <T> T result(Future<T> future) {
    try {
      return future.get();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException("interrupted", e);
    } catch (ExecutionException e) {
      if (e.getCause() instanceof RuntimeException r) {
        throw r;
      }
      if (e.getCause() instanceof Error r) {
        throw r;
      }
      throw new IllegalStateException(e.getCause());
    }
  }
}
