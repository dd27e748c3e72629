package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.assertj.core.api.SoftAssertions;

/** What a picture shows, for tests. */
final class Drawn {

    private static final double ROUNDING = 1e-6;

    private Drawn() {}

    static List<Mark.Text> texts(List<Mark> marks) {
        return of(Mark.Text.class, marks);
    }

    static List<String> words(Picture picture) {
        return texts(picture.marks()).stream().map(Mark.Text::words).toList();
    }

    static <T> List<T> of(Class<T> kind, List<Mark> marks) {
        return marks.stream().filter(kind::isInstance).map(kind::cast).toList();
    }

    /** The filled areas of an ink, as the boxes round them; swatches of a key left out. */
    static List<Box> filled(Picture picture, Ink.Token ink) {
        return of(Mark.Area.class, picture.marks()).stream()
                .filter(area -> area.fill().map(fill -> fill.ink() == ink).orElse(false))
                .map(Drawn::box)
                .filter(box -> !(Math.abs(box.width() - 16) < ROUNDING && Math.abs(box.height() - 11) < ROUNDING))
                .toList();
    }

    static Box box(Mark.Area area) {
        double left = Double.POSITIVE_INFINITY;
        double top = Double.POSITIVE_INFINITY;
        double right = Double.NEGATIVE_INFINITY;
        double bottom = Double.NEGATIVE_INFINITY;
        for (double[] ring : area.rings()) {
            for (int i = 0; i < ring.length; i += 2) {
                left = Math.min(left, ring[i]);
                right = Math.max(right, ring[i]);
                top = Math.min(top, ring[i + 1]);
                bottom = Math.max(bottom, ring[i + 1]);
            }
        }
        return new Box(left, top, right - left, bottom - top);
    }

    /** Checks that all lies within the picture, and that no text covers another. */
    static void isLegible(Picture picture) {
        Box whole = new Box(0, 0, picture.width(), picture.height()).inset(-ROUNDING);
        List<Box> boxes = new ArrayList<>();
        SoftAssertions all = new SoftAssertions();
        for (Mark.Text text : texts(picture.marks())) {
            Box box = Lettering.box(text).inset(0.01);
            all.assertThat(whole.holds(box)).as("%s lies within", text.words()).isTrue();
            for (int i = 0; i < boxes.size(); i++) {
                all.assertThat(boxes.get(i).meets(box))
                        .as("%s covers %s", text.words(), words(picture).get(i))
                        .isFalse();
            }
            boxes.add(box);
        }
        all.assertAll();
        assertThat(of(Mark.Area.class, picture.marks()).stream().map(Drawn::box))
                .allMatch(whole::holds);
        for (Mark.Line line : of(Mark.Line.class, picture.marks())) {
            for (int i = 0; i < line.xy().length; i += 2) {
                assertThat(line.xy()[i]).isBetween(-ROUNDING, picture.width() + ROUNDING);
                assertThat(line.xy()[i + 1]).isBetween(-ROUNDING, picture.height() + ROUNDING);
            }
        }
    }
}
