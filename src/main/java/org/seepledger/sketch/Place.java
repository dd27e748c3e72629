package org.seepledger.sketch;

import java.math.BigDecimal;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.locationtech.jts.geom.Coordinate;

/**
 * A place on the map.
 *
 * @param x its map x, in plan units
 * @param y its map y
 */
public record Place(double x, double y) {

    /** How far from the origin a coordinate may lie; files of prisms have the same limit. */
    public static final double FARTHEST = 1e12;

    private static final String NUMBER = "([-+]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][-+]?\\d{1,3})?)";
    private static final Pattern TYPED = Pattern.compile("\\s*" + NUMBER + "(?:\\s*[,;]\\s*|\\s+)" + NUMBER + "\\s*");
    private static final Pattern DECIMAL_COMMAS = Pattern.compile("[^,;]*,?[^,;]*;[^,;]*,?[^,;]*");

    /** Refuses what is no place that a file could hold. */
    public Place {
        if (!(Math.abs(x) <= FARTHEST) || !(Math.abs(y) <= FARTHEST)) {
            throw new Refusal("Coordinates lie within ±1e12.");
        }
        // One zero alone, so that equal coordinates are equal places.
        x += 0.0;
        y += 0.0;
    }

    /**
     * {@return the place that a person typed: x and y with a blank, comma or semicolon between; decimals may have a
     * comma where a semicolon separates}
     *
     * @param text what was typed
     * @throws Refusal if it is no place
     */
    public static Place typed(String text) {
        String plain = DECIMAL_COMMAS.matcher(text).matches() ? text.replace(',', '.') : text;
        Matcher typed = TYPED.matcher(plain);
        if (!typed.matches()) {
            throw new Refusal("Type x and y as two numbers, such as 500120.5, 5200340.");
        }
        return new Place(Double.parseDouble(typed.group(1)), Double.parseDouble(typed.group(2)));
    }

    /**
     * {@return how far another place is, in plan units}
     *
     * @param other the other
     */
    public double distance(Place other) {
        return Math.hypot(x - other.x, y - other.y);
    }

    /**
     * {@return the place moved}
     *
     * @param dx how far along x, in plan units
     * @param dy how far along y
     */
    public Place moved(double dx, double dy) {
        return new Place(x + dx, y + dy);
    }

    /**
     * {@return a place for a message, as {@code x 500000, y 5200000.5}}
     *
     * @param x its x, which may be none that a place can have
     * @param y its y
     */
    public static String shown(double x, double y) {
        return "x " + shown(x) + ", y " + shown(y);
    }

    private static String shown(double value) {
        boolean plain = value == 0 || Math.abs(value) >= 1e-6 && Math.abs(value) < 1e15;
        String text = plain ? new BigDecimal(Double.toString(value)).toPlainString() : Double.toString(value);
        return text.endsWith(".0") ? text.substring(0, text.length() - 2) : text;
    }

    /**
     * {@return the place on a side that is nearest to this one: an end to the last bit, and on an upright or level side
     * its coordinate and this place's other one}
     *
     * @param from where the side begins
     * @param to where it ends
     */
    public Place nearestOn(Place from, Place to) {
        double dx = to.x - from.x;
        double dy = to.y - from.y;
        if (dx == 0) {
            return new Place(from.x, between(from.y, to.y, y));
        }
        if (dy == 0) {
            return new Place(between(from.x, to.x, x), from.y);
        }
        double along = ((x - from.x) * dx + (y - from.y) * dy) / (dx * dx + dy * dy);
        if (along <= 0) {
            return from;
        }
        return along >= 1 ? to : new Place(from.x + along * dx, from.y + along * dy);
    }

    private static double between(double from, double to, double value) {
        return Math.max(Math.min(from, to), Math.min(Math.max(from, to), value));
    }

    /** {@return the place as the geometry library takes it} */
    Coordinate coordinate() {
        return new Coordinate(x, y);
    }

    /** {@return the place that the geometry library gives} */
    static Place of(Coordinate coordinate) {
        return new Place(coordinate.x, coordinate.y);
    }
}
