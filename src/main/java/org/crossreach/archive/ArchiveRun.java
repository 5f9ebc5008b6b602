package org.crossreach.archive;

import java.io.IOException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Semaphore;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicReference;

/**
 * Keeps many measurements, several side by side.
 *
 * @param plan what is to be made
 * @param listener hears of each measurement as it is finished, one at a time
 */
public record ArchiveRun(Plan plan, Listener listener) {

  /** Hears of each measurement. */
  public interface Listener {
    void finished(Outcome outcome);
  }

  /**
   * Keeps measurements.
   *
   * <p>No more measurements are in memory than are worked on. When the archive cannot be written
   * the run stops; what is kept by then is whole, and the next run goes on from there.
   *
   * @param found the measurements
   * @throws CannotKeep when the archive cannot be written
   */
  public void keep(Iterable<Found> found) throws IOException {
    Keeper keeper = new Keeper(plan);
    Semaphore places = new Semaphore(2 * plan.jobs());
    AtomicReference<Throwable> stop = new AtomicReference<>();
    ExecutorService workers = Executors.newFixedThreadPool(plan.jobs());
    try {
      for (Found each : found) {
        places.acquire();
        if (stop.get() != null) {
          break;
        }
        workers.execute(
            () -> {
              try {
                if (stop.get() == null) {
                  tell(keeper.keep(each));
                }
              } catch (CannotKeep | RuntimeException | Error trouble) {
                stop.compareAndSet(null, trouble);
              } finally {
                places.release();
              }
            });
      }
      workers.shutdown();
      workers.awaitTermination(Long.MAX_VALUE, TimeUnit.NANOSECONDS);
    } catch (InterruptedException interrupted) {
      Thread.currentThread().interrupt();
      throw new IOException("interrupted", interrupted);
    } finally {
      workers.shutdownNow();
    }
    if (stop.get() instanceof CannotKeep trouble) {
      throw trouble;
    }
    if (stop.get() != null) {
      throw new IllegalStateException(stop.get());
    }
  }

  private void tell(Outcome outcome) {
    synchronized (listener) {
      listener.finished(outcome);
    }
  }
}
