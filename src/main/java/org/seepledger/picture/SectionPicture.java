package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Screen;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.picture.Profile.Stretch;
import org.seepledger.prism.Prism;
import org.seepledger.unit.Figures;

/**
 * A vertical section through a prism: layers, water level at the record's begin and end, the prism's body, wells nearby
 * with their screens, and the flow through its lids.
 */
public final class SectionPicture {

    private static final double HEIGHT = 260;
    private static final double TOP = 22;
    private static final double LEFT = 48;
    private static final double RIGHT = 116;
    private static final double KEY = 56;
    private static final double LEGEND = 360;

    /** Neighbouring colours overlap by this, lest the paper shine through between them. */
    private static final double SEAM = 0.4;

    private static final double SMALL = SectionSheet.SMALL;
    private static final Stroke AT_START = Stroke.of(Ink.Token.WATER, 1.3).dashed(5.0, 3.0);
    private static final Stroke AT_END = Stroke.of(Ink.Token.WATER, 2);

    /** Wells are shown up to this share of the line's length beside it. */
    private static final double NEARBY = 0.04;

    private static final double LID_REACH = 12;
    private static final double LID_WIDTH = 5;

    private final Aquifer aquifer;
    private final SectionLine line;
    private final double length;
    private final Profile profile;
    private final SectionSheet sheet;

    private final Optional<Shade> shade;

    /** A value of each cell. */
    public interface CellValues {
        /**
         * {@return the value; not finite where there is none}
         *
         * @param layer from 0
         * @param row from 0 in the north
         * @param column from 0
         */
        double at(int layer, int row, int column);
    }

    /**
     * What cells are coloured by.
     *
     * @param values a value of each cell
     * @param scale which colour a value has
     * @param words what the values are, with their unit
     */
    public record Shade(CellValues values, ValueScale scale, String words) {}

    private SectionPicture(Aquifer aquifer, SectionLine line, Profile profile, Optional<Shade> shade, double width) {
        this.aquifer = aquifer;
        this.line = line;
        this.shade = shade;
        this.length = line.length() * aquifer.grid().planUnit();
        this.profile = profile;
        this.sheet = new SectionSheet(profile, new Box(LEFT, TOP, width - LEFT - RIGHT, HEIGHT - TOP - KEY));
    }

    /**
     * {@return the section; none where the line meets no layer}
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
        Profile profile = Profile.along(line, aquifer, prism);
        return SectionSheet.elevations(profile).findAny().isEmpty()
                ? Optional.empty()
                : Optional.of(new SectionPicture(aquifer, line, profile, shade, width).draw(prism, budget, unit));
    }

    private Picture draw(Prism prism, PeriodBudget budget, UnitShown unit) {
        shade.ifPresent(this::colour);
        drawLayers();
        sheet.level(stretch -> stretch.column().levelAtStart(), AT_START);
        sheet.level(stretch -> stretch.column().levelAtEnd(), AT_END);
        sheet.bodies(
                Stretch::top,
                Stretch::bottom,
                new Fill(Ink.Token.PRISM, shade.isPresent() ? 0 : 0.14, Mark.Texture.PLAIN),
                Stroke.of(Ink.Token.PRISM, 2));
        aquifer.placedWells().forEach(this::drawWell);
        drawLid(budget, "top", unit);
        drawLid(budget, "bottom", unit);
        List<Mark> marks = sheet.marks(length);
        Box box = sheet.box();
        marks.add(Mark.Text.of(box.x(), 14, "A", 13, Mark.Anchor.MIDDLE).strong());
        marks.add(Mark.Text.of(box.right(), 14, "A′", 13, Mark.Anchor.MIDDLE).strong());
        drawKey(marks, unit.words());
        Box legend = new Box(box.x(), HEIGHT + 4, Math.min(LEGEND, box.width()), RampLegend.LEVEL_HEIGHT);
        shade.ifPresent(by -> marks.addAll(RampLegend.level(by.scale(), 1, by.words(), legend)));
        return new Picture(
                box.right() + RIGHT,
                shade.isPresent() ? legend.bottom() + 4 : HEIGHT,
                "Vertical section through " + prism.name(),
                description(),
                marks);
    }

    private String description() {
        return "Layers, water level and the body of the prism along a line of " + Figures.shown(length) + " "
                + aquifer.lengthUnit() + ", with heights " + sheet.exaggeration(length)
                + " times exaggerated, and the net flow through top and bottom.";
    }

    /** Colours each cell that the line cuts, from its bottom to the lower one of its top and the water level. */
    private void colour(Shade by) {
        Grid grid = aquifer.grid();
        for (Stretch stretch : profile.stretches()) {
            double share = (stretch.from() + stretch.to()) / 2;
            double x = line.x(share);
            double y = line.y(share);
            int row = grid.flipped(grid.y().nearest(grid.localY(x, y)));
            int column = grid.x().nearest(grid.localX(x, y));
            double[] surfaces = stretch.column().surfaces();
            for (int layer = 0; layer + 1 < surfaces.length; layer++) {
                double value = by.values().at(layer, row, column);
                double level = aquifer.layers().get(layer).waterTable()
                        ? stretch.column().levelAtEnd()
                        : Double.NaN;
                double upper = Double.isFinite(level) ? Math.min(surfaces[layer], level) : surfaces[layer];
                if (Double.isFinite(value) && upper > surfaces[layer + 1]) {
                    Box cell = new Box(
                            sheet.x(stretch.from()),
                            sheet.y(upper),
                            sheet.x(stretch.to()) - sheet.x(stretch.from()) + SEAM,
                            sheet.y(surfaces[layer + 1]) - sheet.y(upper));
                    Ink ink = by.scale().ramp().ink(by.scale().share(value));
                    sheet.inside(Mark.Area.of(cell, Fill.of(ink)));
                }
            }
        }
    }

