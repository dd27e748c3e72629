package org.seepledger.balance;

import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.Window;
import org.seepledger.fault.DataFault;
import org.seepledger.prism.Coverage;
import org.seepledger.prism.PrismCut;
import org.seepledger.prism.VerticalRange;

/** Finds the layers that a prism between two elevations touches anywhere. */
final class TouchedLayers {

    private final Aquifer aquifer;
    private final PrismCut cut;
    private int first = Integer.MAX_VALUE;
    private int last = -1;

    private TouchedLayers(Aquifer aquifer, PrismCut cut) {
        this.aquifer = aquifer;
        this.cut = cut;
    }

    static VerticalRange.Layers of(Aquifer aquifer, PrismCut cut, VerticalRange.Elevations range) {
        TouchedLayers touched = new TouchedLayers(aquifer, cut);
        Window whole = cut.coverage().window();
        for (int row = whole.row(); row < whole.rowEnd(); row++) {
            touched.addRow(range, new Window(row, whole.column(), 1, whole.columns()));
        }
        if (touched.last < 0) {
            throw touched.fault("a top and bottom between which no layer lies", "a range that meets the grid");
        }
        return new VerticalRange.Layers(touched.first, touched.last);
    }

    private void addRow(VerticalRange.Elevations range, Window row) {
        CellGeometry geometry = CellGeometry.of(aquifer.grid(), aquifer.layers(), row);
        Elevations elevations = new Elevations(range, row);
        Coverage coverage = cut.coverage();
        for (int column = coverage.firstColumn(row.row()); column < coverage.columnEnd(row.row()); column++) {
            if (coverage.share(row.row(), column) != 0) {
                addColumn(geometry, elevations, row.row(), column);
            }
        }
    }

    private void addColumn(CellGeometry geometry, Elevations elevations, int row, int column) {
        double top = elevations.top(row, column);
        double bottom = elevations.bottom(row, column);
        if (Double.isNaN(top) || Double.isNaN(bottom)) {
            throw fault(
                    "no elevation of the top or bottom at row " + (row + 1) + ", column " + (column + 1),
                    "a value in each cell that the prism touches");
        }
        for (int layer = 0; layer < geometry.block().layers(); layer++) {
            int cell = geometry.block().cell(layer, row, column);
            if (geometry.isPresent(cell) && bottom < geometry.top(cell) && top > geometry.bottom(cell)) {
                first = Math.min(first, layer);
                last = Math.max(last, layer);
            }
        }
    }

    private DataFault fault(String found, String expected) {
        return new DataFault(
                "prism \"" + cut.prism().name() + "\"", "", found, expected, "Correct the prism's top or bottom.");
    }
}
