package org.seepledger.desktop.platform;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import javafx.geometry.Rectangle2D;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.desktop.port.GivenAnswers;

class WindowPlaceTest {

    private static final Rectangle2D LEFT = new Rectangle2D(-1920, 0, 1920, 1080);
    private static final Rectangle2D RIGHT = new Rectangle2D(0, 30, 1280, 770);

    @ParameterizedTest
    @CsvSource({
        "-1800, 40, true, false",
        "100, 100, true, true",
        "1250, 100, false, false",
        "100, 790, true, true",
        "100, 900, false, false",
        "100, -300, false, false",
        "-1000, 100, true, false",
        "5000, 5000, false, false"
    })
    void aPlaceCountsWhereItsUpperEdgeCanBeTakenHoldOf(double x, double y, boolean onTwo, boolean onOne) {
        WindowPlace.Kept kept = new WindowPlace.Kept(new Rectangle2D(x, y, 900, 600), false);
        assertThat(kept.isOn(List.of(LEFT, RIGHT))).isEqualTo(onTwo);
        assertThat(kept.isOn(List.of(RIGHT))).isEqualTo(onOne);
    }

    @Test
    void itIsReadAsItIsWritten() {
        WindowPlace.Kept kept = new WindowPlace.Kept(new Rectangle2D(-7, 12, 1300, 800), true);
        assertThat(WindowPlace.Kept.of(kept.text())).contains(kept);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "1 2 3", "a b c d e", "0 0 NaN 600 false", "0 0 -5 600 false", "0 0 1e9 600 false"})
    void whatIsNoPlaceIsNone(String text) {
        assertThat(WindowPlace.Kept.of(text)).isEmpty();
    }

    @Test
    void eachPurposeHasAFolderOfItsOwnWhileItIsThere(@TempDir Path folder) throws Exception {
        LastFolders folders = new LastFolders(new GivenAnswers());
        Path maps = Files.createDirectory(folder.resolve("maps"));
        folders.remember("Lay a picture under the map", maps.resolve("a.tif").toFile());
        assertThat(folders.of("Lay a picture under the map")).contains(maps.toFile());
        assertThat(folders.of("Write the prisms to")).isEmpty();
        Files.delete(maps);
        assertThat(folders.of("Lay a picture under the map")).isEmpty();
        folders.remember("x".repeat(200), folder.resolve("b").toFile());
        assertThat(folders.of("x".repeat(200))).contains(folder.toFile());
    }
}
