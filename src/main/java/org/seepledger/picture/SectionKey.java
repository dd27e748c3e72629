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
    private static final double BELOW = 5;
    private static final double GAP = 14;

    /** As wide as an exaggeration is written, so that the rows do not depend on it. */
    private static final String ANY = "0.0000";

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

    private List<Item> items(String times) {
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
                "elevation and distance in " + section.lengthUnit() + ", heights " + times + " times exaggerated"
                        + (flow.isEmpty() ? "" : "; flow in " + flow)));
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

    /** Where each item begins: x, and how many rows below the first. */
    private List<double[]> places() {
        List<double[]> places = new ArrayList<>();
        double x = 0;
        int row = 0;
        for (Item item : items(ANY)) {
            if (x > 0 && x + item.width() > width) {
                x = 0;
                row++;
            }
            places.add(new double[] {x, row});
            x += item.width() + GAP;
        }
        return places;
    }

    /** {@return how much room axis and key take below the section} */
    double height() {
        List<double[]> places = places();
        return ABOVE + places.get(places.size() - 1)[1] * ROW + BELOW;
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
        List<double[]> places = places();
        List<Item> items = items(times(exaggeration));
        for (int i = 0; i < items.size(); i++) {
            Item item = items.get(i);
            double x = left + places.get(i)[0];
            double y = first + places.get(i)[1] * ROW;
            item.sample().ifPresent(sample -> marks.add(moved(sample, x, y)));
            double words = x + (item.sample().isPresent() ? SAMPLE + 5 : 0);
            String fitted = Lettering.fitted(item.words(), SMALL, left + width - words);
            marks.add(Mark.Text.of(words, y, fitted, SMALL, Mark.Anchor.START).in(Ink.Token.MUTED));
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
