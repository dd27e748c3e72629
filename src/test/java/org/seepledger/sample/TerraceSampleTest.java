package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;

/** The files in the source tree are what the generator makes, and what the sample promises. */
class TerraceSampleTest {

    private static final Path COMMITTED = Path.of("sample-aquifers", "terrace");
    private static final GeometryFactory GEOMETRY = new GeometryFactory();

    @Test
    void regeneratesToTheLastByte(@TempDir Path folder) throws IOException {
        TerraceSample.main(new String[] {folder.toString()});
        List<String> made = names(folder);
        List<String> committed = names(COMMITTED);
        committed.removeAll(List.of("README.md", "submitted.csv")); // written by hand
        assertThat(committed).isEqualTo(made);
        for (String name : made) {
            assertThat(folder.resolve(name)).as(name).hasSameBinaryContentAs(COMMITTED.resolve(name));
        }
    }

    @Test
    void isSmall() throws IOException {
        try (Stream<Path> files = Files.list(COMMITTED)) {
            assertThat(files.mapToLong(TerraceSampleTest::size).sum()).isLessThan(1_500_000);
        }
    }

    @Test
    void prismsLieInTheGridAndDoNotOverlap() throws IOException {
        Map<String, Polygon> prisms = prisms();
        assertThat(prisms).containsOnlyKeys("well field", "upper terrace", "deep sand");
        BlockGrid grid = TerraceGround.grid();
        Envelope inGrid = new Envelope(0, last(grid.columnEdges()), 0, last(grid.rowEdges()));
        assertThat(prisms.values()).allSatisfy(prism -> {
            assertThat(prism.isValid()).isTrue();
            assertThat(inGrid.contains(prism.getEnvelopeInternal())).isTrue();
        });
        Polygon field = prisms.get("well field");
        assertThat(field.getNumInteriorRing()).isEqualTo(1);
        assertThat(field.intersection(prisms.get("upper terrace")).getDimension())
                .as("they touch along a line")
                .isEqualTo(1);
        assertThat(field.intersection(prisms.get("deep sand")).getDimension()).isEqualTo(2);
    }

    @Test
    void oneWellStandsInACellThatASideCuts() throws IOException {
        Polygon field = prisms().get("well field");
        Well orchard = Terrace.WELLS.get(Terrace.WELLS.size() - 1);
        assertThat(field.contains(GEOMETRY.createPoint(new Coordinate(orchard.x(), orchard.y()))))
                .isTrue();
        BlockGrid grid = TerraceGround.grid();
        int cell = orchard.cell(grid);
        Envelope block = new Envelope(
                grid.centreX(cell) - grid.width(cell) / 2,
                grid.centreX(cell) + grid.width(cell) / 2,
                grid.centreY(cell) - grid.height(cell) / 2,
                grid.centreY(cell) + grid.height(cell) / 2);
        double inside = field.intersection(GEOMETRY.toGeometry(block)).getArea() / block.getArea();
        assertThat(inside).isBetween(0.1, 0.9);
    }

    @Test
    void aquiferNamesFilesAndColumnsThatExist() throws IOException {
        JsonNode aquifer =
                new ObjectMapper().readTree(COMMITTED.resolve("aquifer.json").toFile());
        assertThat(aquifer.at("/grid/x/edges")).hasSize(61);
        assertThat(aquifer.at("/grid/y/edges")).hasSize(46);
        List<JsonNode> bindings = aquifer.findParents("column");
        assertThat(bindings).hasSize(10);
        for (JsonNode binding : bindings) {
            String file = binding.get("file").asText();
            String header = Files.readAllLines(COMMITTED.resolve(file)).get(1);
            assertThat(header.split(","))
                    .anyMatch(column -> column.startsWith(binding.get("column").asText() + " ["));
        }
    }

    /** The prisms, turned back into coordinates along the grid. */
    private static Map<String, Polygon> prisms() throws IOException {
        JsonNode collection =
                new ObjectMapper().readTree(COMMITTED.resolve("prisms.geojson").toFile());
        Map<String, Polygon> prisms = new HashMap<>();
        for (JsonNode feature : collection.get("features")) {
            List<LinearRing> rings = new ArrayList<>();
            feature.at("/geometry/coordinates").forEach(ring -> rings.add(ring(ring)));
            LinearRing[] islands = rings.subList(1, rings.size()).toArray(LinearRing[]::new);
            prisms.put(feature.at("/properties/name").asText(), GEOMETRY.createPolygon(rings.get(0), islands));
        }
        return prisms;
    }

    private static LinearRing ring(JsonNode ring) {
        Frame frame = Terrace.FRAME;
        double angle = Math.toRadians(frame.degrees());
        return GEOMETRY.createLinearRing(StreamSupport.stream(ring.spliterator(), false)
                .map(position -> {
                    double x = position.get(0).asDouble() - frame.x();
                    double y = position.get(1).asDouble() - frame.y();
                    return new Coordinate(
                            x * Math.cos(angle) + y * Math.sin(angle), y * Math.cos(angle) - x * Math.sin(angle));
                })
                .toArray(Coordinate[]::new));
    }

    private static List<String> names(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return new ArrayList<>(
                    files.map(file -> file.getFileName().toString()).sorted().toList());
        }
    }

    private static long size(Path file) {
        try {
            return Files.size(file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static double last(double[] edges) {
        return edges[edges.length - 1];
    }
}
