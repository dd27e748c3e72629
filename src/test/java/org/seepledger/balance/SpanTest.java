package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.KeptCells;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.aquifer.Source;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Period;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;
import org.seepledger.progress.Progress;

/** Some intervals alone give what they give among all. */
class SpanTest {

    private static final Grid GRID = new Grid(Axis.even(0, 1, 40), Axis.even(0, 1, 30), 0, 1);
    private static final Prism LEFT = Prisms.of("left", 0, 0, Shapes.box(5.5, 5.5, 15.5, 20.5));
    private static final Prism RIGHT = Prisms.of("right", 0, 0, Shapes.box(15.5, 5.5, 30.5, 20.5));

    private static Aquifer aquifer() {
        FormulaValues x = new FormulaValues(GRID, 3, (step, layer, east, north) -> Math.sin(0.2 * east + step));
        GriddedValues none = GriddedValues.constant(0);
        return AquiferDraft.on(GRID)
                .times(0, 1, 3, 7)
                .flow(new DarcyFlux(x, none, Optional.empty(), false, new OuterFaces(true, false, false)))
                .source(new Source.Areal("rain", x))
                .done();
    }

    private static Balance balance(Aquifer aquifer, Span span) {
        KeptCells kept = new KeptCells(aquifer, 1L << 28);
        return WaterBalance.of(aquifer, kept::around, span, List.of(LEFT, RIGHT), WellRule.POINT, 1, Progress.NONE);
    }

    @Test
    void anIntervalAloneIsTheSameToTheLastBit() {
        Aquifer aquifer = aquifer();
        Balance all = WaterBalance.of(aquifer, List.of(LEFT, RIGHT), WellRule.POINT, 1, Progress.NONE);
        List<Period> intervals = new Periods(aquifer.times()).every(Periods.Every.INTERVAL, 1);
        for (int interval = 0; interval < 3; interval++) {
            Balance alone = balance(aquifer, Span.only(interval));
            Period period = intervals.get(interval);
            for (int prism = 0; prism < 2; prism++) {
                assertThat(alone.ledgers().get(prism).budget(period))
                        .isEqualTo(all.ledgers().get(prism).budget(period));
            }
            for (int flow = 0; flow < all.exchange().size(); flow++) {
                assertThat(alone.exchange().get(flow).rates()[interval])
                        .isEqualTo(all.exchange().get(flow).rates()[interval]);
            }
        }
    }

    @Test
    void whatWasNotAskedForHasNoNumbers() {
        Aquifer aquifer = aquifer();
        Balance some = balance(aquifer, new Span(1, 2));
        Period record = new Periods(aquifer.times()).record();
        assertThat(some.ledgers().get(0).budget(record).totals().inflow()).isNaN();
        ExchangeFlow first = some.exchange().get(0);
        assertThat(first.rates()[0]).isNaN();
        assertThat(first.rates()[1]).isNotNaN();
        assertThat(first.rates()[2]).isNaN();
    }

    @Test
    void imbalanceIsTheMeanOverTheIntervalsAskedFor() {
        Aquifer aquifer = aquifer();
        Balance second = balance(aquifer, Span.only(1));
        Balance third = balance(aquifer, Span.only(2));
        Balance both = balance(aquifer, new Span(1, 3));
        double mean =
                (2 * second.imbalance().at(0, 10, 10) + 4 * third.imbalance().at(0, 10, 10)) / 6;
        assertThat(both.imbalance().at(0, 10, 10)).isCloseTo(mean, org.assertj.core.api.Assertions.within(1e-15));
        assertThat(mean).isNotZero();
    }

    @Test
    void aSpanHoldsAtLeastOneInterval() {
        assertThatThrownBy(() -> new Span(2, 2)).isInstanceOf(IllegalArgumentException.class);
    }
}
