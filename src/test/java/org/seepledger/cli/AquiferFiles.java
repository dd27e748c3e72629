package org.seepledger.cli;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/**
 * A small aquifer folder and prisms to change and to run commands on.
 *
 * <p>As it stands: 4 columns and 3 rows of 10 m from (0, 0), layers from 10 to 5 to 0 m, two intervals of 10 d, a flux
 * of 0.1 m/d to the east and 0.02 m/d to the north, one head of 9 m for all instants, no sources; and one prism
 * {@code block} over both layers, from (10, 10) to (30, 20), side 1 in the south.
 */
final class AquiferFiles {

    private static final ObjectMapper JSON = new ObjectMapper();

    private static final String PLAIN = """
            {'name': 'Invented test', 'length_unit': 'm', 'time_unit': 'd', 'crs': null,
             'grid': {'x': {'from': 0, 'step': 10, 'count': 4}, 'y': {'from': 0, 'step': 10, 'count': 3}},
             'layers': [{'top': 10, 'bottom': 5}, {'bottom': 0}],
             'times': [0, 10, 20],
             'flow': {'kind': 'darcy_flux', 'x': 0.1, 'y': 0.02, 'z': 0},
             'head': 9}
            """;

    static final String BLOCK = "'type': 'Polygon', 'coordinates': [[[10,10],[30,10],[30,20],[10,20],[10,10]]]";

    private final Path folder;
    private final ObjectNode aquifer = (ObjectNode) parse(PLAIN);
    private final List<String> prisms = new ArrayList<>();
    private String prismsCrs = "";
    private String text = "";

    AquiferFiles(Path folder) {
        this.folder = folder;
    }

    private static JsonNode parse(String text) {
        try {
            return JSON.readTree(text.replace('\'', '"'));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Sets a key to a JSON value; {@code flow/x} is the key x of flow. */
    AquiferFiles with(String path, String value) {
        int last = path.lastIndexOf('/');
        ObjectNode parent = last < 0 ? aquifer : (ObjectNode) aquifer.at("/" + path.substring(0, last));
        parent.set(path.substring(last + 1), parse(value));
        return this;
    }

    AquiferFiles without(String path) {
        int last = path.lastIndexOf('/');
        ObjectNode parent = last < 0 ? aquifer : (ObjectNode) aquifer.at("/" + path.substring(0, last));
        parent.remove(path.substring(last + 1));
        return this;
    }

    /** Takes a text in place of all that was set. */
    AquiferFiles withText(String whole) {
        text = whole;
        return this;
    }

    /** {@return aquifer.json as it stands} */
    String text() {
        return aquifer.toString();
    }

    AquiferFiles file(String name, String content) {
        try {
            Files.createDirectories(aquifer().resolve(name).getParent());
            Files.writeString(aquifer().resolve(name), content);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return this;
    }

    AquiferFiles file(String name, byte[] content) {
        try {
            Files.createDirectories(aquifer());
            Files.write(aquifer().resolve(name), content);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return this;
    }

    /** Adds a prism with its properties but the name, and geometry. */
    AquiferFiles prism(String name, String properties, String geometry) {
        prisms.add("{\"type\": \"Feature\", \"properties\": {\"name\": " + quoted(name)
                + (properties.isEmpty() ? "" : ", ") + properties.replace('\'', '"') + "}, \"geometry\": {"
                + geometry.replace('\'', '"') + "}}");
        return this;
    }

    AquiferFiles prismsIn(String crs) {
        prismsCrs = "\"crs\": {\"type\": \"name\", \"properties\": {\"name\": \"" + crs + "\"}}, ";
        return this;
    }

    private static String quoted(String name) {
        try {
            return JSON.writeValueAsString(name);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    Path aquifer() {
        return folder.resolve("aquifer");
    }

    Path prisms() {
        return folder.resolve("prisms.geojson");
    }

    Path out() {
        return folder.resolve("out");
    }

    AquiferFiles write() {
        if (prisms.isEmpty()) {
            prism("block", "", BLOCK);
        }
        file("aquifer.json", text.isEmpty() ? aquifer.toString() : text);
        try {
            Files.writeString(
                    prisms(),
                    "{\"type\": \"FeatureCollection\", " + prismsCrs + "\"features\": [" + String.join(",\n", prisms)
                            + "]}");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return this;
    }

    /** Writes all and runs {@code balance} with more options. */
    Ran balance(String... options) {
        write();
        return balanceAsItStands(options);
    }

    Ran balanceAsItStands(String... options) {
        List<String> all = new ArrayList<>(
                List.of("balance", aquifer().toString(), "--prisms", prisms().toString(), "--out", out().toString()));
        all.addAll(List.of(options));
        return Ran.of(all.toArray(String[]::new));
    }

    /** Writes all and runs {@code plume} with more options. */
    Ran plume(String... options) {
        write();
        List<String> all = new ArrayList<>(
                List.of("plume", aquifer().toString(), "--prisms", prisms().toString(), "--out", out().toString()));
        all.addAll(List.of(options));
        return Ran.of(all.toArray(String[]::new));
    }

    Ran inspect() {
        write();
        return Ran.of("inspect", aquifer().toString());
    }

    /** Lines {@code row,col,value} with one value in all cells. */
    static String everywhere(int rows, int columns, String value) {
        return IntStream.range(0, rows * columns)
                .mapToObj(cell -> (cell / columns + 1) + "," + (cell % columns + 1) + "," + value + "\n")
                .collect(Collectors.joining());
    }

    /** The names in the folder that holds the aquifer, the prisms and the output. */
    List<String> left() {
        return names(folder);
    }

    static List<String> names(Path folder) {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString()).sorted().toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
