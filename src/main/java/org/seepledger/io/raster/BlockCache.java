package org.seepledger.io.raster;

import java.nio.ByteBuffer;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Supplier;
import java.util.stream.Stream;

/**
 * Unpacked strips and tiles, the most recently used ones, up to a number of bytes. In a file whose bands lie interleaved a
 * block holds values of all bands: kept, it is unpacked once for all of them. For any number of threads and rasters.
 */
final class BlockCache {

    private static final long MOST_BYTES = 256L << 20;
    private static final int SHARE_OF_MEMORY = 8;
    private static final int LOCKS = 64;

    private final long capacity;
    private final Map<Key, ByteBuffer> kept = new LinkedHashMap<>(16, 0.75f, true);
    private final Object[] unpacking = Stream.generate(Object::new).limit(LOCKS).toArray();
    private long bytes;

    /** A block of an image, which is known by its identity. */
    private record Key(TiffImage image, int block) {}

    /**
     * Keeps blocks.
     *
     * @param capacity the most bytes of all together; a block of more than half of it is not kept
     */
    BlockCache(long capacity) {
        this.capacity = capacity;
    }

    /** A cache that takes an eighth of the memory that there may be, and no more than 256 MiB. */
    static BlockCache ofMemory() {
        return new BlockCache(Math.min(MOST_BYTES, Runtime.getRuntime().maxMemory() / SHARE_OF_MEMORY));
    }

    /**
     * {@return a block; unpacked once where several threads ask for it at the same time}
     *
     * @param image its image
     * @param block its number there
     * @param unpack unpacks it
     */
    ByteBuffer get(TiffImage image, int block, Supplier<ByteBuffer> unpack) {
        Key key = new Key(image, block);
        synchronized (unpacking[Math.floorMod(key.hashCode(), LOCKS)]) {
            ByteBuffer found = find(key);
            if (found == null) {
                found = unpack.get();
                keep(key, found);
            }
            return found;
        }
    }

    private synchronized ByteBuffer find(Key key) {
        return kept.get(key);
    }

    /** Keeps a block, and forgets those that were not used for longest. */
    private synchronized void keep(Key key, ByteBuffer unpacked) {
        if (unpacked.capacity() > capacity / 2) {
            return;
        }
        kept.put(key, unpacked);
        bytes += unpacked.capacity();
        Iterator<ByteBuffer> eldest = kept.values().iterator();
        while (bytes > capacity) {
            bytes -= eldest.next().capacity();
            eldest.remove();
        }
    }

    /** Forgets the blocks of an image. */
    synchronized void forget(TiffImage image) {
        kept.entrySet().removeIf(entry -> {
            boolean its = entry.getKey().image() == image;
            bytes -= its ? entry.getValue().capacity() : 0;
            return its;
        });
    }

    /** {@return the bytes of all blocks that are kept} */
    synchronized long bytes() {
        return bytes;
    }
}
