package org.seepledger.io.prisms;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;
import org.seepledger.io.crs.PlanCrs;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.VerticalRange.Elevations;
import org.seepledger.prism.VerticalRange.Layers;

class PrismsReaderTest {

    private static final Grid LOCAL = new Grid(Axis.even(0, 10, 10), Axis.even(0, 10, 10), 0, 1);
    private static final Grid UTM = new Grid(Axis.even(497_000, 50, 80), Axis.even(5_197_000, 50, 80), 0, 1);
    private static final String SQUARE = "[[10,10],[50,10],[50,50],[10,50],[10,10]]";
    private static final String ISLAND = "[[20,20],[20,30],[30,30],[20,20]]";

    @TempDir
    Path folder;

    private final List<String> warnings = new ArrayList<>();
    private final List<String> notes = new ArrayList<>();

    private List<Prism> read(String text, PlanCrs crs, Grid grid, boolean clip) throws IOException {
        Path file = Files.writeString(folder.resolve("prisms.geojson"), text);
        SurfaceReader surfaces = (raster, shown) -> GriddedValues.constant(shown.length());
        return new PrismsReader(crs, grid, FourLayers.ALL, clip, surfaces, warnings::add, notes::add)
                .read(file, "prisms.geojson");
    }

    private Prism local(String properties, String type, String coordinates) throws IOException {
        List<Prism> prisms = read(collection(feature(properties, type, coordinates)), PlanCrs.local(), LOCAL, false);
        assertThat(prisms).hasSize(1);
        return prisms.get(0);
    }

    static String feature(String properties, String type, String coordinates) {
        return "{\"type\": \"Feature\", \"properties\": {" + properties + "}, \"geometry\": {\"type\": \"" + type
                + "\", \"coordinates\": " + coordinates + "}}";
    }

    static String collection(String... features) {
        return "{\"type\": \"FeatureCollection\", \"features\": [" + String.join(", ", features) + "]}";
    }

    private static String names(Prism prism) {
        return prism.rings().stream()
                .flatMap(ring -> ring.sides().stream())
                .map(side -> side.name() + " @" + (int) side.x() + "/" + (int) side.y())
                .collect(Collectors.joining(", "));
    }

    private static List<String> items(Prism prism) {
        return prism.rings().stream()
                .flatMap(ring -> ring.sides().stream())
                .map(Side::item)
                .toList();
    }

    @Test
    void numbersTheSidesOfAPolygonWithAnIsland() throws IOException {
        Prism prism = local("\"name\": \"A\"", "Polygon", "[" + SQUARE + ", " + ISLAND + "]");
        assertThat(prism.name()).isEqualTo("A");
        assertThat(names(prism))
                .isEqualTo("side 1 @10/10, side 2 @50/10, side 3 @50/50, side 4 @10/50,"
                        + " island 1 side 1 @20/20, island 1 side 2 @20/30, island 1 side 3 @30/30");
        assertThat(prism.rings()).extracting(Ring::part, Ring::island).hasToString("[(1, 0), (1, 1)]");
        assertThat(items(prism)).startsWith("side 1", "side 2").endsWith("island 1 side 3");
        assertThat(notes).isEmpty();
    }

    @Test
    void turnsRingsThatRunTheOtherWayAboutTheirFirstVertex() throws IOException {
        Prism prism = local(
                "\"name\": \"A\"",
                "Polygon",
                "[[[10,10],[10,50],[50,50],[50,10],[10,10]], [[20,20],[30,30],[20,30],[20,20]]]");
        assertThat(names(prism))
                .isEqualTo("side 1 @10/10, side 2 @50/10, side 3 @50/50, side 4 @10/50,"
                        + " island 1 side 1 @20/20, island 1 side 2 @20/30, island 1 side 3 @30/30");
    }

    @Test
    void prefixesPartsEvenASingleOne() throws IOException {
        Prism single = local("\"name\": \"A\"", "MultiPolygon", "[[" + SQUARE + "]]");
        assertThat(names(single)).startsWith("part 1 side 1 @10/10, part 1 side 2");
        Prism several = local(
                "\"name\": \"A\"",
                "MultiPolygon",
                "[[[[60,60],[70,60],[70,70],[60,60]]], [" + SQUARE + ", " + ISLAND + "]]");
        assertThat(names(several)).startsWith("part 1 side 1 @60/60").contains("part 2 island 1 side 3 @30/30");
        assertThat(several.rings()).extracting(Ring::part, Ring::island).hasToString("[(1, 0), (2, 0), (2, 1)]");
    }

