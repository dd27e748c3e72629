package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.stream.StreamSupport;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.seepledger.aquifer.Window;
import org.seepledger.io.raster.GeoTiff;

/** {@code faces.geojson}, {@code imbalance_l1.tif} and {@code run.json}, read by other means than they are written. */
class ResultFilesTest {

    /** An island in it, given the wrong way round, as its outer ring is. */
    private static final String RINGED = """
            'type': 'MultiPolygon', 'coordinates': [
              [[[500001,1],[500001,29],[500029,29],[500029,1],[500001,1]],
               [[500010,10],[500020,10],[500020,20],[500010,20],[500010,10]]],
              [[[500031,5],[500039,5],[500039.125,25.0625],[500031,5]]]]""";

    @TempDir
    Path folder;

    private AquiferFiles files() {
        return new AquiferFiles(folder)
                .with("crs", "'EPSG:32633'")
                .with("grid/x/from", "500000")
                .prismsIn("EPSG:32633")
                .prism("ringed", "'boundaries': {'bank': ['part 1 island 1']}", RINGED);
    }

    private static JsonNode json(Path file) throws IOException {
        return new ObjectMapper().readTree(file.toFile());
    }

    private static Ran done(AquiferFiles files, String... options) {
        Ran ran = files.balance(options);
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
        return ran;
    }

    private static List<JsonNode> features(JsonNode collection, String group) {
        return StreamSupport.stream(collection.get("features").spliterator(), false)
                .filter(feature -> feature.at("/properties/group").asText().equals(group))
                .toList();
    }

    @Test
    void facesNameTheirCrsAndCarryTheRecordsFlows() throws IOException {
        AquiferFiles files = files();
        done(files, "--every", "record", "--rate-unit", "L/s");
        JsonNode faces = json(files.out().resolve("faces.geojson"));
        assertThat(faces.get("type").asText()).isEqualTo("FeatureCollection");
        assertThat(faces.at("/crs/type").asText()).isEqualTo("name");
        assertThat(faces.at("/crs/properties/name").asText()).isEqualTo("urn:ogc:def:crs:EPSG::32633");
        assertThat(faces.get("disclaimer").asText()).contains("not a determination of compliance");
        Budget budget = Budget.of(files.out());
        assertThat(faces.get("features").size()).isEqualTo((int) budget.rows().stream()
                .filter(row -> row.get("group").matches("side|lid"))
                .count());
        for (JsonNode face : faces.get("features")) {
            JsonNode properties = face.get("properties");
            assertThat(face.get("type").asText()).isEqualTo("Feature");
            for (String column : List.of("inflow_rate", "outflow_rate", "net_rate")) {
                double inTable = budget.number(
                        column,
                        "ringed",
                        "record",
                        properties.get("group").asText(),
                        properties.get("item").asText(),
                        properties.get("layer").asText());
                assertThat(properties.get(column).doubleValue()).as(column).isEqualTo(inTable);
            }
            assertThat(properties.get("rate_unit").asText()).isEqualTo("L/s");
        }
    }

    @Test
    void sidesAreLinesAndABoundaryIsAllOfIts() throws IOException {
        AquiferFiles files = files();
        done(files);
        List<JsonNode> sides = features(json(files.out().resolve("faces.geojson")), "side");
        JsonNode bank = sides.stream()
                .filter(side -> side.at("/properties/item").asText().equals("bank"))
                .findFirst()
                .orElseThrow();
        assertThat(bank.at("/geometry/type").asText()).isEqualTo("MultiLineString");
        assertThat(bank.at("/geometry/coordinates")).hasSize(4);
        JsonNode last = sides.stream()
                .filter(side -> side.at("/properties/item").asText().equals("part 2 side 2"))
                .findFirst()
                .orElseThrow();
        assertThat(last.at("/geometry/coordinates").toString()).isEqualTo("[[[500039.0,5.0],[500039.125,25.0625]]]");
    }

    @Test
    void lidsArePolygonsByTheRightHandRule() throws IOException {
        AquiferFiles files = files();
        done(files);
        List<JsonNode> lids = features(json(files.out().resolve("faces.geojson")), "lid");
        assertThat(lids).hasSize(2);
        for (JsonNode lid : lids) {
            assertThat(lid.at("/geometry/type").asText()).isEqualTo("MultiPolygon");
            JsonNode parts = lid.at("/geometry/coordinates");
            assertThat(parts).hasSize(2);
            assertThat(parts.get(0)).hasSize(2);
            for (JsonNode part : parts) {
                for (int ring = 0; ring < part.size(); ring++) {
                    Coordinate[] corners = corners(part.get(ring));
                    assertThat(corners[corners.length - 1]).as("closed").isEqualTo(corners[0]);
                    assertThat(Orientation.isCCW(corners)).isEqualTo(ring == 0);
                }
            }
        }
    }

    private static Coordinate[] corners(JsonNode ring) {
        List<Coordinate> corners = new ArrayList<>();
        ring.forEach(place ->
                corners.add(new Coordinate(place.get(0).asDouble(), place.get(1).asDouble())));
        return corners.toArray(Coordinate[]::new);
    }

    @Test
    void aFaceThatCannotBeGivenIsNull() throws IOException {
        AquiferFiles files = new AquiferFiles(folder)
                .with("flow/outer_faces", "{'sides': 'closed'}")
                .prism("edge", "", "'type': 'Polygon', 'coordinates': [[[0,0],[20,0],[20,20],[0,20],[0,0]]]");
        done(files);
        JsonNode faces = json(files.out().resolve("faces.geojson"));
        assertThat(faces.has("crs")).as("local coordinates have none").isFalse();
        JsonNode closed = features(faces, "side").get(0).get("properties");
        assertThat(closed.get("inflow_rate").isNull()).isTrue();
        assertThat(closed.get("outflow_rate").isNull()).isTrue();
        assertThat(closed.get("net_rate").isNull()).isTrue();
    }

