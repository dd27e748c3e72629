package org.seepledger.prism;

import java.util.Optional;

/**
 * The rectangle of the grid in local coordinates, from (0, 0) to (width, height), and the way counter-clockwise round
 * it: south edge 0, east edge 1, north edge 2, west edge 3, each with its end but without its beginning; the corner
 * (0, 0) belongs to the south edge.
 *
 * @param width its length along x
 * @param height its length along y
 */
record Perimeter(double width, double height) {

    /**
     * A place on the way round.
     *
     * @param edge 0 to 3
     * @param along the distance from the edge's beginning
     */
    record Position(int edge, double along) implements Comparable<Position> {

        @Override
        public int compareTo(Position other) {
            int order = Integer.compare(edge, other.edge);
            return order != 0 ? order : Double.compare(along, other.along);
        }
    }

    /**
     * The part of a line that lies in the rectangle.
     *
     * @param fromX local x where it begins
     * @param fromY local y where it begins
     * @param toX local x where it ends
     * @param toY local y where it ends
     */
    record Piece(double fromX, double fromY, double toX, double toY) {}

    /** {@return whether a place is in the rectangle or on it} */
    boolean holds(Vertex place) {
        return place.x() >= 0 && place.x() <= width && place.y() >= 0 && place.y() <= height;
    }

    /** {@return where on the way round a place on the rectangle is} */
    Position position(Vertex place) {
        if (place.y() == 0) {
            return new Position(0, place.x());
        }
        if (place.x() == width) {
            return new Position(1, place.y());
        }
        return place.y() == height ? new Position(2, width - place.x()) : new Position(3, height - place.y());
    }

    /** {@return the local x of the corner where an edge ends} */
    double cornerX(int edge) {
        return edge == 0 || edge == 1 ? width : 0;
    }

    /** {@return the local y of the corner where an edge ends} */
    double cornerY(int edge) {
        return edge == 1 || edge == 2 ? height : 0;
    }

    /**
     * {@return the piece of a directed line that has the rectangle's inside at its left, or nothing: where the line
     * misses the rectangle, touches it at a point, or runs along it with the inside at its right}
     */
    Optional<Piece> piece(Vertex from, Vertex to) {
        if (from.y() == to.y() && (from.y() == 0 || from.y() == height)) {
            return along(from.x(), to.x(), width, from.y() == 0)
                    .map(ends -> new Piece(ends[0], from.y(), ends[1], from.y()));
        }
        if (from.x() == to.x() && (from.x() == 0 || from.x() == width)) {
            return along(from.y(), to.y(), height, from.x() == width)
                    .map(ends -> new Piece(from.x(), ends[0], from.x(), ends[1]));
        }
        boolean turned = from.x() > to.x() || from.x() == to.x() && from.y() > to.y();
        return turned ? across(to, from).map(Perimeter::turned) : across(from, to);
    }

    /** The piece of a line along an edge, whose counter-clockwise direction is toward larger numbers or smaller ones. */
    private static Optional<double[]> along(double from, double to, double length, boolean rising) {
        double begin = Math.min(length, Math.max(0, from));
        double end = Math.min(length, Math.max(0, to));
        boolean kept = rising ? begin < end : begin > end;
        return kept ? Optional.of(new double[] {begin, end}) : Optional.empty();
    }

    /** The piece of a line with rising x, by the parameters where it enters and leaves (Liang and Barsky 1984). */
    private Optional<Piece> across(Vertex from, Vertex to) {
        double dx = to.x() - from.x();
        double dy = to.y() - from.y();
        double enter = Math.max(0, Math.max(first(from.x(), dx, width), first(from.y(), dy, height)));
        double leave = Math.min(1, Math.min(last(from.x(), dx, width), last(from.y(), dy, height)));
        if (!(enter < leave)) {
            return Optional.empty();
        }
        Piece piece = new Piece(
                at(from.x(), dx, to.x(), width, enter),
                at(from.y(), dy, to.y(), height, enter),
                at(from.x(), dx, to.x(), width, leave),
                at(from.y(), dy, to.y(), height, leave));
        boolean point = piece.fromX == piece.toX && piece.fromY == piece.toY;
        return point ? Optional.empty() : Optional.of(piece);
    }

    private static double first(double from, double step, double length) {
        if (step == 0) {
            return from < 0 || from > length ? Double.POSITIVE_INFINITY : Double.NEGATIVE_INFINITY;
        }
        return ((step > 0 ? 0 : length) - from) / step;
    }

    private static double last(double from, double step, double length) {
        return step == 0 ? Double.POSITIVE_INFINITY : ((step > 0 ? length : 0) - from) / step;
    }

    /** The coordinate at a parameter: the end's own at an end, exactly the edge's where the parameter is the edge's. */
    private static double at(double from, double step, double to, double length, double parameter) {
        if (parameter == 0 || parameter == 1) {
            return parameter == 0 ? from : to;
        }
        if (step != 0 && parameter == -from / step) {
            return 0;
        }
        if (step != 0 && parameter == (length - from) / step) {
            return length;
        }
        return Math.min(length, Math.max(0, from + step * parameter));
    }

    private static Piece turned(Piece piece) {
        return new Piece(piece.toX, piece.toY, piece.fromX, piece.fromY);
    }
}