    @Test
    void partsMayTouchAtAPlace() throws IOException {
        Prism prism =
                local("\"name\": \"A\"", "MultiPolygon", "[[" + SQUARE + "], [[[50,50],[60,50],[60,60],[50,50]]]]");
        assertThat(prism.rings()).hasSize(2);
    }

    @Test
    void dropsRepeatedVerticesBeforeNumberingAndIgnoresHeights() throws IOException {
        Prism prism = local(
                "\"name\": \"A\"",
                "Polygon",
                "[[[10,10,7],[10,10,8],[50,10,7],[50,10,7],[50,50,7],[10,50,7],[10,10,9],[10,10,7]]]");
        assertThat(names(prism)).isEqualTo("side 1 @10/10, side 2 @50/10, side 3 @50/50, side 4 @10/50");
    }

    @Test
    void readsASingleFeature() throws IOException {
        List<Prism> prisms =
                read(feature("\"name\": \"A\"", "Polygon", "[" + SQUARE + "]"), PlanCrs.local(), LOCAL, false);
        assertThat(prisms).extracting(Prism::name).containsExactly("A");
    }

    @Test
    void readsStacksOfLayersCountedFromOne() throws IOException {
        assertThat(local("\"name\": \"A\", \"layers\": [2, 3.0]", "Polygon", "[" + SQUARE + "]")
                        .range())
                .isEqualTo(new Layers(1, 2));
        assertThat(local("\"name\": \"A\", \"layers\": null, \"top\": null", "Polygon", "[" + SQUARE + "]")
                        .range())
                .isEqualTo(new Layers(0, 3));
    }

    @Test
    void readsElevationsAndSurfaces() throws IOException {
        Files.createDirectory(folder.resolve("surfaces"));
        Files.writeString(folder.resolve("surfaces/base.tif"), "");
        Elevations range = (Elevations) local(
                        "\"name\": \"A\", \"top\": 92.5, \"bottom\": \"surfaces/base.tif\"",
                        "Polygon",
                        "[" + SQUARE + "]")
                .range();
        assertThat(value(range.top().orElseThrow())).isEqualTo(92.5);
        assertThat(value(range.bottom().orElseThrow())).isEqualTo("surfaces/base.tif".length());
        Elevations open = (Elevations) local("\"name\": \"A\", \"bottom\": -3", "Polygon", "[" + SQUARE + "]")
                .range();
        assertThat(open.top()).isEmpty();
        assertThat(value(open.bottom().orElseThrow())).isEqualTo(-3);
    }

    @Test
    void aLidMayLieOnALayer() throws IOException {
        Elevations range = (Elevations) local(
                        "\"name\": \"A\", \"top\": {\"layer\": 2}, \"bottom\": {\"layer\": 3}",
                        "Polygon",
                        "[" + SQUARE + "]")
                .range();
        assertThat(value(range.top().orElseThrow())).isEqualTo(30);
        assertThat(value(range.bottom().orElseThrow())).isEqualTo(10);
        Elevations mixed = (Elevations)
                local("\"name\": \"A\", \"top\": {\"layer\": 1}, \"bottom\": 7", "Polygon", "[" + SQUARE + "]")
                        .range();
        assertThat(value(mixed.top().orElseThrow())).isEqualTo(40);
    }

    private static double value(GriddedValues surface) {
        double[] values = new double[1];
        surface.read(0, 0, new Window(0, 0, 1, 1), values, 0);
        return values[0];
    }

    @Test
    void groupsSidesUnderBoundaries() throws IOException {
        Prism plain = local(
                "\"name\": \"A\", \"boundaries\": {\"bank\": [\"side 2-3\", \"island 1 side 1\"], \"well\":"
                        + " [\"island 1 side 2-3\"]}",
                "Polygon",
                "[" + SQUARE + ", " + ISLAND + "]");
        assertThat(items(plain)).containsExactly("side 1", "bank", "bank", "side 4", "bank", "well", "well");
        assertThat(plain.rings().get(0).sides().get(1).name()).isEqualTo("side 2");
        Prism whole = local(
                "\"name\": \"A\", \"boundaries\": {\"ring\": [\"island 1\"]}",
                "Polygon",
                "[" + SQUARE + ", " + ISLAND + "]");
        assertThat(items(whole)).endsWith("side 4", "ring", "ring", "ring");
    }

