package org.seepledger.desktop.welcome;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.desktop.port.GivenAnswers;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.sample.SampleCopy;

class WelcomeModelTest {

    private static final Path VALLEY = Path.of("sample-aquifers/valley");

    private final GivenAnswers answers = new GivenAnswers();
    private final List<Opening> opened = new ArrayList<>();
    private final WelcomeModel model =
            new WelcomeModel(new DirectTasks(), answers, answers, opened::add, Runnable::run);

    @AfterEach
    void close() {
        opened.forEach(opening -> opening.set().close());
    }

    @Test
    void samplesAreFoundOnceWithWhatTheySayOfThemselves() {
        model.look(List.of(Path.of(""), Path.of("target/..")));
        assertThat(model.samples())
                .extracting(Place::title)
                .containsExactly("Invented depot", "Invented river terrace", "Invented valley");
        assertThat(model.samples().get(2).lead())
                .isEqualTo("A river meanders down a valley that rock closes on all sides.");
    }

    @Test
    void whereThereAreNoSamplesTheListStaysEmpty(@TempDir Path nowhere) {
        model.look(List.of(nowhere, nowhere.resolve("not there")));
        assertThat(model.samples()).isEmpty();
    }

    @Test
    void aFolderOpensWithThePrismsBesideItAndIsRemembered() {
        answers.paths.add(Optional.of(VALLEY));
        model.choose();
        assertThat(opened).hasSize(1);
        assertThat(opened.get(0).kept().drawing().shapes()).isNotEmpty();
        assertThat(model.state().get()).isEqualTo(PaneState.READY);
        assertThat(answers.list()).containsExactly(VALLEY);
        model.look(List.of());
        assertThat(model.recent()).extracting(Place::folder).containsExactly(VALLEY);
    }

    @Test
    void theSetFileItselfWillDo() {
        model.drop(List.of(VALLEY.resolve("aquifer.json")));
        assertThat(opened).hasSize(1);
        assertThat(opened.get(0).set().path()).isEqualTo(VALLEY.toAbsolutePath());
    }

    @Test
    void thinkingBetterOfItChangesNothing() {
        answers.paths.add(Optional.empty());
        model.choose();
        model.drop(List.of());
        assertThat(opened).isEmpty();
        assertThat(model.state().get()).isEqualTo(PaneState.READY);
    }

    @Test
    void whatIsWrongIsSaidWithFileAndRemedy(@TempDir Path folder) throws IOException {
        Files.writeString(folder.resolve("aquifer.json"), "{\"name\": \"x\"");
        model.open(folder);
        assertThat(opened).isEmpty();
        assertThat(model.state().get().phase()).isEqualTo(PaneState.Phase.FAILED);
        assertThat(model.state().get().words()).contains("aquifer.json", "line 1");
        assertThat(answers.list()).isEmpty();
    }

    @Test
    void brokenPrismsBesideASoundSetAreSaidToo(@TempDir Path folder) throws IOException {
        SampleCopy.of("valley", folder);
        Files.writeString(folder.resolve("prisms.geojson"), "{\"type\": \"Feature\"}");
        model.open(folder);
        assertThat(opened).isEmpty();
        assertThat(model.state().get().words()).contains("prisms.geojson");
    }

    @Test
    void foldersThatAreGoneAreNotListed(@TempDir Path folder) {
        answers.remember(folder.resolve("gone"));
        model.look(List.of());
        assertThat(model.recent()).isEmpty();
    }
}
