package org.seepledger.desktop.draw;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.desktop.port.GivenAnswers;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.sample.SampleCopy;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Reach;
import org.seepledger.sketch.Shape;

/** Surfaces as lids, and buffers, typed into the card. */
class CardTest {

    @TempDir
    private Path folder;

    private final Session session = new Session();
    private final GivenAnswers answers = new GivenAnswers();
    private final DraftModel model = new DraftModel(session);
    private final DraftFiles files = new DraftFiles(model, new DirectTasks(), answers, answers);
    private final CardModel card = new CardModel(model, new LidSurfaces(model, new DirectTasks(), answers));
    private Opening opening;

    @BeforeEach
    void open() throws IOException {
        SampleCopy.of("valley", folder);
        opening = Opening.of(folder);
        session.show(Optional.of(opening.set()));
        files.begin(opening);
    }

    @AfterEach
    void close() {
        opening.set().close();
    }

    private Reach reach() {
        return model.selected().orElseThrow().reach();
    }

    @Test
    void aSurfaceIsChosenAsALidAndSavedByItsName() throws IOException {
        answers.paths.add(Optional.of(folder.resolve("loam_base.tif")));
        card.chooseTop("");
        assertThat(reach())
                .isEqualTo(new Reach.Between(Optional.of(new Limit.Surface("loam_base.tif")), Optional.empty()));
        assertThat(card.topText()).isEqualTo("loam_base.tif");
        answers.paths.add(Optional.of(folder.resolve("clay_base.tif")));
        card.chooseBottom(card.topText());
        assertThat(card.bottomText()).isEqualTo("clay_base.tif");
        files.save();
        assertThat(Files.readString(folder.resolve(Opening.PRISMS))).contains("\"clay_base.tif\"");
        model.undo();
        assertThat(card.bottomText()).isEmpty();
    }

    @Test
    void aSurfaceElsewhereIsRefusedWithTheWayOut(@TempDir Path elsewhere) throws IOException {
        Drawing before = model.drawing();
        Path raster = Files.copy(folder.resolve("rock.tif"), elsewhere.resolve("rock.tif"));
        answers.paths.add(Optional.of(raster));
        card.chooseTop("");
        assertThat(session.notices().latest().get().orElseThrow().words())
                .contains("copy it to")
                .contains(folder.toString());
        Files.writeString(folder.resolve("broken.tif"), "no raster");
        card.lids("broken.tif", "");
        assertThat(session.notices().latest().get().orElseThrow().words()).contains("broken.tif");
        answers.paths.add(Optional.empty());
        card.chooseBottom("");
        assertThat(model.drawing()).isEqualTo(before);
    }

    @Test
    void aBufferOutwardsIsANewPrismRoundTheSelectedOneWithItsReach() {
        Shape field = model.selected().orElseThrow();
        double perimeter = 0;
        for (var outline : field.outlines().values()) {
            for (int side = 0; side < outline.size(); side++) {
                perimeter += outline.place(side).distance(outline.place(side + 1));
            }
        }
        assertThat(card.buffer("20")).isTrue();
        Shape buffer = model.selected().orElseThrow();
        assertThat(buffer.name()).isEqualTo("well field buffer");
        assertThat(buffer.reach()).isEqualTo(field.reach());
        assertThat(buffer.area()).isBetween(field.area(), field.area() + 20 * perimeter + 400 * Math.PI);
        assertThat(model.drawing().find("well field")).contains(field);
        model.undo();
        assertThat(model.drawing().find("well field buffer")).isEmpty();
    }

    @Test
    void aBufferInwardsIsSmallerAndOneThatLeavesNothingIsRefused() {
        Shape field = model.selected().orElseThrow();
        assertThat(card.buffer("−15")).isTrue();
        assertThat(model.selected().orElseThrow().area()).isLessThan(field.area());
        session.selected().set(field.name());
        assertThat(card.buffer("-5000")).isFalse();
        assertThat(session.status().get()).contains("Nothing would be left");
        assertThat(card.buffer("far")).isFalse();
        assertThat(session.status().get()).contains("is a number");
        assertThat(card.buffer("0")).isFalse();
        session.selected().set("");
        assertThat(card.buffer("5")).isFalse();
    }
}
