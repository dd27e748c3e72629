package org.seepledger.io.raster;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.util.Optional;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.fault.DataFault;

/** Rasters against grids; the sample's corner is (500000, 5199080), its cells 50 × 40. */
class GridMatchTest {

    private static Grid grid(double x, double stepX, double y, double rotation) {
        return new Grid(Axis.even(x, stepX, Samples.COLUMNS), Axis.even(y, 40, Samples.ROWS), rotation, 1);
    }

    private static Optional<String> check(String file, Grid grid) throws IOException {
        try (GeoTiff raster = Samples.open(file)) {
            return GridMatch.check(raster, grid);
        }
    }

    @ParameterizedTest
    @CsvSource({"0.49, 0", "-0.49, 0", "0, 0.39", "0, -0.39"})
    void takesUpToAHundredthOfACell(double offX, double offY) throws IOException {
        assertThat(check("float64", grid(500_000 + offX, 50, 5_199_080 + offY, 0)))
                .isEmpty();
    }

    @ParameterizedTest
    @CsvSource({
        "500000.51, 50, 5199080, 'corner (500000.51, 5199080), step 50 × 40'",
        "500000, 50, 5199079.59, 'corner (500000, 5199079.59), step 50 × 40'",
        "500000, 50.02, 5199080, 'corner (500000, 5199080), step 50.02 × 40'",
    })
    void saysBothPlacesWhereARasterLiesElsewhere(double x, double step, double y, String expected) {
        assertThatThrownBy(() -> check("float64", grid(x, step, y, 0)))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("float64.tif, georeference: found 23 rows × 37 columns, corner (500000, 5199080)")
                .hasMessageContaining("expected the grid's 23 rows × 37 columns, " + expected);
    }

    @Test
    void saysBothShapes() {
        Grid larger = new Grid(Axis.even(500_000, 50, 37), Axis.even(5_199_080, 40, 24), 0, 1);
        assertThatThrownBy(() -> check("no-georeference", larger))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("found 23 rows × 37 columns, no georeference")
                .hasMessageContaining("24 rows × 37 columns, corner (500000, 5199080), step 50 × 40");
    }

    @Test
    void matchesByShapeWithANoteWhereThereIsNoGeoreference() throws IOException {
        assertThat(check("no-georeference", Samples.GRID).orElseThrow())
                .contains("no-georeference.tif", "23 rows × 37 columns", "row 1 northernmost", "no georeference");
    }

    @Test
    void matchesByShapeWithANoteOnAnUnevenGrid() throws IOException {
        double[] edges = IntStream.rangeClosed(0, Samples.COLUMNS)
                .mapToDouble(i -> 500_000 + i * i)
                .toArray();
        Grid uneven = new Grid(Axis.of(edges), Axis.even(5_199_080, 40, Samples.ROWS), 0, 1);
        assertThat(check("float64", uneven).orElseThrow()).contains("unevenly spaced");
        Grid lower = new Grid(Axis.of(edges), Axis.even(5_199_080, 40, 22), 0, 1);
        assertThatThrownBy(() -> check("float64", lower))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("22 rows × 37 columns, unevenly spaced");
    }

    @Test
    void matchesATurnedGridByGeoreferenceOrElseByShape() throws IOException {
        Grid turned = grid(500_000, 50, 5_199_080, 30);
        assertThat(check("turned", turned)).isEmpty();
        assertThat(check("turned-south-up", turned)).isEmpty();
        assertThat(check("float64", turned).orElseThrow()).contains("not the turned grid's");
        assertThat(check("turned", grid(500_000, 50, 5_199_080, 30.1))).isPresent();
    }

    @Test
    void refusesATurnedRasterOnAGridThatIsNot() {
        assertThatThrownBy(() -> check("turned", Samples.GRID))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("turned by 30");
        assertThatThrownBy(() -> check("half-turn", Samples.GRID))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("turned by 180°");
    }
}
