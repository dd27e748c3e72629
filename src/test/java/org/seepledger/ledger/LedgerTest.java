package org.seepledger.ledger;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.seepledger.ledger.Period.Part;

/** Ledgers made and added up by hand. */
class LedgerTest {

    private static final List<Account> ACCOUNTS = List.of(
            new Account(Group.SIDE, "side 1", 0, true),
            new Account(Group.SIDE, "side 1", 1, true),
            new Account(Group.LID, "top", 0, true),
            new Account(Group.SOURCE, "pumping", 0, true),
            new Account(Group.STORAGE, "elastic storage", 0, true));

    private static final double[][] INFLOW = {{10, 2, 5, 0, 4}, {0, 3, 5, 0, 0}};
    private static final double[][] OUTFLOW = {{1, 6, 0, 12, 1}, {8, 0, 0, 2, 3}};

    private static Period period(double first, double second) {
        return new Period("p", 0, first + second, List.of(new Part(0, first), new Part(1, second)));
    }

    private static Totals totals(List<Account> accounts, boolean known, Period period) {
        return new Ledger("a", accounts, known, INFLOW, OUTFLOW).budget(period).totals();
    }

    @Test
    void aPeriodAddsGrossVolumesOfItsParts() {
        Ledger ledger = new Ledger("a", ACCOUNTS, true, INFLOW, OUTFLOW);
        PeriodBudget budget = ledger.budget(period(2, 3));
        assertThat(ledger.prism()).isEqualTo("a");
        assertThat(ledger.accounts()).isEqualTo(ACCOUNTS);
        assertThat(ledger.storageKnown()).isTrue();
        assertThat(budget.period().name()).isEqualTo("p");
        // In during one interval and out in the next is in both columns: 10 × 2 in, 1 × 2 + 8 × 3 out.
        assertThat(budget.entries())
                .containsExactly(
                        new Entry(ACCOUNTS.get(0), 20, 26),
                        new Entry(ACCOUNTS.get(1), 13, 12),
                        new Entry(ACCOUNTS.get(2), 25, 0),
                        new Entry(ACCOUNTS.get(3), 0, 30),
                        new Entry(ACCOUNTS.get(4), 8, 11));
        assertThat(budget.entries().get(0).net()).isEqualTo(-6);
    }

    @Test
    void totalsLeaveStorageOutOfInflowAndOutflow() {
        Totals totals = totals(ACCOUNTS, true, period(2, 3));
        assertThat(totals.inflow()).isEqualTo(58);
        assertThat(totals.outflow()).isEqualTo(68);
        assertThat(totals.storageChange()).isEqualTo(3);
        assertThat(totals.residual()).isEqualTo(-13);
        // Gains 58 + 8, losses 68 + 11.
        assertThat(totals.throughput()).isEqualTo(79);
        assertThat(totals.closureError()).isEqualTo(-1300 / 79.0, within(1e-13));
        // Nets: side 1 -6 + 1, top 25, pumping -30, elastic storage -3: gains 25, losses 38.
        assertThat(totals.netThroughput()).isEqualTo(38);
        assertThat(totals.netClosureError()).isEqualTo(-1300 / 38.0, within(1e-13));
    }

    @Test
    void theLargerOfGainsAndLossesIsThroughputEitherWay() {
        Totals totals = totals(ACCOUNTS, true, period(1, 0));
        assertThat(totals.inflow()).isEqualTo(17);
        assertThat(totals.outflow()).isEqualTo(19);
        assertThat(totals.storageChange()).isEqualTo(-3);
        assertThat(totals.residual()).isEqualTo(1);
        assertThat(totals.throughput()).isEqualTo(21);
        // Nets: 9 - 4, 5, -12, 3.
        assertThat(totals.netThroughput()).isEqualTo(13);
        assertThat(totals.closureError()).isEqualTo(100 / 21.0, within(1e-13));
    }

