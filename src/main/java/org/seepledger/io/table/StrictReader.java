package org.seepledger.io.table;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.seepledger.fault.DataFault;

/**
 * The text of a table, which refuses what is not UTF-8 text and what does not come to the end of a line.
 *
 * <p>A byte-order mark is passed over.
 */
final class StrictReader extends Reader {

    /** How many characters may stand between the beginnings of two lines of values. */
    static final int LINE_LIMIT = 1 << 20;

    private static final char BYTE_ORDER_MARK = '\uFEFF';
    private static final char REPLACEMENT = '\uFFFD';

    private final Reader source;
    private final String shownName;
    private long line = 1;
    private boolean afterReturn;
    private long lineOfValues = 1;
    private int pending;

    private StrictReader(Reader source, String shownName) {
        this.source = source;
        this.shownName = shownName;
    }

    static StrictReader open(Path file, String shownName) throws IOException {
        InputStream bytes = Files.newInputStream(file);
        try {
            BufferedReader text = new BufferedReader(new InputStreamReader(bytes, StandardCharsets.UTF_8));
            text.mark(1);
            if (text.read() != BYTE_ORDER_MARK) {
                text.reset();
            }
            return new StrictReader(text, shownName);
        } catch (IOException e) {
            bytes.close();
            throw e;
        }
    }

    /**
     * Says that all lines of values before this one are done with.
     *
     * @param firstLine where the next begins at the earliest, from 1
     */
    void beginLineOfValues(long firstLine) {
        lineOfValues = firstLine;
        pending = 0;
    }

    @Override
    public int read(char[] target, int offset, int length) throws IOException {
        int count = source.read(target, offset, length);
        for (int i = offset; i < offset + count; i++) {
            check(target[i]);
        }
        pending += Math.max(0, count);
        if (pending > LINE_LIMIT) {
            throw endless();
        }
        return count;
    }

    private void check(char c) {
        if (c == '\r' || c == '\n' && !afterReturn) {
            line++;
        } else if (c == REPLACEMENT || c == 0) {
            throw notText();
        }
        afterReturn = c == '\r';
    }

    private DataFault notText() {
        return new DataFault(
                shownName, "line " + line, "bytes that are not UTF-8 text", "UTF-8", "Save the table as CSV in UTF-8.");
    }

    private DataFault endless() {
        return new DataFault(
                shownName,
                "line " + lineOfValues,
                "more than 1,048,576 characters that do not end a line of values",
                "a shorter line",
                "Look for a quotation mark that is opened and never closed.");
    }

    @Override
    public void close() throws IOException {
        source.close();
    }
}
