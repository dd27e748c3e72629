package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.picture.Profile;
import org.seepledger.picture.SectionLine;
import org.seepledger.progress.Progress;
import org.seepledger.sketch.Place;

/** Concentrations on a map: values in their own unit, non-detects without a value but with their limit. */
class ConcentrationReadingTest {

    @TempDir
    private Path folder;

    private Workbench open() throws IOException {
        Files.writeString(folder.resolve("c.csv"), """
                row,col,instant,c
                1,1,0,4
                1,2,0,4
                1,3,0,<2
                1,4,0,<2
                1,1,1,8
                1,2,1,<1
                1,3,1,<1
                1,4,1,5
                """);
        Files.writeString(folder.resolve("aquifer.json"), """
                {"length_unit": "ft", "time_unit": "d", "grid": {"x": {"from": 0, "step": 1, "count": 4},
                 "y": {"from": 0, "step": 1, "count": 1}}, "layers": [{"top": 1, "bottom": 0}], "times": [0, 1],
                 "flow": {"kind": "darcy_flux", "x": 0, "y": 0, "z": 0},
                 "solutes": [{"name": "salt", "unit": "ug/L", "concentration": {"file": "c.csv", "column": "c"},
                              "porosity": 0.2}]}
                """);
        return Workbench.open(folder);
    }

    private static MapQuantity quantity(Workbench bench, MapQuantity.Kind kind) {
        return bench.views().quantities().stream()
                .filter(each -> each.kind() == kind)
                .findFirst()
                .orElseThrow();
    }

    private GridLayer read(MapQuantity.Kind kind, int stride) throws IOException {
        try (Workbench bench = open()) {
            MapQuantity quantity = quantity(bench, kind);
            assertThat(quantity.unit()).isEqualTo("ug/L");
            return bench.views().layer(quantity, 0, 0, bench.aquifer().grid().window(), stride, Progress.NONE);
        }
    }

    @Test
    void atTheEndANonDetectHasALimitAndNoValue() throws IOException {
        GridLayer layer = read(MapQuantity.Kind.CONCENTRATION, 1);
        assertThat(layer.values()).containsExactly(new double[] {8, Double.NaN, Double.NaN, 5}, within(1e-12));
        assertThat(layer.limits()).containsExactly(new double[] {Double.NaN, 1, 1, Double.NaN}, within(1e-12));
    }

    @Test
    void aMeanWithOneNonDetectTakesHalfItsLimit() throws IOException {
        GridLayer layer = read(MapQuantity.Kind.MEAN_CONCENTRATION, 1);
        assertThat(layer.values()).containsExactly(new double[] {6, 2.25, Double.NaN, 3}, within(1e-12));
        assertThat(layer.limits()).containsExactly(new double[] {Double.NaN, 1, 1.5, 2}, within(1e-12));
    }

    @Test
    void aSectionHasTheSameValues() throws IOException {
        try (Workbench bench = open()) {
            SectionLine line = new SectionLine(List.of(new Place(0, 0.5), new Place(4, 0.5)));
            Optional<MapQuantity> quantity = Optional.of(quantity(bench, MapQuantity.Kind.CONCENTRATION));
            Profile profile = bench.views().profile(line, quantity, 0, Progress.NONE);
            double[] along = profile.stretches().stream()
                    .mapToDouble(stretch -> stretch.column().values()[0])
                    .toArray();
            assertThat(along).containsExactly(new double[] {8, Double.NaN, Double.NaN, 5}, within(1e-12));
        }
    }

    @Test
    void aSquareOfNonDetectsAloneHasNoValue() throws IOException {
        GridLayer layer = read(MapQuantity.Kind.CONCENTRATION, 2);
        assertThat(layer.values()).containsExactly(new double[] {8, 5}, within(1e-12));
        assertThat(layer.limits()).containsExactly(new double[] {1, 1}, within(1e-12));
        assertThat(layer.hasNonDetects()).isTrue();
    }
}
