package org.seepledger.desktop.closure;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.budget.LiveSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.report.Answer;
import org.seepledger.sample.SampleCopy;

class ClosureModelTest {

    private static ClosureModel model(LiveSet set) {
        return new ClosureModel(set.session, set.live, set.reading, new DirectTasks());
    }

    @Test
    void aBudgetThatClosesSaysSoAndShowsNoCells() {
        try (LiveSet valley = LiveSet.valley()) {
            ClosureModel model = model(valley);
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
            ClosureModel model = model(terrace);
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
            ClosureModel model = model(terrace);
            assertThat(model.points().get(0).text()).contains("m³/d");
            terrace.reading.rateUnit().set("L/s");
            assertThat(model.points().get(0).text()).contains("L/s").doesNotContain("m³/d");
            assertThat(model.spots().get(0).imbalance()).endsWith("L/s");
        }
    }

    @Test
    void thePeriodShownHasCellsOfItsOwn(@TempDir Path folder) throws IOException {
        SampleCopy.of("valley", folder);
        Path described = folder.resolve("aquifer.json");
        Files.writeString(described, Files.readString(described).replace("\"specific_yield.tif\"", "0.02"));
        try (LiveSet wrong = LiveSet.of(folder)) {
            ClosureModel model = model(wrong);
            wrong.reading.every().set(Periods.Every.MONTH);
            assertThat(model.period().get()).isEqualTo("2021-10");
            assertThat(model.spotsOfPeriod()).hasSize(5);
            List<Spot> october = List.copyOf(model.spotsOfPeriod());
            wrong.session.interval().set(7);
            assertThat(model.period().get()).isEqualTo("2022-05");
            assertThat(List.copyOf(model.spotsOfPeriod())).isNotEqualTo(october);
            wrong.reading.every().set(Periods.Every.RECORD);
            assertThat(model.spotsOfPeriod()).isEmpty();
            assertThat(model.spots()).hasSize(5);
        }
    }
}
