package org.seepledger.picture;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.unit.Figures;

/** What a section's lines and textures mean, in rows below it. */
final class SectionKey {

    static final Stroke AT_BEGIN = Stroke.of(Ink.Token.WATER, 1.3).dashed(5.0, 3.0);
    static final Stroke AT_END = Stroke.of(Ink.Token.WATER, 2);

    private static final double SMALL = SectionSheet.SMALL;
    private static final double ROW = 15;
    private static final double SAMPLE = 22;
    private static final double ABOVE = 36;

    /** As wide as an exaggeration is ever written, so that the rows do not depend on it. */
    private static final double SPARE = 30;

    private final Section section;
    private final double width;

    /** A line of words with a sample before it. */
    private record Item(Optional<Mark> sample, String words) {

        double width() {
            return (sample.isPresent() ? SAMPLE + 5 : 0) + Lettering.width(words, SMALL);
        }
    }

    SectionKey(Section section, double width) {
        this.section = section;
        this.width = width;
    }

    /** {@return how many times, to two digits} */
    static String times(double exaggeration) {
        return new BigDecimal(exaggeration).round(new MathContext(2)).toPlainString();
    }

    private List<Item> items(double exaggeration) {
        List<Item> items = new ArrayList<>();
        boolean levels = section.profile().stretches().stream()
                .anyMatch(stretch -> Double.isFinite(stretch.column().level()));
        if (levels) {
            items.add(new Item(
                    Optional.of(sample(AT_END)),
                    "water level"
                            + section.span().map(span -> ", end of " + span).orElse("")));
        }
        if (levels && section.span().isPresent()) {
            items.add(new Item(Optional.of(sample(AT_BEGIN)), "at its begin"));
        }
        if (section.profile().stretches().stream().anyMatch(this::isDry)) {
            Mark.Fill dots = new Mark.Fill(Ink.Token.MUTED, 0.8, Mark.Texture.DOTS);
            items.add(new Item(Optional.of(Mark.Area.of(new Box(0, -9, SAMPLE, 10), dots)), "dry"));
        }
        section.colours().ifPresent(colours -> items.add(new Item(Optional.empty(), "colour: " + colours.words())));
        if (!section.wells().isEmpty()) {
            items.add(new Item(
                    Optional.empty(),
                    "wells within " + Figures.shown(section.within()) + " " + section.lengthUnit()
                            + " of the line, thick: screen or layer"));
        }
        String flow = section.light().unit();
        items.add(new Item(
                Optional.empty(),
                "elevation and distance in " + section.lengthUnit() + ", heights " + times(exaggeration)
                        + " times exaggerated" + (flow.isEmpty() ? "" : "; flow in " + flow)));
        return items;
    }

    private static Mark sample(Stroke stroke) {
        return new Mark.Line(new double[] {0, -3, SAMPLE, -3}, stroke);
    }

    private boolean isDry(Profile.Stretch stretch) {
        for (int layer = 0; layer < section.layers().size(); layer++) {
            if (section.isDry(stretch.column(), layer)) {
                return true;
            }
        }
        return false;
    }

    /** {@return how much room axis and key take below the section} */
    double height() {
        int rows = 1;
        double x = 0;
        for (Item item : items(1)) {
            boolean wraps = x > 0 && x + item.width() + SPARE > width;
            rows += wraps ? 1 : 0;
            x = (wraps ? 0 : x) + item.width() + 14;
        }
        return ABOVE + rows * ROW - 10;
    }

    /**
     * {@return the rows}
     *
     * @param left where they begin
     * @param first the base line of the first
     * @param exaggeration how many times heights are exaggerated
     */
    List<Mark> marks(double left, double first, double exaggeration) {
        List<Mark> marks = new ArrayList<>();
        double x = 0;
        double y = first;
        for (Item item : items(exaggeration)) {
            if (x > 0 && x + item.width() + SPARE > width) {
                x = 0;
                y += ROW;
            }
            double begin = left + x;
            double base = y;
            item.sample().ifPresent(sample -> marks.add(moved(sample, begin, base)));
            double words = begin + (item.sample().isPresent() ? SAMPLE + 5 : 0);
            marks.add(Mark.Text.of(words, base, item.words(), SMALL, Mark.Anchor.START)
                    .in(Ink.Token.MUTED));
            x += item.width() + 14;
        }
        return marks;
    }

    private static Mark moved(Mark sample, double x, double y) {
        if (sample instanceof Mark.Line line) {
            return new Mark.Line(moved(line.xy(), x, y), line.stroke());
        }
        Mark.Area area = (Mark.Area) sample;
        return new Mark.Area(List.of(moved(area.rings().get(0), x, y)), area.fill(), area.stroke());
    }

    private static double[] moved(double[] xy, double x, double y) {
        double[] moved = xy.clone();
        for (int i = 0; i < moved.length; i += 2) {
            moved[i] += x;
            moved[i + 1] += y;
        }
        return moved;
    }
}
