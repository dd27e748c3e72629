package org.seepledger.desktop.map;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.session.FaceFlows;
import org.seepledger.desktop.session.Session;
import org.seepledger.job.WellPlace;
import org.seepledger.picture.Box;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Labels;
import org.seepledger.picture.Mark;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;

/**
 * Everything on the map that has letters, the weightiest first: flows through faces, names of prisms, wells, contours.
 * Places are tried on a page without edges, so that letters move with the map and do not jump while it is dragged.
 */
final class Lettering {

    private static final double FAR = 1e7;
    private static final double WELL = 4.2;
    private static final double SIZE = 11.5;
    private static final double EVERY = 420;
    private static final double FIRST = EVERY / 4;

    /** How far letters keep from each other: their halos must not meet. */
    private static final double APART = 3.5;

    /** Longer names of wells are cut; the read-out has them whole. */
    private static final double LONGEST_NAME = 120;

    /** How far places along a line are apart that are tried for letters, or kept free of them. */
    private static final double TRIED = 12;

    private static final double OUTLINE = 3;
    private static final double VERTEX = 3;

    private final MapModel model;
    private final Camera camera;
    private final Labels labels = new Labels(new Box(-FAR, -FAR, 2 * FAR, 2 * FAR), APART);
    private final List<Mark> marks = new ArrayList<>();

    private Lettering(MapModel model) {
        this.model = model;
        this.camera = model.camera().get();
    }

    static List<Mark> of(MapModel model) {
        Lettering lettering = new Lettering(model);
        Session session = model.session();
        List<WellPlace> wells = model.overlays().wells().get() ? lettering.nearWells() : List.of();
        session.selectedPrism().ifPresent(lettering::keepVerticesFree);
        wells.forEach(lettering::keepFree);
        session.selectedPrism()
                .ifPresent(prism -> lettering.flows(prism, session.faceFlows().get()));
        session.selectedPrism().ifPresent(prism -> lettering.name(prism, true));
        for (Prism prism : session.drawing().get().prisms()) {
            if (!prism.name().equals(session.selected().get())) {
                lettering.name(prism, false);
            }
        }
        wells.forEach(lettering::well);
        session.drawing().get().prisms().forEach(lettering::keepFree);
        model.contours().lines().get().forEach(lettering::contour);
        return lettering.marks;
    }

    private void flows(Prism prism, FaceFlows flows) {
        if (flows.prism().equals(prism.name())) {
            marks.addAll(FlowArrows.of(prism, flows, camera, labels));
        }
    }

    /** A prism is named above its northernmost vertex, else near its middle or below it. */
    private void name(Prism prism, boolean selected) {
        Side top = prism.rings().get(0).sides().get(0);
        for (Side side : prism.rings().get(0).sides()) {
            top = side.y() > top.y() ? side : top;
        }
        double x = camera.x(top.x());
        double y = camera.y(top.y());
        List<Mark.Text> choices = new ArrayList<>(List.of(
                text(x, y - 10, prism.name(), Mark.Anchor.MIDDLE, selected),
                text(x + 9, y - 4, prism.name(), Mark.Anchor.START, selected),
                text(x - 9, y - 4, prism.name(), Mark.Anchor.END, selected),
                text(x, y + 20, prism.name(), Mark.Anchor.MIDDLE, selected)));
        Extent extent = Extent.of(prism);
        double middleX = camera.x(extent.middleX());
        double middleY = camera.y(extent.middleY());
        for (double down : new double[] {0, 34, -34, 52, -52}) {
            choices.add(text(middleX, middleY + down, prism.name(), Mark.Anchor.MIDDLE, selected));
        }
        choices.add(text(middleX, camera.y(extent.south()) + 22, prism.name(), Mark.Anchor.MIDDLE, selected));
        labels.place(choices, marks);
    }

    private static Mark.Text text(double x, double y, String words, Mark.Anchor anchor, boolean bold) {
        return new Mark.Text(x, y, words, bold ? 13 : 12, anchor, Ink.Token.PRISM, bold, true, 0);
    }

    private List<WellPlace> nearWells() {
        return model.session().wells().get().stream()
                .filter(well -> OnScreen.isNear(camera.x(well.x()), camera.y(well.y()), camera))
                .toList();
    }

