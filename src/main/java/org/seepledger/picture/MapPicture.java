package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.balance.HotSpot;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.prism.Prism;

/** Maps of a prism: with the flow through its faces, and with what its cells do not balance. */
public final class MapPicture {

    private static final double STRIP = 58;

    /** Colours under contours are thinned, so that what is drawn on them stands out. */
    private static final double VEILED = 0.55;

    private static final double GAP = 12;
    private static final double LEGEND = 360;

    private final Aquifer aquifer;
    private final MapSheet sheet;
    private final double width;
    private final double height;

    /**
     * What lies under a map.
     *
     * @param values what is shown as colours
     * @param scale which colour a value has
     * @param quantity what it is
     * @param unit its unit
     * @param layer the layer's name
     * @param contoured whether lines of equal value are drawn
     */
    public record Ground(
            Drape values, ValueScale scale, String quantity, String unit, String layer, boolean contoured) {}

    private MapPicture(Aquifer aquifer, Prism subject, List<Prism> others, Optional<Ground> ground, double width) {
        this(aquifer, MapRoom.of(subject, width), Optional.of(subject), others, ground, width);
    }

    private MapPicture(
            Aquifer aquifer,
            MapFrame frame,
            Optional<Prism> subject,
            List<Prism> others,
            Optional<Ground> ground,
            double width) {
        this.aquifer = aquifer;
        this.width = width;
        this.height = frame.box().bottom() + MapSheet.MARGIN + STRIP;
        this.sheet = new MapSheet(frame);
        ground.ifPresent(this::lay);
        others.forEach(other -> sheet.prism(other, false));
        subject.ifPresent(prism -> sheet.prism(prism, true));
    }

    private void lay(Ground under) {
        sheet.drape(under.values(), under.scale(), opacity(under));
        if (under.contoured() && !ValueScale.isFlat(under.values().values())) {
            sheet.contours(
                    under.values(),
                    Ticks.within(under.scale().from(), under.scale().to(), 9));
        }
    }

    /**
     * {@return a map with the net flow through each lateral face as an arrow}
     *
     * @param aquifer the aquifer, whose wells are shown
     * @param subject the prism
     * @param others the other prisms
     * @param ground what lies under it
     * @param line the line of the section, if there is one
     * @param budget the prism's budget over the record
     * @param unit the unit to show
     * @param width in logical pixels
     */
    public static Picture ofFaces(
            Aquifer aquifer,
            Prism subject,
            List<Prism> others,
            Optional<Ground> ground,
            Optional<SectionLine> line,
            PeriodBudget budget,
            UnitShown unit,
            double width) {
        MapPicture map = new MapPicture(aquifer, subject, others, ground, width);
        line.ifPresent(map::drawLine);
        new FaceArrows(subject, budget, unit).draw(map.sheet);
        aquifer.placedWells().forEach(map.sheet::well);
        others.forEach(map.sheet::name);
        return map.picture(ground, "Map of " + subject.name() + " with the flow through its faces", arrowsMean(unit));
    }

    /**
     * The flow through the faces of a prism.
     *
     * @param budget the prism's budget
     * @param unit the unit to show
     */
    public record Flows(PeriodBudget budget, UnitShown unit) {}

    /**
     * {@return a map of what a view shows}
     *
     * @param aquifer the aquifer
     * @param frame the part of the map
     * @param subject the selected prism, if there is one
     * @param others the other prisms
     * @param ground what lies under them
     * @param flows the flow through the selected prism's faces, if it is shown
     * @param wells whether wells are shown
     * @param title what it shows
     * @param width in logical pixels
     */
    public static Picture ofView(
            Aquifer aquifer,
            MapFrame frame,
            Optional<Prism> subject,
            List<Prism> others,
            Ground ground,
            Optional<Flows> flows,
            boolean wells,
            String title,
            double width) {
        MapPicture map = new MapPicture(aquifer, frame, subject, others, Optional.of(ground), width);
        flows.ifPresent(shown -> new FaceArrows(subject.orElseThrow(), shown.budget(), shown.unit()).draw(map.sheet));
        if (wells) {
            aquifer.placedWells().forEach(map.sheet::well);
        }
        others.forEach(map.sheet::name);
        String description =
                flows.map(shown -> arrowsMean(shown.unit())).orElse("Prisms are outlined; the selected one in full.");
        return map.picture(Optional.of(ground), title, description);
    }

    private static String arrowsMean(UnitShown unit) {
        return "Arrows across the faces point inward where water comes in and outward where it leaves; their widths"
                + " are in proportion to net flow in " + unit.words() + ".";
    }

    /**
     * A plume on a map.
     *
     * @param outline what lies above a threshold; empty where none was asked for
     * @param threshold the threshold as it is written
     * @param track the way of its centre of mass
     */
    public record Trail(Optional<ThresholdOutline> outline, String threshold, PlumeTrack track) {}

