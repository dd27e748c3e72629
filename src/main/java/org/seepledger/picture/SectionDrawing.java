package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.picture.Body.Slab;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.picture.Mark.Texture;
import org.seepledger.unit.Figures;

/** Draws a section. */
final class SectionDrawing {

    /** The room beside the frame, for the layers' names. */
    static final double RIGHT = 116;

    private static final double HINT = 0.3;

    private static final double SMALL = SectionSheet.SMALL;
    private static final Fill NONE = new Fill(Ink.Token.TEXT, 0, Texture.PLAIN);
    private static final double LID_REACH = 12;
    private static final double LID_WIDTH = 5;

    /** Where words beside a lid stand, clear of the lid when it is lit up. */
    private static final double ABOVE_LID = -6;

    private static final double BELOW_LID = 14;

    private final Section section;
    private final SectionSheet sheet;
    private final SectionKey key;
    private final Labels layerNames;

    SectionDrawing(Section section, SectionFrame frame, SectionKey key) {
        this.section = section;
        this.sheet = new SectionSheet(frame);
        this.key = key;
        Box box = frame.box();
        this.layerNames = new Labels(new Box(box.right(), box.y() - SMALL, RIGHT, box.height() + 2 * SMALL));
    }

    /** {@return the picture, of a width in logical pixels} */
    Picture picture(double width) {
        drawLayers();
        sheet.level(section.profile().stretches(), stretch -> stretch.column().levelBefore(), SectionKey.AT_BEGIN);
        sheet.level(section.profile().stretches(), stretch -> stretch.column().level(), SectionKey.AT_END);
        section.bodies().stream()
                .filter(body -> !body.name().equals(section.light().prism()))
                .forEach(body -> drawBody(body, 0.4, 1));
        section.body().ifPresent(body -> drawBody(body, 0.6, 2));
        section.body().ifPresent(this::drawLit);
        section.wells().forEach(this::drawWell);
        section.body().ifPresent(body -> {
            drawLid(body, "top", section.light().top());
            drawLid(body, "bottom", section.light().bottom());
        });
        section.bodies().forEach(this::name);
        Box box = sheet.box();
        List<Mark> marks = sheet.marks();
        end(0, "A").ifPresent(marks::add);
        end(section.profile().length(), "A′").ifPresent(marks::add);
        marks.addAll(key.marks(box.x(), box.bottom() + 36, sheet.frame().exaggeration()));
        return new Picture(width, box.bottom() + key.height(), title(), description(), marks);
    }

    private String title() {
        String subject = section.light().prism();
        return "Vertical section" + (subject.isEmpty() ? "" : " through " + subject)
                + section.colours().map(by -> ", " + by.words()).orElse("");
    }

    /** The name of an end of the line, if that is seen. */
    private Optional<Mark> end(double along, String name) {
        double x = sheet.frame().x(along);
        boolean seen = x >= sheet.box().x() - 1 && x <= sheet.box().right() + 1;
        return seen
                ? Optional.of(Mark.Text.of(x, 14, name, 13, Mark.Anchor.MIDDLE).strong())
                : Optional.empty();
    }

    /** Over colours, which have a meaning, a body is but hinted at; its outline has a rim of paper to stand out from them. */
    private void drawBody(Body body, double opacity, double width) {
        double share = section.colours().isPresent() ? HINT * opacity : opacity;
        Fill hatch = new Fill(Ink.Token.PRISM, share, Texture.RISING);
        sheet.body(body.slabs(), hatch, Optional.of(Stroke.of(Ink.Token.PAPER, width + 2)));
        sheet.body(body.slabs(), NONE, Optional.of(Stroke.of(Ink.Token.PRISM, width)));
    }

    private String description() {
        return "Layers, water level and the bodies of prisms along a line of "
                + Figures.shown(section.profile().length()) + " " + section.lengthUnit() + ", with heights "
                + SectionKey.times(sheet.frame().exaggeration()) + " times exaggerated"
                + (section.light().unit().isEmpty() ? "." : ", and the net flow through top and bottom.");
    }

    private void drawLayers() {
        section.colours().ifPresent(colours -> sheet.inside(SectionColours.of(section, colours, sheet.frame())));
        for (int layer = 0; layer < section.layers().size(); layer++) {
            List<Slab> slabs = slabs(layer, false);
            if (section.colours().isPresent()) {
                sheet.body(slabs, NONE, Optional.of(Stroke.of(Ink.Token.PAPER, 1.8)));
                sheet.body(slabs, NONE, Optional.of(Stroke.of(Ink.Token.TEXT, 0.7)));
            } else {
                Fill shade = new Fill(Ink.Token.TEXT, layer % 2 == 0 ? 0.05 : 0.13, Texture.PLAIN);
                sheet.body(slabs, shade, Optional.of(Stroke.of(Ink.Token.MUTED, 0.6)));
            }
            sheet.body(slabs(layer, true), new Fill(Ink.Token.MUTED, 0.8, Texture.DOTS), Optional.empty());
            nameLayer(layer, slabs);
        }
    }

    /** What a layer takes up along the line, or those cells of it alone that are dry. */
    private List<Slab> slabs(int layer, boolean dry) {
        return section.profile().stretches().stream()
                .filter(stretch ->
                        stretch.column().surfaces()[layer] > stretch.column().surfaces()[layer + 1])
                .filter(stretch -> !dry || section.isDry(stretch.column(), layer))
                .map(stretch -> new Slab(
                        stretch.from(),
                        stretch.to(),
                        stretch.column().surfaces()[layer],
                        stretch.column().surfaces()[layer + 1]))
                .toList();
    }

