package org.seepledger.desktop.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.budget.LiveSet;
import org.seepledger.picture.BudgetSeries;

class ChartModelTest {

    private final LiveSet valley = LiveSet.valley();
    private final ChartModel model =
            new ChartModel(valley.session, valley.live, valley.reading, valley.plumes, valley.masses, valley.said);

    @AfterEach
    void close() {
        valley.close();
    }

    private BudgetSeries chart() {
        return model.chart(900, 260).orElseThrow();
    }

    private int periodAtMiddleOf(int period) {
        var place = chart().place(period);
        return chart().periodAt(place.x() + place.width() / 2).orElseThrow();
    }

    @Test
    void aPlaceOnTheChartIsAPeriodAndLeadsToItsInterval() {
        assertThat(model.last().get()).isEqualTo(23);
        model.lookAtPeriod(periodAtMiddleOf(5));
        assertThat(valley.session.interval().get()).isEqualTo(5);
        assertThat(model.when().get()).startsWith("interval 6, 2022-03-01");
    }

    @Test
    void ayearLeadsToItsFirstIntervalUnlessOneOfItsIntervalsIsLookedAtAlready() {
        valley.reading.every().set(Periods.Every.YEAR);
        model.lookAtPeriod(periodAtMiddleOf(1));
        assertThat(valley.session.interval().get()).isEqualTo(3);
        model.look(6);
        model.lookAtPeriod(1);
        assertThat(valley.session.interval().get()).isEqualTo(6);
    }

    @Test
    void theRecordIsShownByItsIntervals() {
        valley.reading.every().set(Periods.Every.RECORD);
        assertThat(periodAtMiddleOf(23)).isEqualTo(23);
    }

    @Test
    void theSliderStopsAtTheEnds() {
        model.look(99);
        assertThat(valley.session.interval().get()).isEqualTo(23);
        model.look(-1);
        assertThat(valley.session.interval().get()).isZero();
    }

    @Test
    void theChartFillsItsRoomAndSaysWhoseItIs() {
        assertThat(chart().picture().height()).isBetween(255.0, 261.0);
        assertThat(chart().picture().title()).contains("well field");
        valley.session.selected().set("");
        assertThat(model.chart(900, 260)).isEqualTo(Optional.empty());
    }
}
