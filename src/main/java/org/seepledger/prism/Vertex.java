package org.seepledger.prism;

import org.locationtech.jts.geom.Coordinate;
import org.seepledger.aquifer.Grid;

/**
 * A vertex in both coordinate systems.
 *
 * @param x its local x
 * @param y its local y
 * @param mapX its map x
 * @param mapY its map y
 */
record Vertex(double x, double y, double mapX, double mapY) {

    /** {@return a place given in local coordinates} */
    static Vertex at(double x, double y, Grid grid) {
        return new Vertex(x, y, grid.mapX(x, y), grid.mapY(x, y));
    }

    /** {@return the local coordinates} */
    Coordinate local() {
        return new Coordinate(x, y);
    }

    /** {@return whether two are at the same local place} */
    boolean isAt(Vertex other) {
        return x == other.x && y == other.y;
    }
}
