package flowshy.verdict.map;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicInteger;

/**
 * Fills a grid on several threads. Every place is written by its index and depends on nothing but its own two numbers, so the result is the
 * same whatever the number of threads.
 *
 * @param threads how many, one or more
 * @param progress told now and then, by the thread that called
 */
public record GridRun(int threads, Progress progress) {
    private static final long PATIENCE_MS = 100;

    /** @throws IllegalArgumentException if there is no thread */
    public GridRun {
        if (threads < 1) {
            throw new IllegalArgumentException("threads: one or more, not " + threads);
        }
    }

    /** Takes notice of how far a run is. */
    @FunctionalInterface
    public interface Progress {
        /** Takes none. */
        Progress NONE = (done, left) -> {};

        /**
         * How far a run is.
         *
         * @param done share of the work, 0 to 1
         * @param left time that the rest will take if it goes on so [s]; NaN at the very beginning
         */
        void at(double done, double left);

        /** The run has ended, well or not. */
        default void end() {}
    }

    /**
     * Fills a grid.
     *
     * @param surface what is mapped
     * @param across side that runs along a line
     * @param down side that runs from line to line
     * @return the grid
     * @throws CancellationException if the calling thread is interrupted: nothing is kept, the threads end, the thread stays marked
     */
    public Grid fill(Surface surface, Axis across, Axis down) {
        Spot[] spots = new Spot[across.count() * down.count()];
        double[] values = new double[across.count()];
        Arrays.setAll(values, across::value);
        AtomicInteger next = new AtomicInteger();
        AtomicInteger done = new AtomicInteger();
        Runnable work = () -> {
            for (int j = next.getAndIncrement(); j < down.count(); j = next.getAndIncrement()) {
                Surface.Line line = surface.line(down.value(j));
                for (int i = 0; i < values.length; i++) {
                    if (Thread.currentThread().isInterrupted()) {
                        return;
                    }
                    spots[j * values.length + i] = line.at(values[i]);
                }
                done.incrementAndGet();
            }
        };
        ExecutorService pool = Executors.newFixedThreadPool(threads);
        try {
            List<Future<?>> workers = new ArrayList<>();
            for (int t = 0; t < threads; t++) {
                workers.add(pool.submit(work));
            }
            pool.shutdown();
            long start = System.nanoTime();
            for (Future<?> worker : workers) {
                await(worker, done, down.count(), start);
            }
        } finally {
            pool.shutdownNow();
            progress.end();
        }
        return new Grid(across, down, Arrays.asList(spots));
    }

    private void await(Future<?> worker, AtomicInteger done, int all, long start) {
        while (true) {
            try {
                worker.get(PATIENCE_MS, TimeUnit.MILLISECONDS);
                return;
            } catch (TimeoutException e) {
                double share = (double) done.get() / all;
                double spent = 1e-9 * (System.nanoTime() - start);
                progress.at(share, share == 0.0 ? Double.NaN : spent * (1.0 - share) / share);
            } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
                throw new CancellationException("the run was interrupted");
            } catch (ExecutionException e) {
                if (e.getCause() instanceof RuntimeException failure) {
                    throw failure;
                }
                throw new IllegalStateException(e.getCause());
            }
        }
    }
}
