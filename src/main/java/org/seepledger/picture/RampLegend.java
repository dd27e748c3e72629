package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.picture.Mark.Anchor;
import org.seepledger.picture.Mark.Stroke;

/** Says which value a colour of a ramp stands for: a strip of it with ticks at round values. */
final class RampLegend {

    /** How high a level legend is, in logical pixels. */
    static final double LEVEL_HEIGHT = 46;

    private static final double SIZE = 11;
    private static final double STRIP = 12;
    private static final double TICK = 4;
    private static final int COLOURS = 256;

    private final ValueScale scale;
    private final List<Mark> marks = new ArrayList<>();

    private RampLegend(ValueScale scale) {
        this.scale = scale;
    }

    /**
     * {@return a legend that lies level}
     *
     * @param scale which colour a value has
     * @param opacity of the colours, from 0 to 1
     * @param words what the values are, with their unit
     * @param place where it goes; its height is {@link #LEVEL_HEIGHT}, its width at least 80
     */
    static List<Mark> level(ValueScale scale, double opacity, String words, Box place) {
        RampLegend legend = new RampLegend(scale);
        Box strip = new Box(place.x(), place.y() + 17, place.width(), STRIP);
        legend.marks.add(title(words, place));
        legend.strip(strip, new double[] {strip.width() / COLOURS, 0, 0, STRIP, strip.x(), strip.y()}, opacity);
        Labels labels = new Labels(new Box(place.x() - 2, strip.bottom() - 2, place.width() + 4, 34));
        RoundValues ticks = levelTicks(scale, place.width());
        for (int i = 0; i < ticks.count(); i++) {
            double x = strip.x() + scale.share(ticks.values().get(i)) * strip.width();
            double half = Lettering.width(ticks.label(i), SIZE) / 2;
            double middle = Math.max(place.x() + half, Math.min(place.right() - half, x));
            double base = strip.bottom() + TICK + SIZE;
            if (labels.place(List.of(Mark.Text.of(middle, base, ticks.label(i), SIZE, Anchor.MIDDLE)), legend.marks)) {
                legend.tick(x, strip.bottom(), x, strip.bottom() + TICK);
            }
        }
        return legend.marks;
    }

    /** {@return as many ticks as have room for their labels} */
    private static RoundValues levelTicks(ValueScale scale, double length) {
        RoundValues best = scale.ticks(3);
        for (int most = 4; most <= 12; most++) {
            RoundValues finer = scale.ticks(most);
            double room = 0;
            for (int i = 0; i < finer.count(); i++) {
                room += Lettering.width(finer.label(i), SIZE) + SIZE;
            }
            best = room <= length ? finer : best;
        }
        return best;
    }

    private static Mark.Text title(String words, Box place) {
        return Mark.Text.of(
                place.x(), place.y() + 11, Lettering.fitted(words, SIZE, place.width()), SIZE, Anchor.START);
    }

    private void strip(Box strip, double[] placement, double opacity) {
        int[] colours = new int[COLOURS];
        for (int i = 0; i < COLOURS; i++) {
            colours[i] = scale.argb(scale.at((i + 0.5) / COLOURS), opacity);
        }
        marks.add(new Mark.Image(COLOURS, 1, colours, placement));
        marks.add(Mark.Area.of(strip, Stroke.of(Ink.Token.MUTED, 1)));
    }

    private void tick(double fromX, double fromY, double toX, double toY) {
        marks.add(new Mark.Line(new double[] {fromX, fromY, toX, toY}, Stroke.of(Ink.Token.MUTED, 1)));
    }
}
