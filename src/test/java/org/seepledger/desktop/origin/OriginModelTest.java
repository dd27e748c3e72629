package org.seepledger.desktop.origin;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.budget.LiveSet;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.desktop.session.DrawnShapes;
import org.seepledger.desktop.session.RowAsked;
import org.seepledger.desktop.solute.MassReading;
import org.seepledger.desktop.solute.SoluteLook;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.job.Rows;
import org.seepledger.job.TracedNumber;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Line;
import org.seepledger.ledger.Period;

class OriginModelTest {

    private LiveSet live;
    private OriginModel model;

    @BeforeEach
    void open() {
        open(LiveSet.valley());
    }

    private void open(LiveSet set) {
        live = set;
        model = new OriginModel(
                live.session,
                live.reading,
                new MassReading(live.session, live.reading),
                new SoluteLook(live.session),
                new DirectTasks(),
                live.answers,
                live.answers);
    }

    @AfterEach
    void close() {
        live.close();
    }

    private void ask(Group group, String item, int layer) {
        live.session.asked().set(Optional.of(new RowAsked(group, item, layer)));
    }

    private double sum() {
        return model.lines().stream()
                .mapToDouble(TracedNumber.Line::contribution)
                .sum();
    }

    /** The rate of an item in the first interval, all layers, as the live budget has it. */
    private double rate(Group group, String item) {
        Period first = live.set.workbench().periods(Periods.Every.INTERVAL, 1).get(0);
        return live.live.known().get().budget(live.prisms.get(0), first).orElseThrow().budget().entries().stream()
                        .filter(entry -> entry.account().group() == group
                                && entry.account().item().equals(item))
                        .mapToDouble(Entry::net)
                        .sum()
                / first.duration();
    }

    @Test
    void sidesSourcesAndStorageAddUpToTheLedger() {
        for (var row : List.of(
                new RowAsked(Group.SIDE, "side 9", Line.ALL_LAYERS),
                new RowAsked(Group.SOURCE, "recharge", Line.ALL_LAYERS),
                new RowAsked(Group.SOURCE, "public supply", Line.ALL_LAYERS),
                new RowAsked(Group.STORAGE, "water-table storage", Line.ALL_LAYERS))) {
            live.session.asked().set(Optional.of(row));
            assertThat(model.state().get()).as(row.item()).isEqualTo(PaneState.READY);
            double ledger = rate(row.group(), row.item());
            double gross = model.lines().stream()
                    .mapToDouble(line -> Math.abs(line.contribution()))
                    .sum();
            assertThat(ledger).isNotZero();
            assertThat(sum()).as(row.item()).isCloseTo(ledger, within(1e-9 * Math.abs(ledger) + 1e-13 * gross));
            assertThat(model.lines().get(0).contribution())
                    .satisfies(first -> assertThat(model.lines())
                            .allMatch(line -> Math.abs(line.contribution()) <= Math.abs(first)));
        }
    }

    @Test
    void whatIsSoughtIsShownAndItsSumTold() {
        ask(Group.SIDE, "side 9", Line.ALL_LAYERS);
        int all = model.lines().size();
        model.sought().set("L3, col 17");
        assertThat(model.lines())
                .isNotEmpty()
                .hasSizeLessThan(all)
                .allMatch(line -> line.file().contains("l3"));
        assertThat(model.shown().get()).startsWith(model.lines().size() + " values");
        model.sought().set("nothing like it");
        assertThat(model.lines()).isEmpty();
    }

    @Test
    void cellsLightUpAndLeadToTheMap() {
        ask(Group.SOURCE, "recharge", Line.ALL_LAYERS);
        model.light(model.lines().subList(0, 2));
        assertThat(live.session.marked().get()).hasSize(2);
        model.goTo(model.lines().get(0));
        assertThat(live.session.target().get()).isPresent();
        ask(Group.SOURCE, "public supply", Line.ALL_LAYERS);
        assertThat(live.session.marked().get()).isEmpty();
        assertThat(model.lines().get(0).cell()).isEmpty();
    }

    @Test
    void whatHasNoTraceSaysSo() {
        ask(Group.TOTAL, "residual", Line.ALL_LAYERS);
        assertThat(model.sum().get()).contains("is rounding");
        ask(Group.TOTAL, "closure error", Line.ALL_LAYERS);
        assertThat(model.state().get().words()).contains("ratio of sums", "residual");
        ask(Group.SIDE, "", 0);
        assertThat(model.state().get().words()).contains("no row of its own");
        assertThat(model.command().get()).isEmpty();
    }

    @Test
    void anotherGeometryIsSaidAndNotWritten() {
        ask(Group.SIDE, "side 9", 0);
        assertThat(model.command().get())
                .contains("--row 'well field/interval 1/side/side 9/1'", "--clip")
                .doesNotContain("--every");
        live.session.drawing().set(new Drawing(2, List.of(LiveSet.moved(live.prisms.get(0), 30)), true));
        assertThat(model.changed().get()).isTrue();
        model.export();
        assertThat(live.answers.asked).isEmpty();
        model.again();
        assertThat(model.changed().get()).isFalse();
    }

    @Test
    void volumesOfTheLedgerAreToldToo() {
        live.reading.volumes().set(true);
        live.reading.every().set(Periods.Every.YEAR);
        ask(Group.SIDE, "side 9", 0);
        assertThat(model.sum().get()).contains("m³/d", "m³ over the period");
        assertThat(model.command().get()).contains("--every year");
    }

    /** A depot's solvent: the file that is written is the command's, and adds up to what the page says. */
    @Test
    void numbersOfSolutesAreTracedToConcentrations(@TempDir Path folder) throws IOException {
        live.close();
        live = LiveSet.depot();
        live.session
                .shapes()
                .set(new DrawnShapes(
                        live.set
                                .workbench()
                                .drawings()
                                .drawing(live.set.path().resolve("prisms.geojson"))
                                .drawing(),
                        true));
        open(live);
        live.session.solute().set("solvent");
        String side = live.prisms.get(0).rings().get(0).sides().get(0).item();
        ask(Group.SIDE, side, Line.ALL_LAYERS);
        assertThat(model.state().get()).isEqualTo(PaneState.READY);
        assertThat(model.belongs().get()).contains("solvent", side);
        assertThat(model.sum().get()).contains("kg/d");
        assertThat(model.lines()).isNotEmpty().allMatch(line -> line.file().equals("concentration.csv"));
        assertThat(model.command().get()).contains("--solute solvent", "--rate-unit kg/d");
        Path file = folder.resolve("trace.csv");
        live.answers.paths.add(Optional.of(file));
        model.export();
        List<CSVRecord> rows = Rows.of(file);
        assertThat(rows).hasSameSizeAs(model.lines());
        double written = rows.stream()
                .mapToDouble(row -> Double.parseDouble(row.get("value")) * Double.parseDouble(row.get("weight")))
                .sum();
        assertThat(sum()).isCloseTo(written, within(1e-12 * Math.abs(written)));
        ask(Group.TOTAL, "inflow", Line.ALL_LAYERS);
        assertThat(model.state().get().words()).contains("not linear in concentrations");
    }
}