    /** Writes a layer's name beside the frame, at the height that it has near it. */
    private void nameLayer(int layer, List<Slab> slabs) {
        SectionFrame frame = sheet.frame();
        Box box = sheet.box();
        for (int i = slabs.size() - 1; i >= 0; i--) {
            Slab slab = slabs.get(i);
            double upper = Math.max(box.y(), frame.y(slab.top()));
            double lower = Math.min(box.bottom(), frame.y(slab.bottom()));
            boolean near = slab.from() <= frame.to() && frame.x(slab.to()) > box.x() + 0.75 * box.width();
            if (lower - upper > 3 && near) {
                String words = (layer + 1) + " " + section.layers().get(layer).name();
                String fitted = Lettering.fitted(words, SMALL, RIGHT - 8);
                double middle = (upper + lower) / 2 + 0.35 * SMALL;
                Mark.Text name = Mark.Text.of(box.right() + 6, middle, fitted, SMALL, Mark.Anchor.START);
                layerNames.place(List.of(name.in(Ink.Token.MUTED)), sheet.over());
                return;
            }
        }
    }

    private void drawWell(NearbyWell well) {
        SectionFrame frame = sheet.frame();
        double x = frame.x(well.along());
        double ground = frame.y(well.ground());
        double lower = frame.y(well.bottom());
        if (Double.isNaN(ground + lower + well.top())
                || x < sheet.box().x()
                || x > sheet.box().right()) {
            return;
        }
        double upper = frame.y(well.top());
        sheet.inside(new Mark.Line(new double[] {x, ground - 6, x, lower}, Stroke.of(Ink.Token.PAPER, 4)));
        sheet.inside(new Mark.Line(new double[] {x, ground - 6, x, lower}, Stroke.of(Ink.Token.TEXT, 1.2)));
        sheet.inside(new Mark.Line(new double[] {x, upper, x, lower}, Stroke.of(Ink.Token.TEXT, 4)));
        sheet.labels()
                .place(
                        List.of(
                                Mark.Text.of(x, ground - 9, well.name(), SMALL, Mark.Anchor.MIDDLE)
                                        .haloed(),
                                Mark.Text.of(x, ground - 21, well.name(), SMALL, Mark.Anchor.MIDDLE)
                                        .haloed()),
                        sheet.over());
    }

    /** The lid that is lit up, over all else of the body. */
    private void drawLit(Body body) {
        String lid = section.light().lid();
        if (!lid.equals("top") && !lid.equals("bottom")) {
            return;
        }
        SectionFrame frame = sheet.frame();
        for (Slab slab : body.slabs()) {
            double y = frame.y(lid.equals("top") ? slab.top() : slab.bottom());
            double[] xy = {frame.x(slab.from()), y, frame.x(slab.to()), y};
            sheet.inside(new Mark.Line(xy, Stroke.of(Ink.Token.PAPER, 7)));
            sheet.inside(new Mark.Line(xy, Stroke.of(Ink.Token.ACCENT, 4)));
        }
    }

    /** The net flow through a lid as an arrow into the body or out of it, in the middle of what is seen of the cut. */
    private void drawLid(Body body, String lid, double net) {
        Optional<Body.Spot> middle = body.spot(sheet.frame(), 0.5);
        if (Double.isNaN(net) && section.light().unit().isEmpty() || middle.isEmpty()) {
            return;
        }
        NetFlow flow = new NetFlow(net);
        double x = sheet.frame().x(middle.get().along());
        boolean isTop = lid.equals("top");
        Slab slab = middle.get().slab();
        double y = sheet.frame().y(isTop ? slab.top() : slab.bottom());
        if (flow.size() > 0) {
            sheet.over().add(flow.arrow(x, y, 0, isTop ? -LID_REACH : LID_REACH, LID_WIDTH));
            sheet.labels().keepFree(new Box(x - 8, y - LID_REACH - 1, 16, 2 * LID_REACH + 2));
        }
        List<Mark.Text> choices = new ArrayList<>();
        for (int side : new int[] {1, -1}) {
            for (double shift : new double[] {isTop ? ABOVE_LID : BELOW_LID, isTop ? BELOW_LID : ABOVE_LID}) {
                Mark.Anchor anchor = side > 0 ? Mark.Anchor.START : Mark.Anchor.END;
                choices.add(Mark.Text.of(x + 11 * side, y + shift, lid + ": " + flow.words(), SMALL, anchor)
                        .strong()
                        .haloed()
                        .in(flow.ink()));
            }
        }
        sheet.labels().place(choices, sheet.over());
    }

    /** Names a body in it, or above it. */
    private void name(Body body) {
        boolean subject = body.name().equals(section.light().prism());
        body.spot(sheet.frame(), 0.5).ifPresent(spot -> {
            double x = sheet.frame().x(spot.along());
            double high = sheet.frame().y(spot.slab().top());
            double low = sheet.frame().y(spot.slab().bottom());
            List<Mark.Text> choices = new ArrayList<>();
            for (double y : new double[] {(high + low) / 2 + 4, high + 16, low - 8, high - 6, high - 18}) {
                Mark.Text text = Mark.Text.of(x, y, body.name(), subject ? 12 : SMALL, Mark.Anchor.MIDDLE)
                        .haloed();
                choices.add((subject ? text.strong() : text).in(Ink.Token.PRISM));
            }
            sheet.labels().place(choices, sheet.over());
        });
    }
}
