package org.seepledger.io.raster;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.ByteBuffer;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Supplier;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Window;

/** Blocks are unpacked once while there is room, and no more is kept than there is room for. */
class BlockCacheTest {

    private static final String INTERLEAVED = "bands-pixel-tiles-predictor2";

    private final AtomicInteger unpacked = new AtomicInteger();
    private TiffImage one;
    private TiffImage other;

    @BeforeEach
    void openImages() throws Exception {
        one = image();
        other = image();
    }

    private static TiffImage image() throws Exception {
        try (TiffFile file = TiffFile.open(Samples.path(INTERLEAVED), INTERLEAVED)) {
            return TiffImage.of(TiffDirectory.all(file).get(0), new BlockCache(0));
        }
    }

    private Supplier<ByteBuffer> block(int bytes) {
        return () -> {
            unpacked.incrementAndGet();
            return ByteBuffer.allocate(bytes);
        };
    }

    @Test
    void unpacksOnce() {
        BlockCache cache = new BlockCache(100);
        ByteBuffer first = cache.get(one, 0, block(10));
        assertThat(cache.get(one, 0, block(10))).isSameAs(first);
        assertThat(cache.get(one, 1, block(10))).isNotSameAs(first);
        assertThat(cache.get(other, 0, block(10))).isNotSameAs(first);
        assertThat(unpacked).hasValue(3);
    }

    @Test
    void forgetsWhatWasNotUsedForLongest() {
        BlockCache cache = new BlockCache(100);
        for (int block = 0; block < 3; block++) {
            cache.get(one, block, block(33));
        }
        cache.get(one, 0, block(33));
        cache.get(one, 3, block(33));
        assertThat(cache.bytes()).isEqualTo(99);
        cache.get(one, 0, block(33));
        assertThat(unpacked).hasValue(4);
        cache.get(one, 1, block(33));
        assertThat(unpacked).hasValue(5);
    }

    @Test
    void neverKeepsMoreThanItHasRoomFor() {
        BlockCache cache = new BlockCache(100);
        for (int block = 0; block < 50; block++) {
            cache.get(one, block, block(1 + 7 * block % 60));
            assertThat(cache.bytes()).isLessThanOrEqualTo(100);
        }
        cache.get(other, 0, block(51));
        cache.get(other, 0, block(51));
        assertThat(unpacked).hasValue(52);
    }

    @Test
    void givesBackTheRoomOfAClosedImage() {
        BlockCache cache = new BlockCache(100);
        cache.get(one, 0, block(20));
        cache.get(other, 0, block(30));
        cache.forget(one);
        assertThat(cache.bytes()).isEqualTo(30);
        cache.get(other, 0, block(30));
        assertThat(unpacked).hasValue(2);
    }

    /** Several threads that ask for the same block at the same time wait for the one that unpacks it. */
    @Test
    void unpacksOnceForSeveralThreads() throws Exception {
        BlockCache cache = new BlockCache(100);
        List<Callable<ByteBuffer>> asked = new ArrayList<>();
        for (int i = 0; i < 64; i++) {
            int block = i % 4;
            asked.add(() -> cache.get(one, block, block(20)));
        }
        ExecutorService threads = Executors.newFixedThreadPool(8);
        threads.invokeAll(asked);
        threads.shutdown();
        assertThat(unpacked).hasValue(4);
        assertThat(cache.bytes()).isEqualTo(80);
    }

    /** A tile holds values of all bands: what one band has unpacked serves the next, and nothing stays of a closed file. */
    @Test
    void bandsThatLieInterleavedShareTheirBlocks() throws Exception {
        BlockCache cache = new BlockCache(1 << 20);
        try (GeoTiff raster = GeoTiff.open(Samples.path(INTERLEAVED), INTERLEAVED, cache)) {
            Window whole = new Window(0, 0, raster.rows(), raster.columns());
            double[] values = new double[whole.size()];
            raster.read(0, whole, values, 0);
            long afterOne = cache.bytes();
            assertThat(afterOne).isPositive();
            for (int band = 1; band < raster.bands(); band++) {
                raster.read(band, whole, values, 0);
            }
            assertThat(raster.bands()).isGreaterThan(1);
            assertThat(cache.bytes()).isEqualTo(afterOne);
        }
        assertThat(cache.bytes()).isZero();
    }
}
