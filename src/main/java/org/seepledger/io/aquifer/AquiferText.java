package org.seepledger.io.aquifer;

import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.ObjectWriter;
import java.io.IOException;
import java.util.Map;

/** The text of {@code aquifer.json} as plain maps, lists, texts and numbers. */
public final class AquiferText {

    private static final ObjectWriter WRITER = writer();

    private AquiferText() {}

    private static ObjectWriter writer() {
        Separators colons = Separators.createDefaultInstance().withObjectFieldValueSpacing(Separators.Spacing.AFTER);
        DefaultPrettyPrinter printer = new DefaultPrettyPrinter(colons);
        printer.indentObjectsWith(new DefaultIndenter("  ", "\n"));
        return new ObjectMapper().writer(printer);
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
}
