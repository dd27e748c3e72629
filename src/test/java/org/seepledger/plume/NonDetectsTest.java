package org.seepledger.plume;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.fault.DataFault;
import org.seepledger.ledger.Entry;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;

/** Non-detects are bracketed with 0, half the limit and the limit (US EPA 2009, Unified Guidance, chapter 15). */
class NonDetectsTest {

    private static final Aquifer AQUIFER = SmallPlumes.uniform(4, 1, 2, 2, new double[] {0.1, 0, 0}, 0, 10);
    private static final Prism ALL = SmallPlumes.box("all", 0, 1, 0, 0, 8, 2);
    private static final double[][] VALUES = {{0.4, 2, 0.6, 3}, {0.4, 0.1, 0.6, 0.9}};

    private static Plume plume(OptionalDouble above, GriddedValues values, GriddedValues porosity) {
        Solute solute =
                SoluteDraft.of("salt", values).porosity(porosity).limit(1).done();
        return SoluteBalance.of(
                        AQUIFER,
                        List.of(solute),
                        List.of(ALL),
                        new SoluteBalance.Options(WellRule.POINT, false, above, 1),
                        Progress.NONE)
                .get(0);
    }

    /** Cells of 2 m × 2 m × 5 m with a quarter of pores hold 5 m³ each: two detects, six non-detects. */
    @Test
    void bracketsMass() {
        Plume plume = plume(OptionalDouble.of(1.5), ArrayValues.steady(4, VALUES), GriddedValues.constant(0.25));
        Stock held = plume.whole(1);
        assertThat(held.total(NonDetects.ZERO)).isCloseTo(5 * 5, within(1e-12));
        assertThat(held.total(NonDetects.HALF)).isCloseTo(5 * 8, within(1e-12));
        assertThat(held.total(NonDetects.LIMIT)).isCloseTo(5 * 11, within(1e-12));
        assertThat(held.undetectedShare()).isCloseTo(3.0 / 8, within(1e-12));
        assertThat(held.detects()).isEqualTo(2);
        assertThat(held.nonDetects()).isEqualTo(6);
        assertThat(held.maximum()).isEqualTo(3);
        assertThat(held.mean()).isCloseTo(1, within(1e-12));
        assertThat(held.rockAbove()).isCloseTo(40, within(1e-12));
        assertThat(held.areaAbove()).isCloseTo(8, within(1e-12));
        assertThat(plume.stocks().get(1).get(1).areaAbove()).isZero();
    }

    @Test
    void countsAreaUnderALayerOnce() {
        Plume plume = plume(OptionalDouble.of(0.2), ArrayValues.steady(4, VALUES), GriddedValues.constant(0.25));
        assertThat(plume.whole(0).areaAbove()).isCloseTo(16, within(1e-12));
        assertThat(plume.whole(1).areaAbove()).isCloseTo(16, within(1e-12));
        assertThat(plume.whole(1).rockAbove()).isCloseTo(160, within(1e-12));
    }

    /** Out of the last column flow 0.1 m/d × 10 m² × 10 d: 3 in the upper layer, a non-detect in the lower one. */
    @Test
    void bracketsFlow() {
        Plume plume = plume(OptionalDouble.empty(), ArrayValues.steady(4, VALUES), GriddedValues.constant(0.25));
        double[] expected = {3, 3.5, 4};
        for (NonDetects choice : NonDetects.values()) {
            double out = plume.ledgers().get(choice).budget(new Periods(AQUIFER.times()).record()).entries().stream()
                    .filter(entry -> entry.account().item().equals("side 2"))
                    .mapToDouble(Entry::outflow)
                    .sum();
            assertThat(out).isCloseTo(10 * expected[choice.ordinal()], within(1e-12));
        }
    }

    @ParameterizedTest
    @CsvSource({"0, more than 0", "1.2, at most 1", "-0.1, more than 0", "NaN, a value in each active cell"})
    void refusesPorositiesThatCannotBe(double porosity, String words) {
        double[][] pores = {{0.2, 0.2, porosity, 0.2}, {0.2, 0.2, 0.2, 0.2}};
        assertThatThrownBy(() ->
                        plume(OptionalDouble.empty(), ArrayValues.steady(4, VALUES), ArrayValues.steady(4, pores)))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("porosity of salt, layer 1, row 1, column 3")
                .hasMessageContaining(words);
    }

    @Test
    void namesACellWithoutConcentration() {
        double[][] holed = {{0.4, 2, 0.6, 3}, {0.4, Double.NaN, 0.6, 0.9}};
        assertThatThrownBy(
                        () -> plume(OptionalDouble.empty(), ArrayValues.steady(4, holed), GriddedValues.constant(0.25)))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("concentration of salt, layer 2, row 1, column 2");
    }

    @Test
    void namesWhatASoluteLacks() {
        Solute daughter = SoluteDraft.of("daughter", GriddedValues.constant(1))
                .parent("parent", 1)
                .done();
        assertThatThrownBy(() -> SoluteDraft.balance(AQUIFER, false, List.of(ALL), daughter))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("\"parent\", which is not balanced with it");
    }
}
