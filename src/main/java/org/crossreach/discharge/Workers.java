package org.crossreach.discharge;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Function;

/** Does the same to several things side by side. */
public final class Workers {

  private Workers() {}

  /**
   * Applies a function to every item; results stand in the order of the items.
   *
   * @param threads at least 1; with 1, or one item, everything happens on the calling thread
   */
  public static <A, B> List<B> map(List<A> items, int threads, Function<A, B> function) {
    List<B> results = new ArrayList<>(items.size());
    if (threads == 1 || items.size() < 2) {
      for (A item : items) {
        results.add(function.apply(item));
      }
      return results;
    }
    ExecutorService workers = Executors.newFixedThreadPool(Math.min(threads, items.size()));
    try {
      List<Future<B>> futures = new ArrayList<>();
      for (A item : items) {
        futures.add(workers.submit(() -> function.apply(item)));
      }
      for (Future<B> future : futures) {
        results.add(future.get());
      }
      return results;
    } catch (ExecutionException e) {
      throw new IllegalStateException(e.getCause());
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException("interrupted", e);
    } finally {
      workers.shutdownNow();
    }
  }
}
