package org.seepledger.io.aquifer;

import com.fasterxml.jackson.databind.JsonNode;
import com.networknt.schema.JsonSchema;
import com.networknt.schema.JsonSchemaFactory;
import com.networknt.schema.SpecVersion;
import com.networknt.schema.ValidationMessage;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Set;
import org.seepledger.fault.DataFault;
import org.seepledger.io.NearestName;

/** Checks {@code aquifer.json} against its schema, and says the first thing that is wrong in words. */
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
        Set<ValidationMessage> messages = SCHEMA.validate(root);
        messages.stream().min(Comparator.comparingInt(SchemaCheck::rank)).ifPresent(message -> {
            throw fault(message);
        });
    }

    private static int rank(ValidationMessage message) {
        return switch (message.getType()) {
            case "additionalProperties" -> 0;
            case "required" -> 1;
            case "type", "enum", "pattern" -> 2;
            default -> 3;
        };
    }

    private static DataFault fault(ValidationMessage message) {
        String place = place(message);
        return switch (message.getType()) {
            case "additionalProperties" -> unknownKey(message, place);
            case "required" ->
                new DataFault(
                        AquiferReader.FILE,
                        place,
                        "no \"" + message.getProperty() + "\"",
                        "one",
                        "Add the key; docs/formats.md says what it means.");
            default ->
                new DataFault(
                        AquiferReader.FILE,
                        place,
                        shown(message.getInstanceNode()),
                        expected(message),
                        "Correct it; docs/formats.md says what may stand there.");
        };
    }

    private static DataFault unknownKey(ValidationMessage message, String place) {
        String key = message.getProperty();
        Collection<String> known = new ArrayList<>();
        message.getSchemaNode().fieldNames().forEachRemaining(known::add);
        JsonNode parent = siblings(message);
        if (parent != null) {
            known.clear();
            parent.fieldNames().forEachRemaining(known::add);
        }
        String remedy = NearestName.of(key, known)
                .map(name -> "Did you mean \"" + name + "\"?")
                .orElse("Take it out.");
        return new DataFault(AquiferReader.FILE, place, "the unknown key \"" + key + "\"", "one of " + known, remedy);
    }

    /** The keys that the schema knows beside the unknown one. */
    private static JsonNode siblings(ValidationMessage message) {
        JsonNode schema = SCHEMA.getSchemaNode();
        for (String step : steps(message)) {
            schema = schema.path(step);
            while (schema.has("$ref")) {
                schema =
                        SCHEMA.getSchemaNode().at(schema.get("$ref").textValue().substring(1));
            }
        }
        return schema.get("properties");
    }

    private static List<String> steps(ValidationMessage message) {
        List<String> steps = new ArrayList<>();
        for (int i = 0; i < message.getInstanceLocation().getNameCount(); i++) {
            String name = message.getInstanceLocation().getName(i);
            boolean inArray = name.chars().allMatch(Character::isDigit);
            if (!inArray) {
                steps.add("properties");
            }
            steps.add(inArray ? "items" : name);
        }
        return steps;
    }

    private static String place(ValidationMessage message) {
        return message.getInstanceLocation()
                .toString()
                .replaceFirst("^\\$\\.?", "")
                .replaceFirst("^/", "");
    }

    private static String expected(ValidationMessage message) {
        String text = message.getMessage();
        String path = message.getInstanceLocation() + ": ";
        return text.startsWith(path) ? "what the schema says: " + text.substring(path.length()) : text;
    }

    private static String shown(JsonNode node) {
        String text = String.valueOf(node);
        return text.length() > 100 ? text.substring(0, 100) + "…" : text;
    }
}
