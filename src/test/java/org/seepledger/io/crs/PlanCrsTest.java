package org.seepledger.io.crs;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.geotools.api.referencing.FactoryException;
import org.geotools.referencing.CRS;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.fault.DataFault;
import org.seepledger.unit.Measure;

/**
 * Transformed places against {@code gdaltransform -s_srs … -t_srs … -output_xy} of GDAL 3.6.2 with PROJ 9.1.1 (Debian
 * 12). The two libraries may differ by some micrometres, and by some millimetres where geocentric coordinates are
 * passed through on the way from one ellipsoid to another.
 */
class PlanCrsTest {

    private static final Measure METRE = Measure.of("m");

    private final List<String> notes = new ArrayList<>();

    private static PlanCrs crs(String name) {
        return PlanCrs.of(name, "aquifer.json", "crs");
    }

    private static boolean same(PlanCrs one, PlanCrs other) {
        return CRS.equalsIgnoreMetadata(one.crs(), other.crs());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "EPSG:32633",
                "epsg:32633",
                " EPSG::32633 ",
                "urn:ogc:def:crs:EPSG::32633",
                "urn:ogc:def:crs:EPSG:8.9:32633",
                "http://www.opengis.net/def/crs/EPSG/0/32633",
            })
    void knowsACodeInAllItsSpellings(String name) {
        assertThat(crs(name).code()).contains("EPSG:32633");
        assertThat(crs(name).isLocal()).isFalse();
        assertThat(same(crs(name), crs("EPSG:32633"))).isTrue();
    }

    @ParameterizedTest
    @CsvSource({
        "EPSG:32633, m, 1.0",
        "EPSG:25832, m, 1.0",
        "EPSG:3035, km, 0.001",
        "EPSG:2193, ft, 3.28083989501312336",
        "EPSG:2225, ftUS, 1.0",
        "EPSG:2222, ft, 1.0",
        "EPSG:2222, m, 0.3048",
    })
    void givesThePlanUnitExactly(String code, String lengthUnit, double factor) {
        assertThat(crs(code).planUnit(Measure.of(lengthUnit))).isEqualTo(factor);
    }

    @Test
    void knowsTheSurveyFoot() {
        assertThat(crs("EPSG:2225").planUnit(METRE)).isEqualTo(1200.0 / 3937.0);
        assertThat(crs("EPSG:2225").planUnit(Measure.of("ft"))).isGreaterThan(1.0);
    }

    @Test
    void convertsARarerUnitByItsMetres() {
        // Clarke's foot: 0.3047972654 m, EPSG unit 9005.
        assertThat(crs("EPSG:2314").planUnit(METRE)).isEqualTo(0.3047972654, within(1e-15));
        assertThat(crs("EPSG:2314").planUnit(Measure.of("km"))).isEqualTo(0.3047972654e-3, within(1e-18));
    }

    @Test
    void localCoordinatesAreInTheLengthUnit() {
        PlanCrs local = PlanCrs.local();
        assertThat(local.isLocal()).isTrue();
        assertThat(local.planUnit(Measure.of("ft"))).isEqualTo(1.0);
        assertThat(local.code()).isEmpty();
        assertThat(local.wkt()).isEmpty();
        assertThatThrownBy(() -> local.from("EPSG:32633", "p.geojson", "crs", notes::add))
                .isInstanceOf(IllegalStateException.class);
    }

    @ParameterizedTest
    @CsvSource({
        "EPSG:4326, 'geographic CRS \"WGS 84\" (EPSG:4326)', 'areas in degrees mean nothing', 'UTM zone'",
        "urn:ogc:def:crs:OGC:1.3:CRS84, 'geographic CRS', 'areas in degrees mean nothing', 'UTM zone'",
        "EPSG:4978, 'not a projected CRS', 'projected CRS with two axes', 'local coordinates'",
        "EPSG:7405, 'not a projected CRS', 'projected CRS with two axes', 'plan part'",
        "EPSG:22275, 'axes run west and south', 'x to the east', 'UTM zone'",
        "EPSG:999999, 'not a known CRS', 'EPSG code such as', 'Write the code'",
        "EPSG:5701, 'not a projected CRS', 'projected CRS with two axes', 'plan part'",
        "32633, 'not a known CRS', 'EPSG code such as', 'Write the code'",
        "'', 'not a known CRS', 'EPSG code such as', 'Write the code'",
        "'PROJCS[\"broken', 'not a known CRS', 'well-known text', 'Write the code'",
        "'AUTO:42001,0,0', 'not a known CRS', 'EPSG code such as', 'Write the code'",
    })
    void refusesWhatIsNoPlan(String name, String found, String expected, String remedy) {
        assertThatThrownBy(() -> crs(name))
                .isInstanceOf(DataFault.class)
                .hasMessageStartingWith("aquifer.json, crs: found ")
                .hasMessageContaining(found)
                .hasMessageContaining(expected)
                .hasMessageContaining(remedy);
    }

    @Test
    void readsWellKnownText() {
        PlanCrs utm = crs("EPSG:32633");
        PlanCrs read = crs(utm.wkt());
        assertThat(read.code()).contains("EPSG:32633");
        assertThat(same(read, utm)).isTrue();
        assertThat(same(read, crs("EPSG:32634"))).isFalse();
    }

    @Test
    void knowsASystemWithoutCodeByWhatItIs() {
        String anonymous = crs("EPSG:32633").wkt().replaceAll(",\\s*AUTHORITY\\[\"EPSG\",\"\\d+\"\\]", "");
        assertThat(crs(anonymous).code()).isEmpty();
        assertThat(same(crs(anonymous), crs("EPSG:32633"))).isTrue();
        assertThat(same(crs("EPSG:32633"), crs(anonymous))).isTrue();
    }

    @Test
    void takesTheSecondVersionOfWellKnownTextByItsCode() {
        String text = "PROJCRS[\"x\",BASEGEOGCRS[\"y\",ID[\"EPSG\",4326]],CS[Cartesian,2],"
                + "AXIS[\"(E)\",east,ORDER[1]],ID[\"EPSG\",2225]]";
        assertThat(crs(text).code()).contains("EPSG:2225");
    }

    @Test
    void putsEastFirstWhateverTheAuthorityPrefers() throws FactoryException {
        // New Zealand Transverse Mercator lists northing before easting.
        PlanCrs turned = PlanCrs.of(CRS.decode("EPSG:2193", false), "ground.tif", "georeference");
        assertThat(same(turned, crs("EPSG:2193"))).isTrue();
        assertThat(turned.crs().getCoordinateSystem().getAxis(0).getDirection()).hasToString("AxisDirection[EAST]");
    }

    @Test
    void transformsLongitudeAndLatitude() {
        PlanTransform transform = crs("EPSG:32633").fromLongitudeLatitude("p.geojson", notes::add);
        double[] place = transform.apply(15.5, 46.95);
        assertThat(place[0]).isEqualTo(538048.203114887, within(1e-5));
        assertThat(place[1]).isEqualTo(5199729.13536928, within(1e-5));
        assertThat(transform.isFromDegrees()).isTrue();
        assertThat(transform.isIdentity()).isFalse();
        assertThat(notes).isEmpty();
    }

    @ParameterizedTest
    @CsvSource({
        "EPSG:32633, urn:ogc:def:crs:OGC:1.3:CRS84, 15.5, 46.95, 538048.203114887, 5199729.13536928, 1e-5, true",
        "EPSG:32633, EPSG:4326, 15.5, 46.95, 538048.203114887, 5199729.13536928, 1e-5, true",
        "EPSG:32633, EPSG:32632, 700000, 5200000, 243209.300588507, 5202174.03064418, 1e-5, false",
        "EPSG:2225, EPSG:4269, -120.5, 39.5, 6985008.65217703, 1704760.54065085, 1e-5, true",
        "EPSG:2225, EPSG:4326, -120.5, 39.5, 6985008.65217703, 1704760.54065085, 0.02, true",
    })
    void transformsFromWhatAFileNames(
            String code, String name, double x, double y, double mapX, double mapY, double tolerance, boolean degrees) {
        PlanTransform transform = crs(code).from(name, "p.geojson", "crs", notes::add);
        double[] place = transform.apply(x, y);
        assertThat(place[0]).isEqualTo(mapX, within(tolerance));
        assertThat(place[1]).isEqualTo(mapY, within(tolerance));
        assertThat(transform.isFromDegrees()).isEqualTo(degrees);
    }

    @Test
    void leavesCoordinatesOfTheSameSystemAlone() {
        PlanTransform same = crs("EPSG:2225").from("urn:ogc:def:crs:EPSG::2225", "p.geojson", "crs", notes::add);
        assertThat(same.isIdentity()).isTrue();
        assertThat(same.apply(0.1, 0.2)).containsExactly(0.1, 0.2);
    }

    @Test
    void saysWhereNoDatumShiftIsKnown() {
        // Anguilla 1957: the EPSG database holds no parameters towards WGS 84.
        PlanTransform transform = crs("EPSG:2000").fromLongitudeLatitude("p.geojson", notes::add);
        assertThat(transform.apply(-63, 18.2)).doesNotContain(Double.NaN);
        assertThat(notes).hasSize(1).first().asString().startsWith("p.geojson: no datum shift is known");
    }

    @Test
    void namesTheFileThatNamesAnUnknownSystem() {
        assertThatThrownBy(() -> crs("EPSG:32633").from("EPSG:1", "p.geojson", "crs", notes::add))
                .isInstanceOf(DataFault.class)
                .hasMessageStartingWith("p.geojson, crs: found \"EPSG:1\"");
    }
}
