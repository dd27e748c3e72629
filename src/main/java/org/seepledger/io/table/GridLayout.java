package org.seepledger.io.table;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import org.seepledger.aquifer.Times;

/**
 * What the columns of a table of gridded values are for, and in which order its values are kept: value column, layer,
 * step, cell. What the table does not tell apart is kept once.
 */
final class GridLayout {

    private static final Set<String> PLACES = Set.of("x", "y", "row", "col", "layer", "interval", "instant");

    private final Header header;
    private final Placement placement;
    private final Optional<Ordinal> layer;
    private final Optional<Ordinal> step;
    private final StepKind kind;
    private final int layers;
    private final int steps;
    private final List<Integer> valueColumns;

    GridLayout(Header header, Frame frame) {
        this.header = header;
        this.placement = Placement.of(header, frame);
        this.layer = ordinal(header.known("layer"), 1, frame.layers(), "Layers count from 1, the uppermost.");
        this.kind = kind(header);
        this.step = step(frame.times());
        this.layers = layer.map(Ordinal::count).orElse(1);
        this.steps = step.map(Ordinal::count).orElse(1);
        this.valueColumns = header.others(PLACES);
        if (valueColumns.isEmpty()) {
            throw header.fault(
                    "no column of values", "at least one beside those of the place", "Add the column of values.");
        }
    }

    private static Optional<Ordinal> ordinal(OptionalInt column, int first, int count, String remedy) {
        return column.isPresent()
                ? Optional.of(new Ordinal(column.getAsInt(), first, count, remedy))
                : Optional.empty();
    }

    private static StepKind kind(Header header) {
        boolean intervals = header.known("interval").isPresent();
        boolean instants = header.known("instant").isPresent();
        if (intervals && instants) {
            throw header.fault("both interval and instant", "one of them", "Take one of the columns out.");
        }
        if (intervals) {
            return StepKind.INTERVAL;
        }
        return instants ? StepKind.INSTANT : StepKind.NONE;
    }

    private Optional<Ordinal> step(Times times) {
        return kind == StepKind.INSTANT
                ? ordinal(
                        header.known("instant"), 0, times.intervals() + 1, "Instants count from 0, the first of times.")
                : ordinal(
                        header.known("interval"),
                        1,
                        times.intervals(),
                        "Interval 1 lasts from the first to the second of times.");
    }

    Header header() {
        return header;
    }

    Placement placement() {
        return placement;
    }

    /** {@return the layer column, if any} */
    Optional<Ordinal> layer() {
        return layer;
    }

    /** {@return the interval or instant column, if any} */
    Optional<Ordinal> step() {
        return step;
    }

    StepKind kind() {
        return kind;
    }

    /** {@return the columns of values, in order} */
    List<Integer> valueColumns() {
        return valueColumns;
    }

    int layers() {
        return layers;
    }

    int steps() {
        return steps;
    }

    /** {@return how many values there are, or more than any table can have} */
    long size() {
        try {
            long planes = Math.multiplyExact((long) valueColumns.size() * layers, (long) steps);
            return Math.multiplyExact(planes, placement.count());
        } catch (ArithmeticException e) {
            return Long.MAX_VALUE;
        }
    }

    /**
     * {@return where the first value of a plane is kept}
     *
     * @param value the number of the value column among the value columns
     * @param layer the layer, from 0
     * @param step the step, from 0
     */
    long plane(int value, int layer, int step) {
        Objects.checkIndex(layer, layers);
        Objects.checkIndex(step, steps);
        return (((long) value * layers + layer) * steps + step) * placement.count();
    }
}
