package org.seepledger.io.prisms;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.seepledger.io.prisms.PrismsReaderTest.collection;
import static org.seepledger.io.prisms.PrismsReaderTest.feature;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.assertj.core.api.AbstractThrowableAssert;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.fault.DataFault;
import org.seepledger.io.crs.PlanCrs;

/** Every message says where and what, and quotes coordinates as they stand in the file. */
class PrismsReaderFaultsTest {

    private static final Grid GRID = new Grid(Axis.even(0, 10, 10), Axis.even(0, 10, 10), 0, 1);
    private static final String SQUARE = "[[10,10],[50,10],[50,50],[10,50],[10,10]]";
    private static final String ISLAND = "[[20,20],[20,30],[30,30],[20,20]]";

    @TempDir
    Path folder;

    private static void read(Path file, PlanCrs crs, boolean clip) {
        SurfaceReader none = (raster, shown) -> GriddedValues.constant(0);
        new PrismsReader(crs, GRID, FourLayers.ALL, clip, none, warning -> {}, note -> {}).read(file, "p.geojson");
    }

    private AbstractThrowableAssert<?, ? extends Throwable> assertRefused(String text, PlanCrs crs, boolean clip)
            throws IOException {
        Path file = Files.writeString(folder.resolve("p.geojson"), text);
        return assertThatThrownBy(() -> read(file, crs, clip))
                .isInstanceOf(DataFault.class)
                .hasMessageStartingWith("p.geojson");
    }

