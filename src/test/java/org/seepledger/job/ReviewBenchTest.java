package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A small run of the bench; {@link ReviewBench} itself says what a large one comes to. */
class ReviewBenchTest {

    private static final long SEED = 3_000_000;
    private static final int TABLES = 64;

    @TempDir
    private Path folder;

    @Test
    void findsNearlyAllSlipsAndNoFaultInSoundTables() throws IOException {
        ReviewBench bench = new ReviewBench(folder);
        int found = 0;
        int faults = 0;
        for (int i = 0; i < TABLES; i++) {
            found += bench.with(ReviewBench.slip(i), SEED + i).found() ? 1 : 0;
            faults += bench.sound(SEED + i).fault() ? 1 : 0;
        }
        assertThat(found).as("slips found with the right code").isGreaterThanOrEqualTo(TABLES - 4);
        assertThat(faults).as("sound tables with a false fault").isLessThanOrEqualTo(1);
    }
}
