package org.seepledger.sample;

import java.util.List;

/**
 * The prisms of the valley, drawn across its cells. The first two share a straight side, on which each has a vertex that the
 * other does not.
 */
final class ValleyPrisms {

    private static final String CRS =
            "\"crs\": {\"type\": \"name\", \"properties\": {\"name\": \"urn:ogc:def:crs:EPSG::32633\"}},\n";

    private static final double[][] WELL_FIELD = {
        {921, 1227},
        {1203, 1173},
        {1479, 1128},
        {1634, 1341},
        {1646, 1593},
        {1658, 1845},
        {1317, 1931},
        {951, 1822},
        {868, 1571}
    };

    private static final double[][] GRAVEL_PIT = {{1212, 1547}, {1198, 1634}, {1287, 1652}, {1301, 1563}};

    private static final double[][] NORTH_FIELDS = {
        {1634, 1341}, {1893, 1227}, {2231, 1194}, {2398, 1403}, {2342, 1727}, {1987, 1893}, {1658, 1845}, {1640, 1467}
    };

    private static final double[][] RIVER_MEADOW = {
        {1764, 923},
        {2084, 803},
        {2467, 842},
        {2793, 848},
        {2781, 1053},
        {2493, 1139},
        {2221, 1058},
        {1948, 1131},
        {1790, 1190}
    };

    private static final double[][] SOUTH_TERRACE = {
        {433, 617}, {702, 366}, {1118, 391}, {1407, 582}, {1364, 871}, {1021, 987}, {566, 912}
    };

    private ValleyPrisms() {}

    static String geoJson() {
        return DrawnPrism.geoJson(
                CRS,
                Valley.FRAME,
                new DrawnPrism(
                        "well field",
                        "\"layers\": [1, 3]",
                        "{\"far bank\": [\"side 1-2\"], \"pit edge\": [\"island 1\"]}",
                        List.of(WELL_FIELD, GRAVEL_PIT)),
                new DrawnPrism(
                        "north fields",
                        "\"layers\": [1, 3]",
                        "{\"river side\": [\"side 1-2\"], \"well field side\": [\"side 7-8\"]}",
                        List.<double[][]>of(NORTH_FIELDS)),
                new DrawnPrism(
                        "river meadow",
                        "\"layers\": [1, 1]",
                        "{\"upstream\": [\"side 9\"]}",
                        List.<double[][]>of(RIVER_MEADOW)),
                new DrawnPrism(
                        "south terrace",
                        "\"bottom\": 93.1",
                        "{\"river side\": [\"side 5-6\"]}",
                        List.<double[][]>of(SOUTH_TERRACE)));
    }
}
