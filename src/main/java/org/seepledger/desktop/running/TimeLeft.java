package org.seepledger.desktop.running;

import java.time.Duration;
import java.util.Optional;
import org.seepledger.desktop.words.Words;

/**
 * How long a stretch of work will still take: from the mean speed so far, and steadied, so that a reader sees it fall rather
 * than jump. Nothing is said before the speed means something.
 */
final class TimeLeft {

    private static final double SETTLED_SECONDS = 2;
    private static final double SETTLED_SHARE = 0.03;

    /** The part of the way that a shown value goes toward a new estimate per look. */
    private static final double GIVE = 0.2;

    /** Estimates that are off by more than this are wrong, not unsteady. */
    private static final double OFF = 2;

    private static final double STEP = 5;
    private static final double MINUTE = 60;

    private int stretch = -1;
    private double firstSeconds;
    private double firstShare;
    private double lastSeconds;
    private double shown = Double.NaN;

    /** Takes note of how far the work is. */
    void look(int nowIn, double share, Duration now) {
        double seconds = now.toNanos() / 1e9;
        if (nowIn != stretch) {
            stretch = nowIn;
            firstSeconds = seconds;
            firstShare = share;
            shown = Double.NaN;
        }
        double time = seconds - firstSeconds;
        double way = share - firstShare;
        if (time >= SETTLED_SECONDS && way >= SETTLED_SHARE) {
            steady((1 - share) * time / way, seconds - lastSeconds);
        }
        lastSeconds = seconds;
    }

    private void steady(double estimate, double passed) {
        double expected = Math.max(0, shown - passed);
        boolean fresh = Double.isNaN(shown) || estimate > OFF * expected + STEP || expected > OFF * estimate + STEP;
        shown = fresh ? estimate : expected + GIVE * (estimate - expected);
    }

    /** What to say of it, if anything. */
    Optional<String> words() {
        if (Double.isNaN(shown)) {
            return Optional.empty();
        }
        if (shown <= STEP) {
            return Optional.of(Words.of("left.soon"));
        }
        return Optional.of(
                shown <= MINUTE
                        ? Words.of("left.seconds", (int) (STEP * Math.ceil(shown / STEP)))
                        : Words.of("left.minutes", (int) Math.ceil(shown / MINUTE)));
    }
}
