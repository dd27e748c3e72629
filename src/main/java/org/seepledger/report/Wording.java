package org.seepledger.report;

import java.util.List;
import java.util.function.DoubleFunction;
import java.util.function.UnaryOperator;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.unit.Figures;
import org.seepledger.unit.Measure;

/** Numbers, units and lists of names as they stand in sentences: plain for a terminal, or typeset for page and window. */
public final class Wording {

    private static final int NAMES_SHOWN = 6;

    private final ResultUnits units;
    private final DoubleFunction<String> number;
    private final DoubleFunction<String> percent;
    private final boolean typeset;
    private final String space;

    private Wording(ResultUnits units, DoubleFunction<String> number, DoubleFunction<String> percent, boolean typeset) {
        this.units = units;
        this.number = number;
        this.percent = percent;
        this.typeset = typeset;
        this.space = typeset ? "\u00a0" : " ";
    }

    /**
     * {@return the wording of a terminal: letters that every terminal has}
     *
     * @param units the units to give
     */
    public static Wording plain(ResultUnits units) {
        return new Wording(units, Figures::shown, Figures::percent, false);
    }

    /**
     * {@return the wording of page and window}
     *
     * @param units the units to give
     */
    public static Wording typeset(ResultUnits units) {
        return new Wording(units, Figures::typeset, Figures::typesetPercent, true);
    }

    /**
     * {@return the wording of the window, with numbers in the form that its user wants}
     *
     * @param units the units to give
     * @param form turns a typeset number into that form
     */
    public static Wording typeset(ResultUnits units, UnaryOperator<String> form) {
        return new Wording(
                units,
                value -> form.apply(Figures.typeset(value)),
                value -> form.apply(Figures.typesetPercent(value)),
                true);
    }

    /**
     * {@return a mean rate with its unit}
     *
     * @param volume length³; kilograms in a solute's budget
     * @param duration the time that it took, in time units
     */
    public String rate(double volume, double duration) {
        return quantity(volume / duration * units.rateFactor(), unit(units.rate()));
    }

    /**
     * {@return a volume with its unit}
     *
     * @param volume length³; kilograms in a solute's budget
     */
    public String volume(double volume) {
        return quantity(volume * units.volumeFactor(), unit(units.volume()));
    }

    /**
     * {@return a number with a unit}
     *
     * @param value the number
     * @param unit the unit as it is written
     */
    public String quantity(double value, String unit) {
        return number.apply(value) + space + unit;
    }

    /**
     * {@return a number}
     *
     * @param value the number
     */
    public String number(double value) {
        return number.apply(value);
    }

    /**
     * {@return a percentage}
     *
     * @param value in percent
     */
    public String percent(double value) {
        return percent.apply(value);
    }

    /**
     * {@return a unit, its powers raised where it is typeset}
     *
     * @param unit the unit
     */
    public String unit(Measure unit) {
        return typeset ? raised(unit) : unit.toString();
    }

    /**
     * {@return a unit with its powers raised}
     *
     * @param unit the unit
     */
    public static String raised(Measure unit) {
        return unit.toString().replaceAll("(?<=[A-Za-z])2\\b", "²").replaceAll("(?<=[A-Za-z])3\\b", "³");
    }

    /**
     * {@return a name in quotation marks}
     *
     * @param name the name
     */
    public String quoted(String name) {
        return typeset ? "\u201c" + name + "\u201d" : "\"" + name + "\"";
    }

    /**
     * {@return how many there are of something}
     *
     * @param count how many
     * @param what one of them
     */
    public static String counted(int count, String what) {
        return count + " " + what + (count == 1 ? "" : "s");
    }

    /**
     * {@return names in a row, the first few of many}
     *
     * @param names the names
     */
    public static String listed(List<String> names) {
        if (names.size() > NAMES_SHOWN) {
            return String.join(", ", names.subList(0, NAMES_SHOWN - 1)) + " and " + (names.size() - NAMES_SHOWN + 1)
                    + " more";
        }
        int last = names.size() - 1;
        return last < 1
                ? String.join("", names)
                : String.join(", ", names.subList(0, last)) + " and " + names.get(last);
    }
}
