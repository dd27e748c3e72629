package org.seepledger.io.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.fault.UsageFault;

class ScratchTest {

    @TempDir
    private Path folder;

    /** Sixteen times what the largest of arrays could hold, and far beyond the heap of the tests. */
    @Test
    void holdsMoreThanTheHeap() {
        long words = 1L << 35;
        try (Scratch scratch = new Scratch(folder, words)) {
            long[] places = {0, 1, (1L << 23) - 1, 1L << 23, 1L << 31, (1L << 32) + 7, words - 1};
            for (long place : places) {
                scratch.set(place, place + 3);
            }
            for (long place : places) {
                assertThat(scratch.get(place)).isEqualTo(place + 3);
            }
            assertThat(scratch.get(2)).isZero();
            assertThat(scratch.get(words - 2)).isZero();
            assertThat(scratch.get(words / 2 + 1)).isZero();
        }
    }

    @Test
    void keepsWhatIsWrittenInAnyOrder() {
        int words = (1 << 23) + 1_000;
        int stride = 4_001;
        Random random = new Random(1);
        try (Scratch scratch = new Scratch(folder, words)) {
            for (int i = 0; i < words; i += stride) {
                scratch.set(words - 1 - i, random.nextLong());
            }
            Random again = new Random(1);
            for (int i = 0; i < words; i += stride) {
                assertThat(scratch.get(words - 1 - i)).isEqualTo(again.nextLong());
            }
        }
    }

    @Test
    void leavesNoFile() {
        try (Scratch scratch = new Scratch(folder, 10)) {
            scratch.set(9, 1);
            assertThat(scratch.isOpen()).isTrue();
        }
        assertThat(folder).isEmptyDirectory();
    }

    @Test
    void saysWhichFolderCannotBeUsed() {
        assertThatThrownBy(() -> new Scratch(folder.resolve("none"), 10))
                .isInstanceOf(UsageFault.class)
                .hasMessageContaining("none cannot be used")
                .hasMessageContaining("-Djava.io.tmpdir");
    }
}
