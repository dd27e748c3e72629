package org.seepledger.io.aquifer;

import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.ObjectWriter;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Map;
import org.seepledger.io.JsonFile;

/** The text of {@code aquifer.json} as plain maps, lists, texts and numbers. */
public final class AquiferText {

    private static final ObjectMapper MAPPER = new ObjectMapper();
    private static final ObjectWriter WRITER = writer();

    private AquiferText() {}

    private static ObjectWriter writer() {
        Separators colons = Separators.createDefaultInstance().withObjectFieldValueSpacing(Separators.Spacing.AFTER);
        DefaultPrettyPrinter printer = new DefaultPrettyPrinter(colons);
        printer.indentObjectsWith(new DefaultIndenter("  ", "\n"));
        return MAPPER.writer(printer);
    }

    /**
     * {@return the text of a set}
     *
     * @param set the set, as maps, lists, texts, numbers and booleans
     */
    public static String of(Map<String, ?> set) {
        try {
            return WRITER.writeValueAsString(set) + "\n";
        } catch (IOException e) {
            throw new IllegalArgumentException(e);
        }
    }

    /**
     * {@return what an {@code aquifer.json} holds, whether or not it keeps to the schema}
     *
     * @param file the file
     * @throws org.seepledger.fault.DataFault if it is not JSON, or not an object
     */
    public static Map<String, Object> read(Path file) {
        JsonNode root = JsonFile.read(file, AquiferReader.FILE);
        if (!root.isObject()) {
            throw new org.seepledger.fault.DataFault(
                    AquiferReader.FILE, "", "no JSON object", "an object with the keys of a set", "Correct the file.");
        }
        @SuppressWarnings("unchecked")
        Map<String, Object> set = MAPPER.convertValue(root, Map.class);
        return set;
    }
}
