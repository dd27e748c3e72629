package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;

/**
 * Vertical sections as pictures, for pages and for the window: layers, values as colour, water levels, the bodies of prisms,
 * wells nearby with their screens, and the flow through the lids of the prism that stands out.
 */
public final class SectionPicture {

    private static final double HEIGHT = 260;
    private static final double TOP = 22;
    private static final double LEFT = 48;
    private static final double RIGHT = SectionDrawing.RIGHT;
    private static final double LEGEND = 360;
    private static final double GAP = 4;

    /** Wells are shown up to this share of the line's length beside it, unless somebody says otherwise. */
    private static final double NEARBY = 0.04;

    private SectionPicture() {}

    /**
     * What cells are coloured by.
     *
     * @param values a value of each cell
     * @param scale which colour a value has
     * @param words what the values are, with their unit
     */
    public record Shade(Profile.LayerValues values, ValueScale scale, String words) {}

    /**
     * {@return a section through a prism with its budget over the record; none where the line meets no layer}
     *
     * @param aquifer the aquifer
     * @param prism the prism
     * @param line the line
     * @param budget the prism's budget over the record
     * @param unit the unit to show
     * @param width in logical pixels
     */
    public static Optional<Picture> of(
            Aquifer aquifer, Prism prism, SectionLine line, PeriodBudget budget, UnitShown unit, double width) {
        return of(aquifer, prism, line, budget, unit, Optional.empty(), width);
    }

    /**
     * {@return the section with cells coloured by a value; none where the line meets no layer}
     *
     * @param aquifer the aquifer
     * @param prism the prism
     * @param line the line
     * @param budget the prism's budget over the record
     * @param unit the unit to show
     * @param shade what cells are coloured by, if by anything
     * @param width in logical pixels
     */
    public static Optional<Picture> of(
            Aquifer aquifer,
            Prism prism,
            SectionLine line,
            PeriodBudget budget,
            UnitShown unit,
            Optional<Shade> shade,
            double width) {
        int end = aquifer.times().intervals();
        Profile profile = Profile.along(line, aquifer, 0, end, shade.map(Shade::values), Progress.NONE);
        double within = nearby(profile);
        boolean moves = aquifer.head().filter(GriddedValues::changes).isPresent();
        Section section = new Section(
                profile,
                aquifer.layers(),
                aquifer.lengthUnit().toString(),
                moves ? Optional.of("record") : Optional.empty(),
                List.of(Body.of(prism, profile)),
                NearbyWell.of(aquifer, profile, within),
                within,
                shade.map(by -> new Section.Colours(by.scale(), by.words())),
                new Section.Light(
                        prism.name(), "", flow(budget, "top", unit), flow(budget, "bottom", unit), unit.words()));
        return section.isThere() ? Optional.of(of(section, width, HEIGHT + legendHeight(section))) : Optional.empty();
    }

    /**
     * {@return a section, all of it, with what its colours mean}
     *
     * @param section the section
     * @param width in logical pixels
     * @param height in logical pixels
     */
    public static Picture of(Section section, double width, double height) {
        SectionKey key = new SectionKey(section.in(Optional.empty()), width - LEFT);
        Box box = box(key, width, height - legendHeight(section));
        Picture bare = new SectionDrawing(section, SectionFrame.fitting(section.profile(), box), key).picture(width);
        List<Mark> marks = new ArrayList<>(bare.marks());
        Box legend = new Box(LEFT, bare.height() + GAP, Math.min(LEGEND, box.width()), RampLegend.LEVEL_HEIGHT);
        section.colours()
                .ifPresent(colours -> marks.addAll(RampLegend.level(colours.scale(), 1, colours.words(), legend)));
        return new Picture(
                bare.width(), bare.height() + legendHeight(section), bare.title(), bare.description(), marks);
    }

    private static double legendHeight(Section section) {
        return section.colours().isPresent() ? RampLegend.LEVEL_HEIGHT + 2 * GAP : 0;
    }

    /**
     * {@return a part of a section, without what its colours mean}
     *
     * @param section the section
     * @param frame which part, in the box that {@link #box} gives
     */
    public static Picture of(Section section, SectionFrame frame) {
        double width = frame.box().right() + RIGHT;
        return new SectionDrawing(section, frame, new SectionKey(section, width - LEFT)).picture(width);
    }

    /**
     * {@return the part of a picture that a section fills}
     *
     * @param section the section
     * @param width of the picture, in logical pixels
     * @param height of the picture
     */
    public static Box box(Section section, double width, double height) {
        return box(new SectionKey(section, width - LEFT), width, height);
    }

    private static Box box(SectionKey key, double width, double height) {
        return new Box(LEFT, TOP, Math.max(40, width - LEFT - RIGHT), Math.max(30, height - TOP - key.height()));
    }

    /**
     * {@return how far from a section's line wells are shown unless somebody says otherwise: a round distance of some
     * hundredths of its length, in length units}
     *
     * @param profile the aquifer along the line
     */
    public static double nearby(Profile profile) {
        return Ticks.within(0, NEARBY * profile.length(), 2).step().doubleValue();
    }

    /** The net flow through a lid; NaN where it cannot be given. */
    private static double flow(PeriodBudget budget, String lid, UnitShown unit) {
        return budget.entries().stream()
                .filter(entry -> entry.account().group() == Group.LID
                        && entry.account().item().equals(lid)
                        && entry.account().quantified())
                .map(entry -> unit.of(entry.net(), budget.period()))
                .reduce(Double::sum)
                .orElse(Double.NaN);
    }
}