    private void keepFree(WellPlace well) {
        labels.keepFree(new Box(camera.x(well.x()) - WELL, camera.y(well.y()) - WELL, 2 * WELL, 2 * WELL));
    }

    private void keepVerticesFree(Prism prism) {
        for (Ring ring : prism.rings()) {
            for (Side side : ring.sides()) {
                labels.keepFree(
                        new Box(camera.x(side.x()) - VERTEX, camera.y(side.y()) - VERTEX, 2 * VERTEX, 2 * VERTEX));
            }
        }
    }

    /** The values of contours keep off outlines. */
    private void keepFree(Prism prism) {
        for (Ring ring : prism.rings()) {
            for (int i = 0; i < ring.sides().size(); i++) {
                keepFree(ring.sides().get(i), ring.after(i));
            }
        }
    }

    private void keepFree(Side from, Side to) {
        double x = camera.x(from.x());
        double y = camera.y(from.y());
        double across = camera.x(to.x()) - x;
        double down = camera.y(to.y()) - y;
        double length = Math.hypot(across, down);
        for (double along = 0; along < length; along += TRIED) {
            double placeX = x + across * along / length;
            double placeY = y + down * along / length;
            if (OnScreen.isNear(placeX, placeY, camera)) {
                labels.keepFree(new Box(placeX - OUTLINE, placeY - OUTLINE, 2 * OUTLINE, 2 * OUTLINE));
            }
        }
    }

    /** A ring; full where the well takes water in the interval, with a point where it adds. */
    private void well(WellPlace well) {
        double x = camera.x(well.x());
        double y = camera.y(well.y());
        marks.add(round(x, y, WELL, Ink.Token.PAPER, Optional.of(Mark.Stroke.of(Ink.Token.PAPER, 4.4))));
        marks.add(round(x, y, WELL, Ink.Token.PAPER, Optional.of(Mark.Stroke.of(Ink.Token.TEXT, 1.8))));
        if (well.rate() != 0) {
            Ink ink = well.rate() < 0 ? Ink.Token.LOSS : Ink.Token.GAIN;
            marks.add(round(x, y, well.rate() < 0 ? 2.4 : 1.4, ink, Optional.empty()));
        }
        String name = org.seepledger.picture.Lettering.fitted(well.name(), SIZE, LONGEST_NAME);
        List<Mark.Text> choices = Labels.around(x, y, WELL + APART + 1, name, SIZE).stream()
                .map(Mark.Text::haloed)
                .toList();
        labels.place(choices, marks);
    }

    private static Mark round(double x, double y, double radius, Ink ink, Optional<Mark.Stroke> rim) {
        double[] ring = new double[48];
        for (int i = 0; i < 24; i++) {
            ring[2 * i] = x + radius * Math.cos(Math.PI * i / 12);
            ring[2 * i + 1] = y + radius * Math.sin(Math.PI * i / 12);
        }
        return new Mark.Area(List.of(ring), Optional.of(Mark.Fill.of(ink)), rim);
    }

    /**
     * The value stands along each line again and again, measured from the line's begin, in stretches that do not depend on
     * what is seen: each has its value at the first place that is free.
     */
    private void contour(ContourModel.Contour contour) {
        for (double[] line : contour.lines()) {
            double walked = 0;
            double tried = 0;
            int labelled = 0;
            for (int i = 2; i < line.length; i += 2) {
                walked += Math.hypot(line[i] - line[i - 2], line[i + 1] - line[i - 1]) * camera.scale();
                int stretch = (int) Math.floor((walked - FIRST) / EVERY) + 1;
                boolean near = OnScreen.isNear(camera.x(line[i]), camera.y(line[i + 1]), camera);
                if (stretch > labelled && near && walked - tried >= TRIED) {
                    tried = walked;
                    labelled = label(contour, line, i) ? stretch : labelled;
                }
            }
        }
    }

    private boolean label(ContourModel.Contour contour, double[] line, int i) {
        double x = camera.x(line[i]);
        double y = camera.y(line[i + 1]);
        Mark.Text text =
                new Mark.Text(x, y + 4, contour.label(), 11, Mark.Anchor.MIDDLE, Ink.Token.TEXT, false, true, 0);
        return labels.place(List.of(text), marks);
    }
}
