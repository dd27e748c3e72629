package org.seepledger.desktop.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.budget.LiveSet;
import org.seepledger.io.table.CsvText;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Period;
import org.seepledger.unit.Figures;

class ExchangeModelTest {

    private final LiveSet valley = LiveSet.valley();
    private final ExchangeModel model = new ExchangeModel(valley.session, valley.live, valley.reading, valley.answers);

    @AfterEach
    void close() {
        valley.close();
    }

    private double rate(String giver, String receiver) {
        Period period =
                valley.reading.period(valley.set, valley.session.interval().get());
        List<ExchangeFlow> flows =
                valley.live.known().get().record().orElseThrow().balance().exchange();
        return flows.stream()
                        .filter(flow ->
                                flow.giver().equals(giver) && flow.receiver().equals(receiver))
                        .mapToDouble(flow -> flow.volume(period))
                        .sum()
                / period.duration();
    }

    @Test
    void eachPlaceOfTheMatrixIsWhatTheRowGivesTheColumn() {
        Matrix matrix = model.matrix().orElseThrow();
        assertThat(matrix.names())
                .containsExactly("well field", "north fields", "river meadow", "south terrace", "outside");
        assertThat(rate("well field", "north fields")).isPositive();
        assertThat(matrix.text(0, 1)).isEqualTo(Figures.tabular(rate("well field", "north fields")));
        assertThat(matrix.text(4, 0)).isEqualTo(Figures.tabular(rate("outside", "well field")));
        assertThat(matrix.text(0, 0)).isEmpty();
        assertThat(matrix.unit()).isEqualTo("m³/d");
        assertThat(model.belongs().get())
                .isEqualTo("Water of all 4 prisms as drawn · interval 1, 2021-10-01 to 2021-11-01");
    }

    @Test
    void itFollowsTheInterval() {
        String before = model.matrix().orElseThrow().text(4, 0);
        valley.session.interval().set(9);
        assertThat(model.matrix().orElseThrow().text(4, 0)).isNotEqualTo(before);
        valley.reading.every().set(Periods.Every.RECORD);
        assertThat(model.belongs().get()).contains("record");
    }

    @Test
    void theDiagramShowsTheSame() {
        assertThat(model.diagram(480).orElseThrow().description())
                .contains(
                        "In m³/d", "well field to north fields " + Figures.typeset(rate("well field", "north fields")));
    }

    @Test
    void aCopyHasTheUnitAllDigitsAndTheCaution() {
        model.copy();
        String exact = CsvText.number(rate("outside", "well field"));
        assertThat(valley.answers.copied.get(0))
                .contains("from ↓ to → [m3/d]\twell field\tnorth fields", "outside\t" + exact, Disclaimer.text());
        assertThat(valley.answers.copied.get(1)).contains("<td>" + exact + "</td>");
    }
}
