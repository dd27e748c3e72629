package org.seepledger.desktop.transect;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.budget.LiveSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.session.Transects;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.sketch.ControlLine;
import org.seepledger.sketch.Place;

/** What crosses transects, while they are dragged and at rest. */
class TransectModelTest {

    private static final ControlLine FENCE = line("fence", 92, 15, 96, 62, 91, 112);
    private static final ControlLine BROOK = line("brook", 170, 8, 170, 112);

    private final LiveSet depot = LiveSet.depot();
    private final TransectModel model = new TransectModel(
            depot.session, new DirectTasks(), depot.reading, depot.masses, depot.answers, depot.answers);

    @TempDir
    private Path folder;

    private static ControlLine line(String name, double... xy) {
        List<Place> places = new java.util.ArrayList<>();
        for (int i = 0; i < xy.length; i += 2) {
            places.add(new Place(xy[i], xy[i + 1]));
        }
        return new ControlLine(name, places);
    }

    @BeforeEach
    void draw() {
        depot.session.transects().set(new Transects(List.of(FENCE, BROOK), true));
        depot.session.transect().set("fence");
        depot.session.interval().set(9);
    }

    @AfterEach
    void close() {
        depot.close();
    }

    private TransectTable table() {
        return model.table().get().orElseThrow();
    }

    @Test
    void nothingIsWorkedOutWhileNobodyLooks() {
        assertThat(model.table().get()).isEmpty();
        model.open().set(true);
        assertThat(table().rows()).hasSize(3);
        assertThat(table().whose()).startsWith("solvent across fence");
    }

    @Test
    void partsAddUpAndSharesAreOfTheWhole() {
        model.open().set(true);
        List<TransectRow> rows = table().rows();
        TransectRow all = rows.get(2);
        assertThat(all.total()).isTrue();
        assertThat(rows.get(0).discharge() + rows.get(1).discharge())
                .isCloseTo(all.discharge(), within(1e-12 * all.discharge()));
        assertThat(rows.get(0).share() + rows.get(1).share()).isCloseTo(100, within(1e-9));
        assertThat(rows.get(0).areaShare() + rows.get(1).areaShare()).isCloseTo(100, within(1e-9));
        assertThat(all.low()).isLessThanOrEqualTo(all.discharge());
        assertThat(table().half()).isLessThan(table().mostly());
        assertThat(table().concentrated()).startsWith("Half of the discharge crosses");
    }

    @Test
    void aDraggedLineHasItsOwnNumbersAtOnceAndTheRecordWhenItRests() {
        model.open().set(true);
        double before = table().rows().get(2).discharge();
        ControlLine moved = line("fence", 92, 15, 104, 62, 91, 112);
        depot.session.transects().set(new Transects(List.of(moved, BROOK), false));
        double dragged = table().rows().get(2).discharge();
        assertThat(dragged).isNotEqualTo(before);
        depot.reading.every().set(Periods.Every.RECORD);
        assertThat(model.table().get()).isEmpty();
        depot.session.transects().set(new Transects(List.of(moved, BROOK), true));
        assertThat(table().whose()).contains("record");
        assertThat(model.state().get()).isEqualTo(PaneState.READY);
    }

    @Test
    void solutesAndTransectsAreChosen() {
        model.open().set(true);
        double solvent = table().rows().get(2).discharge();
        depot.session.solute().set("breakdown product");
        assertThat(table().whose()).startsWith("breakdown product");
        assertThat(table().rows().get(2).discharge()).isNotEqualTo(solvent);
        model.chosen().set(Optional.of(new TransectModel.Choice("brook", -1)));
        assertThat(depot.session.transect().get()).isEqualTo("brook");
        assertThat(table().rows()).hasSize(2);
    }

    /** 10 × 1 × 2 + 1 × 0.1 × 4 + 4 × 0.5 × 3 = 26.4 g/d. */
    @Test
    void measuredPanelsAreOpenedBesideDrawnOnes() throws IOException {
        model.open().set(true);
        Path file = Files.writeString(folder.resolve("p.csv"), """
                transect,solute,panel,q [m/d],c [mg/L],area [m2]
                row,solvent,a,10,1,2
                row,solvent,b,1,<0.2,4
                row,solvent,c,4,0.5,3
                """);
        depot.answers.paths.add(Optional.of(file));
        model.openPanels();
        assertThat(model.choices()).hasSize(3);
        assertThat(table().whose()).isEqualTo("solvent across row, measured");
        TransectRow all = table().rows().get(3);
        assertThat(all.discharge()).isCloseTo(0.0264, within(1e-15));
        assertThat(all.low()).isCloseTo(0.026, within(1e-15));
        assertThat(all.high()).isCloseTo(0.0268, within(1e-15));
        model.copy();
        assertThat(depot.answers.copied.get(0))
                .contains("discharge, kg/d\tof discharge")
                .contains("safe to drink");
        depot.answers.paths.add(
                Optional.of(Files.writeString(folder.resolve("bad.csv"), "transect,q,c,area\nx,1,1,1\n")));
        model.openPanels();
        assertThat(depot.session.notices().latest().get().orElseThrow().words()).contains("unit");
    }

    @Test
    void withoutTransectsItLeadsToOne() {
        model.open().set(true);
        depot.session.transects().set(Transects.NONE);
        assertThat(model.state().get().phase()).isEqualTo(PaneState.Phase.EMPTY);
        model.draw();
        assertThat(depot.session.demand().get()).isEqualTo(Session.Demand.DRAW_TRANSECT);
    }
}
