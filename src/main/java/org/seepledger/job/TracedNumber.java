package org.seepledger.job;

import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.seepledger.io.result.MassUnits;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Period;
import org.seepledger.unit.Measure;

/**
 * A number of a budget and the stored values that it rests on.
 *
 * @param row its row, as {@code PRISM/PERIOD/GROUP/ITEM/LAYER}
 * @param period its period
 * @param net its net rate
 * @param units the units that it is read in; the rate's is that of the number
 * @param sum what value × weight of all values adds up to
 * @param count how many values there are
 * @param largest those that contribute the most, the largest first
 */
public record TracedNumber(
        String row, Period period, double net, Units units, double sum, long count, List<Line> largest) {

    /** Copies the list. */
    public TracedNumber {
        largest = List.copyOf(largest);
    }

    /**
     * The units that a number is read in.
     *
     * @param rate the unit of rates
     * @param rateFactor how many of it one of the set's own rates is
     * @param amount the unit of volumes, or of masses of solutes
     * @param amountFactor how many of it one of the set's own is
     */
    public record Units(Measure rate, double rateFactor, Measure amount, double amountFactor) {

        /**
         * {@return the units of water}
         *
         * @param units the units of results
         */
        public static Units of(ResultUnits units) {
            return new Units(units.rate(), units.rateFactor(), units.volume(), units.volumeFactor());
        }

        /**
         * {@return the units of solutes}
         *
         * @param units the units of results
         */
        public static Units of(MassUnits units) {
            return new Units(units.rate(), units.rateFactor(), units.mass(), units.massFactor());
        }
    }

    /** {@return what flowed over the period, in the unit of amounts} */
    public double amount() {
        return net / units.rateFactor() * period.duration() * units.amountFactor();
    }

    /**
     * A stored value.
     *
     * @param file the file as the set names it
     * @param place where in it
     * @param value the number that stands there
     * @param weight what the rate grows by for each unit of it
     */
    public record Line(String file, String place, double value, double weight) {

        private static final Pattern CELL = Pattern.compile("row (\\d+), col (\\d+)$");

        /** {@return value × weight} */
        public double contribution() {
            return value * weight;
        }

        /** {@return the cell that the value belongs to, if it belongs to one} */
        public Optional<Cell> cell() {
            Matcher cell = CELL.matcher(place);
            return cell.find()
                    ? Optional.of(new Cell(Integer.parseInt(cell.group(1)) - 1, Integer.parseInt(cell.group(2)) - 1))
                    : Optional.empty();
        }
    }

    /**
     * A cell of the grid in plan.
     *
     * @param row from 0 in the north
     * @param column from 0
     */
    public record Cell(int row, int column) {}

    /** {@return what the values that are not among the largest contribute together} */
    public double rest() {
        return sum - largest.stream().mapToDouble(Line::contribution).sum();
    }
}
