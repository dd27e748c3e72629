package org.seepledger.sample;

import java.util.List;

/** The prisms of the terrace, drawn across its cells, as GeoJSON in the map's local coordinates. */
final class TerracePrisms {

    /** Vertices in along-grid metres: outer ring counter-clockwise, island clockwise. */
    private static final double[][] WELL_FIELD = {
        {1018, 457}, {1187, 431}, {1383, 466}, {1562, 523}, {1657, 689}, {1592, 853}, {1304, 908}, {1088, 797}
    };

    private static final double[][] POND = {{1176, 702}, {1193, 763}, {1258, 747}, {1233, 689}};

    /** Its first two sides are sides of the well field the other way round. */
    private static final double[][] UPPER_TERRACE = {
        {1088, 797},
        {1304, 908},
        {1592, 853},
        {1823, 962},
        {2012, 1083},
        {1931, 1374},
        {1504, 1521},
        {1079, 1432},
        {933, 1078}
    };

    private static final double[][] DEEP_SAND = {
        {903, 352}, {1702, 423}, {1824, 764}, {1603, 1153}, {1149, 1184}, {848, 759}
    };

    private TerracePrisms() {}

    static String geoJson() {
        return DrawnPrism.geoJson(
                "",
                Terrace.FRAME,
                new DrawnPrism(
                        "well field",
                        "\"layers\": [1, 2]",
                        "{\"river side\": [\"side 1-3\"], \"pond edge\": [\"island 1\"]}",
                        List.of(WELL_FIELD, POND)),
                new DrawnPrism(
                        "upper terrace",
                        "\"layers\": [1, 2]",
                        "{\"well field side\": [\"side 1-2\"], \"hill side\": [\"side 6-7\"]}",
                        List.<double[][]>of(UPPER_TERRACE)),
                new DrawnPrism(
                        "deep sand",
                        "\"layers\": [3, 3]",
                        "{\"river side\": [\"side 1\"]}",
                        List.<double[][]>of(DEEP_SAND)));
    }
}
