package org.seepledger.sketch;

import java.util.Optional;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Side;

/**
 * A vertex of an outline, and the side from it to the next.
 *
 * @param place where it is
 * @param boundary the name that the side counts under, if the user gave it one
 */
public record Corner(Place place, Optional<String> boundary) {

    /** Refuses a name that no boundary may have. */
    public Corner {
        boundary.ifPresent(Names::checkBoundary);
    }

    /**
     * {@return a vertex whose side counts under its own name}
     *
     * @param x its map x
     * @param y its map y
     */
    public static Corner at(double x, double y) {
        return new Corner(new Place(x, y), Optional.empty());
    }

    /** {@return the corner that a side begins at; the sides that clipping made have no boundary} */
    static Corner of(Side side) {
        boolean own = side.item().equals(side.name()) || side.item().equals(Prism.GRID_EDGE);
        return new Corner(new Place(side.x(), side.y()), own ? Optional.empty() : Optional.of(side.item()));
    }

    Corner to(Place other) {
        return new Corner(other, boundary);
    }

    Corner under(Optional<String> name) {
        return new Corner(place, name);
    }
}