    @Test
    void groupsSidesOfParts() throws IOException {
        String parts = "[[[[60,60],[70,60],[70,70],[60,60]]], [" + SQUARE + ", " + ISLAND + "]]";
        Prism some = local(
                "\"name\": \"A\", \"boundaries\": {\"x\": [\"part 2 island 1 side 3\", \"part 1 side 1-2\"], \"y\":"
                        + " [\"part 2 side 4\"]}",
                "MultiPolygon",
                parts);
        assertThat(items(some).subList(0, 3)).containsExactly("x", "x", "part 1 side 3");
        assertThat(items(some)).endsWith("y", "part 2 island 1 side 1", "part 2 island 1 side 2", "x");
        Prism whole = local("\"name\": \"A\", \"boundaries\": {\"x\": [\"part 2\"]}", "MultiPolygon", parts);
        assertThat(items(whole).subList(3, 10)).containsOnly("x");
    }

    @Test
    void transformsLongitudeAndLatitude() throws IOException {
        // Places by gdaltransform -s_srs EPSG:4326 -t_srs EPSG:32633, GDAL 3.6.2 with PROJ 9.1.1.
        List<Prism> prisms = read(
                collection(feature(
                        "\"name\": \"A\"",
                        "Polygon",
                        "[[[14.97,46.93],[14.99,46.93],[14.99,46.95],[14.97,46.95],[14.97,46.93]]]")),
                PlanCrs.of("EPSG:32633", "aquifer.json", "crs"),
                UTM,
                false);
        List<Side> sides = prisms.get(0).rings().get(0).sides();
        double[][] expected = {
            {497716.255646239, 5197385.7485689},
            {499238.751880044, 5197385.36033301},
            {499239.035295057, 5199607.86439474},
            {497717.105891339, 5199608.25261271},
        };
        for (int i = 0; i < 4; i++) {
            assertThat(sides.get(i).x()).isEqualTo(expected[i][0], within(1e-5));
            assertThat(sides.get(i).y()).isEqualTo(expected[i][1], within(1e-5));
        }
        assertThat(notes)
                .containsExactly("prisms.geojson: without a crs member coordinates are WGS 84 longitude and latitude;"
                        + " they were transformed to the aquifer's CRS EPSG:32633");
    }

    @Test
    void leavesCoordinatesOfTheAquifersCrsAlone() throws IOException {
        String crs = "\"crs\": {\"type\": \"name\", \"properties\": {\"name\": \"urn:ogc:def:crs:EPSG::32633\"}}, ";
        String polygon = "[[[497716.1,5197385.7],[499238.7,5197385.3],[499239.0,5199607.8],[497716.1,5197385.7]]]";
        String text = collection(feature("\"name\": \"A\"", "Polygon", polygon))
                .replace("\"features\"", crs + "\"features\"");
        Prism prism = read(text, PlanCrs.of("EPSG:32633", "aquifer.json", "crs"), UTM, false)
                .get(0);
        assertThat(prism.rings().get(0).sides().get(0)).isEqualTo(new Side("side 1", "side 1", 497716.1, 5197385.7));
        assertThat(notes).isEmpty();
    }

    @Test
    void readsWhatGdalWritesForLongitudeAndLatitude() throws IOException {
        // ogr2ogr -t_srs EPSG:4326 of a square between 500100, 5200100 and 500300, 5200300 in EPSG:32633, GDAL 3.6.2.
        String text = """
                {
                "type": "FeatureCollection",
                "name": "a",
                "crs": { "type": "name", "properties": { "name": "urn:ogc:def:crs:OGC:1.3:CRS84" } },
                "features": [
                { "type": "Feature", "properties": { "name": "A", "layers": [ 1, 2 ] }, "geometry": { "type": "Polygon", \
                "coordinates": [ [ [ 15.001314229812831, 46.954429078419864 ], [ 15.003942689434272, 46.954429018080575 ], \
                [ 15.00394282162387, 46.956228784972176 ], [ 15.001314273876028, 46.956228845315231 ], \
                [ 15.001314229812831, 46.954429078419864 ] ] ] } }
                ]
                }
                """;
        Prism prism = read(text, PlanCrs.of("EPSG:32633", "aquifer.json", "crs"), UTM, false)
                .get(0);
        double[][] expected = {{500100, 5200100}, {500300, 5200100}, {500300, 5200300}, {500100, 5200300}};
        for (int i = 0; i < 4; i++) {
            Side side = prism.rings().get(0).sides().get(i);
            assertThat(side.x()).isEqualTo(expected[i][0], within(1e-5));
            assertThat(side.y()).isEqualTo(expected[i][1], within(1e-5));
        }
        assertThat(notes).isEmpty();
    }

