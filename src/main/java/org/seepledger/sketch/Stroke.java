package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.List;

/**
 * An outline or line while it is drawn, place by place.
 *
 * <p>The second press of a double-click lies within the reach of a drag from the first, and adds nothing; nor does a place
 * typed twice.
 *
 * @param places the places so far, none the same as the one before
 */
public record Stroke(List<Place> places) {

    /** Nothing drawn yet. */
    public static final Stroke EMPTY = new Stroke(List.of());

    /** Copies the list. */
    public Stroke {
        places = List.copyOf(places);
    }

    /**
     * {@return the stroke with another place, unless it ends there already}
     *
     * @param place the place
     */
    public Stroke to(Place place) {
        if (!places.isEmpty() && places.get(places.size() - 1).equals(place)) {
            return this;
        }
        List<Place> more = new ArrayList<>(places);
        more.add(place);
        return new Stroke(more);
    }

    /**
     * {@return the stroke with another place, unless that is no farther from its end than a press may wander before it is
     * a drag}
     *
     * @param place the place that was pressed
     * @param nearness how near counts
     */
    public Stroke to(Place place, Nearness nearness) {
        boolean again = !places.isEmpty() && !nearness.isDrag(places.get(places.size() - 1), place);
        return again ? this : to(place);
    }

    /** {@return the stroke with more places} */
    Stroke along(List<Place> more) {
        Stroke stroke = this;
        for (Place place : more) {
            stroke = stroke.to(place);
        }
        return stroke;
    }

    /**
     * {@return the stroke without its last place}
     */
    public Stroke back() {
        return places.isEmpty() ? this : new Stroke(places.subList(0, places.size() - 1));
    }

    /**
     * {@return the outline through the places, closed}
     *
     * @throws Refusal if fewer than three differ
     */
    public Outline closed() {
        return Outline.through(places);
    }
}
