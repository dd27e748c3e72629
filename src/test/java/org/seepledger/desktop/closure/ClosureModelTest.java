package org.seepledger.desktop.closure;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.seepledger.desktop.budget.LiveSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.report.Answer;

class ClosureModelTest {

    @Test
    void aBudgetThatClosesSaysSoAndShowsNoCells() {
        try (LiveSet valley = LiveSet.valley()) {
            ClosureModel model = new ClosureModel(valley.session, valley.live, valley.reading);
            assertThat(model.points().get(0).topic()).isEqualTo(Answer.Topic.CLOSURE);
            assertThat(model.points().get(0).text()).startsWith("Closes to rounding: less than ");
            assertThat(model.spots()).isEmpty();
            assertThat(model.leads()).isEmpty();
            assertThat(model.blocks(480).orElseThrow().title())
                    .isEqualTo("Gains, losses and storage of well field, record");
            assertThat(model.belongs().get()).startsWith("well field").endsWith("record, 2021-10-01 to 2023-10-01");
        }
    }

    @Test
    void aBudgetThatDoesNotCloseLeadsToItsCellsOnTheMap() {
        try (LiveSet terrace = LiveSet.terrace()) {
            ClosureModel model = new ClosureModel(terrace.session, terrace.live, terrace.reading);
            assertThat(model.points().get(0).text()).startsWith("Closure error ");
            assertThat(model.spots()).hasSize(5);
            assertThat(model.leads()).isNotEmpty();
            Spot second = model.spots().get(1);
            model.goTo(second);
            assertThat(terrace.session.demand().get()).isEqualTo(Session.Demand.SHOW_IMBALANCE);
            assertThat(terrace.session.target().get()).contains(second.place());
            assertThat(terrace.session.layer().get()).isEqualTo(second.cell().layer());
            assertThat(second.where()).contains("row " + (second.cell().row() + 1));
        }
    }

    @Test
    void figuresAreInTheUnitChosen() {
        try (LiveSet terrace = LiveSet.terrace()) {
            ClosureModel model = new ClosureModel(terrace.session, terrace.live, terrace.reading);
            assertThat(model.points().get(0).text()).contains("m³/d");
            terrace.reading.rateUnit().set("L/s");
            assertThat(model.points().get(0).text()).contains("L/s").doesNotContain("m³/d");
            assertThat(model.spots().get(0).imbalance()).endsWith("L/s");
        }
    }
}
