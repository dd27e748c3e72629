package org.seepledger.aquifer;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Iterator;

/**
 * Keeps what was worked out of blocks of cells, within a bound of memory, for questions about almost the same cells that
 * follow one another quickly. A block is somewhat wider than what was asked for, so that a volume can be moved about in it.
 *
 * <p>What a cell's values are does not depend on the block that it is looked at in, so that answers are the same to the
 * last bit as the aquifer's own. Safe from any thread.
 */
public final class KeptCells {

    /** How many cells a block is wider on each side than what was asked for, and which part of its size beside. */
    private static final int MARGIN = 16;

    private static final int MARGIN_PART = 8;

    private final Aquifer aquifer;
    private final long limit;
    private final Deque<KeptBlock> blocks = new ArrayDeque<>();

    /**
     * Keeps nothing yet.
     *
     * @param aquifer the aquifer
     * @param limit how many bytes may be kept, about
     */
    public KeptCells(Aquifer aquifer, long limit) {
        this.aquifer = aquifer;
        this.limit = limit;
    }

    /**
     * {@return the cells of a window, kept for the next time; the aquifer itself where they are too many to keep}
     *
     * @param window the window
     */
    public synchronized KnownCells around(Window window) {
        KeptBlock block = blocks.stream()
                .filter(kept -> kept.holds(window))
                .findFirst()
                .orElseGet(() -> new KeptBlock(aquifer, widened(window), this::trim));
        if (block.leastBytes() > limit) {
            return aquifer;
        }
        blocks.remove(block);
        blocks.addFirst(block);
        trim();
        return block;
    }

    private Window widened(Window window) {
        int margin = MARGIN + Math.max(window.rows(), window.columns()) / MARGIN_PART;
        return window.widened(margin, aquifer.grid());
    }

    /** Gives up what was used longest ago. */
    private synchronized void trim() {
        long room = limit;
        Iterator<KeptBlock> all = blocks.iterator();
        while (all.hasNext()) {
            KeptBlock block = all.next();
            if (block.leastBytes() > room) {
                all.remove();
            } else {
                room -= block.keepWithin(room);
            }
        }
    }

    /** {@return how many bytes are kept, about} */
    synchronized long bytes() {
        return blocks.stream().mapToLong(KeptBlock::bytes).sum();
    }
}