    /** The field is uniform but for 0.003 m/d of recharge on 100 m2 in interval 1 of two, which goes nowhere. */
    @Test
    void imbalanceIsTheMeanOverTheRecordOnTheWindow() throws IOException {
        AquiferFiles files = new AquiferFiles(folder)
                .with("crs", "'EPSG:32633'")
                .with("grid/x/from", "500000")
                .with("times", "[0, 10, 40]")
                .with("sources", "[{'category': 'recharge', 'kind': 'areal', 'rate': {'file': 'r.csv'}}]")
                .file("r.csv", "interval,rate\n1,0.003\n2,0\n")
                .prismsIn("EPSG:32633")
                .prism(
                        "p",
                        "",
                        "'type': 'Polygon', 'coordinates': [[[500012,3],[500018,3],[500018,17],[500012,17],[500012,3]]]");
        done(files);
        try (GeoTiff raster = GeoTiff.open(files.out().resolve("imbalance_l1.tif"), "imbalance_l1.tif")) {
            assertThat(raster.columns()).isEqualTo(1);
            assertThat(raster.rows()).isEqualTo(2);
            var place = raster.georeference().orElseThrow();
            assertThat(place.crs()).contains("EPSG:32633");
            assertThat(place.mapX(0, 0)).isEqualTo(500010);
            assertThat(place.mapY(0, 0)).isEqualTo(20);
            double[] values = new double[2];
            raster.read(0, new Window(0, 0, 2, 1), values, 0);
            assertThat(values).containsExactly(new double[] {0.075, 0.075}, within(1e-12));
        }
        try (GeoTiff below = GeoTiff.open(files.out().resolve("imbalance_l2.tif"), "imbalance_l2.tif")) {
            double[] values = new double[2];
            below.read(0, new Window(0, 0, 2, 1), values, 0);
            assertThat(values).containsExactly(new double[] {0, 0}, within(1e-12));
        }
    }

    @Test
    void runRecordTellsHowTheResultCameAbout() throws IOException, NoSuchAlgorithmException {
        Path periods = Files.writeString(folder.resolve("periods.csv"), "name,from,to\nall,0,20\n");
        AquiferFiles files = new AquiferFiles(folder)
                .with("head", "{'file': 'h.csv'}")
                .file("h.csv", "layer,h\n1,9\n2,9\n")
                .with("flow/outer_faces", "{'top': 'open'}")
                .with("sources", "[{'category': 'recharge', 'kind': 'areal', 'rate': 0, 'origin': 'measured'}]");
        done(files, "--periods", periods.toString(), "--rate-unit", "L/s", "--wells", "spread", "--clip");
        JsonNode run = json(files.out().resolve("run.json"));
        assertThat(run.get("program").asText()).isEqualTo("seepledger");
        assertThat(run.get("version").asText()).matches("\\d+\\.\\d+\\.\\d+\\S*");
        assertThat(run.get("command").asText()).isEqualTo("balance");
        JsonNode options = run.get("options");
        assertThat(options.get("aquifer").asText()).isEqualTo(files.aquifer().toString());
        assertThat(options.get("prisms").asText()).isEqualTo(files.prisms().toString());
        assertThat(options.get("periods").asText()).isEqualTo(periods.toString());
        assertThat(options.get("rate-unit").asText()).isEqualTo("L/s");
        assertThat(options.get("wells").asText()).isEqualTo("spread");
        assertThat(options.get("clip").asText()).isEqualTo("true");
        assertThat(names(run.get("inputs")))
                .containsExactly("aquifer.json", "h.csv", files.prisms().toString(), periods.toString());
        assertHash(run.get("inputs").get(1), files.aquifer().resolve("h.csv"));
        assertThat(names(run.get("outputs")))
                .containsExactly(
                        "budget.csv",
                        "exchange.csv",
                        "faces.geojson",
                        "imbalance_l1.tif",
                        "imbalance_l2.tif",
                        "report.html");
        for (JsonNode output : run.get("outputs")) {
            assertHash(output, files.out().resolve(output.get("name").asText()));
        }
        assertThat(run.get("warnings").toString()).contains("recharge may be counted twice");
        assertThat(run.get("notes").isArray()).isTrue();
        assertThat(run.get("origins").toString()).contains("\"recharge\"", "\"measured\"");
        for (String stage : List.of("reading", "balancing", "writing")) {
            assertThat(run.at("/seconds/" + stage).doubleValue()).as(stage).isPositive();
        }
        assertThat(run.at("/checks/largest_difference_between_routes").doubleValue())
                .isBetween(0.0, 1e-12);
        assertThat(run.get("disclaimer").asText()).isNotEmpty();
    }

    private static List<String> names(JsonNode files) {
        return StreamSupport.stream(files.spliterator(), false)
                .map(file -> file.get("name").asText())
                .toList();
    }

    private static void assertHash(JsonNode record, Path file) throws IOException, NoSuchAlgorithmException {
        byte[] digest = MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(file));
        assertThat(record.get("sha256").asText()).isEqualTo(HexFormat.of().formatHex(digest));
        assertThat(record.get("bytes").asLong()).isEqualTo(Files.size(file));
    }
}
