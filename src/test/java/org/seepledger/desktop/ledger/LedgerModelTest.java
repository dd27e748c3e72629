package org.seepledger.desktop.ledger;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.budget.LiveSet;
import org.seepledger.desktop.ledger.LedgerRow.Kind;
import org.seepledger.io.table.CsvText;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;

class LedgerModelTest {

    private final LiveSet valley = LiveSet.valley();
    private final LedgerModel model =
            new LedgerModel(valley.session, valley.live, valley.reading, valley.plumes, valley.masses, valley.answers);

    @AfterEach
    void close() {
        valley.close();
    }

    private LedgerRow row(String label) {
        return model.rows().stream()
                .filter(row -> row.label().equals(label))
                .findFirst()
                .orElseThrow();
    }

    private List<String> labels(Kind kind) {
        return model.rows().stream()
                .filter(row -> row.kind() == kind)
                .map(LedgerRow::label)
                .toList();
    }

    private PeriodBudget budget() {
        return valley.live
                .known()
                .get()
                .budget(
                        valley.prisms.get(0),
                        valley.reading.period(
                                valley.set, valley.session.interval().get()))
                .orElseThrow()
                .budget();
    }

    @Test
    void sectionsFollowEachOtherAndTotalsStandBelow() {
        assertThat(labels(Kind.HEADING)).containsExactly("Faces", "Sources", "Storage", "Together");
        assertThat(labels(Kind.ENTRY)).startsWith("far bank", "side 3").contains("top", "recharge", "elastic storage");
        assertThat(labels(Kind.TOTAL)).containsExactly("inflow", "outflow", "storage change", "residual");
        assertThat(labels(Kind.PERCENTAGE)).containsExactly("closure error", "net closure error");
        assertThat(model.belongs().get())
                .isEqualTo("well field, layers 1 to 3, 503\u202f700 m² · interval 1, 2021-10-01 to 2021-11-01");
    }

    @Test
    void ratesAndVolumesAreOneBudgetInTwoUnits() {
        PeriodBudget budget = budget();
        assertThat(row("inflow").net()).isEqualTo(budget.totals().inflow() / 31);
        valley.reading.volumes().set(true);
        assertThat(row("inflow").net()).isEqualTo(budget.totals().inflow());
        assertThat(model.unit().get()).isEqualTo("m3");
        valley.reading.volumeUnit().set("ML");
        assertThat(row("inflow").net()).isEqualTo(budget.totals().inflow() * 1e-3);
        assertThat(model.unit().get()).isEqualTo("ML");
        assertThat(row("closure error").net()).isEqualTo(budget.totals().closureError());
    }

    @Test
    void layersAddUpToItems() {
        LedgerRow whole = row("recharge");
        model.arrangement().set(Arrangement.ITEMS_BY_LAYER);
        double sum = model.rows().stream()
                .filter(row -> row.item().equals("recharge"))
                .mapToDouble(LedgerRow::inflow)
                .sum();
        assertThat(sum).isEqualTo(whole.inflow());
        model.arrangement().set(Arrangement.LAYERS);
        assertThat(labels(Kind.HEADING)).hasSize(4).endsWith("Together");
        assertThat(labels(Kind.ENTRY)).contains("sides", "top and bottom", "sources", "storage");
        double sources = model.rows().stream()
                .filter(row -> row.group() == Group.SOURCE)
                .mapToDouble(LedgerRow::inflow)
                .sum();
        assertThat(sources).isPositive();
    }

    @Test
    void sortingKeepsSectionsTogetherAndASecondTimeUndoesIt() {
        List<String> drawn = labels(Kind.ENTRY);
        model.sort(Order.LARGEST_OUT);
        assertThat(labels(Kind.HEADING)).containsExactly("Faces", "Sources", "Storage", "Together");
        assertThat(labels(Kind.ENTRY).get(0)).isEqualTo("side 3");
        assertThat(labels(Kind.ENTRY)).containsExactlyInAnyOrderElementsOf(drawn);
        model.sort(Order.LARGEST_OUT);
        assertThat(labels(Kind.ENTRY)).isEqualTo(drawn);
    }

    @Test
    void thePeriodIsTheOneThatHoldsTheIntervalLookedAt() {
        valley.session.interval().set(14);
        assertThat(model.belongs().get()).contains("interval 15");
        valley.reading.every().set(Periods.Every.YEAR);
        assertThat(model.belongs().get()).contains("2022, 2022-01-01 to 2023-01-01");
        valley.reading.every().set(Periods.Every.WATER_YEAR);
        assertThat(model.belongs().get()).contains("water year 2023");
        valley.reading.every().set(Periods.Every.RECORD);
        assertThat(model.belongs().get()).contains("record, 2021-10-01 to 2023-10-01");
    }

    @Test
    void theRowOfAFaceAndTheFaceOnTheMapLightUpTogether() {
        model.light(row("side 4"));
        assertThat(valley.session.lit().get()).isEqualTo("side 4");
        valley.session.lit().set("far bank");
        assertThat(model.lit()).hasValue(row("far bank"));
        model.light(row("recharge"));
        assertThat(valley.session.lit().get()).isEmpty();
        assertThat(model.lit()).isEmpty();
    }

    @Test
    void aCopyHasUnitsAllDigitsAndTheCaution() {
        model.copy();
        String tabs = valley.answers.copied.get(0);
        String html = valley.answers.copied.get(1);
        String exact = CsvText.number(row("side 4").net());
        assertThat(exact.length()).isGreaterThan(12);
        assertThat(tabs.lines().toList())
                .contains("item\tin\tout\tnet\tunit")
                .anyMatch(line -> line.startsWith("side 4\t") && line.endsWith(exact + "\tm3/d"))
                .anyMatch(line -> line.startsWith("closure error\t\t\t") && line.endsWith("\t%"));
        assertThat(tabs).startsWith("well field").contains(Disclaimer.text());
        assertThat(html).contains("<caption>well field", "<td>" + exact + "</td><td>m3/d</td>", Disclaimer.text());
        assertThat(valley.session.notices().latest().get().orElseThrow().words())
                .startsWith("Copied the budget of well field");
    }

    @Test
    void anotherPrismIsAnotherLedgerAndNoneIsNone() {
        Prism second = valley.prisms.get(1);
        valley.session.selected().set(second.name());
        assertThat(model.belongs().get()).startsWith(second.name());
        valley.session.selected().set("");
        assertThat(model.rows()).isEmpty();
        assertThat(model.belongs().get()).isEmpty();
    }

    @Test
    void numbersOfOneColumnHaveFourDigitsAndOneSign() {
        LedgerRow row = new LedgerRow(Kind.ENTRY, Group.SIDE, "a", 0, "a", 780, 0.5, -1234.4, Double.NaN, Double.NaN);
        assertThat(row.text(row.inflow())).isEqualTo("780.0");
        assertThat(row.text(row.outflow())).isEqualTo("0.5000");
        assertThat(row.text(row.net())).isEqualTo("−1\u202f234");
        assertThat(row.text(Double.NaN)).isEqualTo("–");
        LedgerRow total = LedgerRow.one(Kind.TOTAL, Group.TOTAL, "a", -1, "a", 3);
        assertThat(total.text(total.inflow())).isEmpty();
        assertThat(total.text(total.net())).isEqualTo("3.000");
    }
}
