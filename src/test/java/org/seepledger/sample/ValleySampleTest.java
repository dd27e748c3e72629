package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.aquifer.Grid;
import org.seepledger.io.raster.GeoTiff;
import org.seepledger.io.raster.GridMatch;

/** The files in the source tree are what the generator makes, and what the sample promises. */
class ValleySampleTest {

    private static final Path COMMITTED = Path.of("sample-aquifers", "valley");
    private static final String RASTER = ".tif";

    @Test
    void regeneratesToTheLastByte(@TempDir Path folder) throws IOException {
        ValleySample.main(new String[] {folder.toString()});
        List<String> made = names(folder);
        List<String> committed = names(COMMITTED);
        committed.remove("README.md");
        assertThat(committed).isEqualTo(made);
        for (String name : made) {
            if (name.endsWith(RASTER)) {
                // Not the packed bytes: how DEFLATE packs is the zlib's choice, which is not the same on every machine.
                assertThat(bits(COMMITTED.resolve(name))).as(name).isEqualTo(bits(folder.resolve(name)));
            } else {
                assertThat(folder.resolve(name)).as(name).hasSameBinaryContentAs(COMMITTED.resolve(name));
            }
        }
    }

    /** The values of a raster that lies on the grid, every bit of them. */
    private static long[] bits(Path file) throws IOException {
        Grid grid = ValleyRasters.grid();
        double[] values = new double[grid.rows() * grid.columns()];
        try (GeoTiff raster = GeoTiff.open(file, file.toString())) {
            assertThat(GridMatch.check(raster, grid)).isEmpty();
            raster.read(0, grid.window(), values, 0);
        }
        return Arrays.stream(values).mapToLong(Double::doubleToLongBits).toArray();
    }

    @Test
    void isSmall() throws IOException {
        long size = 0;
        for (String name : names(COMMITTED)) {
            size += Files.size(COMMITTED.resolve(name));
        }
        assertThat(size).isLessThan(2_000_000);
    }

    /** Each of the two has a vertex on the shared side that the other lacks, exactly on the line. */
    @Test
    void twoPrismsShareASideButNotItsVertices() throws IOException {
        List<List<Double>> field = ring("well field");
        List<List<Double>> fields = ring("north fields");
        List<Double> from = List.of(501_634.0, 5_201_341.0);
        List<Double> to = List.of(501_658.0, 5_201_845.0);
        List<List<Double>> shared = new ArrayList<>(field.subList(0, field.size() - 1));
        shared.retainAll(fields);
        assertThat(shared).containsExactly(from, to);
        assertThat(cross(from, to, field.get(field.indexOf(from) + 1))).isZero();
        assertThat(cross(from, to, fields.get(fields.lastIndexOf(from) - 1))).isZero();
    }

    private static double cross(List<Double> from, List<Double> to, List<Double> vertex) {
        return (to.get(0) - from.get(0)) * (vertex.get(1) - from.get(1))
                - (to.get(1) - from.get(1)) * (vertex.get(0) - from.get(0));
    }

    private static List<List<Double>> ring(String prism) throws IOException {
        JsonNode collection =
                new ObjectMapper().readTree(COMMITTED.resolve("prisms.geojson").toFile());
        List<List<Double>> vertices = new ArrayList<>();
        for (JsonNode feature : collection.get("features")) {
            if (feature.at("/properties/name").asText().equals(prism)) {
                feature.at("/geometry/coordinates/0")
                        .forEach(vertex -> vertices.add(
                                List.of(vertex.get(0).asDouble(), vertex.get(1).asDouble())));
            }
        }
        return vertices;
    }

    private static List<String> names(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return new ArrayList<>(
                    files.map(file -> file.getFileName().toString()).sorted().toList());
        }
    }
}
