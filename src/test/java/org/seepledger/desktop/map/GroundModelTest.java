package org.seepledger.desktop.map;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.desktop.port.GivenAnswers;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.io.raster.GeoTiffWriter;
import org.seepledger.job.GroundPicture;

class GroundModelTest {

    @TempDir
    private Path folder;

    private final Session session = new Session();
    private final GivenAnswers answers = new GivenAnswers();
    private final GroundModel model = new GroundModel(session, new DirectTasks(), answers);
    private final Grid grid = new Grid(Axis.even(500000, 100, 3), Axis.even(5200000, 100, 2), 0, 1);
    private Opening opening;

    @BeforeEach
    void open() {
        opening = Opening.of(Path.of("sample-aquifers/valley"));
        session.show(Optional.of(opening.set()));
    }

    @AfterEach
    void close() {
        opening.set().close();
    }

    private void choose(String crs) throws IOException {
        Path file = folder.resolve("photo.tif");
        double[][] rows = {{0, 5, 10}, {10, Double.NaN, 0}};
        GeoTiffWriter.write(file, grid, grid.window(), Optional.of(crs), row -> rows[row]);
        answers.paths.add(Optional.of(file));
        model.choose();
    }

    @Test
    void oneBandIsShownInGreyWhereItLies() throws IOException {
        choose("EPSG:32633");
        GroundPicture picture = model.picture().get().orElseThrow();
        assertThat(picture.argb()).containsExactly(0xff000000, 0xff808080, -1, -1, 0, 0xff000000);
        assertThat(picture.placement()).containsExactly(100, 0, 0, -100, 500000, 5200200);
        model.clear();
        assertThat(model.picture().get()).isEmpty();
    }

    @Test
    void aPictureInAnotherSystemIsRefusedWithTheRemedy() throws IOException {
        choose("EPSG:32632");
        assertThat(model.picture().get()).isEmpty();
        assertThat(session.notices().latest().get().orElseThrow().words())
                .contains("EPSG:32632", "gdalwarp -t_srs EPSG:32633");
    }

    @Test
    void whatIsNoPictureIsSaid() {
        answers.paths.add(Optional.of(Path.of("README.md")));
        model.choose();
        assertThat(session.notices().latest().get().orElseThrow().words()).contains("README.md");
        answers.paths.add(Optional.empty());
        model.choose();
        assertThat(model.picture().get()).isEmpty();
    }
}
