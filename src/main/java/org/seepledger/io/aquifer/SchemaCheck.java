package org.seepledger.io.aquifer;

import com.fasterxml.jackson.databind.JsonNode;
import com.networknt.schema.JsonSchema;
import com.networknt.schema.JsonSchemaFactory;
import com.networknt.schema.SpecVersion;
import com.networknt.schema.ValidationMessage;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Comparator;
import java.util.List;
import org.seepledger.fault.DataFault;

/** Checks {@code aquifer.json} against its schema. */
final class SchemaCheck {

    private static final String RESOURCE = "/org/seepledger/io/aquifer.schema.json";
    private static final JsonSchema SCHEMA = load();

    private SchemaCheck() {}

    private static JsonSchema load() {
        try (InputStream schema = SchemaCheck.class.getResourceAsStream(RESOURCE)) {
            return JsonSchemaFactory.getInstance(SpecVersion.VersionFlag.V202012)
                    .getSchema(schema);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /**
     * Checks the whole file.
     *
     * @param root what it holds
     * @throws DataFault for the first thing that is wrong: unknown keys first, then missing ones, then the rest
     */
    static void check(JsonNode root) {
        faults(root).stream().findFirst().ifPresent(fault -> {
            throw fault;
        });
    }

    /** {@return everything that is wrong: unknown keys first, then missing ones, then the rest} */
    static List<DataFault> faults(JsonNode root) {
        return SCHEMA.validate(root).stream()
                .filter(message -> !isOneWayOfSeveral(message))
                .sorted(Comparator.comparingInt(SchemaCheck::rank))
                .map(message -> new SchemaWords(SCHEMA.getSchemaNode(), message).fault())
                .toList();
    }

    /** Where none of several ways fits, that is said once, not what each of them lacks. */
    private static boolean isOneWayOfSeveral(ValidationMessage message) {
        return message.getSchemaLocation().getFragment().toString().contains("/oneOf/");
    }

    private static int rank(ValidationMessage message) {
        return switch (message.getType()) {
            case "additionalProperties" -> 0;
            case "required" -> 1;
            case "type", "enum", "pattern" -> 2;
            default -> 3;
        };
    }
}
