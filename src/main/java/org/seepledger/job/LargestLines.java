package org.seepledger.job;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.PriorityQueue;
import org.seepledger.balance.Trace;
import org.seepledger.job.TracedNumber.Line;

/** Keeps the lines of a trace that contribute the most, and forgets the others. */
final class LargestLines implements Trace.Lines {

    private static final Comparator<Line> BY_SIZE = Comparator.comparingDouble(line -> Math.abs(line.contribution()));

    private final int most;
    private final PriorityQueue<Line> kept = new PriorityQueue<>(BY_SIZE);

    /**
     * Keeps none yet.
     *
     * @param most how many are kept
     */
    LargestLines(int most) {
        this.most = most;
    }

    @Override
    public void line(String file, String place, double value, double weight) {
        kept.add(new Line(file, place, value, weight));
        if (kept.size() > most) {
            kept.remove();
        }
    }

    /** The lines, the largest first. */
    List<Line> lines() {
        List<Line> lines = new ArrayList<>(kept);
        lines.sort(BY_SIZE.reversed().thenComparing(Line::file).thenComparing(Line::place));
        return lines;
    }
}
