package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.locationtech.jts.algorithm.LineIntersector;
import org.locationtech.jts.algorithm.RobustLineIntersector;
import org.locationtech.jts.geom.Envelope;

/**
 * Cuts two sets of links where they meet, so that afterwards they have whole stretches in common, or nothing but ends.
 *
 * <p>First the ends of the second set that lie near an end of the first are put on it. Then each end that lies near a
 * link of the other set becomes a place where that link is cut; the coordinates are those of the end. Only where two
 * links cross elsewhere is a place computed, once for both. Links of one set do not cross each other.
 *
 * <p>Work is the product of the numbers of links; enough for what is drawn by hand and for one edit of what is imported.
 */
final class Noding {

    private final double near;

    /**
     * Cuts links.
     *
     * @param near how near two places count as one, in plan units
     */
    Noding(double near) {
        this.near = near;
    }

    /**
     * Two sets of links that meet at ends alone.
     *
     * @param first the one
     * @param second the other
     */
    record Noded(List<Link> first, List<Link> second) {}

    Noded of(List<Link> first, List<Link> given) {
        List<Link> second = onto(first, given);
        List<List<Place>> firstStops = stops(first);
        List<List<Place>> secondStops = stops(second);
        for (int i = 0; i < first.size(); i++) {
            Envelope reach = envelope(first.get(i));
            reach.expandBy(near);
            for (int j = 0; j < second.size(); j++) {
                if (reach.intersects(envelope(second.get(j)))) {
                    meet(first.get(i), firstStops.get(i), second.get(j), secondStops.get(j));
                }
            }
        }
        return new Noded(cut(first, firstStops), cut(second, secondStops));
    }

    /**
     * {@return whether two links of one line meet where they should not}
     *
     * @param next whether they may have one end in common
     */
    boolean meetBeyondEnds(Link one, Link other, boolean next) {
        List<Place> onOne = new ArrayList<>();
        List<Place> onOther = new ArrayList<>();
        meet(one, onOne, other, onOther);
        boolean shared = Stream.of(one.from(), one.to()).anyMatch(List.of(other.from(), other.to())::contains);
        return !onOne.isEmpty() || !onOther.isEmpty() || shared && !next || one.equals(other.reversed());
    }

    private List<Link> onto(List<Link> first, List<Link> given) {
        List<Place> ends = first.stream().map(Link::from).distinct().toList();
        return given.stream()
                .map(link -> new Link(onto(ends, link.from()), onto(ends, link.to()), link.boundary()))
                .filter(link -> !link.from().equals(link.to()))
                .toList();
    }

    private Place onto(List<Place> ends, Place place) {
        return ends.stream()
                .filter(end -> end.distance(place) <= near)
                .min(Comparator.comparingDouble(place::distance))
                .orElse(place);
    }

    private void meet(Link one, List<Place> oneStops, Link other, List<Place> otherStops) {
        boolean touch = touch(one, other.from(), oneStops);
        touch |= touch(one, other.to(), oneStops);
        touch |= touch(other, one.from(), otherStops);
        touch |= touch(other, one.to(), otherStops);
        if (!touch) {
            crossing(one, other).ifPresent(place -> {
                oneStops.add(place);
                otherStops.add(place);
            });
        }
    }

    /** Notes a place that lies on a link; tells whether it does. */
    private boolean touch(Link link, Place place, List<Place> stops) {
        if (place.equals(link.from()) || place.equals(link.to())) {
            return true;
        }
        boolean on = place.distance(place.nearestOn(link.from(), link.to())) <= near;
        if (on) {
            stops.add(place);
        }
        return on;
    }

    private static Optional<Place> crossing(Link one, Link other) {
        LineIntersector intersector = new RobustLineIntersector();
        intersector.computeIntersection(
                one.from().coordinate(),
                one.to().coordinate(),
                other.from().coordinate(),
                other.to().coordinate());
        return intersector.hasIntersection() ? Optional.of(Place.of(intersector.getIntersection(0))) : Optional.empty();
    }

    private static List<List<Place>> stops(List<Link> links) {
        List<List<Place>> stops = new ArrayList<>();
        links.forEach(link -> stops.add(new ArrayList<>()));
        return stops;
    }

    private static List<Link> cut(List<Link> links, List<List<Place>> stops) {
        List<Link> pieces = new ArrayList<>();
        for (int i = 0; i < links.size(); i++) {
            Link link = links.get(i);
            Set<Place> places = Set.copyOf(stops.get(i));
            List<Place> along = places.stream()
                    .sorted(Comparator.comparingDouble(link.from()::distance))
                    .toList();
            List<Place> all = Stream.of(List.of(link.from()), along, List.of(link.to()))
                    .flatMap(List::stream)
                    .toList();
            Link.along(all).stream()
                    .filter(piece -> !piece.from().equals(piece.to()))
                    .forEach(piece -> pieces.add(new Link(piece.from(), piece.to(), link.boundary())));
        }
        return pieces;
    }

    private static Envelope envelope(Link link) {
        return new Envelope(link.from().coordinate(), link.to().coordinate());
    }
}
