package org.seepledger.unit;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javax.measure.IncommensurableException;
import javax.measure.MetricPrefix;
import javax.measure.Unit;
import javax.measure.quantity.Length;
import javax.measure.quantity.Mass;
import tech.units.indriya.AbstractUnit;
import tech.units.indriya.unit.Units;

/**
 * A unit as a user writes it: {@code m/d}, {@code mm/yr}, {@code acre-ft/yr}, {@code mg/L}.
 *
 * <p>Powers are a digit after a length ({@code ft3}); at most one {@code /}. {@code cfs}, {@code gpm} and {@code AF} are
 * understood too, and the Greek letter for {@code u}. Two measures are equal when they are written the same.
 */
public final class Measure {

    private static final Unit<Length> INTERNATIONAL_FOOT =
            Units.METRE.multiply(3048).divide(10000).asType(Length.class);
    private static final Map<String, Unit<Length>> LENGTHS = lengths();
    private static final Map<String, Unit<?>> NAMED = named();
    private static final Map<String, String> SPOKEN = Map.of("cfs", "ft3/s", "gpm", "gal/min", "AF", "acre-ft");
    private static final Pattern POWER = Pattern.compile("([A-Za-z]+)([23])");

    private final String text;
    private final Unit<?> unit;

    private Measure(String text, Unit<?> unit) {
        this.text = text;
        this.unit = unit;
    }

    /**
     * {@return the unit that a text names}
     *
     * @param text the text, surrounding blanks allowed
     * @throws IllegalArgumentException if it names none; the message lists what can be written
     */
    public static Measure of(String text) {
        String written = text.strip().replace('\u00b5', 'u').replace('\u03bc', 'u');
        String[] terms = SPOKEN.getOrDefault(written, written).split("/", -1);
        if (terms.length > 2) {
            throw unknown(written);
        }
        Unit<?> unit = term(terms[0].strip(), written);
        if (terms.length == 2) {
            unit = unit.divide(term(terms[1].strip(), written));
        }
        return new Measure(written, unit);
    }

    /**
     * {@return the unit of nothing: a plain number}
     */
    public static Measure number() {
        return new Measure("1", AbstractUnit.ONE);
    }

    /**
     * {@return a power of a length unit, as {@code m3} of {@code m}}
     *
     * @param length a length unit
     * @param power 1, 2 or 3
     */
    public static Measure power(Measure length, int power) {
        return power == 1 ? length : of(length.text + power);
    }

    /**
     * {@return this unit over another, as {@code m3/d}}
     *
     * @param other the divisor, without a {@code /} of its own
     */
    public Measure per(Measure other) {
        return new Measure(text + "/" + other.text, unit.divide(other.unit));
    }

    /**
     * {@return whether a value in this unit can be given in the other}
     *
     * @param other the other unit
     */
    public boolean isCompatible(Measure other) {
        return unit.getDimension().equals(other.unit.getDimension());
    }

    /**
     * {@return how many of the other unit one of this unit is, correctly rounded}
     *
     * @param other the other unit
     * @throws IllegalArgumentException if the two measure different things
     */
    public double in(Measure other) {
        if (!isCompatible(other)) {
            throw new IllegalArgumentException("\"" + text + "\" cannot be given in \"" + other.text + "\"");
        }
        try {
            return unit.getConverterToAny(other.unit).convert((Number) 1L).doubleValue();
        } catch (IncommensurableException e) {
            throw new IllegalArgumentException(e);
        }
    }

    /**
     * {@return what may be written, as one line}
     */
    public static String choices() {
        return "lengths m cm mm km ft ftUS in mi; areas also ha acre; volumes m3 L ML GL hm3 km3 ft3 gal Mgal acre-ft; "
                + "times s min h d yr; masses ng ug mg g kg t lb; and one over another, as m3/d";
    }

    private static Unit<?> term(String term, String whole) {
        Unit<?> named = NAMED.get(term);
        if (named != null) {
            return named;
        }
        Unit<Length> length = LENGTHS.get(term);
        if (length != null) {
            return length;
        }
        Matcher power = POWER.matcher(term);
        if (power.matches() && LENGTHS.containsKey(power.group(1))) {
            return LENGTHS.get(power.group(1)).pow(Integer.parseInt(power.group(2)));
        }
        throw unknown(whole);
    }

    private static IllegalArgumentException unknown(String text) {
        return new IllegalArgumentException("\"" + text + "\" is not a known unit; known are " + choices());
    }

    private static Map<String, Unit<Length>> lengths() {
        Map<String, Unit<Length>> units = new LinkedHashMap<>();
        units.put("m", Units.METRE);
        units.put("cm", MetricPrefix.CENTI(Units.METRE));
        units.put("mm", MetricPrefix.MILLI(Units.METRE));
        units.put("km", MetricPrefix.KILO(Units.METRE));
        units.put("ft", INTERNATIONAL_FOOT);
        units.put("ftUS", Units.METRE.multiply(1200).divide(3937).asType(Length.class));
        units.put("in", INTERNATIONAL_FOOT.divide(12));
        units.put("mi", INTERNATIONAL_FOOT.multiply(5280));
        return units;
    }

    private static Map<String, Unit<?>> named() {
        Map<String, Unit<?>> units = new LinkedHashMap<>();
        units.put("1", AbstractUnit.ONE);
        Unit<?> cubicMetre = Units.METRE.pow(3);
        units.put("ha", Units.METRE.pow(2).multiply(10_000));
        units.put("acre", INTERNATIONAL_FOOT.pow(2).multiply(43_560));
        units.put("L", cubicMetre.divide(1_000));
        units.put("ML", cubicMetre.multiply(1_000));
        units.put("GL", cubicMetre.multiply(1_000_000));
        units.put("hm3", cubicMetre.multiply(1_000_000));
        units.put("gal", INTERNATIONAL_FOOT.divide(12).pow(3).multiply(231));
        units.put("Mgal", INTERNATIONAL_FOOT.divide(12).pow(3).multiply(231_000_000));
        units.put("acre-ft", INTERNATIONAL_FOOT.pow(3).multiply(43_560));
        units.put("s", Units.SECOND);
        units.put("min", Units.SECOND.multiply(60));
        units.put("h", Units.SECOND.multiply(3_600));
        units.put("d", Units.SECOND.multiply(86_400));
        units.put("yr", Units.SECOND.multiply(31_557_600));
        Unit<Mass> gram = Units.GRAM;
        units.put("ng", gram.divide(1_000_000_000));
        units.put("ug", gram.divide(1_000_000));
        units.put("mg", gram.divide(1_000));
        units.put("g", gram);
        units.put("kg", Units.KILOGRAM);
        units.put("t", Units.KILOGRAM.multiply(1_000));
        units.put("lb", Units.KILOGRAM.multiply(45_359_237).divide(100_000_000));
        return units;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Measure measure && text.equals(measure.text);
    }

    @Override
    public int hashCode() {
        return text.hashCode();
    }

    /** {@return the unit as the user wrote it} */
    @Override
    public String toString() {
        return text;
    }
}
