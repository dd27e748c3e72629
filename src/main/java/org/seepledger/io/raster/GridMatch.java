package org.seepledger.io.raster;

import java.util.Optional;
import org.seepledger.aquifer.Grid;
import org.seepledger.fault.DataFault;

/** Whether a raster's cells are a grid's cells. */
public final class GridMatch {

    private static final String REMEDY =
            "Resample or cut the raster to the grid, for instance with gdalwarp -te -tr, or change the grid.";

    private GridMatch() {}

    /**
     * Compares a raster with a grid: its shape, and on an evenly spaced grid its georeference, to a hundredth of a cell.
     *
     * <p>On an uneven or turned grid, or without any georeference, the shape alone decides, row 1 being the northernmost.
     *
     * @param raster the raster
     * @param grid the grid
     * @return a note for the user where the shape alone decided
     * @throws DataFault if the raster does not match, with both places
     */
    public static Optional<String> check(GeoTiff raster, Grid grid) {
        Optional<Georeference> place = raster.georeference();
        boolean even = grid.x().isEven() && grid.y().isEven();
        boolean sameShape = raster.rows() == grid.rows() && raster.columns() == grid.columns();
        boolean lies = sameShape && even && place.isPresent() && liesOn(place.get(), grid);
        boolean free = place.isEmpty() || !even || isTurned(grid);
        if (!sameShape || !lies && !free) {
            String found = shown(raster.rows(), raster.columns(), place);
            throw new DataFault(
                    raster.shownName(),
                    sameShape ? "georeference" : "shape",
                    found,
                    "the grid's " + shown(grid),
                    REMEDY);
        }
        return lies ? Optional.empty() : Optional.of(note(raster, place, even));
    }

    private static boolean isTurned(Grid grid) {
        return grid.sine() != 0 || grid.cosine() != 1;
    }

    /** Both are linear, so that where the corners agree the rest does. */
    private static boolean liesOn(Georeference place, Grid grid) {
        double stepX = grid.x().edge(grid.columns()) / grid.columns();
        double stepY = grid.y().edge(grid.rows()) / grid.rows();
        boolean lies = true;
        for (int corner = 0; corner < 4; corner++) {
            int column = corner % 2 * grid.columns();
            int row = corner / 2 * grid.rows();
            double x = place.mapX(column, row);
            double y = place.mapY(column, row);
            double columnsOff = grid.localX(x, y) / stepX - column;
            double rowsOff = grid.localY(x, y) / stepY - (grid.rows() - row);
            lies &= Math.abs(columnsOff) <= Georeference.TOLERANCE && Math.abs(rowsOff) <= Georeference.TOLERANCE;
        }
        return lies;
    }

    private static String note(GeoTiff raster, Optional<Georeference> place, boolean even) {
        String why = place.isEmpty()
                ? "it has no georeference"
                : even ? "its georeference is not the turned grid's" : "the grid is unevenly spaced";
        return raster.shownName() + " is matched to the grid by its shape alone ("
                + shape(raster.rows(), raster.columns()) + ", row 1 northernmost): " + why;
    }

    private static String shown(Grid grid) {
        boolean even = grid.x().isEven() && grid.y().isEven();
        Georeference place = Georeference.of(grid, Optional.empty());
        return even
                ? shown(grid.rows(), grid.columns(), Optional.of(place))
                : shape(grid.rows(), grid.columns()) + ", unevenly spaced";
    }

    private static String shown(int rows, int columns, Optional<Georeference> place) {
        return shape(rows, columns) + ", "
                + place.map(known -> known.shown(rows)).orElse("no georeference");
    }

    private static String shape(int rows, int columns) {
        return rows + " rows × " + columns + " columns";
    }
}