    private void drawLayers() {
        for (int k = 0; k < aquifer.layers().size(); k++) {
            int layer = k;
            sheet.bodies(
                    stretch -> stretch.column().surfaces()[layer],
                    stretch -> stretch.column().surfaces()[layer + 1],
                    new Fill(Ink.Token.TEXT, shade.isPresent() ? 0 : k % 2 == 0 ? 0.05 : 0.13, Mark.Texture.PLAIN),
                    Stroke.of(Ink.Token.MUTED, 0.6));
            nameLayer(layer);
        }
    }

    /** Writes a layer's name beside the frame, at the height that it has near it. */
    private void nameLayer(int layer) {
        List<Stretch> stretches = profile.stretches();
        Box box = sheet.box();
        for (int i = stretches.size() - 1; i >= 0; i--) {
            double[] surfaces = stretches.get(i).column().surfaces();
            double room = sheet.y(surfaces[layer + 1]) - sheet.y(surfaces[layer]);
            if (room > 3 && stretches.get(i).to() > 0.75) {
                double middle = (sheet.y(surfaces[layer]) + sheet.y(surfaces[layer + 1])) / 2 + 0.35 * SMALL;
                String words = (layer + 1) + " " + aquifer.layers().get(layer).name();
                String fitted = Lettering.fitted(words, SMALL, RIGHT - 8);
                sheet.over()
                        .add(Mark.Text.of(box.right() + 6, middle, fitted, SMALL, Mark.Anchor.START)
                                .in(Ink.Token.MUTED));
                return;
            }
        }
    }

    private void drawWell(PlacedWell well) {
        double wayX = line.toX() - line.fromX();
        double wayY = line.toY() - line.fromY();
        double awayX = well.well().x() - line.fromX();
        double awayY = well.well().y() - line.fromY();
        double share = (awayX * wayX + awayY * wayY) / (wayX * wayX + wayY * wayY);
        double distance = Math.abs(wayX * awayY - wayY * awayX) / line.length();
        if (share <= 0 || share >= 1 || distance > NEARBY * line.length()) {
            return;
        }
        profile.stretches().stream()
                .filter(stretch -> stretch.to() >= share)
                .findFirst()
                .ifPresent(stretch ->
                        drawWell(well, sheet.x(share), stretch.column().surfaces()));
    }

