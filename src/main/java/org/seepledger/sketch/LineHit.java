package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * What of the transects lies under the pointer: a vertex before a segment, the nearest of each.
 *
 * @param line the transect's name
 * @param onVertex whether it is a vertex, rather than a segment
 * @param index the vertex or segment, from 0
 * @param place the vertex, or the place on the segment that is nearest to the pointer
 */
public record LineHit(String line, boolean onVertex, int index, Place place) {

    /**
     * {@return what lies under the pointer, if anything}
     *
     * @param lines the transects
     * @param pointer the place that it points to
     * @param nearness how near counts
     */
    public static Optional<LineHit> at(List<ControlLine> lines, Place pointer, Nearness nearness) {
        List<LineHit> vertices = new ArrayList<>();
        List<LineHit> segments = new ArrayList<>();
        for (ControlLine line : lines) {
            List<Place> places = line.places();
            for (int i = 0; i < places.size(); i++) {
                vertices.add(new LineHit(line.name(), true, i, places.get(i)));
                if (i > 0) {
                    Place on = pointer.nearestOn(places.get(i - 1), places.get(i));
                    segments.add(new LineHit(line.name(), false, i - 1, on));
                }
            }
        }
        return nearest(vertices, pointer, nearness.vertex()).or(() -> nearest(segments, pointer, nearness.edge()));
    }

    private static Optional<LineHit> nearest(List<LineHit> hits, Place pointer, double radius) {
        return hits.stream()
                .filter(hit -> hit.place.distance(pointer) <= radius)
                .min(Comparator.comparingDouble(hit -> hit.place.distance(pointer)));
    }
}
