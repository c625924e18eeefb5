package connate.chance;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Function;

/**
 * Runs a calculation many times with uncertain inputs.
 *
 * <pre>{@code
 * var runs = simulate(20_000, seed(7), draw -> {
 *   var phi = draw.of("porosity", normal(percent(18), percent(2)));
 *   return Outcome.of("permeability", fit.median(phi));
 * });
 * }</pre>
 */
public final class Simulation {

  private Simulation() {}

  /**
   * Runs a calculation.
   *
   * @param runs the number of realisations
   * @param sampling the seed and the way of drawing
   * @param calculation gives the outcome of one realisation; it must not change anything shared
   * @throws IllegalArgumentException if runs is not positive, or a realisation fails: its number is
   *     told, so that it can be repeated
   */
  public static Runs simulate(int runs, Sampling sampling, Function<Draw, Outcome> calculation) {
    return simulate(runs, sampling, calculation, Runtime.getRuntime().availableProcessors());
  }

  /** Runs a calculation on a given number of threads, which changes the time and nothing else. */
  public static Runs simulate(
      int runs, Sampling sampling, Function<Draw, Outcome> calculation, int threads) {
    if (runs < 1 || threads < 1) {
      throw new IllegalArgumentException("at least one run and one thread are needed");
    }
    Probabilities probabilities = new Probabilities(sampling, runs);
    Realisation[] done = new Realisation[runs];
    inParallel(
        threads,
        part -> {
          for (int run = part; run < runs; run += threads) {
            checkInterrupt();
            done[run] = realise(run, probabilities, calculation);
          }
        });
    return Runs.of(List.of(done), sampling, calculation);
  }

  /** One run: what was drawn and what came out. */
  record Realisation(Draw draw, Outcome outcome) {}

  private static Realisation realise(
      int run, Probabilities probabilities, Function<Draw, Outcome> calculation) {
    Draw draw = new Draw(run, name -> probabilities.of(run, name));
    try {
      return new Realisation(draw, calculation.apply(draw));
    } catch (IllegalArgumentException e) {
      throw new IllegalArgumentException(
          "run " + run + " of the simulation failed with " + draw.drawn() + ": " + e.getMessage(),
          e);
    }
  }

  private static void checkInterrupt() {
    if (Thread.currentThread().isInterrupted()) {
      throw new CancellationException("the simulation was stopped");
    }
  }

  private static void inParallel(int threads, java.util.function.IntConsumer work) {
    if (threads == 1) {
      work.accept(0);
      return;
    }
    ExecutorService pool = Executors.newFixedThreadPool(threads);
    try {
      List<Future<?>> parts = new ArrayList<>();
      for (int part = 0; part < threads; part++) {
        int mine = part;
        parts.add(pool.submit(() -> work.accept(mine)));
      }
      for (Future<?> part : parts) {
        await(part);
      }
    } finally {
      pool.shutdownNow();
    }
  }

  private static void await(Future<?> part) {
    try {
      part.get();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new CancellationException("the simulation was stopped");
    } catch (ExecutionException e) {
      if (e.getCause() instanceof RuntimeException cause) {
        throw cause;
      }
      throw new IllegalStateException(e.getCause());
    }
  }
}
