package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;

class HistoryTest {

    private static final Drawing ONE = Drawing.EMPTY.with(Shape.of("a", Drawn.box(0, 0, 10, 10)));
    private static final Drawing TWO = ONE.with(Shape.of("b", Drawn.box(20, 0, 30, 10)));

    @Test
    void undoesAndRedoes() {
        History history = new History(Drawing.EMPTY);
        assertThat(history.undoable()).isEmpty();
        history.step("Draw a", ONE);
        history.step("Draw b", TWO);
        assertThat(history.undoable()).contains("Draw b");
        history.undo();
        assertThat(history.current()).isSameAs(ONE);
        assertThat(history.redoable()).contains("Draw b");
        assertThat(history.undoable()).contains("Draw a");
        history.redo();
        assertThat(history.current()).isSameAs(TWO);
        assertThat(history.redoable()).isEmpty();
        history.redo();
        assertThat(history.current()).isSameAs(TWO);
    }

    @Test
    void aNewStepForgetsWhatWasUndone() {
        History history = new History(ONE);
        history.step("Draw b", TWO);
        history.undo();
        history.step("Rename", ONE.rename("a", "c"));
        assertThat(history.redoable()).isEmpty();
        history.undo();
        assertThat(history.current()).isSameAs(ONE);
    }

    @Test
    void aGestureIsOneStep() {
        History history = new History(ONE);
        history.begin("Move prism");
        for (int dx = 1; dx <= 50; dx++) {
            int by = dx;
            history.preview(history.settled().edit("a", shape -> shape.moved(by, 0)));
        }
        assertThat(history.isGesturing()).isTrue();
        assertThat(history.settled()).isSameAs(ONE);
        assertThat(history.undoable()).isEmpty();
        history.undo();
        assertThat(history.current().outline(RingAt.outer("a")).place(0)).isEqualTo(new Place(50, 0));
        history.commit();
        assertThat(history.undoable()).contains("Move prism");
        history.undo();
        assertThat(history.current()).isSameAs(ONE);
        assertThat(history.undoable()).isEmpty();
    }

    @Test
    void givingAGestureUpRestoresTheVerySameDrawing() {
        History history = new History(ONE);
        history.step("Draw b", TWO);
        history.undo();
        history.begin("Move prism");
        history.preview(TWO);
        history.cancel();
        assertThat(history.current()).isSameAs(ONE);
        assertThat(history.redoable()).contains("Draw b");
        history.cancel();
        assertThat(history.current()).isSameAs(ONE);
    }

    @Test
    void aGestureThatEndsWhereItBeganIsNoStep() {
        History history = new History(ONE);
        history.begin("Move prism");
        history.preview(TWO);
        history.preview(ONE.edit("a", shape -> shape.moved(0, 0)));
        history.commit();
        assertThat(history.current()).isSameAs(ONE);
        assertThat(history.undoable()).isEmpty();
    }

    @Test
    void gesturesDoNotNest() {
        History history = new History(ONE);
        assertThatThrownBy(() -> history.preview(TWO)).isInstanceOf(IllegalStateException.class);
        assertThatThrownBy(history::commit).isInstanceOf(IllegalStateException.class);
        history.begin("Move prism");
        assertThatThrownBy(() -> history.begin("Another")).isInstanceOf(IllegalStateException.class);
        assertThatThrownBy(() -> history.step("Another", TWO)).isInstanceOf(IllegalStateException.class);
    }

    @Property(tries = 50)
    void undoesToTheStartAndRedoesToTheEnd(@ForAll @IntRange(max = 1_000_000) int seed) {
        Random random = new Random(seed);
        History history = new History(Drawing.EMPTY);
        List<Drawing> drawings = new ArrayList<>(List.of(Drawing.EMPTY));
        for (int i = 0; i < 300; i++) {
            history.step("step " + i, edited(history.current(), random));
            if (history.current() != drawings.get(drawings.size() - 1)) {
                drawings.add(history.current());
            }
        }
        for (int i = drawings.size() - 1; i > 0; i--) {
            assertThat(history.current()).isSameAs(drawings.get(i));
            history.undo();
        }
        assertThat(history.undoable()).isEmpty();
        for (Drawing drawing : drawings) {
            assertThat(history.current()).isSameAs(drawing);
            history.redo();
        }
        assertThat(history.redoable()).isEmpty();
    }

    private static Drawing edited(Drawing drawing, Random random) {
        if (drawing.shapes().size() < 3) {
            return drawing.with(Drawn.starShape(random, drawing.freeName("star")));
        }
        String name = drawing.shapes().get(random.nextInt(3)).name();
        RingAt ring = RingAt.outer(name);
        int vertex = random.nextInt(drawing.outline(ring).size());
        Place place = drawing.outline(ring).place(vertex).moved(random.nextDouble(), random.nextDouble());
        return switch (random.nextInt(6)) {
            case 0 -> drawing.edit(ring, outline -> outline.move(vertex, place));
            case 1 -> drawing.edit(ring, outline -> outline.insert(vertex, place));
            case 2 -> drawing.rename(name, drawing.freeName("star"));
            case 3 -> drawing.reorder(name, random.nextInt(3));
            case 4 -> drawing.edit(name, shape -> shape.noted("note " + random.nextInt(2)));
            default -> drawing.without(name);
        };
    }
}
