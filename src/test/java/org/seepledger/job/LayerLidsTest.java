package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Layer;
import org.seepledger.prism.Prism;
import org.seepledger.prism.VerticalRange;
import org.seepledger.progress.Progress;
import org.seepledger.report.Term;

/** A prism whose lids lie on layers' surfaces is the same as one of those layers. */
class LayerLidsTest {

    @Test
    void lidsOnLayersGiveTheBudgetOfTheLayers() {
        try (Workbench valley = Workbench.open(Path.of("sample-aquifers/valley"))) {
            List<Layer> layers = valley.aquifer().layers();
            List<Prism> drawn = valley.drawings()
                    .prisms(Path.of("sample-aquifers/valley/prisms.geojson"))
                    .prisms();
            for (Prism prism : drawn) {
                for (int first = 0; first < 3; first++) {
                    VerticalRange between = new VerticalRange.Elevations(
                            Optional.of(Layer.topOf(layers, first)), Optional.of(Layer.bottomOf(layers, 2)));
                    VerticalRange stack = new VerticalRange.Layers(first, 2);
                    compare(rows(valley, prism, stack), rows(valley, prism, between));
                }
            }
        }
    }

    private static List<Term> rows(Workbench valley, Prism prism, VerticalRange range) {
        Prism ranged = new Prism(prism.name(), prism.rings(), range);
        return Term.of(valley.budgets(List.of(ranged), 6, Progress.NONE).get(0).budget());
    }

    /** Rounding of the sums aside: volumes of some thousand cubic metres. */
    private static void compare(List<Term> stack, List<Term> between) {
        assertThat(between)
                .extracting(Term::name)
                .isEqualTo(stack.stream().map(Term::name).toList());
        assertThat(stack).anyMatch(term -> term.gross() > 100);
        for (int i = 0; i < stack.size(); i++) {
            assertThat(between.get(i).inflow()).isCloseTo(stack.get(i).inflow(), within(1e-7));
            assertThat(between.get(i).outflow()).isCloseTo(stack.get(i).outflow(), within(1e-7));
        }
    }
}
