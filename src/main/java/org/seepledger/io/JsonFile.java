package org.seepledger.io;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import org.seepledger.fault.DataFault;

/**
 * Reads a JSON file (RFC 8259) whole, within limits that keep a hostile one from filling the memory: 128 MiB, eight
 * million tokens, 64 levels, keys that do not repeat, nothing after the end.
 */
public final class JsonFile {

    private static final long MOST_BYTES = 128L << 20;
    private static final long MOST_TOKENS = 8_000_000;
    private static final int DEEPEST = 64;
    private static final JsonMapper MAPPER = mapper();

    private JsonFile() {}

    /**
     * {@return the value that a file holds}
     *
     * @param file the file
     * @param shownFile the file as the user named it, for messages
     * @throws DataFault if it is missing, beyond a limit or not JSON, with line and column
     */
    public static JsonNode read(Path file, String shownFile) {
        if (!Files.isRegularFile(file)) {
            String found = Files.exists(file) ? "something that is not a plain file" : "no such file";
            String remedy = NearestName.besides(file)
                    .map(name -> "Did you mean \"" + name + "\"?")
                    .orElse("Correct the path.");
            throw new DataFault(shownFile, "", found, "a JSON file", remedy);
        }
        try (InputStream in = Files.newInputStream(file)) {
            checkSize(Files.size(file), shownFile);
            JsonNode root = MAPPER.readTree(in);
            if (root.isMissingNode()) {
                throw new DataFault(shownFile, "", "an empty file", "JSON", "Check how the file was made.");
            }
            return root;
        } catch (JsonProcessingException e) {
            throw malformed(e, shownFile);
        } catch (IOException e) {
            throw Unreadable.file(shownFile, e);
        }
    }

    private static void checkSize(long bytes, String shownFile) {
        if (bytes > MOST_BYTES) {
            throw new DataFault(
                    shownFile, "", bytes + " bytes", "at most " + MOST_BYTES + " bytes", "Split or simplify the file.");
        }
    }

    private static DataFault malformed(JsonProcessingException e, String shownFile) {
        JsonLocation at = e.getLocation();
        String place = at == null ? "" : "line " + at.getLineNr() + ", column " + at.getColumnNr();
        String what = e.getOriginalMessage().replaceAll(", from `[^`]*`", "");
        String found = "a fault in the JSON (" + (what.length() > 300 ? what.substring(0, 300) + "…" : what) + ")";
        String expected = "JSON of at most " + DEEPEST + " levels and " + MOST_TOKENS + " tokens, keys not repeated";
        return new DataFault(shownFile, place, found, expected, "Correct the file there.");
    }

    private static JsonMapper mapper() {
        StreamReadConstraints limits = StreamReadConstraints.builder()
                .maxDocumentLength(MOST_BYTES)
                .maxTokenCount(MOST_TOKENS)
                .maxNestingDepth(DEEPEST)
                .build();
        JsonFactory factory = JsonFactory.builder()
                .streamReadConstraints(limits)
                .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
                .build();
        return JsonMapper.builder(factory)
                .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
                .build();
    }
}
