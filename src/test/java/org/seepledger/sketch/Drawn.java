package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import org.seepledger.prism.Side;

/** Shapes for tests, from plain coordinates or at random. */
public final class Drawn {

    private Drawn() {}

    /** Places from x and y by turns. */
    public static List<Place> places(double... coordinates) {
        List<Place> places = new ArrayList<>();
        for (int i = 0; i < coordinates.length; i += 2) {
            places.add(new Place(coordinates[i], coordinates[i + 1]));
        }
        return places;
    }

    /** An outline without boundaries. */
    public static Outline outline(double... coordinates) {
        return Outline.through(places(coordinates));
    }

    /** A box, counter-clockwise from the south-west. */
    public static Outline box(double west, double south, double east, double north) {
        return outline(west, south, east, south, east, north, west, north);
    }

    /** A shape of one ring. */
    public static Shape shape(String name, double... coordinates) {
        return Shape.of(name, outline(coordinates));
    }

    /** A star about a centre, counter-clockwise, with vertices at random distances that holds its centre, and some sides in boundaries. */
    public static Outline star(Random random, Place centre, double least, double most) {
        int count = 5 + random.nextInt(12);
        double turn = random.nextDouble();
        List<Corner> corners = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            double angle = 2 * Math.PI * (i + turn + 0.8 * random.nextDouble()) / count;
            double distance = least + (most - least) * random.nextDouble();
            Place place = centre.moved(distance * Math.cos(angle), distance * Math.sin(angle));
            corners.add(new Corner(place, boundary(random)));
        }
        return new Outline(corners);
    }

    private static Optional<String> boundary(Random random) {
        return Optional.of(List.of("", "", "river bank", "divide").get(random.nextInt(4)))
                .filter(name -> !name.isEmpty());
    }

    /** A star with perhaps an island, at coordinates as maps have them. */
    public static Shape starShape(Random random, String name) {
        Place centre = new Place(500_000 + 100 * random.nextDouble(), 5_200_000 + 100 * random.nextDouble());
        Shape shape = Shape.of(name, star(random, centre, 40, 100));
        return random.nextBoolean() ? shape : shape.with(star(random, centre, 3, 9));
    }

    /** What each side counts under, in the order in which a budget numbers them. */
    public static List<String> items(Shape shape) {
        return shape.rings().stream()
                .flatMap(ring -> ring.sides().stream())
                .map(Side::item)
                .toList();
    }

    /** A shape of parts, each without islands. */
    public static Shape ofParts(String name, Outline... outlines) {
        List<Part> parts = List.of(outlines).stream().map(Part::of).toList();
        return new Shape(name, "", parts, true, new Reach.Whole(), Map.of());
    }
}
