package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;

class LabelsTest {

    private static final Box FRAME = new Box(0, 0, 300, 200);

    @Property(tries = 100)
    void noLabelCoversAnotherOrLeavesTheFrame(@ForAll long seed) {
        Random random = new Random(seed);
        Labels labels = new Labels(FRAME);
        Box free = new Box(100, 50, 60, 60);
        labels.keepFree(free);
        List<Mark> marks = new ArrayList<>();
        for (int i = 0; i < 60; i++) {
            labels.place(
                    Labels.around(300 * random.nextDouble(), 200 * random.nextDouble(), 4, "label " + i, 11), marks);
        }
        List<Box> boxes =
                marks.stream().map(mark -> Lettering.box((Mark.Text) mark)).toList();
        assertThat(boxes).hasSizeGreaterThan(3).allMatch(FRAME::holds).noneMatch(free::meets);
        for (int i = 0; i < boxes.size(); i++) {
            assertThat(boxes.subList(0, i)).noneMatch(boxes.get(i)::meets);
        }
    }

    @Test
    void whoComesFirstHasTheChoice() {
        List<Mark> marks = new ArrayList<>();
        Labels labels = new Labels(FRAME);
        assertThat(labels.place(Labels.around(150, 100, 4, "first", 11), marks)).isTrue();
        assertThat(labels.place(Labels.around(150, 100, 4, "second", 11), marks))
                .isTrue();
        Mark.Text first = (Mark.Text) marks.get(0);
        assertThat(first.x()).isEqualTo(154);
        assertThat(first.y()).isEqualTo(96);
        assertThat(labels.place(List.of(first), marks)).isFalse();
        assertThat(marks).hasSize(2);
    }

    @Test
    void wordsAreCutToTheRoomThereIs() {
        assertThat(Lettering.fitted("river bank", 10, 100)).isEqualTo("river bank");
        String cut = Lettering.fitted("a boundary with a very long name", 10, 60);
        assertThat(cut).startsWith("a bo").endsWith("…");
        assertThat(Lettering.width(cut, 10)).isLessThanOrEqualTo(60);
        assertThat(Lettering.fitted("river bank", 10, 1)).isEqualTo("…");
    }
}
