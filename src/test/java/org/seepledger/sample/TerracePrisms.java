package org.seepledger.sample;

import java.util.stream.Collectors;
import java.util.stream.Stream;

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
        return """
                {"type": "FeatureCollection", "features": [
                %s,
                %s,
                %s
                ]}
                """.formatted(
                        feature(
                                "well field",
                                "[1, 2]",
                                "{\"river side\": [\"side 1-3\"], \"pond edge\": [\"island 1\"]}",
                                WELL_FIELD,
                                POND),
                        feature(
                                "upper terrace",
                                "[1, 2]",
                                "{\"well field side\": [\"side 1-2\"], \"hill side\": [\"side 6-7\"]}",
                                UPPER_TERRACE),
                        feature("deep sand", "[3, 3]", "{\"river side\": [\"side 1\"]}", DEEP_SAND));
    }

    private static String feature(String name, String layers, String boundaries, double[][]... rings) {
        return """
                {"type": "Feature",
                 "properties": {"name": "%s", "layers": %s, "boundaries": %s},
                 "geometry": {"type": "Polygon", "coordinates": [%s]}}""".formatted(
                        name,
                        layers,
                        boundaries,
                        Stream.of(rings).map(TerracePrisms::ring).collect(Collectors.joining(", ")));
    }

    private static String ring(double[][] vertices) {
        StringBuilder ring = new StringBuilder("[");
        for (double[] vertex : vertices) {
            ring.append(position(vertex)).append(", ");
        }
        return ring.append(position(vertices[0])).append(']').toString();
    }

    private static String position(double[] vertex) {
        return "[" + Digits.decimals(Terrace.FRAME.mapX(vertex[0], vertex[1]), 1) + ", "
                + Digits.decimals(Terrace.FRAME.mapY(vertex[0], vertex[1]), 1) + "]";
    }
}
