package org.seepledger.io.aquifer;

import com.fasterxml.jackson.core.JsonPointer;
import com.fasterxml.jackson.databind.JsonNode;
import com.networknt.schema.ValidationMessage;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.StreamSupport;
import org.seepledger.fault.DataFault;
import org.seepledger.io.NearestName;

/** Puts one message of the schema's validator into words for whoever wrote the file. */
final class SchemaWords {

    private static final String REMEDY = "Correct it; docs/formats.md says what may stand there.";
    private static final int LONGEST = 100;

    private final JsonNode schema;
    private final ValidationMessage message;

    /** Where in the schema the keyword stands that failed. */
    private final JsonPointer keyword;

    /** What that keyword says. */
    private final JsonNode rule;

    SchemaWords(JsonNode schema, ValidationMessage message) {
        this.schema = schema;
        this.message = message;
        this.keyword =
                JsonPointer.compile(message.getSchemaLocation().getFragment().toString());
        this.rule = message.getSchemaNode();
    }

    DataFault fault() {
        return switch (message.getType()) {
            case "additionalProperties" -> unknownKey();
            case "required" ->
                fault("no \"" + message.getProperty() + "\"", missing(), "Add it; docs/formats.md says what it means.");
            case "false" ->
                fault(
                        "a key that the \"kind\" beside it does not have",
                        "none here",
                        "Take it out, or correct the kind.");
            default -> fault(shown(), expected(), REMEDY);
        };
    }

    private DataFault fault(String found, String expected, String remedy) {
        return new DataFault(AquiferReader.FILE, place(), found, expected, remedy);
    }

    private String place() {
        return KeyPlace.of(message.getInstanceLocation().toString());
    }

    private DataFault unknownKey() {
        String key = message.getProperty();
        List<String> known = new ArrayList<>();
        owner().path("properties").fieldNames().forEachRemaining(known::add);
        String remedy = NearestName.of(key, known)
                .map(name -> "Did you mean \"" + name + "\"?")
                .orElse("Take it out.");
        return fault("the unknown key " + quoted(key), "one of " + String.join(", ", known), remedy);
    }

    /** The part of the schema that the failed keyword belongs to. */
    private JsonNode owner() {
        return schema.at(keyword.head());
    }

    private String missing() {
        String key = message.getProperty();
        String purpose =
                owner().path("properties").path(key).path("description").asText();
        return "the key \"" + key + "\"" + (purpose.isEmpty() ? "" : ": " + purpose.replaceFirst("\\.$", ""));
    }

    private String expected() {
        return switch (message.getType()) {
            case "type" -> types();
            case "enum" -> "one of " + words(rule, JsonNode::toString, ", ");
            case "pattern", "oneOf", "not" -> owner().path("description").asText();
            case "minItems" -> "at least " + counted(rule.asInt(), "entry", "entries");
            case "maxItems" -> "at most " + counted(rule.asInt(), "entry", "entries");
            case "minimum" -> "a number of " + rule + " or more";
            case "maximum" -> "a number of " + rule + " or less";
            case "exclusiveMinimum" -> "a number greater than " + rule;
            case "minLength" -> "a text that is not empty";
            case "minProperties", "maxProperties" -> "one of the keys " + words(owner().path("properties"));
            default -> message.getMessage();
        };
    }

    private String types() {
        if (!rule.isArray()) {
            return type(rule.textValue());
        }
        String all = words(rule, type -> type(type.textValue()), ", ");
        int last = all.lastIndexOf(", ");
        return all.substring(0, last) + " or" + all.substring(last + 1);
    }

    private static String type(String name) {
        return switch (name) {
            case "string" -> "a text in quotation marks";
            case "number" -> "a number";
            case "integer" -> "a whole number";
            case "boolean" -> "true or false";
            case "array" -> "a list in brackets";
            case "object" -> "keys in braces";
            default -> name;
        };
    }

    private static String words(JsonNode entries, Function<JsonNode, String> word, String between) {
        return StreamSupport.stream(entries.spliterator(), false).map(word).collect(Collectors.joining(between));
    }

    private static String words(JsonNode keys) {
        List<String> names = new ArrayList<>();
        keys.fieldNames().forEachRemaining(names::add);
        return String.join(", ", names);
    }

    private static String counted(int count, String one, String several) {
        return count + " " + (count == 1 ? one : several);
    }

    private String shown() {
        JsonNode node = message.getInstanceNode();
        String kind = node.isObject() ? "the keys " : node.isArray() ? "the list " : "";
        return kind + shortened(String.valueOf(node));
    }

    private static String quoted(String key) {
        return "\"" + shortened(key) + "\"";
    }

    private static String shortened(String text) {
        return text.length() > LONGEST ? text.substring(0, LONGEST) + "…" : text;
    }
}
