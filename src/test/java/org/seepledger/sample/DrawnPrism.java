package org.seepledger.sample;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * A prism drawn across a sample's cells.
 *
 * @param name its name
 * @param range how far it reaches up and down, as JSON: {@code "layers": [1, 2]}
 * @param boundaries groups of sides, as JSON
 * @param rings vertices in along-grid metres: the outer ring counter-clockwise, then islands clockwise
 */
record DrawnPrism(String name, String range, String boundaries, List<double[][]> rings) {

    /** {@return a GeoJSON file of prisms; {@code crs} is its member of that name with a line end, or nothing} */
    static String geoJson(String crs, Frame frame, DrawnPrism... prisms) {
        return Stream.of(prisms)
                .map(prism -> prism.feature(frame))
                .collect(Collectors.joining(
                        ",\n", "{\"type\": \"FeatureCollection\", " + crs + "\"features\": [\n", "\n]}\n"));
    }

    private String feature(Frame frame) {
        return """
                {"type": "Feature",
                 "properties": {"name": "%s", %s, "boundaries": %s},
                 "geometry": {"type": "Polygon", "coordinates": [%s]}}""".formatted(
                        name,
                        range,
                        boundaries,
                        rings.stream().map(ring -> ring(ring, frame)).collect(Collectors.joining(", ")));
    }

    private static String ring(double[][] vertices, Frame frame) {
        StringBuilder ring = new StringBuilder("[");
        for (double[] vertex : vertices) {
            ring.append(position(vertex, frame)).append(", ");
        }
        return ring.append(position(vertices[0], frame)).append(']').toString();
    }

    private static String position(double[] vertex, Frame frame) {
        return "[" + Digits.decimals(frame.mapX(vertex[0], vertex[1]), 1) + ", "
                + Digits.decimals(frame.mapY(vertex[0], vertex[1]), 1) + "]";
    }
}
