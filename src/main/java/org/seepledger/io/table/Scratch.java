package org.seepledger.io.table;

import java.io.IOException;
import java.nio.LongBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import org.seepledger.fault.UsageFault;

/**
 * Very many 64-bit words in a temporary file, 0 at first, which is gone when this is closed.
 *
 * <p>The file is mapped piece by piece as words are written, and has holes where none are; none of it is on the heap.
 * The pages are given back when the garbage collector finds this unused. One thread writes; once that is over, any
 * read.
 */
final class Scratch implements AutoCloseable {

    /** The most words that one may have. */
    static final long MOST_WORDS = 1L << 40;

    private static final int PIECE_BITS = 23;
    private static final long PIECE = 1L << PIECE_BITS;

    private final Path file;
    private final FileChannel channel;
    private final long words;
    private final LongBuffer[] pieces;

    /**
     * Makes the file.
     *
     * @param folder where
     * @param words how many words it can hold, at most {@link #MOST_WORDS}
     * @throws UsageFault if the folder cannot be used
     */
    Scratch(Path folder, long words) {
        if (words < 1 || words > MOST_WORDS) {
            throw new IllegalArgumentException(words + " words");
        }
        this.words = words;
        this.pieces = new LongBuffer[(int) ((words - 1 >> PIECE_BITS) + 1)];
        try {
            this.file = Files.createTempFile(folder, "seepledger-table-", ".scratch");
            this.channel = FileChannel.open(
                    file, StandardOpenOption.READ, StandardOpenOption.WRITE, StandardOpenOption.DELETE_ON_CLOSE);
        } catch (IOException e) {
            throw unusable(folder, e);
        }
    }

    private static UsageFault unusable(Path folder, IOException cause) {
        return new UsageFault("The temporary folder " + folder + " cannot be used (" + cause.getMessage()
                + "). Name another with java -Djava.io.tmpdir=FOLDER.");
    }

    long get(long index) {
        LongBuffer piece = pieces[(int) (index >> PIECE_BITS)];
        return piece == null ? 0 : piece.get((int) (index & PIECE - 1));
    }

    void set(long index, long word) {
        int number = (int) (index >> PIECE_BITS);
        if (pieces[number] == null) {
            pieces[number] = mapped(number);
        }
        pieces[number].put((int) (index & PIECE - 1), word);
    }

    private LongBuffer mapped(int number) {
        long first = number * PIECE;
        long count = Math.min(PIECE, words - first);
        try {
            return channel.map(FileChannel.MapMode.READ_WRITE, first * Long.BYTES, count * Long.BYTES)
                    .asLongBuffer();
        } catch (IOException e) {
            throw unusable(file.getParent(), e);
        }
    }

    boolean isOpen() {
        return channel.isOpen();
    }

    @Override
    public void close() {
        try {
            channel.close();
        } catch (IOException e) {
            throw unusable(file.getParent(), e);
        }
    }
}
