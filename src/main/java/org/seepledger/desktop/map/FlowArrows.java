package org.seepledger.desktop.map;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.desktop.session.FaceFlows;
import org.seepledger.picture.Arrow;
import org.seepledger.picture.Box;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Labels;
import org.seepledger.picture.Mark;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.unit.Figures;

/**
 * The net flow through each face as an arrow across its longest side, its width in proportion. Gain and loss have their colours
 * within a dark rim and a light one, since alone they would not stand out from every colour of the map.
 */
final class FlowArrows {

    private static final double HALF = 20;
    private static final double WIDEST = 14;
    private static final double CORE = 9;
    private static final double LEAST_SHARE = 0.01;
    private static final double SIZE = 11.5;

    private final Camera camera;
    private final FaceFlows flows;
    private final double largest;
    private final List<Mark> marks = new ArrayList<>();

    /** The longest side of a face: its middle on the screen, and the direction outward from it. */
    private record Face(String item, double length, double x, double y, double outX, double outY) {

        static Face of(Camera camera, Side from, Side to) {
            double fromX = camera.x(from.x());
            double fromY = camera.y(from.y());
            double across = camera.x(to.x()) - fromX;
            double down = camera.y(to.y()) - fromY;
            double length = Math.hypot(across, down);
            return new Face(from.item(), length, fromX + across / 2, fromY + down / 2, -down / length, across / length);
        }
    }

    private FlowArrows(Camera camera, FaceFlows flows) {
        this.camera = camera;
        this.flows = flows;
        this.largest = flows.net().values().stream()
                .mapToDouble(Math::abs)
                .filter(Double::isFinite)
                .max()
                .orElse(0);
    }

    static List<Mark> of(Prism prism, FaceFlows flows, Camera camera, Labels labels) {
        FlowArrows arrows = new FlowArrows(camera, flows);
        List<Face> faces = arrows.faces(prism);
        faces.sort(
                Comparator.comparingDouble((Face face) -> -Math.abs(flows.net().get(face.item()))));
        faces.forEach(face -> arrows.arrow(face, labels));
        faces.forEach(face -> arrows.label(face, labels));
        return arrows.marks;
    }

    private List<Face> faces(Prism prism) {
        Map<String, Face> longest = new HashMap<>();
        for (Ring ring : prism.rings()) {
            for (int i = 0; i < ring.sides().size(); i++) {
                Side side = ring.sides().get(i);
                double net = flows.net().getOrDefault(side.item(), Double.NaN);
                if (Math.abs(net) >= LEAST_SHARE * largest && largest > 0) {
                    longest.merge(
                            side.item(),
                            Face.of(camera, side, ring.after(i)),
                            (one, other) -> one.length() >= other.length() ? one : other);
                }
            }
        }
        return new ArrayList<>(longest.values());
    }

    private void arrow(Face face, Labels labels) {
        double net = flows.net().get(face.item());
        double reach = net > 0 ? -HALF : HALF;
        double width = Math.max(1.5, WIDEST * Math.abs(net) / largest);
        Arrow arrow = new Arrow(
                face.x() - face.outX() * reach,
                face.y() - face.outY() * reach,
                face.x() + face.outX() * reach,
                face.y() + face.outY() * reach,
                width);
        marks.add(arrow.mark(fill(net), Mark.Stroke.of(Ink.Token.PAPER, 3.6)));
        marks.add(arrow.mark(fill(net), Mark.Stroke.of(Ink.Token.TEXT, 1)));
        for (double along : new double[] {-CORE, 0, CORE}) {
            double x = face.x() + along * face.outX();
            double y = face.y() + along * face.outY();
            labels.keepFree(new Box(x - CORE / 2, y - CORE / 2, CORE, CORE));
        }
    }

    private static Mark.Fill fill(double net) {
        return Mark.Fill.of(net > 0 ? Ink.Token.GAIN : Ink.Token.LOSS);
    }

    /** The flow stands beyond the arrow's outer end, else beyond its inner one. */
    private void label(Face face, Labels labels) {
        labels.place(List.of(text(face, 1), text(face, -1)), marks);
    }

    private Mark.Text text(Face face, int side) {
        double net = flows.net().get(face.item());
        String words = (net > 0 ? "+" : "−") + Figures.typeset(Math.abs(net));
        double towardX = side * face.outX();
        double towardY = side * face.outY();
        double x = face.x() + towardX * (HALF + 6);
        double y = face.y() + towardY * (HALF + 8) + 0.35 * SIZE;
        Mark.Anchor anchor = towardX > 0.3 ? Mark.Anchor.START : towardX < -0.3 ? Mark.Anchor.END : Mark.Anchor.MIDDLE;
        return new Mark.Text(x, y, words, SIZE, anchor, Ink.Token.TEXT, true, true, 0);
    }
}