    private void drawWell(PlacedWell well, double x, double[] surfaces) {
        double ground = sheet.y(surfaces[0]);
        double upper;
        double lower;
        if (well.well().screen() instanceof Screen.InLayer in) {
            upper = sheet.y(surfaces[in.layer()]);
            lower = sheet.y(surfaces[in.layer() + 1]);
        } else {
            Screen.Between between = (Screen.Between) well.well().screen();
            upper = sheet.y(between.top());
            lower = sheet.y(between.bottom());
        }
        if (Double.isNaN(ground + upper + lower)) {
            return;
        }
        sheet.inside(new Mark.Line(new double[] {x, ground - 6, x, lower}, Stroke.of(Ink.Token.TEXT, 1.2)));
        sheet.inside(new Mark.Line(new double[] {x, upper, x, lower}, Stroke.of(Ink.Token.TEXT, 4)));
        sheet.labels()
                .place(
                        List.of(Mark.Text.of(x, ground - 9, well.well().name(), SMALL, Mark.Anchor.MIDDLE)
                                .haloed()),
                        sheet.over());
    }

    /** The net flow through a lid as an arrow into the body or out of it, in the middle of the cut. */
    private void drawLid(PeriodBudget budget, String lid, UnitShown unit) {
        Optional<NetFlow> flow = flow(budget, lid, unit);
        Optional<Stretch> middle = middle();
        if (flow.isEmpty() || middle.isEmpty()) {
            return;
        }
        double x = (sheet.x(middle.get().from()) + sheet.x(middle.get().to())) / 2;
        boolean isTop = lid.equals("top");
        double y = sheet.y(isTop ? middle.get().top() : middle.get().bottom());
        if (flow.get().size() > 0) {
            sheet.over().add(flow.get().arrow(x, y, 0, isTop ? -LID_REACH : LID_REACH, LID_WIDTH));
            sheet.labels().keepFree(new Box(x - 8, y - LID_REACH - 1, 16, 2 * LID_REACH + 2));
        }
        List<Mark.Text> choices = new ArrayList<>();
        for (int side : new int[] {1, -1}) {
            for (double shift : new double[] {isTop ? -4 : 11, isTop ? 11 : -4}) {
                Mark.Anchor anchor = side > 0 ? Mark.Anchor.START : Mark.Anchor.END;
                choices.add(Mark.Text.of(
                                x + 11 * side,
                                y + shift,
                                lid + ": " + flow.get().words(),
                                SMALL,
                                anchor)
                        .strong()
                        .haloed()
                        .in(flow.get().ink()));
            }
        }
        sheet.labels().place(choices, sheet.over());
    }

    /** The net flow through a lid, if it can be given. */
    private static Optional<NetFlow> flow(PeriodBudget budget, String lid, UnitShown unit) {
        return budget.entries().stream()
                .filter(entry -> entry.account().group() == Group.LID
                        && entry.account().item().equals(lid)
                        && entry.account().quantified())
                .map(entry -> unit.of(entry.net(), budget.period()))
                .reduce(Double::sum)
                .map(NetFlow::new);
    }

    /** The stretch in the middle of those that lie in the prism. */
    private Optional<Stretch> middle() {
        List<Stretch> cut =
                profile.stretches().stream().filter(Stretch::isInPrism).toList();
        return cut.isEmpty() ? Optional.empty() : Optional.of(cut.get(cut.size() / 2));
    }

    private void drawKey(List<Mark> marks, String unit) {
        Box box = sheet.box();
        double y = box.bottom() + 36;
        double x = box.x();
        if (profile.stretches().stream()
                .anyMatch(stretch -> Double.isFinite(stretch.column().levelAtEnd()))) {
            marks.add(new Mark.Line(new double[] {x, y - 3, x + 22, y - 3}, AT_END));
            boolean moves = aquifer.head().get().changes();
            String level = moves ? "water level, end of record" : "water level";
            marks.add(Mark.Text.of(x + 27, y, level, SMALL, Mark.Anchor.START).in(Ink.Token.MUTED));
            x += 27 + Lettering.width(level, SMALL) + 14;
            if (moves) {
                marks.add(new Mark.Line(new double[] {x, y - 3, x + 22, y - 3}, AT_START));
                marks.add(Mark.Text.of(x + 27, y, "at its begin", SMALL, Mark.Anchor.START)
                        .in(Ink.Token.MUTED));
            }
        }
        String units = "Elevation and distance in " + aquifer.lengthUnit() + ", heights " + sheet.exaggeration(length)
                + " times exaggerated; flow in " + unit;
        marks.add(Mark.Text.of(box.x(), y + 15, units, SMALL, Mark.Anchor.START).in(Ink.Token.MUTED));
    }
}