    private AbstractThrowableAssert<?, ? extends Throwable> assertRefused(String text) throws IOException {
        return assertRefused(text, PlanCrs.local(), false);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "[]; p.geojson: found []; FeatureCollection",
                "3; p.geojson: found 3; FeatureCollection",
                "{\"name\": 7}; p.geojson: found {\"name\":7}; FeatureCollection",
                "{\"type\": \"Polygon\", \"coordinates\": []}; GeoJSON object of type \"Polygon\"; property \"name\"",
                "{\"type\": \"FeatureCollection\"}; type \"FeatureCollection\"; FeatureCollection",
                "{\"type\": \"FeatureCollection\", \"features\": []}; found no features; Draw a prism.",
                "{\"type\": \"FeatureCollection\", \"features\": [7]}; feature 1: found an object of type nothing; a Feature",
                "{\"type\": \"Feature\"}; feature 1, name: found nothing; Give the prism",
                "{\"type\": \"FeatureCollection\", \"features\": [{\"crs\": 1}]}; feature 1: found a crs; whole file",
            })
    void refusesWhatIsNoCollectionOfPolygons(String text, String found, String more) throws IOException {
        assertRefused(text).hasMessageContaining(found).hasMessageContaining(more);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "\"id\": 3; feature 1, name: found nothing",
                "\"name\": null; feature 1, name: found null",
                "\"name\": 3; feature 1, name: found 3",
                "\"name\": \"\"; feature 1, name: found \"\"",
                "\"name\": \" A\"; feature 1, name: found \" A\"",
                "\"name\": \"A\\nB\"; feature 1, name: found \"A\\nB\"",
                "\"name\": \"outside\"; which stands for all that is in no prism",
                "\"name\": \"A\", \"layers\": [1, 5]; feature 1 \"A\", layers: found [1,5]; expected [first, last]",
                "\"name\": \"A\", \"layers\": [0, 1]; from 1 to 4",
                "\"name\": \"A\", \"layers\": [3, 2]; found [3,2]",
                "\"name\": \"A\", \"layers\": [1.5, 2]; found [1.5,2]",
                "\"name\": \"A\", \"layers\": [1]; found [1]",
                "\"name\": \"A\", \"layers\": \"1-2\"; found \"1-2\"",
                "\"name\": \"A\", \"layers\": [1, 1e400]; found [1,",
                "\"name\": \"A\", \"layers\": [1, 2], \"top\": 3; layers together with top or bottom",
                "\"name\": \"A\", \"top\": 3, \"bottom\": 3; expected a top above the bottom",
                "\"name\": \"A\", \"top\": [3]; feature 1 \"A\", top: found [3]",
                "\"name\": \"A\", \"top\": 1e400; an elevation, a layer, or the path",
                "\"name\": \"A\", \"top\": {\"layer\": 5}; feature 1 \"A\", top: found {\"layer\":5}; expected {\"layer\": n}",
                "\"name\": \"A\", \"top\": {\"layer\": 1.5}; from 1 to 4",
                "\"name\": \"A\", \"bottom\": {\"layers\": 2}; bottom: found {\"layers\":2}",
                "\"name\": \"A\", \"bottom\": {\"layer\": 2, \"of\": 1}; bottom: found {\"layer\":2,",
                "\"name\": \"A\", \"top\": {\"layer\": 3}, \"bottom\": {\"layer\": 2}; expected a top above the bottom",
                "\"name\": \"A\", \"bottom\": \"../x.tif\"; bottom: found the path \"../x.tif\", which leads out",
                "\"name\": \"A\", \"bottom\": \"x.tif\"; bottom: found the path \"x.tif\", which does not exist",
            })
    void refusesWrongProperties(String properties, String message) throws IOException {
        assertRefused(collection(feature(properties, "Polygon", "[" + SQUARE + "]")))
                .hasMessageContaining(message);
    }

    @Test
    void refusesANameThatAnotherPrismHas() throws IOException {
        String square = feature("\"name\": \"A\"", "Polygon", "[" + SQUARE + "]");
        assertRefused(collection(square, square))
                .hasMessageContaining("feature 2, name: found \"A\", which feature 1 has already");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "{\"x\": [\"side 5\"]}; \"x\": found \"side 5\", which names no sides; \"side 1-4\", \"island 1 side 1-3\"",
                "{\"x\": [\"side 3-5\"]}; found \"side 3-5\", which names no sides; \"side 1-4\"",
                "{\"x\": [\"side 3-2\"]}; found \"side 3-2\", which names no sides; \"side 1-4\"",
                "{\"x\": [\"side 0\"]}; found \"side 0\"; in one of these forms",
                "{\"x\": [\"side 99999999999\"]}; found \"side 99999999999\"; in one of these forms",
                "{\"x\": [\"island 2\"]}; found \"island 2\", which names no sides; \"island 1 side 1-3\"",
                "{\"x\": [\"island 1 side 4\"]}; which names no sides; \"island 1 side 1-3\"",
                "{\"x\": [\"part 1 side 1\"]}; found \"part 1 side 1\", which names no sides; \"side 1-4\"",
                "{\"x\": [\"edge 3\"]}; found \"edge 3\"; in one of these forms",
                "{\"x\": [\"\"]}; found \"\"; in one of these forms",
                "{\"x\": [\" side 1\"]}; found \" side 1\"; in one of these forms",
                "{\"x\": [3]}; found 3; in one of these forms",
                "{\"x\": []}; found []; at least one side",
                "{\"x\": \"side 1\"}; found \"side 1\"; an array of sides",
                "[\"side 1\"]; boundaries: found [\"side 1\"]; an object",
                "{\"x\": [\"side 1-2\"], \"y\": [\"side 2\"]}; \"y\": found side 2, which is in \"x\" already; one of the two",
                "{\"\": [\"side 1\"]}; found \"\" as the name; another name",
                "{\"side 2\": [\"side 1\"]}; found \"side 2\" as the name; another name",
                "{\"part 3 island 1 side 2\": [\"side 1\"]}; as the name; another name",
                "{\"top\": [\"side 1\"]}; found \"top\" as the name; another name",
                "{\"bottom\": [\"side 1\"]}; found \"bottom\" as the name; another name",
                "{\"grid edge\": [\"side 1\"]}; found \"grid edge\" as the name; another name",
            })
    void refusesWrongBoundaries(String boundaries, String found, String more) throws IOException {
        String properties = "\"name\": \"A\", \"boundaries\": " + boundaries;
        assertRefused(collection(feature(properties, "Polygon", "[" + SQUARE + ", " + ISLAND + "]")))
                .hasMessageStartingWith("p.geojson, feature 1 \"A\", boundaries")
                .hasMessageContaining(found)
                .hasMessageContaining(more);
    }

    @Test
    void asksForThePartInAShapeOfParts() throws IOException {
        String properties = "\"name\": \"A\", \"boundaries\": {\"x\": [\"side 1\"]}";
        assertRefused(collection(feature(properties, "MultiPolygon", "[[" + SQUARE + "]]")))
                .hasMessageContaining("found \"side 1\", which names no sides; expected some of \"part 1 side 1-4\"");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "[[[10,10],[50,50],[50,10],[10,50],[10,10]]]; outer ring: found a ring that crosses; at x 30, y 30",
                "[[[10,10],[50,10],[80,10],[50,10],[50,50],[10,50],[10,10]]]; touches itself at x 80, y 10; spike",
                "[[[10,10],[30,10],[30,30],[50,30],[50,50],[30,30],[10,30],[10,10]]]; touches itself at x 30, y 30; loop",
                "[[[10,10],[50,10],[10,10]]]; outer ring: found 2 different vertices near x 10, y 10; three",
                "[[]]; outer ring: found 0 different vertices; three",
                "[]; found [] as the rings; islands",
                "[[[10,10],[50,10],[30,10],[10,10]]]; outer ring: found a ring without area at x 10, y 10; area",
                "[[[10,10],[50,10],[50,50],[10,50]]]; begins at x 10, y 10 but ends at x 10, y 50; Add the first vertex",
                "[[[10,10],[50,\"10\"],[50,50],[10,10]]]; outer ring, vertex 2: found [50,\"10\"]; two numbers",
                "[[[10,10],[50],[50,50],[10,10]]]; outer ring, vertex 2: found [50]; two numbers",
                "[[[10,10],[1e400,5],[50,50],[10,10]]]; outer ring, vertex 2: found x Infinity, y 5; within",
                "[[[10,10],[1e13,5],[50,50],[10,10]]]; outer ring, vertex 2: found x 10000000000000, y 5; within",
                "[5]; outer ring: found 5 as a ring; vertices",
                "7; found 7 as the rings; array",
            })
    void refusesWrongRings(String coordinates, String found, String more) throws IOException {
        assertRefused(collection(feature("\"name\": \"A\"", "Polygon", coordinates)))
                .hasMessageStartingWith("p.geojson, feature 1 \"A\"")
                .hasMessageContaining(found)
                .hasMessageContaining(more);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "[[60,60],[60,70],[70,70],[60,60]]; found an island outside the outer ring at x 60, y 60",
                "[[40,40],[40,60],[45,60],[40,40]]; found rings that cross, or touch along a line, at x ",
                "[[50,20],[40,20],[50,40],[50,20]]; found rings that cross, or touch along a line, at x 50, y ",
                "[[20,20],[30,20],[20,30],[30,30],[20,20]]; island 1: found a ring that crosses",
                "[[20,20],[20,30],[30,30],[20,20]], [[22,25],[22,26],[23,26],[22,25]]; found an island within another",
                "[[20,20],[20,30],[30,30],[20,20]], [[21,20],[21,30],[31,30],[21,20]]; found rings that cross",
                "[[10,30],[30,20],[50,30],[30,25],[10,30]]; found islands that cut the polygon in two at x ",
            })
    void refusesIslandsInTheWrongPlace(String islands, String found) throws IOException {
        assertRefused(collection(feature("\"name\": \"A\"", "Polygon", "[" + SQUARE + ", " + islands + "]")))
                .hasMessageStartingWith("p.geojson, feature 1 \"A\"")
                .hasMessageContaining(found);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "[[[50,20],[60,20],[60,40],[50,40],[50,20]]]; parts 1 and 2 that touch along a line at x 50, y ",
                "[[[40,20],[60,20],[60,40],[40,40],[40,20]]]; parts 1 and 2 that overlap at x ",
                "[[[20,20],[30,20],[30,30],[20,20]]]; parts 1 and 2 that overlap at x ",
                "[" + SQUARE + "]; parts 1 and 2 that overlap at x ",
                "[[[60,20],[70,40],[70,20],[60,40],[60,20]]]; part 2 outer ring: found a ring that crosses",
                "[]; found [] as the rings",
            })
    void refusesPartsThatOverlapOrTouchAlongALine(String part, String found) throws IOException {
        assertRefused(collection(feature("\"name\": \"A\"", "MultiPolygon", "[[" + SQUARE + "], " + part + "]")))
                .hasMessageStartingWith("p.geojson, feature 1 \"A\"")
                .hasMessageContaining(found);
    }

    @Test
    void refusesOtherGeometries() throws IOException {
        assertRefused(collection(feature("\"name\": \"A\"", "LineString", SQUARE)))
                .hasMessageContaining("found a geometry of type \"LineString\"; expected a Polygon or MultiPolygon");
        assertRefused(collection("{\"type\": \"Feature\", \"properties\": {\"name\": \"A\"}, \"geometry\": null}"))
                .hasMessageContaining("found no geometry");
        assertRefused(collection(feature("\"name\": \"A\"", "MultiPolygon", "[]")))
                .hasMessageContaining("found [] as coordinates");
    }

    @Test
    void refusesMoreVerticesThanTheLimit() throws IOException {
        String ring = "[" + "[1,2],".repeat(1_000_000) + "[1,2]]";
        assertRefused(collection(feature("\"name\": \"A\"", "Polygon", "[" + ring + "]")))
                .hasMessageContaining("found more than 1000000 vertices");
    }

    @Test
    void refusesMetresWhereDegreesAreExpected() throws IOException {
        PlanCrs utm = PlanCrs.of("EPSG:32633", "aquifer.json", "crs");
        String polygon = "[[[500100,5200100],[500300,5200100],[500300,5200300],[500100,5200100]]]";
        assertRefused(collection(feature("\"name\": \"A\"", "Polygon", polygon)), utm, false)
                .hasMessage("p.geojson, feature 1 \"A\", outer ring, vertex 1: found x 500100, y 5200100, which is no"
                        + " longitude and latitude; expected longitude within ±180 and latitude within ±90 degrees, in"
                        + " this order. If they are in another CRS, add the member that names it, as \"crs\": {\"type\":"
                        + " \"name\", \"properties\": {\"name\": \"urn:ogc:def:crs:EPSG::32633\"}}.");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "{\"type\": \"name\", \"properties\": {\"name\": \"urn:ogc:def:crs:EPSG::1\"}}; is not a known CRS",
                "{\"type\": \"link\", \"properties\": {\"href\": \"x\"}}; crs: found {\"type\":\"link\"",
                "\"EPSG:32633\"; crs: found \"EPSG:32633\"; expected {\"type\": \"name\"",
            })
    void refusesAMemberThatNamesNoCrs(String member, String message) throws IOException {
        PlanCrs utm = PlanCrs.of("EPSG:32633", "aquifer.json", "crs");
        String text = collection(feature("\"name\": \"A\"", "Polygon", "[" + SQUARE + "]"))
                .replace("\"features\"", "\"crs\": " + member + ", \"features\"");
        assertRefused(text, utm, false).hasMessageContaining(message);
    }

    @Test
    void refusesACrsWhereTheAquiferHasNone() throws IOException {
        String member = "\"crs\": {\"type\": \"name\", \"properties\": {\"name\": \"EPSG:32633\"}}, \"features\"";
        assertRefused(collection(feature("\"name\": \"A\"", "Polygon", "[" + SQUARE + "]"))
                        .replace("\"features\"", member))
                .hasMessageContaining("though the aquifer's crs is null");
    }

    @Test
    void refusesWhatReachesBeyondTheGridWithTheShare() throws IOException {
        String half =
                collection(feature("\"name\": \"A\"", "Polygon", "[[[60,20],[140,20],[140,60],[60,60],[60,20]]]"));
        assertRefused(half)
                .hasMessage("p.geojson, feature 1 \"A\": found a polygon with 50.0 % of its area outside the grid;"
                        + " expected a polygon within the grid, which has corners at x 0, y 0 and x 100, y 100. Draw it"
                        + " within the grid, or cut it at the grid's edge with --clip.");
        String away = collection(feature("\"name\": \"A\"", "Polygon", "[[[160,20],[240,20],[240,60],[160,20]]]"));
        assertRefused(away).hasMessageContaining("found a polygon that lies outside the grid, with a corner at ");
        assertRefused(away, PlanCrs.local(), true)
                .hasMessageContaining("the aquifer's crs is null, so that both must be in the same local ones.");
        String degrees =
                collection(feature("\"name\": \"A\"", "Polygon", "[[[115,46],[115.1,46],[115.1,46.2],[115,46]]]"));
        assertRefused(degrees)
                .hasMessageContaining("They look like longitude and latitude, but the aquifer's crs is null")
                .hasMessageContaining("name the aquifer's crs in aquifer.json");
        assertRefused(away, PlanCrs.of("EPSG:32633", "aquifer.json", "crs"), false)
                .hasMessageContaining("no longitude and latitude");
    }

    @Test
    void refusesWhatIsNotJson() throws IOException {
        assertRefused("{\"type\": }").hasMessageContaining("line 1, column 10");
    }

    /** Valid files with a few bytes changed, taken out or doubled are read or refused, never anything else. */
    @Property(tries = 300)
    void damagedFilesAreReadOrRefused(@ForAll @IntRange(max = 1_000_000) int seed) throws IOException {
        String text = collection(
                feature(
                        "\"name\": \"A\", \"layers\": [1, 2], \"boundaries\": {\"bank\": [\"side 1-2\"]}",
                        "Polygon",
                        "[" + SQUARE + ", " + ISLAND + "]"),
                feature("\"name\": \"B\", \"top\": 3", "MultiPolygon", "[[[[60,60],[70,60],[70,170],[60,60]]]]"));
        Path file = Files.createTempFile("damaged", ".geojson");
        try {
            Files.write(file, damaged(text.getBytes(StandardCharsets.UTF_8), new Random(seed)));
            read(file, PlanCrs.local(), true);
        } catch (DataFault fault) {
            assertThat(fault).hasMessageStartingWith("p.geojson");
        } finally {
            Files.delete(file);
        }
    }

    private static byte[] damaged(byte[] bytes, Random random) {
        String likely = "[]{},:\"-.0123456789eE nulltruefals\\";
        for (int i = 0; i < 1 + random.nextInt(4); i++) {
            int from = random.nextInt(bytes.length);
            bytes[from] = random.nextInt(10) == 0
                    ? (byte) random.nextInt(256)
                    : (byte) likely.charAt(random.nextInt(likely.length()));
        }
        return bytes;
    }
}