    @Test
    void tellsOnceOfPropertiesThatLookLikeItsOwn() throws IOException {
        String other = feature("\"name\": \"B\", \"layer\": 2", "Polygon", "[[[60,60],[70,60],[70,70],[60,60]]]");
        String properties = "\"name\": \"A\", \"layer\": 1, \"Layers\": [1, 2], \"boundary\": 0, \"colour\": \"red\"";
        read(collection(feature(properties, "Polygon", "[" + SQUARE + "]"), other), PlanCrs.local(), LOCAL, false);
        assertThat(warnings)
                .containsExactly(
                        "prisms.geojson, feature 1: the property \"layer\" is not one of name, layers, top, bottom,"
                                + " boundaries and was not read, so that the prism has no \"layers\": did you mean that?",
                        "prisms.geojson, feature 1: the property \"Layers\" is not one of name, layers, top, bottom,"
                                + " boundaries and was not read, so that the prism has no \"layers\": did you mean that?",
                        "prisms.geojson, feature 1: the property \"boundary\" is not one of name, layers, top, bottom,"
                                + " boundaries and was not read, so that the prism has no \"boundaries\": did you mean that?");
        assertThat(notes).isEmpty();
    }

    /** A GIS may have a column of its own beside the right one; a name is there in any case. */
    @Test
    void onlyNotesAResemblanceToAPropertyThatIsThere() throws IOException {
        local(
                "\"name\": \"A\", \"Name\": \"a\", \"layers\": [1, 2], \"layer\": \"parcels\"",
                "Polygon",
                "[" + SQUARE + "]");
        assertThat(warnings).isEmpty();
        assertThat(notes).hasSize(2).allSatisfy(note -> assertThat(note).endsWith("and was not read"));
    }

    @ParameterizedTest
    @CsvSource({"Top, top", "botom, bottom", "bottoms, bottom", "LAYERS, layers", "layer_no, layers"})
    void warnsOfAPropertyThatIsNearlyARange(String written, String meant) throws IOException {
        local("\"name\": \"A\", \"" + written + "\": 3", "Polygon", "[" + SQUARE + "]");
        assertThat(warnings).singleElement().asString().endsWith("has no \"" + meant + "\": did you mean that?");
    }

    @Test
    void cutsAtTheGridsEdgeWhenAskedTo() throws IOException {
        Prism prism = read(
                        collection(feature(
                                "\"name\": \"A\", \"boundaries\": {\"bank\": [\"side 1\"]}",
                                "Polygon",
                                "[[[60,20],[140,20],[140,60],[60,60],[60,20]]]")),
                        PlanCrs.local(),
                        LOCAL,
                        true)
                .get(0);
        assertThat(names(prism)).isEqualTo("side 1 @60/20, grid edge @100/20, side 3 @100/60, side 4 @60/60");
        assertThat(items(prism)).containsExactly("bank", "grid edge", "side 3", "side 4");
        assertThat(notes)
                .containsExactly(
                        "prisms.geojson, feature 1 \"A\": 50.0 % of its area lies outside the grid; the polygon"
                                + " was cut at the grid's edge",
                        "prisms.geojson, feature 1 \"A\": wholly outside the grid, and without rows, are side 2");
    }

    @Test
    void takesAPolygonOnTheEdgeAsItIs() throws IOException {
        Prism prism = local("\"name\": \"A\"", "Polygon", "[[[0,0],[100,0],[100,100],[0,100],[0,0]]]");
        assertThat(prism.rings().get(0).sides()).hasSize(4);
        assertThat(notes).isEmpty();
    }
}