    /**
     * {@return a map of a plume with the net flow of the solute through each lateral face as an arrow}
     *
     * @param aquifer the aquifer, whose wells are shown
     * @param subject the prism
     * @param others the other prisms
     * @param ground the concentrations that lie under it
     * @param trail what else is shown of the plume
     * @param line the line of the section, if there is one
     * @param budget the prism's budget of the solute over the record
     * @param unit the unit to show
     * @param title what it shows
     * @param width in logical pixels
     */
    public static Picture ofPlume(
            Aquifer aquifer,
            Prism subject,
            List<Prism> others,
            Ground ground,
            Trail trail,
            Optional<SectionLine> line,
            PeriodBudget budget,
            UnitShown unit,
            String title,
            double width) {
        MapPicture map = new MapPicture(aquifer, subject, others, Optional.of(ground), width);
        MapFrame frame = map.sheet.frame();
        trail.outline().ifPresent(outline -> outline.marks(frame).forEach(map.sheet::onGround));
        line.ifPresent(map::drawLine);
        new FaceArrows(subject, budget, unit).draw(map.sheet);
        trail.track().marks(frame, map.sheet.labels()).forEach(map.sheet::above);
        aquifer.placedWells().forEach(map.sheet::well);
        others.forEach(map.sheet::name);
        Picture drawn = map.picture(
                Optional.of(ground),
                title,
                "Concentrations as colours; arrows across the faces point inward where the solute comes in and outward"
                        + " where it leaves, in proportion to net flow in " + unit.words()
                        + "; the dark line is the way of the centre of mass.");
        return withKey(drawn, trail);
    }

    private static Picture withKey(Picture drawn, Trail trail) {
        List<Mark> marks = new ArrayList<>(drawn.marks());
        Key key = new Key(MapSheet.MARGIN, drawn.width() - MapRoom.RIGHT, drawn.height(), marks);
        if (trail.outline().isPresent()) {
            key.line(ThresholdOutline.stroke(), "cells with more than " + trail.threshold());
        }
        key.line(PlumeTrack.stroke(), "way of the centre of mass, the last with one standard deviation round it");
        return new Picture(drawn.width(), key.end() + 4, drawn.title(), drawn.description(), marks);
    }

    /**
     * {@return a map of what cells gain that nothing accounts for}
     *
     * @param aquifer the aquifer
     * @param subject the prism
     * @param ground the imbalances
     * @param spots the cells that are furthest from balance, numbered in their order
     * @param width in logical pixels
     */
    public static Picture ofImbalance(
            Aquifer aquifer, Prism subject, Ground ground, List<HotSpot> spots, double width) {
        MapPicture map = new MapPicture(aquifer, subject, List.of(), Optional.of(ground), width);
        for (int i = 0; i < spots.size(); i++) {
            map.drawSpot(ground.values(), spots.get(i), String.valueOf(i + 1));
        }
        return map.picture(
                Optional.of(ground),
                "Map of the imbalance of cells in " + subject.name(),
                "What each cell gains that nothing accounts for, mean over the record; numbered are the cells that are"
                        + " furthest from balance.");
    }

    private void drawLine(SectionLine line) {
        MapFrame frame = sheet.frame();
        double[] xy = line.places().stream()
                .flatMapToDouble(place -> DoubleStream.of(frame.x(place.x()), frame.y(place.y())))
                .toArray();
        sheet.above(new Mark.Line(xy, Stroke.of(Ink.Token.TEXT, 1).dashed(9.0, 3.0, 2.0, 3.0)));
        List<Mark> ends = new ArrayList<>();
        sheet.labels().place(List.of(end(xy[0], xy[1], "A")), ends);
        sheet.labels().place(List.of(end(xy[xy.length - 2], xy[xy.length - 1], "A′")), ends);
        ends.forEach(sheet::above);
    }

    private static Mark.Text end(double x, double y, String name) {
        return Mark.Text.of(x, y - 5, name, 13, Mark.Anchor.MIDDLE).strong().haloed();
    }

    private void drawSpot(Drape values, HotSpot spot, String number) {
        double x = sheet.frame().x(values.mapX(spot.row(), spot.column()));
        double y = sheet.frame().y(values.mapY(spot.row(), spot.column()));
        sheet.above(new Mark.Area(
                List.of(MapSheet.round(x, y, 7)),
                Optional.of(Fill.of(Ink.Token.PAPER)),
                Optional.of(Stroke.of(Ink.Token.RESIDUAL, 1.6))));
        sheet.above(Mark.Text.of(x, y + 3.5, number, 10, Mark.Anchor.MIDDLE).strong());
    }

    private Picture picture(Optional<Ground> ground, String title, String description) {
        List<Mark> marks = new ArrayList<>(sheet.marks());
        Box box = sheet.frame().box();
        double strip = box.bottom() + MapSheet.MARGIN + 2;
        marks.addAll(NorthArrow.marks(box.x(), strip));
        double scale = sheet.frame().scale() / aquifer.grid().planUnit();
        ScaleBar bar = ScaleBar.within(scale, aquifer.lengthUnit().toString(), width / 4);
        marks.addAll(bar.marks(box.x() + NorthArrow.WIDTH + GAP, strip + 8));
        double left = box.x() + NorthArrow.WIDTH + bar.width() + 3 * GAP;
        Box room = new Box(left, strip, Math.min(LEGEND, box.right() - left), RampLegend.LEVEL_HEIGHT);
        ground.ifPresent(under -> marks.addAll(RampLegend.level(
                under.scale(), opacity(under), under.quantity() + ", " + under.unit() + ": " + under.layer(), room)));
        return new Picture(width, height, title, description, marks);
    }

    private static double opacity(Ground ground) {
        return ground.contoured() ? VEILED : 1;
    }
}
