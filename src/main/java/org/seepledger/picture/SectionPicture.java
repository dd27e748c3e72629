package org.seepledger.picture;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import java.util.stream.DoubleStream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Screen;
import org.seepledger.ledger.Entry;
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
    private static final double LEFT = 48;
    private static final double RIGHT = 96;
    private static final double SMALL = 10;
    private static final double NEARBY = 0.04;

    private final Aquifer aquifer;
    private final Prism prism;
    private final SectionLine line;
    private final Profile profile;
    private final Box box;
    private final double lowest;
    private final double highest;
    private final Labels labels;
    private final List<Mark> inside = new ArrayList<>();
    private final List<Mark> over = new ArrayList<>();
    private final List<Mark> marks = new ArrayList<>();

    private SectionPicture(Aquifer aquifer, Prism prism, SectionLine line, Profile profile, double width) {
        this.aquifer = aquifer;
        this.prism = prism;
        this.line = line;
        this.profile = profile;
        this.box = new Box(LEFT, 22, width - LEFT - RIGHT, HEIGHT - 22 - 56);
        double least = elevations().min().orElseThrow();
        double greatest = elevations().max().orElseThrow();
        double margin = Math.max(1e-6, 0.08 * (greatest - least));
        this.lowest = least - margin;
        this.highest = greatest + 2.5 * margin;
        this.labels = new Labels(box.inset(1));
    }

    private DoubleStream elevations() {
        return profile.stretches().stream()
                .flatMapToDouble(stretch -> DoubleStream.concat(
                        DoubleStream.of(stretch.column().surfaces()),
                        DoubleStream.of(
                                stretch.column().levelAtStart(),
                                stretch.column().levelAtEnd())))
                .filter(Double::isFinite);
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
        Profile profile = Profile.along(line, aquifer, prism);
        boolean empty = profile.stretches().stream()
                .allMatch(
                        stretch -> DoubleStream.of(stretch.column().surfaces()).noneMatch(Double::isFinite));
        return empty
                ? Optional.empty()
                : Optional.of(new SectionPicture(aquifer, prism, line, profile, width).draw(budget, unit));
    }

    private Picture draw(PeriodBudget budget, UnitShown unit) {
        drawLayers();
        drawWater(
                stretch -> stretch.column().levelAtStart(),
                Stroke.of(Ink.Token.WATER, 1.3).dashed(5.0, 3.0));
        drawWater(stretch -> stretch.column().levelAtEnd(), Stroke.of(Ink.Token.WATER, 2));
        drawPrism();
        aquifer.placedWells().forEach(this::drawWell);
        drawLid(budget, "top", unit);
        drawLid(budget, "bottom", unit);
        marks.add(new Mark.Group(box, inside));
        marks.addAll(over);
        drawAxes();
        drawKey(unit.words());
        return new Picture(
                box.right() + RIGHT, HEIGHT, "Vertical section through " + prism.name(), description(), marks);
    }

    private String description() {
        return "Layers, water level and the body of the prism along a line of "
                + Figures.shown(line.length()) + " plan units, with heights " + exaggeration()
                + " times exaggerated and the net flow through top and bottom.";
    }

    private String exaggeration() {
        double across = line.length() * aquifer.grid().planUnit() / box.width();
        double up = (highest - lowest) / box.height();
        return new BigDecimal(across / up).round(new MathContext(2)).toPlainString();
    }

    private double x(double share) {
        return box.x() + share * box.width();
    }

    private double y(double elevation) {
        return box.bottom() - (elevation - lowest) / (highest - lowest) * box.height();
    }

    private void drawLayers() {
        int layers = aquifer.layers().size();
        for (int k = 0; k < layers; k++) {
            int layer = k;
            Fill fill = new Fill(Ink.Token.TEXT, k % 2 == 0 ? 0.05 : 0.13, Mark.Texture.PLAIN);
            for (double[] body : bodies(
                    stretch -> stretch.column().surfaces()[layer],
                    stretch -> stretch.column().surfaces()[layer + 1])) {
                inside.add(
                        new Mark.Area(List.of(body), Optional.of(fill), Optional.of(Stroke.of(Ink.Token.MUTED, 0.6))));
            }
            nameLayer(layer);
        }
    }

    private void nameLayer(int layer) {
        List<Stretch> stretches = profile.stretches();
        for (int i = stretches.size() - 1; i >= 0; i--) {
            double[] surfaces = stretches.get(i).column().surfaces();
            double room = y(surfaces[layer + 1]) - y(surfaces[layer]);
            if (room > 3 && x(stretches.get(i).to()) > box.right() - 0.25 * box.width()) {
                double middle = (y(surfaces[layer]) + y(surfaces[layer + 1])) / 2 + 0.35 * SMALL;
                String words = (layer + 1) + " " + aquifer.layers().get(layer).name();
                over.add(Mark.Text.of(
                                box.right() + 6,
                                middle,
                                Lettering.fitted(words, SMALL, RIGHT - 8),
                                SMALL,
                                Mark.Anchor.START)
                        .in(Ink.Token.MUTED));
                return;
            }
        }
    }

    /** Bodies between two surfaces, as long as both have values and the upper one is higher. */
    private List<double[]> bodies(ToDoubleFunction<Stretch> upper, ToDoubleFunction<Stretch> lower) {
        List<double[]> bodies = new ArrayList<>();
        List<Stretch> run = new ArrayList<>();
        for (Stretch stretch : profile.stretches()) {
            if (upper.applyAsDouble(stretch) > lower.applyAsDouble(stretch)) {
                run.add(stretch);
            } else {
                addBody(bodies, run, upper, lower);
            }
        }
        addBody(bodies, run, upper, lower);
        return bodies;
    }

    private void addBody(
            List<double[]> bodies,
            List<Stretch> run,
            ToDoubleFunction<Stretch> upper,
            ToDoubleFunction<Stretch> lower) {
        if (run.isEmpty()) {
            return;
        }
        double[] body = new double[8 * run.size()];
        int at = 0;
        for (Stretch stretch : run) {
            double y = y(upper.applyAsDouble(stretch));
            at = put(body, at, x(stretch.from()), y, x(stretch.to()), y);
        }
        for (int i = run.size() - 1; i >= 0; i--) {
            double y = y(lower.applyAsDouble(run.get(i)));
            at = put(body, at, x(run.get(i).to()), y, x(run.get(i).from()), y);
        }
        bodies.add(body);
        run.clear();
    }

    private static int put(double[] target, int at, double... values) {
        System.arraycopy(values, 0, target, at, values.length);
        return at + values.length;
    }

    private void drawWater(ToDoubleFunction<Stretch> level, Stroke stroke) {
        List<Double> run = new ArrayList<>();
        for (Stretch stretch : profile.stretches()) {
            double elevation = level.applyAsDouble(stretch);
            if (Double.isNaN(elevation)) {
                addLine(run, stroke);
            } else {
                run.addAll(List.of((x(stretch.from()) + x(stretch.to())) / 2, y(elevation)));
            }
        }
        addLine(run, stroke);
    }

    private void addLine(List<Double> run, Stroke stroke) {
        if (run.size() > 2) {
            inside.add(
                    new Mark.Line(run.stream().mapToDouble(Double::doubleValue).toArray(), stroke));
        }
        run.clear();
    }

    private void drawPrism() {
        for (double[] body : bodies(Stretch::top, Stretch::bottom)) {
            Fill fill = new Fill(Ink.Token.PRISM, 0.14, Mark.Texture.PLAIN);
            inside.add(new Mark.Area(List.of(body), Optional.of(fill), Optional.of(Stroke.of(Ink.Token.PRISM, 2))));
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
                .ifPresent(stretch -> drawWell(well, x(share), stretch.column().surfaces()));
    }

    private void drawWell(PlacedWell well, double x, double[] surfaces) {
        double ground = y(surfaces[0]);
        double upper;
        double lower;
        if (well.well().screen() instanceof Screen.InLayer in) {
            upper = y(surfaces[in.layer()]);
            lower = y(surfaces[in.layer() + 1]);
        } else {
            Screen.Between between = (Screen.Between) well.well().screen();
            upper = y(between.top());
            lower = y(between.bottom());
        }
        if (Double.isNaN(ground + upper + lower)) {
            return;
        }
        inside.add(new Mark.Line(new double[] {x, ground - 6, x, lower}, Stroke.of(Ink.Token.TEXT, 1.2)));
        inside.add(new Mark.Line(new double[] {x, upper, x, lower}, Stroke.of(Ink.Token.TEXT, 4)));
        labels.place(
                List.of(Mark.Text.of(x, ground - 9, well.well().name(), SMALL, Mark.Anchor.MIDDLE)
                        .haloed()),
                over);
    }

    /** The net flow through a lid as an arrow into the body or out of it, in the middle of the longest cut. */
    private void drawLid(PeriodBudget budget, String lid, UnitShown unit) {
        double net = 0;
        boolean known = false;
        for (Entry entry : budget.entries()) {
            boolean ours = entry.account().group() == Group.LID
                    && entry.account().item().equals(lid);
            if (ours && entry.account().quantified()) {
                net += unit.of(entry.net(), budget.period());
                known = true;
            }
        }
        Optional<Stretch> middle = middle();
        if (!known || middle.isEmpty()) {
            return;
        }
        double x = (x(middle.get().from()) + x(middle.get().to())) / 2;
        boolean isTop = lid.equals("top");
        double y = y(isTop ? middle.get().top() : middle.get().bottom());
        double reach = (isTop ? -1 : 1) * (net > 0 ? -1 : 1) * 12;
        String words = lid + ": " + (net == 0 ? "0" : (net > 0 ? "in " : "out ") + Figures.typeset(Math.abs(net)));
        Ink ink = net > 0 ? Ink.Token.GAIN : net < 0 ? Ink.Token.LOSS : Ink.Token.MUTED;
        if (net != 0) {
            Fill fill = net > 0 ? Fill.of(ink) : new Fill(ink, 1, Mark.Texture.RISING);
            over.add(
                    new Arrow(x, y - reach, x, y + reach, 5).mark(fill, Stroke.of(net > 0 ? Ink.Token.PAPER : ink, 1)));
            labels.keepFree(new Box(x - 8, y - 13, 16, 26));
        }
        List<Mark.Text> choices = new ArrayList<>();
        for (int side : new int[] {1, -1}) {
            for (double shift : new double[] {isTop ? -4 : 11, isTop ? 11 : -4}) {
                Mark.Anchor anchor = side > 0 ? Mark.Anchor.START : Mark.Anchor.END;
                choices.add(Mark.Text.of(x + 11 * side, y + shift, words, SMALL, anchor)
                        .strong()
                        .haloed()
                        .in(ink));
            }
        }
        labels.place(choices, over);
    }

    /** The stretch in the middle of those that lie in the prism. */
    private Optional<Stretch> middle() {
        List<Stretch> cut =
                profile.stretches().stream().filter(Stretch::isInPrism).toList();
        return cut.isEmpty() ? Optional.empty() : Optional.of(cut.get(cut.size() / 2));
    }

    private void drawAxes() {
        Stroke thin = Stroke.of(Ink.Token.MUTED, 1);
        marks.add(new Mark.Area(List.of(box.ring()), Optional.empty(), Optional.of(thin)));
        Ticks up = Ticks.within(lowest, highest, 6);
        for (int i = 0; i < up.count(); i++) {
            double y = y(up.values().get(i));
            marks.add(new Mark.Line(new double[] {box.x() - 4, y, box.x(), y}, thin));
            marks.add(Mark.Text.of(box.x() - 7, y + 0.35 * SMALL, up.label(i), SMALL, Mark.Anchor.END)
                    .in(Ink.Token.MUTED));
        }
        double length = line.length() * aquifer.grid().planUnit();
        Ticks across = Ticks.within(0, length, 8);
        for (int i = 0; i < across.count(); i++) {
            double x = x(across.values().get(i) / length);
            marks.add(new Mark.Line(new double[] {x, box.bottom(), x, box.bottom() + 4}, thin));
            marks.add(Mark.Text.of(x, box.bottom() + 15, across.label(i), SMALL, Mark.Anchor.MIDDLE)
                    .in(Ink.Token.MUTED));
        }
        marks.add(Mark.Text.of(box.x(), 14, "A", 13, Mark.Anchor.MIDDLE).strong());
        marks.add(Mark.Text.of(box.right(), 14, "A′", 13, Mark.Anchor.MIDDLE).strong());
    }

    private void drawKey(String unit) {
        double y = box.bottom() + 36;
        String length = aquifer.lengthUnit().toString();
        double x = box.x();
        if (aquifer.head().isPresent()) {
            marks.add(new Mark.Line(new double[] {x, y - 3, x + 22, y - 3}, Stroke.of(Ink.Token.WATER, 2)));
            boolean moves = aquifer.head().get().changes();
            String level = moves ? "water level, end of record" : "water level";
            marks.add(Mark.Text.of(x + 27, y, level, SMALL, Mark.Anchor.START).in(Ink.Token.MUTED));
            x += 27 + Lettering.width(level, SMALL) + 14;
            if (moves) {
                marks.add(new Mark.Line(
                        new double[] {x, y - 3, x + 22, y - 3},
                        Stroke.of(Ink.Token.WATER, 1.3).dashed(5.0, 3.0)));
                marks.add(Mark.Text.of(x + 27, y, "at its begin", SMALL, Mark.Anchor.START)
                        .in(Ink.Token.MUTED));
            }
        }
        String units = "Elevation and distance in " + length + ", heights " + exaggeration()
                + " times exaggerated; flow in " + unit;
        marks.add(Mark.Text.of(box.x(), y + 15, units, SMALL, Mark.Anchor.START).in(Ink.Token.MUTED));
    }
}
