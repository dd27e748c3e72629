package org.seepledger.balance;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Consumer;
import org.seepledger.aquifer.Window;
import org.seepledger.prism.PrismCut;

/** Bands of rows, and the work on them by several threads. */
public final class Bands {

    private static final int CELLS_IN_A_BAND = 1 << 18;

    private Bands() {}

    /**
     * {@return the smallest window that holds all cells that prisms touch}
     *
     * @param cuts how each prism cuts the grid
     */
    public static Window joint(List<PrismCut> cuts) {
        int north = Integer.MAX_VALUE;
        int west = Integer.MAX_VALUE;
        int south = 0;
        int east = 0;
        for (PrismCut cut : cuts) {
            Window window = cut.coverage().window();
            north = Math.min(north, window.row());
            west = Math.min(west, window.column());
            south = Math.max(south, window.rowEnd());
            east = Math.max(east, window.columnEnd());
        }
        return new Window(north, west, south - north, east - west);
    }

    /**
     * {@return the bands of a window, aligned so that they fall together with the tiles of rasters}
     *
     * @param window the window
     * @param layers the number of layers
     */
    public static List<Window> of(Window window, int layers) {
        int perRow = (window.columns() + 2) * layers;
        int height = Math.max(8, Integer.highestOneBit(Math.max(1, CELLS_IN_A_BAND / perRow)));
        List<Window> bands = new ArrayList<>();
        for (int row = window.row(); row < window.rowEnd(); ) {
            int end = Math.min(window.rowEnd(), (row / height + 1) * height);
            bands.add(new Window(row, window.column(), end - row, window.columns()));
            row = end;
        }
        return bands;
    }

    /**
     * Does the work of bands and takes what each comes to in their order, whatever the number of threads.
     *
     * @param bands the work on each band
     * @param threads how many threads may work
     * @param inOrder takes the results
     * @param <R> what a band comes to
     * @throws RuntimeException what the work on a band throws
     */
    public static <R> void work(List<? extends Callable<R>> bands, int threads, Consumer<R> inOrder) {
        if (threads == 1) {
            oneByOne(bands, inOrder);
        } else {
            atOnce(bands, threads, inOrder);
        }
    }

    /** In the caller's own thread: to wait for another one costs time where answers are wanted many times a second. */
    private static <R> void oneByOne(List<? extends Callable<R>> bands, Consumer<R> inOrder) {
        for (Callable<R> band : bands) {
            try {
                inOrder.accept(band.call());
            } catch (RuntimeException e) {
                throw e;
            } catch (Exception e) {
                throw new IllegalStateException(e);
            }
        }
    }

    private static <R> void atOnce(List<? extends Callable<R>> bands, int threads, Consumer<R> inOrder) {
        ExecutorService workers = Executors.newFixedThreadPool(threads, Bands::daemon);
        try {
            Deque<Future<R>> waiting = new ArrayDeque<>();
            for (Callable<R> band : bands) {
                waiting.add(workers.submit(band));
                if (waiting.size() > 2 * threads) {
                    inOrder.accept(waiting.remove().get());
                }
            }
            while (!waiting.isEmpty()) {
                inOrder.accept(waiting.remove().get());
            }
        } catch (ExecutionException e) {
            throw e.getCause() instanceof RuntimeException cause ? cause : new IllegalStateException(e.getCause());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        } finally {
            workers.shutdownNow();
        }
    }

    private static Thread daemon(Runnable work) {
        Thread thread = new Thread(work, "balance");
        thread.setDaemon(true);
        return thread;
    }
}
