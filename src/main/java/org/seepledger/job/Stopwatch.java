package org.seepledger.job;

import java.util.LinkedHashMap;
import java.util.Map;

/** How long the stages of a run took. */
final class Stopwatch {

    private static final double NANOS = 1e9;

    private final Map<String, Double> seconds = new LinkedHashMap<>();
    private long last = System.nanoTime();

    void lap(String stage) {
        long now = System.nanoTime();
        seconds.merge(stage, (now - last) / NANOS, Double::sum);
        last = now;
    }

    Map<String, Double> seconds() {
        return seconds;
    }
}
