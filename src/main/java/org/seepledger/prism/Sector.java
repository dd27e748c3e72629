package org.seepledger.prism;

/**
 * Areas in a unit cell as seen from a place in it.
 *
 * <p>A well's field in its cell is radial, with no flow through the cell's faces and uniform divergence but for the well:
 * through a piece of boundary it carries the well's rate times the share of the cell that lies behind the piece. Shares
 * of area do not depend on the cell's proportions, so the unit cell serves for all.
 *
 * @param across the place, from 0 in the west to 1 in the east
 * @param up the place, from 0 in the south to 1 in the north
 */
record Sector(double across, double up) {

    private static final double[][] CORNERS = {{1, 0}, {1, 1}, {0, 1}, {0, 0}};

    /** The signed area behind a piece from P to Q: positive where the piece runs counter-clockwise about the place. */
    double behind(double px, double py, double qx, double qy) {
        double doubled = cross(px - across, py - up, qx - across, qy - up);
        if (doubled == 0) {
            return 0;
        }
        return doubled > 0 ? sector(px, py, qx, qy) - 0.5 * doubled : -(sector(qx, qy, px, py) + 0.5 * doubled);
    }

    /** The area between two rays out to the cell's faces, from the ray through P counter-clockwise to the one through Q. */
    private double sector(double px, double py, double qx, double qy) {
        double from = perimeterPlace(px, py);
        double to = perimeterPlace(qx, qy);
        if (to < from && from - to < 0.5 && (px - across) * (qx - across) + (py - up) * (qy - up) > 0) {
            // Two rays as good as one, put in the wrong order by rounding: not the whole way round.
            return 0;
        }
        double end = to < from ? to + 4 : to;
        double x = perimeterX(from);
        double y = perimeterY(from);
        double doubled = 0;
        for (int corner = (int) Math.floor(from) + 1; corner <= end; corner++) {
            double[] next = CORNERS[(corner - 1) % 4];
            doubled += cross(x - across, y - up, next[0] - across, next[1] - up);
            x = next[0];
            y = next[1];
        }
        doubled += cross(x - across, y - up, perimeterX(to) - across, perimeterY(to) - up);
        return 0.5 * doubled;
    }

    /** Where a ray through a point meets the faces: 0–1 along the south face, 1–2 up the east, 2–3 back, 3–4 down. */
    private double perimeterPlace(double x, double y) {
        double dx = x - across;
        double dy = y - up;
        double toSide = dx > 0 ? (1 - across) / dx : dx < 0 ? -across / dx : Double.POSITIVE_INFINITY;
        double toLevel = dy > 0 ? (1 - up) / dy : dy < 0 ? -up / dy : Double.POSITIVE_INFINITY;
        if (toSide <= toLevel) {
            double level = clamped(up + toSide * dy);
            return dx > 0 ? 1 + level : 4 - level;
        }
        double along = clamped(across + toLevel * dx);
        return dy > 0 ? 3 - along : along;
    }

    private static double clamped(double place) {
        return Math.min(1, Math.max(0, place));
    }

    private static double perimeterX(double place) {
        if (place <= 1) {
            return place;
        }
        return place <= 2 ? 1 : Math.max(0, 3 - place);
    }

    private static double perimeterY(double place) {
        if (place <= 1) {
            return 0;
        }
        if (place <= 2) {
            return place - 1;
        }
        return place <= 3 ? 1 : 4 - place;
    }

    private static double cross(double ax, double ay, double bx, double by) {
        return ax * by - ay * bx;
    }
}
