package org.seepledger.prism;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;
import org.seepledger.prism.VerticalRange.Elevations;
import org.seepledger.prism.VerticalRange.Layers;

/** Rectangles on a grid of ten by ten cells and three layers between elevations 30, 20, 10 and 0. */
class OverlapsTest {

    private static final Grid GRID = new Grid(Axis.even(0, 1, 10), Axis.even(0, 1, 10), 0, 2);
    private static final Overlaps OVERLAPS =
            new Overlaps(GRID, 3, surface -> GriddedValues.constant(30 - 10.0 * surface));

    private static Prism box(String name, double west, double south, double east, double north, VerticalRange range) {
        Coordinate[] ring = {
            new Coordinate(west, south),
            new Coordinate(east, south),
            new Coordinate(east, north),
            new Coordinate(west, north),
            new Coordinate(west, south)
        };
        return new Prism(name, List.of(new SideNumbering(false).number(1, 0, ring)), range);
    }

    private static Elevations between(double top, double bottom) {
        return new Elevations(Optional.of(GriddedValues.constant(top)), Optional.of(GriddedValues.constant(bottom)));
    }

    private static List<Overlap> ofRanges(VerticalRange one, VerticalRange other) {
        return OVERLAPS.of(List.of(box("A", 1, 1, 5, 5, one), box("B", 4, 3, 8, 8, other)));
    }

    @Test
    void listsPairsWithTheirCommonAreaInLengthUnits() {
        Layers all = new Layers(0, 2);
        List<Overlap> overlaps =
                OVERLAPS.of(List.of(box("A", 1, 1, 5, 5, all), box("B", 5, 1, 8, 5, all), box("C", 4, 3, 6, 9, all)));
        // A plan unit is two length units: 1 × 2 cells of 4 square length units.
        assertThat(overlaps).containsExactly(new Overlap("A", "C", 8), new Overlap("B", "C", 8));
    }

    @Test
    void neighboursDoNotOverlap() {
        Layers all = new Layers(0, 2);
        // A hair wider than the shared side: 4e-10 of 16.
        assertThat(OVERLAPS.of(List.of(box("A", 1, 1, 5, 5, all), box("B", 5 - 1e-10, 1, 8, 5, all))))
                .isEmpty();
        assertThat(OVERLAPS.of(List.of(box("A", 1, 1, 5, 5, all), box("B", 5 - 1e-7, 1, 8, 5, all))))
                .hasSize(1);
    }

    /** At 8e6 units from the origin a step of the number format is 9e-10 units, and more than a billionth of these prisms' width. */
    @Test
    void neighboursFarFromTheOriginDoNotOverlap() {
        double far = 8_388_608;
        Grid grid = new Grid(Axis.even(far, 1, 10), Axis.even(0, 1, 10), 0, 1);
        Overlaps overlaps = new Overlaps(grid, 3, surface -> GriddedValues.constant(30 - 10.0 * surface));
        double middle = far + 0.5;
        Layers all = new Layers(0, 2);
        Prism west = box("A", middle - 0.1, 1, middle, 5, all);
        assertThat(overlaps.of(List.of(west, box("B", Math.nextDown(middle), 1, middle + 0.1, 5, all))))
                .isEmpty();
        assertThat(overlaps.of(List.of(west, box("B", middle - 1e-7, 1, middle + 0.1, 5, all))))
                .hasSize(1);
    }

    @Test
    void aTinyPrismWithinALargeOneOverlapsIt() {
        Layers all = new Layers(0, 2);
        assertThat(OVERLAPS.of(List.of(box("A", 5, 5, 5.0001, 5.0001, all), box("B", 0, 0, 10, 10, all))))
                .hasSize(1);
    }

    @Test
    void layersOverlapWhenTheyHaveOneInCommon() {
        assertThat(ofRanges(new Layers(0, 0), new Layers(1, 2))).isEmpty();
        assertThat(ofRanges(new Layers(0, 1), new Layers(1, 2))).hasSize(1);
    }

    @Test
    void elevationsOverlapWhereOneTopIsAboveTheOthersBottom() {
        assertThat(ofRanges(between(30, 15), between(15, 0))).isEmpty();
        assertThat(ofRanges(between(30, 14), between(15, 0))).hasSize(1);
        assertThat(ofRanges(between(15, 0), between(30, 14))).hasSize(1);
    }

    @Test
    void elevationsAreHeldAgainstTheSurfacesOfLayers() {
        assertThat(ofRanges(new Layers(0, 0), between(20, 5))).isEmpty();
        assertThat(ofRanges(between(20.5, 5), new Layers(0, 0))).hasSize(1);
        assertThat(ofRanges(
                        new Layers(2, 2), new Elevations(Optional.of(GriddedValues.constant(12)), Optional.empty())))
                .hasSize(1);
        assertThat(ofRanges(
                        new Layers(2, 2), new Elevations(Optional.empty(), Optional.of(GriddedValues.constant(10)))))
                .isEmpty();
    }

    @Test
    void surfacesCountInTheCellsOfTheCommonAreaAlone() {
        // A surface at 5, but 25 in one cell: that of row 6 (of ten, from the north) and column 4, or elsewhere.
        assertThat(ofRanges(new Layers(0, 0), spike(6, 4))).hasSize(1);
        assertThat(ofRanges(new Layers(0, 0), spike(6, 5))).isEmpty();
        assertThat(ofRanges(new Layers(0, 0), spike(4, 4))).isEmpty();
    }

    @Test
    void aCellWithoutAValueDoesNotCount() {
        Elevations unknown = new Elevations(Optional.of(GriddedValues.constant(Double.NaN)), Optional.empty());
        assertThat(ofRanges(new Layers(0, 2), unknown)).isEmpty();
    }

    private static Elevations spike(int row, int column) {
        GriddedValues surface = new GriddedValues() {
            @Override
            public void read(int layer, int step, Window window, double[] target, int offset) {
                Arrays.fill(target, offset, offset + window.size(), 5);
                if (window.contains(row, column)) {
                    target[offset + window.index(row, column)] = 25;
                }
            }

            @Override
            public boolean changes() {
                return false;
            }

            @Override
            public boolean layered() {
                return false;
            }
        };
        return new Elevations(Optional.of(surface), Optional.empty());
    }
}
