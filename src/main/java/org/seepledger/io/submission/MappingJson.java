package org.seepledger.io.submission;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.seepledger.fault.DataFault;
import org.seepledger.io.JsonFile;
import org.seepledger.io.NearestName;
import org.seepledger.review.mapping.Column;
import org.seepledger.review.mapping.Kind;
import org.seepledger.review.mapping.Mapping;
import org.seepledger.review.mapping.Role;
import org.seepledger.review.mapping.Sense;
import org.seepledger.review.mapping.Tie;
import org.seepledger.review.sheet.Amount;

/** Reads and writes how a submission is read. */
public final class MappingJson {

    private static final ObjectMapper JSON = new ObjectMapper();
    private static final Set<String> KEYS = Set.of("decimal", "unit", "columns", "terms", "areas", "periods", "about");
    private static final Set<String> COLUMN_KEYS =
            Set.of("heading", "is", "term", "period", "area", "counts", "amount", "unit");
    private static final Set<String> TERM_KEYS = Set.of("label", "is", "items", "counts");

    private final String shownFile;

    private MappingJson(String shownFile) {
        this.shownFile = shownFile;
    }

    /**
     * {@return the corrections in a file}
     *
     * @param file the file
     * @param shownFile the file as the user named it
     * @throws DataFault if it cannot be read or holds what it cannot
     */
    public static Mapping read(Path file, String shownFile) {
        return new MappingJson(shownFile).mapping(JsonFile.read(file, shownFile));
    }

    private Mapping mapping(JsonNode root) {
        checkKeys(root, "", KEYS);
        List<Column> columns = new ArrayList<>();
        int number = 0;
        for (JsonNode column : root.path("columns")) {
            number++;
            columns.add(column(column, "columns, entry " + number));
        }
        Map<String, Tie> terms = new LinkedHashMap<>();
        number = 0;
        for (JsonNode term : root.path("terms")) {
            number++;
            terms.put(text(term, "label"), tie(term, "terms, entry " + number));
        }
        String decimal = text(root, "decimal");
        if (!decimal.isEmpty() && !decimal.equals(".") && !decimal.equals(",")) {
            throw fault("decimal", decimal, "\".\" or \",\"");
        }
        return new Mapping(
                -1,
                decimal.isEmpty() ? Optional.empty() : Optional.of(decimal.charAt(0)),
                text(root, "unit"),
                columns,
                terms,
                texts(root.path("areas")),
                texts(root.path("periods")));
    }

    private Column column(JsonNode node, String place) {
        checkKeys(node, place, COLUMN_KEYS);
        Role role = choice(node, "is", place, Role.values()).orElse(Role.VALUE);
        return new Column(
                text(node, "heading"),
                role,
                text(node, "term"),
                text(node, "period"),
                text(node, "area"),
                choice(node, "counts", place, Sense.values()),
                choice(node, "amount", place, Amount.values()),
                text(node, "unit"));
    }

    private Tie tie(JsonNode node, String place) {
        checkKeys(node, place, TERM_KEYS);
        List<String> items = new ArrayList<>();
        node.path("items").forEach(item -> items.add(item.asText()));
        Kind kind = choice(node, "is", place, Kind.values()).orElse(Kind.ITEM);
        if (kind == Kind.ITEM && items.isEmpty()) {
            throw fault(place, "an item that is tied to nothing", "\"items\", as [\"side\", \"source/recharge\"]");
        }
        return new Tie(kind, items, choice(node, "counts", place, Sense.values()));
    }

    private void checkKeys(JsonNode node, String place, Set<String> known) {
        if (!node.isObject()) {
            throw fault(place, "something else", "an object in braces");
        }
        node.fieldNames().forEachRemaining(key -> {
            if (!known.contains(key)) {
                String meant = NearestName.of(key, known)
                        .map(name -> "; did you mean \"" + name + "\"?")
                        .orElse("");
                throw fault(
                        place,
                        "the unknown key \"" + key + "\"" + meant,
                        "one of " + String.join(", ", new java.util.TreeSet<>(known)));
            }
        });
    }

