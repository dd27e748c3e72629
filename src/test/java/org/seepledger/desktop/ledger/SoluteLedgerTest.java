package org.seepledger.desktop.ledger;

import static org.assertj.core.api.Assertions.assertThat;

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
import org.seepledger.desktop.ledger.LedgerRow.Kind;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.job.PlumeJob;
import org.seepledger.job.Requests;
import org.seepledger.ledger.Group;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;

/** The ledger of a solute, as rows and as copied. */
class SoluteLedgerTest {

    private static final Path DEPOT = Path.of("sample-aquifers/depot");

    private final LiveSet depot = LiveSet.depot();
    private final LedgerModel model =
            new LedgerModel(depot.session, depot.live, depot.reading, depot.plumes, depot.masses, depot.answers);

    @TempDir
    private Path folder;

    @BeforeEach
    void look() {
        depot.session.interval().set(4);
        depot.session.solute().set("breakdown product");
    }

    @AfterEach
    void close() {
        depot.close();
    }

    private LedgerRow row(Group group, String item) {
        return model.rows().stream()
                .filter(row -> row.kind() != Kind.HEADING
                        && row.group() == group
                        && row.item().equals(item))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void hasTheRowsOfASolute() {
        assertThat(model.rows().stream()
                        .filter(row -> row.kind() == Kind.HEADING)
                        .map(LedgerRow::label))
                .containsExactly("Held, in kg", "Advection", "Sources", "Decay", "Storage", "Together");
        assertThat(model.unit().get()).isEqualTo("kg/d");
        assertThat(model.belongs().get()).startsWith("breakdown product: yard");
        assertThat(model.closure().get()).startsWith("Closure error").contains("kg/d");
        assertThat(row(Group.DECAY, "decay").outflow()).isPositive();
        assertThat(row(Group.PRODUCTION, "production").inflow()).isPositive();
        assertThat(row(Group.STORAGE, "mass change").low())
                .isNotEqualTo(row(Group.STORAGE, "mass change").high());
        depot.look.dispersion().set(true);
        assertThat(row(Group.DISPERSION, "meadow side").isFace()).isTrue();
    }

    @Test
    void waterHasNoneOfIt() {
        depot.session.solute().set("");
        assertThat(model.unit().get()).isEqualTo("m3/d");
        assertThat(model.closure().get()).isEmpty();
        assertThat(model.rows()).noneMatch(row -> row.kind() == Kind.HELD || !Double.isNaN(row.low()));
    }

    /** While dragged, from the interval alone; at rest, from the record; for a year of several intervals. */
    @Test
    void isTheCommandsTableDigitForDigit() throws IOException {
        depot.look.dispersion().set(true);
        depot.reading.volumes().set(true);
        model.arrangement().set(Arrangement.ITEMS_BY_LAYER);
        Prism moved = LiveSet.moved(depot.prisms.get(0), 3.7);
        for (boolean settled : new boolean[] {false, true}) {
            depot.session.drawing().set(new Drawing(7, List.of(moved, depot.prisms.get(1)), settled));
            assertThat(copied()).containsExactlyInAnyOrderElementsOf(ofCommand("interval 5", Periods.Every.INTERVAL));
        }
        depot.reading.every().set(Periods.Every.YEAR);
        assertThat(copied()).containsExactlyInAnyOrderElementsOf(ofCommand("2022", Periods.Every.YEAR));
    }

    private List<String> copied() {
        model.copy();
        String text = depot.answers.copied.get(depot.answers.copied.size() - 2);
        assertThat(text).contains("no finding that water is safe");
        return text.lines()
                .map(line -> line.split("\t", -1))
                .filter(cells -> cells.length == 7 && cells[6].equals("kg"))
                .filter(cells -> !cells[0].equals("both together"))
                .map(cells -> String.join(" ", List.of(cells).subList(1, 6)).strip())
                .toList();
    }

    private List<String> ofCommand(String period, Periods.Every every) throws IOException {
        Path prisms = folder.resolve("moved.geojson");
        Files.writeString(
                prisms,
                Files.readString(DEPOT.resolve("prisms.geojson"))
                        .replace(
                                "[[[20, 20], [120, 20], [120, 110], [20, 110], [20, 20]]]",
                                "[[[23.7, 20], [123.7, 20], [123.7, 110], [23.7, 110], [23.7, 20]]]"));
        Path out = folder.resolve("out " + Math.random());
        PlumeJob.run(Requests.plume(DEPOT, prisms, out, every, true, Optional.empty()), Progress.NONE);
        return Files.readAllLines(out.resolve("plume.csv")).stream()
                .map(line -> line.split(",", -1))
                .filter(cells -> cells.length == 21 && cells[0].equals("yard") && cells[1].equals("breakdown product"))
                .filter(cells -> cells[2].equals(period) && !cells[16].equals("%"))
                .map(cells -> String.join(" ", cells[13], cells[14], cells[15], cells[18], cells[20])
                        .strip())
                .toList();
    }
}