    @Test
    void unknownStorageLeavesWhatRestsOnItEmptyButNotTheFlows() {
        List<Account> accounts = List.of(
                ACCOUNTS.get(0),
                ACCOUNTS.get(1),
                ACCOUNTS.get(2),
                ACCOUNTS.get(3),
                new Account(Group.STORAGE, "elastic storage", 0, false));
        PeriodBudget budget = new Ledger("a", accounts, false, INFLOW, OUTFLOW).budget(period(2, 3));
        assertThat(budget.entries().get(4).inflow()).isNaN();
        assertThat(budget.entries().get(4).outflow()).isNaN();
        assertThat(budget.entries().get(4).net()).isNaN();
        assertThat(budget.totals().inflow()).isEqualTo(58);
        assertThat(budget.totals().outflow()).isEqualTo(68);
        assertThat(budget.totals().storageChange()).isNaN();
        assertThat(budget.totals().residual()).isNaN();
        assertThat(budget.totals().closureError()).isNaN();
        assertThat(budget.totals().netClosureError()).isNaN();
        assertThat(budget.totals().throughput()).isEqualTo(68);
    }

    @Test
    void whatIsNotQuantifiedCountsAsZeroInTotals() {
        List<Account> accounts = List.of(
                new Account(Group.SIDE, "side 1", 0, false),
                ACCOUNTS.get(1),
                ACCOUNTS.get(2),
                ACCOUNTS.get(3),
                ACCOUNTS.get(4));
        Totals totals = totals(accounts, true, period(2, 3));
        assertThat(totals.inflow()).isEqualTo(38);
        assertThat(totals.outflow()).isEqualTo(42);
        assertThat(totals.residual()).isEqualTo(-7);
    }

    @Test
    void withoutAnyFlowThereIsNoClosureError() {
        double[][] nothing = {{0, 0, 0, 0, 0}, {0, 0, 0, 0, 0}};
        Totals totals = new Ledger("a", ACCOUNTS, true, nothing, nothing)
                .budget(period(2, 3))
                .totals();
        assertThat(totals.residual()).isZero();
        assertThat(totals.closureError()).isNaN();
        assertThat(totals.netClosureError()).isNaN();
    }

    @Test
    void flowAlongAWigglySideDilutesTheClosureErrorButNotTheNetOne() {
        List<Account> accounts =
                List.of(new Account(Group.SIDE, "side 1", 0, true), new Account(Group.SIDE, "side 2", 0, true));
        Totals totals = new Ledger("a", accounts, true, new double[][] {{100, 20}}, new double[][] {{101, 18}})
                .budget(new Period("p", 0, 1, List.of(new Part(0, 1))))
                .totals();
        assertThat(totals.closureError()).isEqualTo(100 * 1 / 120.0, within(1e-13));
        assertThat(totals.netClosureError()).isEqualTo(100 * 1 / 2.0, within(1e-13));
    }

    @Test
    void itemsOfOneNameInTwoGroupsAreNotNettedAgainstEachOther() {
        List<Account> accounts =
                List.of(new Account(Group.SIDE, "river", 0, true), new Account(Group.SOURCE, "river", 0, true));
        Totals totals = new Ledger("a", accounts, true, new double[][] {{7, 0}}, new double[][] {{0, 7}})
                .budget(new Period("p", 0, 1, List.of(new Part(0, 1))))
                .totals();
        assertThat(totals.netThroughput()).isEqualTo(7);
    }

    @Test
    void linesAddUpGroupsByLayerAndLeaveOutWhatCannotBeGiven() {
        List<Entry> entries = List.of(
                new Entry(new Account(Group.SIDE, "side 1", 0, true), 1, 2),
                new Entry(new Account(Group.SIDE, "side 2", 0, true), 3, 4),
                new Entry(new Account(Group.SIDE, "side 1", 1, true), 5, 6),
                new Entry(new Account(Group.SIDE, "side 2", 1, false), Double.NaN, Double.NaN),
                new Entry(new Account(Group.STORAGE, "elastic storage", 0, true), 7, 8));
        assertThat(Line.byLayer(entries))
                .containsExactly(
                        new Line(Group.SIDE, "", 0, 4, 6),
                        new Line(Group.SIDE, "", 1, 5, 6),
                        new Line(Group.STORAGE, "", 0, 7, 8));
        assertThat(Line.each(entries))
                .hasSize(5)
                .element(3)
                .satisfies(line -> assertThat(line.net()).isNaN());
    }

    @Test
    void groupsAreWrittenInSmallLetters() {
        assertThat(Group.values())
                .extracting(Group::toString)
                .containsExactly("side", "lid", "source", "dispersion", "decay", "production", "storage", "total");
    }

    @Test
    void theDisclaimerSpeaksOfRegulationOfInputsAndOfPractitioners() {
        assertThat(Disclaimer.sentences()).hasSize(3);
        assertThat(Disclaimer.text()).contains("not a determination of compliance", "inputs", "licensed practitioners");
    }
}
