package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.List;

/** Outlines by a few typed measures, counter-clockwise. */
public final class Figure {

    private Figure() {}

    /**
     * {@return the rectangle between two opposite corners}
     *
     * @param corner the one, its first vertex
     * @param opposite the other
     * @param degrees how far its sides are turned counter-clockwise, as a grid is; quarter turns keep the
     *     corners' coordinates
     * @throws Refusal if it would be a line
     */
    public static Outline rectangle(Place corner, Place opposite, double degrees) {
        boolean upright = degrees % 90 == 0;
        double cosine = upright ? 1 : Math.cos(Math.toRadians(degrees));
        double sine = upright ? 0 : Math.sin(Math.toRadians(degrees));
        double dx = opposite.x() - corner.x();
        double dy = opposite.y() - corner.y();
        double width = dx * cosine + dy * sine;
        double height = dy * cosine - dx * sine;
        if (width == 0 || height == 0) {
            throw new Refusal("A rectangle has a width and a height.");
        }
        Place along = upright ? new Place(opposite.x(), corner.y()) : corner.moved(width * cosine, width * sine);
        Place up = upright ? new Place(corner.x(), opposite.y()) : corner.moved(-height * sine, height * cosine);
        boolean turned = width * height < 0;
        return Outline.through(turned ? List.of(corner, up, opposite, along) : List.of(corner, along, opposite, up));
    }

    /**
     * {@return the circle of a radius as a polygon of the same area: its vertices lie a little outside of the circle, the
     * middles of its sides a little inside, so that what enters through the rim is shared out over the area that was
     * meant}
     *
     * @param centre the centre, a well say
     * @param radius the circle's radius, in plan units
     * @param vertices how many vertices; the first lies to the east
     * @throws Refusal if the radius is not positive, or there are fewer than three vertices
     */
    public static Outline circle(Place centre, double radius, int vertices) {
        checkRadius(radius);
        if (vertices < 3) {
            throw new Refusal("A circle is drawn with at least three vertices.");
        }
        double step = 2 * Math.PI / vertices;
        double reach = radius * Math.sqrt(step / Math.sin(step));
        List<Place> places = new ArrayList<>();
        for (int i = 0; i < vertices; i++) {
            places.add(centre.moved(reach * Math.cos(i * step), reach * Math.sin(i * step)));
        }
        return Outline.through(places);
    }

    static void checkRadius(double radius) {
        if (!(radius > 0) || Double.isInfinite(radius)) {
            throw new Refusal("A radius is a number above 0.");
        }
    }
}
