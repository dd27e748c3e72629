package org.seepledger.io.table;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.Set;
import java.util.function.Consumer;
import org.seepledger.aquifer.PointRate;
import org.seepledger.fault.DataFault;
import org.seepledger.io.table.SpanReader.Span;
import org.seepledger.unit.Measure;

/**
 * A table of points, as wells: {@code name,x,y,layer,from,to,rate}.
 *
 * <p>In place of {@code layer} a line may give {@code screen_top} and {@code screen_bottom}, in place of {@code rate}
 * the {@code volume} between {@code from} and {@code to}. {@code category}, {@code from} and {@code to} may be left out
 * or empty; so may {@code layer} where there is but one.
 */
public final class PointsTable {

    private static final long MOST_LINES = 2_000_000;
    private static final Set<String> COLUMNS = Set.of(
            "name", "x", "y", "layer", "screen_top", "screen_bottom", "from", "to", "rate", "volume", "category");

    private final TableReader table;
    private final String category;
    private final Frame frame;
    private final PointAmount amount;
    private final SpanReader spans;
    private final int nameColumn;
    private final int xColumn;
    private final int yColumn;
    private final OptionalInt categoryColumn;
    private final PointScreen screen;

    private PointsTable(TableReader table, String category, Frame frame, Measure lengthUnit, Measure rateUnit) {
        this.table = table;
        this.category = category;
        this.frame = frame;
        this.spans = new SpanReader(table, frame.times());
        Header header = table.header();
        this.nameColumn = header.required("name");
        this.xColumn = plan(header, "x", lengthUnit);
        this.yColumn = plan(header, "y", lengthUnit);
        this.categoryColumn = header.known("category");
        this.screen = new PointScreen(table, frame.layers(), lengthUnit);
        this.amount = new PointAmount(table, lengthUnit, frame.times().unit(), rateUnit);
    }

    /** Coordinates are in the map's unit; a header that names another would be misread. */
    private int plan(Header header, String name, Measure lengthUnit) {
        int column = header.required(name);
        double planUnit = frame.grid().planUnit();
        boolean same = header.unit(column).isEmpty()
                || Math.abs(header.factor(column, lengthUnit, lengthUnit) - planUnit) <= 1e-9 * planUnit;
        if (!same) {
            throw header.fault(
                    column,
                    "coordinates in " + header.unit(column).orElseThrow(),
                    "map coordinates, in the unit of the grid",
                    "Give the coordinates of the aquifer's crs.");
        }
        return column;
    }

    /**
     * {@return the points, in the order of the lines}
     *
     * @param file the file
     * @param shownName the file as the user named it
     * @param category what a line without a category counts as
     * @param frame the grid, layers and times
     * @param lengthUnit the set's length unit; elevations without a unit are in it, volumes in its cube
     * @param rateUnit what rates without a unit in the header are in
     * @param warnings receives a sentence for each thing that is doubtful
     * @throws DataFault if the file cannot be read, something is missing or not what it should be, or a point is
     *     outside the grid
     */
    public static List<PointRate> read(
            Path file,
            String shownName,
            String category,
            Frame frame,
            Measure lengthUnit,
            Measure rateUnit,
            Consumer<String> warnings) {
        try (TableReader table = TableReader.open(file, shownName, MOST_LINES)) {
            PointsTable points = new PointsTable(table, category, frame, lengthUnit, rateUnit);
            List<PointRate> rates = new ArrayList<>();
            while (table.next()) {
                rates.add(points.point());
            }
            table.header().warnOfUnused(COLUMNS, warnings);
            points.spans.warn(warnings);
            return List.copyOf(rates);
        }
    }

    private PointRate point() {
        double x = table.required(xColumn, "Give the map coordinates of the point.");
        double y = table.required(yColumn, "Give the map coordinates of the point.");
        checkInside(x, y);
        Span span = spans.span();
        return new PointRate(
                table.name(nameColumn),
                category(),
                x,
                y,
                screen.read(),
                span.from(),
                span.to(),
                amount.rate(span),
                table.place(),
                amount.given(span));
    }

    private void checkInside(double x, double y) {
        if (!frame.grid().holds(x, y)) {
            throw table.fault(
                    "a point outside the grid, at x " + CsvText.number(x) + ", y " + CsvText.number(y),
                    "one on the grid, " + frame.extent(),
                    "Check the coordinates and their crs, or take the line out.");
        }
    }

    private String category() {
        String own = categoryColumn.isPresent() ? table.text(categoryColumn.getAsInt()) : "";
        return own.isEmpty() ? category : own;
    }
}