    private static String text(JsonNode node, String key) {
        return node.path(key).isNull() ? "" : node.path(key).asText();
    }

    private static Map<String, String> texts(JsonNode node) {
        Map<String, String> texts = new LinkedHashMap<>();
        node.fieldNames()
                .forEachRemaining(name -> texts.put(name, node.path(name).asText()));
        return texts;
    }

    private <T extends Enum<T>> Optional<T> choice(JsonNode node, String key, String place, T[] values) {
        String word = text(node, key);
        if (word.isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(Stream.of(values)
                .filter(value -> word(value).equals(word))
                .findFirst()
                .orElseThrow(() -> fault(
                        place + ", " + key,
                        "\"" + word + "\"",
                        Stream.of(values).map(MappingJson::word).collect(Collectors.joining(", ")))));
    }

    private static String word(Enum<?> value) {
        return value.name().toLowerCase(java.util.Locale.ROOT).replace('_', ' ');
    }

    private DataFault fault(String place, String found, String expected) {
        return new DataFault(shownFile, place, found, expected, "docs/review.md says what a mapping may hold.");
    }

    /**
     * Writes mappings: what is known of each table of a file, together.
     *
     * @param file the file
     * @param mappings the mappings
     * @throws IOException if it cannot be written
     */
    public static void write(Path file, List<Mapping> mappings) throws IOException {
        ObjectNode root = JSON.createObjectNode();
        root.put("about", "How a submitted budget was read. Correct it and give it to seepledger review --mapping.");
        mappings.stream()
                .map(Mapping::decimal)
                .flatMap(Optional::stream)
                .findFirst()
                .ifPresent(sign -> root.put("decimal", String.valueOf(sign)));
        mappings.stream()
                .map(Mapping::unit)
                .filter(unit -> !unit.isEmpty())
                .findFirst()
                .ifPresent(unit -> root.put("unit", unit));
        ArrayNode columns = root.putArray("columns");
        ArrayNode terms = root.putArray("terms");
        ObjectNode areas = root.putObject("areas");
        ObjectNode periods = root.putObject("periods");
        List<Column> written = new ArrayList<>();
        Map<String, Tie> ties = new LinkedHashMap<>();
        for (Mapping mapping : mappings) {
            mapping.columns().stream()
                    .filter(column -> !written.contains(column) || mappings.size() == 1)
                    .forEach(column -> {
                        written.add(column);
                        addColumn(columns.addObject(), column);
                    });
            mapping.terms().forEach(ties::putIfAbsent);
            mapping.areas().forEach(areas::put);
            mapping.periods().forEach(periods::put);
        }
        ties.forEach((label, tie) -> addTie(terms.addObject(), label, tie));
        Files.writeString(file, JSON.writerWithDefaultPrettyPrinter().writeValueAsString(root) + "\n");
    }

    private static void addColumn(ObjectNode node, Column column) {
        node.put("heading", column.header()).put("is", word(column.role()));
        put(node, "term", column.term());
        put(node, "period", column.period());
        put(node, "area", column.area());
        column.sense().ifPresent(sense -> node.put("counts", word(sense)));
        column.amount().ifPresent(amount -> node.put("amount", word(amount)));
        put(node, "unit", column.unit());
    }

    private static void put(ObjectNode node, String key, String text) {
        if (!text.isEmpty()) {
            node.put(key, text);
        }
    }

    private static void addTie(ObjectNode node, String label, Tie tie) {
        node.put("label", label).put("is", word(tie.kind()));
        if (!tie.items().isEmpty()) {
            tie.items().forEach(node.withArray("items")::add);
        }
        tie.sense().ifPresent(sense -> node.put("counts", word(sense)));
    }
}
