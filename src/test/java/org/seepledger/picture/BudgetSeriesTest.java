package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalInt;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;

class BudgetSeriesTest {

    private static final List<Account> ACCOUNTS = List.of(
            RandomLedger.account(Group.SIDE, "river side"), RandomLedger.account(Group.STORAGE, "water-table storage"));

    private static Period period(String name, double from, double to, int interval) {
        return new Period(name, from, to, List.of(new Period.Part(interval, to - from)));
    }

    private static List<PeriodBudget> three() {
        Ledger ledger = new Ledger("p", ACCOUNTS, true, new double[][] {{100, 0}, {20, 30}, {50, 0}}, new double[][] {
            {60, 30}, {50, 0}, {50, 0}
        });
        return List.of(period("one", 0, 30, 0), period("two", 30, 90, 1), period("three", 100, 110, 2)).stream()
                .map(ledger::budget)
                .toList();
    }

    private static BudgetSeries series(List<PeriodBudget> budgets, OptionalInt marked) {
        return BudgetSeries.of("p", budgets, RandomLedger.times(true), RandomLedger.RATE, marked, 760);
    }

    @Property(tries = 60)
    void nothingIsCutOrCovered(
            @ForAll long seed,
            @ForAll boolean known,
            @ForAll boolean dated,
            @ForAll @IntRange(min = 1, max = 60) int count) {
        RandomLedger random = new RandomLedger(seed, count);
        Ledger ledger = random.ledger(known, 5);
        List<PeriodBudget> budgets =
                random.periods().stream().map(ledger::budget).toList();
        for (double width : new double[] {340, 360, 760}) {
            Drawn.isLegible(BudgetSeries.of(
                            "p", budgets, RandomLedger.times(dated), RandomLedger.RATE, OptionalInt.of(0), width)
                    .picture());
            Drawn.isLegible(StorageCurve.of("p", budgets, RandomLedger.times(dated), RandomLedger.VOLUME, width));
        }
    }

    @Test
    void barsAreAsHighAsRatesAndAsWideAsPeriods() {
        Picture picture = series(three(), OptionalInt.empty()).picture();
        List<Box> gains = Drawn.filled(picture, Ink.Token.GAIN);
        double scale = gains.get(0).height() / 100;
        assertThat(gains.get(1).height()).isCloseTo(20 * scale, within(1e-9));
        assertThat(Drawn.filled(picture, Ink.Token.LOSS).get(1).height()).isCloseTo(50 * scale, within(1e-9));
        double aDay = (gains.get(0).width() + 1.2) / 30;
        assertThat(gains.get(1).width() + 1.2).isCloseTo(60 * aDay, within(1e-9));
        assertThat(gains.get(2).x() - gains.get(1).right()).isCloseTo(10 * aDay + 1.2, within(1e-9));
    }

    @Test
    void storageStandsOnTheSideThatItMakesUpFor() {
        Picture picture = series(three(), OptionalInt.empty()).picture();
        List<Box> storage = Drawn.filled(picture, Ink.Token.STORAGE);
        Box firstLoss = Drawn.filled(picture, Ink.Token.LOSS).get(0);
        Box secondGain = Drawn.filled(picture, Ink.Token.GAIN).get(1);
        assertThat(storage).hasSize(2);
        assertThat(storage.get(0).y()).isCloseTo(firstLoss.bottom(), within(1e-9));
        assertThat(storage.get(1).bottom()).isCloseTo(secondGain.y(), within(1e-9));
        assertThat(storage.get(1).height() / secondGain.height()).isCloseTo(1.5, within(1e-9));
    }

    @Test
    void theResidualHasAStripUnlessItIsRounding() {
        Picture open = series(three(), OptionalInt.empty()).picture();
        assertThat(Drawn.words(open)).contains("residual, on a scale of its own");
        assertThat(Drawn.filled(open, Ink.Token.RESIDUAL)).hasSize(1);
        Picture closed = series(three().subList(1, 3), OptionalInt.empty()).picture();
        assertThat(Drawn.words(closed)).contains("residual: rounding alone, at most 0");
        assertThat(closed.height()).isLessThan(open.height());
    }

    @Test
    void eachPlaceBelongsToThePeriodThatIsDrawnThere() {
        BudgetSeries series = series(three(), OptionalInt.of(1));
        for (int i = 0; i < 3; i++) {
            assertThat(series.periodAt(series.place(i).middleX())).hasValue(i);
        }
        double between = (series.place(1).right() + series.place(2).x()) / 2;
        assertThat(series.periodAt(between)).isEmpty();
        assertThat(series.periodAt(0)).isEmpty();
        assertThat(Drawn.filled(series.picture(), Ink.Token.ACCENT).get(0).x())
                .isEqualTo(series.place(1).x());
    }

    @Test
    void overlappingPeriodsStandSideBySide() {
        Ledger ledger = new Ledger("p", ACCOUNTS, true, new double[][] {{1, 0}}, new double[][] {{1, 0}});
        BudgetSeries series = series(
                List.of(ledger.budget(period("all", 0, 100, 0)), ledger.budget(period("summer", 50, 60, 0))),
                OptionalInt.empty());
        assertThat(series.place(0).width()).isCloseTo(series.place(1).width(), within(1e-9));
        assertThat(Drawn.words(series.picture())).contains("all", "summer");
    }

    @Test
    void whatCannotBeGivenHasADash() {
        Ledger ledger =
                new Ledger("p", ACCOUNTS, true, new double[][] {{Double.NaN, 0}, {5, 0}}, new double[][] {{1, 0}, {5, 0}
                });
        List<PeriodBudget> budgets =
                List.of(ledger.budget(period("one", 0, 30, 0)), ledger.budget(period("two", 30, 60, 1)));
        Picture picture = series(budgets, OptionalInt.empty()).picture();
        assertThat(Drawn.words(picture)).contains("–");
        assertThat(Drawn.filled(picture, Ink.Token.GAIN)).hasSize(1);
    }
}
